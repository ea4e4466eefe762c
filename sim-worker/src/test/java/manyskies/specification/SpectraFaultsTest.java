package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Faults of the table of spectra stand under the line of the key that names it. */
class SpectraFaultsTest {
    @TempDir Path folder;
    private SpecificationFiles files;

    @BeforeEach
    void writeTable() {
        files = new SpecificationFiles(folder);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "none.txt | the spectra file none.txt (relative to sky.yaml) does not exist; check the path.",
                ". | the spectra file . (relative to sky.yaml) is a directory; name a file in it.",
                "/none/none.txt | the spectra file /none/none.txt does not exist; check the path.",
                "[a.txt] | spectra is a list; it must be the path of a table.",
            })
    void aFileThatGivesNoTextIsOneFault(String path, String sentence) {
        assertThat(faults(path)).containsExactly(new Fault(3, sentence));
    }

    @Test
    void aPathThatCannotExistIsOneFault() {
        assertThat(faults("\"a\\0b\""))
                .singleElement()
                .satisfies(fault -> assertThat(fault.line()).isEqualTo(3))
                .satisfies(fault -> assertThat(fault.sentence()).contains("that is no path"));
    }

    @Test
    void everyFaultOfTheTableIsTold() {
        files.write("bad.txt", "# columns are C_l\n# l TT EE TE\n2 1 1 0\n3 -1 1 0\n4 x 1 0\n");
        List<Fault> found = faults("bad.txt");
        assertThat(found).hasSizeGreaterThan(1).allMatch(fault -> fault.line() == 3);
        assertThat(found)
                .allSatisfy(fault -> assertThat(fault.sentence()).startsWith("bad.txt: "))
                .anySatisfy(fault -> assertThat(fault.sentence()).contains("PP"))
                .anySatisfy(fault -> assertThat(fault.sentence()).contains("'x'"));
    }

    @Test
    void aTableWrongInEveryRowDoesNotFillTheScreen() {
        String rows =
                IntStream.range(2, 500).mapToObj(l -> l + " x").collect(Collectors.joining("\n"));
        files.write("bad.txt", "# columns are C_l\n# l TT EE TE PP\n" + rows + "\n");
        assertThat(faults("bad.txt")).hasSize(21);
        assertThat(faults("bad.txt").get(20).sentence())
                .matches("bad.txt: \\d+ more faults of this kind\\.");
    }

    private List<Fault> faults(String path) {
        return files.faults(SpecificationFiles.FULL.replace("table.txt", path));
    }
}
