package manyskies.quadratic;

import java.util.List;
import java.util.Optional;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.Estimator;
import manyskies.estimator.LegMaps;
import manyskies.estimator.LegPair;
import manyskies.estimator.Reconstruction;
import manyskies.estimator.SeparableTerm;
import manyskies.estimator.SeparableTerm.Order;
import manyskies.field.GradientCurl;
import manyskies.field.Modes;
import manyskies.field.SkyTransform;
import manyskies.field.SpinMap;

/**
 * Any estimator that is a sum of separable terms.
 *
 * <p>v(x) = sum of V grad U and Re[P_V^* grad P_U]; g_L = -div v for the lens, and the rotation of
 * v for the curl. Both are parts of one spin-1 analysis: v_x + i v_y = synthesis of spin 1 of (g/L,
 * -c/L).
 */
public final class SeparableEstimator implements Estimator {
    private final String name;
    private final List<SeparableTerm> terms;

    /** An estimator of the given name and terms. */
    public SeparableEstimator(String name, List<SeparableTerm> terms) {
        this.name = name;
        this.terms = List.copyOf(terms);
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public Optional<BilinearWeight> weight() {
        return Optional.of(BilinearWeight.of(terms));
    }

    @Override
    public Reconstruction reconstruct(LegPair legs) {
        VectorSum sum = new VectorSum(legs.transform().pixels());
        for (SeparableTerm term : terms) {
            addTerm(sum, term, legs);
        }
        return split(legs.transform(), sum.map());
    }

    private static void addTerm(VectorSum sum, SeparableTerm term, LegPair legs) {
        if (legs.isOneSky() || term.order() == Order.FORWARD) {
            add(sum, term, legs.a(), legs.b(), 1);
        } else if (term.order() == Order.REVERSED) {
            add(sum, term, legs.b(), legs.a(), 1);
        } else {
            add(sum, term, legs.a(), legs.b(), 0.5);
            add(sum, term, legs.b(), legs.a(), 0.5);
        }
    }

    private static void add(
            VectorSum sum, SeparableTerm term, LegMaps u, LegMaps v, double factor) {
        switch (term.kind()) {
            case SCALAR ->
                    sum.addScalar(
                            factor, v.scalar(term.plainE()), u.scalarGradient(term.gradientE()));
            case POLARISED ->
                    sum.addPolarised(
                            factor,
                            v.polarised(term.plainE(), term.plainB()),
                            u.raised(term.gradientE(), term.gradientB()),
                            u.lowered(term.gradientE(), term.gradientB()));
        }
    }

    private static Reconstruction split(SkyTransform transform, SpinMap vector) {
        GradientCurl parts = transform.analyse(vector);
        return new Reconstruction(
                sloped(transform, parts.gradient(), 1), sloped(transform, parts.curl(), -1));
    }

    private static Modes sloped(SkyTransform transform, Modes modes, double sign) {
        double[] in = modes.values();
        double[] out = new double[in.length];
        for (int mode = 0; mode < out.length / 2; mode++) {
            double slope = sign * transform.slope(0, mode);
            out[2 * mode] = slope * in[2 * mode];
            out[2 * mode + 1] = slope * in[2 * mode + 1];
        }
        return Modes.of(modes.space(), out);
    }
}
