package manyskies.spectrum;

import java.util.List;

/**
 * Lensed-gradient spectra C^{T gradT}, C^{T gradE}, C^{E gradE}, C^{B gradB} (Lewis, Challinor and
 * Hanson 2011, 1101.2234): the response of a lensed field to one more mode of the potential,
 * averaged over all the others, and therefore the right spectra in the weights and in the response
 * of a quadratic estimator.
 *
 * <p>Definition, flat: let grad X be the gradient of the unlensed X taken where the light comes
 * from, at x + grad phi(x); its correlation with a lensed Y is &lt;(grad X)_l Y_l'^*&gt; = i l
 * C_l^{Y gradX} times A delta_ll'. Without lensing it is C_l^XY. The part of &lt;(grad E) B&gt;
 * across l, which also exists, is not among these.
 *
 * <p>Full sky: the gradient of T has spin 1, that of P = Q + iU has the spins 3 (raised) and 1
 * (lowered), with factors sqrt(l(l+1)), sqrt((l-2)(l+3)) and sqrt((l+2)(l-1)). The correlations of
 * these with T, P and P^* are lensed like any others ({@link LensingKernel}); turned back to
 * spectra and divided by their factors, the two spins are averaged, which is the part along l.
 *
 * <p>Out: the unlensed table with TT, TE, EE, BB standing for these spectra; PP, TP, EP stay. To
 * first order in C^PP: C_l^{T gradT} = C_l (1 - l^2 R) + int d^2l'/(2pi)^2 (l.l'/l^2) [l'.(l - l')]^2
 * C_l' C^PP_|l-l'|, R half the mean square deflection. Continuation and accuracy as in {@link
 * LensedSpectra}.
 */
public final class LensedGradientSpectra {
    private LensedGradientSpectra() {}

    /**
     * Lensed-gradient spectra.
     *
     * @throws IllegalArgumentException if the table ends below l = 100
     */
    public static Spectra of(Spectra unlensed) {
        CorrelationLensing lensing = LensedSpectra.lensing(unlensed);
        double[] tt = LensedSpectra.continued(unlensed, Spectrum.TT);
        double[] ee = LensedSpectra.continued(unlensed, Spectrum.EE);
        double[] bb = LensedSpectra.continued(unlensed, Spectrum.BB);
        double[] te = LensedSpectra.continued(unlensed, Spectrum.TE);
        double[] plus = LensedSpectra.sum(ee, bb, 1);
        double[] minus = LensedSpectra.sum(ee, bb, -1);
        lensing.add(1, 0, scaled(tt, 0));
        lensing.add(3, 2, scaled(plus, 2));
        lensing.add(1, 2, scaled(plus, -2));
        lensing.add(3, -2, scaled(minus, 2));
        lensing.add(1, -2, scaled(minus, -2));
        lensing.add(3, 0, scaled(te, 2));
        lensing.add(1, 0, scaled(te, -2));
        List<double[]> changes = lensing.changes(unlensed.lmax());
        return LensedSpectra.changed(
                unlensed,
                descaled(changes.get(0), 0),
                mean(descaled(changes.get(1), 2), descaled(changes.get(2), -2)),
                mean(descaled(changes.get(3), 2), descaled(changes.get(4), -2)),
                mean(descaled(changes.get(5), 2), descaled(changes.get(6), -2)));
    }

    /**
     * Factor of the gradient of a field of spin s that raises it (lowers it for s &lt; 0): sqrt((l -
     * s)(l + s + 1)); a spin of -2 raised to -1 is one of 2 lowered to 1.
     */
    private static double factor(int l, int spin) {
        return Math.sqrt(Math.max(0, (l - spin) * (l + spin + 1.0)));
    }

    private static double[] scaled(double[] spectrum, int spin) {
        double[] scaled = new double[spectrum.length];
        for (int l = 0; l < scaled.length; l++) {
            scaled[l] = spectrum[l] * factor(l, spin);
        }
        return scaled;
    }

    /** Zero where there is no such harmonic (spin 3 at l = 2). */
    private static double[] descaled(double[] change, int spin) {
        double[] descaled = new double[change.length];
        for (int l = 2; l < descaled.length; l++) {
            double factor = factor(l, spin);
            descaled[l] = factor == 0 ? 0 : change[l] / factor;
        }
        return descaled;
    }

    private static double[] mean(double[] x, double[] y) {
        double[] mean = LensedSpectra.sum(x, y, 1);
        for (int l = 0; l < mean.length; l++) {
            mean[l] /= 2;
        }
        return mean;
    }
}
