package manyskies.spectrum;

import java.util.Arrays;

/**
 * Second method: response of quadratic estimators by direct two-dimensional quadrature.
 *
 * <p>R_L = int d^2l1/(2pi)^2 w f, l2 = L - l1; w = f/(2 C1 C2) for TT and EE, f/(C1 C2) for TE, TB,
 * EB; f as Hu and Okamoto 2002 (astro-ph/0111606); C = lensed + noise/beam^2 between two
 * multipoles. Polar coordinates about l1 = 0; for each |l1| the angles are those with |l2| between
 * the same limits, so that the integrand has no jump. Spectra are read at |l|.
 */
final class DirectResponse {
    private static final double LOW = 100;
    private static final double HIGH = 2000;
    private static final double ARCMIN = Math.PI / 180 / 60;
    private static final double BEAM = 5 * ARCMIN / Math.sqrt(8 * Math.log(2));
    private static final double NOISE = 30 * ARCMIN;
    private static final int ANGLES = 300;
    private static final GaussLegendre UNIT = GaussLegendre.on(0, 1, ANGLES);

    private final Spectra weights;
    private final Spectra lensed;
    private final boolean withBb;

    DirectResponse(Spectra weights, Spectra lensed, boolean withBb) {
        this.weights = weights;
        this.lensed = lensed;
        this.withBb = withBb;
    }

    /** R_L of an estimator named by its column in the check file, "TT" to "EB". */
    double of(String estimator, double lens) {
        double[] breaks = {
            LOW, HIGH, Math.abs(lens - LOW), lens + LOW, HIGH - lens, lens - HIGH, lens
        };
        Arrays.sort(breaks);
        double sum = 0;
        for (int i = 1; i < breaks.length; i++) {
            double from = Math.max(LOW, breaks[i - 1]);
            double to = Math.min(HIGH, breaks[i]);
            if (to > from) {
                sum += panel(estimator, lens, from, to);
            }
        }
        return sum / (4 * Math.PI * Math.PI);
    }

    private double panel(String estimator, double lens, double from, double to) {
        GaussLegendre rule = GaussLegendre.on(from, to, 20 + (int) ((to - from) / 4));
        double sum = 0;
        for (int i = 0; i < rule.count(); i++) {
            double l1 = rule.node(i);
            double first = Math.acos(cosine(lens, l1, LOW));
            double last = Math.acos(cosine(lens, l1, HIGH));
            double ring = 0;
            for (int k = 0; k < ANGLES; k++) {
                double angle = first + (last - first) * UNIT.node(k);
                ring += UNIT.weight(k) * integrand(estimator, lens, l1, angle);
            }
            sum += rule.weight(i) * l1 * 2 * (last - first) * ring; // both signs of the angle
        }
        return sum;
    }

    /** Of the angle between L and l1 where |l2| has a value; the end of the range if nowhere. */
    private static double cosine(double lens, double l1, double l2) {
        double value = (lens * lens + l1 * l1 - l2 * l2) / (2 * lens * l1);
        return Math.max(-1, Math.min(1, value));
    }

    private double integrand(String estimator, double lens, double l1, double angle) {
        double x1 = l1 * Math.cos(angle);
        double y1 = l1 * Math.sin(angle);
        double x2 = lens - x1;
        double l2 = Math.hypot(x2, y1);
        double twice = 2 * (angle - Math.atan2(-y1, x2));
        double a = lens * x1;
        double b = lens * x2;
        double f =
                switch (estimator) {
                    case "TT" -> c(Spectrum.TT, l1) * a + c(Spectrum.TT, l2) * b;
                    case "TE" -> c(Spectrum.TE, l1) * Math.cos(twice) * a + c(Spectrum.TE, l2) * b;
                    case "EE" ->
                            (c(Spectrum.EE, l1) * a + c(Spectrum.EE, l2) * b) * Math.cos(twice);
                    case "TB" -> c(Spectrum.TE, l1) * Math.sin(twice) * a;
                    case "EB" ->
                            (c(Spectrum.EE, l1) * a + (withBb ? c(Spectrum.BB, l2) * b : 0))
                                    * Math.sin(twice);
                    default -> throw new IllegalArgumentException(estimator);
                };
        char x = estimator.charAt(0);
        char y = estimator.charAt(1);
        return f * f / ((x == y ? 2 : 1) * total(x, l1) * total(y, l2));
    }

    private double c(Spectrum name, double l) {
        return weights.at(name, l);
    }

    private double total(char field, double l) {
        double noise = NOISE * NOISE * Math.exp(l * l * BEAM * BEAM);
        return switch (field) {
            case 'T' -> lensed.at(Spectrum.TT, l) + noise;
            case 'E' -> lensed.at(Spectrum.EE, l) + 2 * noise;
            default -> lensed.at(Spectrum.BB, l) + 2 * noise;
        };
    }
}
