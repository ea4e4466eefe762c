package manyskies.flat;

import java.util.Arrays;

/**
 * Scratch memory between the two passes of a transform: a half plane cut into tiles of {@value
 * #WIDTH} columns.
 *
 * <p>Rows are written and read a tile's width at a time, columns a whole tile at a time, which is
 * contiguous: neither pass strides through memory. Distances are padded, because those of a power
 * of two would make all tiles compete for the same few cache lines.
 */
final class ColumnTiles {
    /** Complex columns of a tile: four cache lines of a row (8 is slower by a tenth, 4 by a third). */
    static final int WIDTH = 16;

    /** Numbers in a row of a tile. */
    private static final int ROW = 2 * WIDTH;

    /** Doubles by which a distance is lengthened: one cache line. */
    private static final int PADDING = 8;

    private final int rows;
    private final int tiles;
    private final int tileStride;
    private final int columnStride;
    private final double[] values;
    private final double[] batch; // the columns of one tile, one after another

    ColumnTiles(int rows, int columns) {
        this.rows = rows;
        tiles = (columns + WIDTH - 1) / WIDTH;
        tileStride = ROW * rows + PADDING;
        columnStride = 2 * rows + PADDING;
        values = new double[tiles * tileStride];
        batch = new double[WIDTH * columnStride];
    }

    /** Number of tiles. */
    int tiles() {
        return tiles;
    }

    /** The columns of one tile, each from {@link #column} on. */
    double[] batch() {
        return batch;
    }

    /** Where a column of the batch starts. */
    int column(int column) {
        return column * columnStride;
    }

    /** Writes the first numbers of a row of interleaved columns, and zeros to the next tile. */
    void putRow(int row, double[] from, int start, int numbers) {
        int to = ROW * row;
        int next = start;
        for (int left = numbers; left > 0; left -= ROW) {
            System.arraycopy(from, next, values, to, Math.min(ROW, left));
            if (left < ROW) {
                Arrays.fill(values, to + left, to + ROW, 0.0);
            }
            next += ROW;
            to += tileStride;
        }
    }

    /** Reads the first numbers of a row. */
    void getRow(int row, double[] to, int start, int numbers) {
        int from = ROW * row;
        int next = start;
        for (int left = numbers; left > 0; left -= ROW) {
            System.arraycopy(values, from, to, next, Math.min(ROW, left));
            next += ROW;
            from += tileStride;
        }
    }

    /** Copies the rows |ky| up to a limit of a tile into the batch; the others become zero. */
    void tileToBatch(int tile, int lastKy) {
        rowsToBatch(tile, 0, Math.min(lastKy, rows / 2) + 1);
        if (lastKy < rows / 2) {
            for (int column = 0; column < WIDTH; column++) {
                int start = column * columnStride;
                Arrays.fill(batch, start + 2 * (lastKy + 1), start + 2 * (rows - lastKy), 0.0);
            }
        }
        rowsToBatch(tile, Math.max(rows - lastKy, rows / 2 + 1), rows);
    }

    /** Copies the rows |ky| up to a limit of the batch, times a factor, into a tile. */
    void batchToTile(int tile, int lastKy, double factor) {
        rowsFromBatch(tile, 0, Math.min(lastKy, rows / 2) + 1, factor);
        rowsFromBatch(tile, Math.max(rows - lastKy, rows / 2 + 1), rows, factor);
    }

    private void rowsToBatch(int tile, int first, int end) {
        for (int row = first; row < end; row++) {
            int from = tile * tileStride + ROW * row;
            int to = 2 * row;
            for (int i = from; i < from + ROW; i += 8) { // by four columns: twice as fast as by one
                double a = values[i];
                double b = values[i + 1];
                double c = values[i + 2];
                double d = values[i + 3];
                double e = values[i + 4];
                double f = values[i + 5];
                double g = values[i + 6];
                double h = values[i + 7];
                batch[to] = a;
                batch[to + 1] = b;
                to += columnStride;
                batch[to] = c;
                batch[to + 1] = d;
                to += columnStride;
                batch[to] = e;
                batch[to + 1] = f;
                to += columnStride;
                batch[to] = g;
                batch[to + 1] = h;
                to += columnStride;
            }
        }
    }

    private void rowsFromBatch(int tile, int first, int end, double factor) {
        for (int row = first; row < end; row++) {
            int to = tile * tileStride + ROW * row;
            int from = 2 * row;
            for (int i = to; i < to + ROW; i += 8) {
                double a = batch[from];
                double b = batch[from + 1];
                from += columnStride;
                double c = batch[from];
                double d = batch[from + 1];
                from += columnStride;
                double e = batch[from];
                double f = batch[from + 1];
                from += columnStride;
                double g = batch[from];
                double h = batch[from + 1];
                from += columnStride;
                values[i] = factor * a;
                values[i + 1] = factor * b;
                values[i + 2] = factor * c;
                values[i + 3] = factor * d;
                values[i + 4] = factor * e;
                values[i + 5] = factor * f;
                values[i + 6] = factor * g;
                values[i + 7] = factor * h;
            }
        }
    }
}
