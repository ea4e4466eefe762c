package manyskies.statistic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The ratio of means and its error, on drawn cross- and input spectra. */
class RatioTest {
    private static final int RUNS = 3000;
    private static final int SKIES = 60;
    private static final int MODES = 30;
    private static final double NOISE = 0.1;

    /** Rows (cross, input) of a transfer function of the given value. */
    private static List<double[]> skies(Draws draws, int skies, double transfer) {
        List<double[]> rows = new ArrayList<>();
        for (int sky = 0; sky < skies; sky++) {
            double input = draws.bandpower(MODES);
            rows.add(new double[] {transfer * input + NOISE * draws.gaussian(), input});
        }
        return rows;
    }

    private interface ErrorOf {
        double of(MeanVector skies);
    }

    /**
     * Mean square of (r - 1) in units of its error. With the noise Gaussian and independent it is
     * near (n - 1) / (n - 3) = 1.035 (Student), its scatter over 3000 runs sqrt(2.2 / 3000) = 0.027;
     * terms of second order in the scatter of the mean input (0.26^2 / 60) move it by about 0.003.
     */
    private static double meanSquare(double transfer, ErrorOf error) {
        Draws draws = new Draws(11);
        double sum = 0;
        for (int run = 0; run < RUNS; run++) {
            MeanVector skies = Draws.mean(skies(draws, SKIES, transfer));
            double z = (skies.ratio().value(0) - 1) / error.of(skies);
            sum += z * z;
        }
        return sum / RUNS;
    }

    private static final double EXPECTED = (SKIES - 1.0) / (SKIES - 3.0);

    /** Six times the expected scatter: false-alarm rate below 1e-8. */
    private static final double BOUND = 6 * 0.027;

    @Test
    void theErrorIsCalibrated() {
        assertThat(meanSquare(1, skies -> skies.ratio().error(0)))
                .isCloseTo(EXPECTED, within(BOUND));
    }

    /** Twin: errors 10 per cent off, and a transfer function that is 1 per cent low. */
    @Test
    void wrongErrorsAndWrongTransfersAreSeen() {
        assertThat(Math.abs(meanSquare(1, s -> 0.9 * s.ratio().error(0)) - EXPECTED))
                .isGreaterThan(BOUND);
        assertThat(Math.abs(meanSquare(0.99, s -> s.ratio().error(0)) - EXPECTED))
                .isGreaterThan(BOUND);
    }

    /** Twin: the numerator's own scatter, which forgets that both share their skies. */
    @Test
    void theNaiveErrorIsSeenToBeTooLarge() {
        assertThat(meanSquare(1, s -> s.error(0) / s.value(1))).isLessThan(EXPECTED - BOUND);
    }

    /** Second method: the formula with explicit residuals, for two bands and their covariance. */
    @Test
    void theErrorIsThatOfTheResiduals() {
        List<double[]> rows = new Draws(12).correlated(25, 4, 0.5);
        rows.forEach(
                row -> {
                    row[2] += 6;
                    row[3] += 9;
                });
        MeanVector ratio = Draws.mean(rows).ratio();
        double[] r = new double[2];
        double[] input = new double[2];
        for (int b = 0; b < 2; b++) {
            int band = b;
            input[b] = rows.stream().mapToDouble(row -> row[2 + band]).sum();
            r[b] = rows.stream().mapToDouble(row -> row[band]).sum() / input[b];
            assertThat(ratio.value(b)).isCloseTo(r[b], within(1e-14));
        }
        for (int a = 0; a < 2; a++) {
            for (int b = 0; b < 2; b++) {
                double sum = 0;
                for (double[] row : rows) {
                    sum += (row[a] - r[a] * row[2 + a]) * (row[b] - r[b] * row[2 + b]);
                }
                double expected = sum / 24 * 25 * 25 / (input[a] * input[b]);
                assertThat(ratio.covariance().value(a, b)).isCloseTo(expected, within(1e-13));
            }
        }
    }

    /** Second method: the jackknife over blocks agrees within its own precision, 1/sqrt(2 x 199). */
    @Test
    void theJackknifeFindsTheSameError() {
        Draws draws = new Draws(13);
        List<double[]> all = new ArrayList<>();
        List<double[]> sums = new ArrayList<>();
        List<Integer> counts = new ArrayList<>();
        for (int block = 0; block < 200; block++) {
            List<double[]> rows = skies(draws, block % 3 == 0 ? 4 : 9, 1);
            all.addAll(rows);
            sums.add(JackknifeTest.sum(rows));
            counts.add(rows.size());
        }
        Jackknife jackknife =
                Jackknife.of(sums, counts, (sum, count) -> new double[] {sum[0] / sum[1]});
        MeanVector ratio = Draws.mean(all).ratio();
        assertThat(jackknife.value(0)).isCloseTo(ratio.value(0), within(1e-13));
        assertThat(jackknife.error(0) / ratio.error(0)).isCloseTo(1, within(6 * 0.05));
        assertThat(jackknife.blocks()).isEqualTo(200);
    }

    /** Exact: what is proportional to the input has a ratio without scatter. */
    @Test
    void aTransferWithoutNoiseHasNoError() {
        MeanVector mean =
                Draws.mean(new Draws(14).correlated(20, 1, 0))
                        .transform(new double[][] {{0.5}, {1}});
        assertThat(mean.ratio().value(0)).isEqualTo(0.5);
        assertThat(mean.ratio().error(0)).isLessThan(1e-7);
    }

    @Test
    void impossibleRatiosAreRefused() {
        MeanVector three = Draws.mean(new Draws(15).correlated(5, 3, 0));
        assertThatThrownBy(three::ratio)
                .hasMessage("two vectors of one length make an even number of elements, found 3");
        MeanVector zero = three.transform(new double[][] {{1, 0, 0}, {0, 0, 0}});
        assertThatThrownBy(zero::ratio).hasMessage("element 0 is to be divided by 0.0");
        assertThatThrownBy(() -> three.transform(new double[][] {{1}}))
                .hasMessage("a row of weights has 1 numbers for a vector of 3");
    }
}
