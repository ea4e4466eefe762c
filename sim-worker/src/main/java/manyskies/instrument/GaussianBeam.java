package manyskies.instrument;

/**
 * A Gaussian beam: B_l = exp(-l (l + 1) sigma^2 / 2), sigma = FWHM / sqrt(8 ln 2).
 *
 * @param fwhm full width at half maximum in radian, 0 for no beam
 */
public record GaussianBeam(double fwhm) {

    /** Checks the width. */
    public GaussianBeam {
        if (!(fwhm >= 0) || Double.isInfinite(fwhm)) {
            throw new IllegalArgumentException(
                    "a beam has a width of 0 or more, found " + fwhm + " radian");
        }
    }

    /** B_l at a full-sky multipole, which need not be whole. */
    public double at(double l) {
        double variance = fwhm * fwhm / (8 * StrictMath.log(2));
        return StrictMath.exp(-l * (l + 1) * variance / 2);
    }
}
