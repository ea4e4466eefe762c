package manyskies.estimator;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.field.SkyField;
import manyskies.flat.FlatGrid;
import manyskies.flat.FlatTransform;
import manyskies.quadratic.SmallSky;
import manyskies.response.AnalyticResponse;
import manyskies.response.LensAndCurl;
import org.junit.jupiter.api.Test;

/**
 * What every estimator keeps, to be inherited by its test; the author of a plug-in writes
 *
 * <pre>
 *   class MineContractTest extends EstimatorContract {
 *       MineContractTest() {
 *           super(new MineFactory());
 *       }
 *   }
 * </pre>
 *
 * <p>All checks are exact ones on small patches of random modes; tolerances are relative to the
 * norm of the whole array. Needs neither files nor Spark.
 */
public abstract class EstimatorContract {
    /** Of the norm; rounding of a few transforms is some 1e-15. */
    private static final double ROUNDING = 1e-11;

    private static final FlatGrid RECTANGLE = SmallSky.GRID;
    private static final FlatGrid SQUARE = new FlatGrid(32, 32, 1.2e-3);

    private final EstimatorFactory factory;

    /** The contract of the estimators a factory makes. */
    protected EstimatorContract(EstimatorFactory factory) {
        this.factory = factory;
    }

    @Test
    final void itsNameIsFitToBeStored() {
        assertThat(factory.name()).matches("[a-z][a-z0-9]*(-[a-z0-9]+)*");
        assertThat(factory.prepare(SmallSky.belief()).name()).isEqualTo(factory.name());
    }

    @Test
    final void itSaysWhatItDoesAndReads() {
        assertThat(factory.summary()).isNotBlank().doesNotContain("\n");
        assertThat(factory.needs()).isNotEmpty();
    }

    /** META-INF/services/manyskies.estimator.EstimatorFactory names it. */
    @Test
    final void itIsFoundUnderItsName() {
        assertThat(Estimators.named(factory.name())).isExactlyInstanceOf(factory.getClass());
    }

    /** The estimate of (x a + y a', b) is x times that of (a, b) plus y times that of (a', b). */
    @Test
    final void itIsLinearInEachLeg() {
        Belief belief = SmallSky.belief();
        CmbModes a = SmallSky.legs(1);
        CmbModes other = SmallSky.legs(2);
        CmbModes b = SmallSky.legs(3);
        CmbModes sum = SkyMotion.combine(a, 0.7, other, -1.9);
        assertSame(
                belief,
                reconstruct(belief, sum, b),
                combine(reconstruct(belief, a, b), 0.7, reconstruct(belief, other, b), -1.9));
        assertSame(
                belief,
                reconstruct(belief, b, sum),
                combine(reconstruct(belief, b, a), 0.7, reconstruct(belief, b, other), -1.9));
    }

    /** A sky on its own is that sky as either leg, and not another code path. */
    @Test
    final void oneSkyIsTwoEqualSkies() {
        Belief belief = SmallSky.belief();
        CmbModes sky = SmallSky.legs(4);
        LegMaps maps = belief.maps(sky);
        Reconstruction one = factory.prepare(belief).reconstruct(belief.pair(maps, maps));
        assertSame(belief, one, reconstruct(belief, sky, SmallSky.legs(4)));
    }

    /** Fields it does not need change no bit; each that it needs changes the estimate. */
    @Test
    final void itReadsTheFieldsItNeedsAndNoOther() {
        Belief belief = SmallSky.belief();
        CmbModes a = SmallSky.legs(5);
        CmbModes b = SmallSky.legs(6);
        Reconstruction whole = reconstruct(belief, a, b);
        for (SkyField field : SkyField.values()) {
            Modes strange = SmallSky.legs(7).of(field);
            Reconstruction changed =
                    reconstruct(
                            belief,
                            SkyMotion.with(a, field, strange),
                            SkyMotion.with(b, field, strange));
            if (factory.needs().contains(field)) {
                double moved = distance(belief, changed.gradient(), whole.gradient());
                assertThat(moved).as("read %s", field).isGreaterThan(1e-3);
            } else {
                assertSameBits(changed, whole);
            }
        }
    }

