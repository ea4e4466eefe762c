package manyskies.sky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import java.util.stream.DoubleStream;
import manyskies.flat.FlatGrid;
import manyskies.flat.StokesMaps;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class BSplineTest {
    private static final FlatGrid GRID = new FlatGrid(24, 16, 1e-3);

    /** Exact: the cubic B-spline is 1/6, 2/3, 1/6 at whole numbers and 1/48, 23/48 at halves. */
    @Test
    void cubicWeightsAreTheKnownFractions() {
        double[] w = new double[4];
        BSpline.weights(3, 0, w);
        assertThat(w).containsExactly(new double[] {1 / 6.0, 2 / 3.0, 1 / 6.0, 0}, offset(1e-15));
        BSpline.weights(3, 0.5, w);
        assertThat(w)
                .containsExactly(
                        new double[] {1 / 48.0, 23 / 48.0, 23 / 48.0, 1 / 48.0}, offset(1e-15));
    }

    /**
     * What the prefilter is made for, by quadrature over the displacement: the mean over Gaussian
     * displacements of the spline at delta, divided by the wave there, is one.
     */
    @ParameterizedTest
    @CsvSource({"3, 0.0, 5", "3, 0.2, 11", "3, 0.85, 11", "5, 0.3, 9", "5, 1.7, 2", "7, 0.1, 11"})
    void theMeanResponseIsOne(int degree, double rms, int k) {
        int n = 24;
        double w = 2 * Math.PI * k / n;
        double f = BSpline.prefilter(degree, n, rms)[k];
        double re = 0;
        double im = 0;
        double norm = 0;
        double step = rms == 0 ? 1 : rms / 200;
        int steps = rms == 0 ? 0 : 2000;
        for (int i = -steps; i <= steps; i++) {
            double delta = i * step;
            double weight = rms == 0 ? 1 : Math.exp(-delta * delta / (2 * rms * rms));
            re += weight * f * response(degree, w, delta, true);
            im += weight * f * response(degree, w, delta, false);
            norm += weight;
        }
        assertThat(re / norm).isCloseTo(1, offset(1e-6));
        assertThat(im / norm).isCloseTo(0, offset(1e-6));
    }

    private static double response(int degree, double w, double delta, boolean real) {
        double[] weights = new double[degree + 1];
        double floor = Math.floor(delta);
        BSpline.weights(degree, delta - floor, weights);
        double sum = 0;
        int below = degree / 2;
        for (int j = 0; j <= degree; j++) {
            double phase = w * (floor - below + j - delta);
            sum += weights[j] * (real ? Math.cos(phase) : Math.sin(phase));
        }
        return sum;
    }

    private static StokesMaps madeUp() {
        StokesMaps maps = StokesMaps.zero(GRID);
        for (int i = 0; i < GRID.pixels(); i++) {
            maps.t()[i] = Math.sin(0.7 * i * i);
            maps.q()[i] = Math.cos(1.3 * i * i);
            maps.u()[i] = Math.sin(2.1 * i * i + 1);
        }
        return maps;
    }

    /** Exact: whole pixels shift the map; far beyond the patch too. */
    @ParameterizedTest
    @ValueSource(ints = {3, 5, 7})
    void wholePixelsRollTheSky(int degree) {
        SplineMaps splines = SplineMaps.of(GRID, degree);
        splines.load(madeUp());
        StokesMaps still = evaluated(splines, 0, 0);
        for (int[] shift : new int[][] {{3, -2}, {-25, 40}, {0, 15}}) {
            StokesMaps moved = evaluated(splines, shift[0], shift[1]);
            for (int y = 0; y < GRID.ny(); y++) {
                for (int x = 0; x < GRID.nx(); x++) {
                    int from =
                            Math.floorMod(y + shift[1], GRID.ny()) * GRID.nx()
                                    + Math.floorMod(x + shift[0], GRID.nx());
                    int to = y * GRID.nx() + x;
                    assertThat(moved.t()[to]).isCloseTo(still.t()[from], offset(1e-14));
                    assertThat(moved.q()[to]).isCloseTo(still.q()[from], offset(1e-14));
                    assertThat(moved.u()[to]).isCloseTo(still.u()[from], offset(1e-14));
                }
            }
        }
    }

    private static StokesMaps evaluated(SplineMaps splines, double dx, double dy) {
        StokesMaps out = StokesMaps.zero(GRID);
        splines.evaluate(constant(dx), constant(dy), out);
        return out;
    }

    private static double[] constant(double value) {
        return DoubleStream.generate(() -> value).limit(GRID.pixels()).toArray();
    }

    /** Second method: the kernels written out against the recursion. */
    @ParameterizedTest
    @ValueSource(ints = {3, 5})
    void fastKernelsAreTheSplinesOfTheirDegree(int degree) {
        double[] c = new double[20 * 3 * 20];
        for (int i = 0; i < c.length; i++) {
            c[i] = Math.sin(3.7 * i * i);
        }
        SplineKernel fast = degree == 3 ? new CubicKernel(c, 60) : new QuinticKernel(c, 60);
        SplineKernel plain = new AnyDegreeKernel(c, 60, degree);
        double[][] a = new double[3][50];
        double[][] b = new double[3][50];
        for (int i = 0; i < 50; i++) {
            double tx = i / 50.0;
            double ty = (i * 17 % 50) / 50.0;
            fast.evaluate(3 * i, tx, ty, i, a[0], a[1], a[2]);
            plain.evaluate(3 * i, tx, ty, i, b[0], b[1], b[2]);
        }
        for (int lane = 0; lane < 3; lane++) {
            assertThat(a[lane]).containsExactly(b[lane], offset(1e-14));
        }
    }

    /**
     * Exact: a plane wave of 3 periods along x and 2 along y, moved by a fraction of a pixel. The
     * interpolant's images are below (w / (2 pi - w))^(n+1) each.
     */
    @ParameterizedTest
    @ValueSource(ints = {3, 5, 7})
    void aPlaneWaveIsMovedAsItShouldBe(int degree) {
        double wx = 2 * Math.PI * 3 / GRID.nx();
        double wy = 2 * Math.PI * 2 / GRID.ny();
        double f =
                BSpline.prefilter(degree, GRID.nx(), 0)[3]
                        * BSpline.prefilter(degree, GRID.ny(), 0)[2];
        StokesMaps wave = StokesMaps.zero(GRID);
        for (int i = 0; i < GRID.pixels(); i++) {
            int x = i % GRID.nx();
            int y = i / GRID.nx();
            wave.t()[i] = f * Math.cos(wx * x + wy * y);
            wave.q()[i] = 2 * wave.t()[i];
        }
        SplineMaps splines = SplineMaps.of(GRID, degree);
        splines.load(wave);
        StokesMaps moved = evaluated(splines, 0.3, -1.4);
        double image = Math.pow(wx / (2 * Math.PI - wx), degree + 1);
        double worst = 0;
        for (int i = 0; i < GRID.pixels(); i++) {
            int x = i % GRID.nx();
            int y = i / GRID.nx();
            double expected = Math.cos(wx * (x + 0.3) + wy * (y - 1.4));
            worst = Math.max(worst, Math.abs(moved.t()[i] - expected));
            assertThat(moved.q()[i]).isCloseTo(2 * moved.t()[i], offset(1e-14));
        }
        // two images either way along two axes; and not far less, or another degree was used
        assertThat(worst).isLessThan(8 * image).isGreaterThan(image / 8);
    }
}
