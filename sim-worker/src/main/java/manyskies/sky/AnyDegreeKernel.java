package manyskies.sky;

/** Any odd degree, by recursion for the weights; for degree 7, and to check the faster ones. */
final class AnyDegreeKernel implements SplineKernel {
    private final double[] c;
    private final int stride;
    private final int degree;
    private final double[] wx;
    private final double[] wy;

    AnyDegreeKernel(double[] coefficients, int stride, int degree) {
        c = coefficients;
        this.stride = stride;
        this.degree = degree;
        wx = new double[degree + 1];
        wy = new double[degree + 1];
    }

    @Override
    public void evaluate(
            int corner, double tx, double ty, int pixel, double[] t, double[] q, double[] u) {
        BSpline.weights(degree, tx, wx);
        BSpline.weights(degree, ty, wy);
        double sumT = 0;
        double sumQ = 0;
        double sumU = 0;
        for (int j = 0, row = corner; j <= degree; j++, row += stride) {
            double rowT = 0;
            double rowQ = 0;
            double rowU = 0;
            for (int i = 0, k = row; i <= degree; i++, k += 3) {
                rowT = Math.fma(wx[i], c[k], rowT);
                rowQ = Math.fma(wx[i], c[k + 1], rowQ);
                rowU = Math.fma(wx[i], c[k + 2], rowU);
            }
            sumT = Math.fma(wy[j], rowT, sumT);
            sumQ = Math.fma(wy[j], rowQ, sumQ);
            sumU = Math.fma(wy[j], rowU, sumU);
        }
        t[pixel] = sumT;
        q[pixel] = sumQ;
        u[pixel] = sumU;
    }
}
