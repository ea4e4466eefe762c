package manyskies.quadratic;

import manyskies.field.SpinMap;

/** The vector field v_x + i v_y of an estimator while its terms are being added up. */
final class VectorSum {
    private final double[] x;
    private final double[] y;

    VectorSum(int pixels) {
        x = new double[pixels];
        y = new double[pixels];
    }

    /** Adds V grad U of two scalars. */
    void addScalar(double factor, SpinMap plain, SpinMap gradient) {
        double[] v = plain.re();
        double[] gx = gradient.re();
        double[] gy = gradient.im();
        for (int pixel = 0; pixel < x.length; pixel++) {
            double fv = factor * v[pixel];
            x[pixel] += fv * gx[pixel];
            y[pixel] += fv * gy[pixel];
        }
    }

    /**
     * Adds Re[P_V^* grad P_U] = (P_V^* R - P_V Q^*) / 2, with the raised map R = (d_x + i d_y) P_U
     * and the lowered one Q = -(d_x - i d_y) P_U.
     */
    void addPolarised(double factor, SpinMap plain, SpinMap raised, SpinMap lowered) {
        double[] pr = plain.re();
        double[] pi = plain.im();
        double[] rr = raised.re();
        double[] ri = raised.im();
        double[] qr = lowered.re();
        double[] qi = lowered.im();
        double half = 0.5 * factor;
        for (int pixel = 0; pixel < x.length; pixel++) {
            double p = half * pr[pixel];
            double q = half * pi[pixel];
            x[pixel] += p * (rr[pixel] - qr[pixel]) + q * (ri[pixel] - qi[pixel]);
            y[pixel] += p * (ri[pixel] + qi[pixel]) - q * (rr[pixel] + qr[pixel]);
        }
    }

    SpinMap map() {
        return SpinMap.of(1, x, y);
    }
}
