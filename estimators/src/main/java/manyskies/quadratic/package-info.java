/**
 * Quadratic estimators of the lensing potential: tt, te, tb, ee, eb and joint.
 *
 * <p><b>In</b>: a belief and two legs. <b>Out</b>: unnormalised modes g_L.
 *
 * <p><b>Flow</b>: each estimator is a list of separable terms ({@link
 * manyskies.estimator.SeparableTerm}); {@link manyskies.quadratic.SeparableEstimator} turns any
 * such list into products of spin maps, whose gradient part is the lens and whose curl part the
 * null test. The same list gives the analytic response and noise in package {@code response}.
 *
 * <p><b>Uses</b> field, spectrum, filter, estimator. Never an FFT.
 *
 * <p>Sources: Hu and Okamoto 2002 (astro-ph/0111606), Okamoto and Hu 2003 (astro-ph/0301031),
 * Maniyar et al. 2021 (2101.12193).
 */
package manyskies.quadratic;
