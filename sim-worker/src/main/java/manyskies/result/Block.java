package manyskies.result;

import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The finished work of one task.
 *
 * <p>Columns hold, per realisation in index order, a vector of bandpowers (any length, the same for
 * all rows of a column). Their names are {@code estimator.quantity}, for example {@code tt.auto}, or
 * {@code input.auto} for the input potential. Field sums hold the interleaved complex modes of a
 * reconstruction, added up over the block's realisations in index order; their names are those of
 * the estimators. Arrays belong to the block and are read only to others.
 */
public final class Block {
    private final BlockId id;
    private final SortedMap<String, List<double[]>> columns;
    private final SortedMap<String, double[]> fieldSums;

    private Block(
            BlockId id,
            SortedMap<String, List<double[]>> columns,
            SortedMap<String, double[]> fieldSums) {
        this.id = id;
        this.columns = columns;
        this.fieldSums = fieldSums;
    }

    /**
     * A block of the given columns and sums.
     *
     * @throws IllegalArgumentException if a column has another number of rows than the block, rows
     *     of different lengths, or a number that is not finite
     */
    public static Block of(
            BlockId id, Map<String, List<double[]>> columns, Map<String, double[]> fieldSums) {
        columns.forEach((name, rows) -> check(id, name, rows));
        fieldSums.forEach((name, sum) -> checkSum(id, name, sum));
        SortedMap<String, List<double[]>> sorted = new TreeMap<>();
        columns.forEach((name, rows) -> sorted.put(name, List.copyOf(rows)));
        return new Block(id, sorted, new TreeMap<>(fieldSums));
    }

    private static void checkSum(BlockId id, String name, double[] sum) {
        for (double value : sum) {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException(
                        id.stem() + ": the field sum of " + name + " holds " + value);
            }
        }
    }

    private static void check(BlockId id, String name, List<double[]> rows) {
        if (rows.size() != id.count()) {
            throw new IllegalArgumentException(
                    id.stem()
                            + ": column "
                            + name
                            + " has "
                            + rows.size()
                            + " rows, expected "
                            + id.count());
        }
        for (int row = 0; row < rows.size(); row++) {
            if (rows.get(row).length != rows.get(0).length) {
                throw new IllegalArgumentException(
                        id.stem() + ": rows of column " + name + " differ in length");
            }
            for (double value : rows.get(row)) {
                if (!Double.isFinite(value)) {
                    throw new IllegalArgumentException(
                            id.stem()
                                    + ": "
                                    + name
                                    + " of realisation "
                                    + (id.first() + row)
                                    + " is "
                                    + value);
                }
            }
        }
    }

    /** Which realisations these are. */
    public BlockId id() {
        return id;
    }

    /** Bandpowers: column name to rows in index order. */
    public SortedMap<String, List<double[]>> columns() {
        return columns;
    }

    /** Sums of reconstructed modes: estimator name to interleaved modes. */
    public SortedMap<String, double[]> fieldSums() {
        return fieldSums;
    }
}
