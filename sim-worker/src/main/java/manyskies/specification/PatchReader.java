package manyskies.specification;

import java.util.List;
import java.util.Optional;

/** Reads the patch: {@code pixels} (one number, or x and y) and {@code pixel-size}. */
final class PatchReader {
    static final List<String> KEYS = List.of("pixels", "pixel-size");

    private static final int FEWEST = 16;
    private static final int MOST = 8192;
    private static final double WIDEST = Math.PI / 2;
    private static final String PIXELS =
            "it must be one even whole number from " + FEWEST + " to " + MOST + ", or two: [x, y]";

    private final Section section;

    private PatchReader(Section section) {
        this.section = section;
    }

    /** The patch, NaN where it is faulty. */
    static Shape read(Section section) {
        return new PatchReader(section).read();
    }

    private Shape read() {
        section.require("pixels", "pixels: 512");
        section.require("pixel-size", "pixel-size: 2 arcmin");
        double pixel = section.quantity("pixel-size", Double.NaN, Quantity.ANGLE, false);
        double[] pixels = section.has("pixels") ? pixels() : new double[] {Double.NaN, Double.NaN};
        Shape shape = new Shape(pixels[0], pixels[1], pixel);
        if (Math.max(shape.nx, shape.ny) * pixel > WIDEST) {
            section.fault(
                    "pixel-size",
                    "the patch would be wider than 90 deg, where a flat sky means nothing; make it"
                            + " smaller");
        }
        return shape;
    }

    private double[] pixels() {
        double[] none = {Double.NaN, Double.NaN};
        Optional<List<String>> texts = section.list("pixels", PIXELS);
        if (texts.isEmpty()) {
            return none;
        }
        List<String> found = texts.get();
        if (found.isEmpty() || found.size() > 2) {
            section.fault("pixels", "a list of " + found.size(), PIXELS);
            return none;
        }
        double nx = count(found.get(0));
        return new double[] {nx, found.size() == 1 ? nx : count(found.get(1))};
    }

    private double count(String text) {
        double n =
                section.number(
                        "pixels", text, v -> v == Math.rint(v) && v >= FEWEST && v <= MOST, PIXELS);
        if (Double.isNaN(n) || isSmooth((int) n)) {
            return n;
        }
        section.fault(
                "pixels",
                text,
                "it must be even with no prime factor above 5; the nearest are "
                        + nearest((int) n));
        return Double.NaN;
    }

    private static String nearest(int n) {
        int below = n;
        int above = n;
        while (!isSmooth(below)) {
            below--;
        }
        while (!isSmooth(above)) {
            above++;
        }
        return below + " and " + above;
    }

    private static boolean isSmooth(int n) {
        int rest = n;
        for (int prime : new int[] {2, 3, 5}) {
            while (rest % prime == 0) {
                rest /= prime;
            }
        }
        return n % 2 == 0 && rest == 1;
    }

    /** Pixels and their side as far as they are known; NaN where a fault was found. */
    record Shape(double nx, double ny, double pixel) {

        double shorterSide() {
            return Math.min(nx, ny) * pixel;
        }

        /** pi / d. */
        double nyquist() {
            return Math.PI / pixel;
        }

        /** The smallest |l| above zero. */
        double fundamental() {
            return 2 * Math.PI / (Math.max(nx, ny) * pixel);
        }

        Patch patch() {
            return new Patch((int) nx, (int) ny, pixel);
        }
    }
}
