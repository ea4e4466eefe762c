package manyskies.flat;

import java.util.Arrays;

/**
 * The modes of a grid with |l| at most a limit, as one run of columns per row.
 *
 * <p>Row r of the half plane holds the wanted modes in columns 0 .. last(r); last(r) is -1 where
 * the row has none.
 */
final class BandLimit {
    private final int[] lastOfRow;
    private final int lastColumn;

    private BandLimit(int[] lastOfRow) {
        this.lastOfRow = lastOfRow;
        lastColumn = Arrays.stream(lastOfRow).max().orElse(-1);
    }

    /**
     * The modes of a grid within a limit.
     *
     * @throws IllegalArgumentException if the limit is not positive
     */
    static BandLimit of(FlatGrid grid, double limit) {
        if (!(limit > 0)) {
            throw new IllegalArgumentException("a band limit is positive, found " + limit);
        }
        int[] last = new int[grid.ny()];
        for (int row = 0; row < last.length; row++) {
            last[row] = lastWithin(grid, row, limit);
        }
        return new BandLimit(last);
    }

    /** The same without Nyquist rows and columns. */
    BandLimit withoutNyquist(FlatGrid grid) {
        int[] last = lastOfRow.clone();
        for (int row = 0; row < last.length; row++) {
            last[row] = Math.min(last[row], grid.nx() / 2 - 1);
        }
        last[grid.ny() / 2] = -1;
        return new BandLimit(last);
    }

    private static int lastWithin(FlatGrid grid, int row, double limit) {
        int last = grid.columns() - 1;
        while (last >= 0 && grid.multipole(row * grid.columns() + last) > limit) {
            last--;
        }
        return last;
    }

    /** The last wanted column of a row, or -1. */
    int last(int row) {
        return lastOfRow[row];
    }

    /** The last column in which any row has a wanted mode. */
    int lastColumn() {
        return lastColumn;
    }

    /** The largest |ky| of which column kx has a wanted mode, or -1. */
    int lastKy(int kx) {
        int ky = lastOfRow.length / 2;
        while (ky >= 0 && lastOfRow[ky] < kx) {
            ky--;
        }
        return ky;
    }
}
