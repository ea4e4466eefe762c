package manyskies.flat;

/**
 * The phases of a spin transform, i^s exp(i s phi_l), without trigonometric functions.
 *
 * <p>cos phi = l_x/|l| and sin phi = l_y/|l|; their powers follow by repeated multiplication. Kept
 * is the quarter plane kx, ky &ge; 0 within the limit, since phi turns into -phi with ky. Phases
 * are zero at l = 0 and on Nyquist rows and columns, where a spin has no direction. Immutable.
 */
final class SpinFactor {
    private final FlatGrid grid;
    private final boolean odd;
    private final double[][] phaseOfKy; // sign cos(s phi), sign sin(s phi), by kx

    private SpinFactor(FlatGrid grid, boolean odd, double[][] phaseOfKy) {
        this.grid = grid;
        this.odd = odd;
        this.phaseOfKy = phaseOfKy;
    }

    /** The phases of a spin above 0. */
    static SpinFactor of(FlatGrid grid, BandLimit band, int spin) {
        int sign = (spin & 2) == 0 ? 1 : -1; // i^s = sign for even s, sign i for odd s
        double[][] phases = new double[grid.ny() / 2 + 1][];
        for (int ky = 0; ky < phases.length; ky++) {
            double[] row = new double[2 * (band.last(ky) + 1)];
            for (int kx = 0; kx <= band.last(ky); kx++) {
                storePower(grid, grid.mode(kx, ky), spin, sign, row);
            }
            phases[ky] = row;
        }
        return new SpinFactor(grid, spin % 2 == 1, phases);
    }

    private static void storePower(FlatGrid grid, int mode, int spin, int sign, double[] row) {
        if (mode == 0 || grid.isNyquist(mode)) {
            return;
        }
        double cos = grid.lx(mode) / grid.multipole(mode);
        double sin = grid.ly(mode) / grid.multipole(mode);
        double re = sign;
        double im = 0;
        for (int power = 0; power < spin; power++) {
            double next = re * cos - im * sin;
            im = re * sin + im * cos;
            re = next;
        }
        int kx = mode % grid.columns();
        row[2 * kx] = re;
        row[2 * kx + 1] = im;
    }

    /**
     * One row of the half planes of the real and imaginary part of a spin map S: with C, D =
     * cos, sin(s phi),
     *
     * <pre>  re_l = i^s (g_l C - c_l D),    im_l = i^s (g_l D + c_l C)</pre>
     *
     * because S_l = i^s (g_l + i c_l) exp(i s phi_l) and re_l = (S_l + S_{-l}^*) / 2.
     *
     * @param curl null for zero
     * @param re written for the first columns
     */
    void raise(int row, int columns, double[] gradient, double[] curl, double[] re, double[] im) {
        double[] phase = phase(row);
        double flip = flip(row);
        int start = 2 * row * grid.columns();
        for (int i = 0; i < 2 * columns; i += 2) {
            double cos = phase[i];
            double sin = flip * phase[i + 1];
            double gRe = gradient[start + i];
            double gIm = gradient[start + i + 1];
            double cRe = curl == null ? 0 : curl[start + i];
            double cIm = curl == null ? 0 : curl[start + i + 1];
            double aRe = gRe * cos - cRe * sin;
            double aIm = gIm * cos - cIm * sin;
            double bRe = gRe * sin + cRe * cos;
            double bIm = gIm * sin + cIm * cos;
            re[i] = odd ? -aIm : aRe;
            re[i + 1] = odd ? aRe : aIm;
            im[i] = odd ? -bIm : bRe;
            im[i + 1] = odd ? bRe : bIm;
        }
    }

    /** The inverse of {@link #raise}: a row of both parts of a spin map to gradient and curl. */
    void lower(int row, int columns, double[] re, double[] im, double[] gradient, double[] curl) {
        double[] phase = phase(row);
        double flip = flip(row);
        int start = 2 * row * grid.columns();
        for (int i = 0; i < 2 * columns; i += 2) {
            double cos = phase[i];
            double sin = flip * phase[i + 1];
            double gRe = re[i] * cos + im[i] * sin;
            double gIm = re[i + 1] * cos + im[i + 1] * sin;
            double cRe = im[i] * cos - re[i] * sin;
            double cIm = im[i + 1] * cos - re[i + 1] * sin;
            gradient[start + i] = odd ? gIm : gRe; // (-i)^s is sign for even s, -sign i for odd s
            gradient[start + i + 1] = odd ? -gRe : gIm;
            curl[start + i] = odd ? cIm : cRe;
            curl[start + i + 1] = odd ? -cRe : cIm;
        }
    }

    private double[] phase(int row) {
        return phaseOfKy[Math.abs(grid.ky(row))];
    }

    private double flip(int row) {
        return grid.ky(row) < 0 ? -1 : 1;
    }
}
