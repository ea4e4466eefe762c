package manyskies.flat;

/**
 * The two self-conjugate columns kx = 0 and kx = nx/2 of a half plane, packed as one.
 *
 * <p>Along y both are transforms of real columns a and b, so that one complex transform of a + i b
 * does both: with Z its transform, A_k = (Z_k + Z_{-k}^*) / 2 and B_k = (Z_k - Z_{-k}^*) / 2i.
 */
final class SelfConjugate {
    private SelfConjugate() {}

    /** Z = A + i B in place of A, from the Hermitian parts of A and B. */
    static void pack(double[] column, int start, double[] other, int rows) {
        for (int k = 0; k <= rows / 2; k++) {
            int p = start + 2 * k;
            int q = start + 2 * ((rows - k) % rows);
            double aRe = (column[p] + column[q]) / 2;
            double aIm = (column[p + 1] - column[q + 1]) / 2;
            double bRe = (other[p - start] + other[q - start]) / 2;
            double bIm = (other[p - start + 1] - other[q - start + 1]) / 2;
            column[p] = aRe - bIm;
            column[p + 1] = aIm + bRe;
            column[q] = aRe + bIm;
            column[q + 1] = bRe - aIm;
        }
    }

    /** A in place of Z, and B. */
    static void unpack(double[] column, int start, double[] other, int rows) {
        for (int k = 0; k <= rows / 2; k++) {
            int p = start + 2 * k;
            int q = start + 2 * ((rows - k) % rows);
            double aRe = (column[p] + column[q]) / 2;
            double aIm = (column[p + 1] - column[q + 1]) / 2;
            double bRe = (column[p + 1] + column[q + 1]) / 2;
            double bIm = (column[q] - column[p]) / 2;
            column[p] = aRe;
            column[p + 1] = aIm;
            column[q] = aRe;
            column[q + 1] = -aIm;
            other[p - start] = bRe;
            other[p - start + 1] = bIm;
            other[q - start] = bRe;
            other[q - start + 1] = -bIm;
        }
    }
}
