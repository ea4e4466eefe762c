package manyskies.sky;

/**
 * Degree 3: 4 by 4 coefficients.
 *
 * <p>Written out for all 4 by 4 coefficients: this is where lensing spends its time, and the
 * compiler keeps the weights in registers only if they are names.
 */
final class CubicKernel implements SplineKernel {
    private final double[] c;
    private final int stride;

    CubicKernel(double[] coefficients, int stride) {
        c = coefficients;
        this.stride = stride;
    }

    @Override
    public void evaluate(
            int corner, double tx, double ty, int pixel, double[] t, double[] q, double[] u) {
        double s = 1 - tx;
        double x0 = s * s * s / 6;
        double x1 = (4 + tx * tx * (3 * tx - 6)) / 6;
        double x2 = (4 + s * s * (3 * s - 6)) / 6;
        double x3 = tx * tx * tx / 6;
        double r = 1 - ty;
        double y0 = r * r * r / 6;
        double y1 = (4 + ty * ty * (3 * ty - 6)) / 6;
        double y2 = (4 + r * r * (3 * r - 6)) / 6;
        double y3 = ty * ty * ty / 6;
        double sumT = 0;
        double sumQ = 0;
        double sumU = 0;
        int k = corner;
        sumT =
                Math.fma(
                        y0,
                        Math.fma(
                                x3,
                                c[k + 9],
                                Math.fma(x2, c[k + 6], Math.fma(x1, c[k + 3], x0 * c[k]))),
                        sumT);
        sumQ =
                Math.fma(
                        y0,
                        Math.fma(
                                x3,
                                c[k + 10],
                                Math.fma(x2, c[k + 7], Math.fma(x1, c[k + 4], x0 * c[k + 1]))),
                        sumQ);
        sumU =
                Math.fma(
                        y0,
                        Math.fma(
                                x3,
                                c[k + 11],
                                Math.fma(x2, c[k + 8], Math.fma(x1, c[k + 5], x0 * c[k + 2]))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y1,
                        Math.fma(
                                x3,
                                c[k + 9],
                                Math.fma(x2, c[k + 6], Math.fma(x1, c[k + 3], x0 * c[k]))),
                        sumT);
        sumQ =
                Math.fma(
                        y1,
                        Math.fma(
                                x3,
                                c[k + 10],
                                Math.fma(x2, c[k + 7], Math.fma(x1, c[k + 4], x0 * c[k + 1]))),
                        sumQ);
        sumU =
                Math.fma(
                        y1,
                        Math.fma(
                                x3,
                                c[k + 11],
                                Math.fma(x2, c[k + 8], Math.fma(x1, c[k + 5], x0 * c[k + 2]))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y2,
                        Math.fma(
                                x3,
                                c[k + 9],
                                Math.fma(x2, c[k + 6], Math.fma(x1, c[k + 3], x0 * c[k]))),
                        sumT);
        sumQ =
                Math.fma(
                        y2,
                        Math.fma(
                                x3,
                                c[k + 10],
                                Math.fma(x2, c[k + 7], Math.fma(x1, c[k + 4], x0 * c[k + 1]))),
                        sumQ);
        sumU =
                Math.fma(
                        y2,
                        Math.fma(
                                x3,
                                c[k + 11],
                                Math.fma(x2, c[k + 8], Math.fma(x1, c[k + 5], x0 * c[k + 2]))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y3,
                        Math.fma(
                                x3,
                                c[k + 9],
                                Math.fma(x2, c[k + 6], Math.fma(x1, c[k + 3], x0 * c[k]))),
                        sumT);
        sumQ =
                Math.fma(
                        y3,
                        Math.fma(
                                x3,
                                c[k + 10],
                                Math.fma(x2, c[k + 7], Math.fma(x1, c[k + 4], x0 * c[k + 1]))),
                        sumQ);
        sumU =
                Math.fma(
                        y3,
                        Math.fma(
                                x3,
                                c[k + 11],
                                Math.fma(x2, c[k + 8], Math.fma(x1, c[k + 5], x0 * c[k + 2]))),
                        sumU);
        t[pixel] = sumT;
        q[pixel] = sumQ;
        u[pixel] = sumU;
    }
}
