/**
 * The flat, periodic patch: its grid of modes and its Fourier transforms.
 *
 * <p><b>In</b>: modes on a {@link manyskies.flat.FlatGrid} (the half plane of a real transform).
 * <b>Out</b>: maps of ny rows of nx pixels, and back.
 *
 * <p><b>Flow</b>: one-dimensional JTransforms plans under our own two-dimensional driver, which
 * skips rows and columns that are zero beyond a band limit.
 *
 * <p><b>Uses</b> field. Alone imports JTransforms.
 */
package manyskies.flat;
