/**
 * What an instrument makes of a sky: beam, noise, splits, and the taper at the patch's edge.
 *
 * <p><b>In</b>: lensed maps, an address for the noise. <b>Out</b>: observed modes of T, E, B, beam
 * included; or the observed maps.
 *
 * <p><b>Flow</b>: {@link manyskies.instrument.Observer} transforms the maps, multiplies by the beam
 * and adds noise drawn in the half plane, only at the multipoles the analysis asks for. With a taper
 * it goes back to real space in between, at three more transforms either way.
 *
 * <p><b>Uses</b> random, specification and the estimators' field and flat.
 */
package manyskies.instrument;
