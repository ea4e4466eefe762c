package manyskies.aggregate;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import manyskies.field.ModeSpace;
import manyskies.spectrum.Bandpowers;
import manyskies.spectrum.Bands;

/**
 * What is known of a run before its first sky: estimators, bands, and numbers that are computed.
 *
 * <p>Vectors hold one number per band under names like those of a block's columns: {@code
 * tt.response}, {@code tt.n0_analytic}, {@code tt.curl_n0_analytic}, or others; each becomes rows of
 * the table. Immutable.
 */
public final class AnalyticBands {
    private final List<String> estimators;
    private final Bands bands;
    private final ModeSpace space;
    private final Bandpowers bandpowers;
    private final SortedMap<String, double[]> vectors;

    private AnalyticBands(
            List<String> estimators,
            Bands bands,
            ModeSpace space,
            SortedMap<String, double[]> vectors) {
        this.estimators = estimators;
        this.bands = bands;
        this.space = space;
        this.bandpowers = Bandpowers.of(space, bands);
        this.vectors = vectors;
    }

    /**
     * The known numbers of a run; arrays are copied.
     *
     * @param estimators names in the order of the tables
     * @param bands bands of L
     * @param space the modes of reconstructions, as in the blocks' field sums
     * @param vectors {@code estimator.quantity} to one number per band
     * @throws IllegalArgumentException if a vector has another length or a number that is not
     *     finite, or a band holds no mode
     */
    public static AnalyticBands of(
            List<String> estimators, Bands bands, ModeSpace space, Map<String, double[]> vectors) {
        SortedMap<String, double[]> copy = new TreeMap<>();
        vectors.forEach((name, vector) -> copy.put(name, checked(name, vector, bands.count())));
        return new AnalyticBands(List.copyOf(estimators), bands, space, copy);
    }

    private static double[] checked(String name, double[] vector, int bands) {
        if (vector.length != bands) {
            throw new IllegalArgumentException(
                    name + " has " + vector.length + " numbers, the run has " + bands + " bands");
        }
        for (int band = 0; band < bands; band++) {
            if (!Double.isFinite(vector[band])) {
                throw new IllegalArgumentException(
                        name + " is " + vector[band] + " in band " + band + "; it is finite");
            }
        }
        return vector.clone();
    }

    /** Names of the estimators, in the order of the tables. */
    public List<String> estimators() {
        return estimators;
    }

    /** The bands of L. */
    public Bands bands() {
        return bands;
    }

    ModeSpace space() {
        return space;
    }

    Bandpowers bandpowers() {
        return bandpowers;
    }

    /** A vector by its whole name. */
    Optional<double[]> vector(String name) {
        return Optional.ofNullable(vectors.get(name));
    }

    /** Names of all vectors, sorted. */
    List<String> names() {
        return List.copyOf(vectors.keySet());
    }
}
