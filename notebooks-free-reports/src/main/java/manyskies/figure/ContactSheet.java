package manyskies.figure;

import java.util.List;

/**
 * Maps side by side as a PNG, each with its title and a colour bar with numbers and unit.
 *
 * <p>Large maps are averaged over cells of pixels, small ones enlarged. The picture depends on the
 * numbers alone: no fonts, no display.
 */
public final class ContactSheet {
    private static final int SIDE = 512; // longest side of a map, at most
    private static final int SHORTEST_BAR = 320; // has room for three numbers and a unit
    private static final int TEXT = 2; // pixels per cell of a letter
    private static final int LINE = 24;
    private static final int BAR = 14;
    private static final int MARGIN = 22;

    private final String heading;
    private final List<MapPanel> panels;

    private ContactSheet(String heading, List<MapPanel> panels) {
        this.heading = heading;
        this.panels = panels;
    }

    /**
     * A sheet of maps, row by row, three to a row (four or fewer: two to a row).
     *
     * @param heading a line above all, printable ASCII
     * @throws IllegalArgumentException if there is no map
     */
    public static ContactSheet of(String heading, List<MapPanel> panels) {
        if (panels.isEmpty()) {
            throw new IllegalArgumentException("a contact sheet has at least one map");
        }
        return new ContactSheet(heading, List.copyOf(panels));
    }

    /** The picture as the bytes of a PNG file. */
    public byte[] png() {
        int columns = columns();
        int rows = (panels.size() + columns - 1) / columns;
        int width = panels.stream().mapToInt(ContactSheet::width).max().orElseThrow();
        int height = panels.stream().mapToInt(ContactSheet::height).max().orElseThrow();
        int cellWidth = Math.max(width, SIDE) + MARGIN;
        int cellHeight = LINE + height + 6 + BAR + 6 + LINE + MARGIN;
        Canvas canvas =
                new Canvas(MARGIN + columns * cellWidth, MARGIN + LINE + 10 + rows * cellHeight);
        canvas.text(heading, MARGIN, MARGIN, TEXT);
        for (int i = 0; i < panels.size(); i++) {
            int x = MARGIN + i % columns * cellWidth;
            int y = MARGIN + LINE + 10 + i / columns * cellHeight;
            draw(canvas, panels.get(i), x, y);
        }
        return canvas.png();
    }

    private int columns() {
        if (panels.size() == 1) {
            return 1;
        }
        return panels.size() <= 4 ? 2 : 3;
    }

    private static void draw(Canvas canvas, MapPanel panel, int x, int y) {
        int width = width(panel);
        int height = height(panel);
        double[] shown = panel.shown(width, height);
        ColourRange range = panel.range(shown);
        canvas.text(fitted(panel.title()), x, y, TEXT);
        for (int i = 0; i < shown.length; i++) {
            int above = y + LINE + height - 1 - i / width;
            canvas.pixel(x + i % width, above, range.colour(shown[i]));
        }
        canvas.frame(x, y + LINE, width, height);
        int bar = Math.max(width, SHORTEST_BAR);
        drawBar(canvas, range, panel.unit(), x, y + LINE + height + 8, bar);
    }

    /** The bar, and below it: low end, middle with the unit, high end. */
    private static void drawBar(
            Canvas canvas, ColourRange range, String unit, int x, int y, int bar) {
        for (int dx = 0; dx < bar; dx++) {
            double place = (double) dx / (bar - 1);
            canvas.fill(x + dx, y, 1, BAR, range.palette().colour(place));
        }
        canvas.frame(x, y, bar, BAR);
        int below = y + BAR + 6;
        String middle = (range.label(0.5) + " " + unit).strip();
        String high = range.label(1);
        canvas.text(range.label(0), x, below, TEXT);
        canvas.text(middle, x + (bar - Canvas.width(middle, TEXT)) / 2, below, TEXT);
        canvas.text(high, x + bar - Canvas.width(high, TEXT), below, TEXT);
    }

    private static String fitted(String title) {
        int letters = SIDE / (TEXT * Glyphs.ADVANCE);
        return title.length() <= letters ? title : title.substring(0, letters - 2) + "..";
    }

    /** The longest side is a whole part or a whole multiple of the map's, as near SIDE as can be. */
    private static int longest(MapPanel panel) {
        int pixels = Math.max(panel.nx(), panel.ny());
        return pixels > SIDE
                ? Math.max(1, pixels / ((pixels + SIDE - 1) / SIDE))
                : pixels * (SIDE / pixels);
    }

    private static int width(MapPanel panel) {
        return scaled(panel, panel.nx());
    }

    private static int height(MapPanel panel) {
        return scaled(panel, panel.ny());
    }

    private static int scaled(MapPanel panel, int pixels) {
        long longest = longest(panel);
        return Math.max(1, Math.toIntExact(longest * pixels / Math.max(panel.nx(), panel.ny())));
    }
}
