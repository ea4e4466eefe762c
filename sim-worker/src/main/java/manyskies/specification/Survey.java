package manyskies.specification;

import java.io.Serializable;

/**
 * The truth: what the simulated sky and instrument are.
 *
 * @param beam full width at half maximum of the Gaussian beam in radian, 0 for none
 * @param temperature noise of the temperature map
 * @param polarisation noise of each of the Q and U maps
 * @param splits number of splits with independent noise, each with sqrt(splits) times the depth
 * @param edgeTaper width of the taper at the patch's edge in radian; 0 for a periodic patch
 *     without mask
 * @param curl C_L^psipsi as a fraction of C_L^phiphi, 0 for none
 * @param splineDegree degree of the B-splines that remap the sky: 3, 5 or 7
 */
public record Survey(
        double beam,
        Noise temperature,
        Noise polarisation,
        int splits,
        double edgeTaper,
        double curl,
        int splineDegree)
        implements Serializable {}
