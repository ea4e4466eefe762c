package manyskies.quadratic;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import manyskies.estimator.Belief;
import manyskies.estimator.Estimators;
import manyskies.estimator.LegMaps;
import manyskies.estimator.LegPair;
import manyskies.estimator.Reconstruction;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.field.SkyField;
import manyskies.flat.FlatGrid;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Second method: every estimator against its formula as a direct sum over the plane. */
class QuadraticEstimatorsTest {
    private static final double LOUT = SmallSky.LOUT;
    private static final FlatGrid GRID = SmallSky.GRID;

    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "TB", "EE", "EB"})
    void oneSkyIsTheDirectSum(String xy) {
        CmbModes legs = SmallSky.legs(11);
        assertSums(xy, legs, legs);
    }

    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "TB", "EE", "EB"})
    void twoSkiesAreTheDirectSumWithTheFirstFieldFromLegA(String xy) {
        assertSums(xy, SmallSky.legs(12), SmallSky.legs(13));
    }

    private static void assertSums(String xy, CmbModes a, CmbModes b) {
        Belief belief = SmallSky.belief();
        Reconstruction found = reconstruct(belief, xy.toLowerCase(Locale.ROOT), a, b);
        DirectSums direct = new DirectSums(GRID, belief.weights(), belief.total(), SmallSky.LMAX);
        Modes x = a.of(SkyField.valueOf(xy.substring(0, 1)));
        Modes y = b.of(SkyField.valueOf(xy.substring(1)));
        assertSame(found.gradient(), (kx, ky) -> direct.estimate(xy, false, x, y, kx, ky));
        assertSame(found.curl(), (kx, ky) -> direct.estimate(xy, true, x, y, kx, ky));
    }

    private static Reconstruction reconstruct(Belief belief, String name, CmbModes a, CmbModes b) {
        LegMaps first = belief.maps(a);
        LegMaps second = a.equals(b) ? first : belief.maps(b);
        LegPair pair = belief.pair(first, second);
        return pair.reconstruct(Estimators.named(name).prepare(belief));
    }

    private interface Expected {
        double[] at(int kx, int ky);
    }

    /** Error relative to the norm of the whole array. */
    private static void assertSame(Modes found, Expected expected) {
        double error = 0;
        double norm = 0;
        for (int ky = -GRID.ny() / 2 + 1; ky < GRID.ny() / 2; ky++) {
            for (int kx = 0; kx < GRID.nx() / 2; kx++) {
                int mode = GRID.mode(kx, ky);
                if (GRID.multipole(mode) > 0 && GRID.multipole(mode) < LOUT) {
                    double[] e = expected.at(kx, ky);
                    error += Math.pow(found.re(mode) - e[0], 2);
                    error += Math.pow(found.im(mode) - e[1], 2);
                    norm += e[0] * e[0] + e[1] * e[1];
                }
            }
        }
        assertThat(norm).isPositive();
        assertThat(Math.sqrt(error / norm)).isLessThan(1e-12);
    }
}
