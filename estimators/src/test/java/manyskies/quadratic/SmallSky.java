package manyskies.quadratic;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.SplittableRandom;
import manyskies.estimator.Belief;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.filter.InverseVariance;
import manyskies.flat.FlatGrid;
import manyskies.flat.FlatTransform;
import manyskies.spectrum.ModeSpectra;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/** A patch small enough for direct sums, with smooth invented spectra. */
public final class SmallSky {
    /** Rectangular on purpose, so that x and y cannot be confused. */
    public static final FlatGrid GRID = new FlatGrid(24, 32, 1.2e-3);

    public static final double LMAX = 1250; // less than a third of the plane, nothing aliases

    public static final double LOUT = 1200;

    private SmallSky() {}

    public static ModeSpectra signal() {
        return signal(GRID);
    }

    private static ModeSpectra signal(FlatGrid grid) {
        return ModeSpectra.sample(table(), grid);
    }

    private static Spectra table() {
        int lmax = 4000;
        EnumMap<Spectrum, double[]> c = new EnumMap<>(Spectrum.class);
        for (Spectrum name : Spectrum.values()) {
            c.put(name, new double[lmax + 1]);
        }
        for (int l = 0; l <= lmax; l++) {
            double fall = Math.exp(-l / 900.0);
            c.get(Spectrum.TT)[l] = 3 * fall;
            c.get(Spectrum.EE)[l] = 0.7 * fall * (1.2 + Math.sin(l / 150.0));
            c.get(Spectrum.BB)[l] = 0.2 * fall;
            c.get(Spectrum.TE)[l] = 0.8 * fall * Math.cos(l / 150.0);
        }
        return Spectra.of(lmax, c);
    }

    /** Signal plus white noise. */
    public static ModeSpectra total(double noise) {
        return total(GRID, noise);
    }

    private static ModeSpectra total(FlatGrid grid, double noise) {
        double[] n = new double[grid.size()];
        Arrays.fill(n, noise);
        return signal(grid).plus(Map.of(Spectrum.TT, n, Spectrum.EE, n, Spectrum.BB, n));
    }

    public static Belief belief() {
        return belief(GRID);
    }

    /** On another patch; its products are exact if (2 LMAX + LOUT) pixel is below 2 pi. */
    public static Belief belief(FlatGrid grid) {
        ModeSpectra total = total(grid, 0.1);
        return new Belief(
                FlatTransform.of(grid, 2 * LMAX),
                signal(grid),
                total,
                InverseVariance.of(total, l -> l <= LMAX, l -> l <= LMAX),
                LOUT);
    }

    /** Three unrelated fields with random modes; Hermitian on the self-conjugate column. */
    public static CmbModes legs(long seed) {
        return legs(GRID, seed);
    }

    /** The same on another patch. */
    public static CmbModes legs(FlatGrid grid, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        return new CmbModes(field(grid, random), field(grid, random), field(grid, random));
    }

    private static Modes field(FlatGrid grid, SplittableRandom random) {
        double[] values = new double[2 * grid.size()];
        for (int mode = 0; mode < grid.size(); mode++) {
            if (!grid.isNyquist(mode) && grid.multipole(mode) > 0) {
                values[2 * mode] = random.nextDouble(-1, 1);
                values[2 * mode + 1] = random.nextDouble(-1, 1);
            }
        }
        for (int ky = 1; ky < grid.ny() / 2; ky++) {
            int plus = grid.mode(0, ky);
            int minus = grid.mode(0, -ky);
            values[2 * minus] = values[2 * plus];
            values[2 * minus + 1] = -values[2 * plus + 1];
        }
        return Modes.of(grid, values);
    }
}
