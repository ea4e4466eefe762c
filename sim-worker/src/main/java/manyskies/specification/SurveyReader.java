package manyskies.specification;

import java.util.List;
import java.util.Optional;
import org.snakeyaml.engine.v2.nodes.ScalarNode;

/** Reads the truth: beam, noise, splits, edge taper, curl, degree of the remapping splines. */
final class SurveyReader {
    static final List<String> KEYS =
            List.of("beam", "noise", "splits", "edge-taper", "curl", "spline-degree");

    private static final List<String> FIELDS = List.of("temperature", "polarisation");
    private static final List<String> NOISE_KEYS = List.of("depth", "knee", "slope");
    private static final int MOST_SPLITS = 64;
    private static final double STEEPEST = 10;
    private static final double MOST_CURL = 10;
    private static final int DEFAULT_DEGREE = 5;

    /** A pair of detectors measures T by the sum and Q, U by the difference: sqrt(2) more noise. */
    private static final double POLARISATION_OVER_TEMPERATURE = Math.sqrt(2);

    private final Section section;
    private final PatchReader.Shape shape;

    private SurveyReader(Section section, PatchReader.Shape shape) {
        this.section = section;
        this.shape = shape;
    }

    /** The survey; its numbers mean nothing if a fault was added. */
    static Survey read(Section section, PatchReader.Shape shape) {
        return new SurveyReader(section, shape).read();
    }

    private Survey read() {
        double beam = section.quantity("beam", 0, Quantity.ANGLE, true);
        requireBelowHalf("beam", beam);
        Section noise = section.section("noise", FIELDS);
        noise.require("temperature", "temperature: 5 uK-arcmin");
        Noise temperature = noise(noise, "temperature", Noise.white(Double.NaN));
        double depth = POLARISATION_OVER_TEMPERATURE * temperature.depth();
        Noise polarisation = noise(noise, "polarisation", Noise.white(depth));
        double splits = section.whole("splits", 1, 1, MOST_SPLITS);
        double taper = section.quantity("edge-taper", 0, Quantity.ANGLE, true);
        requireBelowHalf("edge-taper", taper);
        double curl =
                section.number(
                        "curl",
                        0,
                        c -> c >= 0 && c <= MOST_CURL,
                        "it must be a number from 0 to 10");
        double degree =
                section.number(
                        "spline-degree",
                        DEFAULT_DEGREE,
                        d -> d == 3 || d == 5 || d == 7,
                        "it must be 3, 5 or 7");
        return new Survey(beam, temperature, polarisation, (int) splits, taper, curl, (int) degree);
    }

    private void requireBelowHalf(String key, double angle) {
        double half = shape.shorterSide() / 2;
        if (angle >= half) {
            section.fault(
                    key,
                    "it must be less than half of the patch's shorter side, "
                            + Rounded.text(Math.toDegrees(half))
                            + " deg");
        }
    }

    private static Noise noise(Section noise, String field, Noise otherwise) {
        if (noise.node(field).orElse(null) instanceof ScalarNode) {
            return Noise.white(noise.quantity(field, Double.NaN, Quantity.DEPTH, false));
        }
        return noise.has(field) ? correlated(noise.section(field, NOISE_KEYS)) : otherwise;
    }

    private static Noise correlated(Section noise) {
        noise.require("depth", "depth: 5 uK-arcmin");
        double depth = noise.quantity("depth", Double.NaN, Quantity.DEPTH, false);
        double knee =
                noise.number("knee", 0, k -> k >= 0, "it must be a multipole, 0 for white noise");
        double slope =
                noise.number(
                        "slope",
                        0,
                        s -> s > 0 && s <= STEEPEST,
                        "it must be a positive number up to 10: N_l grows as l^-slope below the knee");
        together(noise, "knee", "slope", "write for example 'slope: 3', or leave out the knee");
        together(noise, "slope", "knee", "write for example 'knee: 800', or leave out the slope");
        return new Noise(depth, knee, slope);
    }

    private static void together(Section noise, String key, String other, String mend) {
        Optional<String> text = noise.has(other) ? Optional.empty() : noise.text(key, mend);
        text.ifPresent(found -> noise.fault(key, found + " without a " + other, mend));
    }
}
