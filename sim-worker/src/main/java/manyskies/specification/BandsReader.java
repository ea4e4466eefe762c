package manyskies.specification;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import manyskies.spectrum.Bands;

/**
 * Reads the bands of L: {@code from}, {@code to}, {@code width}, or a list of {@code edges}.
 *
 * <p>Default: width 100 from L = 40 up to 1540, or less where lmax is lower; on a small patch from
 * its lowest mode on, and at least as wide as the spacing of its modes.
 */
final class BandsReader {
    static final List<String> KEYS = List.of("from", "to", "width", "edges");

    private static final double DEFAULT_FROM = 40;
    private static final double DEFAULT_TO = 1540;
    private static final double DEFAULT_WIDTH = 100;
    private static final String MULTIPOLE = "it must be a multipole, 0 or above";

    private final Section section;
    private final PatchReader.Shape shape;
    private final double largest;

    private BandsReader(Section section, PatchReader.Shape shape, double largest) {
        this.section = section;
        this.shape = shape;
        this.largest = largest;
    }

    /**
     * The bands; none if a fault was added.
     *
     * @param largest the largest L that the filters' multipoles allow; NaN if that is not known
     */
    static Optional<Bands> read(Section section, PatchReader.Shape shape, double largest) {
        BandsReader reader = new BandsReader(section, shape, largest);
        boolean given = KEYS.stream().anyMatch(section::has);
        Optional<double[]> edges =
                !given
                        ? reader.byDefault()
                        : section.has("edges") ? reader.listed() : reader.even();
        return edges.flatMap(new BandsCheck(section, shape, largest)::checked);
    }

    private Optional<double[]> byDefault() {
        double lowest = shape.fundamental();
        if (Double.isNaN(lowest) || Double.isNaN(largest) || !section.isWhole()) {
            return Optional.empty();
        }
        double from = Math.max(DEFAULT_FROM, 10 * Math.floor(lowest / 10));
        double width = Math.max(DEFAULT_WIDTH, 10 * Math.ceil(lowest / 10));
        double count = Math.floor((Math.min(DEFAULT_TO, largest) - from) / width);
        if (count >= 1) {
            return Optional.of(evenly(from, width, (int) count));
        }
        section.faults()
                .add(
                        section.line("from"),
                        "no band of width "
                                + Rounded.text(width)
                                + " lies between the patch's lowest mode, |l| = "
                                + Rounded.text(lowest)
                                + ", and the filters' lmax, "
                                + Rounded.text(largest)
                                + "; make the patch wider, or give analysis.bands.");
        return Optional.empty();
    }

    private Optional<double[]> listed() {
        for (String key : List.of("from", "to", "width")) {
            if (section.has(key)) {
                section.faults()
                        .add(
                                section.line(key),
                                section.path(key)
                                        + " stands beside edges; give from, to and width, or edges"
                                        + " alone.");
            }
        }
        Optional<List<String>> texts =
                section.list("edges", "it must be a list of rising multipoles");
        if (texts.isEmpty()) {
            return Optional.empty();
        }
        List<Double> edges = new ArrayList<>();
        for (String text : texts.get()) {
            edges.add(section.number("edges", text, l -> l >= 0, MULTIPOLE));
        }
        return rising(edges) ? Optional.of(array(edges)) : Optional.empty();
    }

    private boolean rising(List<Double> edges) {
        if (edges.size() < 2) {
            section.fault("edges", "a list of " + edges.size(), "a band needs two edges or more");
            return false;
        }
        for (int i = 1; i < edges.size(); i++) {
            if (edges.get(i) <= edges.get(i - 1)) {
                section.fault(
                        "edges",
                        Decimal.text(edges.get(i)) + " after " + Decimal.text(edges.get(i - 1)),
                        "edges must rise");
                return false;
            }
        }
        return edges.stream().noneMatch(edge -> edge.isNaN());
    }

    private Optional<double[]> even() {
        section.require("from", "from: 40");
        section.require("to", "to: 1540");
        double from = section.number("from", Double.NaN, l -> l >= 0, MULTIPOLE);
        double to = section.number("to", Double.NaN, l -> l > 0, "it must be a multipole above 0");
        double width =
                section.number(
                        "width", DEFAULT_WIDTH, w -> w > 0, "a band's width must be positive");
        if (to <= from) {
            section.fault("to", Decimal.text(to), "it must be above from, " + Decimal.text(from));
            return Optional.empty();
        }
        if (Double.isNaN(from + to + width)) {
            return Optional.empty();
        }
        if ((to - from) / width > BandsCheck.MOST_BANDS) {
            section.fault("width", Decimal.text(width), BandsCheck.TOO_MANY);
            return Optional.empty();
        }
        int count = (int) Math.rint((to - from) / width);
        if (edge(from, width, count) != to) {
            int fewer = (int) ((to - from) / width);
            section.fault(
                    "to",
                    Decimal.text(to),
                    "it must be from plus a whole number of widths; the nearest "
                            + (fewer > 0
                                    ? "are " + Decimal.text(edge(from, width, fewer)) + " and "
                                    : "is ")
                            + Decimal.text(edge(from, width, fewer + 1)));
            return Optional.empty();
        }
        return Optional.of(evenly(from, width, count));
    }

    /** In decimal arithmetic, so that 0.1 + 3 * 0.2 is 0.7. */
    static double edge(double from, double width, int i) {
        BigDecimal step = new BigDecimal(Decimal.text(width)).multiply(BigDecimal.valueOf(i));
        return new BigDecimal(Decimal.text(from)).add(step).doubleValue();
    }

    private static double[] evenly(double from, double width, int count) {
        double[] edges = new double[count + 1];
        for (int i = 0; i < edges.length; i++) {
            edges[i] = edge(from, width, i);
        }
        return edges;
    }

    private static double[] array(List<Double> values) {
        return values.stream().mapToDouble(Double::doubleValue).toArray();
    }
}
