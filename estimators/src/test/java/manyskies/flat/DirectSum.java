package manyskies.flat;

import manyskies.field.Modes;

/** The transforms of {@link FlatGrid} as plain sums over all modes and pixels: slow and obvious. */
final class DirectSum {
    private DirectSum() {}

    /** Re and im of S(x) = (1/A) sum_l i^s (g_l + i c_l) exp(i s phi_l) exp(i l.x). */
    static double[][] synthesise(FlatGrid grid, int spin, Modes g, Modes c, double limit) {
        double[][] map = new double[2][grid.pixels()];
        for (int ky = -grid.ny() / 2 + 1; ky <= grid.ny() / 2; ky++) {
            for (int kx = -grid.nx() / 2 + 1; kx <= grid.nx() / 2; kx++) {
                double lx = kx * grid.stepX();
                double ly = ky * grid.stepY();
                boolean nyquist = kx == grid.nx() / 2 || ky == grid.ny() / 2;
                boolean noDirection = nyquist || (kx == 0 && ky == 0);
                if (Math.hypot(lx, ly) > limit || (spin > 0 && noDirection)) {
                    continue;
                }
                double[] a = coefficient(grid, g, kx, ky);
                double[] b = coefficient(grid, c, kx, ky);
                double turn = spin * (Math.PI / 2 + Math.atan2(ly, lx));
                addWave(grid, map, kx, ky, turn, a[0] - b[1], a[1] + b[0]);
            }
        }
        return map;
    }

    private static void addWave(
            FlatGrid grid, double[][] map, int kx, int ky, double turn, double re, double im) {
        for (int y = 0; y < grid.ny(); y++) {
            for (int x = 0; x < grid.nx(); x++) {
                double angle = 2 * Math.PI * ((double) kx * x / grid.nx()) + turn;
                angle += 2 * Math.PI * ((double) ky * y / grid.ny());
                double cos = Math.cos(angle) / grid.area();
                double sin = Math.sin(angle) / grid.area();
                map[0][y * grid.nx() + x] += re * cos - im * sin;
                map[1][y * grid.nx() + x] += re * sin + im * cos;
            }
        }
    }

    /** X_l on the whole plane: X_{-l} is the conjugate of X_l. */
    static double[] coefficient(FlatGrid grid, Modes modes, int kx, int ky) {
        if (modes == null) {
            return new double[2];
        }
        int opposite = ky == grid.ny() / 2 ? ky : -ky;
        int mode = kx >= 0 ? grid.mode(kx, ky) : grid.mode(-kx, opposite);
        return new double[] {modes.re(mode), kx >= 0 ? modes.im(mode) : -modes.im(mode)};
    }

    /** X_l = d^2 sum_x X(x) exp(-i l.x). */
    static Modes analyse(FlatGrid grid, double[] map) {
        double[] out = new double[2 * grid.size()];
        double weight = grid.pixel() * grid.pixel();
        for (int mode = 0; mode < grid.size(); mode++) {
            for (int y = 0; y < grid.ny(); y++) {
                for (int x = 0; x < grid.nx(); x++) {
                    double angle = (grid.lx(mode) * x + grid.ly(mode) * y) * grid.pixel();
                    out[2 * mode] += weight * map[y * grid.nx() + x] * Math.cos(angle);
                    out[2 * mode + 1] -= weight * map[y * grid.nx() + x] * Math.sin(angle);
                }
            }
        }
        return Modes.of(grid, out);
    }
}
