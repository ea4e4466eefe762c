package manyskies.flat;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import manyskies.field.Modes;

/** Made-up fields for tests, and how far apart two arrays are. */
final class Skies {
    private Skies() {}

    /** Uniform in (-1, 1). */
    static double[] noise(int length, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double[] out = new double[length];
        for (int i = 0; i < length; i++) {
            out[i] = 2 * random.nextDouble() - 1;
        }
        return out;
    }

    /** Modes of a real field with |l| up to a limit, Hermitian on the self-conjugate columns. */
    static Modes modes(FlatGrid grid, double limit, boolean nyquist, long seed) {
        double[] out = noise(2 * grid.size(), seed);
        for (int mode = 0; mode < grid.size(); mode++) {
            boolean gone = grid.multipole(mode) > limit || (!nyquist && grid.isNyquist(mode));
            out[2 * mode] *= gone ? 0 : 1;
            out[2 * mode + 1] *= gone ? 0 : 1;
        }
        for (int kx = 0; kx <= grid.nx() / 2; kx += grid.nx() / 2) {
            for (int ky = 0; ky <= grid.ny() / 2; ky++) {
                int mode = grid.mode(kx, ky);
                int opposite = grid.mode(kx, ky == grid.ny() / 2 ? ky : -ky);
                out[2 * opposite] = out[2 * mode];
                out[2 * opposite + 1] = mode == opposite ? 0 : -out[2 * mode + 1];
            }
        }
        return Modes.of(grid, out);
    }

    /** The same without the mode l = 0, which has no direction. */
    static Modes directed(FlatGrid grid, double limit, long seed) {
        double[] out = modes(grid, limit, false, seed).values().clone();
        out[0] = 0;
        return Modes.of(grid, out);
    }

    /** Checks two arrays to a part in 10^12 of the norm of the second. */
    static void assertSame(double[] found, double[] expected) {
        assertThat(distance(found, expected)).isLessThan(1e-12);
    }

    /** The norm of the difference over the norm of the expected array. */
    static double distance(double[] found, double[] expected) {
        assertThat(found).hasSameSizeAs(expected);
        double difference = 0;
        double norm = 0;
        for (int i = 0; i < found.length; i++) {
            difference += (found[i] - expected[i]) * (found[i] - expected[i]);
            norm += expected[i] * expected[i];
        }
        return Math.sqrt(difference / norm);
    }
}
