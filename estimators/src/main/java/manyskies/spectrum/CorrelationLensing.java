package manyskies.spectrum;

import java.util.ArrayList;
import java.util.List;

/**
 * Changes of spectra by lensing, from correlation functions in two passes.
 *
 * <p>Spectra are smooth in l, so at large separations the change of a correlation function is
 * smooth in beta and comes from low l. Near pass: 0 to {@link #ANGLE}, all l. Far pass: from there
 * to pi, l up to {@link #FAR_LMAX} with the spectra faded out before, a hundredth of the work; it
 * matters at l &lt; 30 (BB at l = 2 by 1 per cent). A cosine over the last quarter of the near range
 * joins the two; their weights add up to one.
 */
final class CorrelationLensing {
    private static final double ANGLE = Math.PI / 24; // join: below 2e-5 of TT, EE, BB for l < 3000
    private static final int FAR_LMAX = 700;
    private static final double SMALLEST_FAR = 0.75 * ANGLE;

    private final double[] deflection;
    private final List<SpinSpectrum> spectra = new ArrayList<>();

    /** Lensing by a potential with the spectrum C_l^phiphi, l = 0 .. lmax. */
    CorrelationLensing(double[] potential) {
        deflection = new double[potential.length];
        for (int l = 1; l < potential.length; l++) {
            deflection[l] = (2 * l + 1) / (4 * Math.PI) * l * (l + 1) * potential[l];
        }
    }

    /** Asks for the change of one more spectrum, l = 0 .. lmax, between spins s and t. */
    void add(int s, int t, double[] spectrum) {
        spectra.add(new SpinSpectrum(s, t, spectrum));
    }

    /** Mean square deflection, sum_l (2l+1)/4pi l(l+1) C_l^phiphi, rad^2. */
    double variance() {
        double sum = 0;
        for (double part : deflection) {
            sum += part;
        }
        return sum;
    }

    /** Lensed minus unlensed in the order of {@link #add}, for l = 0 .. a smaller lmax. */
    List<double[]> changes(int outputLmax) {
        List<double[]> changes = new ArrayList<>();
        spectra.forEach(spectrum -> changes.add(new double[outputLmax + 1]));
        new LensingPass(deflection, variance(), spectra)
                .addChanges(
                        rule(0, ANGLE, deflection.length + outputLmax),
                        beta -> 1 - farWindow(beta),
                        changes);
        List<double[]> far = new ArrayList<>();
        int farLmax = Math.min(FAR_LMAX, outputLmax);
        spectra.forEach(spectrum -> far.add(new double[farLmax + 1]));
        List<SpinSpectrum> low = spectra.stream().map(s -> s.fadedAt(FAR_LMAX)).toList();
        new LensingPass(SpinSpectrum.faded(deflection, FAR_LMAX), variance(), low)
                .addChanges(
                        rule(SMALLEST_FAR, Math.PI, 2 * FAR_LMAX),
                        CorrelationLensing::farWindow,
                        far);
        for (int k = 0; k < changes.size(); k++) {
            for (int l = 0; l <= farLmax; l++) {
                changes.get(k)[l] += far.get(k)[l];
            }
        }
        return changes;
    }

    /** Enough nodes for products of functions whose multipoles add up to the given sum. */
    private static GaussLegendre rule(double lower, double upper, int multipoles) {
        return GaussLegendre.on(lower, upper, 64 + (int) (0.4 * (upper - lower) * multipoles));
    }

    private static double farWindow(double beta) {
        double x = (beta - SMALLEST_FAR) / (ANGLE - SMALLEST_FAR);
        return x <= 0 ? 0 : x >= 1 ? 1 : (1 - StrictMath.cos(Math.PI * x)) / 2;
    }
}
