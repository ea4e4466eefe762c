/**
 * One realisation: a pure function of (specification, set, index).
 *
 * <p><b>In</b>: a {@link manyskies.specification.Specification} and the id of a block. <b>Out</b>:
 * the block's bandpowers and sums of reconstructed modes.
 *
 * <p><b>Flow</b>: {@link manyskies.realisation.RunModel} holds what all realisations of a run share
 * (spectra, belief, normalisation, analytic noise) and is made once per JVM. {@link
 * manyskies.realisation.SkyWorker}, one per thread, draws, lenses, observes, crops to the grid of
 * products, reconstructs and measures. {@link manyskies.realisation.BlockRunner} repeats that over
 * the indices of a block, in order.
 *
 * <p><b>Sets</b>: {@code data} skies are reconstructed with themselves; {@code pairs} are two
 * independent skies each, for the Monte Carlo N0.
 *
 * <p><b>Uses</b> all packages of this module and estimators. No clock, no thread, no file.
 */
package manyskies.realisation;
