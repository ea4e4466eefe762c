package manyskies.sky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.Optional;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.flat.RealFft2;
import manyskies.flat.StokesMaps;
import manyskies.flat.StokesTransform;
import manyskies.random.Address;
import manyskies.spectrum.Spectrum;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SkyLensingTest {
    private static final double ARCMIN = Math.PI / 180 / 60;
    private static final FlatGrid GRID = new FlatGrid(96, 64, 2 * ARCMIN);
    private static final ModeDisc DISC = ModeDisc.of(GRID, GRID.nyquist() * (1 - 1e-9));

    private static UnlensedSky sky() {
        return GaussianSky.of(DISC, Tables.unlensed(), 0).draw(new Address(7, "sky", 0));
    }

    private static UnlensedSky with(UnlensedSky sky, Modes phi) {
        return new UnlensedSky(
                sky.temperature(), sky.gradient(), sky.curl(), phi, Optional.empty());
    }

    private static StokesMaps unlensedMaps(UnlensedSky sky) {
        return StokesTransform.of(DISC)
                .synthesise(new CmbModes(sky.temperature(), sky.gradient(), Modes.zero(GRID)));
    }

    /** Exact: interpolating splines pass through the pixels. */
    @ParameterizedTest
    @ValueSource(ints = {3, 5, 7})
    void aSkyWithoutLensesStaysAsItIs(int degree) {
        UnlensedSky sky = with(sky(), Modes.zero(GRID));
        StokesMaps lensed = SkyLensing.withRms(DISC, 0, degree).lens(sky);
        StokesMaps expected = unlensedMaps(sky);
        assertThat(distance(lensed.t(), expected.t())).isLessThan(1e-12);
        assertThat(distance(lensed.q(), expected.q())).isLessThan(1e-12);
        assertThat(distance(lensed.u(), expected.u())).isLessThan(1e-12);
    }

    /** Common practice, no source: rms between 1 and 3 arcmin, coherent over degrees. */
    @Test
    void deflectionsAreArcminutesCoherentOverDegrees() {
        FlatGrid wide = new FlatGrid(256, 256, 5 * ARCMIN);
        GaussianSky skies = GaussianSky.of(wide, Tables.unlensed(), 0);
        SkyLensing lensing = SkyLensing.of(skies.disc(), Tables.unlensed(), 0, 3);
        lensing.displacement(skies.draw(new Address(7, "deflection", 0)));
        double rms = Math.sqrt(product(wide, lensing, 0)) * 5;
        assertThat(rms).isBetween(1.0, 3.0);
        int degree = 12; // pixels
        assertThat(product(wide, lensing, degree) / product(wide, lensing, 0)).isGreaterThan(0.5);
    }

    /** Mean of d(x) d(x + shift along y), in square pixels. */
    private static double product(FlatGrid grid, SkyLensing lensing, int shift) {
        double sum = 0;
        for (int i = 0; i < grid.pixels(); i++) {
            int j = (i + shift * grid.nx()) % grid.pixels();
            sum += lensing.dx[i] * lensing.dx[j] + lensing.dy[i] * lensing.dy[j];
        }
        return sum / grid.pixels();
    }

    /**
     * The mean square of d over skies against the table, with a curl potential. A sum of squares of
     * unequal variances is taken as chi-squared of the same mean and variance; false-alarm rate
     * 1e-6, shared by the axes.
     */
    private static double worstDisplacementTail(double belief) {
        int count = 400;
        double curl = 0.2;
        GaussianSky skies = GaussianSky.of(GRID, Tables.unlensed(), curl);
        SkyLensing lensing = SkyLensing.of(skies.disc(), Tables.unlensed(), curl, 3);
        double[] expected = SkyLensing.displacementVariance(skies.disc(), Tables.unlensed(), curl);
        double[] degrees = degreesOfFreedom(skies.disc(), curl);
        double[] mean = new double[2];
        for (int index = 0; index < count; index++) {
            lensing.displacement(skies.draw(new Address(7, "rms", index)));
            mean[0] += meanSquare(lensing.dx) / count;
            mean[1] += meanSquare(lensing.dy) / count;
        }
        double worst = 1;
        for (int axis = 0; axis < 2; axis++) {
            double ratio = mean[axis] * GRID.pixel() * GRID.pixel() / (belief * expected[axis]);
            double all = count * degrees[axis];
            worst = Math.min(worst, ChiSquared.tail(ratio * all, all));
        }
        return worst;
    }

    private static double meanSquare(double[] values) {
        return Arrays.stream(values).map(v -> v * v).sum() / values.length;
    }

    /** (sum of variances)^2 / sum of their squares, over phi and psi, along x and along y. */
    private static double[] degreesOfFreedom(ModeDisc disc, double curl) {
        double[] sum = new double[2];
        double[] squares = new double[2];
        for (int mode = 0; mode < GRID.size(); mode++) {
            if (GRID.multipole(mode) <= disc.limit()) {
                double m = GRID.multiplicity(mode);
                double c = Tables.unlensed().at(Spectrum.PP, GRID.fullSkyMultipole(mode));
                double x = GRID.lx(mode) * GRID.lx(mode) * c;
                double y = GRID.ly(mode) * GRID.ly(mode) * c;
                sum[0] += m * (x + curl * y);
                sum[1] += m * (y + curl * x);
                squares[0] += m * (x * x + curl * y * curl * y);
                squares[1] += m * (y * y + curl * x * curl * x);
            }
        }
        return new double[] {sum[0] * sum[0] / squares[0], sum[1] * sum[1] / squares[1]};
    }

    @Test
    void rmsDeflectionIsTheTables() {
        assertThat(worstDisplacementTail(1)).isGreaterThan(1e-6 / 2);
    }

    @Test
    void theRmsSeesTwentyPerCent() {
        assertThat(worstDisplacementTail(1.2)).isLessThan(1e-6 / 2);
    }

    /** Common practice, no source: about 1e-5 of the mean, 2.7255 K; 4e-5 with all its scales. */
    @Test
    void temperatureContrastIsOfOrderTenToMinusFive() {
        double rms = Math.sqrt(meanSquare(unlensedMaps(sky()).t()));
        assertThat(rms / 2.7255e6).isBetween(1e-5, 1e-4);
    }

    /** Exact: no gravitational waves, no lenses, no B. */
    @Test
    void anUnlensedSkyIsPureE() {
        UnlensedSky sky = with(sky(), Modes.zero(GRID));
        StokesMaps maps = SkyLensing.withRms(DISC, 0, 3).lens(sky);
        CmbModes modes = StokesTransform.of(DISC).analyse(maps);
        assertThat(norm(modes.curl().values())).isLessThan(1e-13 * norm(modes.gradient().values()));
        assertThat(distance(modes.gradient().values(), sky.gradient().values())).isLessThan(1e-11);
    }

    @Test
    void lensingMakesB() {
        CmbModes modes =
                StokesTransform.of(DISC)
                        .analyse(SkyLensing.of(DISC, Tables.unlensed(), 0, 3).lens(sky()));
        assertThat(norm(modes.curl().values()))
                .isBetween(
                        1e-3 * norm(modes.gradient().values()),
                        0.5 * norm(modes.gradient().values()));
    }

    /** Exact: y to -y with U to -U leaves T and E of the mirrored sky, and flips its B. */
    @Test
    void theMirroredSkyHasTheSameEAndTheOppositeB() {
        StokesTransform transform = StokesTransform.of(DISC);
        StokesMaps maps = SkyLensing.of(DISC, Tables.unlensed(), 0, 3).lens(sky());
        CmbModes modes = transform.analyse(maps);
        CmbModes mirrored = transform.analyse(mirrored(maps));
        assertThat(distance(mirrored.temperature().values(), flip(modes.temperature(), 1)))
                .isLessThan(1e-11);
        assertThat(distance(mirrored.gradient().values(), flip(modes.gradient(), 1)))
                .isLessThan(1e-11);
        assertThat(distance(mirrored.curl().values(), flip(modes.curl(), -1))).isLessThan(1e-11);
    }

    private static StokesMaps mirrored(StokesMaps maps) {
        StokesMaps out = StokesMaps.zero(GRID);
        for (int pixel = 0; pixel < GRID.pixels(); pixel++) {
            int y = pixel / GRID.nx();
            int from = (GRID.ny() - y) % GRID.ny() * GRID.nx() + pixel % GRID.nx();
            out.t()[pixel] = maps.t()[from];
            out.q()[pixel] = maps.q()[from];
            out.u()[pixel] = -maps.u()[from];
        }
        return out;
    }

    /** sign X(l_x, -l_y), for modes within the disc. */
    private static double[] flip(Modes modes, int sign) {
        double[] out = new double[2 * GRID.size()];
        for (int ky = -DISC.maxKy(); ky <= DISC.maxKy(); ky++) {
            for (int kx = 0; kx <= DISC.last(ky); kx++) {
                out[2 * GRID.mode(kx, ky)] = sign * modes.re(GRID.mode(kx, -ky));
                out[2 * GRID.mode(kx, ky) + 1] = sign * modes.im(GRID.mode(kx, -ky));
            }
        }
        return out;
    }

    /** A mirrored sky is lensed to the mirrored lensed sky: psi, as B, changes its sign. */
    @Test
    void lensingRespectsParity() {
        GaussianSky skies = GaussianSky.of(DISC, Tables.withCurl(Tables.unlensed()), 0.5);
        SkyLensing lensing = SkyLensing.of(DISC, Tables.unlensed(), 0.5, 5);
        UnlensedSky sky = skies.draw(new Address(7, "parity", 0));
        UnlensedSky mirrored =
                new UnlensedSky(
                        Modes.of(GRID, flip(sky.temperature(), 1)),
                        Modes.of(GRID, flip(sky.gradient(), 1)),
                        sky.curl().map(b -> Modes.of(GRID, flip(b, -1))),
                        Modes.of(GRID, flip(sky.phi(), 1)),
                        sky.psi().map(psi -> Modes.of(GRID, flip(psi, -1))));
        StokesMaps expected = mirrored(lensing.lens(sky));
        StokesMaps found = lensing.lens(mirrored);
        assertThat(distance(found.t(), expected.t())).isLessThan(1e-10);
        assertThat(distance(found.q(), expected.q())).isLessThan(1e-10);
        assertThat(distance(found.u(), expected.u())).isLessThan(1e-10);
    }

    /** Second method: the displacements against differences of the potentials' maps. */
    @Test
    void displacementsAreDerivativesOfThePotentials() {
        FlatGrid fine = new FlatGrid(192, 128, ARCMIN);
        ModeDisc low = ModeDisc.of(fine, 800);
        UnlensedSky sky =
                GaussianSky.of(low, Tables.unlensed(), 0.5).draw(new Address(7, "potential", 0));
        SkyLensing lensing = SkyLensing.of(low, Tables.unlensed(), 0.5, 3);
        lensing.displacement(sky);
        RealFft2 fft = RealFft2.of(fine, 800);
        double[] phi = new double[fine.pixels()];
        double[] psi = new double[fine.pixels()];
        fft.inverse(sky.phi().values(), phi);
        fft.inverse(sky.psi().orElseThrow().values(), psi);
        double[] x = new double[fine.pixels()];
        double[] y = new double[fine.pixels()];
        for (int i = 0; i < fine.pixels(); i++) {
            x[i] = slope(fine, phi, i, 1, 0) + slope(fine, psi, i, 0, 1);
            y[i] = slope(fine, phi, i, 0, 1) - slope(fine, psi, i, 1, 0);
        }
        // fourth-order differences: (l d)^4 / 30 = 1e-4 at l = 800, mostly far less
        assertThat(distance(lensing.dx, x)).isLessThan(1e-3);
        assertThat(distance(lensing.dy, y)).isLessThan(1e-3);
    }

    /** d f / d pixel / pixel, from four neighbours, in pixels. */
    private static double slope(FlatGrid grid, double[] f, int at, int stepX, int stepY) {
        double near = neighbour(grid, f, at, stepX, stepY) - neighbour(grid, f, at, -stepX, -stepY);
        double far =
                neighbour(grid, f, at, 2 * stepX, 2 * stepY)
                        - neighbour(grid, f, at, -2 * stepX, -2 * stepY);
        return (8 * near - far) / 12 / (grid.pixel() * grid.pixel());
    }

    private static double neighbour(FlatGrid grid, double[] f, int at, int dx, int dy) {
        int x = Math.floorMod(at % grid.nx() + dx, grid.nx());
        int y = Math.floorMod(at / grid.nx() + dy, grid.ny());
        return f[y * grid.nx() + x];
    }

    private static double norm(double[] values) {
        return Math.sqrt(meanSquare(values));
    }

    @Test
    void anUnknownDegreeIsRefused() {
        assertThatThrownBy(() -> SkyLensing.withRms(DISC, 0, 4))
                .hasMessage("splines that remap the sky have degree 3, 5 or 7, found 4");
    }

    /** The largest difference over the rms of what is expected. */
    static double distance(double[] found, double[] expected) {
        double worst = 0;
        double square = 0;
        for (int i = 0; i < expected.length; i++) {
            worst = Math.max(worst, Math.abs(found[i] - expected[i]));
            square += expected[i] * expected[i];
        }
        return worst / Math.sqrt(square / expected.length);
    }
}
