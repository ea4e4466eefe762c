package manyskies.combine;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import manyskies.estimator.Belief;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.Estimator;
import manyskies.estimator.EstimatorFactory;
import manyskies.field.SkyField;
import manyskies.quadratic.QuadraticFactory;
import manyskies.response.AnalyticResponse;
import manyskies.response.LensAndCurl;

/**
 * The minimum-variance combination of tt, te, tb, ee and eb.
 *
 * <p>phi_MV = sum_a w_a phi_a, w = N^-1 1 / (1^T N^-1 1) per mode, N the full matrix of N0 (Hu and
 * Okamoto 2002, astro-ph/0111606); tb and eb are uncorrelated with the others by parity. Believed
 * totals set the weights, so that with other true spectra it is unbiased but no longer optimal.
 */
public final class MinimumVarianceFactory implements EstimatorFactory {
    private static final List<EstimatorFactory> PARTS =
            List.of(
                    new QuadraticFactory.Tt(),
                    new QuadraticFactory.Te(),
                    new QuadraticFactory.Ee(),
                    new QuadraticFactory.Tb(),
                    new QuadraticFactory.Eb());

    @Override
    public String name() {
        return "mv";
    }

    @Override
    public String summary() {
        return "minimum-variance combination of tt, te, tb, ee, eb"
                + " (Hu and Okamoto 2002, astro-ph/0111606)";
    }

    @Override
    public Set<SkyField> needs() {
        return EnumSet.allOf(SkyField.class);
    }

    @Override
    public Estimator prepare(Belief belief) {
        AnalyticResponse analytic = AnalyticResponse.of(belief);
        List<Estimator> estimators = new ArrayList<>();
        List<BilinearWeight> weights = new ArrayList<>();
        List<LensAndCurl> responses = new ArrayList<>();
        for (EstimatorFactory factory : PARTS) {
            Estimator estimator = factory.prepare(belief);
            BilinearWeight weight = estimator.weight().orElseThrow();
            estimators.add(estimator);
            weights.add(weight);
            responses.add(analytic.response(weight, belief.weights()));
        }
        LensAndCurl[][] noise = noiseMatrix(analytic, weights, belief);
        List<double[]> lens =
                CombinationWeights.of(
                        responses.stream().map(LensAndCurl::lens).toList(),
                        (a, b, mode) -> noise[a][b].lens()[mode],
                        belief::reconstructs);
        List<double[]> curl =
                CombinationWeights.of(
                        responses.stream().map(LensAndCurl::curl).toList(),
                        (a, b, mode) -> noise[a][b].curl()[mode],
                        belief::reconstructs);
        return new CombinedEstimator(name(), estimators, lens, curl);
    }

    private static LensAndCurl[][] noiseMatrix(
            AnalyticResponse analytic, List<BilinearWeight> weights, Belief belief) {
        int n = weights.size();
        LensAndCurl[][] noise = new LensAndCurl[n][n];
        for (int a = 0; a < n; a++) {
            for (int b = a; b < n; b++) {
                noise[a][b] = analytic.noise(weights.get(a), weights.get(b), belief.total());
                noise[b][a] = noise[a][b];
            }
        }
        return noise;
    }
}
