package manyskies.random;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import manyskies.sky.ChiSquared;
import org.apache.commons.rng.core.source64.XoShiRo256PlusPlus;
import org.hipparchus.special.Erf;
import org.junit.jupiter.api.Test;

class GaussianRowsTest {
    /** False-alarm rate of each test of this class, shared by its comparisons (Bonferroni). */
    private static final double FALSE_ALARM = 1e-6;

    private static final int MANY = 200_000;
    private static final Address HERE = new Address(20261201, "data", 3);

    private static double[] row(Address address, String field, int ky, int count) {
        double[] out = new double[count];
        address.field(field).fill(ky, out, count);
        return out;
    }

    /** The authors' reference code started at 1, 2, 3, 4 (Blackman and Vigna 2021; from memory). */
    @Test
    void generatorGivesTheKnownAnswer() {
        var bits = new XoShiRo256PlusPlus(new long[] {1, 2, 3, 4});
        assertThat(List.of(bits.nextLong(), bits.nextLong(), bits.nextLong(), bits.nextLong()))
                .containsExactly(41943041L, 58720359L, 3588806011781223L, 3591011842654386L);
    }

    /** Second method: the step of the paper, written out. */
    @Test
    void generatorStepsAsPublished() {
        long[] s = {0x123456789abcdefL, -5, 77, Long.MIN_VALUE + 9};
        var bits = new XoShiRo256PlusPlus(s.clone());
        for (int i = 0; i < 1000; i++) {
            long expected = Long.rotateLeft(s[0] + s[3], 23) + s[0];
            long t = s[1] << 17;
            s[2] ^= s[0];
            s[3] ^= s[1];
            s[1] ^= s[2];
            s[0] ^= s[3];
            s[2] ^= t;
            s[3] = Long.rotateLeft(s[3], 45);
            assertThat(bits.nextLong()).isEqualTo(expected);
        }
    }

    /** SplitMix64 started at 1234567: the first outputs of its reference code (from memory). */
    @Test
    void mixGivesTheKnownAnswer() {
        long gamma = 0x9e3779b97f4a7c15L;
        assertThat(GaussianRows.mix(1234567 + gamma)).isEqualTo(6457827717110365317L);
        assertThat(GaussianRows.mix(1234567 + 2 * gamma)).isEqualTo(3203168211198807973L);
    }

    @Test
    void fewerNumbersAreAPrefixOfMore() {
        assertThat(row(HERE, "T", 5, 10)).isEqualTo(Arrays.copyOf(row(HERE, "T", 5, 99), 10));
    }

    @Test
    void negativeIndicesAreRefused() {
        assertThatThrownBy(() -> new Address(1, "data", -2))
                .hasMessage("realisations are counted from 0, found index -2 in set data");
    }

    private static Map<String, double[]> neighbours() {
        Map<String, double[]> rows = new LinkedHashMap<>();
        rows.put("here", row(HERE, "T", 4, MANY));
        rows.put("seed", row(new Address(20261202, "data", 3), "T", 4, MANY));
        rows.put("set", row(new Address(20261201, "datA", 3), "T", 4, MANY));
        rows.put("index", row(new Address(20261201, "data", 4), "T", 4, MANY));
        rows.put("field", row(HERE, "E", 4, MANY));
        rows.put("letter moved", row(new Address(20261201, "dataT", 3), "", 4, MANY));
        rows.put("next row", row(HERE, "T", 5, MANY));
        rows.put("mirrored row", row(HERE, "T", -4, MANY));
        return rows;
    }

    /** |r| sqrt(n) of two independent rows is normal for n this large. */
    private static double correlationTail(double[] a, double[] b) {
        double ab = 0;
        double aa = 0;
        double bb = 0;
        for (int i = 0; i < a.length; i++) {
            ab += a[i] * b[i];
            aa += a[i] * a[i];
            bb += b[i] * b[i];
        }
        return Erf.erfc(Math.abs(ab) / Math.sqrt(aa * bb) * Math.sqrt(a.length / 2.0));
    }

    @Test
    void neighbouringAddressesAreIndependent() {
        List<double[]> rows = List.copyOf(neighbours().values());
        int pairs = rows.size() * (rows.size() - 1) / 2;
        for (int i = 0; i < rows.size(); i++) {
            for (int j = 0; j < i; j++) {
                assertThat(correlationTail(rows.get(i), rows.get(j)))
                        .isGreaterThan(FALSE_ALARM / pairs);
            }
        }
    }

    /** Twin: five per cent of another row mixed in. */
    @Test
    void theCheckSeesFivePerCentOfAnotherRow() {
        double[] a = row(HERE, "T", 4, MANY);
        double[] b = row(HERE, "E", 4, MANY);
        for (int i = 0; i < MANY; i++) {
            b[i] += 0.05 * a[i];
        }
        assertThat(correlationTail(a, b)).isLessThan(FALSE_ALARM);
    }

    private static double worstMomentTail(double scale) {
        double[] x = row(HERE, "phi", -7, MANY);
        double square = 0;
        double sum = 0;
        double fourth = 0;
        for (double v : x) {
            double y = scale * v;
            sum += y;
            square += y * y;
            fourth += y * y * y * y;
        }
        double mean = Erf.erfc(Math.abs(sum) / Math.sqrt(2.0 * MANY));
        // Var y^4 = 105 - 9
        double kurtosis = Erf.erfc(Math.abs(fourth - 3.0 * MANY) / Math.sqrt(2 * 96.0 * MANY));
        return Math.min(mean, Math.min(kurtosis, ChiSquared.tail(square, MANY)));
    }

    @Test
    void momentsAreThoseOfTheNormalLaw() {
        assertThat(worstMomentTail(1)).isGreaterThan(FALSE_ALARM / 3);
    }

    @Test
    void theMomentsSeeTwoPerCent() {
        assertThat(worstMomentTail(1.02)).isLessThan(FALSE_ALARM / 3);
    }

    /** The largest distance between the distribution of the numbers and the normal law. */
    private static double distance(double scale) {
        double[] x = row(HERE, "B", 0, MANY);
        Arrays.sort(x);
        double worst = 0;
        for (int i = 0; i < MANY; i++) {
            double normal = 0.5 * Erf.erfc(-scale * x[i] / Math.sqrt(2));
            worst = Math.max(worst, Math.abs(normal - (i + 0.5) / MANY) + 0.5 / MANY);
        }
        return worst;
    }

    /** P(distance &gt; e) &le; 2 exp(-2 n e^2) for every n (Massart 1990). */
    private static final double BOUND = Math.sqrt(Math.log(2 / FALSE_ALARM) / (2.0 * MANY));

    @Test
    void numbersFollowTheNormalLaw() {
        assertThat(distance(1)).isLessThan(BOUND);
    }

    @Test
    void theLawSeesFivePerCent() {
        assertThat(distance(1.05)).isGreaterThan(BOUND);
    }
}
