package manyskies.instrument;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.offset;

import java.util.List;
import java.util.function.Function;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.flat.StokesMaps;
import manyskies.flat.StokesTransform;
import manyskies.random.Address;
import manyskies.sky.ChiSquared;
import manyskies.sky.GaussianSky;
import manyskies.sky.Tables;
import manyskies.sky.UnlensedSky;
import manyskies.specification.Noise;
import manyskies.specification.Survey;
import org.junit.jupiter.api.Test;

class ObserverTest {
    private static final double ARCMIN = Math.PI / 180 / 60;

    /** False-alarm rate of each statistical test, shared by its comparisons (Bonferroni). */
    private static final double FALSE_ALARM = 1e-6;

    private static final FlatGrid GRID = new FlatGrid(96, 120, 2 * ARCMIN);
    private static final Noise T = new Noise(6 * ARCMIN, 1500, 1.7);
    private static final Noise P = new Noise(9 * ARCMIN, 400, 2);
    private static final double LIMIT = 3000;
    private static final Address HERE = new Address(3, "noise", 0);

    private static Survey survey(double beam, int splits, double taper) {
        return new Survey(beam * ARCMIN, T, P, splits, taper * ARCMIN, 0, 3);
    }

    private static Observer observer(double beam, int splits, double taper) {
        return Observer.of(GRID, survey(beam, splits, taper), LIMIT);
    }

    private static StokesMaps sky() {
        UnlensedSky sky = GaussianSky.of(GRID, Tables.unlensed(), 0).draw(new Address(3, "sky", 0));
        return StokesTransform.of(ModeDisc.of(GRID, GRID.nyquist()))
                .synthesise(new CmbModes(sky.temperature(), sky.gradient(), Modes.zero(GRID)));
    }

    /** Exact: chi-squared law of the noise over its power, in five annuli and in all. */
    private static double worstTail(Observer observer, Function<CmbModes, Modes> field, Noise n) {
        double[] sum = new double[6];
        double[] degrees = new double[6];
        for (int index = 0; index < 20; index++) {
            Modes x =
                    field.apply(
                            observer.observe(
                                    StokesMaps.zero(GRID), new Address(3, "noise", index)));
            for (int mode = 1; mode < GRID.size(); mode++) {
                double l = GRID.multipole(mode);
                if (l <= LIMIT) {
                    double m = GRID.multiplicity(mode);
                    double variance = GRID.area() * power(n, l - 0.5);
                    for (int band : new int[] {(int) (5 * l / (LIMIT + 1)), 5}) {
                        sum[band] += m * x.realProduct(x, mode) / variance;
                        degrees[band] += m;
                    }
                }
            }
        }
        double worst = 1;
        for (int band = 0; band < 6; band++) {
            worst = Math.min(worst, ChiSquared.tail(sum[band], degrees[band]));
        }
        return worst;
    }

    /** N_l = w^2 [1 + (l_knee / l)^alpha], written out again. */
    private static double power(Noise n, double l) {
        return n.depth() * n.depth() * (1 + Math.pow(n.knee() / l, n.slope()));
    }

    @Test
    void noiseHasThePowerAskedFor() {
        Observer observer = observer(1.4, 1, 0);
        assertThat(worstTail(observer, CmbModes::temperature, T)).isGreaterThan(FALSE_ALARM / 18);
        assertThat(worstTail(observer, CmbModes::gradient, P)).isGreaterThan(FALSE_ALARM / 18);
        assertThat(worstTail(observer, CmbModes::curl, P)).isGreaterThan(FALSE_ALARM / 18);
    }

    /** Twin: five per cent of power; and a knee ten per cent too low. */
    @Test
    void theCheckSeesFivePerCent() {
        Observer observer = observer(1.4, 1, 0);
        Noise louder = new Noise(T.depth() * Math.sqrt(1.05), T.knee(), T.slope());
        Noise lower = new Noise(T.depth(), 0.9 * T.knee(), T.slope());
        assertThat(worstTail(observer, CmbModes::temperature, louder)).isLessThan(FALSE_ALARM / 18);
        assertThat(worstTail(observer, CmbModes::temperature, lower)).isLessThan(FALSE_ALARM / 18);
    }

    /** The mean of the splits' independent noises has the power of the whole. */
    @Test
    void splitsAddUpToTheDepthAskedFor() {
        assertThat(worstTail(observer(0, 4, 0), CmbModes::temperature, T))
                .isGreaterThan(FALSE_ALARM / 6);
    }

    @Test
    void theMeanOfTheSplitsIsTheObservation() {
        Observer observer = observer(1.4, 3, 0);
        StokesMaps sky = sky();
        CmbModes whole = observer.observe(sky, HERE);
        List<CmbModes> splits = observer.observeSplits(sky, HERE);
        assertThat(splits).hasSize(3);
        Modes sum =
                splits.get(0)
                        .curl()
                        .combine(1, splits.get(1).curl(), 1)
                        .combine(1, splits.get(2).curl(), 1);
        assertThat(relative(sum.combine(1.0 / 3, whole.curl(), -1), whole.curl()))
                .isLessThan(1e-14);
    }

