package manyskies.statistic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class JackknifeTest {
    private static final Jackknife.Statistic MEAN = (sum, n) -> new double[] {sum[0] / n};

    static double[] sum(List<double[]> rows) {
        double[] sum = new double[rows.get(0).length];
        for (double[] row : rows) {
            for (int i = 0; i < sum.length; i++) {
                sum[i] += row[i];
            }
        }
        return sum;
    }

    /** Exact: of the mean of equal blocks it is the error of the mean of block means. */
    @Test
    void ofAMeanItIsTheErrorOfTheMeanOfBlockMeans() {
        List<double[]> blocks = List.of(new double[] {6}, new double[] {10}, new double[] {17});
        Jackknife jackknife = Jackknife.of(blocks, List.of(2, 2, 2), MEAN);
        // block means 3, 5, 8.5; mean 5.5; sum of squared deviations 15.5; over 3 x 2
        assertThat(jackknife.value(0)).isEqualTo(5.5);
        assertThat(jackknife.error(0)).isCloseTo(Math.sqrt(15.5 / 6), within(1e-14));
    }

    /**
     * Exact: for a mean the variance is unbiased, whatever the sizes. Over 4000 runs of five blocks
     * of unit Gaussian numbers its mean is 1/n; its relative scatter is at most sqrt(2 / 1) / sqrt(4000)
     * (two blocks hold most of the data): six of those, false-alarm rate below 1e-8.
     */
    private static double meanVariance(List<Integer> sizes, List<Integer> told) {
        Draws draws = new Draws(21);
        double total = 0;
        for (int run = 0; run < 4000; run++) {
            List<double[]> sums = new ArrayList<>();
            for (int size : sizes) {
                sums.add(sum(draws.correlated(size, 1, 0)));
            }
            double error = Jackknife.of(sums, told, MEAN).error(0);
            total += error * error;
        }
        return total / 4000;
    }

    private static final List<Integer> SIZES = List.of(8, 8, 1, 3, 2);
    private static final double BOUND = 6 * Math.sqrt(2 / 4000.0);

    @Test
    void theVarianceOfAMeanIsUnbiasedForUnequalBlocks() {
        assertThat(22 * meanVariance(SIZES, SIZES)).isCloseTo(1, within(BOUND));
    }

    /** Twin: numbers that are correlated within blocks have a larger error, and it is seen. */
    @Test
    void correlationWithinBlocksIsSeen() {
        Draws draws = new Draws(22);
        double total = 0;
        for (int run = 0; run < 4000; run++) {
            List<double[]> sums = new ArrayList<>();
            for (int size : SIZES) {
                double common = 0.5 * draws.gaussian();
                sums.add(new double[] {sum(draws.correlated(size, 1, 0))[0] + size * common});
            }
            double error = Jackknife.of(sums, SIZES, MEAN).error(0);
            total += error * error;
        }
        assertThat(22 * total / 4000).isGreaterThan(1 + BOUND);
    }

    @Test
    void fewerThanTwoBlocksAreRefused() {
        assertThatThrownBy(() -> Jackknife.of(List.of(new double[1]), List.of(3), MEAN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "a jackknife needs at least 2 blocks with a count for each, found 1 and 1");
        List<double[]> two = List.of(new double[1], new double[1]);
        assertThatThrownBy(() -> Jackknife.of(two, List.of(3, 0), MEAN))
                .hasMessage("a block of 0 realisations");
    }
}
