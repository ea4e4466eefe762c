package manyskies.aggregate;

import manyskies.specification.Sets;

/**
 * What the tables say about their run.
 *
 * @param name name of the run
 * @param hash hash of the resolved specification
 * @param planned how many realisations of each set the run asks for
 */
public record RunFacts(String name, String hash, Sets planned) {}
