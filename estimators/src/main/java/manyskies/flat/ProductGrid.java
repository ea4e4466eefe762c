package manyskies.flat;

/**
 * The smallest grid on which a product of two band-limited maps is exact where it is wanted.
 *
 * <p>Two fields with modes up to lmax have a product with modes up to 2 lmax. On m pixels a side a
 * mode k of the product also appears at k - m; that stays off the modes up to lout when m &gt; (2
 * lmax + lout) side / 2 pi.
 */
public final class ProductGrid {
    private ProductGrid() {}

    /**
     * The smallest such patch with the sides of the given one, the same ratio of pixels and sides
     * that have no prime factor above 5. It may have fewer or more pixels than the given one.
     *
     * @param lmax largest |l| of either factor
     * @param lout largest |l| wanted of the product
     * @throws IllegalArgumentException if a limit is negative or not finite, or the ratio of the
     *     sides has a prime factor above 5
     */
    public static FlatGrid of(FlatGrid map, double lmax, double lout) {
        requireLimit("lmax", lmax);
        requireLimit("lout", lout);
        double widest = Math.max(2 * lmax + lout, 2 * lout); // both must be held without aliasing
        int common = gcd(map.nx(), map.ny());
        int ratioX = map.nx() / common;
        int ratioY = map.ny() / common;
        SmoothLength.require("nx", 2 * ratioX);
        SmoothLength.require("ny", 2 * ratioY);
        double factor = Math.max(widest / map.stepX() / ratioX, widest / map.stepY() / ratioY);
        int smallest = Math.max(4, (int) Math.floor(factor) + 1);
        int even = SmoothLength.atLeast(smallest);
        return map.withPixels(ratioX * even, ratioY * even);
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
