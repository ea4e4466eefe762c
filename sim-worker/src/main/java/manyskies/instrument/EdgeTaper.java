package manyskies.instrument;

import manyskies.flat.FlatGrid;
import manyskies.flat.StokesMaps;

/**
 * The window W(x, y) = w(x) w(y) that takes a patch smoothly to zero at its edges.
 *
 * <p>w(x) = 10 s^3 - 15 s^4 + 6 s^5, s = min(1, distance to the nearer edge / width): twice
 * continuously differentiable everywhere (common practice, no source). Distances are those of pixel
 * centres, which lie half a pixel inside the edge and further.
 */
public final class EdgeTaper {
    private final FlatGrid grid;
    private final double[] alongX;
    private final double[] alongY;

    private EdgeTaper(FlatGrid grid, double[] alongX, double[] alongY) {
        this.grid = grid;
        this.alongX = alongX;
        this.alongY = alongY;
    }

    /**
     * The taper of a width in radian.
     *
     * @throws IllegalArgumentException if the width is not positive, or above half a side
     */
    public static EdgeTaper of(FlatGrid grid, double width) {
        double half = Math.min(grid.nx(), grid.ny()) * grid.pixel() / 2;
        if (!(width > 0) || width > half) {
            throw new IllegalArgumentException(
                    "an edge taper is wider than 0 and at most half a side, "
                            + half
                            + " radian here; found "
                            + width);
        }
        return new EdgeTaper(
                grid,
                profile(grid.nx(), width / grid.pixel()),
                profile(grid.ny(), width / grid.pixel()));
    }

    private static double[] profile(int n, double width) {
        double[] w = new double[n];
        for (int i = 0; i < n; i++) {
            double s = Math.min(1, (Math.min(i, n - 1 - i) + 0.5) / width);
            w[i] = s * s * s * (10 + s * (6 * s - 15));
        }
        return w;
    }

    /** W at a pixel. */
    public double at(int x, int y) {
        return alongX[x] * alongY[y];
    }

    /** The mean of W^power over the patch, by which spectra of tapered maps are divided. */
    public double meanPower(int power) {
        return mean(alongX, power) * mean(alongY, power);
    }

    private static double mean(double[] profile, int power) {
        double sum = 0;
        for (double w : profile) {
            sum += StrictMath.pow(w, power);
        }
        return sum / profile.length;
    }

    /** Multiplies maps by W, in place. */
    void apply(StokesMaps maps) {
        for (int y = 0, pixel = 0; y < grid.ny(); y++) {
            for (int x = 0; x < grid.nx(); x++, pixel++) {
                double w = at(x, y);
                maps.t()[pixel] *= w;
                maps.q()[pixel] *= w;
                maps.u()[pixel] *= w;
            }
        }
    }
}
