package manyskies.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

class ContactSheetTest {
    private static final int ORANGE = Palette.DIVERGING.colour(1);
    private static final int BLUE = Palette.DIVERGING.colour(0);

    private static BufferedImage read(byte[] png) throws IOException {
        return ImageIO.read(new ByteArrayInputStream(png));
    }

    /** Pixel (0, 0) is at the lower left, (nx - 1, 0) at the lower right. */
    @Test
    void xRunsToTheRightAndYUpwards() throws IOException {
        double[] values = new double[4 * 4];
        values[0] = 1;
        values[3] = -1;
        BufferedImage picture = read(ContactSheet.of("", List.of(panel("T", 4, values))).png());
        int left = 22; // margin
        int top = 22 + 24 + 10 + 24; // margin, heading, space, title
        assertThat(picture.getRGB(left, top + 511) & 0xffffff).isEqualTo(ORANGE);
        assertThat(picture.getRGB(left + 511, top + 511) & 0xffffff).isEqualTo(BLUE);
        assertThat(picture.getRGB(left, top) & 0xffffff).isEqualTo(Palette.DIVERGING.colour(0.5));
    }

    private static MapPanel panel(String title, int side, double[] values) {
        return MapPanel.signed(title, "uK", side, side, values);
    }

    /** Every pixel of a large map enters one cell: the mean stays. */
    @Test
    void largeMapsAreAveraged() {
        double[] values = new double[1000 * 1000];
        Arrays.setAll(values, i -> i % 7);
        double mean = Arrays.stream(values).average().orElseThrow();
        double[] shown = panel("T", 1000, values).shown(250, 250);
        assertThat(Arrays.stream(shown).average().orElseThrow()).isCloseTo(mean, within(1e-9));
        assertThat(shown[1]).isEqualTo(meanOfTheSecondCell(values));
    }

    private static double meanOfTheSecondCell(double[] values) {
        double sum = 0;
        for (int i = 0; i < 16; i++) {
            sum += values[i / 4 * 1000 + 4 + i % 4];
        }
        return sum / 16;
    }

    @Test
    void mapsOfAnyShapeFit() throws IOException {
        List<MapPanel> panels = new ArrayList<>();
        for (int[] shape : new int[][] {{1, 1}, {640, 480}, {30, 1000}, {512, 512}, {401, 401}}) {
            double[] values = new double[shape[0] * shape[1]];
            panels.add(MapPanel.rising("mask", "", shape[0], shape[1], values));
        }
        BufferedImage picture = read(ContactSheet.of("shapes", panels).png());
        assertThat(picture.getWidth()).isEqualTo(22 + 3 * 534);
    }

    @Test
    void equalMapsAreEqualBytesAndOthersAreNot() {
        double[] values = new double[64];
        Arrays.setAll(values, i -> i - 30);
        byte[] once = ContactSheet.of("a", List.of(panel("T", 8, values))).png();
        assertThat(ContactSheet.of("a", List.of(panel("T", 8, values))).png()).isEqualTo(once);
        values[9] = 3;
        assertThat(ContactSheet.of("a", List.of(panel("T", 8, values))).png()).isNotEqualTo(once);
    }

    @Test
    void mapsThatAreNoneAreRefused() {
        assertThatThrownBy(() -> panel("T", 2, new double[] {0, 1, Double.NaN, 1}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("map 'T' is NaN at x = 0, y = 1; it is finite everywhere");
        assertThatThrownBy(() -> panel("T", 2, new double[3]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("map 'T' has 3 values for 2 x 2");
        assertThatThrownBy(() -> ContactSheet.of("", List.of()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a contact sheet has at least one map");
    }

    /** What titles and numbers are made of is there, and no two letters look the same. */
    @Test
    void theLettersAreThere() {
        Set<String> shapes = new HashSet<>();
        String letters =
                "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789"
                        + ".,:;-+=/()[]_'%^*<>| ";
        for (int i = 0; i < letters.length(); i++) {
            char letter = letters.charAt(i);
            assertThat(Glyphs.knows(letter)).as("%s", letter).isTrue();
            StringBuilder shape = new StringBuilder();
            for (int cell = 0; cell < Glyphs.ROWS * Glyphs.COLUMNS; cell++) {
                shape.append(Glyphs.covers(letter, cell % Glyphs.COLUMNS, cell / Glyphs.COLUMNS));
            }
            assertThat(shapes.add(shape.toString())).as("%s", letter).isTrue();
        }
        assertThat(Glyphs.knows('\u00e9')).isFalse();
    }
}
