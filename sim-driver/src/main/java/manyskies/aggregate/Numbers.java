package manyskies.aggregate;

import com.fasterxml.jackson.core.io.NumberOutput;

/**
 * Numbers as text with all their digits: the shortest decimal that reads back as the same bits.
 *
 * <p>{@code Double.toString} does so from Java 19 on only and may write a digit more before, so that
 * equal tables would differ between Java versions; the library's own conversion does not.
 */
final class Numbers {
    private Numbers() {}

    static String text(double value) {
        return NumberOutput.toString(value, true);
    }
}
