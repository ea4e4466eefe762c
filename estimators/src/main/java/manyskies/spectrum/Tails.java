package manyskies.spectrum;

import java.util.Arrays;

/**
 * Continues spectra above the end of a table, because lensing mixes multipoles.
 *
 * <p>T and E: exponential decay in l (the damping tail); potential: a power law in L. The rate of
 * decay is that between the means of the last two stretches of {@value #STRETCH} multipoles (about
 * one acoustic period; shorter for short tables), the slope that over the last one; neither rises.
 * TE is continued by zero: it is oscillating and by then negligible beside lensed TE. Results
 * within a few hundred multipoles of the end of the table rest on this; far below it does not
 * matter.
 */
final class Tails {
    private static final int STRETCH = 300;

    private Tails() {}

    /** Continued by zero. */
    static double[] zero(double[] table, int lmax) {
        return Arrays.copyOf(table, lmax + 1);
    }

    /** Continued by C_l = C_end exp(-k (l - end)). */
    static double[] decaying(double[] table, int lmax) {
        int end = table.length - 1;
        int stretch = Math.min(STRETCH, end / 8);
        double rate = Math.max(0, -logRatio(table, stretch) / stretch);
        double[] all = zero(table, lmax);
        for (int l = end + 1; l <= lmax; l++) {
            all[l] = table[end] * StrictMath.exp(-rate * (l - end));
        }
        return all;
    }

    /** Continued by C_L = C_end (L / end)^slope. */
    static double[] powerLaw(double[] table, int lmax) {
        int end = table.length - 1;
        int stretch = Math.min(STRETCH, end / 8);
        double step = StrictMath.log((double) end / (end - stretch));
        double ratio = table[end - stretch] > 0 ? table[end] / table[end - stretch] : 0;
        double slope = ratio > 0 ? Math.min(0, StrictMath.log(ratio) / step) : 0;
        double[] all = zero(table, lmax);
        for (int l = end + 1; l <= lmax; l++) {
            all[l] = table[end] * StrictMath.pow((double) l / end, slope);
        }
        return all;
    }

    /** ln of the mean of the last stretch over that of the one before; 0 if either is empty. */
    private static double logRatio(double[] table, int stretch) {
        double last = sum(table, table.length - stretch, table.length);
        double before = sum(table, table.length - 2 * stretch, table.length - stretch);
        return last > 0 && before > 0 ? StrictMath.log(last / before) : 0;
    }

    private static double sum(double[] table, int from, int to) {
        double sum = 0;
        for (int l = from; l < to; l++) {
            sum += table[l];
        }
        return sum;
    }
}
