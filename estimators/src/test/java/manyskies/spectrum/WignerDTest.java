package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.analysis.polynomials.PolynomialsUtils;
import org.hipparchus.special.BesselJ;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WignerDTest {
    private static final double[] ANGLES = {1e-6, 0.01, 0.3, 1.2, 2.0, 3.1};

    private static double[] values(int m, int n, int lmax, double beta) {
        WignerSet set = new WignerSet(lmax);
        int index = set.index(m, n);
        double[][] d = new double[set.size()][lmax + 1];
        set.fill(beta, d);
        for (int l = 0; l <= lmax; l++) {
            d[index][l] *= WignerSet.sign(m, n);
        }
        return d[index];
    }

    /** Exact, spin weights of a quadrupole (Varshalovich et al. 1988, table 4.4). */
    @Test
    void quadrupoleFunctionsAreTheClosedForms() {
        for (double beta : ANGLES) {
            double c = Math.cos(beta);
            double s = Math.sin(beta);
            assertThat(values(2, 2, 2, beta)[2]).isCloseTo((1 + c) * (1 + c) / 4, within(1e-15));
            assertThat(values(2, -2, 2, beta)[2]).isCloseTo((1 - c) * (1 - c) / 4, within(1e-15));
            assertThat(values(2, 0, 2, beta)[2]).isCloseTo(Math.sqrt(6) / 4 * s * s, within(1e-15));
            assertThat(values(2, 1, 2, beta)[2]).isCloseTo(s * (1 + c) / 2, within(1e-15));
            assertThat(values(1, 1, 2, beta)[2]).isCloseTo((2 * c * c + c - 1) / 2, within(1e-15));
            assertThat(values(0, 0, 2, beta)[2]).isCloseTo((3 * c * c - 1) / 2, within(1e-15));
        }
    }

    /** Second method: the explicit sum (Varshalovich et al. 1988, 4.3.1), all pairs of orders. */
    @Test
    void recurrenceAndSymmetriesAgreeWithTheSum() {
        for (double beta : ANGLES) {
            for (int m = -4; m <= 4; m++) {
                for (int n = -4; n <= 4; n++) {
                    double[] d = values(m, n, 12, beta);
                    for (int l = 0; l <= 12; l++) {
                        assertThat(d[l])
                                .as("d^%d_%d,%d(%s)", l, m, n, beta)
                                .isCloseTo(sum(l, m, n, beta), within(2e-11));
                    }
                }
            }
        }
    }

    private static double sum(int l, int m, int n, double beta) {
        double sum = 0;
        if (l < Math.max(Math.abs(m), Math.abs(n))) {
            return 0;
        }
        for (int k = Math.max(0, n - m); k <= Math.min(l - m, l + n); k++) {
            sum +=
                    (k % 2 == 0 ? 1 : -1)
                            * Math.pow(Math.cos(beta / 2), 2 * l + n - m - 2 * k)
                            * Math.pow(Math.sin(beta / 2), m - n + 2 * k)
                            / (factorial(l - m - k)
                                    * factorial(l + n - k)
                                    * factorial(k + m - n)
                                    * factorial(k));
        }
        return sum
                * Math.sqrt(factorial(l + m) * factorial(l - m))
                * Math.sqrt(factorial(l + n) * factorial(l - n));
    }

    private static double factorial(int n) {
        return n <= 1 ? 1 : n * factorial(n - 1);
    }

    /** d^l_00 is the Legendre polynomial; coefficients from a general-purpose library. */
    @Test
    void zeroOrdersAreLegendrePolynomials() {
        for (double beta : ANGLES) {
            double[] d = values(0, 0, 15, beta);
            for (int l = 0; l <= 15; l++) {
                double legendre =
                        PolynomialsUtils.createLegendrePolynomial(l).value(Math.cos(beta));
                assertThat(d[l]).isCloseTo(legendre, within(1e-11));
            }
        }
    }

    /**
     * Small angles, high l: d^l_mn -> J_{m-n}((l + 1/2) beta), its error of order beta^2; Bessel
     * functions from a general-purpose library. Also shows that 6000 steps keep the phase.
     */
    @ParameterizedTest
    @CsvSource({"0, 0", "1, -1", "2, 2", "2, -2", "4, -4", "3, 1", "3, -2", "1, 0", "4, 0"})
    void highMultipolesAreBesselFunctions(int m, int n) {
        double beta = 0.003;
        double[] d = values(m, n, 6000, beta);
        for (int l = 100; l <= 6000; l += 59) {
            double bessel = new BesselJ(m - n).value((l + 0.5) * beta);
            assertThat(d[l]).isCloseTo(bessel, within(1e-4));
        }
    }

    /** int d^l_mn d^k_mn dcos(beta) = 2/(2l+1) delta_lk. */
    @ParameterizedTest
    @CsvSource({"0, 0", "2, 2", "2, -2", "2, 0", "4, -4", "3, -1"})
    void functionsAreOrthogonal(int m, int n) {
        int lmax = 60;
        double[][] product = new double[lmax + 1][lmax + 1];
        GaussLegendre rule = GaussLegendre.on(-1, 1, lmax + 1);
        for (int node = 0; node < rule.count(); node++) {
            double[] d = values(m, n, lmax, Math.acos(rule.node(node)));
            for (int l = 0; l <= lmax; l++) {
                for (int k = 0; k <= lmax; k++) {
                    product[l][k] += rule.weight(node) * d[l] * d[k];
                }
            }
        }
        for (int l = m; l <= lmax; l++) {
            for (int k = m; k <= lmax; k++) {
                double expected = l == k ? 2.0 / (2 * l + 1) : 0;
                assertThat(product[l][k]).isCloseTo(expected, within(1e-12));
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 7, 64, 751})
    void gaussLegendreIsExactForPolynomials(int count) {
        GaussLegendre rule = GaussLegendre.on(0.5, 2, count);
        int degree = Math.min(2 * count - 1, 90);
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += rule.weight(i) * Math.pow(rule.node(i), degree);
        }
        double exact = (Math.pow(2, degree + 1) - Math.pow(0.5, degree + 1)) / (degree + 1);
        assertThat(sum / exact).isCloseTo(1, within(1e-11));
    }

    @Test
    void ordersMustFit() {
        assertThatThrownBy(() -> WignerD.of(1, 2, 10))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("orders m = 1, n = 2 to lmax = 10; need |n| <= m <= lmax");
    }
}