    @Test
    final void theSameLegsGiveTheSameBits() {
        Belief belief = SmallSky.belief();
        Estimator estimator = factory.prepare(belief);
        Reconstruction first = estimator.reconstruct(pair(belief, 8, 9));
        estimator.reconstruct(pair(belief, 10, 8)); // leaves nothing behind
        assertSameBits(estimator.reconstruct(pair(belief, 8, 9)), first);
        assertSameBits(factory.prepare(belief).reconstruct(pair(belief, 8, 9)), first);
        Belief fresh = SmallSky.belief();
        assertSameBits(factory.prepare(fresh).reconstruct(pair(fresh, 8, 9)), first);
    }

    /** Threads share an estimator and bring transforms of their own; it must use those. */
    @Test
    final void itUsesTheTransformOfItsLegsAlone() {
        FlatTransform first = FlatTransform.of(RECTANGLE, 2 * SmallSky.LMAX);
        Belief belief = SmallSky.belief().on(first);
        Belief other = belief.on(FlatTransform.of(RECTANGLE, 2 * SmallSky.LMAX));
        Estimator estimator = factory.prepare(belief);
        Reconstruction expected = estimator.reconstruct(pair(belief, 21, 22));
        long before = first.transforms();
        assertSameBits(estimator.reconstruct(pair(other, 21, 22)), expected);
        assertThat(first.transforms()).isEqualTo(before);
    }

    /** Maps are shared; who comes first must not matter, and nobody writes to them. */
    @Test
    final void otherEstimatorsOnTheSameLegsChangeNothing() {
        Belief belief = SmallSky.belief();
        Estimator estimator = factory.prepare(belief);
        LegPair legs = pair(belief, 11, 12);
        Reconstruction before = estimator.reconstruct(legs);
        Map<String, Reconstruction> after = new TreeMap<>();
        Estimators.installed().values().stream()
                .map(other -> other.prepare(belief))
                .forEach(other -> after.put(other.name(), other.reconstruct(legs)));
        assertSameBits(estimator.reconstruct(legs), before);
        after.forEach(
                (name, found) -> {
                    Estimator other = Estimators.named(name).prepare(belief);
                    assertSameBits(other.reconstruct(pair(belief, 11, 12)), found);
                });
    }

    /** Parity, y to -y with U to -U: E and phi keep their sign, B and psi change it. */
    @Test
    final void theMirroredSkyHasTheMirroredEstimate() {
        Belief belief = SmallSky.belief();
        CmbModes a = SmallSky.legs(13);
        CmbModes b = SmallSky.legs(14);
        Reconstruction plain = reconstruct(belief, a, b);
        Reconstruction mirrored = reconstruct(belief, SkyMotion.mirrored(a), SkyMotion.mirrored(b));
        Modes phi = SkyMotion.mirrored(plain.gradient());
        Modes psi = SkyMotion.mirrored(plain.curl());
        assertSame(belief, mirrored, new Reconstruction(phi, psi.combine(-1, psi, 0)));
    }

    /** By 90 degrees on a square patch; E, B, phi and psi are scalars. */
    @Test
    final void theTurnedSkyHasTheTurnedEstimate() {
        Belief belief = SmallSky.belief(SQUARE);
        CmbModes a = SmallSky.legs(SQUARE, 15);
        CmbModes b = SmallSky.legs(SQUARE, 16);
        Reconstruction plain = reconstruct(belief, a, b);
        Reconstruction turned = reconstruct(belief, SkyMotion.turned(a), SkyMotion.turned(b));
        assertSame(
                belief,
                turned,
                new Reconstruction(
                        SkyMotion.turned(plain.gradient()), SkyMotion.turned(plain.curl())));
    }

