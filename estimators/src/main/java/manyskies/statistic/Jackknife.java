package manyskies.statistic;

import java.util.ArrayList;
import java.util.List;

/**
 * Errors from leaving out one block at a time: a second method, which asks nothing of the law of the
 * data and keeps whatever correlation there is within a block.
 *
 * <p>Blocks may differ in size. With g blocks of m_j of the n realisations, h_j = n / m_j, the value
 * t of all data and t_-j without block j, the pseudo-values are q_j = h_j t - (h_j - 1) t_-j, the
 * estimate is t_J = sum_j q_j / h_j, and Var t = (1/g) sum_j (q_j - t_J)^2 / (h_j - 1) (Busing, Meijer &
 * van der Leeden 1999, Statistics and Computing 9, 3). For equal blocks this is the usual jackknife;
 * for a mean it is unbiased. Its own relative error is about 1 / sqrt(2 (g - 1)). Immutable.
 */
public final class Jackknife {

    /** What is computed from sums over realisations, for example a ratio of two of them. */
    @FunctionalInterface
    public interface Statistic {
        /** The values for the given sums over the given number of realisations. */
        double[] of(double[] sums, long count);
    }

    private final double[] values;
    private final double[] errors;
    private final int blocks;

    private Jackknife(double[] values, double[] errors, int blocks) {
        this.values = values;
        this.errors = errors;
        this.blocks = blocks;
    }

    /**
     * The statistic of all blocks with its jackknife errors.
     *
     * @param sums per block, in index order, the sums over its realisations
     * @param counts per block the number of its realisations
     * @throws IllegalArgumentException if there are fewer than two blocks, an empty one, or not one
     *     count for each
     */
    public static Jackknife of(List<double[]> sums, List<Integer> counts, Statistic statistic) {
        require(sums, counts);
        long n = 0;
        double[] total = new double[sums.get(0).length];
        for (int j = 0; j < sums.size(); j++) {
            n += counts.get(j);
            for (int i = 0; i < total.length; i++) {
                total[i] += sums.get(j)[i];
            }
        }
        double[] all = statistic.of(total.clone(), n);
        List<double[]> without = new ArrayList<>();
        for (int j = 0; j < sums.size(); j++) {
            without.add(statistic.of(minus(total, sums.get(j)), n - counts.get(j)));
        }
        return new Jackknife(all, errors(all, without, counts, (double) n), sums.size());
    }

    private static double[] minus(double[] total, double[] part) {
        double[] rest = new double[total.length];
        for (int i = 0; i < rest.length; i++) {
            rest[i] = total[i] - part[i];
        }
        return rest;
    }

    private static double[] errors(
            double[] all, List<double[]> without, List<Integer> counts, double n) {
        int g = without.size();
        double[] error = new double[all.length];
        for (int i = 0; i < error.length; i++) {
            double[] pseudo = new double[g];
            double centre = 0;
            for (int j = 0; j < g; j++) {
                double h = n / counts.get(j);
                pseudo[j] = h * all[i] - (h - 1) * without.get(j)[i];
                centre += pseudo[j] / h;
            }
            double variance = 0;
            for (int j = 0; j < g; j++) {
                double deviation = pseudo[j] - centre;
                variance += deviation * deviation / (n / counts.get(j) - 1);
            }
            error[i] = Math.sqrt(variance / g);
        }
        return error;
    }

    private static void require(List<double[]> sums, List<Integer> counts) {
        if (sums.size() < 2 || counts.size() != sums.size()) {
            throw new IllegalArgumentException(
                    "a jackknife needs at least 2 blocks with a count for each, found "
                            + sums.size()
                            + " and "
                            + counts.size());
        }
        for (int count : counts) {
            if (count < 1) {
                throw new IllegalArgumentException("a block of " + count + " realisations");
            }
        }
    }

    /** The statistic of all blocks. */
    public double value(int i) {
        return values[i];
    }

    /** Its jackknife error. */
    public double error(int i) {
        return errors[i];
    }

    /** Number of values. */
    public int size() {
        return values.length;
    }

    /** Number of blocks. */
    public int blocks() {
        return blocks;
    }
}
