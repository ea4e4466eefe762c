package manyskies.specification;

import java.io.Serializable;

/**
 * A flat periodic patch of square pixels.
 *
 * @param nx pixels along x, even, with prime factors 2, 3 and 5 only
 * @param ny pixels along y, likewise
 * @param pixel side of a pixel in radian
 */
public record Patch(int nx, int ny, double pixel) implements Serializable {}
