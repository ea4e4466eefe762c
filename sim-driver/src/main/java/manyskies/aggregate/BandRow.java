package manyskies.aggregate;

import manyskies.statistic.Measurement;

/**
 * A row of the table of bandpowers.
 *
 * @param estimator name of the estimator, or {@code input}
 * @param quantity what was measured or computed
 * @param band running number of the band, from 0
 * @param lMin its lower edge
 * @param lMax its upper edge
 * @param lMean mean |L| of its modes
 * @param measurement value, error and count; error and count are 0 for what was computed
 */
public record BandRow(
        String estimator,
        String quantity,
        int band,
        double lMin,
        double lMax,
        double lMean,
        Measurement measurement) {}
