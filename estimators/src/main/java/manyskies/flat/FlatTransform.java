package manyskies.flat;

import java.util.HashMap;
import java.util.Map;
import manyskies.field.GradientCurl;
import manyskies.field.Modes;
import manyskies.field.SkyTransform;
import manyskies.field.SpinMap;

/**
 * Spin transforms of a flat, periodic patch, within a band limit.
 *
 * <pre>  S(x) = (1/A) sum_l i^s (g_l + i c_l) exp(i s phi_l) exp(i l.x),    |l| up to the limit</pre>
 *
 * Modes beyond the limit are ignored by {@code synthesise} and zero after {@code analyse}. For s
 * above 0, l = 0 and the Nyquist rows and columns are zero too: they have no direction. A complex
 * map costs two real transforms, a real one costs one.
 *
 * <p>Holds plans, scratch memory and a count of its transforms: one thread at a time.
 */
public final class FlatTransform implements SkyTransform {
    private final FlatGrid grid;
    private final BandLimit band;
    private final RealFft2 fft;
    private final Map<Integer, SpinFactor> factorOfSpin = new HashMap<>(); // built when first used
    private final ColumnTiles tilesRe;
    private final ColumnTiles tilesIm;
    private final double[] rowRe;
    private final double[] rowIm;
    private long transforms;

    private FlatTransform(FlatGrid grid, double bandLimit) {
        this.grid = grid;
        band = BandLimit.of(grid, bandLimit);
        fft = RealFft2.of(grid, bandLimit);
        tilesRe = fft.newTiles();
        tilesIm = fft.newTiles();
        rowRe = new double[grid.nx()];
        rowIm = new double[grid.nx()];
    }

    /**
     * The transform of a grid.
     *
     * @param bandLimit the largest |l|; infinity for all modes
     * @throws IllegalArgumentException if a side has a prime factor above 5 (the message names the
     *     nearest sides that have none), or the limit is not positive
     */
    public static FlatTransform of(FlatGrid grid, double bandLimit) {
        return new FlatTransform(grid, bandLimit);
    }

    /** How many real two-dimensional transforms this instance has done: the unit of cost. */
    public long transforms() {
        return transforms;
    }

    @Override
    public FlatGrid space() {
        return grid;
    }

    @Override
    public int pixels() {
        return grid.pixels();
    }

    @Override
    public double slope(int spin, int mode) {
        return grid.multipole(mode);
    }

    @Override
    public SpinMap synthesise(int spin, Modes gradient, Modes curl) {
        requireArguments(spin, gradient, curl);
        transforms += spin == 0 ? 1 : 2;
        double[] re = new double[pixels()];
        if (spin == 0) {
            fft.inverse(gradient.values(), re);
            return SpinMap.scalar(re);
        }
        double[] im = new double[pixels()];
        raise(factor(spin), gradient.values(), curl == null ? null : curl.values());
        fft.clearNyquist();
        fft.tilesToMap(tilesRe, re);
        fft.tilesToMap(tilesIm, im);
        return SpinMap.of(spin, re, im);
    }

    @Override
    public GradientCurl analyse(SpinMap map) {
        requirePixels(map);
        transforms += map.spin() == 0 ? 1 : 2;
        double[] gradient = new double[2 * grid.size()];
        if (map.spin() == 0) {
            fft.forward(map.re(), gradient);
            return new GradientCurl(Modes.of(grid, gradient), null);
        }
        double[] curl = new double[2 * grid.size()];
        fft.mapToTiles(map.re(), tilesRe);
        fft.mapToTiles(map.im(), tilesIm);
        lower(factor(map.spin()), gradient, curl);
        return new GradientCurl(Modes.of(grid, gradient), Modes.of(grid, curl));
    }

    private SpinFactor factor(int spin) {
        return factorOfSpin.computeIfAbsent(spin, s -> SpinFactor.of(grid, band, s));
    }

    private void raise(SpinFactor factor, double[] gradient, double[] curl) {
        for (int row = 0; row < grid.ny(); row++) {
            int columns = fft.storedColumns(row);
            factor.raise(row, columns, gradient, curl, rowRe, rowIm);
            tilesRe.putRow(row, rowRe, 0, 2 * columns);
            tilesIm.putRow(row, rowIm, 0, 2 * columns);
        }
    }

    private void lower(SpinFactor factor, double[] gradient, double[] curl) {
        for (int row = 0; row < grid.ny(); row++) {
            int columns = fft.storedColumns(row);
            tilesRe.getRow(row, rowRe, 0, 2 * columns);
            tilesIm.getRow(row, rowIm, 0, 2 * columns);
            factor.lower(row, columns, rowRe, rowIm, gradient, curl);
        }
    }

    private void requirePixels(SpinMap map) {
        if (map.re().length != pixels()) {
            throw new IllegalArgumentException(
                    "a map of this patch has " + pixels() + " pixels, found " + map.re().length);
        }
    }

    private void requireArguments(int spin, Modes gradient, Modes curl) {
        if (spin < 0) {
            throw new IllegalArgumentException(
                    "a spin is 0 or more, found " + spin + "; conjugate the map of spin " + -spin);
        }
        if (spin == 0 && curl != null) {
            throw new IllegalArgumentException("a map of spin 0 has no curl part; give null");
        }
        requireSpace(gradient);
        if (curl != null) {
            requireSpace(curl);
        }
    }

    private void requireSpace(Modes modes) {
        if (!grid.equals(modes.space())) {
            throw new IllegalArgumentException(
                    "modes of "
                            + modes.space()
                            + " cannot be transformed on "
                            + grid
                            + "; copy them there first");
        }
    }
}
