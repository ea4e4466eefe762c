package manyskies.estimator;

import java.util.Set;
import manyskies.field.SkyField;

/**
 * Makes an {@link Estimator} for a given belief. Found by {@link java.util.ServiceLoader}: name the
 * implementation in {@code META-INF/services/manyskies.estimator.EstimatorFactory}.
 */
public interface EstimatorFactory {
    /** The estimator's name: lower case letters, digits and hyphens; stored with results. */
    String name();

    /** One line for people: what it does, and its source. */
    String summary();

    /** The fields it reads. */
    Set<SkyField> needs();

    /**
     * Builds the estimator.
     *
     * @param belief what the analysis believes; its transform may be used here, but not kept
     */
    Estimator prepare(Belief belief);
}
