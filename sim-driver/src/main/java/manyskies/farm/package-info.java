/**
 * The farm: blocks to Spark tasks, results to one committer.
 *
 * <p><b>In</b>: ids of the blocks that are missing, {@link manyskies.farm.BlockWork} that computes
 * one, {@link manyskies.farm.BlockSink} that keeps it. <b>Out</b>: committed blocks and a
 * {@link manyskies.farm.FarmResult}.
 *
 * <p><b>Flow</b>: {@link manyskies.farm.Farm} sends small jobs to Spark; a task returns its encoded
 * block or its failure as a value; Spark's scheduler thread enqueues it and a single thread commits.
 *
 * <p><b>Uses</b> result. Alone imports Spark; nothing else starts it.
 */
package manyskies.farm;
