/**
 * From committed blocks to tables: a pure function, which can run at any moment.
 *
 * <p><b>In</b>: the blocks of each set in order ({@link manyskies.aggregate.BlockSource}) and what is
 * known without any sky ({@link manyskies.aggregate.AnalyticBands}). <b>Out</b>: {@link
 * manyskies.aggregate.Tables}, which are the files of the run folder's {@code tables}, and {@link
 * manyskies.aggregate.HeadlineTable} for the console.
 *
 * <p><b>Flow</b>: SetStatistics adds up the blocks of a set one by one (moments of all columns, sums
 * per block, mean fields of two halves); EstimatorResult derives an estimator's bands and checks from
 * them; Summary turns checks into verdicts. Every column {@code estimator.quantity} that a block
 * holds becomes rows of the table, whether this package knows it or not.
 *
 * <p><b>Uses</b> result, specification, statistic. No Spark. Equal blocks give equal bytes.
 */
package manyskies.aggregate;
