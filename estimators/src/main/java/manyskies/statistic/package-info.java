/**
 * Statistics of bandpowers: means, ratios, covariances and verdicts, each number with its error.
 *
 * <p><b>In</b>: rows of numbers, one row per realisation, in index order. <b>Out</b>: {@link
 * manyskies.statistic.MeanVector}, a mean with the covariance of one realisation; ratios of means;
 * {@link manyskies.statistic.Covariance} with an error per element; {@link
 * manyskies.statistic.HotellingTest}, the probability to exceed of a mean vector against an
 * expected one; {@link manyskies.statistic.Jackknife}, errors from blocks.
 *
 * <p><b>Flow</b>: {@link manyskies.statistic.MomentSums} adds rows; everything else is read from
 * the mean vector it returns, by linear maps. All sums run in the order of the indices.
 *
 * <p><b>Uses</b> nothing but distributions and linear algebra. No random numbers, files or clocks.
 */
package manyskies.statistic;
