package manyskies.spectrum;

import java.util.Arrays;

/** The unlensed spectrum, l = 0 .. lmax, between a field of spin s and one of spin t. */
final class SpinSpectrum {
    final int s;
    final int t;
    final double[] values;

    SpinSpectrum(int s, int t, double[] values) {
        this.s = s;
        this.t = t;
        this.values = values.clone();
    }

    /** Faded out by a cosine from a third of an lmax to that lmax. */
    SpinSpectrum fadedAt(int lmax) {
        return new SpinSpectrum(s, t, faded(values, lmax));
    }

    static double[] faded(double[] values, int lmax) {
        double[] low = Arrays.copyOf(values, Math.min(lmax + 1, values.length));
        int start = lmax / 3;
        for (int l = start; l < low.length; l++) {
            low[l] *= (1 + StrictMath.cos(Math.PI * (l - start) / (lmax - start))) / 2;
        }
        return low;
    }
}
