package manyskies.farm;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import manyskies.result.BlockId;
import manyskies.result.EncodedBlock;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Invariants of the farm, with stand-in work. */
class FarmTest {
    private static final AtomicInteger TRIES = new AtomicInteger();

    private final List<EncodedBlock> committed = Collections.synchronizedList(new ArrayList<>());

    private static List<BlockId> blocks(int count) {
        return IntStream.range(0, count).mapToObj(i -> new BlockId("data", i, 4 * i, 4)).toList();
    }

    private FarmResult run(int cores, int count, BlockWork work) {
        return Farm.run(
                FarmSettings.local(cores),
                blocks(count),
                work,
                committed::add,
                Progress.SILENT,
                new StopSwitch());
    }

    private List<String> committedStems() {
        return committed.stream().map(b -> b.id().stem()).sorted().toList();
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3})
    void everyBlockIsCommittedOnce(int cores) {
        FarmResult result = run(cores, 11, StandInWork.plain());
        assertThat(result).isEqualTo(new FarmResult(11, List.of(), false));
        assertThat(committedStems())
                .isEqualTo(blocks(11).stream().map(BlockId::stem).sorted().toList());
    }

    @Test
    void withNothingToDoSparkIsNotStarted() {
        FarmSettings nowhere = new FarmSettings(1, Optional.of("no such master"));
        FarmResult result =
                Farm.run(
                        nowhere,
                        List.of(),
                        StandInWork.plain(),
                        committed::add,
                        Progress.SILENT,
                        new StopSwitch());
        assertThat(result.committed()).isZero();
    }

    @Test
    void aBlockThatFailsIsNamedAndTheOthersGoOn() {
        FarmResult result = run(2, 5, StandInWork.failingAt(2, 9));
        assertThat(result.committed()).isEqualTo(4);
        assertThat(committedStems()).doesNotContain("data-000002");
        assertThat(result.failures())
                .singleElement()
                .satisfies(
                        f -> {
                            assertThat(f.message())
                                    .isEqualTo("block data-000002: realisation 9 failed");
                            assertThat(f.stackTrace()).contains("IllegalStateException");
                            assertThat(f.outOfMemory()).isFalse();
                        });
    }

    @Test
    void memoryThatRunsOutIsToldFromAFault() {
        BlockWork hungry =
                id -> {
                    throw new IllegalStateException(
                            "realisation 0 failed", new OutOfMemoryError("Java heap space"));
                };
        FarmResult result = run(1, 1, hungry);
        assertThat(result.failures()).singleElement().matches(BlockFailure::outOfMemory);
    }

    @Test
    void failingInputAndOutputIsTriedThreeTimes() {
        TRIES.set(0);
        BlockWork flaky =
                id -> {
                    if (id.number() == 1 && TRIES.incrementAndGet() < 3) {
                        throw new UncheckedIOException(new IOException("lost disk"));
                    }
                    return StandInWork.block(id);
                };
        assertThat(run(1, 3, flaky).committed()).isEqualTo(3);
        assertThat(TRIES).hasValue(3);
    }

    @Test
    void aHostThatKeepsFailingEndsTheRunWithASentence() {
        BlockWork broken =
                id -> {
                    if (id.number() >= 2) {
                        throw new UncheckedIOException(new IOException("lost disk"));
                    }
                    return StandInWork.block(id);
                };
        assertThatThrownBy(() -> run(1, 5, broken))
                .isInstanceOf(FarmException.class)
                .hasMessageStartingWith("Spark gave up: ")
                .hasMessageContaining("lost disk")
                .hasMessageEndingWith(
                        "2 of 5 blocks were committed and stay, the same command resumes");
    }

    @Test
    void theSwitchEndsTheRunAndWhatArrivedStays() {
        StopSwitch stop = new StopSwitch();
        BlockSink sink =
                block -> {
                    committed.add(block);
                    if (committed.size() == 3) {
                        stop.stop();
                    }
                };
        FarmResult result =
                Farm.run(
                        FarmSettings.local(1),
                        blocks(40),
                        StandInWork.lasting(20),
                        sink,
                        Progress.SILENT,
                        stop);
        assertThat(result.stopped()).isTrue();
        assertThat(result.committed()).isBetween(3, 10).isEqualTo(committed.size());
    }

    @Test
    void aCommitThatFailsEndsTheRunAndIsTheOneReported() {
        BlockSink full =
                block -> {
                    if (committed.size() == 2) {
                        throw new IllegalStateException("the disk is full");
                    }
                    committed.add(block);
                };
        assertThatThrownBy(
                        () ->
                                Farm.run(
                                        FarmSettings.local(2),
                                        blocks(40),
                                        StandInWork.lasting(20),
                                        full,
                                        Progress.SILENT,
                                        new StopSwitch()))
                .hasMessage("the disk is full");
        assertThat(committed).hasSize(2);
    }

    @Test
    void aMasterThatIsNoneIsRefused() {
        FarmSettings nowhere = new FarmSettings(1, Optional.of("no such master"));
        assertThatThrownBy(
                        () ->
                                Farm.run(
                                        nowhere,
                                        blocks(1),
                                        StandInWork.plain(),
                                        committed::add,
                                        Progress.SILENT,
                                        new StopSwitch()))
                .isInstanceOf(FarmException.class)
                .hasMessageStartingWith("Spark did not start on no such master: ");
    }

    @Test
    void coresArePositive() {
        assertThatThrownBy(() -> FarmSettings.local(0))
                .hasMessage("--cores is 0; at least one core is needed");
    }
}
