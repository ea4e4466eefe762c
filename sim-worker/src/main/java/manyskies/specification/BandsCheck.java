package manyskies.specification;

import java.util.Optional;
import manyskies.spectrum.Bands;

/** Checks band edges against the patch, whose modes they hold, and against the filters. */
final class BandsCheck {
    static final int MOST_BANDS = 1000;
    static final String TOO_MANY = "that makes more than " + MOST_BANDS + " bands, make them wider";

    private final Section section;
    private final PatchReader.Shape shape;
    private final double largest;

    /**
     * A check of the bands of a section.
     *
     * @param largest the largest L that the filters' multipoles allow; NaN if that is not known
     */
    BandsCheck(Section section, PatchReader.Shape shape, double largest) {
        this.section = section;
        this.shape = shape;
        this.largest = largest;
    }

    /** Bands between rising edges; none if a fault was added. */
    Optional<Bands> checked(double[] edges) {
        String key = section.has("edges") ? "edges" : "from";
        String last = section.has("edges") ? "edges" : "to";
        int before = section.faults().count();
        double top = edges[edges.length - 1];
        if (edges.length - 1 > MOST_BANDS) {
            section.fault(key, "a list of " + edges.length, TOO_MANY);
        } else if (top > largest) {
            section.fault(
                    last,
                    Decimal.text(top),
                    "the filters' multipoles allow L up to " + Decimal.text(largest));
        } else if (edges[0] == 0) {
            section.fault(
                    key,
                    "0",
                    "L = 0 is not reconstructed, and the patch's lowest mode is |l| = "
                            + Rounded.text(shape.fundamental())
                            + "; begin at "
                            + (int) Math.ceil(shape.fundamental()));
        } else {
            requireModes(edges, key);
        }
        return section.faults().count() == before
                ? Optional.of(Bands.between(edges))
                : Optional.empty();
    }

    private void requireModes(double[] edges, String key) {
        if (Double.isNaN(shape.fundamental()) || Double.isNaN(largest)) {
            return; // a fault is known, and the bands may reach absurdly far
        }
        AnnulusModes modes = new AnnulusModes(shape);
        for (int band = 0; band + 1 < edges.length; band++) {
            if (!modes.isPopulated(edges[band], edges[band + 1])) {
                section.fault(key, Decimal.text(edges[0]), empty(edges[band], edges[band + 1]));
                return;
            }
        }
    }

    private String empty(double lower, double upper) {
        double lowest = shape.fundamental();
        return "the band from "
                + Decimal.text(lower)
                + " to "
                + Decimal.text(upper)
                + " holds no mode of the patch; "
                + (upper <= lowest
                        ? "its lowest is |l| = "
                                + Rounded.text(lowest)
                                + ", begin at "
                                + (int) Math.ceil(lowest)
                        : "make bands wider than the spacing " + Rounded.text(lowest));
    }
}
