package manyskies.picture;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import manyskies.flat.FlatGrid;
import manyskies.result.AtomicFile;
import nom.tam.fits.Fits;
import nom.tam.fits.FitsException;
import nom.tam.fits.Header;
import nom.tam.fits.HeaderCardException;
import nom.tam.fits.ImageData;
import nom.tam.fits.ImageHDU;
import nom.tam.util.FitsOutputStream;

/**
 * Maps of a flat patch as a FITS file: the first map is the primary image, each further one an
 * image extension; viewers that show one image show the first.
 *
 * <p>Pixel (x, y) of the patch is FITS pixel (x + 1, y + 1): x runs to the right, y upwards.
 * Coordinates are linear (CAR about the equator, centre at 0, 0), one pixel being one pixel side in
 * both: y is declination, and right ascension falls with x, since it grows to the left on a sky
 * seen from within. A simulated patch has no place on the sky; these are nominal. Stokes parameters
 * refer to the axes x and y. The bytes depend on the arguments alone.
 */
public final class FitsMaps {
    private static final List<String> ORIENTATION =
            List.of(
                    "Simulated sky; its coordinates are nominal.",
                    "x runs to the right, y up; right ascension grows to the left.",
                    "Stokes Q, U refer to x and y: Q > 0 along x, angles from x to y.");

    private FitsMaps() {}

    /**
     * Writes maps to a file, whole or not at all.
     *
     * @param provenance lines of printable ASCII on where the maps come from
     * @throws IllegalArgumentException if there is no map, one has another number of pixels, or a
     *     value that is not finite
     * @throws manyskies.result.RunFolderException if the file cannot be written
     */
    public static void write(
            Path file, FlatGrid grid, List<NamedMap> maps, List<String> provenance) {
        if (maps.isEmpty()) {
            throw new IllegalArgumentException(file + ": there is no map to write");
        }
        maps.forEach(map -> check(grid, map));
        AtomicFile.write(file, out -> write(out, grid, maps, provenance));
    }

    private static void check(FlatGrid grid, NamedMap map) {
        double[] values = map.values();
        if (values.length != grid.pixels()) {
            throw new IllegalArgumentException(
                    "map "
                            + map.name()
                            + " has "
                            + values.length
                            + " values, the patch has "
                            + grid.pixels()
                            + " pixels");
        }
        for (int i = 0; i < values.length; i++) {
            if (!Double.isFinite(values[i])) {
                throw new IllegalArgumentException(
                        "map "
                                + map.name()
                                + " is "
                                + values[i]
                                + " at x = "
                                + i % grid.nx()
                                + ", y = "
                                + i / grid.nx()
                                + "; it is finite everywhere");
            }
        }
    }

    private static void write(
            OutputStream out, FlatGrid grid, List<NamedMap> maps, List<String> provenance)
            throws IOException {
        try (Fits fits = new Fits()) {
            for (NamedMap map : maps) {
                ImageHDU image = ImageData.from(rows(grid, map.values())).toHDU();
                fits.addHDU(image);
                describe(image.getHeader(), grid, map, provenance);
            }
            fits.getHDU(0)
                    .getHeader()
                    .findCard("SIMPLE")
                    .setComment("FITS standard"); // the library would put the time of writing here
            FitsOutputStream stream = new FitsOutputStream(out);
            fits.write(stream);
            stream.flush();
        } catch (FitsException e) {
            throw new IllegalArgumentException("the maps are no FITS images: " + e.getMessage(), e);
        }
    }

    private static double[][] rows(FlatGrid grid, double[] values) {
        double[][] rows = new double[grid.ny()][];
        for (int y = 0; y < rows.length; y++) {
            rows[y] = Arrays.copyOfRange(values, y * grid.nx(), (y + 1) * grid.nx());
        }
        return rows;
    }

    private static void describe(
            Header header, FlatGrid grid, NamedMap map, List<String> provenance)
            throws HeaderCardException {
        header.addValue("EXTNAME", map.name(), "what the map shows");
        header.addValue("BUNIT", map.unit(), "unit of the values");
        double side = Math.toDegrees(grid.pixel());
        header.addValue("WCSAXES", 2, "axes of the coordinates");
        axis(header, 1, "RA---CAR", (grid.nx() + 1) / 2.0, -side);
        axis(header, 2, "DEC--CAR", (grid.ny() + 1) / 2.0, side);
        for (String line : ORIENTATION) {
            header.insertCommentStyle("COMMENT", line);
        }
        for (String line : provenance) {
            header.insertCommentStyleMultiline("HISTORY", line);
        }
    }

    private static void axis(Header header, int axis, String type, double centre, double step)
            throws HeaderCardException {
        header.addValue("CTYPE" + axis, type, "plate carree");
        header.addValue("CUNIT" + axis, "deg", "unit of the coordinate");
        header.addValue("CRVAL" + axis, 0.0, "coordinate of the patch's centre");
        header.addValue("CRPIX" + axis, centre, "pixel of the patch's centre");
        header.addValue("CDELT" + axis, step, "step from pixel to pixel");
    }
}
