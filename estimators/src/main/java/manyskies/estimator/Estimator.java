package manyskies.estimator;

import java.util.Optional;

/**
 * A bilinear estimator of the lensing potential, ready for use.
 *
 * <p>Bilinear: linear in the sky of leg a and in that of leg b, so that noise biases are bookkeeping
 * over pairs of skies. A pure function of its legs: one instance serves all threads of a program at
 * once, each with legs and a transform of its own. So it is immutable, holds no scratch memory, and
 * transforms with {@link LegPair#transform} only, never with that of the belief it was made from.
 */
public interface Estimator {
    /** The name under which results are stored: lower case, stable. */
    String name();

    /** The unnormalised reconstruction from two legs; {@link LegPair} shares what others made. */
    Reconstruction reconstruct(LegPair legs);

    /**
     * How it weights its legs, from which response and noise follow analytically; empty where that
     * is not known and both must be measured by simulation.
     */
    Optional<BilinearWeight> weight();
}
