package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.util.List;
import manyskies.spectrum.SpectraWriter;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The canonical text is a fixed point: what is read from it is what it was written from. */
class CanonicalYamlTest {
    @TempDir Path folder;
    private SpecificationFiles files;

    @BeforeEach
    void writeTable() {
        files = new SpecificationFiles(folder);
    }

    @ParameterizedTest
    @ValueSource(strings = {SpecificationFiles.FULL, SpecificationFiles.SHORTEST})
    void readsBackAsTheSameSpecification(String text) throws SpecificationException {
        Specification first = files.read(text);
        files.write("spectra.txt", SpectraWriter.write(first.unlensed(), List.of("a copy")));
        String canonical =
                CanonicalYaml.write(first, List.of("hash " + SpecificationHash.of(first)));
        Specification again = files.read(canonical);
        assertThat(again).isEqualTo(first.withSpectraFile("spectra.txt"));
        assertThat(CanonicalYaml.write(again))
                .isEqualTo(
                        canonical
                                .replaceFirst("# hash.*\n", "")
                                .replace(" # a copy of table.txt", ""));
        assertThat(SpecificationHash.of(again)).isEqualTo(SpecificationHash.of(first));
        assertThat(SpecificationDifference.between(first, again)).isEmpty();
    }

    @Test
    void shortestFileIsResolvedInFull() throws SpecificationException {
        assertThat(CanonicalYaml.write(files.read(SpecificationFiles.SHORTEST)))
                .isEqualTo(
                        """
                        name: sky
                        seed: 1
                        spectra: spectra.txt # a copy of table.txt
                        patch:
                          pixels: [256, 256]
                          pixel-size: 2 arcmin
                        survey:
                          beam: none
                          noise:
                            temperature: 5 uK-arcmin
                            polarisation: 7.071067811865476 uK-arcmin
                          splits: 1
                          edge-taper: none
                          curl: 0
                          spline-degree: 5
                        analysis:
                          temperature: {lmin: 100, lmax: 3000}
                          polarisation: {lmin: 100, lmax: 3000}
                          weights: lensed-gradient
                          estimators: [tt, te, tb, ee, eb, mv, joint]
                          bands: {from: 40, to: 1540, width: 100}
                        sets:
                          data: 64
                          pairs: 32
                        block: 16
                        """);
    }

    @Test
    void fullFileIsWrittenAsItStands() throws SpecificationException {
        assertThat(CanonicalYaml.write(files.read(SpecificationFiles.FULL)))
                .isEqualTo(
                        SpecificationFiles.FULL.replace(
                                "spectra: table.txt",
                                "spectra: spectra.txt # a copy of table.txt"));
    }

    @Test
    void remarksHaveOneLine() throws SpecificationException {
        Specification specification = files.read(SpecificationFiles.SHORTEST);
        assertThatThrownBy(() -> CanonicalYaml.write(specification, List.of("a\nseed: 8")))
                .hasMessage("a remark is one line, found: a\nseed: 8");
    }
}
