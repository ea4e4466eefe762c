package manyskies.statistic;

/**
 * The mean of a vector over n realisations, with the covariance of one realisation.
 *
 * <p>The error of element i is sqrt(C_ii / n). What is made of a mean vector by a linear map A has
 * the mean A x and the covariance A C A^T; a ratio of means is of that kind to first order ({@link
 * #ratio}). Units are those of the elements. Immutable.
 */
public final class MeanVector {
    private final double[] mean;
    private final Covariance covariance;

    private MeanVector(double[] mean, Covariance covariance) {
        this.mean = mean;
        this.covariance = covariance;
    }

    /**
     * A mean with the covariance of one realisation; the mean is copied.
     *
     * @throws IllegalArgumentException if their sizes differ
     */
    public static MeanVector of(double[] mean, Covariance covariance) {
        if (mean.length != covariance.size()) {
            throw new IllegalArgumentException(
                    "a mean of "
                            + mean.length
                            + " elements has no covariance of "
                            + covariance.size());
        }
        return new MeanVector(mean.clone(), covariance);
    }

    /** Number of elements. */
    public int size() {
        return mean.length;
    }

    /** Number of realisations. */
    public long count() {
        return covariance.count();
    }

    /** The mean of one element. */
    public double value(int i) {
        return mean[i];
    }

    /** The error of the mean of one element, sqrt(C_ii / n). */
    public double error(int i) {
        return covariance.sigma(i) / Math.sqrt((double) count());
    }

    /** One element with its error and count. */
    public Measurement measurement(int i) {
        return new Measurement(mean[i], error(i), count());
    }

    /** The covariance of one realisation; that of the mean is n times smaller. */
    public Covariance covariance() {
        return covariance;
    }

    /** Some elements, in the given order. */
    public MeanVector select(int... indices) {
        double[] out = new double[indices.length];
        for (int i = 0; i < out.length; i++) {
            out[i] = mean[indices[i]];
        }
        return new MeanVector(out, covariance.select(indices));
    }

    /**
     * The vector A x of sums of these elements.
     *
     * @param a one row of weights per new element, each as long as this vector
     * @throws IllegalArgumentException if a row has another length
     */
    public MeanVector transform(double[][] a) {
        double[] out = new double[a.length];
        for (int i = 0; i < a.length; i++) {
            if (a[i].length != mean.length) {
                throw new IllegalArgumentException(
                        "a row of weights has "
                                + a[i].length
                                + " numbers for a vector of "
                                + mean.length);
            }
            out[i] = product(a[i], mean);
        }
        return new MeanVector(out, covariance.transform(a));
    }

    /** These elements, each divided by a number of its own. */
    public MeanVector dividedBy(double... divisor) {
        double[][] a = new double[mean.length][mean.length];
        for (int i = 0; i < a.length; i++) {
            a[i][i] = 1 / requireDivisor(divisor[i], i);
        }
        return transform(a);
    }

    /**
     * The difference of the first half of this vector and the second.
     *
     * @throws IllegalArgumentException if the number of elements is odd
     */
    public MeanVector difference() {
        double[][] a = new double[half()][mean.length];
        for (int i = 0; i < a.length; i++) {
            a[i][i] = 1;
            a[i][a.length + i] = -1;
        }
        return transform(a);
    }

    /**
     * The ratio of the first half of this vector (numerators c) to the second (denominators d).
     *
     * <p>r = sum_i c_i / sum_i d_i over realisations i, never the mean of c_i / d_i, which is
     * biased. To first order r - &lt;r&gt; is the mean of (c_i - r d_i) / mean(d), so that the
     * residuals' covariance is that of one realisation of r: what c and d share drops out. The bias
     * of r is of order 1/n of one realisation's relative variance, far below its error.
     *
     * @throws IllegalArgumentException if the number of elements is odd or a denominator is zero
     */
    public MeanVector ratio() {
        int p = half();
        double[][] a = new double[p][mean.length];
        double[] r = new double[p];
        for (int i = 0; i < p; i++) {
            r[i] = mean[i] / requireDivisor(mean[p + i], i);
            a[i][i] = 1 / mean[p + i];
            a[i][p + i] = -r[i] / mean[p + i];
        }
        return new MeanVector(r, covariance.transform(a));
    }

    private int half() {
        if (mean.length % 2 != 0) {
            throw new IllegalArgumentException(
                    "two vectors of one length make an even number of elements, found "
                            + mean.length);
        }
        return mean.length / 2;
    }

    private static double requireDivisor(double divisor, int i) {
        if (divisor == 0 || !Double.isFinite(divisor)) {
            throw new IllegalArgumentException("element " + i + " is to be divided by " + divisor);
        }
        return divisor;
    }

    /**
     * The mean over elements, weighted by 1 / C_ii, with the error sqrt(w^T C w / n).
     *
     * <p>Correlations enter the error, not the weights: that costs a little precision and needs no
     * inverse, so that it works from two realisations on.
     *
     * @throws IllegalArgumentException if an element has no scatter
     */
    public Measurement weightedMean() {
        double[] weights = inverseVariances();
        double variance = covariance.varianceOf(weights) / count();
        return new Measurement(product(weights, mean), Math.sqrt(variance), count());
    }

    /**
     * Weights 1 / C_ii, scaled so that their sum is one.
     *
     * @throws IllegalArgumentException if an element has no scatter
     */
    public double[] inverseVariances() {
        double[] weights = new double[mean.length];
        double total = 0;
        for (int i = 0; i < weights.length; i++) {
            covariance.requireScatter(i);
            weights[i] = 1 / covariance.value(i, i);
            total += weights[i];
        }
        for (int i = 0; i < weights.length; i++) {
            weights[i] /= total;
        }
        return weights;
    }

    /**
     * The element farthest from an expected value in units of its error.
     *
     * @throws IllegalArgumentException if an element has no scatter
     */
    public Deviation largestDeviation(double expected) {
        Deviation largest = new Deviation(0, 0);
        for (int i = 0; i < mean.length; i++) {
            covariance.requireScatter(i);
            double sigma = (mean[i] - expected) / error(i);
            if (i == 0 || Math.abs(sigma) > Math.abs(largest.sigma())) {
                largest = new Deviation(i, sigma);
            }
        }
        return largest;
    }

    static double product(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }
}
