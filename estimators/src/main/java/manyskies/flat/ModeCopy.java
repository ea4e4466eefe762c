package manyskies.flat;

import manyskies.field.Modes;

/**
 * Takes the modes of a field from one grid to another of the same sides and other pixels.
 *
 * <p>Only modes with |l| up to a limit that neither grid has on a Nyquist row or column are taken;
 * the others come out zero. X_l does not depend on the number of pixels, so values are copied as
 * they are. Immutable; share freely.
 */
public final class ModeCopy {
    private final FlatGrid from;
    private final FlatGrid to;
    private final int[] source; // first number of each run of modes
    private final int[] target;
    private final int[] length;

    private ModeCopy(FlatGrid from, FlatGrid to, int[] source, int[] target, int[] length) {
        this.from = from;
        this.to = to;
        this.source = source;
        this.target = target;
        this.length = length;
    }

    /**
     * Prepares the copy.
     *
     * @param limit the largest |l| taken; infinity for all that both grids have
     * @throws IllegalArgumentException if the sides differ by more than rounding, or the limit is
     *     not positive
     */
    public static ModeCopy of(FlatGrid from, FlatGrid to, double limit) {
        requireSameSide("x", from.nx() * from.pixel(), to.nx() * to.pixel());
        requireSameSide("y", from.ny() * from.pixel(), to.ny() * to.pixel());
        FlatGrid coarse = from.nx() <= to.nx() ? from : to;
        BandLimit band = BandLimit.of(coarse, limit).withoutNyquist(coarse);
        int[] source = new int[coarse.ny()];
        int[] target = new int[coarse.ny()];
        int[] length = new int[coarse.ny()];
        for (int row = 0; row < coarse.ny(); row++) {
            source[row] = 2 * from.mode(0, coarse.ky(row));
            target[row] = 2 * to.mode(0, coarse.ky(row));
            length[row] = 2 * (band.last(row) + 1);
        }
        return new ModeCopy(from, to, source, target, length);
    }

    private static void requireSameSide(String axis, double from, double to) {
        if (Math.abs(from - to) > 1e-9 * from) {
            throw new IllegalArgumentException(
                    "modes can only be copied between patches of the same sides; along "
                            + axis
                            + " these have "
                            + from
                            + " and "
                            + to
                            + " rad");
        }
    }

    /**
     * The copied modes, in the space of the second grid.
     *
     * @throws IllegalArgumentException if the modes are not of the first grid
     */
    public Modes copy(Modes modes) {
        if (!from.equals(modes.space())) {
            throw new IllegalArgumentException(
                    "this copies modes of " + from + ", found modes of " + modes.space());
        }
        double[] out = new double[2 * to.size()];
        for (int run = 0; run < length.length; run++) {
            System.arraycopy(modes.values(), source[run], out, target[run], length[run]);
        }
        return Modes.of(to, out);
    }
}
