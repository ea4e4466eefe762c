package manyskies.spectrum;

/**
 * The change that lensing makes to one correlation function, full sky, to second order in C_gl,2
 * and to all orders in sigma^2 (Challinor and Lewis 2005, astro-ph/0502425).
 *
 * <p>A field of spin s at one point and one of spin t at another, beta apart, have the correlation
 * xi(beta) = sum_l (2l+1)/4pi C_l d^l_st(beta). Lensing moves both points; with L = l(l+1), d^l_st
 * becomes
 *
 * <pre>
 * exp(-[2L - s^2 - t^2] sigma^2/4)
 *   { d_st [1 + C_gl,2^2 (L - s^2)(L - t^2)/16]
 *     + C_gl,2 [u+(s) u-(t) d_{s+1,t-1} + u-(s) u+(t) d_{s-1,t+1}]
 *     + C_gl,2^2/2 [v+(s) v-(t) d_{s+2,t-2} + v-(s) v+(t) d_{s-2,t+2}] }
 * </pre>
 *
 * <p>with u+-(s) = sqrt(L - s(s+-1))/2 and v+-(s) = u+-(s) u+-(s+-1): each power of C_gl,2 raises
 * the spin at one end and lowers it at the other. These are the paper's X_imn to leading order in
 * sigma^2 beside L sigma^2, for any pair of spins. Flat limit: the expansion of exp(-l^2 [sigma^2 +
 * cos(2 phi) C_gl,2]/2). What is left out is of relative order sigma^2 ~ 5e-7.
 */
final class LensingKernel {
    private static final int[] STEPS = {1, -1, 2, -2};

    private final double spinSquares;
    private final int[] function = new int[STEPS.length + 1];
    private final int sign;
    private final double[] plain; // weights of d_st at order 0,
    private final double[] second; // and at order 2,
    private final double[][] shifted = new double[STEPS.length][]; // and of the other four

    /** The kernel of one spectrum; it adds the functions it needs to the set. */
    LensingKernel(SpinSpectrum spectrum, WignerSet wigner) {
        int s = spectrum.s;
        int t = spectrum.t;
        int lmax = spectrum.values.length - 1;
        spinSquares = (double) s * s + t * t;
        function[0] = wigner.index(s, t);
        sign = WignerSet.sign(s, t);
        plain = new double[lmax + 1];
        second = new double[lmax + 1];
        for (int l = Math.max(Math.abs(s), Math.abs(t)); l <= lmax; l++) {
            double square = (double) l * (l + 1);
            plain[l] = sign * (2 * l + 1) / (4 * Math.PI) * spectrum.values[l];
            second[l] = plain[l] * (square - s * s) * (square - t * t) / 16;
        }
        for (int k = 0; k < STEPS.length; k++) {
            int up = s + STEPS[k];
            int down = t - STEPS[k];
            function[k + 1] = wigner.index(up, down);
            shifted[k] = new double[lmax + 1];
            double factor = sign * WignerSet.sign(up, down) / (double) Math.abs(STEPS[k]);
            for (int l = 0; l <= lmax; l++) {
                shifted[k][l] = factor * plain[l] * shift(l, s, STEPS[k]) * shift(l, t, -STEPS[k]);
            }
        }
    }

    /** u for a step of 1, v for a step of 2. */
    private static double shift(int l, int spin, int step) {
        int one = Integer.signum(step);
        double u = Math.sqrt(Math.max(0, (double) l * (l + 1) - spin * (spin + one))) / 2;
        return step == one ? u : u * shift(l, spin + one, one);
    }

    /**
     * Lensed minus unlensed correlation function at one separation.
     *
     * @param d the functions of the set there
     * @param damping exp(-l(l+1) sigma^2/2)
     */
    double change(double[][] d, double[] damping, double sigma2, double cgl2) {
        double common = StrictMath.exp(spinSquares * sigma2 / 4);
        double squared = cgl2 * cgl2;
        double[] d0 = d[function[0]];
        double[] d1 = d[function[1]];
        double[] d2 = d[function[2]];
        double[] d3 = d[function[3]];
        double[] d4 = d[function[4]];
        double sum = 0;
        for (int l = 0; l < plain.length; l++) {
            double unlensed = plain[l] * d0[l];
            double first = shifted[0][l] * d1[l] + shifted[1][l] * d2[l];
            double two = second[l] * d0[l] + shifted[2][l] * d3[l] + shifted[3][l] * d4[l];
            sum += common * damping[l] * (unlensed + cgl2 * first + squared * two) - unlensed;
        }
        return sum;
    }

    /** Adds factor times d^l_st to sums over nodes, one for each l. */
    void addProjection(double factor, double[][] d, double[] sums) {
        double signed = sign * factor;
        double[] d0 = d[function[0]];
        for (int l = 0; l < sums.length; l++) {
            sums[l] += signed * d0[l];
        }
    }
}
