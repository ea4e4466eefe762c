package manyskies.instrument;

import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.random.Address;
import manyskies.random.GaussianRows;
import manyskies.specification.Noise;

/**
 * Beam and noise of one field, for the modes of a disc: X_l B_l + n_l.
 *
 * <p>The noise of split s of S has power S N_l, N_l read at |l| - 1/2, and numbers of its own from
 * the address's field {@code noise-F/s}; which number belongs to which mode is said in {@link
 * manyskies.sky.GaussianSky}, so that a smaller disc has the same noise on its modes. Immutable.
 */
final class BeamAndNoise {
    private final ModeDisc disc;
    private final String field;
    private final int splits;
    private final double[] table; // beam and noise amplitude, by |ky| and kx
    private final int[] firstOfRow;

    private BeamAndNoise(ModeDisc disc, String field, int splits) {
        this.disc = disc;
        this.field = field;
        this.splits = splits;
        firstOfRow = new int[disc.maxKy() + 1];
        int size = 0;
        for (int ky = 0; ky <= disc.maxKy(); ky++) {
            firstOfRow[ky] = size;
            size += 2 * (disc.last(ky) + 1);
        }
        table = new double[size];
    }

    static BeamAndNoise of(
            ModeDisc disc, String field, GaussianBeam beam, Noise noise, int splits) {
        if (splits < 1) {
            throw new IllegalArgumentException(
                    "a map has one split or more, found " + splits + " splits");
        }
        BeamAndNoise made = new BeamAndNoise(disc, field, splits);
        FlatGrid grid = disc.grid();
        for (int ky = 0; ky <= disc.maxKy(); ky++) {
            for (int kx = 0; kx <= disc.last(ky); kx++) {
                double l = grid.fullSkyMultipole(grid.mode(kx, ky));
                int at = made.firstOfRow[ky] + 2 * kx;
                made.table[at] = beam.at(l);
                made.table[at + 1] = Math.sqrt(grid.area() / 2 * splits * noise.power(l));
            }
        }
        return made;
    }

    /** One split: beam times sky plus this split's noise. */
    Modes split(Modes sky, Address address, int split) {
        double[] out = convolved(sky);
        addNoise(out, address, split, 1);
        return Modes.of(disc.grid(), out);
    }

    /** The mean of all splits. */
    Modes coadd(Modes sky, Address address) {
        double[] out = convolved(sky);
        for (int split = 0; split < splits; split++) {
            addNoise(out, address, split, 1.0 / splits);
        }
        return Modes.of(disc.grid(), out);
    }

    private double[] convolved(Modes sky) {
        double[] in = sky.values();
        double[] out = new double[in.length];
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            int from = firstOfRow[Math.abs(ky)];
            int to = 2 * disc.grid().mode(0, ky);
            for (int i = 0; i < 2 * (disc.last(ky) + 1); i++) {
                out[to + i] = table[from + (i & ~1)] * in[to + i];
            }
        }
        return out;
    }

    private void addNoise(double[] out, Address address, int split, double scale) {
        GaussianRows rows = address.field("noise-" + field + "/" + split);
        double[] row = new double[2 * (disc.last(0) + 1)];
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            int count = 2 * (disc.last(ky) + 1);
            rows.fill(ky, row, count);
            int from = firstOfRow[Math.abs(ky)] + 1;
            int to = 2 * disc.grid().mode(0, ky);
            for (int i = 2; i < count; i++) {
                out[to + i] += scale * table[from + (i & ~1)] * row[i];
            }
            if (ky > 0) {
                double amplitude = scale * table[from];
                int mirror = 2 * disc.grid().mode(0, -ky);
                out[to] += amplitude * row[0];
                out[to + 1] += amplitude * row[1];
                out[mirror] += amplitude * row[0];
                out[mirror + 1] -= amplitude * row[1];
            }
        }
    }
}
