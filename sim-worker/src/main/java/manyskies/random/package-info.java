/**
 * From names to random numbers: every number is a pure function of its address.
 *
 * <p><b>In</b>: an {@link manyskies.random.Address} (seed of the run, set, index of the
 * realisation) and the name of a field. <b>Out</b>: Gaussian numbers for each mode of that field,
 * {@link manyskies.random.GaussianRows}.
 *
 * <p><b>Flow</b>: SHA-256 of the address gives a key; key and wave number ky, mixed, give the state
 * of one generator per row of modes; the row is drawn for kx = 0, 1, 2, ... So a number depends on
 * (seed, set, index, field, kx, ky) and on nothing else: not on the size of a pixel, nor on how
 * many modes are drawn, nor on what was drawn before.
 *
 * <p><b>Uses</b> the JDK. Alone imports Commons RNG.
 */
package manyskies.random;
