package manyskies.flat;

/**
 * From a half plane of modes to a real map and back, on arrays: what lies under everything that
 * moves between modes and maps on the flat patch.
 *
 * <p>X(x) = (1/A) sum_l X_l exp(+i l.x); X_l = d^2 sum_x X(x) exp(-i l.x). Maps are ny rows of nx
 * pixels. An instance may hold scratch memory: one thread at a time.
 */
public interface MapTransform {
    /** The grid of both. */
    FlatGrid grid();

    /**
     * Modes to a map. The half plane must be zero outside the disc; it may be overwritten.
     *
     * @param modes interleaved coefficients
     * @param disc the modes that are not zero
     * @param map receives the map
     */
    void toMap(double[] modes, ModeDisc disc, double[] map);

    /**
     * A map to the modes of a disc; others are left as they are. The map may be overwritten.
     *
     * @param map the map
     * @param disc the modes that are wanted
     * @param modes receives them
     */
    void toModes(double[] map, ModeDisc disc, double[] modes);
}
