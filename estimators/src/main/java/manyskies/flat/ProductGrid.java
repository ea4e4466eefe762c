package manyskies.flat;

/**
 * The cheapest grid on which a product of two band-limited maps is exact where it is wanted.
 *
 * <p>Two fields with modes up to lmax have a product with modes up to 2 lmax. On m pixels a side a
 * mode k of the product also appears at k - m; that stays off the modes up to lout when m &gt; (2
 * lmax + lout) side / 2 pi.
 */
public final class ProductGrid {
    /**
     * How much longer a transform takes per point and factor of two when its length is no power of
     * two. Measured with {@code TransformBenchmark} between 432 and 1024; it only decides speed.
     */
    private static final double MIXED_RADIX = 1.7;

    private ProductGrid() {}

    /**
     * The cheapest such patch with the sides of the given one, the same ratio of pixels, and sides
     * that have no prime factor above 5: the smallest, unless a power of two is little larger. It
     * may have fewer or more pixels than the given one.
     *
     * @param lmax largest |l| of either factor
     * @param lout largest |l| wanted of the product
     * @throws IllegalArgumentException if a limit is negative or not finite, or the ratio of the
     *     sides has a prime factor above 5
     */
    public static FlatGrid of(FlatGrid map, double lmax, double lout) {
        requireLimit("lmax", lmax);
        requireLimit("lout", lout);
        double widest = Math.max(2 * lmax + lout, 2 * lout); // lout itself is to be held as well
        int common = gcd(map.nx(), map.ny());
        int ratioX = map.nx() / common;
        int ratioY = map.ny() / common;
        SmoothLength.require("nx", map.nx());
        SmoothLength.require("ny", map.ny());
        double factor = Math.max(widest / map.stepX() / ratioX, widest / map.stepY() / ratioY);
        int smallest = SmoothLength.atLeast(Math.max(4, (int) Math.floor(factor) + 1));
        int best = smallest;
        for (int k = smallest; k < 2 * smallest; k = SmoothLength.atLeast(k + 1)) {
            if (cost(k * ratioX, k * ratioY) < cost(best * ratioX, best * ratioY)) {
                best = k;
            }
        }
        return map.withPixels(ratioX * best, ratioY * best);
    }

    /** Relative time of a transform. */
    private static double cost(int nx, int ny) {
        return (double) nx * ny * (costPerPoint(nx) + costPerPoint(ny));
    }

    private static double costPerPoint(int n) {
        return StrictMath.log(n) * (Integer.bitCount(n) == 1 ? 1 : MIXED_RADIX);
    }

    private static void requireLimit(String name, double limit) {
        if (!(limit >= 0) || Double.isInfinite(limit)) {
            throw new IllegalArgumentException(
                    name
                            + " = "
                            + limit
                            + " is no limit of a product; it is finite and not negative");
        }
    }

    private static int gcd(int a, int b) {
        return b == 0 ? a : gcd(b, a % b);
    }
}
