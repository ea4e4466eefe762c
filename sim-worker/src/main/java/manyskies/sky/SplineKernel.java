package manyskies.sky;

/** The sum over a stencil of coefficients: the innermost loop of the remap. */
interface SplineKernel {
    /**
     * Writes T, Q, U at one point.
     *
     * @param corner index of the stencil's first coefficient of T
     * @param tx distance along x from the pixel before the point, 0 to 1
     * @param ty the same along y
     * @param pixel where to write
     */
    void evaluate(int corner, double tx, double ty, int pixel, double[] t, double[] q, double[] u);
}
