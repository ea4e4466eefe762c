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
 * <p>Rows are real transforms of length nx, columns complex ones of length ny. Only columns within
 * the limit are transformed. Columns travel {@value #BATCH} at a time through a contiguous buffer,
 * and rows and columns of the scratch memory are padded, because strides of a power of two would
 * make all of them compete for the same few cache lines.
 *
 * <p>Holds plans and scratch memory: one thread at a time.
 */
public final class RealFft2 {
    /** Columns gathered at once: two cache lines of a row. */
    private static final int BATCH = 8;

    /** Doubles by which a stride is lengthened: one cache line. */
    private static final int PADDING = 8;

    static {
        // before any plan: plans must not start threads of their own
        ConcurrencyUtils.setNumberOfThreads(1);
    }

    private final FlatGrid grid;
    private final BandLimit band;
    private final DoubleFFT_1D alongX;
    private final DoubleFFT_1D alongY;
    private final double inverseScale;
    private final int columns; // those within the limit
    private final double[] rows; // transformed along x only
    private final int rowStride;
    private final double[] batch;
    private final int batchStride;

    private RealFft2(FlatGrid grid, BandLimit band) {
        this.grid = grid;
        this.band = band;
        alongX = new DoubleFFT_1D(grid.nx());
        alongY = new DoubleFFT_1D(grid.ny());
        inverseScale = 1 / (grid.area() * unscaled(alongX, grid.nx()));
        columns = band.lastColumn() + 1;
        rowStride = 2 * columns + PADDING;
        rows = new double[grid.ny() * rowStride];
        batchStride = 2 * grid.ny() + PADDING;
        batch = new double[Math.max(BATCH * batchStride, grid.nx())]; // also holds a row
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
        for (int first = 0; first < columns; first += BATCH) {
            int count = Math.min(BATCH, columns - first);
            gatherModes(modes, first, count);
            for (int column = 0; column < count; column++) {
                alongY.complexInverse(batch, column * batchStride, false);
            }
            scatterToRows(first, count);
        }
        for (int row = 0; row < grid.ny(); row++) {
            inverseRow(map, row);
        }
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
        for (int row = 0; row < grid.ny(); row++) {
            forwardRow(map, row);
        }
        for (int first = 0; first < columns; first += BATCH) {
            int count = Math.min(BATCH, columns - first);
            gatherFromRows(first, count);
            for (int column = 0; column < count; column++) {
                alongY.complexForward(batch, column * batchStride);
            }
            scatterModes(modes, first, count);
        }
        clearBeyondLimit(modes);
    }

    private void gatherModes(double[] modes, int first, int count) {
        for (int row = 0; row < grid.ny(); row++) {
            int from = 2 * (row * grid.columns() + first);
            int to = 2 * row;
            int wanted = Math.max(0, Math.min(count, band.last(row) + 1 - first));
            for (int column = 0; column < wanted; column++) {
                batch[to + column * batchStride] = inverseScale * modes[from + 2 * column];
                batch[to + column * batchStride + 1] = inverseScale * modes[from + 2 * column + 1];
            }
            for (int column = wanted; column < count; column++) {
                batch[to + column * batchStride] = 0;
                batch[to + column * batchStride + 1] = 0;
            }
        }
    }

    private void scatterToRows(int first, int count) {
        for (int row = 0; row < grid.ny(); row++) {
            int to = row * rowStride + 2 * first;
            int from = 2 * row;
            for (int column = 0; column < count; column++) {
                rows[to + 2 * column] = batch[from + column * batchStride];
                rows[to + 2 * column + 1] = batch[from + column * batchStride + 1];
            }
        }
    }

    private void gatherFromRows(int first, int count) {
        for (int row = 0; row < grid.ny(); row++) {
            int from = row * rowStride + 2 * first;
            int to = 2 * row;
            for (int column = 0; column < count; column++) {
                batch[to + column * batchStride] = rows[from + 2 * column];
                batch[to + column * batchStride + 1] = rows[from + 2 * column + 1];
            }
        }
    }

    private void scatterModes(double[] modes, int first, int count) {
        double scale = grid.pixel() * grid.pixel();
        for (int row = 0; row < grid.ny(); row++) {
            int to = 2 * (row * grid.columns() + first);
            int from = 2 * row;
            int wanted = Math.min(count, band.last(row) + 1 - first);
            for (int column = 0; column < wanted; column++) {
                modes[to + 2 * column] = scale * batch[from + column * batchStride];
                modes[to + 2 * column + 1] = scale * batch[from + column * batchStride + 1];
            }
        }
    }

    private void clearBeyondLimit(double[] modes) {
        for (int row = 0; row < grid.ny(); row++) {
            int start = 2 * row * grid.columns();
            Arrays.fill(modes, start + 2 * (band.last(row) + 1), start + 2 * grid.columns(), 0.0);
        }
    }

    /** JTransforms packs the real X_{n/2} where the imaginary part of X_0 would be. */
    private void inverseRow(double[] map, int row) {
        int start = row * grid.nx();
        int from = row * rowStride;
        int stored = Math.min(2 * columns, grid.nx());
        System.arraycopy(rows, from, map, start, stored);
        Arrays.fill(map, start + stored, start + grid.nx(), 0.0);
        map[start + 1] = columns > grid.nx() / 2 ? rows[from + grid.nx()] : 0;
        alongX.realInverse(map, start, false);
    }

    private void forwardRow(double[] map, int row) {
        System.arraycopy(map, row * grid.nx(), batch, 0, grid.nx());
        alongX.realForward(batch);
        int to = row * rowStride;
        System.arraycopy(batch, 0, rows, to, Math.min(2 * columns, grid.nx()));
        rows[to + 1] = 0;
        if (columns > grid.nx() / 2) {
            rows[to + grid.nx()] = batch[1];
            rows[to + grid.nx() + 1] = 0;
        }
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
