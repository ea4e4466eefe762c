package manyskies.specification;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.ToDoubleFunction;
import java.util.regex.Pattern;

/**
 * Decimal numbers as people write them, and the way back from a double to such a number.
 *
 * <p>A written number is scaled to the code's unit in decimal arithmetic and rounded to a double
 * once. Every double of ordinary size is therefore the value of some short decimal in every unit,
 * and {@link #shortest} finds the shortest: what a file says is what is printed.
 */
final class Decimal {
    /** pi to 50 digits (DLMF 3.12.1), more than any product here is rounded to. */
    static final BigDecimal PI =
            new BigDecimal("3.1415926535897932384626433832795028841971693993751");

    /** Enough for every double to have a decimal of its own, with a margin for the scaling. */
    private static final int MOST_DIGITS = 20;

    private static final MathContext SCALING = new MathContext(50, RoundingMode.HALF_EVEN);
    private static final Pattern NUMBER =
            Pattern.compile("[+-]?(\\d{1,40}(\\.\\d{0,40})?|\\.\\d{1,40})([eE][+-]?\\d{1,3})?");

    private Decimal() {}

    /** The number a text states in decimal digits; none if it states something else. */
    static Optional<BigDecimal> parse(String text) {
        return NUMBER.matcher(text).matches()
                ? Optional.of(new BigDecimal(text))
                : Optional.empty();
    }

    /** The whole number of 64 bits a text states; none if it states something else. */
    static OptionalLong parseLong(String text) {
        try {
            return OptionalLong.of(Long.parseLong(text));
        } catch (NumberFormatException e) {
            return OptionalLong.empty();
        }
    }

    /** A written number times the size of its unit, rounded to a double once. */
    static double scaled(BigDecimal number, BigDecimal unit) {
        return number.multiply(unit, SCALING).doubleValue();
    }

    /** The shortest decimal whose value is the given double. */
    static String text(double value) {
        return shortest(value, BigDecimal.ONE);
    }

    /** The shortest decimal that, in the given unit, has the given double as its value. */
    static String shortest(double value, BigDecimal unit) {
        BigDecimal exact = new BigDecimal(value).divide(unit, SCALING);
        return shortest(exact, value, number -> scaled(number, unit));
    }

    private static String shortest(
            BigDecimal exact, double value, ToDoubleFunction<BigDecimal> read) {
        for (int digits = 1; digits <= MOST_DIGITS; digits++) {
            BigDecimal rounded = exact.round(new MathContext(digits, RoundingMode.HALF_EVEN));
            if (read.applyAsDouble(rounded) == value) {
                return plain(rounded);
            }
        }
        throw new IllegalArgumentException(value + " has no decimal of " + MOST_DIGITS + " digits");
    }

    /** Without an exponent from 1e-6 up to 1e15, as people write such numbers. */
    private static String plain(BigDecimal number) {
        BigDecimal stripped = number.stripTrailingZeros();
        int exponent = stripped.precision() - stripped.scale() - 1;
        return stripped.signum() == 0
                ? "0"
                : exponent >= -6 && exponent <= 15
                        ? stripped.toPlainString()
                        : stripped.toString().replace("E+", "e").replace('E', 'e');
    }
}
