/**
 * Blocks and the run folder: what is on disk, whole or not at all.
 *
 * <p><b>In</b>: {@link manyskies.result.Block}, the finished work of one task. <b>Out</b>: Parquet
 * files under {@code blocks/} (bandpowers, one row per realisation) and {@code fields/} (sums of
 * reconstructed modes), each with its checksum; and blocks read back.
 *
 * <p><b>Flow</b>: a task encodes its block to bytes ({@link manyskies.result.BlockCodec}); one
 * committer writes beside the target, syncs and renames ({@link manyskies.result.RunFolder}): first
 * the checksum file, then the field file, then the bandpower file. A block exists exactly when its
 * bandpower file stands under its final name. Reading compares SHA-256 first.
 *
 * <p><b>Uses</b> specification, spectrum. Alone imports Parquet.
 */
package manyskies.result;
