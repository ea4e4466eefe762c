package manyskies.statistic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.hipparchus.distribution.continuous.FDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.junit.jupiter.api.Test;

class HotellingTestTest {
    private static final int RUNS = 4000;
    private static final int P = 5;
    private static final int N = 12;
    private static final double BOUND = Draws.massartBound(RUNS, 1e-6);

    private interface Law {
        double tail(HotellingTest test);
    }

    /** Distance from uniform of the probabilities of many runs whose true mean is {@code shift}. */
    private static double distance(double shift, Law law) {
        Draws draws = new Draws(77);
        double[] tails = new double[RUNS];
        double[] expected = new double[P];
        expected[1] = shift;
        for (int run = 0; run < RUNS; run++) {
            List<double[]> rows = draws.correlated(N, P, 0.9);
            tails[run] = law.tail(HotellingTest.of(Draws.mean(rows), expected));
        }
        return Draws.distanceFromUniform(tails);
    }

    /** Exact: under the truth the probability to exceed is uniform. False-alarm rate 1e-6. */
    @Test
    void probabilitiesAreUniformWhenTheExpectationIsRight() {
        assertThat(distance(0, HotellingTest::probabilityToExceed)).isLessThan(BOUND);
    }

    /** Twin: one of five elements moved by a quarter of one realisation's scatter. */
    @Test
    void aShiftOfOneElementIsSeen() {
        assertThat(distance(0.25, HotellingTest::probabilityToExceed)).isGreaterThan(BOUND);
    }

    /** Twin: the chi-square law, which forgets that the covariance is noisy, is seen to be wrong. */
    @Test
    void theChiSquareLawWouldBeSeen() {
        assertThat(distance(0, t -> TailProbability.ofChiSquare(t.tSquared(), P)))
                .isGreaterThan(BOUND);
    }

    /** Exact: with one element T is Student's t, from a library. */
    @Test
    void oneElementIsStudentsTest() {
        MeanVector mean = Draws.mean(new Draws(3).correlated(9, 1, 0));
        HotellingTest test = HotellingTest.of(mean, 0.3);
        double t = (mean.value(0) - 0.3) / mean.error(0);
        assertThat(test.tSquared()).isCloseTo(t * t, within(1e-12 * t * t));
        double tail = 2 * new TDistribution(8).cumulativeProbability(-Math.abs(t));
        assertThat(test.probabilityToExceed()).isCloseTo(tail, within(1e-12));
    }

    /** Second method: a library's distribution; and the digits of a small tail. */
    @Test
    void tailsOfFAgreeWithALibrary() {
        for (double f : new double[] {0, 0.2, 1, 3.7, 20}) {
            double library = 1 - new FDistribution(4, 11).cumulativeProbability(f);
            assertThat(TailProbability.ofF(f, 4, 11)).isCloseTo(library, within(1e-12));
        }
        // exact for d1 = 2: (1 + 2 f / d2)^(-d2/2)
        assertThat(TailProbability.ofF(1000, 2, 30))
                .isCloseTo(Math.pow(1 + 2000 / 30.0, -15), within(1e-38));
        assertThatThrownBy(() -> TailProbability.ofF(-1, 2, 3))
                .hasMessageContaining("found -1.0 with 2.0");
    }

    /** Invariant: bandpowers in other units or other linear combinations give the same verdict. */
    @Test
    void unitsDoNotMatter() {
        MeanVector mean = Draws.mean(new Draws(4).correlated(20, 3, 0.5));
        HotellingTest plain = HotellingTest.of(mean, 0);
        MeanVector other = mean.transform(new double[][] {{1e-9, 0, 0}, {2, 3, 0}, {1e5, 0, -4e5}});
        assertThat(HotellingTest.of(other, 0).tSquared())
                .isCloseTo(plain.tSquared(), within(1e-9 * plain.tSquared()));
    }

    @Test
    void tooFewRealisationsAreRefusedWithTheNumberNeeded() {
        MeanVector mean = Draws.mean(new Draws(5).correlated(7, 5, 0.5));
        assertThatThrownBy(() -> HotellingTest.of(mean, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "a test of 5 bandpowers with their own covariance needs at least 8"
                                + " realisations, found 7");
        assertThat(HotellingTest.of(Draws.mean(new Draws(5).correlated(8, 5, 0.5)), 0).count())
                .isEqualTo(8);
    }

    @Test
    void elementsThatMoveTogetherAreRefused() {
        MeanVector mean =
                Draws.mean(new Draws(6).correlated(20, 2, 0.5))
                        .transform(new double[][] {{1, 0}, {0, 1}, {1, 1}});
        assertThatThrownBy(() -> HotellingTest.of(mean, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("the covariance of these 3 bandpowers is singular");
    }
}
