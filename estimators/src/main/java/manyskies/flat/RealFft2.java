package manyskies.flat;

import java.util.Arrays;
import org.jtransforms.fft.DoubleFFT_1D;
import org.visnow.jlargearrays.ConcurrencyUtils;

/**
 * The two-dimensional Fourier transform of a real map, within a band limit.
 *
 * <pre>  X_l = d^2 sum_x X(x) exp(-i l.x),    X(x) = (1/A) sum_l X_l exp(+i l.x)</pre>
 *
 * for |l| up to the limit: modes beyond it are not read by {@code inverse} and come out zero from
 * {@code forward}. Maps are ny rows of nx pixels; modes are the half plane of {@link FlatGrid},
 * interleaved. Of the self-conjugate columns kx = 0 and nx/2 the Hermitian part is what counts.
 *
 * <p>Two passes, rows as real transforms of length nx and columns as complex ones of length ny,
 * with {@link ColumnTiles} between them. Only columns within the limit are transformed; beyond it
 * nothing is moved either, since moving costs nearly as much as transforming.
 *
 * <p>Holds plans and scratch memory: one thread at a time.
 */
public final class RealFft2 {
    static {
        // before any plan: plans must not start threads of their own
        ConcurrencyUtils.setNumberOfThreads(1);
    }

    private final FlatGrid grid;
    private final BandLimit band;
    private final DoubleFFT_1D alongX;
    private final DoubleFFT_1D alongY;
    private final double forwardScale;
    private final double inverseScale;
    private final int columns; // those within the limit; nx/2 travels packed with 0
    private final int[] lastKyOfTile;
    private final ColumnTiles tiles;
    private final double[] row;
    private final double[] nyquist; // the column kx = nx/2

    private RealFft2(FlatGrid grid, BandLimit band) {
        this.grid = grid;
        this.band = band;
        alongX = new DoubleFFT_1D(grid.nx());
        alongY = new DoubleFFT_1D(grid.ny());
        forwardScale = grid.pixel() * grid.pixel();
        inverseScale = 1 / (grid.area() * unscaled(alongX, grid.nx()));
        columns = Math.min(band.lastColumn() + 1, grid.nx() / 2);
        tiles = newTiles();
        lastKyOfTile = new int[tiles.tiles()];
        Arrays.setAll(lastKyOfTile, tile -> band.lastKy(tile * ColumnTiles.WIDTH));
        row = new double[grid.nx()];
        nyquist = new double[2 * grid.ny()];
    }

    /**
     * The transform of a grid.
     *
     * @param bandLimit the largest |l|; infinity for all modes
     * @throws IllegalArgumentException if a side has a prime factor above 5 (the message names the
     *     nearest sides that have none), or the limit is not positive
     */
    public static RealFft2 of(FlatGrid grid, double bandLimit) {
        SmoothLength.require("nx", grid.nx());
        SmoothLength.require("ny", grid.ny());
        return new RealFft2(grid, BandLimit.of(grid, bandLimit));
    }

    /** What JTransforms' unscaled real inverse makes of X_0 = 1: 1 or 1/2, by length. */
    private static double unscaled(DoubleFFT_1D plan, int n) {
        double[] probe = new double[n];
        probe[0] = 1;
        plan.realInverse(probe, false);
        return probe[0];
    }

    /**
     * The map of given modes.
     *
     * @param modes read within the limit
     * @param map overwritten
     * @throws IllegalArgumentException if an array has another length than the grid asks for
     */
    public void inverse(double[] modes, double[] map) {
        requireLengths(map, modes);
        for (int y = 0; y < grid.ny(); y++) {
            int start = 2 * y * grid.columns();
            tiles.putRow(y, modes, start, 2 * storedColumns(y));
            boolean wanted = band.last(y) == grid.nx() / 2;
            nyquist[2 * y] = wanted ? modes[start + grid.nx()] : 0;
            nyquist[2 * y + 1] = wanted ? modes[start + grid.nx() + 1] : 0;
        }
        tilesToMap(tiles, map);
    }

    /**
     * The modes of a given map.
     *
     * @param map only read
     * @param modes overwritten, with zeros beyond the limit
     * @throws IllegalArgumentException if an array has another length than the grid asks for
     */
    public void forward(double[] map, double[] modes) {
        requireLengths(map, modes);
        mapToTiles(map, tiles);
        for (int y = 0; y < grid.ny(); y++) {
            int start = 2 * y * grid.columns();
            int end = start + 2 * grid.columns();
            int stored = start + 2 * storedColumns(y);
            tiles.getRow(y, modes, start, stored - start);
            Arrays.fill(modes, stored, end, 0.0);
            if (band.last(y) == grid.nx() / 2) {
                modes[end - 2] = nyquist[2 * y];
                modes[end - 1] = nyquist[2 * y + 1];
            }
        }
    }

    /** Scratch memory of the size of this transform. */
    ColumnTiles newTiles() {
        return new ColumnTiles(grid.ny(), columns);
    }

    /** Sets the column kx = nx/2 to zero, for those who fill tiles themselves. */
    void clearNyquist() {
        Arrays.fill(nyquist, 0.0);
    }

    /** How many columns of a row lie within the limit and in the tiles. */
    int storedColumns(int y) {
        return Math.min(band.last(y) + 1, grid.nx() / 2);
    }

    /** From modes within the limit to a map. */
    void tilesToMap(ColumnTiles from, double[] map) {
        for (int tile = 0; tile < from.tiles(); tile++) {
            from.tileToBatch(tile, lastKyOfTile[tile]);
            if (tile == 0) {
                SelfConjugate.pack(from.batch(), 0, nyquist, grid.ny());
            }
            for (int column = 0; column < width(tile); column++) {
                alongY.complexInverse(from.batch(), from.column(column), false);
            }
            from.batchToTile(tile, grid.ny(), inverseScale);
        }
        for (int y = 0; y < grid.ny(); y++) {
            int start = y * grid.nx();
            from.getRow(y, map, start, 2 * columns);
            Arrays.fill(map, start + 2 * columns, start + grid.nx(), 0.0);
            alongX.realInverse(
                    map, start, false); // takes X_{nx/2} where Im X_0 would be, as packed
        }
    }

    /** From a map to its modes within the limit. */
    void mapToTiles(double[] map, ColumnTiles to) {
        for (int y = 0; y < grid.ny(); y++) {
            System.arraycopy(map, y * grid.nx(), row, 0, grid.nx());
            alongX.realForward(row); // leaves X_{nx/2} where Im X_0 would be
            to.putRow(y, row, 0, 2 * columns);
        }
        for (int tile = 0; tile < to.tiles(); tile++) {
            to.tileToBatch(tile, grid.ny());
            for (int column = 0; column < width(tile); column++) {
                alongY.complexForward(to.batch(), to.column(column));
            }
            if (tile == 0) {
                SelfConjugate.unpack(to.batch(), 0, nyquist, grid.ny());
            }
            to.batchToTile(tile, lastKyOfTile[tile], forwardScale);
        }
        for (int i = 0; i < nyquist.length; i++) {
            nyquist[i] *= forwardScale;
        }
    }

    private int width(int tile) {
        return Math.min(ColumnTiles.WIDTH, columns - tile * ColumnTiles.WIDTH);
    }

    private void requireLengths(double[] map, double[] modes) {
        if (map.length != grid.pixels() || modes.length != 2 * grid.size()) {
            throw new IllegalArgumentException(
                    "this grid has "
                            + grid.pixels()
                            + " pixels and "
                            + 2 * grid.size()
                            + " numbers for its modes; found "
                            + map.length
                            + " and "
                            + modes.length);
        }
    }
}
