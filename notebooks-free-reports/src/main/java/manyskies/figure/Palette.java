package manyskies.figure;

/**
 * Colours in an order that the eye sees: a path through Oklab (Ottosson 2020, formulas from memory)
 * given by a few points, straight between them, whose lightness rises or falls steadily.
 *
 * <p>Hues lie along blue against yellow, which red-green deficiency leaves (common practice, no
 * source); and lightness alone tells the order.
 */
final class Palette {
    private static final int STEPS = 1024;

    /** Blue, through white at the middle, to orange brown; both ends equally dark. */
    static final Palette DIVERGING =
            new Palette(
                    new double[][] {
                        {0.32, -0.015, -0.125},
                        {0.58, -0.040, -0.125},
                        {0.80, -0.035, -0.070},
                        {0.97, 0.000, 0.000},
                        {0.80, 0.045, 0.095},
                        {0.58, 0.080, 0.100},
                        {0.32, 0.070, 0.060}
                    });

    /** Dark blue, through grey green, to pale yellow. */
    static final Palette SEQUENTIAL =
            new Palette(
                    new double[][] {
                        {0.18, 0.000, -0.080},
                        {0.40, -0.030, -0.110},
                        {0.62, -0.045, -0.040},
                        {0.82, -0.025, 0.070},
                        {0.97, -0.010, 0.075}
                    });

    private final int[] colours = new int[STEPS + 1];

    private Palette(double[][] points) {
        for (int step = 0; step <= STEPS; step++) {
            double along = (double) step / STEPS * (points.length - 1);
            int from = Math.min((int) along, points.length - 2);
            colours[step] = between(points[from], points[from + 1], along - from);
        }
    }

    /** The colour, as 0xRRGGBB, at a place from 0 to 1; places beyond have the ends' colours. */
    int colour(double place) {
        return colours[(int) Math.rint(Math.min(Math.max(place, 0), 1) * STEPS)];
    }

    private static int between(double[] from, double[] to, double share) {
        double[] lab = new double[3];
        for (int i = 0; i < 3; i++) {
            lab[i] = from[i] + share * (to[i] - from[i]);
        }
        return colour(lab[0], lab[1], lab[2]);
    }

    /** Oklab to sRGB. */
    private static int colour(double lightness, double a, double b) {
        double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
        double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
        double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
        int red = channel(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s);
        int green = channel(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s);
        int blue = channel(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
        return red << 16 | green << 8 | blue;
    }

    private static double cube(double x) {
        return x * x * x;
    }

    /** The transfer function of sRGB (IEC 61966-2-1). */
    private static int channel(double linear) {
        double value =
                linear <= 0.0031308
                        ? 12.92 * linear
                        : 1.055 * StrictMath.pow(linear, 1 / 2.4) - 0.055;
        return (int) Math.rint(255 * Math.min(Math.max(value, 0), 1));
    }
}
