package manyskies.specification;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers in sentences: four digits, without an exponent. */
final class Rounded {
    private static final MathContext FOUR_DIGITS = new MathContext(4);

    private Rounded() {}

    static String text(double value) {
        return new BigDecimal(value).round(FOUR_DIGITS).stripTrailingZeros().toPlainString();
    }
}
