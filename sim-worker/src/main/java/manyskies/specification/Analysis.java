package manyskies.specification;

import java.io.Serializable;
import java.util.List;
import manyskies.spectrum.Bands;

/**
 * The belief: what filters and estimators assume and use.
 *
 * @param temperature multipoles of T that are used
 * @param polarisation multipoles of E and B that are used
 * @param weights spectra in the estimators' weights and responses
 * @param estimators names, in the order of the tables
 * @param bands bands of L of the reconstruction
 */
public record Analysis(
        MultipoleRange temperature,
        MultipoleRange polarisation,
        Weights weights,
        List<String> estimators,
        Bands bands)
        implements Serializable {

    /** Copies the list. */
    public Analysis {
        estimators = List.copyOf(estimators);
    }
}
