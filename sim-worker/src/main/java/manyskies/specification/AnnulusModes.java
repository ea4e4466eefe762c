package manyskies.specification;

/**
 * Which annuli of |l| hold a mode of a patch, l = 2 pi (kx / (nx d), ky / (ny d)), the mode l = 0
 * left out. Multipoles are computed as the flat grid does, to the last bit, so that an edge that
 * falls on a mode is judged alike.
 */
final class AnnulusModes {
    private final double stepX;
    private final double stepY;

    AnnulusModes(PatchReader.Shape shape) {
        stepX = 2 * Math.PI / (shape.nx() * shape.pixel());
        stepY = 2 * Math.PI / (shape.ny() * shape.pixel());
    }

    /** Whether a mode has lower &le; |l| &lt; upper. */
    boolean isPopulated(double lower, double upper) {
        for (int kx = 0; kx * stepX < upper; kx++) {
            double lx = kx * stepX;
            double rest = Math.sqrt(Math.max(0, lower * lower - lx * lx));
            int first = Math.max(kx == 0 ? 1 : 0, (int) (rest / stepY) - 1);
            for (int ky = first; ky <= first + 2; ky++) {
                double ly = ky * stepY;
                double l = Math.sqrt(lx * lx + ly * ly);
                if (l >= lower && l < upper) {
                    return true;
                }
            }
        }
        return false;
    }
}
