package manyskies.specification;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import manyskies.spectrum.Bands;

/** Reads the belief: multipoles of the filters, weights, estimators, bands. */
final class AnalysisReader {
    static final List<String> KEYS =
            List.of("temperature", "polarisation", "weights", "estimators", "bands");

    private static final List<String> RANGE_KEYS = List.of("lmin", "lmax");
    private static final List<String> WEIGHTS =
            Stream.of(Weights.values()).map(Enum::name).map(AnalysisReader::written).toList();
    private static final List<String> DEFAULT_ESTIMATORS =
            List.of("tt", "te", "tb", "ee", "eb", "mv", "joint");
    private static final double DEFAULT_LMIN = 100;
    private static final double DEFAULT_LMAX = 3000;

    /** Above this part of the Nyquist multipole remapping loses power even with high degrees. */
    private static final double PART_OF_NYQUIST = 0.75;

    private final Section section;
    private final PatchReader.Shape shape;
    private final double tableLmax;
    private final Set<String> known;

    private AnalysisReader(
            Section section, PatchReader.Shape shape, double tableLmax, Set<String> known) {
        this.section = section;
        this.shape = shape;
        this.tableLmax = tableLmax;
        this.known = known;
    }

    /**
     * The analysis; none if a fault was added.
     *
     * @param tableLmax the last multipole of the spectra; NaN if they are faulty
     * @param known names of the estimators that are installed
     */
    static Optional<Analysis> read(
            Section section, PatchReader.Shape shape, double tableLmax, Set<String> known) {
        return new AnalysisReader(section, shape, tableLmax, known).read();
    }

    private Optional<Analysis> read() {
        int before = section.faults().count();
        MultipoleRange temperature = range("temperature");
        MultipoleRange polarisation = range("polarisation");
        Weights weights = weights();
        List<String> estimators = estimators();
        double most = Math.max(temperature.lmax(), polarisation.lmax());
        double fewest = Math.min(temperature.lmax(), polarisation.lmax());
        Optional<Bands> bands =
                BandsReader.read(
                        section.section("bands", BandsReader.KEYS),
                        shape,
                        Math.min(most, 2 * fewest)); // L = |l1 + l2| for legs of either field
        return section.faults().count() == before && bands.isPresent()
                ? Optional.of(
                        new Analysis(temperature, polarisation, weights, estimators, bands.get()))
                : Optional.empty();
    }

    private MultipoleRange range(String field) {
        Section range = section.section(field, RANGE_KEYS);
        double lmin =
                range.number("lmin", DEFAULT_LMIN, l -> l >= 2, "it must be a multipole from 2 up");
        double lmax =
                range.number("lmax", defaultLmax(), l -> l > 2, "it must be a multipole above 2");
        if (lmin >= lmax) {
            String key = range.has("lmax") ? "lmax" : "lmin";
            range.fault(
                    key,
                    Decimal.text(key.equals("lmax") ? lmax : lmin),
                    "lmin must be below lmax, but they are "
                            + Decimal.text(lmin)
                            + " and "
                            + Decimal.text(lmax)
                            + (range.has("lmax")
                                    ? ""
                                    : ", the default with these pixels and spectra"));
        }
        requireResolved(range, lmax);
        if (lmax > tableLmax) {
            range.fault(
                    "lmax",
                    Decimal.text(lmax),
                    "the spectra end at l = " + Decimal.text(tableLmax));
        }
        return new MultipoleRange(lmin, lmax);
    }

    private void requireResolved(Section range, double lmax) {
        if (lmax > resolved()) {
            double largestPixel = Math.toDegrees(PART_OF_NYQUIST * Math.PI / lmax) * 60;
            range.fault(
                    "lmax",
                    Decimal.text(lmax),
                    "it must be at most 0.75 of the patch's Nyquist multipole, "
                            + Decimal.text(Math.floor(resolved()))
                            + "; for this lmax pixels have at most "
                            + Rounded.text(downTo(0.001, largestPixel * (1 + 1e-12)))
                            + " arcmin");
        }
    }

    /** The largest l that the pixels resolve; the margin lets round numbers be what they are. */
    private double resolved() {
        return PART_OF_NYQUIST * shape.nyquist() * (1 + 1e-12);
    }

    /** 3000, or as many whole hundreds as the pixels and the spectra allow. */
    private double defaultLmax() {
        double allowed = resolved();
        double known = Double.isNaN(tableLmax) ? allowed : Math.min(allowed, tableLmax);
        return known < 100 ? Math.floor(known) : Math.min(DEFAULT_LMAX, downTo(100, known));
    }

    private static double downTo(double step, double value) {
        return Math.floor(value / step) * step;
    }

    private Weights weights() {
        String allowed = "allowed are " + String.join(", ", WEIGHTS);
        Optional<String> text = section.text("weights", allowed);
        if (text.isPresent() && !WEIGHTS.contains(text.get())) {
            section.faults()
                    .add(
                            section.line("weights"),
                            section.path("weights")
                                    + " is '"
                                    + text.get()
                                    + "'; "
                                    + NearName.mend(text.get(), WEIGHTS));
        }
        return text.filter(WEIGHTS::contains)
                .map(AnalysisReader::weights)
                .orElse(Weights.LENSED_GRADIENT);
    }

    private static Weights weights(String written) {
        return Weights.valueOf(written.toUpperCase(Locale.ROOT).replace('-', '_'));
    }

    /** A constant's name as it stands in files: lower case, with hyphens. */
    static String written(String constant) {
        return constant.toLowerCase(Locale.ROOT).replace('_', '-');
    }

    private List<String> estimators() {
        if (!section.has("estimators")) {
            return DEFAULT_ESTIMATORS;
        }
        String allowed = "list some of " + String.join(", ", sortedKnown());
        Optional<List<String>> names = section.list("estimators", allowed);
        if (names.isPresent() && names.get().isEmpty()) {
            section.fault("estimators", "an empty list", allowed);
        }
        List<String> seen = new ArrayList<>();
        for (String name : names.orElse(List.of())) {
            check(name, seen);
            seen.add(name);
        }
        return seen;
    }

    private void check(String name, List<String> before) {
        if (before.contains(name)) {
            section.fault("estimators", "a list with '" + name + "' twice", "remove one");
        } else if (!known.contains(name)) {
            section.faults()
                    .add(
                            section.line("estimators"),
                            "'"
                                    + name
                                    + "' is no estimator that is installed; "
                                    + NearName.mend(name, sortedKnown()));
        }
    }

    private List<String> sortedKnown() {
        return known.stream().sorted().toList();
    }
}
