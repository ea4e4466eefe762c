package manyskies.estimator;

import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import manyskies.field.Modes;
import manyskies.field.SkyField;
import manyskies.field.SkyTransform;
import manyskies.quadratic.QuadraticFactory;
import org.junit.jupiter.api.Test;

/** The contract itself: a fault of each kind is caught by the check made for it. */
class EstimatorContractTest {
    private static final Set<SkyField> E_AND_B = EnumSet.of(SkyField.E, SkyField.B);

    /** EB under its own name, with a fault in what it does. */
    private static final class Faulty implements EstimatorFactory {
        private final Set<SkyField> needs;
        private final UnaryOperator<Estimator> fault;

        Faulty(Set<SkyField> needs, UnaryOperator<Estimator> fault) {
            this.needs = needs;
            this.fault = fault;
        }

        @Override
        public String name() {
            return "eb";
        }

        @Override
        public String summary() {
            return "";
        }

        @Override
        public Set<SkyField> needs() {
            return needs;
        }

        @Override
        public Estimator prepare(Belief belief) {
            return fault.apply(new QuadraticFactory.Eb().prepare(belief));
        }
    }

    private static final class Contract extends EstimatorContract {
        Contract(Set<SkyField> needs, UnaryOperator<Estimator> fault) {
            super(new Faulty(needs, fault));
        }
    }

    /** An estimator that does what a function makes of the right one. */
    private static UnaryOperator<Estimator> doing(
            BiFunction<Estimator, LegPair, Reconstruction> fault) {
        return right ->
                new Estimator() {
                    @Override
                    public String name() {
                        return right.name();
                    }

                    @Override
                    public Reconstruction reconstruct(LegPair legs) {
                        return fault.apply(right, legs);
                    }

                    @Override
                    public Optional<BilinearWeight> weight() {
                        return right.weight();
                    }
                };
    }

    private static void assertSeen(
            Set<SkyField> needs,
            UnaryOperator<Estimator> fault,
            Consumer<EstimatorContract> check) {
        EstimatorContract right = new Contract(E_AND_B, UnaryOperator.identity());
        assertThatCode(() -> check.accept(right)).doesNotThrowAnyException();
        assertCaught(new Contract(needs, fault), check);
    }

    private static void assertCaught(EstimatorContract faulty, Consumer<EstimatorContract> check) {
        assertThatThrownBy(() -> check.accept(faulty)).isInstanceOf(AssertionError.class);
    }

    private static void assertSeen(
            BiFunction<Estimator, LegPair, Reconstruction> fault,
            Consumer<EstimatorContract> check) {
        assertSeen(E_AND_B, doing(fault), check);
    }

    private static Reconstruction plus(Reconstruction r, Modes phi, double factor) {
        return new Reconstruction(r.gradient().combine(1, phi, factor), r.curl());
    }

    @Test
    void anEmptySummaryIsSeen() {
        assertCaught(
                new Contract(E_AND_B, UnaryOperator.identity()),
                EstimatorContract::itSaysWhatItDoesAndReads);
    }

    @Test
    void aFactoryThatIsNotInstalledIsSeen() {
        assertCaught(
                new Contract(E_AND_B, UnaryOperator.identity()),
                EstimatorContract::itIsFoundUnderItsName);
    }

    /** A part in 10^6 of a term of second order in leg a. */
    @Test
    void aSquareIsSeen() {
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    return plus(r, r.gradient(), 1e-6 * legs.a().legs().gradient().re(1));
                },
                EstimatorContract::itIsLinearInEachLeg);
    }

    /** Temperature itself, added to the lens without being declared. */
    @Test
    void aFieldReadInSecretIsSeen() {
        assertSeen(
                (right, legs) -> plus(right.reconstruct(legs), legs.a().legs().temperature(), 1),
                EstimatorContract::itReadsTheFieldsItNeedsAndNoOther);
    }

    @Test
    void aFieldDeclaredInVainIsSeen() {
        assertSeen(
                EnumSet.allOf(SkyField.class),
                doing(Estimator::reconstruct),
                EstimatorContract::itReadsTheFieldsItNeedsAndNoOther);
    }

    /** An estimator that counts its calls. */
    @Test
    void aMemoryIsSeen() {
        int[] calls = new int[1];
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    return plus(r, r.gradient(), 1e-12 * calls[0]++);
                },
                EstimatorContract::theSameLegsGiveTheSameBits);
    }

    /** One that works with the first transform it ever saw, which is another thread's by then. */
    @Test
    void aTransformKeptIsSeen() {
        SkyTransform[] first = new SkyTransform[1];
        assertSeen(
                (right, legs) -> {
                    first[0] = first[0] == null ? legs.transform() : first[0];
                    first[0].synthesise(0, legs.a().legs().temperature(), null);
                    return right.reconstruct(legs);
                },
                EstimatorContract::itUsesTheTransformOfItsLegsAlone);
    }

    /** One that spoils a map which it shares with others. */
    @Test
    void aMapWrittenToIsSeen() {
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    SeparableTerm first =
                            right.weight().orElseThrow().parts().get(0).terms().get(0);
                    legs.b().polarised(first.plainE(), first.plainB()).re()[0] += 1;
                    return r;
                },
                EstimatorContract::otherEstimatorsOnTheSameLegsChangeNothing);
    }

    /** A curl that leaks into the lens, a part in 10^6: parity sees it, rotation cannot. */
    @Test
    void aLeakOfOtherParityIsSeen() {
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    return plus(r, r.curl(), 1e-6);
                },
                EstimatorContract::theMirroredSkyHasTheMirroredEstimate);
    }

    /** A preferred place: the real part of the mode (1, 0) a part in 10^6 too large. */
    @Test
    void aPreferredPlaceIsSeen() {
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    double[] phi = r.gradient().values().clone();
                    phi[2] *= 1 + 1e-6;
                    return new Reconstruction(Modes.of(r.gradient().space(), phi), r.curl());
                },
                EstimatorContract::theShiftedSkyHasTheShiftedEstimate);
    }

    /** A preferred direction: the mode (1, 0) a part in 10^6 too large. */
    @Test
    void aPreferredDirectionIsSeen() {
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    double[] phi = r.gradient().values().clone();
                    phi[2] *= 1 + 1e-6;
                    phi[3] *= 1 + 1e-6;
                    return new Reconstruction(Modes.of(r.gradient().space(), phi), r.curl());
                },
                EstimatorContract::theTurnedSkyHasTheTurnedEstimate);
    }

    /** A lens a part in 10^6 larger than declared. */
    @Test
    void aWeightThatIsNotItsOwnIsSeen() {
        assertSeen(
                (right, legs) -> {
                    Reconstruction r = right.reconstruct(legs);
                    return plus(r, r.gradient(), 1e-6);
                },
                EstimatorContract::theDeclaredWeightIsItsOwn);
    }

    /** A declared weight that has no response at all. */
    @Test
    void aWeightWithoutResponseIsSeen() {
        assertSeen(
                E_AND_B,
                right ->
                        new Estimator() {
                            @Override
                            public String name() {
                                return right.name();
                            }

                            @Override
                            public Reconstruction reconstruct(LegPair legs) {
                                return right.reconstruct(legs);
                            }

                            @Override
                            public Optional<BilinearWeight> weight() {
                                return Optional.of(new BilinearWeight(List.of()));
                            }
                        },
                EstimatorContract::theDeclaredWeightCanBeNormalised);
    }
}
