package manyskies.combine;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.Estimator;
import manyskies.estimator.LegPair;
import manyskies.estimator.Reconstruction;

/** A sum of estimators with a factor per estimator and mode. */
final class CombinedEstimator implements Estimator {
    private final String name;
    private final List<Estimator> parts;
    private final List<double[]> lensFactors;
    private final List<double[]> curlFactors;

    CombinedEstimator(
            String name,
            List<Estimator> parts,
            List<double[]> lensFactors,
            List<double[]> curlFactors) {
        this.name = name;
        this.parts = List.copyOf(parts);
        this.lensFactors = List.copyOf(lensFactors);
        this.curlFactors = List.copyOf(curlFactors);
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public Reconstruction reconstruct(LegPair legs) {
        Reconstruction sum = part(legs, 0);
        for (int a = 1; a < parts.size(); a++) {
            sum = sum.plus(part(legs, a));
        }
        return sum;
    }

    private Reconstruction part(LegPair legs, int a) {
        return legs.reconstruct(parts.get(a)).times(lensFactors.get(a), curlFactors.get(a));
    }

    @Override
    public Optional<BilinearWeight> weight() {
        List<BilinearWeight.Part> all = new ArrayList<>();
        for (int a = 0; a < parts.size(); a++) {
            for (BilinearWeight.Part part : parts.get(a).weight().orElseThrow().parts()) {
                all.add(
                        new BilinearWeight.Part(
                                lensFactors.get(a), curlFactors.get(a), part.terms()));
            }
        }
        return Optional.of(new BilinearWeight(all));
    }
}
