package manyskies.flat;

import manyskies.field.CmbModes;
import manyskies.field.Modes;

/**
 * Between the modes T, E, B and the maps T, Q, U: three transforms either way.
 *
 * <p>Q_l = E_l cos 2phi_l - B_l sin 2phi_l, U_l = E_l sin 2phi_l + B_l cos 2phi_l, with cos 2phi_l =
 * (l_x^2 - l_y^2) / l^2 and sin 2phi_l = 2 l_x l_y / l^2. Nyquist rows and columns, and the mode l =
 * 0 of E and B, are zero. Holds scratch memory: one thread at a time.
 */
public final class StokesTransform {
    private final ModeDisc disc;
    private final RealFft2 fft;

    private StokesTransform(ModeDisc disc) {
        this.disc = disc;
        fft = RealFft2.of(disc.grid(), disc.limit());
    }

    /**
     * The transform of the modes of a disc.
     *
     * @throws IllegalArgumentException if a side of the grid cannot be transformed
     */
    public static StokesTransform of(ModeDisc disc) {
        return new StokesTransform(disc);
    }

    /** Maps of the disc's modes; others are ignored. */
    public StokesMaps synthesise(CmbModes modes) {
        StokesMaps maps = StokesMaps.zero(disc.grid());
        double[] q = new double[2 * disc.grid().size()];
        double[] u = new double[q.length];
        rotate(modes.gradient().values(), modes.curl().values(), 1, q, u);
        fft.inverse(modes.temperature().values(), maps.t());
        fft.inverse(q, maps.q());
        fft.inverse(u, maps.u());
        return maps;
    }

    /** Modes of the disc; others are zero. */
    public CmbModes analyse(StokesMaps maps) {
        double[] t = new double[2 * disc.grid().size()];
        double[] q = new double[t.length];
        double[] u = new double[t.length];
        fft.forward(maps.t(), t);
        fft.forward(maps.q(), q);
        fft.forward(maps.u(), u);
        rotate(q, u, -1, q, u);
        return new CmbModes(
                Modes.of(disc.grid(), t), Modes.of(disc.grid(), q), Modes.of(disc.grid(), u));
    }

    /** (a + i b) exp(2 i sign phi) of a pair of real fields; in place if the arrays are the same. */
    private void rotate(double[] a, double[] b, int sign, double[] toA, double[] toB) {
        FlatGrid grid = disc.grid();
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            double ly = ky * grid.stepY();
            for (int kx = 0, at = 2 * grid.mode(0, ky); kx <= disc.last(ky); kx++, at += 2) {
                double lx = kx * grid.stepX();
                double inverse = kx == 0 && ky == 0 ? 0 : 1 / (lx * lx + ly * ly);
                double cos = (lx * lx - ly * ly) * inverse;
                double sin = sign * 2 * lx * ly * inverse;
                double aRe = a[at];
                double aIm = a[at + 1];
                toA[at] = cos * aRe - sin * b[at];
                toA[at + 1] = cos * aIm - sin * b[at + 1];
                toB[at] = sin * aRe + cos * b[at];
                toB[at + 1] = sin * aIm + cos * b[at + 1];
            }
        }
    }
}
