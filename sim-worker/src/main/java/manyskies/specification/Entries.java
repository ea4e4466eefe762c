package manyskies.specification;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import manyskies.spectrum.Bands;

/**
 * A specification as pairs of a key with its dots, such as {@code survey.beam}, and its value as it
 * is written in YAML, in canonical order and with nothing left to defaults. The spectra are not
 * among them: they are numbers, not text.
 */
final class Entries {
    private final Map<String, String> entries = new LinkedHashMap<>();

    private Entries() {}

    static Map<String, String> of(Specification specification) {
        Entries all = new Entries();
        all.entries.put("name", specification.name());
        all.entries.put("seed", Long.toString(specification.seed()));
        all.add(specification.patch());
        all.add(specification.survey());
        all.add(specification.analysis());
        all.entries.put("sets.data", Integer.toString(specification.sets().data()));
        all.entries.put("sets.pairs", Integer.toString(specification.sets().pairs()));
        all.entries.put("block", Integer.toString(specification.block()));
        return all.entries;
    }

    private void add(Patch patch) {
        entries.put("patch.pixels", "[" + patch.nx() + ", " + patch.ny() + "]");
        entries.put("patch.pixel-size", Quantity.ANGLE.text(patch.pixel()));
    }

    private void add(Survey survey) {
        entries.put("survey.beam", angleOrNone(survey.beam()));
        entries.put("survey.noise.temperature", text(survey.temperature()));
        entries.put("survey.noise.polarisation", text(survey.polarisation()));
        entries.put("survey.splits", Integer.toString(survey.splits()));
        entries.put("survey.edge-taper", angleOrNone(survey.edgeTaper()));
        entries.put("survey.curl", Decimal.text(survey.curl()));
        entries.put("survey.spline-degree", Integer.toString(survey.splineDegree()));
    }

    private void add(Analysis analysis) {
        entries.put("analysis.temperature", text(analysis.temperature()));
        entries.put("analysis.polarisation", text(analysis.polarisation()));
        entries.put("analysis.weights", AnalysisReader.written(analysis.weights().name()));
        entries.put("analysis.estimators", "[" + String.join(", ", analysis.estimators()) + "]");
        entries.put("analysis.bands", text(analysis.bands()));
    }

    private static String angleOrNone(double angle) {
        return angle == 0 ? "none" : Quantity.ANGLE.text(angle);
    }

    private static String text(Noise noise) {
        String depth = Quantity.DEPTH.text(noise.depth());
        return noise.knee() == 0
                ? depth
                : mapping(
                        "depth: " + depth,
                        "knee: " + Decimal.text(noise.knee()),
                        "slope: " + Decimal.text(noise.slope()));
    }

    private static String text(MultipoleRange range) {
        return mapping(
                "lmin: " + Decimal.text(range.lmin()), "lmax: " + Decimal.text(range.lmax()));
    }

    /** By from, to and width where these give the very same edges. */
    private static String text(Bands bands) {
        double from = bands.lower(0);
        double width = bands.upper(0) - from;
        boolean even =
                IntStream.range(0, bands.count())
                        .allMatch(b -> BandsReader.edge(from, width, b + 1) == bands.upper(b));
        double to = bands.upper(bands.count() - 1);
        if (even) {
            return mapping(
                    "from: " + Decimal.text(from),
                    "to: " + Decimal.text(to),
                    "width: " + Decimal.text(width));
        }
        Stream<Double> edges =
                IntStream.rangeClosed(0, bands.count())
                        .mapToObj(b -> b == 0 ? from : bands.upper(b - 1));
        return mapping(
                "edges: [" + edges.map(Decimal::text).collect(Collectors.joining(", ")) + "]");
    }

    private static String mapping(String... pairs) {
        return "{" + String.join(", ", pairs) + "}";
    }
}
