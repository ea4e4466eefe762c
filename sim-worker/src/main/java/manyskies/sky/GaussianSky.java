package manyskies.sky;

import java.util.Optional;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.HalfPlane;
import manyskies.flat.ModeDisc;
import manyskies.random.Address;
import manyskies.random.GaussianRows;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/**
 * Gaussian skies of given unlensed spectra: {@code <X_l Y_l'^*> = A delta_ll' C_l^XY}.
 *
 * <p>Modes of T, E, B, phi, psi with |l| up to a limit are the Cholesky factor of C_l, read at |l| -
 * 1/2, times unit normal numbers of the addresses' fields {@code phi}, {@code T}, {@code E}, {@code
 * B}, {@code psi}; l = 0 and everything beyond the limit is zero. phi depends on the lenses'
 * address only, so that one lens can stand before many CMBs; T and E follow it as their correlation
 * with phi demands.
 *
 * <p>The numbers of mode (kx, ky) are those at 2 kx and 2 kx + 1 of row ky (its real and imaginary
 * part); for kx = 0 those of ky &gt; 0 count, and -ky is the conjugate. So skies of one address on
 * grids of the same sides share their modes, whatever their pixels and limits.
 *
 * <p>Immutable; share freely.
 */
public final class GaussianSky {
    private final ModeDisc disc;
    private final SkyFactor factor;
    private final boolean hasCurl;
    private final double psiOfPhi; // amplitude of psi relative to that of phi

    private GaussianSky(ModeDisc disc, SkyFactor factor, boolean hasCurl, double psiOfPhi) {
        this.disc = disc;
        this.factor = factor;
        this.hasCurl = hasCurl;
        this.psiOfPhi = psiOfPhi;
    }

    /**
     * Skies on a grid, drawn up to the end of the table or just below the Nyquist multipole,
     * whichever is lower.
     *
     * @param curl C_L^psipsi as a fraction of C_L^phiphi, 0 for none
     * @throws IllegalArgumentException if the spectra are not positive semi-definite at some mode,
     *     or the fraction is negative
     */
    public static GaussianSky of(FlatGrid grid, Spectra unlensed, double curl) {
        return of(ModeDisc.of(grid, unlensed.lmax() + 0.5), unlensed, curl);
    }

    /** The same, drawn within a disc of modes. */
    public static GaussianSky of(ModeDisc disc, Spectra unlensed, double curl) {
        if (!(curl >= 0)) {
            throw new IllegalArgumentException(
                    "the curl fraction is a power relative to phi's, 0 or more; found " + curl);
        }
        return new GaussianSky(
                disc, SkyFactor.of(disc, unlensed), unlensed.has(Spectrum.BB), Math.sqrt(curl));
    }

    /** The modes that are drawn. */
    public ModeDisc disc() {
        return disc;
    }

    /** Draws a sky whose CMB and lenses have one address. */
    public UnlensedSky draw(Address address) {
        return draw(address, address);
    }

    /**
     * Draws a sky.
     *
     * @param cmb address of T, E and B
     * @param lenses address of phi and psi
     */
    public UnlensedSky draw(Address cmb, Address lenses) {
        FlatGrid grid = disc.grid();
        double[] t = new double[2 * grid.size()];
        double[] e = new double[2 * grid.size()];
        double[] phi = new double[2 * grid.size()];
        drawCorrelated(cmb, lenses.field("phi"), t, e, phi);
        return new UnlensedSky(
                Modes.of(grid, t),
                Modes.of(grid, e),
                single(hasCurl, cmb.field("B"), SkyFactor.BB, 1),
                Modes.of(grid, phi),
                single(psiOfPhi > 0, lenses.field("psi"), SkyFactor.PP, psiOfPhi));
    }

    private void drawCorrelated(
            Address cmb, GaussianRows ofPhi, double[] t, double[] e, double[] phi) {
        GaussianRows ofT = cmb.field("T");
        GaussianRows ofE = cmb.field("E");
        double[] rowP = row();
        double[] rowT = row();
        double[] rowE = row();
        double[] f = factor.values();
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            int count = 2 * (disc.last(ky) + 1);
            ofPhi.fill(ky, rowP, count);
            ofT.fill(ky, rowT, count);
            ofE.fill(ky, rowE, count);
            int to = 2 * disc.grid().mode(0, ky);
            int from = factor.start(ky);
            for (int i = 0; i < count; i++) {
                int at = from + SkyFactor.STRIDE * (i >> 1);
                double p = rowP[i];
                phi[to + i] = f[at + SkyFactor.PP] * p;
                t[to + i] = f[at + SkyFactor.TP] * p + f[at + SkyFactor.TT] * rowT[i];
                e[to + i] =
                        f[at + SkyFactor.EP] * p
                                + f[at + SkyFactor.ET] * rowT[i]
                                + f[at + SkyFactor.EE] * rowE[i];
            }
        }
        HalfPlane.makeReal(disc, phi);
        HalfPlane.makeReal(disc, t);
        HalfPlane.makeReal(disc, e);
    }

    private Optional<Modes> single(boolean present, GaussianRows rows, int column, double scale) {
        if (!present) {
            return Optional.empty();
        }
        double[] out = new double[2 * disc.grid().size()];
        double[] row = row();
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            int count = 2 * (disc.last(ky) + 1);
            rows.fill(ky, row, count);
            int to = 2 * disc.grid().mode(0, ky);
            int from = factor.start(ky) + column;
            for (int i = 0; i < count; i++) {
                double f = factor.values()[from + SkyFactor.STRIDE * (i >> 1)];
                out[to + i] = scale * f * row[i];
            }
        }
        HalfPlane.makeReal(disc, out);
        return Optional.of(Modes.of(disc.grid(), out));
    }

    private double[] row() {
        return new double[2 * (disc.last(0) + 1)];
    }
}
