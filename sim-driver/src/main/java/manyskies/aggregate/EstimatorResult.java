package manyskies.aggregate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import manyskies.statistic.Covariance;
import manyskies.statistic.MeanVector;
import manyskies.statistic.Measurement;

/**
 * What follows for one estimator from the sums of both sets.
 *
 * <ul>
 *   <li>transfer r_b = sum C[phi-hat, phi-in] / sum C[phi-in, phi-in], with the ratio's own error; its
 *       test asks whether the mean of C[phi-hat, phi-in] - C[phi-in, phi-in] is zero, which is the
 *       same statement and follows Hotelling's law without linearising.
 *   <li>debiased = auto - n0 - mean_field: n0 from pairs where there are any, else the analytic one.
 *       It still holds N1. Errors are added in quadrature: auto, n0_mc and mean_field come from
 *       different pairs of skies and are uncorrelated for a Gaussian reconstruction.
 *   <li>signal-to-noise of an amplitude fitted to one sky's debiased bands with weights d_b / C_bb,
 *       sum w d / sqrt(w^T C w): correlations are in the error, not in the weights.
 * </ul>
 */
final class EstimatorResult {
    private static final String INPUT = "input.auto";

    private final String name;
    private final AnalyticBands known;
    private final SetStatistics data;
    private final SetStatistics pairs;
    private final Optional<List<Measurement>> meanField;

    EstimatorResult(
            String name,
            AnalyticBands known,
            SetStatistics data,
            SetStatistics pairs,
            FieldHalves halves) {
        this.name = name;
        this.known = known;
        this.data = data;
        this.pairs = pairs;
        this.meanField = halves.spectrum(name, known.bandpowers());
    }

    String name() {
        return name;
    }

    private int bands() {
        return known.bands().count();
    }

    private String column(String quantity) {
        return name + "." + quantity;
    }

    Optional<List<Measurement>> meanField() {
        return meanField;
    }

    /** The transfer function, if its columns are there. */
    Optional<MeanVector> transfer() {
        return data.vector(column("cross_input"), INPUT).map(MeanVector::ratio);
    }

    /** Is the transfer function one? */
    Check transferCheck() {
        String numerator = column("cross_input");
        return data.vector(numerator, INPUT)
                .map(both -> Check.of(1, both.ratio(), both.difference(), 0))
                .map(check -> withJackknife(check, numerator))
                .orElseGet(() -> absent(1, data, numerator, INPUT));
    }

    /** Is the cross-spectrum of the curl estimate with phi zero? Shown in units of the input's. */
    Check curlCheck() {
        String numerator = column("curl_cross");
        int[] first = firstBands();
        return data.vector(numerator, INPUT)
                .map(both -> Check.of(0, both.ratio(), both.select(first), 0))
                .map(check -> withJackknife(check, numerator))
                .orElseGet(() -> absent(0, data, numerator, INPUT));
    }

    /** Is the Monte Carlo N0 the analytic one? */
    Check n0Check() {
        Optional<double[]> analytic = known.vector(column("n0_analytic"));
        if (analytic.isEmpty()) {
            String reason = "no analytic n0 was handed over for " + name;
            return Check.notMeasured(1, pairs.count(), bands(), reason);
        }
        return pairs.vector(column("n0_mc"))
                .map(n0 -> n0.dividedBy(analytic.get()))
                .map(ratio -> Check.of(1, ratio, ratio, 1))
                .orElseGet(() -> absent(1, pairs, column("n0_mc")));
    }

    private int[] firstBands() {
        int[] first = new int[bands()];
        for (int band = 0; band < first.length; band++) {
            first[band] = band;
        }
        return first;
    }

    private Check absent(double expected, SetStatistics set, String... columns) {
        String reason =
                set.count() < 2
                        ? "set " + set.set() + " has " + set.count() + " realisations"
                        : "set " + set.set() + " lacks one of " + List.of(columns);
        return Check.notMeasured(expected, set.count(), bands(), reason);
    }

    /** With the weights of the whole sample, so that only the data move between blocks. */
    private Check withJackknife(Check check, String numerator) {
        if (check.mean().isEmpty()) {
            return check;
        }
        double[] weights = data.vector(numerator, INPUT).orElseThrow().ratio().inverseVariances();
        return check.withJackknife(
                data.jackknife((sums, count) -> meanRatio(sums, weights), numerator, INPUT)
                        .map(jackknife -> jackknife.error(0)));
    }

    private static double[] meanRatio(double[] sums, double[] weights) {
        double mean = 0;
        for (int band = 0; band < weights.length; band++) {
            mean += weights[band] * (sums[band] / sums[weights.length + band]);
        }
        return new double[] {mean};
    }

    /** Which n0 is subtracted: the name of its quantity, or nothing if there is none. */
    Optional<String> debiasedWith() {
        if (pairs.vector(column("n0_mc")).isPresent()) {
            return Optional.of("n0_mc");
        }
        return known.vector(column("n0_analytic")).map(vector -> "n0_analytic");
    }

    /** The debiased auto-spectrum, if there is something to subtract. */
    Optional<List<Measurement>> debiased() {
        Optional<MeanVector> auto = data.vector(column("auto"));
        if (auto.isEmpty() || debiasedWith().isEmpty()) {
            return Optional.empty();
        }
        List<Measurement> out = new ArrayList<>();
        for (int band = 0; band < bands(); band++) {
            Measurement left = auto.get().measurement(band).minus(n0(band));
            out.add(meanField.isPresent() ? left.minus(meanField.get().get(band)) : left);
        }
        return Optional.of(out);
    }

    private Measurement n0(int band) {
        return pairs.vector(column("n0_mc"))
                .map(n0 -> n0.measurement(band))
                .orElseGet(
                        () ->
                                Measurement.computed(
                                        known.vector(column("n0_analytic")).orElseThrow()[band]));
    }

    /** Signal-to-noise of the debiased auto-spectrum of one sky. */
    Optional<Double> signalToNoise() {
        Optional<List<Measurement>> signal = debiased();
        if (signal.isEmpty()) {
            return Optional.empty();
        }
        Covariance c = data.vector(column("auto")).orElseThrow().covariance();
        double[] weights = new double[bands()];
        double sum = 0;
        for (int band = 0; band < weights.length; band++) {
            double d = signal.get().get(band).value();
            if (!(c.value(band, band) > 0)) {
                return Optional.empty();
            }
            weights[band] = d / c.value(band, band);
            sum += weights[band] * d;
        }
        double variance = c.varianceOf(weights);
        return variance > 0 ? Optional.of(sum / Math.sqrt(variance)) : Optional.empty();
    }
}
