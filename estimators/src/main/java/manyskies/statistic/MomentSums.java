package manyskies.statistic;

import java.util.List;

/**
 * First and second moments of a vector, added up row by row in index order.
 *
 * <p>With the first row k as origin, S_i = sum_r (x_ri - k_i) and Q_ij = sum_r (x_ri - k_i)(x_rj -
 * k_j); then mean = k + S/n and C = (Q - S S^T / n) / (n - 1). The origin lies within the scatter, so
 * that little cancels (Chan, Golub & LeVeque 1983, The American Statistician 37, 242). Each sum adds
 * one row after another, so that the bits do not depend on how rows were grouped when handed over.
 *
 * <p>Memory: half a matrix of the vector's length, squared. Mutable: one thread, one owner.
 */
public final class MomentSums {
    private final int size;
    private final double[] sum;
    private final double[][] products; // lower triangle
    private double[] origin = new double[0];
    private long count;

    /** Sums for vectors of the given number of elements. */
    public MomentSums(int size) {
        this.size = size;
        sum = new double[size];
        products = new double[size][];
        for (int i = 0; i < size; i++) {
            products[i] = new double[i + 1];
        }
    }

    /**
     * Adds the next rows.
     *
     * @throws IllegalArgumentException if a row has another number of elements; nothing is added
     */
    public void add(List<double[]> rows) {
        for (double[] row : rows) {
            requireSize(row);
        }
        if (rows.isEmpty()) {
            return;
        }
        if (count == 0) {
            origin = rows.get(0).clone();
        }
        double[][] shifted = new double[rows.size()][size];
        for (int r = 0; r < shifted.length; r++) {
            for (int i = 0; i < size; i++) {
                shifted[r][i] = rows.get(r)[i] - origin[i];
                sum[i] += shifted[r][i];
            }
        }
        // one row of the matrix stays in the cache while the realisations pass by
        for (int i = 0; i < size; i++) {
            for (double[] x : shifted) {
                addProducts(products[i], x[i], x);
            }
        }
        count += shifted.length;
    }

    private static void addProducts(double[] row, double factor, double[] x) {
        for (int j = 0; j < row.length; j++) {
            row[j] += factor * x[j];
        }
    }

    private void requireSize(double[] row) {
        if (row.length != size) {
            throw new IllegalArgumentException(
                    "a row has " + row.length + " elements, expected " + size);
        }
    }

    /** Number of rows so far. */
    public long count() {
        return count;
    }

    /**
     * The mean and covariance of the rows so far.
     *
     * @throws IllegalArgumentException if there are fewer than two
     */
    public MeanVector mean() {
        Covariance.requireTwo(count);
        double[] mean = new double[size];
        double[][] lower = new double[size][];
        for (int i = 0; i < size; i++) {
            mean[i] = origin[i] + sum[i] / count;
            lower[i] = new double[i + 1];
            for (int j = 0; j <= i; j++) {
                lower[i][j] = (products[i][j] - sum[i] * (sum[j] / count)) / (count - 1);
            }
        }
        return MeanVector.of(mean, Covariance.ofLower(lower, count));
    }
}
