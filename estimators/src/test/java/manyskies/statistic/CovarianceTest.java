package manyskies.statistic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** The Wishart law of a sample covariance (Anderson 2003, chapter 7). */
class CovarianceTest {
    private static final int SETS = 20000;
    private static final int SKIES = 12;
    private static final int SIZE = 3;
    private static final double SHARED = 0.8;

    /** Two-sided, for the 6 elements together (Bonferroni). */
    private static final double FALSE_ALARM = 1e-6;

    private static final double[][] SUM = new double[SIZE][SIZE];
    private static final double[][] SQUARES = new double[SIZE][SIZE];

    static {
        Draws draws = new Draws(20261);
        for (int set = 0; set < SETS; set++) {
            Covariance c = Draws.mean(draws.correlated(SKIES, SIZE, SHARED)).covariance();
            for (int i = 0; i < SIZE; i++) {
                for (int j = 0; j < SIZE; j++) {
                    double deviation = c.value(i, j) - truth().value(i, j);
                    SUM[i][j] += c.value(i, j);
                    SQUARES[i][j] += deviation * deviation;
                }
            }
        }
    }

    private static Covariance truth() {
        double[][] c = new double[SIZE][SIZE];
        for (int i = 0; i < SIZE; i++) {
            for (int j = 0; j < SIZE; j++) {
                c[i][j] = SHARED * SHARED + (i == j ? 1 : 0);
            }
        }
        return Covariance.of(c, SKIES);
    }

    /** Exact: sum over sets of (n - 1) S_ii / C_ii is chi-square with sets (n - 1) degrees. */
    private static double tailOfDiagonal(int i, double scale) {
        double degrees = SETS * (SKIES - 1.0);
        double x = scale * (SKIES - 1) * SUM[i][i] / truth().value(i, i);
        double upper = TailProbability.ofChiSquare(x, degrees);
        return 2 * Math.min(upper, 1 - upper);
    }

    @Test
    void theMeanOfTheDiagonalIsTheTruth() {
        for (int i = 0; i < SIZE; i++) {
            assertThat(tailOfDiagonal(i, 1)).isGreaterThan(FALSE_ALARM / SIZE);
            // twin: a divisor of n instead of n - 1 is far outside
            assertThat(tailOfDiagonal(i, (SKIES - 1.0) / SKIES)).isLessThan(FALSE_ALARM / SIZE);
        }
    }

    /**
     * The scatter of S_ij about the truth against {@link Covariance#error} of the truth. S_ij is a
     * quadratic form, whose excess kurtosis is at most 12 / (n - 1); the relative scatter of its
     * mean square over M sets is then at most sqrt((2 + 12 / (n - 1)) / M) = 0.0124. Over M = 20000
     * the mean is Gaussian enough that 6 of those have a false-alarm rate below 1e-6 for 6 elements.
     */
    private static double worst(double factor) {
        double worst = 0;
        for (int i = 0; i < SIZE; i++) {
            for (int j = 0; j <= i; j++) {
                double predicted = factor * truth().error(i, j);
                double ratio = SQUARES[i][j] / SETS / (predicted * predicted);
                worst = Math.max(worst, Math.abs(ratio - 1));
            }
        }
        return worst;
    }

    private static final double BOUND = 6 * Math.sqrt((2 + 12.0 / (SKIES - 1)) / SETS);

    @Test
    void elementsScatterAsTheirErrorsSay() {
        assertThat(worst(1)).isLessThan(BOUND);
    }

    @Test
    void anErrorWrongByFivePerCentIsSeen() {
        assertThat(worst(1.05)).isGreaterThan(BOUND);
        assertThat(worst(0.95)).isGreaterThan(BOUND);
    }

    @Test
    void correlationAndScatterAreReadFromTheMatrix() {
        Covariance c = Covariance.of(new double[][] {{4, -3, 0}, {-3, 9, 0}, {0, 0, 0}}, 5);
        assertThat(c.correlation(0, 1)).isEqualTo(-0.5);
        assertThat(c.correlation(1, 1)).isEqualTo(1);
        assertThat(c.sigma(1)).isEqualTo(3);
        assertThat(c.error(0, 1)).isCloseTo(Math.sqrt((9 + 36) / 4.0), within(1e-15));
        assertThat(c.varianceOf(new double[] {1, 1, 5})).isEqualTo(4 + 9 - 6);
        assertThat(c.select(1, 0).value(0, 1)).isEqualTo(-3);
        assertThat(c.select(1, 0).value(0, 0)).isEqualTo(9);
        assertThatThrownBy(() -> c.correlation(0, 2))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("element 2 has no scatter over 5 realisations: its variance is 0.0");
    }
}
