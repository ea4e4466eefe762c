package manyskies.field;

/**
 * A map of spin s in real space: a complex number per pixel (a real one for spin 0).
 *
 * <p>Pixels in the order the transform defines; units are those of the field. As with {@link
 * Modes}, the arrays belong to the map and are read only to others. For spin 0 the imaginary part
 * is absent and {@link #im()} is an empty array.
 */
public final class SpinMap {
    private final int spin;
    private final double[] re;
    private final double[] im;

    private SpinMap(int spin, double[] re, double[] im) {
        this.spin = spin;
        this.re = re;
        this.im = im;
    }

    /** A real map of spin 0. */
    public static SpinMap scalar(double[] values) {
        return new SpinMap(0, values, new double[0]);
    }

    /**
     * A complex map of positive spin.
     *
     * @throws IllegalArgumentException if the spin is below 1 or the parts differ in length
     */
    public static SpinMap of(int spin, double[] re, double[] im) {
        if (spin < 1 || re.length != im.length) {
            throw new IllegalArgumentException(
                    "a complex map needs a spin above 0 and two parts of one length, found spin "
                            + spin
                            + " and lengths "
                            + re.length
                            + ", "
                            + im.length);
        }
        return new SpinMap(spin, re, im);
    }

    /** The spin, 0 or positive. */
    public int spin() {
        return spin;
    }

    /** Real parts, one per pixel. */
    public double[] re() {
        return re;
    }

    /** Imaginary parts, one per pixel; empty for spin 0. */
    public double[] im() {
        return im;
    }
}
