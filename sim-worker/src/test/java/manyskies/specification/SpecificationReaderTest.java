package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import manyskies.spectrum.Bands;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What is read from good files, and how files that are faulty as a whole are refused. */
class SpecificationReaderTest {
    private static final double ARCMIN = Math.PI / 10800;

    @TempDir Path folder;
    private SpecificationFiles files;

    @BeforeEach
    void writeTable() {
        files = new SpecificationFiles(folder);
    }

    @Test
    void everyKeyArrives() throws SpecificationException {
        Specification full = files.read(SpecificationFiles.FULL);
        assertThat(full)
                .isEqualTo(
                        new Specification(
                                "trial",
                                7,
                                new Patch(256, 240, 2 * ARCMIN),
                                SpecificationFiles.spectra(4000),
                                "table.txt",
                                new Survey(
                                        Math.PI / 7200,
                                        new Noise(5 * ARCMIN, 800, 3),
                                        Noise.white(7.07 * ARCMIN),
                                        2,
                                        Math.PI / 180,
                                        0.5,
                                        7),
                                new Analysis(
                                        new MultipoleRange(100, 3000),
                                        new MultipoleRange(200, 2500),
                                        Weights.LENSED,
                                        List.of("tt", "eb", "mv"),
                                        Bands.between(
                                                50, 150, 250, 350, 450, 550, 650, 750, 850, 950,
                                                1050, 1150, 1250, 1350, 1450, 1550)),
                                new Sets(128, 64),
                                16));
    }

    @Test
    void whatIsLeftOutHasItsDefault() throws SpecificationException {
        Specification shortest = files.read(SpecificationFiles.SHORTEST);
        assertThat(shortest.name()).isEqualTo("sky");
        assertThat(shortest.seed()).isEqualTo(1);
        assertThat(shortest.survey())
                .isEqualTo(
                        new Survey(
                                0,
                                Noise.white(5 * ARCMIN),
                                Noise.white(Math.sqrt(2) * (5 * ARCMIN)),
                                1,
                                0,
                                0,
                                5));
        assertThat(shortest.analysis().temperature()).isEqualTo(new MultipoleRange(100, 3000));
        assertThat(shortest.analysis().polarisation()).isEqualTo(new MultipoleRange(100, 3000));
        assertThat(shortest.analysis().weights()).isEqualTo(Weights.LENSED_GRADIENT);
        assertThat(shortest.analysis().estimators())
                .containsExactly("tt", "te", "tb", "ee", "eb", "mv", "joint");
        assertThat(shortest.sets()).isEqualTo(new Sets(64, 32));
        assertThat(shortest.block()).isEqualTo(16);
    }

    @Test
    void defaultsFollowPixelsAndPatch() throws SpecificationException {
        // 96 pixels of 4': Nyquist 2700, three quarters of it 2025; modes are 56.25 apart
        Specification small =
                files.read(
                        SpecificationFiles.SHORTEST
                                .replace("256", "96")
                                .replace("2 arcmin", "4 arcmin"));
        assertThat(small.analysis().temperature()).isEqualTo(new MultipoleRange(100, 2000));
        Bands bands = small.analysis().bands();
        assertThat(bands.lower(0)).isEqualTo(50);
        assertThat(bands.upper(bands.count() - 1)).isEqualTo(1450);
        assertThat(bands.count()).isEqualTo(14);
    }

