package manyskies.quadratic;

import manyskies.field.Modes;
import manyskies.field.SkyField;
import manyskies.flat.FlatGrid;
import manyskies.spectrum.ModeSpectra;

/**
 * The second method: estimators, responses and noise as written-out double sums over the plane.
 *
 * <p>Formulas of Okamoto and Hu 2003 (astro-ph/0301031), table 1, in the conventions of our package
 * docs. Slow and obvious; shares no code with the estimators but the grid's geometry.
 */
public final class DirectSums {
    private final FlatGrid grid;
    private final ModeSpectra c;
    private final ModeSpectra total;
    private final double lmax;

    public DirectSums(FlatGrid grid, ModeSpectra c, ModeSpectra total, double lmax) {
        this.grid = grid;
        this.c = c;
        this.total = total;
        this.lmax = lmax;
    }

    /** A function of two modes. */
    private interface OfTwo {
        double at(int k1x, int k1y, int k2x, int k2y);
    }

    private double lx(int kx) {
        return kx * grid.stepX();
    }

    private double ly(int ky) {
        return ky * grid.stepY();
    }

    private int mode(int kx, int ky) {
        return kx >= 0 ? grid.mode(kx, ky) : grid.mode(-kx, -ky);
    }

    private boolean kept(int kx, int ky) {
        double l = Math.hypot(lx(kx), ly(ky));
        return l > 0 && l <= lmax;
    }

    private double spectrum(ModeSpectra s, char a, char b, int kx, int ky) {
        double[] found = s.of(field(a), field(b));
        return found == null ? 0 : found[mode(kx, ky)];
    }

    private static SkyField field(char name) {
        return SkyField.valueOf(String.valueOf(name));
    }

    /** The lever L.l, or for the curl l x L. */
    private double lever(boolean curl, int kx, int ky, int k1x, int k1y) {
        return curl ? lx(k1x) * ly(ky) - ly(k1y) * lx(kx) : lx(kx) * lx(k1x) + ly(ky) * ly(k1y);
    }

    private double f(String xy, boolean curl, int k1x, int k1y, int k2x, int k2y) {
        int kx = k1x + k2x;
        int ky = k1y + k2y;
        double first = lever(curl, kx, ky, k1x, k1y);
        double second = lever(curl, kx, ky, k2x, k2y);
        double phi12 = Math.atan2(ly(k1y), lx(k1x)) - Math.atan2(ly(k2y), lx(k2x));
        double cos = Math.cos(2 * phi12);
        double sin = Math.sin(2 * phi12);
        return switch (xy) {
            case "TT" ->
                    spectrum(c, 'T', 'T', k1x, k1y) * first
                            + spectrum(c, 'T', 'T', k2x, k2y) * second;
            case "TE" ->
                    spectrum(c, 'T', 'E', k1x, k1y) * cos * first
                            + spectrum(c, 'T', 'E', k2x, k2y) * second;
            case "TB" -> spectrum(c, 'T', 'E', k1x, k1y) * sin * first;
            case "EE" ->
                    (spectrum(c, 'E', 'E', k1x, k1y) * first
                                    + spectrum(c, 'E', 'E', k2x, k2y) * second)
                            * cos;
            case "EB" ->
                    (spectrum(c, 'E', 'E', k1x, k1y) * first
                                    + spectrum(c, 'B', 'B', k2x, k2y) * second)
                            * sin;
            default -> throw new IllegalArgumentException(xy);
        };
    }

    private double w(String xy, boolean curl, int k1x, int k1y, int k2x, int k2y) {
        double equal = xy.charAt(0) == xy.charAt(1) ? 0.5 : 1;
        return equal
                * f(xy, curl, k1x, k1y, k2x, k2y)
                / spectrum(total, xy.charAt(0), xy.charAt(0), k1x, k1y)
                / spectrum(total, xy.charAt(1), xy.charAt(1), k2x, k2y);
    }

    private interface Visit {
        void at(int k1x, int k1y, int k2x, int k2y);
    }

    private void sum(int kx, int ky, Visit visit) {
        int nx = grid.nx() / 2;
        int ny = grid.ny() / 2;
        for (int k1y = -ny + 1; k1y < ny; k1y++) {
            for (int k1x = -nx + 1; k1x < nx; k1x++) {
                int k2x = kx - k1x;
                int k2y = ky - k1y;
                if (Math.abs(k2x) < nx && Math.abs(k2y) < ny && kept(k1x, k1y) && kept(k2x, k2y)) {
                    visit.at(k1x, k1y, k2x, k2y);
                }
            }
        }
    }

    /** g_L = (1/A) sum w X_l1 Y_l2 as (re, im). */
    public double[] estimate(String xy, boolean curl, Modes x, Modes y, int kx, int ky) {
        double[] g = new double[2];
        sum(
                kx,
                ky,
                (k1x, k1y, k2x, k2y) -> {
                    double w = w(xy, curl, k1x, k1y, k2x, k2y) / grid.area();
                    double xr = x.re(mode(k1x, k1y));
                    double xi = (k1x < 0 ? -1 : 1) * x.im(mode(k1x, k1y));
                    double yr = y.re(mode(k2x, k2y));
                    double yi = (k2x < 0 ? -1 : 1) * y.im(mode(k2x, k2y));
                    g[0] += w * (xr * yr - xi * yi);
                    g[1] += w * (xr * yi + xi * yr);
                });
        return g;
    }

    /** R_L = (1/A) sum w f. */
    public double response(String xy, boolean curl, int kx, int ky) {
        return integral(
                kx,
                ky,
                (k1x, k1y, k2x, k2y) ->
                        w(xy, curl, k1x, k1y, k2x, k2y) * f(xy, curl, k1x, k1y, k2x, k2y));
    }

    /** The noise numerator N_L of two estimators on Gaussian skies of the given spectra. */
    public double noise(String a, String b, boolean curl, ModeSpectra truth, int kx, int ky) {
        return integral(
                kx,
                ky,
                (k1x, k1y, k2x, k2y) ->
                        w(a, curl, k1x, k1y, k2x, k2y)
                                * (w(b, curl, k1x, k1y, k2x, k2y)
                                                * pair(truth, a, b, 0, 0, k1x, k1y)
                                                * pair(truth, a, b, 1, 1, k2x, k2y)
                                        + w(b, curl, k2x, k2y, k1x, k1y)
                                                * pair(truth, a, b, 0, 1, k1x, k1y)
                                                * pair(truth, a, b, 1, 0, k2x, k2y)));
    }

    private double pair(ModeSpectra s, String a, String b, int i, int j, int kx, int ky) {
        return spectrum(s, a.charAt(i), b.charAt(j), kx, ky);
    }

    private double integral(int kx, int ky, OfTwo integrand) {
        double[] sum = new double[1];
        sum(kx, ky, (k1x, k1y, k2x, k2y) -> sum[0] += integrand.at(k1x, k1y, k2x, k2y));
        return sum[0] / grid.area();
    }
}
