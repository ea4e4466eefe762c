package manyskies.aggregate;

import java.util.Optional;

/**
 * The headline of one estimator.
 *
 * @param estimator its name
 * @param transfer is the transfer function one?
 * @param curl is the curl's cross-spectrum with phi zero, in units of the input spectrum?
 * @param n0 is the Monte Carlo n0 the analytic one?
 * @param debiasedWith which n0 was subtracted from the auto-spectrum
 * @param meanFieldRemoved whether the mean field was subtracted from it too
 * @param signalToNoise of an amplitude fitted to the debiased auto-spectrum of one sky
 */
public record EstimatorSummary(
        String estimator,
        Check transfer,
        Check curl,
        Check n0,
        Optional<String> debiasedWith,
        boolean meanFieldRemoved,
        Optional<Double> signalToNoise) {

    static EstimatorSummary of(EstimatorResult result) {
        return new EstimatorSummary(
                result.name(),
                result.transferCheck(),
                result.curlCheck(),
                result.n0Check(),
                result.debiasedWith(),
                result.meanField().isPresent(),
                result.signalToNoise());
    }
}
