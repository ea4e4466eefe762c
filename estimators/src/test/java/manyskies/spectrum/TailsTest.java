package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class TailsTest {
    private static double[] table(IntToDoubleFunction f) {
        return IntStream.rangeClosed(0, 3000).mapToDouble(f).toArray();
    }

    @Test
    void anExponentialGoesOnAsItself() {
        double[] all = Tails.decaying(table(l -> 7 * Math.exp(-l / 400.0)), 5000);
        assertThat(all).hasSize(5001);
        assertThat(all[5000] / (7 * Math.exp(-12.5))).isCloseTo(1, within(1e-12));
    }

    @Test
    void aPowerLawGoesOnAsItself() {
        double[] all = Tails.powerLaw(table(l -> l == 0 ? 0 : Math.pow(l, -6.5)), 5000);
        assertThat(all[5000] / Math.pow(5000, -6.5)).isCloseTo(1, within(0.01));
    }

    /** A table that rises at its end must not explode. */
    @Test
    void nothingRisesAboveItsEnd() {
        assertThat(Tails.decaying(table(l -> l), 5000)[5000]).isEqualTo(3000);
        assertThat(Tails.powerLaw(table(l -> l), 5000)[5000]).isEqualTo(3000);
        assertThat(Tails.decaying(new double[3001], 5000)[4000]).isZero();
        assertThat(Tails.zero(table(l -> l), 5000)[4000]).isZero();
    }
}
