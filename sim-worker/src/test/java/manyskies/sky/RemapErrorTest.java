package manyskies.sky;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import manyskies.field.CmbModes;
import manyskies.flat.FlatGrid;
import manyskies.random.Address;
import manyskies.spectrum.Bands;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * Second method: 2 arcmin pixels against a grid refined by two, degree 7. One sky, and two remaps of
 * it: nothing here scatters but the error itself.
 */
class RemapErrorTest {
    private static final Bands BANDS = Bands.between(100, 1000, 1500, 2000, 2500, 3000);
    private static RemapError error;

    @BeforeAll
    static void drawOneSky() {
        FlatGrid grid = new FlatGrid(256, 256, 2 * Math.PI / 180 / 60);
        error = new RemapError(grid, 2, Tables.unlensed(), BANDS, new Address(11, "remap", 0));
    }

    private static double worst(double[] errors) {
        return Arrays.stream(errors).map(Math::abs).max().orElseThrow();
    }

    /** The claim of degree 3: 0.1 per cent of the power of T and E, 0.3 of B. */
    @Test
    void degreeThreeIsGoodToAThousandthOfThePower() {
        CmbModes found = error.remapped(3, false);
        CmbModes truth = error.truth();
        assertThat(worst(error.ofPower(found.temperature(), truth.temperature()))).isLessThan(1e-3);
        assertThat(worst(error.ofPower(found.gradient(), truth.gradient()))).isLessThan(1e-3);
        assertThat(worst(error.ofPower(found.curl(), truth.curl()))).isLessThan(3e-3);
    }

    /** Twin: the interpolating prefilter loses about two per cent at l = 2500 to 3000. */
    @Test
    void interpolationIsNot() {
        CmbModes found = error.remapped(3, true);
        CmbModes truth = error.truth();
        double[] t = error.ofPower(found.temperature(), truth.temperature());
        assertThat(t[4]).isBetween(-0.03, -0.01);
    }

    @Test
    void higherDegreesAreBetterModeByMode() {
        double[] worst = new double[3];
        for (int i = 0; i < 3; i++) {
            CmbModes found = error.remapped(3 + 2 * i, false);
            worst[i] = worst(error.ofModes(found.gradient(), error.truth().gradient()));
        }
        assertThat(worst[0]).isLessThan(2e-2);
        assertThat(worst[1]).isLessThan(worst[0] / 3);
        assertThat(worst[2]).isLessThan(worst[1] / 2);
    }
}
