package manyskies.estimator;

import java.util.List;

/**
 * How an estimator weights its legs: g_L = sum over parts of p(L) times the part's separable terms.
 *
 * @param parts the parts
 */
public record BilinearWeight(List<Part> parts) {

    /** Copies the list. */
    public BilinearWeight {
        parts = List.copyOf(parts);
    }

    /** A weight of separable terms without a factor. */
    public static BilinearWeight of(List<SeparableTerm> terms) {
        return new BilinearWeight(List.of(new Part(new double[0], new double[0], terms)));
    }

    /**
     * Terms under common factors of L.
     *
     * @param gradientFactor p(L) per mode of the gradient estimate, empty for 1; read only
     * @param curlFactor p(L) per mode of the curl estimate, empty for 1; read only
     * @param terms the terms
     */
    @SuppressWarnings("ArrayRecordComponent") // parts are compared by nobody
    public record Part(double[] gradientFactor, double[] curlFactor, List<SeparableTerm> terms) {

        /** Copies the list. */
        public Part {
            terms = List.copyOf(terms);
        }
    }
}
