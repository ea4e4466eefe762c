package manyskies.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import manyskies.estimator.Belief;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.Estimators;
import manyskies.flat.FlatGrid;
import manyskies.quadratic.DirectSums;
import manyskies.quadratic.SmallSky;
import manyskies.spectrum.ModeSpectra;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Second method: responses and noise against direct sums over the plane. */
class AnalyticResponseTest {
    private static final FlatGrid GRID = SmallSky.GRID;
    private static final double LOUT = SmallSky.LOUT;
    private static final List<String> ALL = List.of("tt", "te", "tb", "ee", "eb", "mv", "joint");

    private final Belief belief = SmallSky.belief();
    private final AnalyticResponse analytic = AnalyticResponse.of(belief);
    private final DirectSums direct =
            new DirectSums(GRID, belief.weights(), belief.total(), SmallSky.LMAX);

    private BilinearWeight weight(String name) {
        return Estimators.named(name.toLowerCase(Locale.ROOT))
                .prepare(belief)
                .weight()
                .orElseThrow();
    }

    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "TB", "EE", "EB"})
    void responseIsTheDirectSum(String xy) {
        LensAndCurl found = analytic.response(weight(xy), belief.weights());
        assertSame(found.lens(), (kx, ky) -> direct.response(xy, false, kx, ky));
        assertSame(found.curl(), (kx, ky) -> direct.response(xy, true, kx, ky));
    }

    /** With a truth other than the belief, so that no term hides behind an identity. */
    @ParameterizedTest
    @CsvSource({"TT,TT", "TE,TE", "TB,TB", "EE,EE", "EB,EB", "TT,TE", "TT,EE", "TE,EE", "TB,EB"})
    void noiseIsTheDirectSum(String a, String b) {
        ModeSpectra truth = SmallSky.total(0.37);
        LensAndCurl found = analytic.noise(weight(a), weight(b), truth);
        assertSame(found.lens(), (kx, ky) -> direct.noise(a, b, false, truth, kx, ky));
        assertSame(found.curl(), (kx, ky) -> direct.noise(a, b, true, truth, kx, ky));
    }

    private interface Expected {
        double at(int kx, int ky);
    }

    private static void assertSame(double[] found, Expected expected) {
        double error = 0;
        double norm = 0;
        for (int ky = -GRID.ny() / 2 + 1; ky < GRID.ny() / 2; ky++) {
            for (int kx = 0; kx < GRID.nx() / 2; kx++) {
                int mode = GRID.mode(kx, ky);
                if (GRID.multipole(mode) > 0 && GRID.multipole(mode) < LOUT) {
                    double e = expected.at(kx, ky);
                    error += Math.pow(found[mode] - e, 2);
                    norm += e * e;
                }
            }
        }
        assertThat(norm).isPositive();
        assertThat(Math.sqrt(error / norm)).isLessThan(1e-12);
    }

    /** Exact: with filters that are the true totals, optimal estimators have N0 = 1 / R. */
    @Test
    void optimalEstimatorsHaveNoiseOneOverResponse() {
        for (String name : List.of("tt", "ee", "eb", "tb", "joint")) {
            BilinearWeight w = weight(name);
            double[] r = analytic.response(w, belief.weights()).lens();
            double[] n = analytic.noise(w, w, belief.total()).lens();
            forModes(mode -> assertThat(n[mode] / r[mode]).isBetween(1 - 1e-10, 1 + 1e-10));
        }
    }

    @Test
    void theCombinationHasUnitResponse() {
        LensAndCurl r = analytic.response(weight("mv"), belief.weights());
        forModes(mode -> assertThat(r.lens()[mode]).isBetween(1 - 1e-10, 1 + 1e-10));
    }

    /** Maniyar et al. 2021 (2101.12193): the joint estimator is never noisier than mv. */
    @Test
    void noiseFallsFromEachToTheirCombinationToTheJointOne() {
        double[] joint = n0("joint");
        double[] mv = n0("mv");
        forModes(mode -> assertThat(joint[mode]).isLessThanOrEqualTo(mv[mode] * (1 + 1e-10)));
        for (String name : ALL.subList(0, 5)) {
            double[] one = n0(name);
            forModes(mode -> assertThat(mv[mode]).isLessThan(one[mode] * (1 + 1e-10)));
        }
    }

    private double[] n0(String name) {
        BilinearWeight w = weight(name);
        double[] r = analytic.response(w, belief.weights()).lens();
        double[] n = analytic.noise(w, w, belief.total()).lens();
        double[] out = new double[n.length];
        for (int mode = 0; mode < out.length; mode++) {
            out[mode] = n[mode] / (r[mode] * r[mode]);
        }
        return out;
    }

    private interface OfMode {
        void at(int mode);
    }

    private static void forModes(OfMode check) {
        int seen = 0;
        for (int mode = 0; mode < GRID.size(); mode++) {
            if (!GRID.isNyquist(mode) && GRID.multipole(mode) > 0 && GRID.multipole(mode) < LOUT) {
                check.at(mode);
                seen++;
            }
        }
        assertThat(seen).isGreaterThan(50);
    }
}
