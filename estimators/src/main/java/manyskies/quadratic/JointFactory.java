package manyskies.quadratic;

import static manyskies.field.SkyField.B;
import static manyskies.field.SkyField.E;
import static manyskies.field.SkyField.T;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import manyskies.estimator.Belief;
import manyskies.estimator.Estimator;
import manyskies.estimator.EstimatorFactory;
import manyskies.estimator.LegField;
import manyskies.estimator.SeparableTerm;
import manyskies.estimator.SeparableTerm.Order;
import manyskies.field.SkyField;
import manyskies.spectrum.Spectrum;

/**
 * The joint (global) minimum-variance estimator of Maniyar et al. 2021 (2101.12193).
 *
 * <p>With (T_bar, E_bar, B_bar) = C_tot^-1 (T, E, B) and the Wiener-filtered X_wf = C X_bar: v =
 * T_bar grad T_wf + Re[P_bar^* grad P_wf], g = -div v.
 */
public final class JointFactory implements EstimatorFactory {
    @Override
    public String name() {
        return "joint";
    }

    @Override
    public String summary() {
        return "all fields, filtered jointly: global minimum variance"
                + " (Maniyar et al. 2021, 2101.12193)";
    }

    @Override
    public Set<SkyField> needs() {
        return EnumSet.allOf(SkyField.class);
    }

    @Override
    public Estimator prepare(Belief belief) {
        LegField t = belief.jointlyFiltered(T);
        LegField e = belief.jointlyFiltered(E);
        LegField b = belief.jointlyFiltered(B);
        double[] te = belief.weights().of(Spectrum.TE);
        LegField wienerT = t.times(belief.weights().of(Spectrum.TT)).plus(e.times(te));
        LegField wienerE = t.times(te).plus(e.times(belief.weights().of(Spectrum.EE)));
        LegField wienerB = b.times(belief.weights().of(Spectrum.BB));
        return new SeparableEstimator(
                name(),
                List.of(
                        SeparableTerm.scalar(Order.SYMMETRIC, wienerT, t),
                        SeparableTerm.polarised(Order.SYMMETRIC, wienerE, wienerB, e, b)));
    }
}
