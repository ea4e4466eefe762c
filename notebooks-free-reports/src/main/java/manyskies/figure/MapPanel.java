package manyskies.figure;

import java.util.function.Function;

/** A map in a contact sheet: ny rows of nx values, x to the right, y upwards. */
public final class MapPanel {
    private final String title;
    private final String unit;
    private final int nx;
    private final int ny;
    private final double[] values;
    private final Function<double[], ColourRange> rangeOf;

    private MapPanel(
            String title,
            String unit,
            int nx,
            int ny,
            double[] values,
            Function<double[], ColourRange> rangeOf) {
        this.title = title;
        this.unit = unit;
        this.nx = nx;
        this.ny = ny;
        this.values = values;
        this.rangeOf = rangeOf;
    }

    /**
     * A map of both signs: white is zero, and the colours reach equally far up and down, to what
     * 99.5 per cent of the values do not exceed.
     *
     * @throws IllegalArgumentException if there is not one finite value per pixel
     */
    public static MapPanel signed(String title, String unit, int nx, int ny, double[] values) {
        check(title, nx, ny, values);
        return new MapPanel(title, unit, nx, ny, values, ColourRange::symmetric);
    }

    /**
     * A map without a middle, such as a mask or a depth: the lighter the more.
     *
     * @throws IllegalArgumentException if there is not one finite value per pixel
     */
    public static MapPanel rising(String title, String unit, int nx, int ny, double[] values) {
        check(title, nx, ny, values);
        return new MapPanel(title, unit, nx, ny, values, ColourRange::rising);
    }

    private static void check(String title, int nx, int ny, double[] values) {
        if (nx < 1 || ny < 1 || values.length != (long) nx * ny) {
            throw new IllegalArgumentException(
                    "map '" + title + "' has " + values.length + " values for " + nx + " x " + ny);
        }
        for (int i = 0; i < values.length; i++) {
            if (!Double.isFinite(values[i])) {
                throw new IllegalArgumentException(
                        "map '"
                                + title
                                + "' is "
                                + values[i]
                                + " at x = "
                                + i % nx
                                + ", y = "
                                + i / nx
                                + "; it is finite everywhere");
            }
        }
    }

    String title() {
        return title;
    }

    String unit() {
        return unit;
    }

    int nx() {
        return nx;
    }

    int ny() {
        return ny;
    }

    /** The range of colours that fits the values shown. */
    ColourRange range(double[] shown) {
        return rangeOf.apply(shown);
    }

    /** The map averaged over, or spread out to, width x height cells; rows from below. */
    double[] shown(int width, int height) {
        double[] cells = new double[width * height];
        for (int row = 0; row < height; row++) {
            int y0 = first(row, ny, height);
            int y1 = Math.max(y0 + 1, first(row + 1, ny, height));
            for (int column = 0; column < width; column++) {
                int x0 = first(column, nx, width);
                int x1 = Math.max(x0 + 1, first(column + 1, nx, width));
                cells[row * width + column] = mean(x0, x1, y0, y1);
            }
        }
        return cells;
    }

    private static int first(int cell, int pixels, int cells) {
        return (int) ((long) cell * pixels / cells);
    }

    private double mean(int x0, int x1, int y0, int y1) {
        double sum = 0;
        for (int y = y0; y < y1; y++) {
            for (int x = x0; x < x1; x++) {
                sum += values[y * nx + x];
            }
        }
        return sum / ((double) (x1 - x0) * (y1 - y0));
    }
}
