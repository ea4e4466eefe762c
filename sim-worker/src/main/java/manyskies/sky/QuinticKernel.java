package manyskies.sky;

/**
 * Degree 5: 6 by 6 coefficients.
 *
 * <p>Written out for all 6 by 6 coefficients: this is where lensing spends its time, and the
 * compiler keeps the weights in registers only if they are names.
 */
final class QuinticKernel implements SplineKernel {
    private final double[] c;
    private final int stride;

    QuinticKernel(double[] coefficients, int stride) {
        c = coefficients;
        this.stride = stride;
    }

    @Override
    public void evaluate(
            int corner, double tx, double ty, int pixel, double[] t, double[] q, double[] u) {
        double s = 1 - tx;
        double tx2 = tx * tx;
        double s2 = s * s;
        double x0 = s2 * s2 * s / 120;
        double x1 = (26 + tx * (-50 + tx * (20 + tx * (20 + tx * (-20 + 5 * tx))))) / 120;
        double x2 = (66 + tx * tx * (-60 + tx * tx * (30 - 10 * tx))) / 120;
        double x3 = (66 + s * s * (-60 + s * s * (30 - 10 * s))) / 120;
        double x4 = (26 + s * (-50 + s * (20 + s * (20 + s * (-20 + 5 * s))))) / 120;
        double x5 = tx2 * tx2 * tx / 120;
        double r = 1 - ty;
        double ty2 = ty * ty;
        double r2 = r * r;
        double y0 = r2 * r2 * r / 120;
        double y1 = (26 + ty * (-50 + ty * (20 + ty * (20 + ty * (-20 + 5 * ty))))) / 120;
        double y2 = (66 + ty * ty * (-60 + ty * ty * (30 - 10 * ty))) / 120;
        double y3 = (66 + r * r * (-60 + r * r * (30 - 10 * r))) / 120;
        double y4 = (26 + r * (-50 + r * (20 + r * (20 + r * (-20 + 5 * r))))) / 120;
        double y5 = ty2 * ty2 * ty / 120;
        double sumT = 0;
        double sumQ = 0;
        double sumU = 0;
        int k = corner;
        sumT =
                Math.fma(
                        y0,
                        Math.fma(
                                x5,
                                c[k + 15],
                                Math.fma(
                                        x4,
                                        c[k + 12],
                                        Math.fma(
                                                x3,
                                                c[k + 9],
                                                Math.fma(
                                                        x2,
                                                        c[k + 6],
                                                        Math.fma(x1, c[k + 3], x0 * c[k]))))),
                        sumT);
        sumQ =
                Math.fma(
                        y0,
                        Math.fma(
                                x5,
                                c[k + 16],
                                Math.fma(
                                        x4,
                                        c[k + 13],
                                        Math.fma(
                                                x3,
                                                c[k + 10],
                                                Math.fma(
                                                        x2,
                                                        c[k + 7],
                                                        Math.fma(x1, c[k + 4], x0 * c[k + 1]))))),
                        sumQ);
        sumU =
                Math.fma(
                        y0,
                        Math.fma(
                                x5,
                                c[k + 17],
                                Math.fma(
                                        x4,
                                        c[k + 14],
                                        Math.fma(
                                                x3,
                                                c[k + 11],
                                                Math.fma(
                                                        x2,
                                                        c[k + 8],
                                                        Math.fma(x1, c[k + 5], x0 * c[k + 2]))))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y1,
                        Math.fma(
                                x5,
                                c[k + 15],
                                Math.fma(
                                        x4,
                                        c[k + 12],
                                        Math.fma(
                                                x3,
                                                c[k + 9],
                                                Math.fma(
                                                        x2,
                                                        c[k + 6],
                                                        Math.fma(x1, c[k + 3], x0 * c[k]))))),
                        sumT);
        sumQ =
                Math.fma(
                        y1,
                        Math.fma(
                                x5,
                                c[k + 16],
                                Math.fma(
                                        x4,
                                        c[k + 13],
                                        Math.fma(
                                                x3,
                                                c[k + 10],
                                                Math.fma(
                                                        x2,
                                                        c[k + 7],
                                                        Math.fma(x1, c[k + 4], x0 * c[k + 1]))))),
                        sumQ);
        sumU =
                Math.fma(
                        y1,
                        Math.fma(
                                x5,
                                c[k + 17],
                                Math.fma(
                                        x4,
                                        c[k + 14],
                                        Math.fma(
                                                x3,
                                                c[k + 11],
                                                Math.fma(
                                                        x2,
                                                        c[k + 8],
                                                        Math.fma(x1, c[k + 5], x0 * c[k + 2]))))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y2,
                        Math.fma(
                                x5,
                                c[k + 15],
                                Math.fma(
                                        x4,
                                        c[k + 12],
                                        Math.fma(
                                                x3,
                                                c[k + 9],
                                                Math.fma(
                                                        x2,
                                                        c[k + 6],
                                                        Math.fma(x1, c[k + 3], x0 * c[k]))))),
                        sumT);
        sumQ =
                Math.fma(
                        y2,
                        Math.fma(
                                x5,
                                c[k + 16],
                                Math.fma(
                                        x4,
                                        c[k + 13],
                                        Math.fma(
                                                x3,
                                                c[k + 10],
                                                Math.fma(
                                                        x2,
                                                        c[k + 7],
                                                        Math.fma(x1, c[k + 4], x0 * c[k + 1]))))),
                        sumQ);
        sumU =
                Math.fma(
                        y2,
                        Math.fma(
                                x5,
                                c[k + 17],
                                Math.fma(
                                        x4,
                                        c[k + 14],
                                        Math.fma(
                                                x3,
                                                c[k + 11],
                                                Math.fma(
                                                        x2,
                                                        c[k + 8],
                                                        Math.fma(x1, c[k + 5], x0 * c[k + 2]))))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y3,
                        Math.fma(
                                x5,
                                c[k + 15],
                                Math.fma(
                                        x4,
                                        c[k + 12],
                                        Math.fma(
                                                x3,
                                                c[k + 9],
                                                Math.fma(
                                                        x2,
                                                        c[k + 6],
                                                        Math.fma(x1, c[k + 3], x0 * c[k]))))),
                        sumT);
        sumQ =
                Math.fma(
                        y3,
                        Math.fma(
                                x5,
                                c[k + 16],
                                Math.fma(
                                        x4,
                                        c[k + 13],
                                        Math.fma(
                                                x3,
                                                c[k + 10],
                                                Math.fma(
                                                        x2,
                                                        c[k + 7],
                                                        Math.fma(x1, c[k + 4], x0 * c[k + 1]))))),
                        sumQ);
        sumU =
                Math.fma(
                        y3,
                        Math.fma(
                                x5,
                                c[k + 17],
                                Math.fma(
                                        x4,
                                        c[k + 14],
                                        Math.fma(
                                                x3,
                                                c[k + 11],
                                                Math.fma(
                                                        x2,
                                                        c[k + 8],
                                                        Math.fma(x1, c[k + 5], x0 * c[k + 2]))))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y4,
                        Math.fma(
                                x5,
                                c[k + 15],
                                Math.fma(
                                        x4,
                                        c[k + 12],
                                        Math.fma(
                                                x3,
                                                c[k + 9],
                                                Math.fma(
                                                        x2,
                                                        c[k + 6],
                                                        Math.fma(x1, c[k + 3], x0 * c[k]))))),
                        sumT);
        sumQ =
                Math.fma(
                        y4,
                        Math.fma(
                                x5,
                                c[k + 16],
                                Math.fma(
                                        x4,
                                        c[k + 13],
                                        Math.fma(
                                                x3,
                                                c[k + 10],
                                                Math.fma(
                                                        x2,
                                                        c[k + 7],
                                                        Math.fma(x1, c[k + 4], x0 * c[k + 1]))))),
                        sumQ);
        sumU =
                Math.fma(
                        y4,
                        Math.fma(
                                x5,
                                c[k + 17],
                                Math.fma(
                                        x4,
                                        c[k + 14],
                                        Math.fma(
                                                x3,
                                                c[k + 11],
                                                Math.fma(
                                                        x2,
                                                        c[k + 8],
                                                        Math.fma(x1, c[k + 5], x0 * c[k + 2]))))),
                        sumU);
        k += stride;
        sumT =
                Math.fma(
                        y5,
                        Math.fma(
                                x5,
                                c[k + 15],
                                Math.fma(
                                        x4,
                                        c[k + 12],
                                        Math.fma(
                                                x3,
                                                c[k + 9],
                                                Math.fma(
                                                        x2,
                                                        c[k + 6],
                                                        Math.fma(x1, c[k + 3], x0 * c[k]))))),
                        sumT);
        sumQ =
                Math.fma(
                        y5,
                        Math.fma(
                                x5,
                                c[k + 16],
                                Math.fma(
                                        x4,
                                        c[k + 13],
                                        Math.fma(
                                                x3,
                                                c[k + 10],
                                                Math.fma(
                                                        x2,
                                                        c[k + 7],
                                                        Math.fma(x1, c[k + 4], x0 * c[k + 1]))))),
                        sumQ);
        sumU =
                Math.fma(
                        y5,
                        Math.fma(
                                x5,
                                c[k + 17],
                                Math.fma(
                                        x4,
                                        c[k + 14],
                                        Math.fma(
                                                x3,
                                                c[k + 11],
                                                Math.fma(
                                                        x2,
                                                        c[k + 8],
                                                        Math.fma(x1, c[k + 5], x0 * c[k + 2]))))),
                        sumU);
        t[pixel] = sumT;
        q[pixel] = sumQ;
        u[pixel] = sumU;
    }
}
