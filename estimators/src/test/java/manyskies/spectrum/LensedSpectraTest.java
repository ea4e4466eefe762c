package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class LensedSpectraTest {
    /** Found: below 3e-5 for 2 <= l < 3000. Needed: 1e-3, and 5e-3 in BB. */
    private static final double TOLERANCE = 1e-4;

    private static final Spectrum[] LENSED = {Spectrum.TT, Spectrum.EE, Spectrum.BB, Spectrum.TE};

    private static Spectra unlensed;
    private static Spectra lensed;
    private static Spectra reference;
    private static Spectra damped;
    private static Spectra dampedLensed;

    @BeforeAll
    static void lens() throws IOException {
        unlensed = SpectraReaderTest.fiducial();
        reference = SpectraReaderTest.lensedTable();
        lensed = LensedSpectra.of(unlensed);
        damped = damped();
        dampedLensed = LensedSpectra.of(damped);
    }

    /** Largest |a - b| for 2 <= l < 3000 relative to b, for TE to sqrt(TT EE). */
    private static double worst(Spectrum name, Spectra a, Spectra b) {
        double worst = 0;
        for (int l = 2; l < 3000; l++) {
            double scale =
                    name == Spectrum.TE
                            ? Math.sqrt(b.at(Spectrum.TT, l) * b.at(Spectrum.EE, l))
                            : b.at(name, l);
            worst = Math.max(worst, Math.abs(a.at(name, l) - b.at(name, l)) / scale);
        }
        return worst;
    }

    /**
     * The table lensed by an independent program from tails that its header describes
     * (conf/spectra/fiducial_lensed.txt).
     */
    @ParameterizedTest
    @EnumSource(names = {"TT", "EE", "BB", "TE"})
    void spectraAgreeWithTheLensedTable(Spectrum name) {
        assertThat(worst(name, lensed, reference)).isLessThan(TOLERANCE);
    }

    /** The twin: the comparison sees half a per cent on one spectrum. */
    @ParameterizedTest
    @EnumSource(names = {"TT", "EE", "BB", "TE"})
    void theComparisonSeesHalfAPerCent(Spectrum name) {
        double[] off = lensed.values(name);
        Arrays.setAll(off, l -> 1.005 * off[l]);
        assertThat(worst(name, lensed.with(Map.of(name, off)), reference))
                .isGreaterThan(20 * TOLERANCE);
    }

    /** Half a per cent on the potential is seen too, in every spectrum. */
    @Test
    void theComparisonSeesHalfAPerCentOfThePotential() {
        Spectra off = LensedSpectra.of(withPotential(1.005));
        assertThat(worst(Spectrum.BB, off, reference)).isGreaterThan(20 * TOLERANCE);
        assertThat(worst(Spectrum.TT, off, reference)).isGreaterThan(2 * TOLERANCE);
        assertThat(worst(Spectrum.EE, off, reference)).isGreaterThan(2 * TOLERANCE);
        assertThat(worst(Spectrum.TE, off, reference)).isGreaterThan(2 * TOLERANCE);
    }

    @Test
    void withoutPotentialNothingChanges() {
        Spectra same = LensedSpectra.of(withPotential(0));
        for (Spectrum name : LENSED) {
            double[] before = unlensed.values(name);
            double[] after = same.values(name);
            for (int l = 0; l <= 6000; l++) {
                assertThat(after[l]).isCloseTo(before[l], within(1e-10 * Math.abs(before[l])));
            }
        }
    }

    @Test
    void thePotentialAndItsCrossSpectraStay() {
        assertThat(lensed.lmax()).isEqualTo(6000);
        for (Spectrum name : new Spectrum[] {Spectrum.PP, Spectrum.TP, Spectrum.EP}) {
            assertThat(lensed.values(name)).isEqualTo(unlensed.values(name));
        }
    }

    /**
     * Lensing moves points about, so the variance of T, and of Q and U, is what it was. Damped
     * spectra and potential, for which no lensed power lies above the table.
     */
    @Test
    void powerIsOnlyMoved() {
        assertThat(moved(1, Spectrum.TT)).isLessThan(3e-4);
        assertThat(moved(1, Spectrum.EE, Spectrum.BB)).isLessThan(3e-4);
    }

    /** The twin: 0.5 per cent too much of the lensed power between l = 1000 and 2000 is seen. */
    @Test
    void theVarianceSeesHalfAPerCent() {
        assertThat(moved(1.005, Spectrum.TT)).isGreaterThan(1e-3);
        assertThat(moved(1.005, Spectrum.EE, Spectrum.BB)).isGreaterThan(1e-3);
    }

    /** Sum of (2l+1)(lensed - unlensed) over l, relative to the sum of moduli. */
    private static double moved(double factor, Spectrum... names) {
        double sum = 0;
        double modulus = 0;
        for (int l = 2; l <= 6000; l++) {
            double change = 0;
            for (Spectrum name : names) {
                double f = l >= 1000 && l < 2000 ? factor : 1;
                change += (2 * l + 1) * (f * dampedLensed.at(name, l) - damped.at(name, l));
            }
            sum += change;
            modulus += Math.abs(change);
        }
        return Math.abs(sum) / modulus;
    }

    private static Spectra damped() {
        Map<Spectrum, double[]> damped = new EnumMap<>(Spectrum.class);
        for (Spectrum name : Spectrum.values()) {
            double[] values = unlensed.values(name);
            Arrays.setAll(values, l -> values[l] * Math.exp(-(double) l * l / (1200.0 * 1200.0)));
            damped.put(name, values);
        }
        return unlensed.with(damped);
    }

    /** The rms deflection in the header of the lensed table, 2.4419 arcmin. */
    @Test
    void rmsDeflectionIsThatOfTheHeader() {
        double rms = Math.sqrt(LensedSpectra.lensing(unlensed).variance());
        assertThat(Math.toDegrees(rms) * 60).isCloseTo(2.4419, within(5e-5));
    }

    /** A table cut at l = 4000 lenses to the same for l < 3000: the continuation is harmless. */
    @Test
    void whereTheTableEndsHardlyMatters() {
        Spectra cut = LensedSpectra.of(cutAt(4000));
        assertThat(cut.lmax()).isEqualTo(4000);
        assertThat(worst(Spectrum.TT, cut, lensed)).isLessThan(1e-3);
        assertThat(worst(Spectrum.EE, cut, lensed)).isLessThan(1e-3);
        assertThat(worst(Spectrum.BB, cut, lensed)).isLessThan(5e-3);
    }

    @Test
    void aShortTableIsRefused() {
        assertThatThrownBy(() -> LensedSpectra.of(cutAt(50)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("unlensed spectra end at l = 50; lensing them needs l = 100 or more");
    }

    private static Spectra withPotential(double factor) {
        double[] potential = unlensed.values(Spectrum.PP);
        Arrays.setAll(potential, l -> factor * potential[l]);
        return unlensed.with(Map.of(Spectrum.PP, potential));
    }

    private static Spectra cutAt(int lmax) {
        Map<Spectrum, double[]> cut = new EnumMap<>(Spectrum.class);
        for (Spectrum name : Spectrum.values()) {
            cut.put(name, Arrays.copyOf(unlensed.values(name), lmax + 1));
        }
        return Spectra.of(lmax, cut);
    }
}
