package manyskies.figure;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class PaletteTest {
    /** Relative luminance of sRGB (IEC 61966-2-1), a road other than the one the colours came by. */
    private static double luminance(int colour) {
        return 0.2126 * linear(colour >> 16)
                + 0.7152 * linear(colour >> 8)
                + 0.0722 * linear(colour);
    }

    private static double linear(int channel) {
        double value = (channel & 255) / 255.0;
        return value <= 0.04045 ? value / 12.92 : Math.pow((value + 0.055) / 1.055, 2.4);
    }

    /** Blue against yellow: what red-green deficiency leaves of a hue. */
    private static double blueness(int colour) {
        return (colour & 255) - ((colour >> 16 & 255) + (colour >> 8 & 255)) / 2.0;
    }

    /** Ten steps apart, each colour is lighter than the one before. */
    private static void assertRises(Palette palette, double from, double to) {
        double last = -1;
        for (int step = 0; step <= 10; step++) {
            double now = luminance(palette.colour(from + step * (to - from) / 10));
            assertThat(now).as("step %d", step).isGreaterThan(last + 0.002);
            last = now;
        }
    }

    @Test
    void lightnessTellsTheOrder() {
        assertRises(Palette.SEQUENTIAL, 0, 1);
        assertRises(Palette.DIVERGING, 0, 0.5);
        assertRises(Palette.DIVERGING, 1, 0.5);
    }

    @Test
    void theMiddleOfTheDivergingOneIsNearlyWhiteAndItsEndsAreEquallyDark() {
        int middle = Palette.DIVERGING.colour(0.5);
        assertThat(Math.abs(blueness(middle))).isLessThan(3);
        assertThat(luminance(middle)).isGreaterThan(0.85);
        double low = luminance(Palette.DIVERGING.colour(0));
        double high = luminance(Palette.DIVERGING.colour(1));
        assertThat(Math.abs(low - high)).isLessThan(0.02);
    }

    @Test
    void signsDifferInBlueAgainstYellow() {
        for (double far : new double[] {0.1, 0.2, 0.3, 0.4, 0.5}) {
            assertThat(blueness(Palette.DIVERGING.colour(0.5 - far))).isGreaterThan(10);
            assertThat(blueness(Palette.DIVERGING.colour(0.5 + far))).isLessThan(-10);
        }
    }

    @Test
    void placesBeyondHaveTheEndsColours() {
        assertThat(Palette.SEQUENTIAL.colour(-3)).isEqualTo(Palette.SEQUENTIAL.colour(0));
        assertThat(Palette.SEQUENTIAL.colour(3)).isEqualTo(Palette.SEQUENTIAL.colour(1));
    }
}
