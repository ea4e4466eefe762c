package manyskies.statistic;

import org.hipparchus.special.Beta;
import org.hipparchus.special.Gamma;

/**
 * Probabilities to exceed, computed as tails (never as one minus a sum), so that small ones keep
 * their digits.
 */
public final class TailProbability {
    private TailProbability() {}

    /**
     * P(F &gt; f) for Fisher's F with the given degrees of freedom: I_x(d2/2, d1/2), the regularised
     * incomplete beta function at x = d2 / (d2 + d1 f).
     *
     * @throws IllegalArgumentException if f is negative or a number of degrees is not positive
     */
    public static double ofF(double f, double d1, double d2) {
        requireTail(f, d1);
        requireTail(f, d2);
        return Beta.regularizedBeta(d2 / (d2 + d1 * f), d2 / 2, d1 / 2);
    }

    /**
     * P(X &gt; x) for chi-square with the given degrees of freedom: Q(d/2, x/2).
     *
     * @throws IllegalArgumentException if x is negative or the number of degrees not positive
     */
    public static double ofChiSquare(double x, double degrees) {
        requireTail(x, degrees);
        return Gamma.regularizedGammaQ(degrees / 2, x / 2);
    }

    private static void requireTail(double x, double degrees) {
        if (!(x >= 0) || !(degrees > 0)) {
            throw new IllegalArgumentException(
                    "a tail begins at 0 or above and has positive degrees of freedom; found "
                            + x
                            + " with "
                            + degrees);
        }
    }
}
