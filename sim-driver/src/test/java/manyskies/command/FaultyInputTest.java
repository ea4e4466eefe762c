package manyskies.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import manyskies.command.CommandLineHarness.Ran;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Faulty files through the command line: each kind gives its sentence with place and mend, exit code
 * 2, no stack trace, and nothing is written.
 */
class FaultyInputTest {
    private static final String[][] COMMANDS = {
        {"run", "small.yaml", "--out", "run"}, {"sky", "small.yaml", "--index", "0"}
    };

    @TempDir private Path folder;
    private CommandLineHarness manyskies;

    @BeforeEach
    void writeFiles() throws IOException {
        manyskies = SmallSimulation.in(folder);
    }

    @ParameterizedTest(name = "{0} -> {1}")
    @CsvFileSource(resources = "/faulty-specifications.txt", delimiter = '|', quoteCharacter = '`')
    void ofASpecification(String from, String to, int line, String sentence) throws IOException {
        write("small.yaml", edited(SmallSimulation.SPECIFICATION, from, to));
        assertRefused("small.yaml: 1 fault, nothing was run.", at(line) + sentence);
    }

    @ParameterizedTest(name = "{0} -> {1}")
    @CsvFileSource(resources = "/faulty-spectra.txt", delimiter = '|', quoteCharacter = '`')
    void ofATableOfSpectra(String from, String to, String sentence) throws IOException {
        write("table.txt", edited(SmallSimulation.table(), from, to));
        assertRefused(", nothing was run.", at(3) + "table.txt: " + sentence);
    }

    @Test
    void allAtOnceInTheOrderOfTheirLines() throws IOException {
        String text = edited(SmallSimulation.SPECIFICATION, "seed: 41", "sede: 41");
        text = edited(text, "pixels: 128", "pixels: 127");
        text = edited(text, "depth: 5", "depth: -5");
        write("small.yaml", edited(text, "data: 16", "data: 15"));
        Ran ran = manyskies.run("run", "small.yaml");
        assertThat(ran.code()).isEqualTo(ExitCode.BAD_INPUT.code());
        assertThat(ran.err().lines().map(l -> l.replaceFirst("(line +\\d+).*", "$1")))
                .containsExactly(
                        folder.resolve("small.yaml") + ": 4 faults, nothing was run.",
                        "  line  2",
                        "  line  5",
                        "  line 10",
                        "  line 23");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "run nothing.yaml | nothing.yaml: 1 fault, nothing was run.\\n  the file does not"
                        + " exist; check the path.",
                "run folder | folder: 1 fault, nothing was run.\\n  the file is a directory; name"
                        + " a file in it.",
                "run empty.yaml | empty.yaml: 1 fault, nothing was run.\\n  the file is empty; its"
                        + " keys are name, seed, spectra",
                "run bytes.yaml | the file is not a text file in UTF-8; save it as UTF-8.",
                "run small.yaml --out table.txt | table.txt: this is a file; name the folder of a"
                        + " run.",
                "status table.txt | table.txt: this is a file; name the folder of a run.",
                "aggregate folder | folder: this is no run folder, for it holds no"
                        + " specification.yaml.",
                "aggregate nowhere | nowhere: there is no such folder; 'manyskies run' makes one.",
                "run small.yaml --master nonsense | --master is 'nonsense'; write the URL of a"
                        + " Spark master, for example spark://host:7077, or leave it out.",
                "run small.yaml --cores -2 | --cores is -2; at least one core is needed.",
                "run small.yaml --core 2 | '--core' is no option here; did you mean --cores?",
                "sky small.yaml --index -1 | --index is -1; indices begin at 0.",
                "sky small.yaml | Missing required option: '--index=N'",
                "run small.yaml half.yaml | 'half.yaml' is no command or argument here.",
            })
    void ofACommandLine(String line, String sentence) throws IOException {
        Files.createDirectory(folder.resolve("folder"));
        write("empty.yaml", "");
        Files.write(folder.resolve("bytes.yaml"), new byte[] {'a', ':', ' ', (byte) 0xff});
        Map<String, String> before = contents();
        Ran ran = manyskies.run(line.split(" "));
        assertThat(ran.code()).isEqualTo(ExitCode.BAD_INPUT.code());
        assertThat(ran.err()).contains(sentence.replace("\\n", "\n"));
        assertOnlySentences(ran);
        assertThat(contents()).isEqualTo(before);
    }

    private void assertRefused(String head, String sentence) throws IOException {
        Map<String, String> before = contents();
        for (String[] command : COMMANDS) {
            Ran ran = manyskies.run(command);
            assertThat(ran.code()).isEqualTo(ExitCode.BAD_INPUT.code());
            assertThat(ran.err().lines().findFirst().orElse("")).endsWith(head);
            assertThat(ran.err().lines()).contains(sentence);
            assertOnlySentences(ran);
        }
        assertThat(contents()).isEqualTo(before);
    }

    private static void assertOnlySentences(Ran ran) {
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err()).doesNotContain("\tat ").doesNotContain("Exception");
        assertThat(ran.err().lines()).hasSizeLessThan(5);
    }

    private static String at(int line) {
        return "  line " + line + "  ";
    }

    private Map<String, String> contents() throws IOException {
        Map<String, String> contents = new TreeMap<>();
        try (var paths = Files.walk(folder)) {
            for (Path path : paths.toList()) {
                boolean text = path.toString().matches(".*(small\\.yaml|table\\.txt)");
                contents.put(path.toString(), text ? Files.readString(path) : "");
            }
        }
        return contents;
    }

    private void write(String name, String text) throws IOException {
        Files.writeString(folder.resolve(name), text);
    }

    private static String edited(String text, String from, String to) {
        String old = withBreaks(from);
        assertThat(text).contains(old);
        int at = text.indexOf(old);
        String now = to == null ? "" : withBreaks(to);
        return text.substring(0, at) + now + text.substring(at + old.length());
    }

    private static String withBreaks(String text) {
        return text.replace("\\n", "\n").replace("\\t", "\t");
    }
}
