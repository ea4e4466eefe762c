package manyskies.realisation;

import manyskies.estimator.Reconstruction;
import manyskies.field.ModeSubset;
import manyskies.response.LensAndCurl;

/** From an unnormalised reconstruction to phi and psi: 1 / R_L on the modes that are kept. */
final class Normalisation {
    private final ModeSubset kept;
    private final double[] inverseLens;
    private final double[] inverseCurl;

    private Normalisation(ModeSubset kept, double[] inverseLens, double[] inverseCurl) {
        this.kept = kept;
        this.inverseLens = inverseLens;
        this.inverseCurl = inverseCurl;
    }

    /**
     * The inverse of a response.
     *
     * @throws IllegalArgumentException if the response of a kept mode is not positive
     */
    static Normalisation of(String estimator, LensAndCurl response, ModeSubset kept) {
        return new Normalisation(
                kept,
                inverse(estimator, kept, response.lens()),
                inverse(estimator, kept, response.curl()));
    }

    private static double[] inverse(String estimator, ModeSubset kept, double[] ofMode) {
        double[] response = kept.pack(ofMode);
        double[] out = new double[response.length];
        for (int mode = 0; mode < out.length; mode++) {
            if (!(response[mode] > 0)) {
                throw new IllegalArgumentException(
                        "the response of estimator '"
                                + estimator
                                + "' is "
                                + response[mode]
                                + " at L = "
                                + kept.multipole(mode)
                                + "; it must be positive wherever bands reach: end the bands"
                                + " lower, widen the multipoles of the filter, or correct the"
                                + " estimator's weight");
            }
            out[mode] = 1 / response[mode];
        }
        return out;
    }

    /** phi and psi on the kept modes. */
    Reconstruction normalise(Reconstruction unnormalised) {
        return new Reconstruction(
                kept.pack(unnormalised.gradient(), inverseLens),
                kept.pack(unnormalised.curl(), inverseCurl));
    }

    /** N0 of phi per kept mode from the noise of the unnormalised estimate. */
    double[] lensNoise(LensAndCurl noise) {
        return timesSquare(kept.pack(noise.lens()), inverseLens);
    }

    /** N0 of psi per kept mode. */
    double[] curlNoise(LensAndCurl noise) {
        return timesSquare(kept.pack(noise.curl()), inverseCurl);
    }

    private static double[] timesSquare(double[] noise, double[] factor) {
        double[] out = new double[noise.length];
        for (int mode = 0; mode < out.length; mode++) {
            out[mode] = noise[mode] * factor[mode] * factor[mode];
        }
        return out;
    }
}
