package manyskies.sky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Optional;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.flat.StokesMaps;
import manyskies.flat.StokesTransform;
import manyskies.random.Address;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SkyLensingTest {
    private static final double ARCMIN = Math.PI / 180 / 60;
    private static final FlatGrid GRID = new FlatGrid(96, 64, 2 * ARCMIN);
    private static final ModeDisc DISC = ModeDisc.of(GRID, GRID.nyquist() * (1 - 1e-9));

    private static UnlensedSky sky() {
        return GaussianSky.of(DISC, Tables.unlensed(), 0).draw(new Address(7, "sky", 0));
    }

    private static UnlensedSky with(UnlensedSky sky, Modes phi) {
        return new UnlensedSky(
                sky.temperature(), sky.gradient(), sky.curl(), phi, Optional.empty());
    }

    private static StokesMaps unlensedMaps(UnlensedSky sky) {
        return StokesTransform.of(DISC)
                .synthesise(new CmbModes(sky.temperature(), sky.gradient(), Modes.zero(GRID)));
    }

    /** Exact: interpolating splines pass through the pixels. */
    @ParameterizedTest
    @ValueSource(ints = {3, 5, 7})
    void aSkyWithoutLensesStaysAsItIs(int degree) {
        UnlensedSky sky = with(sky(), Modes.zero(GRID));
        StokesMaps lensed = SkyLensing.withRms(DISC, 0, degree).lens(sky);
        StokesMaps expected = unlensedMaps(sky);
        assertThat(distance(lensed.t(), expected.t())).isLessThan(1e-12);
        assertThat(distance(lensed.q(), expected.q())).isLessThan(1e-12);
        assertThat(distance(lensed.u(), expected.u())).isLessThan(1e-12);
    }

    @Test
    void anUnknownDegreeIsRefused() {
        assertThatThrownBy(() -> SkyLensing.withRms(DISC, 0, 4))
                .hasMessage("splines that remap the sky have degree 3, 5 or 7, found 4");
    }

    /** The largest difference over the rms of what is expected. */
    static double distance(double[] found, double[] expected) {
        double worst = 0;
        double square = 0;
        for (int i = 0; i < expected.length; i++) {
            worst = Math.max(worst, Math.abs(found[i] - expected[i]));
            square += expected[i] * expected[i];
        }
        return worst / Math.sqrt(square / expected.length);
    }
}
