package manyskies.flat;

import static manyskies.flat.Skies.assertSame;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import manyskies.field.GradientCurl;
import manyskies.field.Modes;
import manyskies.field.SpinMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class FlatTransformTest {
    private static final double PIXEL = 0.01;
    private static final List<FlatGrid> GRIDS =
            List.of(
                    new FlatGrid(16, 16, PIXEL),
                    new FlatGrid(12, 20, PIXEL),
                    new FlatGrid(30, 8, PIXEL),
                    new FlatGrid(4, 6, PIXEL));

    /** Grid, spin, band limit as a fraction of the Nyquist multipole. */
    static List<Arguments> cases() {
        List<Arguments> cases = new ArrayList<>();
        for (FlatGrid grid : GRIDS) {
            for (int spin = 0; spin <= 8; spin++) {
                for (double fraction : new double[] {0.5, 0.77, 2}) {
                    cases.add(Arguments.of(grid, spin, fraction * grid.nyquist()));
                }
            }
        }
        return cases;
    }

    /** Second method: the sum over modes as it is written. */
    @ParameterizedTest
    @MethodSource("cases")
    void synthesisIsTheDirectSum(FlatGrid grid, int spin, double limit) {
        Modes gradient = Skies.modes(grid, Double.POSITIVE_INFINITY, true, 1);
        Modes curl = spin == 0 ? null : Skies.modes(grid, Double.POSITIVE_INFINITY, true, 2);

        SpinMap map = FlatTransform.of(grid, limit).synthesise(spin, gradient, curl);

        double[][] expected = DirectSum.synthesise(grid, spin, gradient, curl, limit);
        assertSame(map.re(), expected[0]);
        if (spin > 0) {
            assertSame(map.im(), expected[1]);
        }
    }

    /** Invariant: analysis undoes synthesis, for modes within the limit that have a direction. */
    @ParameterizedTest
    @MethodSource("cases")
    void analysisUndoesSynthesis(FlatGrid grid, int spin, double limit) {
        FlatTransform transform = FlatTransform.of(grid, limit);
        Modes gradient =
                spin == 0 ? Skies.modes(grid, limit, true, 3) : Skies.directed(grid, limit, 3);
        Modes curl = spin == 0 ? null : Skies.directed(grid, limit, 4);

        GradientCurl back = transform.analyse(transform.synthesise(spin, gradient, curl));

        assertSame(back.gradient().values(), gradient.values());
        if (spin == 0) {
            assertThat(back.curl()).isNull();
        } else {
            assertSame(back.curl().values(), curl.values());
        }
        assertThat(transform.transforms()).isEqualTo(spin == 0 ? 2 : 4);
    }

    /** Exact: spin 1 of a gradient part |l| f is d_x f + i d_y f; here f = cos(k_x x + k_y y). */
    @Test
    void spinOneIsTheGradient() {
        FlatGrid grid = new FlatGrid(20, 12, PIXEL);
        double[] modes = new double[2 * grid.size()];
        int mode = grid.mode(3, -2);
        modes[2 * mode] = grid.multipole(mode) * grid.area() / 2;

        SpinMap map = FlatTransform.of(grid, 1e9).synthesise(1, Modes.of(grid, modes), null);

        double[] dx = new double[grid.pixels()];
        double[] dy = new double[grid.pixels()];
        for (int pixel = 0; pixel < grid.pixels(); pixel++) {
            int row = pixel / 20;
            double x = pixel % 20 * PIXEL;
            double y = row * PIXEL;
            double slope = -Math.sin(grid.lx(mode) * x + grid.ly(mode) * y);
            dx[pixel] = grid.lx(mode) * slope;
            dy[pixel] = grid.ly(mode) * slope;
        }
        assertSame(map.re(), dx);
        assertSame(map.im(), dy);
    }

    /** Exact: synthesise(2, E, B) is -(Q + iU); E along x, l = (k, 0), is pure Q = E. */
    @Test
    void spinTwoIsMinusPolarisation() {
        FlatGrid grid = new FlatGrid(16, 8, PIXEL);
        double[] modes = new double[2 * grid.size()];
        modes[2 * grid.mode(2, 0)] = grid.area() / 2;

        SpinMap map = FlatTransform.of(grid, 1e9).synthesise(2, Modes.of(grid, modes), null);

        double[] minusQ = new double[grid.pixels()];
        for (int pixel = 0; pixel < grid.pixels(); pixel++) {
            minusQ[pixel] = -Math.cos(grid.lx(2) * (pixel % 16) * PIXEL);
        }
        assertSame(map.re(), minusQ);
        assertThat(Arrays.stream(map.im()).map(Math::abs).max()).hasValue(0);
    }

    /**
     * Invariant: reflecting y -> -y and conjugating a spin map (U -> -U) takes gradient modes to
     * their mirror image and curl modes to minus theirs.
     */
    @ParameterizedTest
    @MethodSource("cases")
    void mirrorKeepsGradientAndFlipsCurl(FlatGrid grid, int spin, double limit) {
        if (spin == 0) {
            return; // no curl part
        }
        FlatTransform transform = FlatTransform.of(grid, limit);
        double[] re = Skies.noise(grid.pixels(), 5);
        double[] im = Skies.noise(grid.pixels(), 6);
        double[] minusIm = mirror(grid, im);
        for (int pixel = 0; pixel < minusIm.length; pixel++) {
            minusIm[pixel] = -minusIm[pixel];
        }

        GradientCurl plain = transform.analyse(SpinMap.of(spin, re, im));
        GradientCurl turned = transform.analyse(SpinMap.of(spin, mirror(grid, re), minusIm));

        assertSame(turned.gradient().values(), mirrored(plain.gradient(), 1));
        assertSame(turned.curl().values(), mirrored(plain.curl(), -1));
    }

    private static double[] mirror(FlatGrid grid, double[] map) {
        double[] out = new double[map.length];
        for (int y = 0; y < grid.ny(); y++) {
            int image = (grid.ny() - y) % grid.ny();
            System.arraycopy(map, y * grid.nx(), out, image * grid.nx(), grid.nx());
        }
        return out;
    }

    private static double[] mirrored(Modes modes, double sign) {
        FlatGrid grid = (FlatGrid) modes.space();
        double[] out = new double[2 * grid.size()];
        for (int mode = 0; mode < grid.size(); mode++) {
            int ky = grid.ky(mode / grid.columns());
            int image = grid.mode(mode % grid.columns(), ky == grid.ny() / 2 ? ky : -ky);
            out[2 * image] = sign * modes.re(mode);
            out[2 * image + 1] = sign * modes.im(mode);
        }
        return out;
    }

    /** Invariant: the sum of |S|^2 over pixels is that of the modes over the whole plane. */
    @ParameterizedTest
    @MethodSource("cases")
    void powerIsKept(FlatGrid grid, int spin, double limit) {
        Modes gradient =
                spin == 0 ? Skies.modes(grid, limit, true, 7) : Skies.directed(grid, limit, 7);
        Modes curl = spin == 0 ? null : Skies.directed(grid, limit, 8);
        SpinMap map = FlatTransform.of(grid, limit).synthesise(spin, gradient, curl);
        double inModes = power(gradient) + (curl == null ? 0 : power(curl));

        double inPixels = 0;
        for (int pixel = 0; pixel < map.re().length; pixel++) {
            inPixels += map.re()[pixel] * map.re()[pixel];
            inPixels += spin == 0 ? 0 : map.im()[pixel] * map.im()[pixel];
        }
        double expected = inModes / grid.area();
        assertThat(inPixels * PIXEL * PIXEL)
                .isBetween(expected * (1 - 1e-12), expected * (1 + 1e-12));
    }

    private static double power(Modes modes) {
        double sum = 0;
        for (int mode = 0; mode < modes.space().size(); mode++) {
            sum += modes.space().multiplicity(mode) * modes.realProduct(modes, mode);
        }
        return sum;
    }

    /** Invariant: the transform is linear. */
    @Test
    void mapsAddAsModesDo() {
        FlatGrid grid = new FlatGrid(24, 18, PIXEL);
        FlatTransform transform = FlatTransform.of(grid, 0.7 * grid.nyquist());
        Modes first = Skies.modes(grid, 1e9, false, 9);
        Modes second = Skies.modes(grid, 1e9, false, 10);
        SpinMap one = transform.synthesise(2, first, second);
        SpinMap two = transform.synthesise(2, second, null);
        SpinMap both =
                transform.synthesise(2, first.combine(3, second, -2), second.combine(3, second, 0));

        double[] sum = new double[grid.pixels()];
        for (int pixel = 0; pixel < sum.length; pixel++) {
            sum[pixel] = 3 * one.im()[pixel] - 2 * two.im()[pixel];
        }
        assertSame(both.im(), sum);
    }

    @Test
    void modesBeyondTheLimitComeOutZero() {
        FlatGrid grid = new FlatGrid(24, 20, PIXEL);
        double limit = 0.4 * grid.nyquist();
        SpinMap map = SpinMap.of(3, Skies.noise(grid.pixels(), 11), Skies.noise(grid.pixels(), 12));
        GradientCurl parts = FlatTransform.of(grid, limit).analyse(map);
        for (int mode = 0; mode < grid.size(); mode++) {
            boolean beyond = grid.multipole(mode) > limit || mode == 0;
            assertThat(parts.gradient().re(mode) == 0).isEqualTo(beyond);
            assertThat(parts.curl().im(mode) == 0).isEqualTo(beyond);
        }
    }

    /** The scratch memory of one call must not show in the next. */
    @Test
    void resultsDependOnArgumentsOnly() {
        FlatGrid grid = new FlatGrid(24, 20, PIXEL);
        FlatTransform used = FlatTransform.of(grid, 0.6 * grid.nyquist());
        Modes gradient = Skies.modes(grid, 1e9, true, 13);
        Modes curl = Skies.modes(grid, 1e9, true, 14);
        used.analyse(SpinMap.scalar(Skies.noise(grid.pixels(), 15)));
        used.synthesise(5, curl, gradient);

        SpinMap fresh = FlatTransform.of(grid, 0.6 * grid.nyquist()).synthesise(2, gradient, curl);
        SpinMap again = used.synthesise(2, gradient, curl);

        assertThat(again.re()).isEqualTo(fresh.re());
        assertThat(again.im()).isEqualTo(fresh.im());
    }

    @Test
    void refusalsSayWhatIsAllowed() {
        FlatGrid grid = new FlatGrid(16, 8, PIXEL);
        FlatTransform transform = FlatTransform.of(grid, 100);
        Modes modes = Modes.zero(grid);
        assertThatThrownBy(() -> transform.synthesise(-2, modes, null))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a spin is 0 or more, found -2; conjugate the map of spin 2");
        assertThatThrownBy(() -> transform.synthesise(0, modes, modes))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a map of spin 0 has no curl part; give null");
        assertThatThrownBy(
                        () -> transform.synthesise(2, modes, Modes.zero(new FlatGrid(8, 8, PIXEL))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("modes of FlatGrid[nx=8, ny=8, pixel=0.01] cannot be")
                .hasMessageEndingWith("copy them there first");
        assertThatThrownBy(() -> transform.analyse(SpinMap.scalar(new double[64])))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a map of this patch has 128 pixels, found 64");
        assertThatThrownBy(() -> FlatTransform.of(grid, -1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a band limit is positive, found -1.0");
        assertThatThrownBy(() -> FlatTransform.of(new FlatGrid(514, 8, PIXEL), 100))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "nx = 514 pixels cannot be transformed: a side is even with no prime factor"
                                + " but 2, 3 and 5; the nearest are 512 and 540");
    }
}