    @Test
    void theNoiseOfPolarisationIsWhiteByDefault() throws SpecificationException {
        String text =
                SpecificationFiles.SHORTEST.replace(
                        "5 uK-arcmin", "{depth: 5 uK-arcmin, knee: 800, slope: 3}");
        assertThat(files.read(text).survey().polarisation())
                .isEqualTo(Noise.white(Math.sqrt(2) * (5 * ARCMIN)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"first-light", "shortest"})
    void theFilesInConfAreGood(String name) throws SpecificationException {
        Path file = Path.of("..", "conf", name + ".yaml");
        Specification found = SpecificationReader.read(file, SpecificationFiles.ESTIMATORS);
        assertThat(found.name()).isEqualTo(name);
        assertThat(found.unlensed().lmax()).isEqualTo(6000);
    }

    @Test
    void pixelsTooCoarseForTheDefaultsAreTold() {
        // 32 pixels of 90': Nyquist 120, three quarters of it 90
        String text =
                SpecificationFiles.SHORTEST.replace("256", "32").replace("2 arcmin", "90 arcmin");
        String range =
                " is 100; lmin must be below lmax, but they are 100 and 90, the default with these"
                        + " pixels and spectra.";
        assertThat(files.faults(text))
                .containsExactly(
                        new Fault(1, "analysis.temperature.lmin" + range),
                        new Fault(1, "analysis.polarisation.lmin" + range),
                        new Fault(
                                1,
                                "no band of width 100 lies between the patch's lowest mode, |l| ="
                                        + " 7.5, and the filters' lmax, 90; make the patch wider,"
                                        + " or give analysis.bands."));
    }

    @Test
    void allFaultsAreToldAtOnceInTheOrderOfTheLines() {
        Path file =
                files.write(
                        "sky.yaml",
                        SpecificationFiles.FULL
                                .replace("block: 16", "block: 0")
                                .replace("lmax: 2500", "lmaks: 2500")
                                .replace("name: trial", "name: a b")
                                .replace("7.07 uK-arcmin", "-7 uK-arcmin"));
        assertThatThrownBy(() -> SpecificationReader.read(file, SpecificationFiles.ESTIMATORS))
                .isInstanceOf(SpecificationException.class)
                .hasMessage(
                        file
                                + ": 4 faults, nothing was run.\n"
                                + "  line  1  name is 'a b'; it must begin with a letter or digit"
                                + " and have at most 100 letters, digits, '.', '_', '-'.\n"
                                + "  line 11  survey.noise.polarisation is -7 uK-arcmin; a depth"
                                + " must be positive.\n"
                                + "  line 18  'lmaks' is no key of analysis.polarisation; the"
                                + " nearest is 'lmax'.\n"
                                + "  line 25  block is 0; it must be a whole number from 1 to"
                                + " 4096.");
    }

    @Test
    void aMissingFileIsNamed() {
        assertWhole(folder.resolve("none.yaml"), "the file does not exist; check the path.");
    }

    @Test
    void aDirectoryIsNoFile() {
        assertWhole(folder, "the file is a directory; name a file in it.");
    }

    @Test
    void anEmptyFileIsTold() {
        assertWhole(
                files.write("sky.yaml", "# nothing\n"),
                "the file is empty; its keys are name, seed, spectra, patch, survey, analysis,"
                        + " sets, block.");
    }

    @Test
    void otherEncodingsAreRefused() throws IOException {
        Path file = folder.resolve("sky.yaml");
        Files.write(file, "name: m\u00fc".getBytes(StandardCharsets.ISO_8859_1));
        assertWhole(file, "the file is not a text file in UTF-8; save it as UTF-8.");
    }

    @Test
    void aFileBeyondOneMebibyteIsRefused() {
        String text = SpecificationFiles.FULL + "#".repeat(1 << 20);
        assertWhole(
                files.write("sky.yaml", text),
                "the file is larger than 1 MiB, the most such a file may have; is it the right"
                        + " file?");
    }

    @Test
    void aFileOfAMillionBracketsIsRefusedBeforeAnyStackOverflows() {
        assertThat(files.faults("seed: " + "[".repeat(1_000_000)))
                .containsExactly(
                        new Fault(1, "the nesting is deeper than 16; three levels suffice."));
    }

    @Test
    void aListIsNoSpecification() {
        assertThat(files.faults("- name\n- seed\n"))
                .containsExactly(
                        new Fault(
                                1,
                                "the file is no mapping; its keys are name, seed, spectra, patch,"
                                        + " survey, analysis, sets, block."));
    }

    @Test
    void aFileNameThatCannotNameARunNeedsAName() {
        Path file = files.write("my sky.yaml", SpecificationFiles.SHORTEST);
        assertThatThrownBy(() -> SpecificationReader.read(file, SpecificationFiles.ESTIMATORS))
                .hasMessageContaining(
                        "line 1  the file's name, 'my sky', cannot name the run: it must begin"
                                + " with a letter or digit and have at most 100 letters, digits,"
                                + " '.', '_', '-'; add a key 'name'.");
    }

    private static void assertWhole(Path file, String sentence) {
        assertThatThrownBy(() -> SpecificationReader.read(file, SpecificationFiles.ESTIMATORS))
                .isInstanceOf(SpecificationException.class)
                .hasMessage(file + ": 1 fault, nothing was run.\n  " + sentence);
    }
}
