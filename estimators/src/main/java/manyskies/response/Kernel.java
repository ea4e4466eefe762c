package manyskies.response;

import manyskies.field.SpinMap;

/**
 * The map (1/A) sum_l F(l) exp(i s phi_l) exp(i l.x) of an even real F, for s of either sign.
 *
 * <p>A synthesis of spin |s| carries i^|s| besides; for negative s the map is its conjugate up to
 * (-1)^s. The remaining unit factor is kept as (unitRe + i unitIm).
 */
final class Kernel {
    private final double[] re;
    private final double[] im;
    private final double unitRe;
    private final double unitIm;
    private final double conjugate; // -1 if the stored map is to be conjugated

    private Kernel(double[] re, double[] im, double unitRe, double unitIm, double conjugate) {
        this.re = re;
        this.im = im;
        this.unitRe = unitRe;
        this.unitIm = unitIm;
        this.conjugate = conjugate;
    }

    static Kernel of(int spin, SpinMap synthesised) {
        int s = Math.abs(spin);
        double[] im = s == 0 ? new double[synthesised.re().length] : synthesised.im();
        // i^-s, and for a conjugated map its conjugate i^s times (-1)^s, which is i^-s again
        double[][] power = {{1, 0}, {0, -1}, {-1, 0}, {0, 1}};
        return new Kernel(
                synthesised.re(), im, power[s % 4][0], power[s % 4][1], spin < 0 ? -1 : 1);
    }

    private double re(int pixel) {
        return unitRe * re[pixel] - unitIm * conjugate * im[pixel];
    }

    private double im(int pixel) {
        return unitRe * conjugate * im[pixel] + unitIm * re[pixel];
    }

    double productRe(Kernel other, int pixel) {
        return re(pixel) * other.re(pixel) - im(pixel) * other.im(pixel);
    }

    double productIm(Kernel other, int pixel) {
        return re(pixel) * other.im(pixel) + im(pixel) * other.re(pixel);
    }
}
