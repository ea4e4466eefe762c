/**
 * The flat, periodic patch: its grid of modes and its Fourier transforms.
 *
 * <p><b>In</b>: modes on a {@link manyskies.flat.FlatGrid} (the half plane of a real transform).
 * <b>Out</b>: maps of ny rows of nx pixels, and back.
 *
 * <p><b>Flow</b>: {@link manyskies.flat.FlatTransform} turns modes by their spin's phases and hands
 * them to our own two-dimensional driver, one-dimensional JTransforms plans under tiles of columns,
 * which leaves out what lies beyond a band limit. {@link manyskies.flat.ProductGrid} and {@link
 * manyskies.flat.ModeCopy} move fields to a smaller grid where that pays.
 *
 * <p><b>Uses</b> field. Alone imports JTransforms.
 */
package manyskies.flat;
