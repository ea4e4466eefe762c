package manyskies.flat;

/**
 * The phases of a spin transform, cos(s phi_l) and sin(s phi_l), without trigonometric functions.
 *
 * <p>cos phi = l_x/|l| and sin phi = l_y/|l| are kept for the quarter plane kx, ky &ge; 0; phi
 * turns into -phi with the sign of ky. Powers follow by repeated multiplication. Both are zero at l
 * = 0 and on Nyquist rows and columns, where a spin has no direction.
 */
final class SpinFactor {
    private final FlatGrid grid;
    private final BandLimit band;
    private final double[] unit; // interleaved cos, sin of phi, rows ky = 0 .. ny/2

    private SpinFactor(FlatGrid grid, BandLimit band, double[] unit) {
        this.grid = grid;
        this.band = band;
        this.unit = unit;
    }

    static SpinFactor of(FlatGrid grid, BandLimit band) {
        double[] unit = new double[2 * (grid.ny() / 2 + 1) * grid.columns()];
        for (int mode = 1; mode < unit.length / 2; mode++) {
            if (!grid.isNyquist(mode)) {
                unit[2 * mode] = grid.lx(mode) / grid.multipole(mode);
                unit[2 * mode + 1] = grid.ly(mode) / grid.multipole(mode);
            }
        }
        return new SpinFactor(grid, band, unit);
    }

    /**
     * The half planes of the real and imaginary part of a spin map S: with C, D = cos, sin(s phi),
     *
     * <pre>  re_l = i^s (g_l C - c_l D),    im_l = i^s (g_l D + c_l C)</pre>
     *
     * because S_l = i^s (g_l + i c_l) exp(i s phi_l) and re_l = (S_l + S_{-l}^*) / 2. A null curl
     * counts as zero. Only modes within the limit are written.
     */
    void raise(int spin, double[] gradient, double[] curl, double[] re, double[] im) {
        double[] zero = curl == null ? ZERO : curl;
        int step = curl == null ? 0 : 1;
        double[] phase = new double[2];
        for (int row = 0; row < grid.ny(); row++) {
            double sign = grid.ky(row) < 0 ? -1 : 1;
            int quarter = 2 * Math.abs(grid.ky(row)) * grid.columns();
            int start = 2 * row * grid.columns();
            for (int i = 0; i <= 2 * band.last(row); i += 2) {
                power(spin, unit[quarter + i], sign * unit[quarter + i + 1], phase);
                double cos = phase[0];
                double sin = phase[1];
                int m = start + i;
                double gr = gradient[m];
                double gi = gradient[m + 1];
                double cr = zero[step * m];
                double ci = zero[step * (m + 1)];
                storeTimesI(spin, re, m, gr * cos - cr * sin, gi * cos - ci * sin);
                storeTimesI(spin, im, m, gr * sin + cr * cos, gi * sin + ci * cos);
            }
        }
    }

    /** The inverse of {@link #raise}: from the parts of a spin map to gradient and curl. */
    void lower(int spin, double[] re, double[] im, double[] gradient, double[] curl) {
        double[] phase = new double[2];
        int inverse = 3 * spin; // (-i)^s = i^(3 s)
        for (int row = 0; row < grid.ny(); row++) {
            double sign = grid.ky(row) < 0 ? -1 : 1;
            int quarter = 2 * Math.abs(grid.ky(row)) * grid.columns();
            int start = 2 * row * grid.columns();
            for (int i = 0; i <= 2 * band.last(row); i += 2) {
                power(spin, unit[quarter + i], sign * unit[quarter + i + 1], phase);
                double cos = phase[0];
                double sin = phase[1];
                int m = start + i;
                double a = re[m];
                double b = re[m + 1];
                double c = im[m];
                double d = im[m + 1];
                storeTimesI(inverse, gradient, m, a * cos + c * sin, b * cos + d * sin);
                storeTimesI(inverse, curl, m, c * cos - a * sin, d * cos - b * sin);
            }
        }
    }

    private static final double[] ZERO = new double[1];

    /** phase = (cos + i sin)^spin. */
    private static void power(int spin, double cos, double sin, double[] phase) {
        double a = cos;
        double b = sin;
        for (int power = 1; power < spin; power++) {
            double next = a * cos - b * sin;
            b = a * sin + b * cos;
            a = next;
        }
        phase[0] = a;
        phase[1] = b;
    }

    /** out_m = i^power (re + i im). */
    private static void storeTimesI(int power, double[] out, int m, double re, double im) {
        switch (power & 3) {
            case 0 -> {
                out[m] = re;
                out[m + 1] = im;
            }
            case 1 -> {
                out[m] = -im;
                out[m + 1] = re;
            }
            case 2 -> {
                out[m] = -re;
                out[m + 1] = -im;
            }
            default -> {
                out[m] = im;
                out[m + 1] = -re;
            }
        }
    }
}
