package manyskies.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.List;
import manyskies.spectrum.LensedGradientSpectra;
import manyskies.spectrum.Spectra;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Published statements on the noise of lensing reconstruction, on the fiducial spectra.
 *
 * <p>The default tests use lensed spectra in the weights and a patch of 6.4 degrees; the slow ones
 * lensed-gradient spectra and one of 12.8 degrees. T, E, B with l = 2 .. 3500, noise of E and B
 * sqrt(2) times that of T.
 */
class PublishedNoiseTest {
    private static final int SMALL = 128;
    private static final int LARGE = 256;

    private record Fiducial(Spectra lensed, Spectra unlensed, Spectra used) {
        static Fiducial quick() throws IOException {
            Spectra lensed = RealSurvey.fiducial("lensed");
            return new Fiducial(lensed, RealSurvey.fiducial("unlensed"), lensed);
        }

        static Fiducial exact() throws IOException {
            Spectra unlensed = RealSurvey.fiducial("unlensed");
            return new Fiducial(
                    RealSurvey.fiducial("lensed"), unlensed, LensedGradientSpectra.of(unlensed));
        }

        RealSurvey survey(int pixels, double depth, double beam) {
            return new RealSurvey(pixels, depth, beam, lensed, used);
        }
    }

    /** N0 of all pairs with E or B, over that of tt, near L = 80; 4 arcmin beam. */
    private static double polarisationOverTemperature(Fiducial sky, int pixels, double depth) {
        RealSurvey survey = sky.survey(pixels, depth, 4);
        double[] even = survey.n0OfBoth("te", "ee");
        double[] odd = survey.n0OfBoth("tb", "eb"); // uncorrelated with the even ones by parity
        double[] both = new double[even.length];
        for (int mode = 0; mode < both.length; mode++) {
            both[mode] = even[mode] * odd[mode] / (even[mode] + odd[mode]);
        }
        double[] temperature = survey.n0("tt", "tt");
        double to = pixels == SMALL ? 100 : 60;
        return survey.mean(20, to, both) / survey.mean(20, to, temperature);
    }

    /**
     * "Polarisation's reconstruction overtakes temperature's at about 26 uK-arcmin and a 4' beam"
     * (Hu and Okamoto 2002, astro-ph/0111606, abstract, as our notes quote it).
     *
     * <p>The sentence leaves open which pairs and which noise. Read as all pairs with polarisation
     * (te, ee, tb, eb) against tt on the largest scales, at 26 uK-arcmin of temperature noise, it
     * holds within a fifth: we find 23 uK-arcmin for L &lt; 60 and 21 at L = 60 to 100. Without te and
     * tb the crossing is far off, at 10 (15 of polarisation noise).
     */
    @Test
    @Tag("slow")
    void polarisationOvertakesTemperatureNear26() throws IOException {
        Fiducial sky = Fiducial.exact();
        double below = 26 / 1.2;
        double above = 26 * 1.2;
        assertThat(polarisationOverTemperature(sky, LARGE, below)).isLessThan(1);
        assertThat(polarisationOverTemperature(sky, LARGE, above)).isGreaterThan(1);
    }

    /** The same within a factor of 1.5, on the small patch's lowest modes, near L = 70. */
    @Test
    void polarisationOvertakesTemperatureWithinHalfOf26() throws IOException {
        Fiducial sky = Fiducial.quick();
        assertThat(polarisationOverTemperature(sky, SMALL, 26 / 1.5)).isLessThan(1);
        assertThat(polarisationOverTemperature(sky, SMALL, 26 * 1.5)).isGreaterThan(1);
    }

    /** N0 of eb over C_L^phiphi near some L, at 0.3 uK-arcmin and 3 arcmin. */
    private static double noiseOverLenses(Fiducial sky, int pixels, double l) {
        RealSurvey survey = sky.survey(pixels, 0.3, 3);
        double[] lenses = survey.lenses(sky.unlensed());
        double[] noise = survey.n0("eb", "eb");
        return survey.mean(l - 50, l + 50, noise) / survey.mean(l - 50, l + 50, lenses);
    }

    /**
     * "EB maps mass mode by mode to L ~ 1000 at 0.3 uK-arcmin and 3'" (the same abstract): N0
     * crosses C_L^phiphi within a fifth of L = 1000. We find L = 1055, and 1150 if 0.3 uK-arcmin is
     * the noise of polarisation.
     */
    @ParameterizedTest
    @CsvSource({"833, 0", "1200, 1"})
    void ebMapsMassModeByModeToAThousand(double l, int above) throws IOException {
        double ratio = noiseOverLenses(Fiducial.quick(), SMALL, l);
        assertThat(ratio > 1 ? 1 : 0).as("N0 / C is %s at L = %s", ratio, l).isEqualTo(above);
    }

    /** The same within a tenth, with lensed-gradient weights on the large patch. */
    @Test
    @Tag("slow")
    void ebMapsMassModeByModeToAThousandWithinATenth() throws IOException {
        Fiducial sky = Fiducial.exact();
        assertThat(noiseOverLenses(sky, LARGE, 1000 / 1.1)).isLessThan(1);
        assertThat(noiseOverLenses(sky, LARGE, 1000 * 1.1)).isGreaterThan(1);
    }

    /**
     * The joint estimator is never noisier than mv, and up to some 9 per cent quieter (Maniyar et al.
     * 2021, 2101.12193): here by at most 10 and, where T and E matter alike, by at least 3.
     */
    @ParameterizedTest
    @CsvSource({"26, 4", "3, 3"})
    void theJointEstimatorIsQuieterThanMvByLessThanATenth(double depth, double beam)
            throws IOException {
        RealSurvey survey = Fiducial.quick().survey(SMALL, depth, beam);
        double[] joint = survey.n0("joint", "joint");
        double[] mv = survey.n0("mv", "mv");
        double smallest = 1;
        for (int mode = 0; mode < joint.length; mode++) {
            if (survey.reconstructs(mode)) {
                double ratio = joint[mode] / mv[mode];
                assertThat(ratio).as("L = %s", survey.multipole(mode)).isBetween(0.9, 1 + 1e-10);
                smallest = Math.min(smallest, ratio);
            }
        }
        assertThat(smallest).isLessThan(0.97);
    }

    /** Exact: filters that are the true totals make N0 = 1 / R, on real spectra as well. */
    @Test
    void optimalFiltersMakeTheNoiseOneOverTheResponse() throws IOException {
        RealSurvey survey = Fiducial.quick().survey(SMALL, 10, 4);
        for (String name : List.of("tt", "ee", "eb", "tb", "joint")) {
            double[] noise = survey.n0(name, name);
            double[] response = survey.response(name);
            for (int mode = 0; mode < noise.length; mode++) {
                if (survey.reconstructs(mode)) {
                    assertThat(noise[mode] * response[mode])
                            .as("%s at L = %s", name, survey.multipole(mode))
                            .isBetween(1 - 1e-9, 1 + 1e-9);
                }
            }
        }
    }
}
