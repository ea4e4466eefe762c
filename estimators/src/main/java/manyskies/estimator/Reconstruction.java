package manyskies.estimator;

import manyskies.field.Modes;

/**
 * What an estimator returns: the modes of phi (gradient) and of psi (curl).
 *
 * <p>Unnormalised as an estimator returns it; divided by the two responses it estimates phi and
 * psi, where the deflection is d_i = d_i phi + eps_ij d_j psi.
 *
 * @param gradient estimate of the lensing potential
 * @param curl estimate of the curl potential, whose expectation is zero on a sky without rotation
 */
public record Reconstruction(Modes gradient, Modes curl) {

    /** Both parts multiplied by a factor per mode each. */
    public Reconstruction times(double[] gradientFactor, double[] curlFactor) {
        return new Reconstruction(gradient.times(gradientFactor), curl.times(curlFactor));
    }

    /** The sum of two reconstructions. */
    public Reconstruction plus(Reconstruction other) {
        return new Reconstruction(
                gradient.combine(1, other.gradient, 1), curl.combine(1, other.curl, 1));
    }
}
