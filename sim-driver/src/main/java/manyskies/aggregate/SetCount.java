package manyskies.aggregate;

/**
 * How much of a set is there.
 *
 * @param set its name
 * @param planned realisations the run asks for
 * @param realisations realisations that are committed
 * @param blocks blocks that are committed
 */
public record SetCount(String set, long planned, long realisations, int blocks) {}
