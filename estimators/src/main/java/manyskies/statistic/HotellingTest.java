package manyskies.statistic;

import java.util.Arrays;
import org.hipparchus.exception.MathIllegalArgumentException;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.CholeskyDecomposition;
import org.hipparchus.linear.RealVector;

/**
 * Hotelling's test: is a mean vector what was expected, given the scatter of its own sample?
 *
 * <p>T^2 = n (x - mu)^T C^-1 (x - mu) with the sample covariance C of n realisations. For Gaussian
 * realisations T^2 (n - p) / (p (n - 1)) follows Fisher's F law with p and n - p degrees of freedom,
 * exactly; the noise of C, which would bias a chi-square, is in the law. Source: Anderson 2003, An
 * Introduction to Multivariate Statistical Analysis, section 5.2.
 *
 * @param tSquared T^2, the chi-square with the estimated covariance
 * @param dimension number of elements p
 * @param count number of realisations n
 * @param probabilityToExceed probability of a T^2 above this one if the expectation is right
 */
public record HotellingTest(
        double tSquared, int dimension, long count, double probabilityToExceed) {

    /** Below this pivot of its correlation matrix a covariance counts as singular. */
    private static final double SMALLEST_PIVOT = 1e-10;

    /** The smallest number of realisations with which p elements can be tested. */
    public static long needed(int dimension) {
        return dimension + 3L;
    }

    /**
     * Tests a mean against an expected value that is the same for all elements.
     *
     * @throws IllegalArgumentException as {@link #of(MeanVector, double[])}
     */
    public static HotellingTest of(MeanVector mean, double expected) {
        double[] all = new double[mean.size()];
        Arrays.fill(all, expected);
        return of(mean, all);
    }

    /**
     * Tests a mean against expected values.
     *
     * @throws IllegalArgumentException if n &lt;= p + 2, the numbers of elements differ, an element
     *     has no scatter, or the covariance is singular
     */
    public static HotellingTest of(MeanVector mean, double[] expected) {
        int p = mean.size();
        long n = mean.count();
        if (n < needed(p)) {
            throw new IllegalArgumentException(
                    "a test of "
                            + p
                            + " bandpowers with their own covariance needs at least "
                            + needed(p)
                            + " realisations, found "
                            + n);
        }
        if (expected.length != p) {
            throw new IllegalArgumentException(
                    expected.length + " expected values for " + p + " bandpowers");
        }
        double tSquared = tSquared(mean, expected);
        double f = tSquared * (n - p) / (p * (n - 1.0));
        return new HotellingTest(tSquared, p, n, TailProbability.ofF(f, p, n - (double) p));
    }

    /** In units of each element's error, so that only the correlation matrix is inverted. */
    private static double tSquared(MeanVector mean, double[] expected) {
        int p = mean.size();
        double[] z = new double[p];
        double[][] correlation = new double[p][p];
        for (int i = 0; i < p; i++) {
            for (int j = 0; j < p; j++) {
                correlation[i][j] = mean.covariance().correlation(i, j);
            }
            z[i] = (mean.value(i) - expected[i]) / mean.error(i);
        }
        RealVector deviation = new ArrayRealVector(z, false);
        return Math.max(
                0, deviation.dotProduct(cholesky(correlation).getSolver().solve(deviation)));
    }

    private static CholeskyDecomposition cholesky(double[][] correlation) {
        try {
            return new CholeskyDecomposition(
                    new Array2DRowRealMatrix(correlation, false),
                    CholeskyDecomposition.DEFAULT_RELATIVE_SYMMETRY_THRESHOLD,
                    SMALLEST_PIVOT);
        } catch (MathIllegalArgumentException e) {
            throw new IllegalArgumentException(
                    "the covariance of these "
                            + correlation.length
                            + " bandpowers is singular: some of them move together exactly; test"
                            + " fewer or wider bands",
                    e);
        }
    }
}
