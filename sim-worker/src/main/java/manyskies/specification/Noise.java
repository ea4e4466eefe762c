package manyskies.specification;

import java.io.Serializable;

/**
 * Noise power N_l = depth^2 [1 + (knee / l)^slope].
 *
 * @param depth white level in uK radian (uK-arcmin outside the code)
 * @param knee multipole at which the correlated part equals the white one; 0 for white noise
 * @param slope power of l, positive; 0 for white noise
 */
public record Noise(double depth, double knee, double slope) implements Serializable {

    /** White noise has no slope, so that two records of the same noise are equal. */
    public Noise {
        slope = knee == 0 ? 0 : slope;
    }

    /** White noise of a depth in uK radian. */
    public static Noise white(double depth) {
        return new Noise(depth, 0, 0);
    }

    /** N_l in uK^2 sr; l is taken as at least 2, so that the largest scales stay finite. */
    public double power(double l) {
        double white = depth * depth;
        return knee == 0 ? white : white * (1 + StrictMath.pow(knee / Math.max(l, 2), slope));
    }
}
