package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BandsTest {
    private final Bands bands = Bands.between(10, 20, 50);

    @ParameterizedTest
    @CsvSource({
        "9.999, -1",
        "10, 0",
        "19.999, 0",
        "20, 1",
        "49.999, 1",
        "50, -1",
        "NaN, -1",
        "-3, -1"
    })
    void aBandHoldsItsLowerEdgeAndNotItsUpper(double l, int band) {
        assertThat(bands.bandOf(l)).isEqualTo(band);
    }

    @Test
    void edgesAreThoseGivenAndStay() {
        double[] edges = {10, 20, 50};
        Bands same = Bands.between(edges);
        edges[1] = 30;
        assertThat(same).isEqualTo(bands).hasSameHashCodeAs(bands);
        assertThat(same).isNotEqualTo(Bands.between(edges)).hasToString("bands [10.0, 20.0, 50.0]");
        assertThat(same.count()).isEqualTo(2);
        assertThat(same.lower(1)).isEqualTo(20);
        assertThat(same.upper(1)).isEqualTo(50);
    }

    @Test
    void refusalsShowTheEdges() {
        assertRefused("bands need two or more edges from 0 up, found [7.0]", 7);
        assertRefused("bands need two or more edges from 0 up, found [-1.0, 5.0]", -1, 5);
        assertRefused("bands need two or more edges from 0 up, found [NaN, 5.0]", Double.NaN, 5);
        assertRefused("band edges rise, but 5.0 follows 5.0", 1, 5, 5);
        assertRefused("band edges rise, but NaN follows 5.0", 1, 5, Double.NaN);
        assertRefused("band edges rise, but Infinity follows 5.0", 5, Double.POSITIVE_INFINITY);
    }

    private static void assertRefused(String message, double... edges) {
        assertThatThrownBy(() -> Bands.between(edges))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
    }
}
