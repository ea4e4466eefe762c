package manyskies.field;

/**
 * The set of modes in which fields of one geometry are expanded.
 *
 * <p>A mode is addressed by an index from 0 to {@link #size()} - 1. Fields are real, so that one
 * stored mode may stand for itself and its conjugate. Two spaces are equal exactly when modes of
 * one may be combined with modes of the other.
 */
public interface ModeSpace {
    /** Number of stored modes. */
    int size();

    /** The multipole |l| of a mode in this geometry, dimensionless. */
    double multipole(int mode);

    /**
     * The multipole at which tables of full-sky C_l are read for this mode. On a flat patch it is
     * |l| - 1/2, because flat |l| corresponds to l + 1/2 of the sphere.
     */
    double fullSkyMultipole(int mode);

    /**
     * How many modes of the whole plane a stored one stands for: 2 where its conjugate is not
     * stored, 1 where it is or where the mode is its own conjugate.
     */
    int multiplicity(int mode);

    /** Area of the sky in steradian: {@code <X_l Y_l'^*> = area delta_ll' C_l}. */
    double area();
}