    /** By a fraction of a pixel, so that a product that aliases is seen as well. */
    @Test
    final void theShiftedSkyHasTheShiftedEstimate() {
        Belief belief = SmallSky.belief();
        double dx = 3.3 * RECTANGLE.pixel();
        double dy = -1.6 * RECTANGLE.pixel();
        CmbModes a = SmallSky.legs(17);
        CmbModes b = SmallSky.legs(18);
        Reconstruction plain = reconstruct(belief, a, b);
        Reconstruction shifted =
                reconstruct(belief, SkyMotion.shifted(a, dx, dy), SkyMotion.shifted(b, dx, dy));
        assertSame(
                belief,
                shifted,
                new Reconstruction(
                        SkyMotion.shifted(plain.gradient(), dx, dy),
                        SkyMotion.shifted(plain.curl(), dx, dy)));
    }

    /** A declared weight, written out as a sum over the plane, is what the estimator does. */
    @Test
    final void theDeclaredWeightIsItsOwn() {
        Belief belief = SmallSky.belief();
        Optional<BilinearWeight> weight = factory.prepare(belief).weight();
        if (weight.isPresent()) {
            CmbModes a = SmallSky.legs(19);
            CmbModes b = SmallSky.legs(20);
            DeclaredSum sum = new DeclaredSum(RECTANGLE, weight.orElseThrow());
            assertSame(
                    belief, reconstruct(belief, a, b), sum.reconstruct(a, b, belief::reconstructs));
        }
    }

    /** An estimate that cannot be normalised, or that is free of noise, is a wrong one. */
    @Test
    final void theDeclaredWeightCanBeNormalised() {
        Belief belief = SmallSky.belief();
        Optional<BilinearWeight> weight = factory.prepare(belief).weight();
        if (weight.isPresent()) {
            BilinearWeight w = weight.orElseThrow();
            AnalyticResponse analytic = AnalyticResponse.of(belief);
            LensAndCurl response = analytic.response(w, belief.weights());
            LensAndCurl noise = analytic.noise(w, w, belief.total());
            for (int mode = 0; mode < RECTANGLE.size(); mode++) {
                if (belief.reconstructs(mode)) {
                    assertThat(Math.abs(response.lens()[mode])).isPositive().isFinite();
                    assertThat(noise.lens()[mode]).isPositive().isFinite();
                    assertThat(noise.curl()[mode]).isPositive().isFinite();
                }
            }
        }
    }

    private Reconstruction reconstruct(Belief belief, CmbModes a, CmbModes b) {
        return factory.prepare(belief).reconstruct(belief.pair(belief.maps(a), belief.maps(b)));
    }

    private static LegPair pair(Belief belief, long a, long b) {
        return belief.pair(belief.maps(SmallSky.legs(a)), belief.maps(SmallSky.legs(b)));
    }

    private static Reconstruction combine(
            Reconstruction r, double x, Reconstruction other, double y) {
        return new Reconstruction(
                r.gradient().combine(x, other.gradient(), y), r.curl().combine(x, other.curl(), y));
    }

    private static void assertSameBits(Reconstruction found, Reconstruction expected) {
        assertThat(found.gradient().values()).isEqualTo(expected.gradient().values());
        assertThat(found.curl().values()).isEqualTo(expected.curl().values());
    }

    private static void assertSame(Belief belief, Reconstruction found, Reconstruction expected) {
        Map<String, Double> error = new LinkedHashMap<>();
        error.put("phi", distance(belief, found.gradient(), expected.gradient()));
        error.put("psi", distance(belief, found.curl(), expected.curl()));
        assertThat(error).allSatisfy((part, e) -> assertThat(e).isLessThan(ROUNDING));
    }

    /** The norm of the difference over that of the expected, over the modes reconstructed. */
    private static double distance(Belief belief, Modes found, Modes expected) {
        double difference = 0;
        double norm = 0;
        for (int mode = 0; mode < found.space().size(); mode++) {
            if (belief.reconstructs(mode)) {
                difference += square(found.re(mode) - expected.re(mode));
                difference += square(found.im(mode) - expected.im(mode));
                norm += square(expected.re(mode)) + square(expected.im(mode));
            }
        }
        assertThat(norm).isPositive();
        return Math.sqrt(difference / norm);
    }

    private static double square(double x) {
        return x * x;
    }
}
