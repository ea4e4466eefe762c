package manyskies.spectrum;

/**
 * Names of the spectra in a table. T, E, B in uK, P the lensing potential phi (dimensionless).
 */
public enum Spectrum {
    /** Temperature, uK^2. */
    TT,
    /** Gradient polarisation, uK^2. */
    EE,
    /** Curl polarisation, uK^2. */
    BB,
    /** Temperature with gradient polarisation, uK^2. */
    TE,
    /** Lensing potential, dimensionless. */
    PP,
    /** Temperature with lensing potential, uK. */
    TP,
    /** Gradient polarisation with lensing potential, uK. */
    EP
}
