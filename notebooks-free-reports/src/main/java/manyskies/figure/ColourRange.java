package manyskies.figure;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;

/**
 * Which value has which colour: linear between two values that leave the few most extreme ones
 * beyond the ends, so that a single pixel does not pale all others.
 */
record ColourRange(Palette palette, double low, double high) {
    /** Share of the values within the range. */
    private static final double WITHIN = 0.995;

    /** -x to x, where 99.5 per cent of the values are no farther from zero than x. */
    static ColourRange symmetric(double[] values) {
        double[] sizes = Arrays.stream(values).map(Math::abs).sorted().toArray();
        double limit = sizes[(int) Math.rint(WITHIN * (sizes.length - 1))];
        double x = limit > 0 ? limit : positive(sizes[sizes.length - 1]);
        return new ColourRange(Palette.DIVERGING, -x, x);
    }

    /** Holds at least 99.5 per cent of the values, equally many lying below and above. */
    static ColourRange rising(double[] values) {
        double[] sorted = Arrays.stream(values).sorted().toArray();
        int outside = (int) ((1 - WITHIN) / 2 * (sorted.length - 1));
        double low = sorted[outside];
        double high = sorted[sorted.length - 1 - outside];
        return new ColourRange(
                Palette.SEQUENTIAL, low, high > low ? high : low + positive(Math.abs(low)));
    }

    /** An empty range has no colours: one where all values are equal gets some width. */
    private static double positive(double size) {
        return size > 0 ? size : 1;
    }

    int colour(double value) {
        return palette.colour((value - low) / (high - low));
    }

    /** The value at a place from 0 to 1 along the bar, with three digits. */
    String label(double place) {
        return text(place == 0.5 ? low / 2 + high / 2 : low + place * (high - low));
    }

    static String text(double value) {
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(3)).stripTrailingZeros();
        int exponent = rounded.precision() - rounded.scale() - 1;
        if (exponent >= -3 && exponent < 5) {
            return rounded.toPlainString();
        }
        return rounded.movePointLeft(exponent).toPlainString() + "e" + exponent;
    }
}
