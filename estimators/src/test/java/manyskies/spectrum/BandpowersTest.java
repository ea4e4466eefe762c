package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import org.junit.jupiter.api.Test;

class BandpowersTest {
    private static final FlatGrid GRID = new FlatGrid(10, 8, 1e-3);
    private static final double STEP = GRID.stepX(); // stepY is 1.25 times that
    private static final Bands BANDS = Bands.between(0.9 * STEP, 1.1 * STEP, 2.1 * STEP);
    private final Bandpowers bandpowers = Bandpowers.of(GRID, BANDS);

    /**
     * Exact, counted by hand over the whole plane, (kx, ky) at |l| / step: (+-1, 0) at 1; (0, +-1)
     * at 1.25, (+-1, +-1) at 1.60, (+-2, 0) at 2.
     */
    @Test
    void everyModeOfThePlaneCountsOnce() {
        assertThat(bandpowers.modesInBand()).containsExactly(2, 8);
        double mean = (2 * 1.25 + 4 * Math.sqrt(1 + 1.25 * 1.25) + 2 * 2) / 8;
        assertThat(bandpowers.meanMultipole()[0] / STEP).isBetween(1 - 1e-14, 1 + 1e-14);
        assertThat(bandpowers.meanMultipole()[1] / STEP).isBetween(mean - 1e-14, mean + 1e-14);
    }

    /** Exact: one plane wave at (1, 1) with X = 3 + 4i, Y = 1 - 2i; Re X Y^* = -5, 2 of 8 modes. */
    @Test
    void onePlaneWaveHasItsProductOverAreaAndModes() {
        Modes x = wave(3, 4);
        Modes y = wave(1, -2);
        double expected = -5 * 2 / (8 * GRID.area());
        assertThat(bandpowers.average(x, y)[0]).isZero();
        assertThat(bandpowers.average(x, y)[1] / expected).isBetween(1 - 1e-14, 1 + 1e-14);
        assertThat(bandpowers.average(y, x)).isEqualTo(bandpowers.average(x, y));
    }

    private static Modes wave(double re, double im) {
        double[] values = new double[2 * GRID.size()];
        values[2 * GRID.mode(1, 1)] = re;
        values[2 * GRID.mode(1, 1) + 1] = im;
        return Modes.of(GRID, values);
    }

    /** The mean of |l| as any function of modes is the mean multipole. */
    @Test
    void functionsAreAveragedAsMultipolesAre() {
        double[] l = new double[GRID.size()];
        Arrays.setAll(l, GRID::multipole);
        assertThat(bandpowers.mean(l)).isEqualTo(bandpowers.meanMultipole());
    }

    @Test
    void aBandWithoutModesIsRefused() {
        Bands empty = Bands.between(0.5, 2, 1000);
        assertThatThrownBy(() -> Bandpowers.of(GRID, empty))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("no mode of the patch lies in the band from 0.5 to 2.0; widen it");
    }

    @Test
    void modesOfAnotherSpaceAreRefused() {
        FlatGrid other = new FlatGrid(8, 10, 1e-3);
        Modes there = Modes.zero(other);
        assertThatThrownBy(() -> bandpowers.average(Modes.zero(GRID), there))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("modes of " + GRID + " cannot be combined with modes of " + other);
        assertThatThrownBy(() -> bandpowers.average(there, there))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("bandpowers of " + GRID + " cannot be taken of modes of " + other);
        assertThatThrownBy(() -> bandpowers.mean(new double[5]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("expected 48 numbers, one per mode of the space, found 5");
    }
}
