package manyskies.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import manyskies.command.CommandLineHarness.Ran;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Commands that start no farm: exit code, output, and that nothing is written. */
class CommandLineTest {
    @TempDir private Path folder;
    private CommandLineHarness manyskies;

    @BeforeEach
    void makeHarness() {
        manyskies = new CommandLineHarness(folder);
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "run", "status", "aggregate", "sky", "estimators", "bench"})
    void everyCommandHasHelpWithAnExample(String command) {
        Ran ran = manyskies.run(command, "--help");
        assertThat(ran.code()).isZero();
        assertThat(ran.out())
                .contains("Usage: manyskies " + command)
                .contains("Example: manyskies");
        assertThat(ran.err()).isEmpty();
        assertThat(manyskies.run("--help").out()).contains("  " + command + " ");
    }

    @Test
    void theHelpListsEveryExitCode() {
        String help = manyskies.run("--help").out();
        for (ExitCode code : ExitCode.values()) {
            assertThat(help).containsPattern("  " + code.code() + " +" + code.meaning());
        }
        assertThat(Arrays.stream(ExitCode.values()).map(ExitCode::code)).doesNotHaveDuplicates();
    }

    @Test
    void theVersionIsOneLine() {
        assertThat(manyskies.run("--version").out()).matches("manyskies \\S+\\R");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "run x.yaml --cors 2 | '--cors' is no option here; did you mean --cores?",
                "runn x.yaml | 'runn' is no command or argument here; did you mean run?",
                "run | Missing required parameter: 'SPEC'",
                "sky x.yaml | Missing required option: '--index=N'",
                "run x.yaml --cores two | Invalid value for option '--cores': 'two' is not an int",
            })
    void aFaultyCommandLineIsOneSentence(String line, String sentence) {
        Ran ran = manyskies.run(line.split(" "));
        assertThat(ran.code()).isEqualTo(ExitCode.BAD_INPUT.code());
        assertThat(ran.err().lines().toList()).hasSize(2).first().isEqualTo(sentence);
        assertThat(ran.err()).contains("--help'.");
    }

    @Test
    void aFaultySpecificationGivesItsSentencesAndWritesNothing() throws IOException {
        Path file = manyskies.specification("s.yaml", 8, 4, "-5 uK-arcmin");
        for (String command : new String[] {"check", "run", "bench"}) {
            Ran ran = manyskies.run(command, "s.yaml");
            assertThat(ran.code()).isEqualTo(2);
            assertThat(ran.err()).contains("1 fault, nothing was run.").contains("-5 uK-arcmin");
            assertThat(ran.out()).isEmpty();
        }
        try (var files = Files.list(folder)) {
            assertThat(files).containsExactly(file);
        }
    }

    @Test
    void checkSaysWhatWouldRunAndForHowLong() throws IOException {
        manyskies.specification("s.yaml", 8, 4);
        Ran ran =
                manyskies
                        .with(new StandInRealisations(50, -1, 1 << 20))
                        .run("check", "s.yaml", "--cores", "2");
        assertThat(ran.err()).isEmpty();
        assertThat(ran.code()).isZero();
        assertThat(ran.out())
                .contains("pixels: [32, 32]")
                .contains("  data     8 realisations in 2 blocks")
                .contains("  pairs    4 realisations in 1 block\n")
                .contains("Memory: 1 MiB for each block in progress")
                .containsPattern(
                        "Cost: (0\\.0[5-9]|0\\.[1-9]|[1-9])[0-9.]* s for a realisation of data")
                .containsPattern(
                        "On 2 cores: \\d+ s, so started now it would end about 2026-03-01");
        assertThat(Files.exists(folder.resolve("runs"))).isFalse();
    }

    @Test
    void aHeapTooSmallForTheCoresIsRefusedWithWhatWouldFit() throws IOException {
        manyskies.specification("s.yaml", 8, 4);
        Ran ran =
                manyskies
                        .with(new StandInRealisations(0, -1, 200 << 20))
                        .run("run", "s.yaml", "--cores", "4");
        assertThat(ran.code()).isEqualTo(ExitCode.ENVIRONMENT.code());
        assertThat(ran.err())
                .isEqualToIgnoringNewLines(
                        "4 cores need 1056 MiB of heap (200 MiB for each block in progress, 0 MiB"
                                + " shared, 256 MiB to spare, and never less than 450 MiB); the heap"
                                + " is 1024 MiB: use --cores 3 or less, or MANYSKIES_HEAP=1188m.");
        assertThat(Files.exists(folder.resolve("runs"))).isFalse();
    }

    @Test
    void coresArePositive() throws IOException {
        manyskies.specification("s.yaml", 8, 4);
        Ran ran = manyskies.run("run", "s.yaml", "--cores", "0");
        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.err()).contains("--cores is 0; at least one core is needed");
    }

    @Test
    void skyWritesAndNamesItsFiles() throws IOException {
        manyskies.specification("s.yaml", 8, 4);
        Ran ran = manyskies.run("sky", "s.yaml", "--index", "3");
        assertThat(ran.code()).isZero();
        assertThat(folder.resolve("skies/small-3/sky.txt")).hasContent("sky 3");
        assertThat(ran.out()).contains("sky.txt");
        assertThat(manyskies.run("sky", "s.yaml", "--index", "-1").err())
                .contains("--index is -1; indices begin at 0");
    }

    @Test
    void estimatorsAreListedWithTheFieldsTheyNeed() {
        assertThat(manyskies.run("estimators").out())
                .containsPattern("\ntt +T +\\S")
                .containsPattern("\neb +EB +\\S");
    }

    @Test
    void benchPrintsTheTableOfStages() throws IOException {
        manyskies.specification("s.yaml", 8, 4);
        assertThat(manyskies.run("bench", "s.yaml").out()).contains("stages of small");
    }

    @ParameterizedTest
    @ValueSource(strings = {"status", "aggregate"})
    void aFolderThatIsNoRunIsSaidToBeNone(String command) {
        Ran nowhere = manyskies.run(command, "nowhere");
        assertThat(nowhere.code()).isEqualTo(2);
        assertThat(nowhere.err())
                .contains("nowhere: there is no such folder; 'manyskies run' makes one.");
        assertThat(manyskies.run(command, ".").err()).contains("this is no run folder");
    }
}
