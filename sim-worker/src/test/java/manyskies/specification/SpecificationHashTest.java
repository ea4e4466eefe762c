package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.TreeSet;
import manyskies.spectrum.SpectraWriter;
import manyskies.spectrum.Spectrum;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Every key counts in the hash, in the identity and in the difference; spelling counts in none. */
class SpecificationHashTest {
    @TempDir static Path folder;
    private static SpecificationFiles files;

    @BeforeAll
    static void writeTable() {
        files = new SpecificationFiles(folder);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("edits")
    void everyKeyCounts(String key, String from, String to) throws SpecificationException {
        assertThat(SpecificationFiles.FULL).contains(from);
        Specification a = files.read(SpecificationFiles.FULL);
        Specification b = files.read(SpecificationFiles.FULL.replace(from, to));
        boolean onlyExtends = key.equals("name") || key.startsWith("sets.");
        assertThat(SpecificationHash.of(b)).isNotEqualTo(SpecificationHash.of(a));
        assertThat(SpecificationHash.identity(b).equals(SpecificationHash.identity(a)))
                .isEqualTo(onlyExtends);
        assertThat(SpecificationDifference.between(a, b))
                .singleElement()
                .satisfies(line -> assertThat(line).startsWith(key + ": ").contains(" -> "));
    }

    /** Key, text in the full file, another text. */
    static List<Arguments> edits() {
        return List.of(
                Arguments.of("name", "name: trial", "name: other"),
                Arguments.of("seed", "seed: 7", "seed: -7"),
                Arguments.of("patch.pixels", "[256, 240]", "[240, 256]"),
                Arguments.of("patch.pixel-size", "2 arcmin", "1.99999999999999 arcmin"),
                Arguments.of("survey.beam", "1.5 arcmin", "none"),
                Arguments.of("survey.noise.temperature", "knee: 800", "knee: 801"),
                Arguments.of("survey.noise.polarisation", "7.07 uK", "7.08 uK"),
                Arguments.of("survey.splits", "splits: 2", "splits: 4"),
                Arguments.of("survey.edge-taper", "1 deg", "1.5 deg"),
                Arguments.of("survey.curl", "curl: 0.5", "curl: 0"),
                Arguments.of("survey.spline-degree", "degree: 7", "degree: 3"),
                Arguments.of("analysis.temperature", "lmin: 100", "lmin: 101"),
                Arguments.of("analysis.polarisation", "lmax: 2500", "lmax: 2600"),
                Arguments.of("analysis.weights", "weights: lensed", "weights: unlensed"),
                Arguments.of("analysis.estimators", "[tt, eb, mv]", "[eb, tt, mv]"),
                Arguments.of("analysis.bands", "width: 100", "width: 150"),
                Arguments.of("sets.data", "data: 128", "data: 256"),
                Arguments.of("sets.pairs", "pairs: 64", "pairs: 0"),
                Arguments.of("block", "block: 16", "block: 32"));
    }

    @Test
    void noKeyIsForgottenAbove() throws SpecificationException {
        TreeSet<String> edited = new TreeSet<>();
        edits().forEach(edit -> edited.add((String) edit.get()[0]));
        assertThat(Entries.of(files.read(SpecificationFiles.FULL))).containsOnlyKeys(edited);
    }

    @ParameterizedTest
    @MethodSource("spellings")
    void spellingDoesNotCount(String from, String to) throws SpecificationException {
        assertThat(SpecificationFiles.FULL).contains(from);
        Specification a = files.read(SpecificationFiles.FULL);
        Specification b = files.read(SpecificationFiles.FULL.replace(from, to));
        assertThat(b).isEqualTo(a);
        assertThat(SpecificationHash.of(b)).isEqualTo(SpecificationHash.of(a));
        assertThat(SpecificationHash.of(a)).matches("[0-9a-f]{64}");
    }

    static List<Arguments> spellings() {
        return List.of(
                Arguments.of("seed: 7", "seed: '7' # a remark"),
                Arguments.of("1 deg", "60 arcmin"),
                Arguments.of("1.5 arcmin", "90.0 arcsec"),
                Arguments.of("5 uK-arcmin", "5e0 \u00b5K-arcmin"),
                Arguments.of("curl: 0.5", "curl: .5"),
                Arguments.of(
                        "{from: 50, to: 1550, width: 100}", "{width: 100, to: 1550, from: 50}"),
                Arguments.of("name: trial\nseed: 7", "seed: 7\nname: trial"));
    }

    @Test
    void theNumbersOfTheSpectraCountNotTheirPath() throws SpecificationException {
        Specification a = files.read(SpecificationFiles.FULL);
        String table = SpectraWriter.write(a.unlensed(), List.of("another file"));
        files.write("same.txt", table);
        files.write("other.txt", table.replaceFirst("\n100 \\S+", "\n100 0.25"));
        Specification same = files.read(SpecificationFiles.FULL.replace("table.txt", "same.txt"));
        Specification other = files.read(SpecificationFiles.FULL.replace("table.txt", "other.txt"));
        assertThat(SpecificationHash.of(same)).isEqualTo(SpecificationHash.of(a));
        assertThat(SpecificationDifference.between(a, same)).isEmpty();
        assertThat(SpecificationHash.of(other)).isNotEqualTo(SpecificationHash.of(a));
        assertThat(SpecificationHash.identity(other)).isNotEqualTo(SpecificationHash.identity(a));
        assertThat(SpecificationDifference.between(a, other))
                .containsExactly(
                        "spectra: TT at l = 100 (the first of those that differ): "
                                + a.unlensed().values(Spectrum.TT)[100]
                                + " -> 0.25");
    }

    @Test
    void differencesShowBothValues() throws SpecificationException {
        Specification a = files.read(SpecificationFiles.FULL);
        Specification b =
                files.read(
                        SpecificationFiles.FULL
                                .replace("beam: 1.5 arcmin", "beam: 2 arcmin")
                                .replace("data: 128", "data: 256"));
        assertThat(SpecificationDifference.between(a, b))
                .containsExactly("survey.beam: 1.5 arcmin -> 2 arcmin", "sets.data: 128 -> 256");
    }
}
