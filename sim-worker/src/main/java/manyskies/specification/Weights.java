package manyskies.specification;

/** Which spectra stand in the weights and responses of the estimators. */
public enum Weights {
    /** C^{T grad T} and its kin (Lewis, Challinor and Hanson 2011, 1101.2234). */
    LENSED_GRADIENT,
    /** Lensed spectra. */
    LENSED,
    /** Unlensed spectra; biased at low L by several per cent. */
    UNLENSED
}
