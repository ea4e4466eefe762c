package manyskies.specification;

import java.io.Serializable;

/**
 * Multipoles lmin &le; l &le; lmax.
 *
 * @param lmin smallest, included
 * @param lmax largest, included
 */
public record MultipoleRange(double lmin, double lmax) implements Serializable {

    /** Whether a multipole lies in the range. */
    public boolean contains(double l) {
        return l >= lmin && l <= lmax;
    }
}
