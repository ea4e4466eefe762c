package manyskies.filter;

import java.util.EnumMap;
import java.util.function.DoublePredicate;
import manyskies.field.ModeSpace;
import manyskies.field.SkyField;
import manyskies.spectrum.ModeSpectra;
import manyskies.spectrum.Spectrum;

/**
 * The isotropic inverse-variance filter of a beam-deconvolved sky.
 *
 * <p>Separate: X_bar_l = X_l / C_l^XX. Joint: (T_bar, E_bar) = C_l^-1 (T, E) with the 2 x 2 total
 * covariance; B alone. C_l is signal plus noise over squared beam, uK^2 sr; a field is zero outside
 * its multipoles, and where only one of T and E is kept the joint filter is that field's own. See
 * Okamoto and Hu 2003 (astro-ph/0301031) for the separate filter, Maniyar et al. 2021 (2101.12193)
 * for the joint one. Immutable; arrays are read only to others.
 */
public final class InverseVariance {
    private final EnumMap<SkyField, double[]> separate = new EnumMap<>(SkyField.class);
    private final double[] jointTt;
    private final double[] jointTe;
    private final double[] jointEe;

    private InverseVariance(ModeSpectra total, DoublePredicate keepT, DoublePredicate keepP) {
        separate.put(SkyField.T, inverse(total, Spectrum.TT, keepT));
        separate.put(SkyField.E, inverse(total, Spectrum.EE, keepP));
        separate.put(SkyField.B, inverse(total, Spectrum.BB, keepP));
        jointTt = separate.get(SkyField.T).clone();
        jointEe = separate.get(SkyField.E).clone();
        jointTe = new double[total.space().size()];
        double[] te = total.of(Spectrum.TE);
        for (int mode = 0; mode < jointTe.length; mode++) {
            invertTogether(mode, te[mode], total.space().multipole(mode));
        }
    }

    /**
     * The filter for given totals and kept multipoles |l|.
     *
     * @throws IllegalArgumentException if a total is not positive at a kept multipole, or TE^2
     *     exceeds TT EE there
     */
    public static InverseVariance of(
            ModeSpectra total, DoublePredicate keepT, DoublePredicate keepP) {
        return new InverseVariance(total, keepT, keepP);
    }

    private static double[] inverse(ModeSpectra total, Spectrum name, DoublePredicate keep) {
        ModeSpace space = total.space();
        double[] c = total.of(name);
        double[] out = new double[c.length];
        for (int mode = 0; mode < out.length; mode++) {
            double l = space.multipole(mode);
            if (l > 0 && keep.test(l)) {
                if (!(c[mode] > 0)) {
                    throw new IllegalArgumentException(
                            "total C_l^"
                                    + name
                                    + " is "
                                    + c[mode]
                                    + " at l = "
                                    + l
                                    + "; a filter needs a positive one: add noise or lower lmax");
                }
                out[mode] = 1 / c[mode];
            }
        }
        return out;
    }

    private void invertTogether(int mode, double te, double l) {
        double inverseTt = jointTt[mode];
        double inverseEe = jointEe[mode];
        if (inverseTt == 0 || inverseEe == 0) {
            return;
        }
        double decorrelation = 1 - te * te * inverseTt * inverseEe;
        if (!(decorrelation > 0)) {
            throw new IllegalArgumentException(
                    "total C_l^TE = "
                            + te
                            + " exceeds sqrt(TT EE) = "
                            + 1 / Math.sqrt(inverseTt * inverseEe)
                            + " at l = "
                            + l
                            + "; check the columns of the spectra");
        }
        jointTt[mode] = inverseTt / decorrelation;
        jointEe[mode] = inverseEe / decorrelation;
        jointTe[mode] = -te * inverseTt * inverseEe / decorrelation;
    }

    /** 1 / C_l^XX of a field alone, per mode; zero where the field is not kept. */
    public double[] separate(SkyField field) {
        return separate.get(field);
    }

    /** An element of the inverse of the joint covariance, per mode; null where it is zero. */
    public double[] joint(SkyField row, SkyField column) {
        if (row == SkyField.B || column == SkyField.B) {
            return row == column ? separate.get(SkyField.B) : null;
        }
        if (row != column) {
            return jointTe;
        }
        return row == SkyField.T ? jointTt : jointEe;
    }
}
