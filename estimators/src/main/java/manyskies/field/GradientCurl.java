package manyskies.field;

/**
 * The two real fields of which a spin map is made: its gradient (E-like) and curl (B-like) part.
 *
 * @param gradient modes of the gradient part
 * @param curl modes of the curl part
 */
public record GradientCurl(Modes gradient, Modes curl) {}
