/**
 * Power spectra: tables of C_l, lensing of spectra, bands and bandpowers.
 *
 * <p><b>In</b>: text tables of unlensed spectra. <b>Out</b>: {@link manyskies.spectrum.Spectra},
 * unlensed, lensed and lensed-gradient; bandpowers of modes.
 *
 * <p><b>Flow</b>: a reader turns lines into Spectra (the caller opens the file); LensedSpectra and
 * LensedGradientSpectra turn unlensed Spectra into lensed ones by correlation functions; Bandpowers
 * averages mode products over annuli.
 *
 * <p><b>Uses</b> field. C_l everywhere, never D_l; uK^2, uK, dimensionless.
 */
package manyskies.spectrum;
