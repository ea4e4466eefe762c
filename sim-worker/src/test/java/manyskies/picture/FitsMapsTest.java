package manyskies.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import manyskies.flat.FlatGrid;
import nom.tam.fits.BasicHDU;
import nom.tam.fits.Fits;
import nom.tam.fits.FitsException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FitsMapsTest {
    private static final FlatGrid GRID = new FlatGrid(6, 4, Math.toRadians(2.0 / 60));
    private static final int BLOCK = 2880; // FITS standard 4.0, section 3.1
    private static final int CARD = 80;

    @TempDir private Path folder;

    private static NamedMap map(String name, double scale) {
        double[] values = new double[GRID.pixels()];
        Arrays.setAll(values, i -> scale * (i - 7) / 3);
        return NamedMap.of(name, "uK", values);
    }

    private Path write() {
        Path file = folder.resolve("maps/sky.fits");
        FitsMaps.write(
                file, GRID, List.of(map("lensed T", 1), map("lensed Q", -1e-7)), List.of("seed 1"));
        return file;
    }

    @Test
    void theLibraryReadsItBack() throws FitsException, IOException {
        try (Fits fits = new Fits(write().toFile())) {
            BasicHDU<?>[] images = fits.read();
            assertThat(images).hasSize(2);
            double[][] values = (double[][]) images[1].getKernel();
            for (int y = 0; y < GRID.ny(); y++) {
                for (int x = 0; x < GRID.nx(); x++) {
                    assertThat(values[y][x])
                            .isEqualTo(map("lensed Q", -1e-7).values()[y * GRID.nx() + x]);
                }
            }
            assertThat(images[1].getHeader().getStringValue("EXTNAME")).isEqualTo("lensed Q");
            assertThat(images[1].getHeader().getStringValue("BUNIT")).isEqualTo("uK");
        }
    }

    /** Second method: blocks, cards and numbers by hand, after the FITS standard 4.0. */
    @Test
    void itsBytesAreThoseOfTheStandard() throws IOException {
        byte[] bytes = Files.readAllBytes(write());
        assertThat(bytes.length % BLOCK).isZero();
        Map<String, String> primary = new TreeMap<>();
        int data = header(bytes, 0, primary);
        assertThat(primary)
                .containsEntry("SIMPLE", "T")
                .containsEntry("BITPIX", "-64")
                .containsEntry("NAXIS", "2")
                .containsEntry("NAXIS1", "6")
                .containsEntry("NAXIS2", "4")
                .containsEntry("BUNIT", "'uK      '")
                .containsEntry("CTYPE1", "'RA---CAR'")
                .containsEntry("CTYPE2", "'DEC--CAR'");
        // the centre of six pixels numbered from one lies between the third and the fourth
        assertThat(number(primary, "CRPIX1")).isEqualTo(3.5);
        assertThat(number(primary, "CRPIX2")).isEqualTo(2.5);
        assertThat(number(primary, "CRVAL1")).isZero();
        assertThat(number(primary, "CDELT1")).isCloseTo(-2.0 / 60, within(1e-15));
        assertThat(number(primary, "CDELT2")).isCloseTo(2.0 / 60, within(1e-15));
        ByteBuffer values = ByteBuffer.wrap(bytes, data, Double.BYTES * GRID.pixels());
        for (double expected : map("lensed T", 1).values()) {
            assertThat(values.getDouble()).isEqualTo(expected);
        }
        Map<String, String> extension = new TreeMap<>();
        int second = header(bytes, data + BLOCK, extension); // 24 doubles fill one block
        assertThat(extension).containsEntry("XTENSION", "'IMAGE   '");
        assertThat(second).isEqualTo(bytes.length - BLOCK);
        assertThat(new String(bytes, StandardCharsets.US_ASCII)).contains("HISTORY  seed 1");
    }

    /** Reads cards up to END and returns where the data begin. */
    private static int header(byte[] bytes, int start, Map<String, String> cards) {
        for (int at = start; ; at += CARD) {
            String card = new String(bytes, at, CARD, StandardCharsets.US_ASCII);
            if (card.startsWith("END ")) {
                return start + ((at + CARD - start + BLOCK - 1) / BLOCK) * BLOCK;
            }
            if (card.startsWith("= ", 8)) {
                String value = card.substring(10).split("/", 2)[0].strip();
                assertThat(cards.put(card.substring(0, 8).strip(), value)).isNull();
            }
        }
    }

    private static double number(Map<String, String> cards, String name) {
        return Double.parseDouble(cards.get(name).replace('D', 'E'));
    }

    /** No card tells the time; the library's own first card would, to the second. */
    @Test
    void equalMapsAreEqualBytes() throws IOException {
        byte[] once = Files.readAllBytes(write());
        assertThat(new String(once, 0, CARD, StandardCharsets.US_ASCII).strip())
                .isEqualTo("SIMPLE  =                    T / FITS standard");
        assertThat(new String(once, StandardCharsets.US_ASCII)).doesNotContain("UTC", ":0", "DATE");
        assertThat(Files.readAllBytes(write())).isEqualTo(once);
    }

    @Test
    void valuesThatAreNoneAreRefused() {
        NamedMap bad = map("T", 1);
        bad.values()[8] = Double.NaN;
        Path file = folder.resolve("bad.fits");
        assertThatThrownBy(() -> FitsMaps.write(file, GRID, List.of(bad), List.of()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("map T is NaN at x = 2, y = 1; it is finite everywhere");
        NamedMap small = NamedMap.of("E", "uK", new double[3]);
        assertThatThrownBy(() -> FitsMaps.write(file, GRID, List.of(small), List.of()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("map E has 3 values, the patch has 24 pixels");
        assertThatThrownBy(() -> FitsMaps.write(file, GRID, List.of(), List.of()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(file + ": there is no map to write");
        assertThat(file).doesNotExist();
    }
}
