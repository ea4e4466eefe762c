package manyskies.field;

import java.util.Arrays;
import java.util.function.IntPredicate;

/**
 * Some of the modes of a space, packed: what is kept of a reconstruction.
 *
 * <p>Modes keep their order. Equal to another subset with the same modes of an equal space.
 */
public final class ModeSubset implements ModeSpace {
    private final ModeSpace whole;
    private final int[] modes;

    private ModeSubset(ModeSpace whole, int[] modes) {
        this.whole = whole;
        this.modes = modes;
    }

    /** The modes of a space that are to be kept, in rising order. */
    public static ModeSubset of(ModeSpace whole, IntPredicate keep) {
        int[] all = new int[whole.size()];
        int kept = 0;
        for (int mode = 0; mode < all.length; mode++) {
            if (keep.test(mode)) {
                all[kept++] = mode;
            }
        }
        return new ModeSubset(whole, Arrays.copyOf(all, kept));
    }

    /**
     * The kept modes of a field.
     *
     * @throws IllegalArgumentException if the field lives in another space than this is a part of
     */
    public Modes pack(Modes field) {
        double[] one = new double[modes.length];
        Arrays.fill(one, 1);
        return pack(field, one);
    }

    /**
     * The kept modes of a field, each times a factor of its own.
     *
     * @param factor one per kept mode
     * @throws IllegalArgumentException if the field lives in another space than this is a part of,
     *     or there is not one factor per kept mode
     */
    public Modes pack(Modes field, double[] factor) {
        if (!field.space().equals(whole)) {
            throw new IllegalArgumentException(
                    "modes of " + field.space() + " are no modes of " + whole);
        }
        if (factor.length != modes.length) {
            throw new IllegalArgumentException(
                    "expected "
                            + modes.length
                            + " factors, one per kept mode, found "
                            + factor.length);
        }
        double[] in = field.values();
        double[] out = new double[2 * modes.length];
        for (int i = 0; i < modes.length; i++) {
            out[2 * i] = factor[i] * in[2 * modes[i]];
            out[2 * i + 1] = factor[i] * in[2 * modes[i] + 1];
        }
        return Modes.of(this, out);
    }

    /**
     * A packed field on the whole space again, zero at the modes that were not kept.
     *
     * @throws IllegalArgumentException if the field is not one of this subset
     */
    public Modes unpack(Modes packed) {
        if (!packed.space().equals(this)) {
            throw new IllegalArgumentException(
                    "modes of " + packed.space() + " are not of " + this);
        }
        double[] in = packed.values();
        double[] out = new double[2 * whole.size()];
        for (int i = 0; i < modes.length; i++) {
            out[2 * modes[i]] = in[2 * i];
            out[2 * modes[i] + 1] = in[2 * i + 1];
        }
        return Modes.of(whole, out);
    }

    /**
     * The kept values of a function given per mode of the whole space.
     *
     * @throws IllegalArgumentException if there is not one value per mode of the whole space
     */
    public double[] pack(double[] ofMode) {
        if (ofMode.length != whole.size()) {
            throw new IllegalArgumentException(
                    "expected "
                            + whole.size()
                            + " numbers, one per mode of the whole space, found "
                            + ofMode.length);
        }
        double[] out = new double[modes.length];
        Arrays.setAll(out, i -> ofMode[modes[i]]);
        return out;
    }

    @Override
    public int size() {
        return modes.length;
    }

    @Override
    public double multipole(int mode) {
        return whole.multipole(modes[mode]);
    }

    @Override
    public double fullSkyMultipole(int mode) {
        return whole.fullSkyMultipole(modes[mode]);
    }

    @Override
    public int multiplicity(int mode) {
        return whole.multiplicity(modes[mode]);
    }

    @Override
    public double area() {
        return whole.area();
    }

    @Override
    public boolean equals(Object other) {
        return this == other
                || (other instanceof ModeSubset subset
                        && whole.equals(subset.whole)
                        && Arrays.equals(modes, subset.modes));
    }

    @Override
    public int hashCode() {
        return 31 * whole.hashCode() + Arrays.hashCode(modes);
    }

    @Override
    public String toString() {
        return modes.length + " modes of " + whole;
    }
}
