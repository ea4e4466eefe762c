package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import manyskies.field.SkyField;
import manyskies.flat.FlatGrid;
import org.junit.jupiter.api.Test;

class ModeSpectraTest {
    private static final FlatGrid GRID = new FlatGrid(8, 8, 1e-3);
    private static final int LMAX = 3000;

    /** TT = l, TE = 2 l, EE = 3 l, BB = 4 l: linear, so that reading between entries is exact. */
    private static Spectra rising() {
        EnumMap<Spectrum, double[]> c = new EnumMap<>(Spectrum.class);
        Spectrum[] names = {Spectrum.TT, Spectrum.TE, Spectrum.EE, Spectrum.BB};
        for (int i = 0; i < names.length; i++) {
            double[] table = new double[LMAX + 1];
            int slope = i + 1;
            Arrays.setAll(table, l -> slope * l);
            c.put(names[i], table);
        }
        return Spectra.of(LMAX, c);
    }

    /** Flat |l| is l + 1/2 of the full sky; zero outside the table. */
    @Test
    void tablesAreReadHalfAMultipoleBelow() {
        ModeSpectra spectra = ModeSpectra.sample(rising(), GRID);
        for (int mode = 0; mode < GRID.size(); mode++) {
            double l = GRID.multipole(mode) - 0.5;
            double expected = l < 0 || l > LMAX ? 0 : l;
            assertThat(spectra.of(Spectrum.TT)[mode])
                    .isBetween(expected * (1 - 1e-14), expected * (1 + 1e-14));
        }
        assertThat(GRID.multipole(GRID.mode(3, 3))).isGreaterThan(LMAX);
        assertThat(ModeSpectra.sample(rising(), GRID, mode -> 7.25).of(Spectrum.BB))
                .containsOnly(29);
    }

    @Test
    void pairsOfFieldsFindTheirSpectrum() {
        ModeSpectra spectra = ModeSpectra.sample(rising(), GRID, mode -> 1);
        assertThat(spectra.of(SkyField.T, SkyField.T)).containsOnly(1);
        assertThat(spectra.of(SkyField.T, SkyField.E)).containsOnly(2);
        assertThat(spectra.of(SkyField.E, SkyField.T)).containsOnly(2);
        assertThat(spectra.of(SkyField.E, SkyField.E)).containsOnly(3);
        assertThat(spectra.of(SkyField.B, SkyField.B)).containsOnly(4);
        assertThat(spectra.of(SkyField.T, SkyField.B)).isNull();
        assertThat(spectra.of(SkyField.B, SkyField.E)).isNull();
    }

    @Test
    void noiseIsAddedToACopy() {
        ModeSpectra spectra = ModeSpectra.sample(rising(), GRID, mode -> 1);
        double[] noise = new double[GRID.size()];
        Arrays.fill(noise, 0.5);
        ModeSpectra sum = spectra.plus(Map.of(Spectrum.EE, noise));
        assertThat(sum.of(Spectrum.EE)).containsOnly(3.5);
        assertThat(sum.of(Spectrum.TT)).containsOnly(1);
        assertThat(spectra.of(Spectrum.EE)).containsOnly(3);
    }

    @Test
    void refusalsSayWhatWasFound() {
        ModeSpectra spectra = ModeSpectra.sample(rising(), GRID);
        assertThatThrownBy(() -> spectra.of(Spectrum.PP))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("no spectrum PP of the CMB fields");
        assertThatThrownBy(() -> spectra.plus(Map.of(Spectrum.BB, new double[3])))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("expected 40 numbers, found 3");
    }
}
