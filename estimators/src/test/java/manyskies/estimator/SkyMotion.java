package manyskies.estimator;

import java.util.function.IntToDoubleFunction;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.field.SkyField;
import manyskies.flat.FlatGrid;

/** Sums, mirror images, rotations and shifts of skies on a flat patch, mode by mode. */
final class SkyMotion {
    private SkyMotion() {}

    /** Which mode (kx', ky') of the old sky stands at (kx, ky) of the new one. */
    private interface Source {
        int[] of(int kx, int ky);
    }

    /** x a + y b. */
    static CmbModes combine(CmbModes a, double x, CmbModes b, double y) {
        return new CmbModes(
                a.temperature().combine(x, b.temperature(), y),
                a.gradient().combine(x, b.gradient(), y),
                a.curl().combine(x, b.curl(), y));
    }

    /** A sky with one field replaced. */
    static CmbModes with(CmbModes sky, SkyField field, Modes modes) {
        return new CmbModes(
                field == SkyField.T ? modes : sky.temperature(),
                field == SkyField.E ? modes : sky.gradient(),
                field == SkyField.B ? modes : sky.curl());
    }

    /** y to -y: a scalar's X'(lx, ly) = X(lx, -ly). */
    static Modes mirrored(Modes modes) {
        return moved(modes, (kx, ky) -> new int[] {kx, -ky}, mode -> 0);
    }

    /** y to -y with U to -U, under which B changes its sign besides. */
    static CmbModes mirrored(CmbModes sky) {
        Modes b = mirrored(sky.curl());
        return new CmbModes(
                mirrored(sky.temperature()), mirrored(sky.gradient()), b.combine(-1, b, 0));
    }

    /** By 90 degrees from x to y: X'(lx, ly) = X(ly, -lx). */
    static Modes turned(Modes modes) {
        return moved(modes, (kx, ky) -> new int[] {ky, -kx}, mode -> 0);
    }

    /** By 90 degrees from x to y. */
    static CmbModes turned(CmbModes sky) {
        return new CmbModes(turned(sky.temperature()), turned(sky.gradient()), turned(sky.curl()));
    }

    /** X'(x) = X(x - d): X'_l = X_l exp(-i l.d). */
    static Modes shifted(Modes modes, double dx, double dy) {
        FlatGrid grid = (FlatGrid) modes.space();
        return moved(
                modes,
                (kx, ky) -> new int[] {kx, ky},
                mode -> -grid.lx(mode) * dx - grid.ly(mode) * dy);
    }

    /** X'(x) = X(x - d). */
    static CmbModes shifted(CmbModes sky, double dx, double dy) {
        return new CmbModes(
                shifted(sky.temperature(), dx, dy),
                shifted(sky.gradient(), dx, dy),
                shifted(sky.curl(), dx, dy));
    }

    /** Nyquist rows and columns, which have no direction, are left out. */
    private static Modes moved(Modes modes, Source source, IntToDoubleFunction phase) {
        FlatGrid grid = (FlatGrid) modes.space();
        double[] out = new double[2 * grid.size()];
        for (int mode = 0; mode < grid.size(); mode++) {
            if (!grid.isNyquist(mode)) {
                int kx = mode % grid.columns();
                int[] from = source.of(kx, grid.ky(mode / grid.columns()));
                boolean stored = from[0] >= 0;
                int old = stored ? grid.mode(from[0], from[1]) : grid.mode(-from[0], -from[1]);
                double re = modes.re(old);
                double im = stored ? modes.im(old) : -modes.im(old);
                double cos = Math.cos(phase.applyAsDouble(mode));
                double sin = Math.sin(phase.applyAsDouble(mode));
                out[2 * mode] = cos * re - sin * im;
                out[2 * mode + 1] = cos * im + sin * re;
            }
        }
        return Modes.of(grid, out);
    }
}
