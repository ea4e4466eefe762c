package manyskies.sky;

import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/**
 * The Cholesky factor of the covariance of (phi, T, E) for every mode of a disc.
 *
 * <p>phi stands first, so that the phi of a sky depends on phi's numbers only; then T given phi, E
 * given both: phi = pp g_p; T = tp g_p + tt g_t; E = ep g_p + et g_t + ee g_e, and B = bb g_b. A
 * factor of sqrt(A/2) is included: real and imaginary part each carry half of the variance A C_l.
 *
 * <p>Covariances may be semi-definite (no E, full correlation): a pivot within rounding of zero is
 * zero, and so is its column.
 */
final class SkyFactor {
    static final int STRIDE = 7;
    static final int PP = 0;
    static final int TP = 1;
    static final int TT = 2;
    static final int EP = 3;
    static final int ET = 4;
    static final int EE = 5;
    static final int BB = 6;

    /** A pivot this far below zero, relative to its variance, is still rounding of the table. */
    private static final double ROUNDING = 1e-9;

    private final int[] firstOfRow; // by |ky|
    private final double[] values;

    private SkyFactor(ModeDisc disc) {
        firstOfRow = new int[disc.maxKy() + 1];
        int size = 0;
        for (int ky = 0; ky <= disc.maxKy(); ky++) {
            firstOfRow[ky] = size;
            size += STRIDE * (disc.last(ky) + 1);
        }
        values = new double[size];
    }

    /**
     * The factors of a disc of modes.
     *
     * @throws IllegalArgumentException if the spectra are not positive semi-definite at a mode
     */
    static SkyFactor of(ModeDisc disc, Spectra spectra) {
        FlatGrid grid = disc.grid();
        SkyFactor factor = new SkyFactor(disc);
        for (int ky = 0; ky <= disc.maxKy(); ky++) {
            for (int kx = 0; kx <= disc.last(ky); kx++) {
                double l = grid.fullSkyMultipole(grid.mode(kx, ky));
                factor.fill(factor.firstOfRow[ky] + STRIDE * kx, spectra, l, grid.area() / 2);
            }
        }
        return factor;
    }

    private void fill(int at, Spectra c, double l, double scale) {
        double tt = c.at(Spectrum.TT, l);
        double ee = c.at(Spectrum.EE, l);
        double te = c.at(Spectrum.TE, l);
        double tp = c.at(Spectrum.TP, l);
        double ep = c.at(Spectrum.EP, l);
        double pp = root(c.at(Spectrum.PP, l), c.at(Spectrum.PP, l), Spectrum.PP, l);
        double tOfP = ratio(tp, pp, tt * c.at(Spectrum.PP, l), Spectrum.TP, l);
        double eOfP = ratio(ep, pp, ee * c.at(Spectrum.PP, l), Spectrum.EP, l);
        double tOfT = root(tt - tOfP * tOfP, tt, Spectrum.TT, l);
        double eOfT = ratio(te - tOfP * eOfP, tOfT, tt * ee, Spectrum.TE, l);
        double eOfE = root(ee - eOfP * eOfP - eOfT * eOfT, ee, Spectrum.EE, l);
        double bOfB = root(c.at(Spectrum.BB, l), c.at(Spectrum.BB, l), Spectrum.BB, l);
        double norm = Math.sqrt(scale);
        values[at + PP] = norm * pp;
        values[at + TP] = norm * tOfP;
        values[at + TT] = norm * tOfT;
        values[at + EP] = norm * eOfP;
        values[at + ET] = norm * eOfT;
        values[at + EE] = norm * eOfE;
        values[at + BB] = norm * bOfB;
    }

    private static double root(double pivot, double variance, Spectrum name, double l) {
        if (pivot < -ROUNDING * Math.abs(variance)) {
            throw notPositive(name, l, "the variance left is " + pivot + " of " + variance);
        }
        return pivot <= ROUNDING * variance ? 0 : Math.sqrt(pivot);
    }

    /** covariance / pivot; where the pivot is zero, the covariance must be so within rounding. */
    private static double ratio(
            double covariance, double pivot, double variances, Spectrum name, double l) {
        if (pivot > 0) {
            return covariance / pivot;
        }
        if (covariance * covariance > ROUNDING * variances) {
            throw notPositive(name, l, covariance + " is left with a field of no variance");
        }
        return 0;
    }

    private static IllegalArgumentException notPositive(Spectrum name, double l, String found) {
        return new IllegalArgumentException(
                "C_l of (phi, T, E, B) is not positive semi-definite at l = "
                        + l
                        + ", found at "
                        + name
                        + ": "
                        + found
                        + "; check the columns of the spectra there");
    }

    /** Where the factors of mode (0, ky) start; those of (kx, ky) stand STRIDE kx further. */
    int start(int ky) {
        return firstOfRow[Math.abs(ky)];
    }

    /** All factors. */
    double[] values() {
        return values;
    }
}
