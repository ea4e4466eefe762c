package manyskies.response;

import java.util.function.DoubleUnaryOperator;
import manyskies.field.GradientCurl;
import manyskies.field.Modes;
import manyskies.field.SkyTransform;
import manyskies.field.SpinMap;

/**
 * Sums over l1 of products of functions of l1 and of l2 = L - l1, for all L at once.
 *
 * <p>Adds up (1/A) sum_l1 F(l1) G(l2) cos(n phi12) times L.l1 L.l1 ({@link #addDirect}) or L.l1
 * L.l2 ({@link #addExchanged}), and the same with L x l. Both follow from two sums, since with
 * complex l = |l| exp(i phi)
 *
 * <pre>
 *   (L.l)(L.l') = |L|^2 [Re(l l'^*) + Re(exp(-2 i phi_L) l l')] / 2
 *   (Lxl)(Lxl') = |L|^2 [Re(l l'^*) - Re(exp(-2 i phi_L) l l')] / 2
 * </pre>
 *
 * <p>F and G depend on l and -l alike, so that all maps are even or odd and the modes real. Keeps
 * three maps, and some twelve more while a product is added; one thread at a time.
 */
final class Convolution {
    private static final int HIGHEST_HARMONIC = 4;

    private final SkyTransform transform;
    private final double[] aligned; // sum with Re(l l'^*)
    private final double[] twistedRe; // sum with l l', a map of spin 2
    private final double[] twistedIm;

    Convolution(SkyTransform transform) {
        this.transform = transform;
        aligned = new double[transform.pixels()];
        twistedRe = new double[transform.pixels()];
        twistedIm = new double[transform.pixels()];
    }

    /** Adds F(l1) G(l2) (L.l1)^2 times the product of two angles, taken at the same modes. */
    void addDirect(double[] f, double[] g, Angle a, Angle b) {
        if (f == null || g == null || !a.isEvenWith(b)) {
            return;
        }
        Kernels first = kernels(f, slope -> slope * slope);
        Kernels second = kernels(g, slope -> 1);
        for (int n = 0; n <= HIGHEST_HARMONIC; n += 2) {
            double c = a.coefficient(b, n);
            if (c != 0) {
                addAligned(c, first.of(n), second.of(-n));
                addTwisted(0.5 * c, first.of(2 + n), second.of(-n));
                addTwisted(0.5 * c, first.of(2 - n), second.of(n));
            }
        }
    }

    /** Adds F(l1) G(l2) L.l1 L.l2 times angle a and angle b with its modes exchanged. */
    void addExchanged(double[] f, double[] g, Angle a, Angle b) {
        if (f == null || g == null || !a.isEvenWith(b)) {
            return;
        }
        Kernels first = kernels(f, slope -> slope);
        Kernels second = kernels(g, slope -> slope);
        for (int n = 0; n <= HIGHEST_HARMONIC; n += 2) {
            double c = 0.5 * a.coefficient(b.exchanged(), n);
            if (c != 0) {
                addAligned(c, first.of(1 + n), second.of(-1 - n));
                addAligned(c, first.of(1 - n), second.of(n - 1));
                addTwisted(c, first.of(1 + n), second.of(1 - n));
                addTwisted(c, first.of(1 - n), second.of(1 + n));
            }
        }
    }

    private Kernels kernels(double[] f, DoubleUnaryOperator ofSlope) {
        double[] modes = new double[2 * f.length];
        for (int mode = 0; mode < f.length; mode++) {
            modes[2 * mode] = f[mode] * ofSlope.applyAsDouble(transform.slope(0, mode));
        }
        return new Kernels(transform, Modes.of(transform.space(), modes));
    }

    /** Adds the sum over l1 of two kernels of opposite spins, whose real part is cos(s phi12). */
    private void addAligned(double c, Kernel first, Kernel second) {
        for (int pixel = 0; pixel < aligned.length; pixel++) {
            aligned[pixel] += c * first.productRe(second, pixel);
        }
    }

    /** Adds the sum over l1 of two kernels whose spins add up to 2. */
    private void addTwisted(double c, Kernel first, Kernel second) {
        for (int pixel = 0; pixel < twistedRe.length; pixel++) {
            twistedRe[pixel] += c * first.productRe(second, pixel);
            twistedIm[pixel] += c * first.productIm(second, pixel);
        }
    }

    /** The sums as they stand. */
    LensAndCurl result() {
        double[] even = transform.analyse(SpinMap.scalar(aligned.clone())).gradient().values();
        GradientCurl twisted =
                transform.analyse(SpinMap.of(2, twistedRe.clone(), twistedIm.clone()));
        double[] odd = twisted.gradient().values();
        double[] lens = new double[transform.space().size()];
        double[] curl = new double[lens.length];
        for (int mode = 0; mode < lens.length; mode++) {
            double slope = transform.slope(0, mode);
            double half = 0.5 * slope * slope;
            lens[mode] = half * (even[2 * mode] - odd[2 * mode]); // spin 2 carries i^2 = -1
            curl[mode] = half * (even[2 * mode] + odd[2 * mode]);
        }
        return new LensAndCurl(lens, curl);
    }
}
