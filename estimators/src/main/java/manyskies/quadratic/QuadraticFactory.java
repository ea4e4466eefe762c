package manyskies.quadratic;

import static manyskies.estimator.SeparableTerm.Order.FORWARD;
import static manyskies.estimator.SeparableTerm.Order.REVERSED;
import static manyskies.estimator.SeparableTerm.Order.SYMMETRIC;
import static manyskies.estimator.SeparableTerm.polarised;
import static manyskies.estimator.SeparableTerm.scalar;
import static manyskies.field.SkyField.B;
import static manyskies.field.SkyField.E;
import static manyskies.field.SkyField.T;

import java.util.List;
import java.util.Set;
import java.util.function.Function;
import manyskies.estimator.Belief;
import manyskies.estimator.Estimator;
import manyskies.estimator.EstimatorFactory;
import manyskies.estimator.LegField;
import manyskies.estimator.SeparableTerm;
import manyskies.field.SkyField;
import manyskies.spectrum.Spectrum;

/**
 * The separable quadratic estimators of Okamoto and Hu 2003 (astro-ph/0301031).
 *
 * <p>With X_bar = X / C^XX_tot and l1 + l2 = L, phi12 = phi_l1 - phi_l2, each is g_L = (1/A) sum
 * f(l1, l2) X_bar_l1 Y_bar_l2 (half of it for equal fields), f as in that paper's table 1, with
 * X = the first letter of the name, Y the second, and te with separable weights.
 */
public abstract class QuadraticFactory implements EstimatorFactory {
    private final String name;
    private final String summary;
    private final Set<SkyField> needs;
    private final Function<Belief, List<SeparableTerm>> terms;

    private QuadraticFactory(
            String name,
            String summary,
            Set<SkyField> needs,
            Function<Belief, List<SeparableTerm>> terms) {
        this.name = name;
        this.summary = summary + " (Okamoto and Hu 2003, astro-ph/0301031)";
        this.needs = needs;
        this.terms = terms;
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public String summary() {
        return summary;
    }

    @Override
    public Set<SkyField> needs() {
        return needs;
    }

    @Override
    public Estimator prepare(Belief belief) {
        return new SeparableEstimator(name, terms.apply(belief));
    }

    /** Temperature with itself: f = C1^TT L.l1 + C2^TT L.l2. */
    public static final class Tt extends QuadraticFactory {
        /** For the service loader. */
        public Tt() {
            super(
                    "tt",
                    "temperature with itself",
                    Set.of(T),
                    b -> List.of(scalar(SYMMETRIC, b.weighted(T, Spectrum.TT), b.filtered(T))));
        }
    }

    /** Temperature with E: f = C1^TE cos(2 phi12) L.l1 + C2^TE L.l2. */
    public static final class Te extends QuadraticFactory {
        /** For the service loader. */
        public Te() {
            super("te", "temperature with E polarisation", Set.of(T, E), Te::terms);
        }

        private static List<SeparableTerm> terms(Belief b) {
            LegField weightedT = b.weighted(T, Spectrum.TE);
            LegField weightedE = b.weighted(E, Spectrum.TE);
            return List.of(
                    polarised(FORWARD, weightedT, null, b.filtered(E), null),
                    scalar(REVERSED, weightedE, b.filtered(T)));
        }
    }

    /** Temperature with B: f = C1^TE sin(2 phi12) L.l1. */
    public static final class Tb extends QuadraticFactory {
        /** For the service loader. */
        public Tb() {
            super(
                    "tb",
                    "temperature with B polarisation",
                    Set.of(T, B),
                    b ->
                            List.of(
                                    polarised(
                                            FORWARD,
                                            b.weighted(T, Spectrum.TE),
                                            null,
                                            null,
                                            b.filtered(B))));
        }
    }

    /** E with itself: f = (C1^EE L.l1 + C2^EE L.l2) cos(2 phi12). */
    public static final class Ee extends QuadraticFactory {
        /** For the service loader. */
        public Ee() {
            super(
                    "ee",
                    "E polarisation with itself",
                    Set.of(E),
                    b ->
                            List.of(
                                    polarised(
                                            SYMMETRIC,
                                            b.weighted(E, Spectrum.EE),
                                            null,
                                            b.filtered(E),
                                            null)));
        }
    }

    /** E with B: f = (C1^EE L.l1 + C2^BB L.l2) sin(2 phi12). */
    public static final class Eb extends QuadraticFactory {
        /** For the service loader. */
        public Eb() {
            super("eb", "E polarisation with B polarisation", Set.of(E, B), Eb::terms);
        }

        private static List<SeparableTerm> terms(Belief b) {
            LegField weightedE = b.weighted(E, Spectrum.EE);
            LegField weightedB = b.weighted(B, Spectrum.BB);
            return List.of(
                    polarised(FORWARD, weightedE, null, null, b.filtered(B)),
                    polarised(REVERSED, null, weightedB, b.filtered(E), null));
        }
    }
}