    /** Three splits, each with three times the power, and no correlation between them. */
    @Test
    void splitsAreNoisierAndIndependent() {
        List<CmbModes> splits = observer(0, 3, 0).observeSplits(StokesMaps.zero(GRID), HERE);
        Modes one = observer(0, 1, 0).observe(StokesMaps.zero(GRID), HERE).temperature();
        Modes first = splits.get(0).temperature();
        assertThat(relative(first.combine(1, one, -Math.sqrt(3)), first)).isLessThan(1e-14);
        // whitened sums of two splits: variance 2 in each mode if they are independent
        Modes sum = first.combine(1, splits.get(1).temperature(), 1);
        double chi = 0;
        double degrees = 0;
        for (int mode = 1; mode < GRID.size(); mode++) {
            double l = GRID.multipole(mode);
            if (l <= LIMIT) {
                double variance = 6 * GRID.area() * power(T, l - 0.5);
                chi += GRID.multiplicity(mode) * sum.realProduct(sum, mode) / variance;
                degrees += GRID.multiplicity(mode);
            }
        }
        assertThat(ChiSquared.tail(chi, degrees)).isGreaterThan(FALSE_ALARM);
        assertThat(ChiSquared.tail(2 * chi, degrees)).isLessThan(FALSE_ALARM); // the same split
    }

    @Test
    void noiseOfAModeDoesNotDependOnTheLimit() {
        StokesMaps nothing = StokesMaps.zero(GRID);
        Modes all = observer(1, 2, 0).observe(nothing, HERE).gradient();
        Modes few = Observer.of(GRID, survey(1, 2, 0), 900).observe(nothing, HERE).gradient();
        int compared = 0;
        for (int mode = 0; mode < GRID.size(); mode++) {
            boolean kept = GRID.multipole(mode) <= 900;
            assertThat(few.re(mode)).isEqualTo(kept ? all.re(mode) : 0);
            assertThat(few.im(mode)).isEqualTo(kept ? all.im(mode) : 0);
            compared += kept ? 1 : 0;
        }
        assertThat(compared).isGreaterThan(100);
    }

    /** Exact: without noise, observed over true modes is exp(-l (l + 1) sigma^2 / 2). */
    @Test
    void theBeamMultipliesTheModes() {
        Noise none = new Noise(0, 0, 1);
        Survey survey = new Survey(3 * ARCMIN, none, none, 1, 0, 0, 3);
        CmbModes observed = Observer.of(GRID, survey, LIMIT).observe(sky(), HERE);
        CmbModes truth = StokesTransform.of(ModeDisc.of(GRID, LIMIT)).analyse(sky());
        double sigma = 3 * ARCMIN / Math.sqrt(8 * Math.log(2));
        double[] beam = new double[GRID.size()];
        for (int mode = 0; mode < beam.length; mode++) {
            double l = GRID.multipole(mode) - 0.5;
            beam[mode] = Math.exp(-l * (l + 1) * sigma * sigma / 2);
        }
        Modes expected = truth.gradient().times(beam);
        assertThat(relative(observed.gradient().combine(1, expected, -1), expected))
                .isLessThan(1e-13);
    }

    /** Exact: a Gaussian of FWHM theta has half its peak at theta / 2; its transform is B_l. */
    @Test
    void theBeamHasItsWidthInRealSpace() {
        double theta = 60 * ARCMIN;
        GaussianBeam beam = new GaussianBeam(theta);
        double peak = 0;
        double half = 0;
        double step = 0.1;
        for (double l = step; l < 3000; l += step) { // Hankel transform, l dl J0(l theta / 2)
            peak += l * beam.at(l - 0.5);
            half += l * beam.at(l - 0.5) * besselJ0(l * theta / 2);
        }
        assertThat(half / peak).isCloseTo(0.5, offset(1e-5));
    }

    private static double besselJ0(double x) {
        double sum = 0;
        int points = 400;
        for (int i = 0; i < points; i++) {
            sum += Math.cos(x * Math.sin(Math.PI * (i + 0.5) / points));
        }
        return sum / points;
    }

    /** Second method: beam and noise to maps, taper, and back, step by step. */
    @Test
    void theTaperMultipliesTheObservedMaps() {
        ModeDisc all = ModeDisc.of(GRID, GRID.nyquist());
        Survey bare = survey(1.4, 2, 0);
        CmbModes untapered = Observer.of(GRID, bare, GRID.nyquist()).observe(sky(), HERE);
        StokesMaps maps = StokesTransform.of(all).synthesise(untapered);
        EdgeTaper taper = EdgeTaper.of(GRID, 30 * ARCMIN);
        for (int pixel = 0; pixel < GRID.pixels(); pixel++) {
            double w = taper.at(pixel % GRID.nx(), pixel / GRID.nx());
            maps.t()[pixel] *= w;
            maps.q()[pixel] *= w;
            maps.u()[pixel] *= w;
        }
        CmbModes expected = StokesTransform.of(ModeDisc.of(GRID, LIMIT)).analyse(maps);
        CmbModes found = observer(1.4, 2, 30).observe(sky(), HERE);
        assertThat(relative(found.curl().combine(1, expected.curl(), -1), expected.curl()))
                .isLessThan(1e-12);
        StokesMaps seen = observer(1.4, 2, 30).observedMaps(sky(), HERE);
        assertThat(seen.u()).containsExactly(maps.u(), offset(1e-9));
    }

    @Test
    void impossibleInstrumentsAreRefused() {
        assertThatThrownBy(() -> observer(1, 0, 0))
                .hasMessage("a map has one split or more, found 0 splits");
        assertThatThrownBy(() -> observer(-1, 1, 0))
                .hasMessageStartingWith("a beam has a width of 0 or more, found -");
        assertThatThrownBy(() -> observer(1, 1, 97))
                .hasMessageContaining("an edge taper is wider than 0 and at most half a side")
                .hasMessageContaining("found 0.028");
    }

    private static double relative(Modes difference, Modes of) {
        double a = 0;
        double b = 0;
        for (int i = 0; i < of.values().length; i++) {
            a += difference.values()[i] * difference.values()[i];
            b += of.values()[i] * of.values()[i];
        }
        return Math.sqrt(a / b);
    }
}
