package manyskies.combine;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

class CombinationWeightsTest {
    private static List<double[]> weights(double[][] s, double... responses) {
        List<double[]> r = Arrays.stream(responses).mapToObj(x -> new double[] {x}).toList();
        return CombinationWeights.of(r, (a, b, mode) -> s[a][b], mode -> true);
    }

    private static void assertWeights(List<double[]> found, double... expected) {
        for (int a = 0; a < expected.length; a++) {
            assertThat(found.get(a)[0]).isBetween(expected[a] - 1e-14, expected[a] + 1e-14);
        }
    }

    /**
     * Exact, by hand: S = ((2, 1), (1, 3)), R = (1, 2): S^-1 R = (1, 3) / 5, R S^-1 R = 7/5, so p =
     * (1, 3) / 7.
     */
    @Test
    void twoCorrelatedEstimatesAreCombinedAsByHand() {
        assertWeights(weights(new double[][] {{2, 1}, {1, 3}}, 1, 2), 1.0 / 7, 3.0 / 7);
    }

    /** Units of the parts do not matter, though they differ by twenty orders of magnitude. */
    @Test
    void thePartsMayHaveAnyUnits() {
        double u = 1e-20;
        List<double[]> found = weights(new double[][] {{2, u}, {u, 3 * u * u}}, 1, 2 * u);
        assertWeights(List.of(found.get(0), new double[] {found.get(1)[0] * u}), 1.0 / 7, 3.0 / 7);
    }

    /** p . R = 1, whatever the parts: the combination is normalised. */
    @Test
    void theCombinationHasUnitResponse() {
        double[][] s = {{5, 2, 1}, {2, 4, -1}, {1, -1, 3}};
        List<double[]> p = weights(s, 0.3, 2, 1.1);
        double response = 0.3 * p.get(0)[0] + 2 * p.get(1)[0] + 1.1 * p.get(2)[0];
        assertThat(response).isBetween(1 - 1e-14, 1 + 1e-14);
    }

    /** A part without response or noise at a mode is left out there; with none left, zero. */
    @Test
    void deadPartsAreLeftOut() {
        double[][] s = {{2, 9}, {9, 3}};
        assertWeights(weights(s, 4, 0), 0.25, 0);
        assertWeights(weights(new double[][] {{0, 0}, {0, 3}}, 4, 2), 0, 0.5);
        assertWeights(weights(s, 0, 0), 0, 0);
    }

    @Test
    void modesThatAreNotReconstructedAreZero() {
        List<double[]> r = List.of(new double[] {1, 1, 1}, new double[] {1, 1, 1});
        List<double[]> found =
                CombinationWeights.of(r, (a, b, mode) -> a == b ? 1 : 0, mode -> mode != 1);
        assertThat(found.get(0)).containsExactly(0.5, 0, 0.5);
        assertThat(found.get(1)).containsExactly(0.5, 0, 0.5);
    }
}
