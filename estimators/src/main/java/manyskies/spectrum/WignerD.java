package manyskies.spectrum;

import java.util.Arrays;

/**
 * Reduced Wigner functions d^l_mn(beta) for one pair of orders and all l up to lmax, m &ge; |n|.
 *
 * <p>Upward recurrence in l, stable because the wanted solution grows or oscillates (Challinor and
 * Lewis 2005, astro-ph/0502425; Varshalovich et al. 1988, section 4.8.2):
 *
 * <p>l sqrt(((l+1)^2 - m^2)((l+1)^2 - n^2)) d^{l+1} = (2l+1) (l(l+1) cos beta - mn) d^l - (l+1)
 * sqrt((l^2 - m^2)(l^2 - n^2)) d^{l-1}
 *
 * <p>from d^m_mn = sqrt((2m)! / ((m+n)! (m-n)!)) cos^{m+n}(beta/2) sin^{m-n}(beta/2). The sign is
 * that of d^l_mn near +J_{m-n}((l + 1/2) beta) at small angles, so d^1_10 = +sin beta / sqrt 2.
 */
final class WignerD {
    private final int m;
    private final int n;
    private final int lmax;
    private final double first;
    private final double[] cosine; // d^{l+1} = (cosine[l] cos beta - constant[l]) d^l
    private final double[] constant;
    private final double[] before; //          - before[l] d^{l-1}

    private WignerD(int m, int n, int lmax) {
        this.m = m;
        this.n = n;
        this.lmax = lmax;
        first = Math.sqrt(binomial(2 * m, m - n));
        cosine = new double[lmax + 1];
        constant = new double[lmax + 1];
        before = new double[lmax + 1];
        for (int l = m; l < lmax; l++) {
            double up = root(l + 1);
            cosine[l] = (2 * l + 1) * (l + 1.0) / up;
            constant[l] = m * n == 0 ? 0 : (2 * l + 1) * (double) (m * n) / (l * up);
            before[l] = l == m ? 0 : (l + 1) * root(l) / (l * up);
        }
    }

    /** The functions of orders m and n, m &ge; |n|. */
    static WignerD of(int m, int n, int lmax) {
        if (m < Math.abs(n) || lmax < m) {
            throw new IllegalArgumentException(
                    "orders m = "
                            + m
                            + ", n = "
                            + n
                            + " to lmax = "
                            + lmax
                            + "; need |n| <= m"
                            + " <= lmax");
        }
        return new WignerD(m, n, lmax);
    }

    /** d^l_mn(beta) into an array for l = 0 .. lmax; zero below l = m. */
    void fill(double beta, double[] values) {
        double cosBeta = StrictMath.cos(beta);
        double start =
                first
                        * power(StrictMath.cos(beta / 2), m + n)
                        * power(StrictMath.sin(beta / 2), m - n);
        Arrays.fill(values, 0, m, 0);
        double previous = 0;
        double current = start;
        values[m] = start;
        for (int l = m; l < lmax; l++) {
            double next = (cosine[l] * cosBeta - constant[l]) * current - before[l] * previous;
            previous = current;
            current = next;
            values[l + 1] = next;
        }
    }

    private double root(int l) {
        double square = (double) l * l;
        return Math.sqrt((square - m * m) * (square - n * n));
    }

    private static double power(double x, int exponent) {
        double product = 1;
        for (int i = 0; i < exponent; i++) {
            product *= x;
        }
        return product;
    }

    private static double binomial(int n, int k) {
        double value = 1;
        for (int i = 1; i <= k; i++) {
            value = value * (n - k + i) / i; // whole at every step
        }
        return value;
    }
}
