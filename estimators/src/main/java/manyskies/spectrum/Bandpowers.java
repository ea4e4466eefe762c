package manyskies.spectrum;

import manyskies.field.ModeSpace;
import manyskies.field.Modes;

/**
 * Bandpowers of two fields: their mode products averaged over annuli of |l|.
 *
 * <p>C_b = sum_l m_l Re(X_l Y_l^*) / (A sum_l m_l) over the modes of band b; m_l is 2 where a
 * stored mode also stands for its conjugate, else 1, so that each mode counts once.
 *
 * <p>In: modes in one space. Out: C_l (never D_l), one per band. Gaussian scatter: Var C_b =
 * (C_xy^2 + C_xx C_yy) / N_b. Immutable; share freely.
 */
public final class Bandpowers {
    private final ModeSpace space;
    private final int[] modes; // those that lie in some band, in rising order
    private final int[] bandOf; // band of each of these
    private final double[] weight; // multiplicity of each of these
    private final double[] modesInBand;
    private final double[] meanMultipole;

    private Bandpowers(ModeSpace space, Bands bands) {
        this.space = space;
        int[] band = new int[space.size()];
        int used = 0;
        for (int mode = 0; mode < band.length; mode++) {
            band[mode] = bands.bandOf(space.multipole(mode));
            used += band[mode] >= 0 ? 1 : 0;
        }
        modes = new int[used];
        bandOf = new int[used];
        weight = new double[used];
        modesInBand = new double[bands.count()];
        meanMultipole = new double[bands.count()];
        for (int mode = 0, i = 0; mode < band.length; mode++) {
            if (band[mode] >= 0) {
                modes[i] = mode;
                bandOf[i] = band[mode];
                weight[i] = space.multiplicity(mode);
                modesInBand[band[mode]] += weight[i];
                meanMultipole[band[mode]] += weight[i] * space.multipole(mode);
                i++;
            }
        }
        for (int b = 0; b < modesInBand.length; b++) {
            if (modesInBand[b] == 0) {
                throw new IllegalArgumentException(
                        "no mode of the patch lies in the band from "
                                + bands.lower(b)
                                + " to "
                                + bands.upper(b)
                                + "; widen it");
            }
            meanMultipole[b] /= modesInBand[b];
        }
    }

    /**
     * Bandpowers of the given bands for modes of a space.
     *
     * @throws IllegalArgumentException if a band holds no mode
     */
    public static Bandpowers of(ModeSpace space, Bands bands) {
        return new Bandpowers(space, bands);
    }

    /**
     * Bandpowers of x and y.
     *
     * @throws IllegalArgumentException if x or y lives in another space
     */
    public double[] average(Modes x, Modes y) {
        x.requireSameSpace(y);
        if (x.space() != space && !x.space().equals(space)) {
            throw new IllegalArgumentException(
                    "bandpowers of " + space + " cannot be taken of modes of " + x.space());
        }
        double[] power = new double[modesInBand.length];
        for (int i = 0; i < modes.length; i++) { // this order fixes the last bits
            power[bandOf[i]] += weight[i] * x.realProduct(y, modes[i]);
        }
        for (int band = 0; band < power.length; band++) {
            power[band] /= space.area() * modesInBand[band];
        }
        return power;
    }

    /**
     * The mean over each band of a function given per mode.
     *
     * @throws IllegalArgumentException if there is not one value per mode
     */
    public double[] mean(double[] ofMode) {
        if (ofMode.length != space.size()) {
            throw new IllegalArgumentException(
                    "expected "
                            + space.size()
                            + " numbers, one per mode of the space, found "
                            + ofMode.length);
        }
        double[] sum = new double[modesInBand.length];
        for (int i = 0; i < modes.length; i++) {
            sum[bandOf[i]] += weight[i] * ofMode[modes[i]];
        }
        for (int band = 0; band < sum.length; band++) {
            sum[band] /= modesInBand[band];
        }
        return sum;
    }

    /** Number of modes of the whole plane in each band, N_b. */
    public double[] modesInBand() {
        return modesInBand.clone();
    }

    /** Mean |l| of the modes of each band. */
    public double[] meanMultipole() {
        return meanMultipole.clone();
    }
}
