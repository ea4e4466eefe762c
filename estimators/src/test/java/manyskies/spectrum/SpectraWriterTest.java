package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.StringReader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** A table that is written reads back as the same spectra, to the last bit. */
class SpectraWriterTest {

    @Test
    void theFiducialTableReadsBack() throws IOException {
        Path table = Path.of("..", "conf", "spectra", "fiducial_unlensed.txt");
        Spectra first = read(Files.readString(table));
        assertThat(read(SpectraWriter.write(first, List.of("a copy")))).isEqualTo(first);
    }

    @Test
    void numbersWithoutAShortDecimalReadBack() throws IOException {
        Spectra first = Spectra.of(120, Map.of(Spectrum.TT, thirds(), Spectrum.PP, thirds()));
        SpectraReader reader = SpectraReader.requiring(Spectrum.TT, Spectrum.PP);
        String text = SpectraWriter.write(first, List.of());
        assertThat(reader.read(new StringReader(text), "copy")).isEqualTo(first);
        double[] moved = thirds();
        moved[77] = Math.nextUp(moved[77]);
        assertThat(first.with(Map.of(Spectrum.TT, moved))).isNotEqualTo(first);
    }

    @Test
    void whatATableCannotHoldIsRefused() {
        double[] monopole = thirds();
        monopole[0] = 1;
        Spectra spectra = Spectra.of(120, Map.of(Spectrum.TT, monopole));
        assertThatThrownBy(() -> SpectraWriter.write(spectra, List.of()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("TT is 1.0 at l = 0; a table begins at l = 2, set it to zero");
        assertThatThrownBy(() -> SpectraWriter.write(spectra, List.of("a\nb")))
                .hasMessage("a remark is one line, found: a\nb");
    }

    private static double[] thirds() {
        double[] values = new double[121];
        for (int l = 2; l <= 120; l++) {
            values[l] = 1 / (3.0 * l * l);
        }
        return values;
    }

    private static Spectra read(String text) throws IOException {
        return SpectraReader.unlensed().read(new StringReader(text), "table");
    }
}
