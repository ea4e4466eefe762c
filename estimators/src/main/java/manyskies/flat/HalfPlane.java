package manyskies.flat;

/** What makes a half plane of coefficients that of a real map. */
public final class HalfPlane {
    private HalfPlane() {}

    /**
     * Makes column kx = 0 that of a real map without mean: X(0, -ky) = X(0, ky)^*, X(0, 0) = 0.
     * What stood at negative ky is discarded.
     *
     * @param disc the modes that are not zero
     * @param modes interleaved coefficients, changed in place
     */
    public static void makeReal(ModeDisc disc, double[] modes) {
        FlatGrid grid = disc.grid();
        modes[0] = 0;
        modes[1] = 0;
        for (int ky = 1; ky <= disc.maxKy(); ky++) {
            int from = 2 * grid.mode(0, ky);
            int to = 2 * grid.mode(0, -ky);
            modes[to] = modes[from];
            modes[to + 1] = -modes[from + 1];
        }
    }
}
