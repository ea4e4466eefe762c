/**
 * Analytic response and Gaussian noise of separable estimators.
 *
 * <p><b>In</b>: an estimator's {@link manyskies.estimator.BilinearWeight} and spectra. <b>Out</b>:
 * R_L and noise numerators per mode, for lens and curl.
 *
 * <p><b>Flow</b>: the integrals over l1 are convolutions, taken with the same transform and the
 * same grid as the estimator itself, so that discreteness and cuts are the same in both.
 *
 * <p><b>Uses</b> field, spectrum, estimator. Never an FFT. Holds for a flat sky, where the slope of
 * every spin is |l|; another geometry brings its own.
 */
package manyskies.response;
