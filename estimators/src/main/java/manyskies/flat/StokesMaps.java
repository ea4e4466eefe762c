package manyskies.flat;

/**
 * Maps of the Stokes parameters T, Q, U on a grid: ny rows of nx pixels, in uK.
 *
 * <p>(Q + iU)_l = (E_l + i B_l) exp(2 i phi_l). The arrays belong to this object and are read only
 * to others.
 *
 * @param grid the grid
 * @param t temperature
 * @param q Stokes Q
 * @param u Stokes U
 */
@SuppressWarnings("ArrayRecordComponent") // never compared; copies would cost as much as the work
public record StokesMaps(FlatGrid grid, double[] t, double[] q, double[] u) {

    /** Checks the lengths. */
    public StokesMaps {
        for (double[] map : new double[][] {t, q, u}) {
            if (map.length != grid.pixels()) {
                throw new IllegalArgumentException(
                        "a map has " + grid.pixels() + " pixels here, found " + map.length);
            }
        }
    }

    /** Maps of zeros. */
    public static StokesMaps zero(FlatGrid grid) {
        int n = grid.pixels();
        return new StokesMaps(grid, new double[n], new double[n], new double[n]);
    }
}
