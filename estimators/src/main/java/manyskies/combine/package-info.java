/**
 * Combinations of estimators, multipole by multipole.
 *
 * <p><b>In</b>: several quadratic estimators with their responses and noise. <b>Out</b>: one
 * estimator, already normalised (its response is one by construction).
 *
 * <p><b>Flow</b>: the parts' reconstructions are taken from the leg pair, where they may have been
 * made already, and added with weights per mode.
 *
 * <p><b>Uses</b> estimator, quadratic, response.
 */
package manyskies.combine;
