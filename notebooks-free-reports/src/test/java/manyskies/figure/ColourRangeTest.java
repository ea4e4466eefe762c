package manyskies.figure;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ColourRangeTest {

    /** Exact: 1001 values -500 .. 500, of which 99.5 per cent are no larger than 498 in size. */
    @Test
    void theSymmetricRangeLeavesOutTheExtremes() {
        double[] values = new double[1001];
        Arrays.setAll(values, i -> i - 500);
        assertThat(ColourRange.symmetric(values))
                .isEqualTo(new ColourRange(Palette.DIVERGING, -498, 498));
        values[3] = 1e9;
        assertThat(ColourRange.symmetric(values).high()).isLessThan(501);
        assertThat(ColourRange.symmetric(values).colour(0))
                .isEqualTo(Palette.DIVERGING.colour(0.5));
    }

    @Test
    void theRisingRangeLeavesOutEquallyManyBelowAndAbove() {
        double[] values = new double[1001];
        Arrays.setAll(values, i -> i);
        ColourRange range = ColourRange.rising(values);
        assertThat(range.low() + range.high()).isEqualTo(1000);
        assertThat(range.low()).isBetween(1.0, 4.0);
    }

    @Test
    void equalValuesHaveARangeToo() {
        assertThat(ColourRange.symmetric(new double[] {0, 0}).high()).isEqualTo(1);
        assertThat(ColourRange.rising(new double[] {5, 5}).high()).isEqualTo(10);
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "312.44, 312",
        "-0.01234, -0.0123",
        "1.5, 1.5",
        "0.000321, 3.21e-4",
        "-2.5e-8, -2.5e-8",
        "99960, 1e5",
        "12345, 12300"
    })
    void numbersHaveThreeDigits(double value, String text) {
        assertThat(ColourRange.text(value)).isEqualTo(text);
    }
}
