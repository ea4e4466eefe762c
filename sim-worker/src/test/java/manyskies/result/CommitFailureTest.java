package manyskies.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * A commit broken at each of its steps, by an error and by an outage, before, within and after the
 * step: the block stands whole or does not exist, and the one before it is untouched.
 */
class CommitFailureTest {
    private static final List<String> STEPS =
            List.of(
                    "write data-000001.sha256.PID.unfinished",
                    "write data-000001.parquet.PID.unfinished",
                    "write data-000001.parquet.PID.unfinished",
                    "rename data-000001.sha256",
                    "sync blocks",
                    "rename data-000001.parquet",
                    "sync fields",
                    "rename data-000001.parquet",
                    "sync blocks");

    /** Steps of committing data-000001 anew when a shorter one of this name stands. */
    private static final int GROWING_STEPS = STEPS.size() + 2;

    @TempDir private Path run;

    /** The data a commit cannot lose, in the order in which it cannot. */
    @Test
    void theStepsAreThese() {
        start();
        FailingFiles files = FailingFiles.never();
        new BlockStore(files, run).commit(TestBlocks.encoded(1));
        assertThat(files.steps()).isEqualTo(STEPS);
    }

    private void start() {
        try (RunFolder folder = RunFolder.open(run)) {
            folder.commit(TestBlocks.encoded(0));
        }
    }

    static Stream<Arguments> breaks() {
        return breaks(STEPS.size());
    }

    static Stream<Arguments> growingBreaks() {
        return breaks(GROWING_STEPS);
    }

    private static Stream<Arguments> breaks(int steps) {
        List<Arguments> all = new ArrayList<>();
        for (int step = 0; step < steps; step++) {
            for (FailingFiles.Moment moment : FailingFiles.Moment.values()) {
                all.add(Arguments.of(step, moment));
            }
        }
        return all.stream();
    }

    @ParameterizedTest
    @MethodSource("breaks")
    void anErrorLeavesAWholeBlockOrNone(int step, FailingFiles.Moment moment) throws IOException {
        start();
        SortedMap<String, String> before = listing();
        FailingFiles files = FailingFiles.withError(step, moment, "No space left on device");
        assertThatThrownBy(() -> new BlockStore(files, run).commit(TestBlocks.encoded(1)))
                .isInstanceOf(RunFolderException.class)
                .hasMessage(
                        run.resolve("blocks/data-000001.parquet")
                                + ": cannot be written, the disk or the quota is full. What was"
                                + " committed before is kept; make room, then the same command"
                                + " goes on from there.");
        assertThat(listing()).containsAllEntriesOf(before);
        if (step < 3) { // a full disk is found while nothing has its name yet
            assertThat(listing()).isEqualTo(before);
        }
        wholeOrNone(before, TestBlocks.encoded(1));
    }

    @ParameterizedTest
    @MethodSource("breaks")
    void anOutageLeavesAWholeBlockOrNone(int step, FailingFiles.Moment moment) throws IOException {
        start();
        SortedMap<String, String> before = listing();
        FailingFiles files = FailingFiles.withOutage(step, moment);
        assertThatThrownBy(() -> new BlockStore(files, run).commit(TestBlocks.encoded(1)))
                .isInstanceOf(FailingFiles.Outage.class);
        wholeOrNone(before, TestBlocks.encoded(1));
    }

    /** The same while a longer block takes the place of a shorter one: old, none or new. */
    @ParameterizedTest
    @MethodSource("growingBreaks")
    void anOutageLeavesTheShorterBlockOrTheLongerOrNone(int step, FailingFiles.Moment moment)
            throws IOException {
        start();
        SortedMap<String, String> before = listing();
        EncodedBlock shorter = BlockCodec.encode(TestBlocks.block(new BlockId("data", 1, 4, 2)));
        new BlockStore(new LocalFiles(), run).commit(shorter);
        SortedMap<String, String> withShorter = listing();
        FailingFiles files = FailingFiles.withOutage(step, moment);
        assertThatThrownBy(() -> new BlockStore(files, run).commit(TestBlocks.encoded(1)))
                .isInstanceOf(FailingFiles.Outage.class);
        try (RunFolder folder = RunFolder.open(run)) {
            if (folder.committed().contains(shorter.id())) {
                assertThat(listing()).isEqualTo(withShorter);
                return;
            }
        }
        wholeOrNone(before, TestBlocks.encoded(1));
    }

    /** What the folder holds once it is opened again, and once the block is committed again. */
    private void wholeOrNone(SortedMap<String, String> before, EncodedBlock block)
            throws IOException {
        try (RunFolder folder = RunFolder.open(run)) {
            assertThat(folder.damaged()).isEmpty();
            if (folder.committed().contains(block.id())) {
                assertThat(listing()).isEqualTo(with(before, block));
            } else {
                assertThat(listing()).isEqualTo(before);
            }
            folder.commit(block);
            assertThat(listing()).isEqualTo(with(before, block));
            folder.verify(block.id());
        }
    }

    private static SortedMap<String, String> with(
            SortedMap<String, String> before, EncodedBlock block) {
        SortedMap<String, String> all = new TreeMap<>(before);
        String stem = block.id().stem();
        byte[] seal = BlockSeal.of(block).text().getBytes(java.nio.charset.StandardCharsets.UTF_8);
        all.put("blocks/" + stem + ".sha256", HexFormat.of().formatHex(seal));
        all.put("blocks/" + stem + ".parquet", HexFormat.of().formatHex(block.bandpowers()));
        all.put("fields/" + stem + ".parquet", HexFormat.of().formatHex(block.fields()));
        return all;
    }

    /** Every file below the run folder with its contents. */
    private SortedMap<String, String> listing() throws IOException {
        SortedMap<String, String> listing = new TreeMap<>();
        try (Stream<Path> all = Files.walk(run)) {
            for (Path file : (Iterable<Path>) all.filter(Files::isRegularFile)::iterator) {
                listing.put(
                        run.relativize(file).toString(),
                        HexFormat.of().formatHex(Files.readAllBytes(file)));
            }
        }
        return listing;
    }
}
