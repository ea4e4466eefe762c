package manyskies.flat;

/**
 * The modes of a grid with |l| &le; limit, all below the Nyquist multipole, row by row.
 *
 * <p>Row ky holds the columns 0 .. {@code last(ky)}; rows run over |ky| &le; {@code maxKy()}. Loops
 * over a disc visit half as many modes as loops over the half plane, and need no test per mode.
 * Immutable.
 */
public final class ModeDisc {
    /** Far below one step of l, far above rounding. */
    private static final double BELOW = 1e-9;

    private final FlatGrid grid;
    private final double limit;
    private final int[] last; // by |ky|

    private ModeDisc(FlatGrid grid, double limit) {
        this.grid = grid;
        this.limit = limit;
        int rows = 0;
        while (rows < grid.ny() / 2 && grid.multipole(grid.mode(0, rows)) <= limit) {
            rows++;
        }
        last = new int[rows];
        for (int ky = 0; ky < rows; ky++) {
            int kx = 0;
            while (kx + 1 < grid.nx() / 2 && grid.multipole(grid.mode(kx + 1, ky)) <= limit) {
                kx++;
            }
            last[ky] = kx;
        }
    }

    /**
     * The disc of a radius; one beyond the Nyquist multipole ends just below it.
     *
     * @throws IllegalArgumentException if the limit is not a number of 0 or more
     */
    public static ModeDisc of(FlatGrid grid, double limit) {
        if (!(limit >= 0)) {
            throw new IllegalArgumentException(
                    "the limit of a disc of modes is a multipole of 0 or more, found " + limit);
        }
        return new ModeDisc(grid, Math.min(limit, grid.nyquist() * (1 - BELOW)));
    }

    /** The grid. */
    public FlatGrid grid() {
        return grid;
    }

    /** The radius: the one asked for, or just below the Nyquist multipole. */
    public double limit() {
        return limit;
    }

    /** The largest |ky|. */
    public int maxKy() {
        return last.length - 1;
    }

    /** The last column of a row of |ky| &le; maxKy. */
    public int last(int ky) {
        return last[Math.abs(ky)];
    }
}
