package manyskies.sky;

import manyskies.flat.FlatGrid;
import manyskies.flat.StokesMaps;

/**
 * Spline coefficients of T, Q, U side by side, and their evaluation at displaced pixels.
 *
 * <p>Coefficients stand interleaved (T, Q, U of one pixel together) in ny + degree rows of nx +
 * degree pixels; the extra ones repeat the periodic sky, so that a stencil is never wrapped, only
 * its corner. Scratch memory of one thread.
 */
final class SplineMaps {
    private final FlatGrid grid;
    private final int degree;
    private final int stride; // numbers per row
    private final double[] values;
    private final SplineKernel kernel;

    private SplineMaps(FlatGrid grid, int degree) {
        this.grid = grid;
        this.degree = degree;
        stride = 3 * (grid.nx() + degree);
        values = new double[stride * (grid.ny() + degree)];
        kernel =
                switch (degree) {
                    case 3 -> new CubicKernel(values, stride);
                    case 5 -> new QuinticKernel(values, stride);
                    default -> new AnyDegreeKernel(values, stride, degree);
                };
    }

    /** Room for the coefficients of one sky. */
    static SplineMaps of(FlatGrid grid, int degree) {
        BSpline.requireKnown(degree);
        return new SplineMaps(grid, degree);
    }

    /** Takes the coefficients of three maps. */
    void load(StokesMaps coefficients) {
        int nx = grid.nx();
        double[] t = coefficients.t();
        double[] q = coefficients.q();
        double[] u = coefficients.u();
        for (int y = 0; y < grid.ny(); y++) {
            int to = y * stride;
            for (int from = y * nx; from < (y + 1) * nx; from++, to += 3) {
                values[to] = t[from];
                values[to + 1] = q[from];
                values[to + 2] = u[from];
            }
            System.arraycopy(values, y * stride, values, to, 3 * degree);
        }
        for (int y = 0; y < degree; y++) {
            int from = y % grid.ny() * stride;
            System.arraycopy(values, from, values, (grid.ny() + y) * stride, stride);
        }
    }

    /**
     * The splines at every pixel's place plus its displacement.
     *
     * @param dx displacement along x in pixels
     * @param dy displacement along y in pixels
     * @param out receives T, Q, U
     */
    void evaluate(double[] dx, double[] dy, StokesMaps out) {
        for (int y = 0; y < grid.ny(); y++) {
            evaluateRow(y, dx, dy, out);
        }
    }

    private void evaluateRow(int y, double[] dx, double[] dy, StokesMaps out) {
        int nx = grid.nx();
        int below = degree / 2;
        double[] t = out.t();
        double[] q = out.q();
        double[] u = out.u();
        for (int x = 0, pixel = y * nx; x < nx; x++, pixel++) {
            double px = x + dx[pixel];
            double py = y + dy[pixel];
            double floorX = Math.floor(px);
            double floorY = Math.floor(py);
            int column = wrap((int) floorX - below, nx);
            int row = wrap((int) floorY - below, grid.ny());
            kernel.evaluate(row * stride + 3 * column, px - floorX, py - floorY, pixel, t, q, u);
        }
    }

    private static int wrap(int at, int n) {
        return at >= 0 && at < n ? at : Math.floorMod(at, n);
    }
}
