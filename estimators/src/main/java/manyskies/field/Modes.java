package manyskies.field;

/**
 * The modes of one real field: complex coefficients X_l, in units of the field times steradian.
 *
 * <p>Stored interleaved: real part of mode m at 2m, imaginary part at 2m + 1. The array belongs to
 * this object once handed over; whoever reads {@link #values()} must not write to it. (Copying
 * would cost as much as the work done on the modes.)
 */
public final class Modes {
    private final ModeSpace space;
    private final double[] values;

    private Modes(ModeSpace space, double[] values) {
        this.space = space;
        this.values = values;
    }

    /**
     * Takes over an array of interleaved coefficients.
     *
     * @throws IllegalArgumentException if the array is not twice as long as the space is large
     */
    public static Modes of(ModeSpace space, double[] values) {
        if (values.length != 2 * space.size()) {
            throw new IllegalArgumentException(
                    "modes need "
                            + 2 * space.size()
                            + " numbers on this space, found "
                            + values.length);
        }
        return new Modes(space, values);
    }

    /** The field that is zero everywhere. */
    public static Modes zero(ModeSpace space) {
        return new Modes(space, new double[2 * space.size()]);
    }

    /** The space these modes live in. */
    public ModeSpace space() {
        return space;
    }

    /** The interleaved coefficients themselves, to be read only. */
    public double[] values() {
        return values;
    }

    /** Real part of a mode. */
    public double re(int mode) {
        return values[2 * mode];
    }

    /** Imaginary part of a mode. */
    public double im(int mode) {
        return values[2 * mode + 1];
    }

    /**
     * These modes, each multiplied by its own real factor (a filter, a beam, a spectrum).
     *
     * @throws IllegalArgumentException if there is not one factor per mode
     */
    public Modes times(double[] factorOfMode) {
        if (factorOfMode.length != space.size()) {
            throw new IllegalArgumentException(
                    "expected " + space.size() + " factors, found " + factorOfMode.length);
        }
        double[] out = new double[values.length];
        for (int mode = 0; mode < factorOfMode.length; mode++) {
            out[2 * mode] = factorOfMode[mode] * values[2 * mode];
            out[2 * mode + 1] = factorOfMode[mode] * values[2 * mode + 1];
        }
        return new Modes(space, out);
    }

    /**
     * The sum a X + b Y of these modes X and others Y.
     *
     * @throws IllegalArgumentException if the other modes live in another space
     */
    public Modes combine(double a, Modes other, double b) {
        requireSameSpace(other);
        double[] out = new double[values.length];
        for (int i = 0; i < out.length; i++) {
            out[i] = a * values[i] + b * other.values[i];
        }
        return new Modes(space, out);
    }

    /** Re(X_l Y_l^*) of one mode. */
    public double realProduct(Modes other, int mode) {
        return values[2 * mode] * other.values[2 * mode]
                + values[2 * mode + 1] * other.values[2 * mode + 1];
    }

    /**
     * Checks that other modes may be combined with these.
     *
     * @throws IllegalArgumentException if they may not
     */
    public void requireSameSpace(Modes other) {
        if (space != other.space && !space.equals(other.space)) {
            throw new IllegalArgumentException(
                    "modes of " + space + " cannot be combined with modes of " + other.space);
        }
    }
}
