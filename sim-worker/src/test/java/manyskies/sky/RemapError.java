package manyskies.sky;

import java.util.Locale;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.flat.StokesMaps;
import manyskies.flat.StokesTransform;
import manyskies.random.Address;
import manyskies.spectrum.Bandpowers;
import manyskies.spectrum.Bands;
import manyskies.spectrum.Spectra;

/**
 * The interpolation's error per band: a remap on a grid against degree 7 on a grid refined by two or
 * more, of the same modes and displacement, compared at the common pixels.
 *
 * <p>Both sample one lensed sky at the same points, so that they differ by interpolation alone. Run
 * {@code main} for the table that the documentation quotes.
 */
final class RemapError {
    private static final double ARCMIN = Math.PI / 180 / 60;

    private final FlatGrid grid;
    private final ModeDisc disc;
    private final Spectra spectra;
    private final Bandpowers bandpowers;
    private final StokesTransform analysis;
    private final UnlensedSky sky;
    private final CmbModes truth;

    RemapError(FlatGrid grid, int refined, Spectra spectra, Bands bands, Address address) {
        this.grid = grid;
        this.spectra = spectra;
        disc = ModeDisc.of(grid, spectra.lmax() + 0.5);
        bandpowers = Bandpowers.of(grid, bands);
        analysis = StokesTransform.of(ModeDisc.of(grid, grid.nyquist()));
        sky = GaussianSky.of(disc, spectra, 0).draw(address);
        FlatGrid fine = grid.withPixels(refined * grid.nx(), refined * grid.ny());
        ModeDisc same = ModeDisc.of(fine, disc.limit());
        StokesMaps maps =
                SkyLensing.of(same, spectra, 0, 7)
                        .lens(GaussianSky.of(same, spectra, 0).draw(address));
        truth = analysis.analyse(every(refined, maps));
    }

    private StokesMaps every(int step, StokesMaps fine) {
        StokesMaps out = StokesMaps.zero(grid);
        for (int y = 0, pixel = 0; y < grid.ny(); y++) {
            for (int x = 0; x < grid.nx(); x++, pixel++) {
                int from = step * (y * fine.grid().nx() + x);
                out.t()[pixel] = fine.t()[from];
                out.q()[pixel] = fine.q()[from];
                out.u()[pixel] = fine.u()[from];
            }
        }
        return out;
    }

    /** The modes remapped on the grid itself. */
    CmbModes remapped(int degree, boolean interpolating) {
        SkyLensing lensing =
                interpolating
                        ? SkyLensing.withRms(disc, 0, degree)
                        : SkyLensing.of(disc, spectra, 0, degree);
        return analysis.analyse(lensing.lens(sky));
    }

    /** Relative error of the power per band. */
    double[] ofPower(Modes found, Modes expected) {
        double[] a = bandpowers.average(found, found);
        double[] b = bandpowers.average(expected, expected);
        double[] out = new double[a.length];
        for (int i = 0; i < a.length; i++) {
            out[i] = a[i] / b[i] - 1;
        }
        return out;
    }

    /** Root of the power of the difference, relative to that of the field, per band. */
    double[] ofModes(Modes found, Modes expected) {
        Modes difference = found.combine(1, expected, -1);
        double[] a = bandpowers.average(difference, difference);
        double[] b = bandpowers.average(expected, expected);
        double[] out = new double[a.length];
        for (int i = 0; i < a.length; i++) {
            out[i] = Math.sqrt(a[i] / b[i]);
        }
        return out;
    }

    CmbModes truth() {
        return truth;
    }

    /** Prints the errors: arguments refinement, degree. */
    public static void main(String[] arguments) {
        int n = Integer.parseInt(arguments[0]);
        int refined = Integer.parseInt(arguments[1]);
        double[] edges = new double[30];
        for (int i = 0; i < edges.length; i++) {
            edges[i] = 100 * (i + 1);
        }
        FlatGrid grid = new FlatGrid(n, n, 2 * ARCMIN);
        RemapError error =
                new RemapError(
                        grid,
                        refined,
                        Tables.unlensed(),
                        Bands.between(edges),
                        new Address(1, "remap", 0));
        for (int degree = 3; degree <= 7; degree += 2) {
            for (boolean interpolating : new boolean[] {true, false}) {
                CmbModes found = error.remapped(degree, interpolating);
                print(
                        degree,
                        interpolating,
                        "T",
                        error.ofPower(found.temperature(), error.truth.temperature()));
                print(
                        degree,
                        interpolating,
                        "E",
                        error.ofPower(found.gradient(), error.truth.gradient()));
                print(degree, interpolating, "B", error.ofPower(found.curl(), error.truth.curl()));
                print(
                        degree,
                        interpolating,
                        "T modes",
                        error.ofModes(found.temperature(), error.truth.temperature()));
                print(
                        degree,
                        interpolating,
                        "E modes",
                        error.ofModes(found.gradient(), error.truth.gradient()));
                print(
                        degree,
                        interpolating,
                        "B modes",
                        error.ofModes(found.curl(), error.truth.curl()));
            }
        }
    }

    private static void print(int degree, boolean interpolating, String field, double[] errors) {
        StringBuilder line = new StringBuilder();
        line.append(degree)
                .append(interpolating ? " interpolating " : " mean response ")
                .append(field)
                .append(" %:");
        for (double e : errors) {
            line.append(String.format(Locale.ROOT, " %.3f", 100 * e));
        }
        System.out.println(line);
    }
}
