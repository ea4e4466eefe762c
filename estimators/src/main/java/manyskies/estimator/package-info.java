/**
 * What an estimator is: a bilinear map of two skies to the modes of a lensing potential.
 *
 * <p><b>In</b>: two {@link manyskies.field.CmbModes} (T, E and B of any two skies, beam
 * deconvolved) and a {@link manyskies.estimator.Belief} (spectra, filters, transform). <b>Out</b>:
 * a {@link manyskies.estimator.Reconstruction}, unnormalised gradient and curl modes.
 *
 * <p><b>Flow</b>: legs become {@link manyskies.estimator.LegField}s (filtered, weighted linear
 * combinations), these become spin maps, made once per leg and shared by all estimators ({@link
 * manyskies.estimator.LegMaps}); an estimator multiplies maps and analyses the product. What it
 * weights with is declared as {@link manyskies.estimator.SeparableTerm}s, from which package {@code
 * response} takes its response and noise.
 *
 * <p><b>Uses</b> field, spectrum, filter. Never an FFT, files, clocks, threads or random numbers.
 *
 * <p><b>To add one</b>: implement {@link manyskies.estimator.EstimatorFactory}, name it in
 * META-INF/services and extend {@code EstimatorContract} (test tree) in its test.
 */
package manyskies.estimator;
