package manyskies.spectrum;

import java.util.List;
import java.util.Map;

/**
 * Lensed CMB spectra from unlensed ones, by full-sky correlation functions (Challinor and Lewis
 * 2005, astro-ph/0502425).
 *
 * <p>In: unlensed TT, EE, BB, TE and the potential PP. Out: the same table with lensed TT, EE, BB,
 * TE for l = 2 .. lmax; PP, TP, EP as they were. EE +- BB are the spectra of spins (2, +-2), TE that
 * of (2, 0). The correlation of T and E with phi is not used: it changes lensed spectra by far less
 * than 1e-3.
 *
 * <p>Lensing mixes multipoles, so tables are continued to lmax + {@value #EXTRA} (see {@link Tails}).
 * Accuracy for a table to l = 6000: 1e-4 for l &lt; 3000; the last thousand multipoles lean on the
 * continuation. Single thread, the same bits on every host.
 */
public final class LensedSpectra {
    /** Multipoles added to the table; 1000 fewer change lensed BB at lmax - 1000 by 5e-4. */
    static final int EXTRA = 3000;

    private static final int SMALLEST_LMAX = 100;

    private LensedSpectra() {}

    /**
     * Lensed spectra.
     *
     * @throws IllegalArgumentException if the table ends below l = 100
     */
    public static Spectra of(Spectra unlensed) {
        CorrelationLensing lensing = lensing(unlensed);
        double[] tt = continued(unlensed, Spectrum.TT);
        double[] ee = continued(unlensed, Spectrum.EE);
        double[] bb = continued(unlensed, Spectrum.BB);
        double[] te = continued(unlensed, Spectrum.TE);
        lensing.add(0, 0, tt);
        lensing.add(2, 2, sum(ee, bb, 1));
        lensing.add(2, -2, sum(ee, bb, -1));
        lensing.add(2, 0, te);
        List<double[]> changes = lensing.changes(unlensed.lmax());
        return changed(unlensed, changes.get(0), changes.get(1), changes.get(2), changes.get(3));
    }

    /** Lensing by the potential of a table, continued. */
    static CorrelationLensing lensing(Spectra unlensed) {
        if (unlensed.lmax() < SMALLEST_LMAX) {
            throw new IllegalArgumentException(
                    "unlensed spectra end at l = "
                            + unlensed.lmax()
                            + "; lensing them needs l = "
                            + SMALLEST_LMAX
                            + " or more");
        }
        double[] potential = unlensed.values(Spectrum.PP);
        return new CorrelationLensing(Tails.powerLaw(potential, unlensed.lmax() + EXTRA));
    }

    /** A spectrum continued above its table. */
    static double[] continued(Spectra unlensed, Spectrum name) {
        double[] table = unlensed.values(name);
        int lmax = unlensed.lmax() + EXTRA;
        return name == Spectrum.TE ? Tails.zero(table, lmax) : Tails.decaying(table, lmax);
    }

    /** x + factor y. */
    static double[] sum(double[] x, double[] y, double factor) {
        double[] sum = new double[x.length];
        for (int l = 0; l < x.length; l++) {
            sum[l] = x[l] + factor * y[l];
        }
        return sum;
    }

    /** The table with changes of TT, EE + BB, EE - BB and TE; monopole and dipole stay. */
    static Spectra changed(
            Spectra unlensed, double[] tt, double[] plus, double[] minus, double[] te) {
        double[] ee = sum(plus, minus, 1);
        double[] bb = sum(plus, minus, -1);
        return unlensed.with(
                Map.of(
                        Spectrum.TT, added(unlensed.values(Spectrum.TT), tt, 1),
                        Spectrum.EE, added(unlensed.values(Spectrum.EE), ee, 0.5),
                        Spectrum.BB, added(unlensed.values(Spectrum.BB), bb, 0.5),
                        Spectrum.TE, added(unlensed.values(Spectrum.TE), te, 1)));
    }

    private static double[] added(double[] table, double[] change, double factor) {
        for (int l = 2; l < table.length; l++) {
            table[l] += factor * change[l];
        }
        return table;
    }
}
