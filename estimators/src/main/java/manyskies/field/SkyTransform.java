package manyskies.field;

/**
 * From modes to spin maps and back: the algebra in which every estimator is written.
 *
 * <p>For spin s &ge; 0 the map of a gradient part g and a curl part c is
 *
 * <pre>  S(x) = (1/A) sum_l i^s (g_l + i c_l) exp(i s phi_l) exp(i l.x)        (flat sky)</pre>
 *
 * so that {@code synthesise(1, l f, 0)} is the complex gradient d_x f + i d_y f, and {@code
 * synthesise(2, E, B)} is -(Q + iU). {@code analyse} is its inverse. A map of spin -s is the
 * complex conjugate of that of spin s up to the sign (-1)^s; callers conjugate.
 *
 * <p>An instance may hold scratch memory: one thread at a time. Its results depend on nothing but
 * the arguments.
 */
public interface SkyTransform {
    /** The space of modes that is read by {@code synthesise} and written by {@code analyse}. */
    ModeSpace space();

    /** Number of pixels of a map. */
    int pixels();

    /**
     * The map of spin s with the given parts.
     *
     * @param spin 0 or more
     * @param gradient modes of the gradient part; for spin 0 the field itself
     * @param curl modes of the curl part, or null for none (always null for spin 0)
     * @throws IllegalArgumentException if modes live in another space, or spin 0 has a curl part
     */
    SpinMap synthesise(int spin, Modes gradient, Modes curl);

    /**
     * The parts of a map; for spin 0 the gradient part is the field and the curl part null.
     *
     * @throws IllegalArgumentException if the map has another number of pixels
     */
    GradientCurl analyse(SpinMap map);

    /**
     * The factor by which the spin-raising derivative multiplies a mode of a map of this spin: |l|
     * on the flat sky, sqrt((l - s)(l + s + 1)) on the sphere. For the lowering derivative use
     * {@code slope(-spin, mode)}.
     */
    double slope(int spin, int mode);
}
