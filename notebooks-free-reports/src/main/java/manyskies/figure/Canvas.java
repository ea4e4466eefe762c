package manyskies.figure;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Arrays;
import javax.imageio.ImageIO;
import javax.imageio.ImageWriter;
import javax.imageio.stream.MemoryCacheImageOutputStream;

/** A picture under construction: pixels, lines of text, a PNG at the end. x right, y down. */
final class Canvas {
    static final int WHITE = 0xffffff;
    static final int INK = 0x202020;

    private final BufferedImage image;

    Canvas(int width, int height) {
        image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
        int[] row = new int[width];
        Arrays.fill(row, WHITE);
        for (int y = 0; y < height; y++) {
            image.setRGB(0, y, width, 1, row, 0, width);
        }
    }

    void pixel(int x, int y, int colour) {
        image.setRGB(x, y, colour);
    }

    void fill(int x, int y, int width, int height, int colour) {
        for (int dy = 0; dy < height; dy++) {
            for (int dx = 0; dx < width; dx++) {
                pixel(x + dx, y + dy, colour);
            }
        }
    }

    /** A frame one pixel wide around an area. */
    void frame(int x, int y, int width, int height) {
        fill(x - 1, y - 1, width + 2, 1, INK);
        fill(x - 1, y + height, width + 2, 1, INK);
        fill(x - 1, y, 1, height, INK);
        fill(x + width, y, 1, height, INK);
    }

    /** Width of a text. */
    static int width(String text, int scale) {
        return scale * (Glyphs.ADVANCE * text.length() - 1);
    }

    /** A text whose upper left corner is (x, y); what lies beyond the picture is left out. */
    void text(String text, int x, int y, int scale) {
        for (int i = 0; i < text.length(); i++) {
            letter(text.charAt(i), x + i * scale * Glyphs.ADVANCE, y, scale);
        }
    }

    private void letter(char letter, int x, int y, int scale) {
        for (int row = 0; row < Glyphs.ROWS; row++) {
            for (int column = 0; column < Glyphs.COLUMNS; column++) {
                int left = x + column * scale;
                if (Glyphs.covers(letter, column, row) && left + scale <= image.getWidth()) {
                    fill(left, y + row * scale, scale, scale, INK);
                }
            }
        }
    }

    byte[] png() {
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (MemoryCacheImageOutputStream out = new MemoryCacheImageOutputStream(bytes)) {
            writer.setOutput(out);
            writer.write(image);
        } catch (IOException e) { // memory does not fail
            throw new UncheckedIOException(e);
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }
}
