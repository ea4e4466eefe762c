package manyskies.flat;

import org.jtransforms.fft.DoubleFFT_2D;

/**
 * The unit in which the program's times are given: one two-dimensional real transform of a map by
 * JTransforms itself, on one thread, in place. For measurements only.
 */
public final class UnitTransform {
    private final DoubleFFT_2D transform;
    private final double[] map;

    private UnitTransform(FlatGrid grid) {
        RealFft2.of(grid, Double.POSITIVE_INFINITY); // sets JTransforms to one thread
        transform = new DoubleFFT_2D(grid.ny(), grid.nx());
        map = new double[grid.pixels()];
    }

    /**
     * The unit of a grid.
     *
     * @throws IllegalArgumentException if a side is no power of two, where JTransforms has no such
     *     transform
     */
    public static UnitTransform of(FlatGrid grid) {
        if (Integer.bitCount(grid.nx()) != 1 || Integer.bitCount(grid.ny()) != 1) {
            throw new IllegalArgumentException(
                    "the unit of time is a transform that exists for sides of 2^n pixels only;"
                            + " this patch has "
                            + grid.nx()
                            + " x "
                            + grid.ny()
                            + ": measure on 512 or 1024 pixels");
        }
        return new UnitTransform(grid);
    }

    /** Fills the map with a pattern; not part of what is timed. */
    public void prepare() {
        for (int i = 0; i < map.length; i++) {
            map[i] = i * 7919 % 1000;
        }
    }

    /** One transform of the prepared map. */
    public void run() {
        transform.realForward(map);
    }
}
