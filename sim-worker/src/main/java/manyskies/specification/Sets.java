package manyskies.specification;

import java.io.Serializable;

/**
 * How many realisations of which kind.
 *
 * @param data skies that are reconstructed: auto, cross, mean field, covariance
 * @param pairs pairs of independent skies for the Monte Carlo N0
 */
public record Sets(int data, int pairs) implements Serializable {}
