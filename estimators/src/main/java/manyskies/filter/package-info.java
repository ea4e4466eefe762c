/**
 * Filters: from an observed sky to the inverse-variance legs of an estimator.
 *
 * <p><b>In</b>: the total spectra that the analysis believes in, and the multipoles it keeps.
 * <b>Out</b>: per mode, the inverse of the total covariance of T, E and B.
 *
 * <p><b>Flow</b>: each field alone for the separate estimators; T and E together, a 2 x 2 inverse
 * per mode, for the joint one.
 *
 * <p><b>Uses</b> field, spectrum.
 */
package manyskies.filter;
