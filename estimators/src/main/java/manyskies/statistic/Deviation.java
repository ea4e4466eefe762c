package manyskies.statistic;

/**
 * How far an element of a vector lies from what was expected.
 *
 * @param index which element
 * @param sigma signed deviation in units of the element's error
 */
public record Deviation(int index, double sigma) {}
