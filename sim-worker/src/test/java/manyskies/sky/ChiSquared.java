package manyskies.sky;

import org.hipparchus.special.Gamma;

/** The exact law of powers of Gaussian modes, for bounds. */
public final class ChiSquared {
    private ChiSquared() {}

    /** The two-sided tail of a sum of squares of this many unit normal numbers. */
    public static double tail(double sum, double degrees) {
        double below = Gamma.regularizedGammaP(degrees / 2, sum / 2, 1e-12, 1_000_000);
        double above = Gamma.regularizedGammaQ(degrees / 2, sum / 2, 1e-12, 1_000_000);
        return Math.min(1, 2 * Math.min(below, above));
    }
}
