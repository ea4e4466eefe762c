package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;

import manyskies.flat.FlatGrid;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Second method: look at every mode of the grid. */
class AnnulusModesTest {

    @ParameterizedTest
    @CsvSource({"32, 32", "48, 30", "20, 64"})
    void agreesWithALookAtEveryMode(int nx, int ny) {
        double pixel = 0.01;
        FlatGrid grid = new FlatGrid(nx, ny, pixel);
        AnnulusModes modes = new AnnulusModes(new PatchReader.Shape(nx, ny, pixel));
        double step = grid.stepX() / 7;
        int empty = 0;
        for (int i = 0; i * step < 0.7 * grid.nyquist(); i++) {
            for (int width = 1; width < 8; width++) {
                double lower = i * step;
                boolean found = modes.isPopulated(lower, lower + width * step);
                assertThat(found).isEqualTo(hasMode(grid, lower, lower + width * step));
                empty += found ? 0 : 1;
            }
        }
        assertThat(empty).isPositive();
    }

    /**
     * An edge that is exactly a mode's |l| belongs to the band above it. None of these modes has
     * the |l| of another: kx^2 + (48/30)^2 ky^2 is reached once.
     */
    @ParameterizedTest
    @CsvSource({"3, 0", "0, 7", "3, 4", "7, 1"})
    void edgesOnAModeAreJudgedToTheLastBit(int kx, int ky) {
        FlatGrid grid = new FlatGrid(48, 30, 0.0123);
        AnnulusModes modes = new AnnulusModes(new PatchReader.Shape(48, 30, 0.0123));
        double l = grid.multipole(grid.mode(kx, ky));
        assertThat(modes.isPopulated(l, Math.nextUp(l))).isTrue();
        assertThat(modes.isPopulated(Math.nextDown(l), l)).isFalse();
    }

    private static boolean hasMode(FlatGrid grid, double lower, double upper) {
        for (int mode = 1; mode < grid.size(); mode++) { // mode 0 is l = 0
            double l = grid.multipole(mode);
            if (l >= lower && l < upper) {
                return true;
            }
        }
        return false;
    }
}
