package manyskies.flat;

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
    private final RealFft2 fft;
    private final SpinFactor factor;
    private final double[] partRe;
    private final double[] partIm;
    private long transforms;

    private FlatTransform(FlatGrid grid, double bandLimit) {
        this.grid = grid;
        fft = RealFft2.of(grid, bandLimit);
        factor = SpinFactor.of(grid, BandLimit.of(grid, bandLimit));
        partRe = new double[2 * grid.size()];
        partIm = new double[2 * grid.size()];
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
        if (spin == 0) {
            return SpinMap.scalar(map(gradient.values()));
        }
        double[] curlValues = curl == null ? null : curl.values();
        factor.raise(spin, gradient.values(), curlValues, partRe, partIm);
        return SpinMap.of(spin, map(partRe), map(partIm));
    }

    @Override
    public GradientCurl analyse(SpinMap map) {
        if (map.re().length != pixels()) {
            throw new IllegalArgumentException(
                    "a map of this patch has " + pixels() + " pixels, found " + map.re().length);
        }
        if (map.spin() == 0) {
            double[] field = new double[2 * grid.size()];
            modes(map.re(), field);
            return new GradientCurl(Modes.of(grid, field), null);
        }
        modes(map.re(), partRe);
        modes(map.im(), partIm);
        double[] gradient = new double[2 * grid.size()];
        double[] curl = new double[2 * grid.size()];
        factor.lower(map.spin(), partRe, partIm, gradient, curl);
        return new GradientCurl(Modes.of(grid, gradient), Modes.of(grid, curl));
    }

    private double[] map(double[] modes) {
        double[] map = new double[pixels()];
        fft.inverse(modes, map);
        transforms++;
        return map;
    }

    private void modes(double[] map, double[] modes) {
        fft.forward(map, modes);
        transforms++;
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
