package manyskies.statistic;

import java.util.Arrays;

/**
 * The covariance matrix of a vector over realisations, as estimated from n of them.
 *
 * <p>C_ij = sum_r (x_ri - mean_i)(x_rj - mean_j) / (n - 1), unbiased. For Gaussian vectors (n - 1) C
 * follows the Wishart law with n - 1 degrees of freedom, so that Var C_ij = (C_ij^2 + C_ii C_jj) /
 * (n - 1), from which {@link #error} is estimated by inserting C itself. Source: Anderson 2003, An
 * Introduction to Multivariate Statistical Analysis, chapter 7.
 *
 * <p>Units: those of the vector, squared. Immutable.
 */
public final class Covariance {
    private final double[][] lower; // row i holds columns 0 .. i
    private final long count;

    private Covariance(double[][] lower, long count) {
        this.lower = lower;
        this.count = count;
    }

    /** Takes over the lower triangle of a matrix. */
    static Covariance ofLower(double[][] lower, long count) {
        return new Covariance(lower, count);
    }

    /**
     * A covariance matrix; its lower triangle is copied.
     *
     * @param matrix symmetric, size by size
     * @param count realisations from which it was estimated
     * @throws IllegalArgumentException if the matrix is not square, or count is below 2
     */
    public static Covariance of(double[][] matrix, long count) {
        requireTwo(count);
        double[][] lower = new double[matrix.length][];
        for (int i = 0; i < matrix.length; i++) {
            if (matrix[i].length != matrix.length) {
                throw new IllegalArgumentException(
                        "row "
                                + i
                                + " of a covariance of "
                                + matrix.length
                                + " rows has "
                                + matrix[i].length
                                + " columns");
            }
            lower[i] = Arrays.copyOf(matrix[i], i + 1);
        }
        return new Covariance(lower, count);
    }

    static void requireTwo(long count) {
        if (count < 2) {
            throw new IllegalArgumentException(
                    "a scatter needs at least 2 realisations, found " + count);
        }
    }

    /** Number of rows and columns. */
    public int size() {
        return lower.length;
    }

    /** Realisations from which the matrix was estimated. */
    public long count() {
        return count;
    }

    /** The element C_ij. */
    public double value(int i, int j) {
        return i >= j ? lower[i][j] : lower[j][i];
    }

    /** The standard error of the element C_ij by the Wishart law. */
    public double error(int i, int j) {
        double c = value(i, j);
        return Math.sqrt((c * c + value(i, i) * value(j, j)) / (count - 1));
    }

    /** The standard deviation sqrt(C_ii) of one realisation; 0 where rounding made C_ii negative. */
    public double sigma(int i) {
        return Math.sqrt(Math.max(0, value(i, i)));
    }

    /**
     * The correlation C_ij / sqrt(C_ii C_jj).
     *
     * @throws IllegalArgumentException if one of the two has no scatter
     */
    public double correlation(int i, int j) {
        requireScatter(i);
        requireScatter(j);
        return i == j ? 1 : value(i, j) / (sigma(i) * sigma(j));
    }

    void requireScatter(int i) {
        if (!(value(i, i) > 0)) {
            throw new IllegalArgumentException(
                    "element "
                            + i
                            + " has no scatter over "
                            + count
                            + " realisations: its variance is "
                            + value(i, i));
        }
    }

    /** The variance w^T C w of the sum of elements with the given weights. */
    public double varianceOf(double[] weights) {
        double sum = 0;
        for (int i = 0; i < lower.length; i++) {
            double row = 0;
            for (int j = 0; j < lower.length; j++) {
                row += value(i, j) * weights[j];
            }
            sum += weights[i] * row;
        }
        return Math.max(0, sum);
    }

    /** The covariance A C A^T of the vector A x. */
    Covariance transform(double[][] a) {
        double[][] out = new double[a.length][];
        for (int i = 0; i < a.length; i++) {
            double[] row = timesRow(a[i]);
            out[i] = new double[i + 1];
            for (int j = 0; j <= i; j++) {
                out[i][j] = MeanVector.product(a[j], row);
            }
        }
        return new Covariance(out, count);
    }

    private double[] timesRow(double[] weights) {
        double[] out = new double[lower.length];
        for (int i = 0; i < out.length; i++) {
            for (int j = 0; j < out.length; j++) {
                out[i] += value(i, j) * weights[j];
            }
        }
        return out;
    }

    /** The covariance of some elements, in the given order. */
    public Covariance select(int... indices) {
        double[][] out = new double[indices.length][];
        for (int i = 0; i < indices.length; i++) {
            out[i] = new double[i + 1];
            for (int j = 0; j <= i; j++) {
                out[i][j] = value(indices[i], indices[j]);
            }
        }
        return new Covariance(out, count);
    }
}
