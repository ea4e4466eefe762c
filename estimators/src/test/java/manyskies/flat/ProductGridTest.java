package manyskies.flat;

import static manyskies.flat.Skies.assertSame;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import manyskies.field.Modes;
import manyskies.field.SpinMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ProductGridTest {
    private static final double PIXEL = 0.01;

    /**
     * Exact: the modes of a product up to lout are those found on a grid twice as fine as any
     * product needs.
     */
    @ParameterizedTest
    @CsvSource({
        "40, 40, 9, 5",
        "60, 40, 6, 3",
        "36, 60, 7.5, 7.5",
        "32, 32, 10, 30",
        "48, 80, 4, 0"
    })
    void productsAreExact(int nx, int ny, double kmax, double kout) {
        FlatGrid map = new FlatGrid(nx, ny, PIXEL);
        double step = Math.min(map.stepX(), map.stepY());
        FlatGrid small = ProductGrid.of(map, kmax * step, kout * step);
        FlatGrid fine = map.withPixels(4 * nx, 4 * ny);
        Modes a = Skies.modes(map, kmax * step, false, 1);
        Modes b = Skies.modes(map, kmax * step, false, 2);

        double[] found = product(map, small, fine, a, b, kmax * step, kout * step);
        double[] expected = product(map, fine, fine, a, b, kmax * step, kout * step);

        assertSame(found, expected);
        assertThat(small.nx() * map.ny()).isEqualTo(small.ny() * map.nx());
    }

    /** The modes up to lout, on a last grid, of the product taken on a given one. */
    private static double[] product(
            FlatGrid map, FlatGrid on, FlatGrid last, Modes a, Modes b, double lmax, double lout) {
        ModeCopy there = ModeCopy.of(map, on, lmax);
        FlatTransform transform = FlatTransform.of(on, 1e9);
        double[] x = transform.synthesise(0, there.copy(a), null).re();
        double[] y = transform.synthesise(0, there.copy(b), null).re();
        double[] xy = new double[x.length];
        for (int pixel = 0; pixel < xy.length; pixel++) {
            xy[pixel] = x[pixel] * y[pixel];
        }
        Modes modes = transform.analyse(SpinMap.scalar(xy)).gradient();
        return ModeCopy.of(on, last, Math.max(lout, 1e-9)).copy(modes).values();
    }

    /** Smaller where that pays; a power of two where one is little larger. */
    @ParameterizedTest
    @CsvSource({
        "1024, 1024, 255, 129, 640, 640",
        "1024, 1024, 170, 80, 512, 512",
        "600, 400, 100, 50, 270, 180",
        "512, 512, 400, 100, 1024, 1024"
    })
    void theCheapestSidesAreChosen(int nx, int ny, double kmax, double kout, int mx, int my) {
        FlatGrid map = new FlatGrid(nx, ny, PIXEL);
        double step = Math.min(map.stepX(), map.stepY());
        FlatGrid found = ProductGrid.of(map, kmax * step, kout * step);
        assertThat(found).isEqualTo(map.withPixels(mx, my));
    }

    @Test
    void refusalsSayWhatIsAllowed() {
        FlatGrid map = new FlatGrid(16, 16, PIXEL);
        assertThatThrownBy(() -> ProductGrid.of(map, -1, 10))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("lmax = -1.0 is no limit of a product; it is finite and not negative");
        assertThatThrownBy(() -> ProductGrid.of(map, 1, Double.POSITIVE_INFINITY))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith("lout = Infinity is no limit");
        assertThatThrownBy(() -> ProductGrid.of(new FlatGrid(14, 16, PIXEL), 1, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith("nx = 14 pixels cannot be transformed");
        assertThatThrownBy(() -> ModeCopy.of(map, new FlatGrid(16, 16, 0.02), 10))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "modes can only be copied between patches of the same sides; along x these"
                                + " have 0.16 and 0.32 rad");
        assertThatThrownBy(() -> ModeCopy.of(map, map, 10).copy(Modes.zero(map.withPixels(8, 8))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith("this copies modes of FlatGrid[nx=16")
                .hasMessageContaining("found modes of FlatGrid[nx=8");
    }

    /** Every mode, one by one: copied where both grids have it below Nyquist, else zero. */
    @ParameterizedTest
    @CsvSource({"24, 40, 12, 20, 1e9", "12, 20, 24, 40, 1e9", "12, 20, 12, 20, 150"})
    void modesAreCopiedWhereBothGridsHaveThem(int nx, int ny, int mx, int my, double limit) {
        FlatGrid from = new FlatGrid(nx, ny, PIXEL);
        FlatGrid to = from.withPixels(mx, my);
        Modes modes = Modes.of(from, Skies.noise(2 * from.size(), 3));

        Modes copied = ModeCopy.of(from, to, limit).copy(modes);

        for (int mode = 0; mode < to.size(); mode++) {
            int kx = mode % to.columns();
            int ky = to.ky(mode / to.columns());
            boolean taken = kx < Math.min(nx, mx) / 2 && Math.abs(ky) < Math.min(ny, my) / 2;
            taken &= to.multipole(mode) <= limit;
            assertThat(copied.re(mode)).isEqualTo(taken ? modes.re(from.mode(kx, ky)) : 0);
            assertThat(copied.im(mode)).isEqualTo(taken ? modes.im(from.mode(kx, ky)) : 0);
        }
    }
}
