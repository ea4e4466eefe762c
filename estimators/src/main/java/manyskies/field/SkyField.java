package manyskies.field;

/** The observed fields of the microwave sky, in uK. */
public enum SkyField {
    /** Temperature. */
    T,
    /** Gradient part of the polarisation. */
    E,
    /** Curl part of the polarisation. */
    B
}
