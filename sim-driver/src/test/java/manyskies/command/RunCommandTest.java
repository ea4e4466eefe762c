package manyskies.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import manyskies.command.CommandLineHarness.Ran;
import manyskies.result.RunFolder;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Invariants of a run, with stand-in realisations: the same bytes however it came about. */
class RunCommandTest {
    @TempDir private Path folder;
    private CommandLineHarness manyskies;

    @BeforeEach
    void makeHarness() throws IOException {
        manyskies = new CommandLineHarness(folder);
        manyskies.specification("small.yaml", 16, 8);
        manyskies.specification("smaller.yaml", 8, 4);
    }

    private Map<String, String> digests(String run) throws IOException {
        return CommandLineHarness.digests(folder.resolve(run));
    }

    private Ran ok(String... arguments) {
        Ran ran = manyskies.run(arguments);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.code()).isZero();
        return ran;
    }

    @Test
    void oneCoreAndTwoGiveTheSameBytes() throws IOException {
        Ran ran = ok("run", "small.yaml", "--cores", "1");
        ok("run", "small.yaml", "--cores", "2", "--out", "two");
        assertThat(ran.out()).contains("6 blocks run").contains("runs/small/tables");
        assertThat(digests("runs/small"))
                .isEqualTo(digests("two"))
                .containsKey("tables/bandpowers.csv")
                .containsKey("blocks/data-000003.parquet");
    }

    @Test
    void theSameCommandAgainHasNothingToDo() throws IOException {
        ok("run", "small.yaml");
        Map<String, String> before = digests("runs/small");
        assertThat(ok("run", "small.yaml").out()).contains("Nothing was left to run");
        assertThat(digests("runs/small")).isEqualTo(before);
        assertThat(ok("status", "runs/small").out())
                .contains("  data     4 of 4 blocks, 16 of 16 realisations")
                .contains("  pairs    2 of 2 blocks, 8 of 8 realisations");
    }

    @Test
    void aRunThatIsExtendedHasTheBytesOfTheWhole() throws IOException {
        ok("run", "smaller.yaml", "--out", "grown");
        assertThat(ok("run", "small.yaml", "--out", "grown").out()).contains("3 blocks run");
        ok("run", "small.yaml", "--out", "whole");
        assertThat(digests("grown")).isEqualTo(digests("whole"));
    }

    @Test
    void aRunDoesNotShrink() throws IOException {
        ok("run", "small.yaml", "--out", "r");
        Map<String, String> before = digests("r");
        Ran ran = manyskies.run("run", "smaller.yaml", "--out", "r");
        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.err())
                .contains("holds more realisations than asked for")
                .contains("sets.data: 16 -> 8");
        assertThat(digests("r")).isEqualTo(before);
    }

    @Test
    void anotherSpecificationIsRefusedWithWhatDiffers() throws IOException {
        ok("run", "small.yaml", "--out", "r");
        manyskies.specification("deeper.yaml", 16, 8, "3 uK-arcmin");
        Ran ran = manyskies.run("run", "deeper.yaml", "--out", "r");
        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.err())
                .contains("holds a run of another specification, nothing was run.")
                .containsPattern("survey.noise.temperature\\S*: .*6.* -> .*3");
    }

    @Test
    void aDamagedBlockIsNamedAndComputedAgain() throws IOException {
        ok("run", "small.yaml");
        Map<String, String> before = digests("runs/small");
        damage("blocks/data-000002.parquet");
        damage("fields/data-000001.parquet");
        Ran ran = manyskies.run("run", "small.yaml");
        assertThat(ran.code()).isZero();
        assertThat(ran.err())
                .contains("data-000002")
                .contains("data-000001")
                .contains("it will be computed again");
        assertThat(ran.out()).contains("2 blocks run");
        assertThat(digests("runs/small")).isEqualTo(before);
    }

    private void damage(String file) throws IOException {
        Path path = folder.resolve("runs/small").resolve(file);
        byte[] bytes = Files.readAllBytes(path);
        bytes[bytes.length / 2] ^= 1;
        Files.write(path, bytes);
    }

    @Test
    void aTruncatedBlockIsComputedAgain() throws IOException {
        ok("run", "small.yaml");
        Map<String, String> before = digests("runs/small");
        Path file = folder.resolve("runs/small/blocks/pairs-000000.parquet");
        Files.write(file, new byte[0]);
        assertThat(manyskies.run("run", "small.yaml").out()).contains("1 block run");
        assertThat(digests("runs/small")).isEqualTo(before);
    }

    @Test
    void aFailingBlockIsNamedTheOthersHaveTheirTablesAndItIsOurFault() throws IOException {
        Ran ran =
                manyskies
                        .with(new StandInRealisations(0, 6, 1 << 20))
                        .run("run", "small.yaml", "--cores", "2");
        assertThat(ran.code()).isEqualTo(ExitCode.OUR_FAULT.code());
        assertThat(ran.err())
                .contains("block data-000001: realisation 6 of set data failed")
                .contains("java.lang.IllegalStateException")
                .contains("1 block failed, missing from the tables")
                .contains("please report");
        assertThat(digests("runs/small"))
                .doesNotContainKey("blocks/data-000001.parquet")
                .containsKey("blocks/data-000002.parquet")
                .containsKey("tables/bandpowers.csv");
        Ran mended = manyskies.with(StandInRealisations.plain()).run("run", "small.yaml");
        assertThat(mended.out()).contains("1 block run");
        ok("run", "small.yaml", "--out", "other");
        assertThat(digests("runs/small")).isEqualTo(digests("other"));
    }

    @Test
    void aSecondDriverIsRefused() {
        try (RunFolder held = RunFolder.open(folder.resolve("runs/small"))) {
            Ran ran = manyskies.run("run", "small.yaml");
            assertThat(ran.code()).isEqualTo(ExitCode.ENVIRONMENT.code());
            assertThat(ran.err()).contains(held.path().toString()).doesNotContain("\tat ");
        }
    }

    @Test
    void aFileInTheWayIsTheEnvironmentsFault() throws IOException {
        Files.writeString(folder.resolve("runs"), "a file where a folder should be");
        Ran ran = manyskies.run("run", "small.yaml");
        assertThat(ran.code()).isEqualTo(ExitCode.ENVIRONMENT.code());
        assertThat(ran.err()).contains("runs").doesNotContain("\tat ");
    }

    @Test
    void aggregateMakesTheSameTablesAgain() throws IOException {
        Ran run = ok("run", "small.yaml");
        Map<String, String> before = digests("runs/small");
        Files.delete(folder.resolve("runs/small/tables/bandpowers.csv"));
        Ran again = ok("aggregate", "runs/small");
        assertThat(digests("runs/small")).isEqualTo(before);
        assertThat(run.out()).startsWith(again.out().lines().findFirst().orElseThrow());
    }
}
