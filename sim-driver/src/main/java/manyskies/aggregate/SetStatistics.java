package manyskies.aggregate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.statistic.Jackknife;
import manyskies.statistic.MeanVector;
import manyskies.statistic.MomentSums;

/**
 * All columns of one set, added up block by block: moments of the stacked vector, sums per block.
 *
 * <p>Columns are stacked in the order of their names, bands within a column; any two elements'
 * covariance can be asked for. Memory: half the square of the number of elements, and one vector
 * per block; never the rows.
 */
final class SetStatistics {
    private final String set;
    private final int bands;
    private final List<String> columns = new ArrayList<>();
    private final List<double[]> blockSums = new ArrayList<>();
    private final List<Integer> blockCounts = new ArrayList<>();
    private MomentSums moments = new MomentSums(0);
    private MeanVector mean;

    private SetStatistics(String set, int bands) {
        this.set = set;
        this.bands = bands;
    }

    /**
     * Reads the blocks of a set, once, in their order.
     *
     * @param alsoTo who else wants to see each block
     * @throws IllegalArgumentException if blocks are out of order or overlap, belong to another set,
     *     or have other columns or bands than the run
     */
    static SetStatistics read(
            String set, int bands, Iterable<Block> blocks, Consumer<Block> alsoTo) {
        SetStatistics statistics = new SetStatistics(set, bands);
        BlockId last = new BlockId(set, -1, 0, 0);
        for (Block block : blocks) {
            requireOrder(last, block.id());
            statistics.add(block);
            alsoTo.accept(block);
            last = block.id();
        }
        if (statistics.count() >= 2) {
            statistics.mean = statistics.moments.mean();
        }
        return statistics;
    }

    private static void requireOrder(BlockId last, BlockId next) {
        if (!next.set().equals(last.set())) {
            throw new IllegalArgumentException(
                    next.stem() + " was handed over as a block of the set " + last.set());
        }
        if (next.number() <= last.number() || next.first() < last.first() + last.count()) {
            throw new IllegalArgumentException(
                    next.stem()
                            + " begins at realisation "
                            + next.first()
                            + ", after "
                            + last.stem()
                            + " with "
                            + last.first()
                            + " to "
                            + (last.first() + last.count() - 1)
                            + "; blocks come in rising order and share no realisation");
        }
    }

    private void add(Block block) {
        if (blockCounts.isEmpty()) {
            columns.addAll(block.columns().keySet());
            moments = new MomentSums(columns.size() * bands);
        } else if (!List.copyOf(block.columns().keySet()).equals(columns)) {
            throw new IllegalArgumentException(
                    block.id().stem()
                            + " has the columns "
                            + block.columns().keySet()
                            + ", the blocks before it "
                            + columns
                            + "; delete this block and run again");
        }
        List<double[]> rows = stack(block);
        moments.add(rows);
        double[] sum = new double[columns.size() * bands];
        for (double[] row : rows) {
            for (int i = 0; i < sum.length; i++) {
                sum[i] += row[i];
            }
        }
        blockSums.add(sum);
        blockCounts.add(rows.size());
    }

    private List<double[]> stack(Block block) {
        List<double[]> rows = new ArrayList<>();
        for (int r = 0; r < block.id().count(); r++) {
            double[] row = new double[columns.size() * bands];
            for (int c = 0; c < columns.size(); c++) {
                double[] part = block.columns().get(columns.get(c)).get(r);
                if (part.length != bands) {
                    throw new IllegalArgumentException(
                            block.id().stem()
                                    + ": column "
                                    + columns.get(c)
                                    + " has "
                                    + part.length
                                    + " bandpowers, the run has "
                                    + bands
                                    + " bands; delete this block and run again");
                }
                System.arraycopy(part, 0, row, c * bands, bands);
            }
            rows.add(row);
        }
        return rows;
    }

    String set() {
        return set;
    }

    long count() {
        return moments.count();
    }

    int blocks() {
        return blockCounts.size();
    }

    List<String> columns() {
        return columns;
    }

    /** The stacked vector of some columns, or nothing if one is absent or fewer than two skies are. */
    Optional<MeanVector> vector(String... names) {
        if (mean == null || !columns.containsAll(List.of(names))) {
            return Optional.empty();
        }
        return Optional.of(mean.select(indices(names)));
    }

    /** The jackknife over blocks of some columns, or nothing if fewer than two blocks are there. */
    Optional<Jackknife> jackknife(Jackknife.Statistic statistic, String... names) {
        if (blocks() < 2 || !columns.containsAll(List.of(names))) {
            return Optional.empty();
        }
        int[] indices = indices(names);
        List<double[]> sums = new ArrayList<>();
        for (double[] all : blockSums) {
            double[] some = new double[indices.length];
            for (int i = 0; i < some.length; i++) {
                some[i] = all[indices[i]];
            }
            sums.add(some);
        }
        return Optional.of(Jackknife.of(sums, blockCounts, statistic));
    }

    private int[] indices(String... names) {
        int[] indices = new int[names.length * bands];
        for (int i = 0; i < indices.length; i++) {
            indices[i] = columns.indexOf(names[i / bands]) * bands + i % bands;
        }
        return indices;
    }
}
