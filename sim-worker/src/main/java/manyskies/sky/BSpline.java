package manyskies.sky;

/**
 * Uniform B-splines of odd degree n: their Fourier response, and prefilters.
 *
 * <p>A spline on the pixels is sum_j c_j b(x - j); coefficients of a plane wave of phase w per pixel
 * are F(w) times its values. At a pixel's place plus delta the spline is then
 *
 * <pre>  sum_k F(w) B(w + 2 pi k) exp(i (w + 2 pi k) delta),   B(w) = (sin(w/2) / (w/2))^(n+1)</pre>
 *
 * so the images k != 0 carry phases exp(2 pi i k delta). Interpolation takes them at delta = 0. Here
 * delta is a Gaussian of known rms s per axis, and their mean is chi_k = exp(-(2 pi k s)^2 / 2), so
 *
 * <pre>  F(w) = 1 / sum_k B(w + 2 pi k) chi_k</pre>
 *
 * makes the mean response of every mode exact, and the error of its power second order in the
 * images. For s = 0 it is interpolation, for s &gt;&gt; 1 it is 1 / B(w). Derivation: ours; splines:
 * Unser 1999.
 */
final class BSpline {
    /** Images beyond this one are taken at delta = 0; they are below 1e-7 of the response. */
    private static final int IMAGES = 100;

    private BSpline() {}

    /** The Fourier response B(w) of the B-spline of a degree at phase w per pixel. */
    static double response(int degree, double w) {
        if (w == 0) {
            return 1;
        }
        double sinc = StrictMath.sin(w / 2) / (w / 2);
        double power = 1;
        for (int i = 0; i <= degree; i++) {
            power *= sinc;
        }
        return power;
    }

    /**
     * F(2 pi k / n) for k = 0 .. n/2.
     *
     * @param degree 3, 5 or 7
     * @param n pixels along the axis
     * @param rms of the displacement along the axis, in pixels
     * @throws IllegalArgumentException for another degree
     */
    static double[] prefilter(int degree, int n, double rms) {
        requireKnown(degree);
        double[] factor = new double[n / 2 + 1];
        for (int k = 0; k < factor.length; k++) {
            factor[k] = 1 / meanResponse(degree, 2 * Math.PI * k / n, rms);
        }
        return factor;
    }

    /** All images at delta = 0, in closed form, less what the displacement averages away. */
    private static double meanResponse(int degree, double w, double rms) {
        double sum = sampled(degree, w);
        for (int image = 1; image <= IMAGES; image++) {
            double phase = 2 * Math.PI * image * rms;
            double averagedAway = -StrictMath.expm1(-phase * phase / 2);
            double above = response(degree, w + 2 * Math.PI * image);
            double below = response(degree, w - 2 * Math.PI * image);
            sum -= averagedAway * (above + below);
        }
        return sum;
    }

    /** sum_k B(w + 2 pi k) = sum_j b(j) cos(j w), b(j) the B-spline at whole numbers. */
    private static double sampled(int degree, double w) {
        double[] atPixels = new double[degree + 1];
        weights(degree, 0, atPixels);
        double sum = 0;
        for (int j = 0; j < degree; j++) {
            sum += atPixels[j] * StrictMath.cos((j - degree / 2) * w);
        }
        return sum;
    }

    /** Checks a degree. */
    static void requireKnown(int degree) {
        if (degree != 3 && degree != 5 && degree != 7) {
            throw new IllegalArgumentException(
                    "splines that remap the sky have degree 3, 5 or 7, found " + degree);
        }
    }

    /**
     * The degree + 1 weights of the coefficients around a point, from the one (degree - 1)/2 pixels
     * below the pixel before it.
     *
     * @param t the point's distance from the pixel before it, 0 to 1
     */
    static void weights(int degree, double t, double[] into) {
        into[0] = 1;
        for (int k = 1; k <= degree; k++) { // recursion of Cox and de Boor for uniform knots
            into[k] = t * into[k - 1] / k;
            for (int j = k - 1; j > 0; j--) {
                into[j] = ((t + (k - j)) * into[j - 1] + (j + 1 - t) * into[j]) / k;
            }
            into[0] *= (1 - t) / k;
        }
    }
}
