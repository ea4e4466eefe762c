package manyskies.aggregate;

import java.util.List;
import java.util.Optional;
import manyskies.statistic.Covariance;

/**
 * The covariance of one realisation's debiased bandpowers, of all estimators.
 *
 * <p>What debiasing subtracts is the same for all realisations, so that this is the covariance of
 * the auto-spectra themselves.
 *
 * @param estimators estimators that are in it; each has all bands, in this order
 * @param bands number of bands
 * @param covariance absent with fewer than two realisations
 */
public record LabelledCovariance(
        List<String> estimators, int bands, Optional<Covariance> covariance) {

    /** Copies the list. */
    public LabelledCovariance {
        estimators = List.copyOf(estimators);
    }

    /** Number of rows and columns. */
    public int size() {
        return covariance.map(Covariance::size).orElse(0);
    }

    /** The estimator of a row or column. */
    public String estimator(int index) {
        return estimators.get(index / bands);
    }

    /** The band of a row or column. */
    public int band(int index) {
        return index % bands;
    }
}
