package manyskies.spectrum;

import java.io.Serializable;
import java.util.Arrays;

/**
 * Bands of multipoles: band b holds lower(b) &le; |l| &lt; lower(b + 1).
 *
 * <p>Immutable. Edges are dimensionless multipoles, rising.
 */
public final class Bands implements Serializable {
    private static final long serialVersionUID = 1L;

    private final double[] edges;

    private Bands(double[] edges) {
        this.edges = edges;
    }

    /**
     * Bands between neighbouring edges.
     *
     * @throws IllegalArgumentException if there are fewer than two edges, or they do not rise from
     *     0 or above
     */
    public static Bands between(double... edges) {
        if (edges.length < 2 || !(edges[0] >= 0)) {
            throw new IllegalArgumentException(
                    "bands need two or more edges from 0 up, found " + Arrays.toString(edges));
        }
        for (int i = 1; i < edges.length; i++) {
            if (!(edges[i] > edges[i - 1]) || !Double.isFinite(edges[i])) {
                throw new IllegalArgumentException(
                        "band edges rise, but " + edges[i] + " follows " + edges[i - 1]);
            }
        }
        return new Bands(edges.clone());
    }

    /** Number of bands. */
    public int count() {
        return edges.length - 1;
    }

    /** Lower edge of a band; it belongs to the band. */
    public double lower(int band) {
        return edges[band];
    }

    /** Upper edge of a band; it belongs to the next one. */
    public double upper(int band) {
        return edges[band + 1];
    }

    /** The band of a multipole, or -1 if it lies in none. */
    public int bandOf(double l) {
        if (!(l >= edges[0]) || l >= edges[edges.length - 1]) {
            return -1;
        }
        int at = Arrays.binarySearch(edges, l);
        return at >= 0 ? at : -at - 2;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Bands bands && Arrays.equals(edges, bands.edges);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(edges);
    }

    @Override
    public String toString() {
        return "bands " + Arrays.toString(edges);
    }
}
