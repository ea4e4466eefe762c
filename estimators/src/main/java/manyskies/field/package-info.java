/**
 * Fields on a sky, without saying which sky: modes, spin maps and the transform between them.
 *
 * <p><b>In</b>: arrays of Fourier (or harmonic) coefficients. <b>Out</b>: spin maps, and back.
 *
 * <p><b>Flow</b>: {@link manyskies.field.Modes} of a gradient and a curl part go through {@link
 * manyskies.field.SkyTransform#synthesise} to a {@link manyskies.field.SpinMap}; products of maps
 * are taken pixel by pixel; {@link manyskies.field.SkyTransform#analyse} leads back.
 *
 * <p><b>Uses</b> the JDK only. Never an FFT, files, clocks, threads or random numbers.
 *
 * <p><b>To extend</b>: a new geometry implements ModeSpace and SkyTransform; {@code flat} holds the
 * first one.
 */
package manyskies.field;
