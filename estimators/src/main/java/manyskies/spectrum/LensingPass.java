package manyskies.spectrum;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Changes of spectra by lensing from one range of separations: sum over nodes of 2pi sin(beta)
 * window(beta) [xi_lensed - xi] d^l_st.
 *
 * <p>sigma^2(beta) = C_gl(0) - C_gl(beta), C_gl = sum_l (2l+1)/4pi l(l+1) C_l^phiphi d^l_11, C_gl,2
 * the same with d^l_1-1. Sums run over l, then over nodes, always in that order.
 */
final class LensingPass {
    private final double[] deflection;
    private final double leftOut;
    private final WignerSet wigner;
    private final int parallel;
    private final int crossed;
    private final List<LensingKernel> kernels = new ArrayList<>();

    /**
     * A pass with given deflection variances by l, (2l+1)/4pi l(l+1) C_l^phiphi, which may be
     * smoothed; their whole is the variance.
     */
    LensingPass(double[] deflection, double variance, List<SpinSpectrum> spectra) {
        this.deflection = deflection.clone();
        double sum = 0;
        for (double part : deflection) {
            sum += part;
        }
        leftOut = variance - sum;
        wigner = new WignerSet(deflection.length - 1);
        parallel = wigner.index(1, 1);
        crossed = wigner.index(1, -1);
        spectra.forEach(spectrum -> kernels.add(new LensingKernel(spectrum, wigner)));
    }

    /** Adds to the changes, one array per spectrum, no longer than the spectra. */
    void addChanges(GaussLegendre rule, DoubleUnaryOperator window, List<double[]> changes) {
        double[][] d = new double[wigner.size()][deflection.length];
        double[] damping = new double[deflection.length];
        for (int node = 0; node < rule.count(); node++) {
            double beta = rule.node(node);
            wigner.fill(beta, d);
            double sigma2 = sigma2(d[parallel]);
            double cgl2 = cgl2(d[crossed]);
            fillDamping(sigma2, damping);
            double measure = 2 * Math.PI * StrictMath.sin(beta) * rule.weight(node);
            measure *= window.applyAsDouble(beta);
            for (int k = 0; k < kernels.size(); k++) {
                double change = kernels.get(k).change(d, damping, sigma2, cgl2);
                kernels.get(k).addProjection(measure * change, d, changes.get(k));
            }
        }
    }

    private double sigma2(double[] d11) {
        double sum = leftOut;
        for (int l = 1; l < d11.length; l++) {
            sum += deflection[l] * (1 - d11[l]);
        }
        return sum;
    }

    private double cgl2(double[] d1m1) {
        double sum = 0;
        for (int l = 1; l < d1m1.length; l++) {
            sum += deflection[l] * d1m1[l];
        }
        return sum;
    }

    /** exp(-l(l+1) sigma^2/2) as a running product: neighbours have the ratio exp(-l sigma^2). */
    private static void fillDamping(double sigma2, double[] damping) {
        double step = StrictMath.exp(-sigma2);
        double ratio = 1;
        double value = 1;
        damping[0] = 1;
        for (int l = 1; l < damping.length; l++) {
            ratio *= step;
            value *= ratio;
            damping[l] = value;
        }
    }
}
