package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.Arrays;
import java.util.Map;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class LensedGradientSpectraTest {
    private static final double WEAK = 1e-3; // the second order is then about 1e-3 of the first
    private static final int[] MULTIPOLES = {30, 300, 1000, 2000};

    private static Spectra unlensed;
    private static Spectra weak;
    private static Spectra weakLensed;
    private static Spectra weakGradient;

    @BeforeAll
    static void lens() throws IOException {
        unlensed = SpectraReaderTest.fiducial();
        weak = withPotential(WEAK);
        weakLensed = LensedSpectra.of(weak);
        weakGradient = LensedGradientSpectra.of(weak);
    }

    /**
     * First order in C^PP by brute force, flat sky. Found: 2.1e-3 (TE at l = 30) of the larger of
     * change and lost power; the flat sky itself is good to 1/l^2, the second order is 1e-3.
     */
    @ParameterizedTest
    @EnumSource(names = {"TT", "TE", "EE", "BB"})
    void weakLensingIsTheFirstOrder(Spectrum name) {
        assertThat(worst(weakGradient, name, new PerturbedSpectra(weak, true))).isLessThan(4e-3);
        assertThat(worst(weakLensed, name, new PerturbedSpectra(weak, false))).isLessThan(4e-3);
    }

    /** The twin: taking one kind for the other is seen by a wide margin. */
    @ParameterizedTest
    @EnumSource(names = {"TT", "TE", "EE", "BB"})
    void lensedIsNotLensedGradient(Spectrum name) {
        assertThat(worst(weakLensed, name, new PerturbedSpectra(weak, true))).isGreaterThan(2e-2);
    }

    /** Another: the largest lenses count; a sum that starts at L = 24 breaks the bound of 4e-3. */
    @ParameterizedTest
    @EnumSource(names = {"TT", "EE"})
    void theLargestLensesAreIn(Spectrum name) {
        assertThat(worst(weakGradient, name, new PerturbedSpectra(weak, true, 24)))
                .isGreaterThan(6e-3);
    }

    /** Largest deviation of the change, in units of the power lost (BB: of the change). */
    private static double worst(Spectra after, Spectrum name, PerturbedSpectra first) {
        double worst = 0;
        for (int l : MULTIPOLES) {
            double change = after.at(name, l) - weak.at(name, l);
            double expected = first.change(name, l);
            double scale = Math.max(Math.abs(expected), lost(name, l));
            worst = Math.max(worst, Math.abs(change - expected) / scale);
        }
        return worst;
    }

    private static double lost(Spectrum name, int l) {
        double variance = LensedSpectra.lensing(weak).variance();
        return l * (l + 1.0) * variance / 2 * Math.abs(weak.at(name, l));
    }

    @Test
    void withoutPotentialNothingChanges() {
        Spectra same = LensedGradientSpectra.of(withPotential(0));
        for (Spectrum name : Spectrum.values()) {
            double[] before = name == Spectrum.PP ? new double[6001] : unlensed.values(name);
            double[] after = same.values(name);
            for (int l = 0; l <= 6000; l++) {
                assertThat(after[l]).isCloseTo(before[l], within(1e-10 * Math.abs(before[l])));
            }
        }
    }

    private static Spectra withPotential(double factor) {
        double[] potential = unlensed.values(Spectrum.PP);
        Arrays.setAll(potential, l -> factor * potential[l]);
        return unlensed.with(Map.of(Spectrum.PP, potential));
    }
}
