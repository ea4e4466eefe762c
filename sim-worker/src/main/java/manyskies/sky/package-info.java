/**
 * One sky: correlated Gaussian modes, and their lensing.
 *
 * <p><b>In</b>: unlensed spectra, a grid, addresses of the randomness. <b>Out</b>: modes of the
 * unlensed T, E, B, phi, psi ({@link manyskies.sky.UnlensedSky}); maps and modes of the lensed T,
 * Q, U ({@link manyskies.sky.LensedSky}).
 *
 * <p><b>Flow</b>: {@link manyskies.sky.GaussianSky} draws modes with the Cholesky factor of the
 * spectra; {@link manyskies.sky.SkyLensing} divides them by the spline's mean response, transforms
 * T, Q, U and the two displacements (5 inverse transforms), and evaluates the splines at the
 * displaced points; {@link manyskies.flat.StokesTransform} leads back to T, E, B (3 transforms).
 *
 * <p><b>Uses</b> random and the estimators' field, flat, spectrum. No files, clocks or threads.
 */
package manyskies.sky;
