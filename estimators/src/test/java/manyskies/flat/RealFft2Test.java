package manyskies.flat;

import static manyskies.flat.Skies.assertSame;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import manyskies.field.Modes;
import org.jtransforms.fft.DoubleFFT_2D;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class RealFft2Test {
    private static final double PIXEL = 0.01;

    static List<Arguments> gridsAndFractions() {
        List<Arguments> cases = new ArrayList<>();
        for (FlatGrid grid :
                List.of(
                        new FlatGrid(4, 4, PIXEL),
                        new FlatGrid(8, 30, PIXEL),
                        new FlatGrid(36, 10, PIXEL),
                        new FlatGrid(72, 20, PIXEL))) {
            for (double fraction : new double[] {0.01, 0.3, 0.5, 0.9, 1, 1.2, 9}) {
                cases.add(Arguments.of(grid, fraction));
            }
        }
        return cases;
    }

    /** Second method: the sum over pixels as it is written. */
    @ParameterizedTest
    @MethodSource("gridsAndFractions")
    void forwardIsTheDirectSumWithinTheLimit(FlatGrid grid, double fraction) {
        double limit = fraction * grid.nyquist();
        double[] map = Skies.noise(grid.pixels(), 1);
        double[] kept = map.clone();
        double[] modes = Skies.noise(2 * grid.size(), 2); // to be overwritten

        RealFft2.of(grid, limit).forward(map, modes);

        double[] expected = DirectSum.analyse(grid, map).values();
        for (int mode = 0; mode < grid.size(); mode++) {
            if (grid.multipole(mode) > limit) {
                expected[2 * mode] = 0;
                expected[2 * mode + 1] = 0;
            }
        }
        assertSame(modes, expected);
        assertThat(map).isEqualTo(kept);
    }

    /** Second method, with modes beyond the limit that must not be read. */
    @ParameterizedTest
    @MethodSource("gridsAndFractions")
    void inverseIsTheDirectSumWithinTheLimit(FlatGrid grid, double fraction) {
        double limit = fraction * grid.nyquist();
        Modes modes = Skies.modes(grid, 1e9, true, 3);
        double[] spoilt = modes.values().clone();
        for (int mode = 0; mode < grid.size(); mode++) {
            if (grid.multipole(mode) > limit) {
                spoilt[2 * mode] = Double.NaN;
            }
        }
        double[] map = Skies.noise(grid.pixels(), 4); // to be overwritten

        RealFft2.of(grid, limit).inverse(spoilt, map);

        assertSame(map, DirectSum.synthesise(grid, 0, modes, null, limit)[0]);
    }

    /** Second method: a library's two-dimensional transform, at the sizes it can do. */
    @ParameterizedTest
    @ValueSource(ints = {64, 256})
    void forwardAgreesWithJTransforms(int n) {
        FlatGrid grid = new FlatGrid(n, n, 1);
        double[] map = Skies.noise(grid.pixels(), 5);
        double[] full = new double[2 * n * n];
        System.arraycopy(map, 0, full, 0, map.length);
        new DoubleFFT_2D(n, n).realForwardFull(full);
        double[] expected = new double[2 * grid.size()];
        for (int y = 0; y < n; y++) {
            System.arraycopy(full, 2 * n * y, expected, 2 * y * (n / 2 + 1), n + 2);
        }

        double[] modes = new double[2 * grid.size()];
        RealFft2.of(grid, Double.POSITIVE_INFINITY).forward(map, modes);

        assertSame(modes, expected);
    }

    /** Exact: a constant has one mode, its value times the area. */
    @Test
    void aConstantIsItsAreaAtZero() {
        FlatGrid grid = new FlatGrid(20, 12, PIXEL);
        double[] map = new double[grid.pixels()];
        Arrays.fill(map, 3);
        double[] modes = new double[2 * grid.size()];
        RealFft2.of(grid, 1e9).forward(map, modes);
        double[] expected = new double[2 * grid.size()];
        expected[0] = 3 * grid.area();
        assertSame(modes, expected);
    }

    /** Only the Hermitian part of the self-conjugate columns counts, and they do not mix. */
    @ParameterizedTest
    @ValueSource(ints = {0, 8})
    void selfConjugateColumnsCountByTheirHermitianPart(int kx) {
        FlatGrid grid = new FlatGrid(16, 10, PIXEL);
        double[] lopsided = new double[2 * grid.size()];
        lopsided[2 * grid.mode(kx, 2)] = 1;
        lopsided[2 * grid.mode(kx, 2) + 1] = 4;
        double[] even = new double[2 * grid.size()];
        even[2 * grid.mode(kx, 2)] = 0.5;
        even[2 * grid.mode(kx, 2) + 1] = 2;
        even[2 * grid.mode(kx, -2)] = 0.5;
        even[2 * grid.mode(kx, -2) + 1] = -2;
        RealFft2 fft = RealFft2.of(grid, 1e9);
        double[] map = new double[grid.pixels()];
        double[] back = new double[2 * grid.size()];

        fft.inverse(lopsided, map);
        fft.forward(map, back);

        assertSame(back, even);
    }

    /** Larger maps, whose tiles are many: there and back. */
    @ParameterizedTest
    @CsvSource({"240, 162, 0.5", "250, 108, 3", "128, 384, 0.97", "270, 64, 3"})
    void forwardUndoesInverse(int nx, int ny, double fraction) {
        FlatGrid grid = new FlatGrid(nx, ny, PIXEL);
        double limit = fraction * grid.nyquist();
        Modes modes = Skies.modes(grid, limit, true, 6);
        RealFft2 fft = RealFft2.of(grid, limit);
        double[] map = new double[grid.pixels()];
        double[] back = new double[2 * grid.size()];
        fft.inverse(modes.values(), map);
        fft.forward(map, back);
        assertSame(back, modes.values());
    }

    @ParameterizedTest
    @CsvSource({"14, 12, 16", "514, 512, 540", "22, 20, 24", "1022, 1000, 1024"})
    void otherSidesAreRefusedWithTheNearest(int n, int below, int above) {
        String end =
                " = "
                        + n
                        + " pixels cannot be transformed: a side is even with no prime factor but 2,"
                        + " 3 and 5; the nearest are "
                        + below
                        + " and "
                        + above;
        assertThatThrownBy(() -> RealFft2.of(new FlatGrid(n, 16, PIXEL), 10))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("nx" + end);
        assertThatThrownBy(() -> RealFft2.of(new FlatGrid(16, n, PIXEL), 10))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("ny" + end);
    }

    @Test
    void otherLengthsAreRefused() {
        RealFft2 fft = RealFft2.of(new FlatGrid(16, 10, PIXEL), 10);
        assertThatThrownBy(() -> fft.inverse(new double[180], new double[161]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "this grid has 160 pixels and 180 numbers for its modes; found 161 and 180");
        assertThatThrownBy(() -> RealFft2.of(new FlatGrid(16, 10, PIXEL), Double.NaN))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a band limit is positive, found NaN");
    }
}
