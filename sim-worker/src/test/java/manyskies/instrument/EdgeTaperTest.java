package manyskies.instrument;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import manyskies.flat.FlatGrid;
import org.junit.jupiter.api.Test;

class EdgeTaperTest {
    private static final FlatGrid GRID = new FlatGrid(400, 200, 1e-3);
    private static final EdgeTaper TAPER = EdgeTaper.of(GRID, 0.05);

    @Test
    void theMiddleIsUntouched() {
        assertThat(TAPER.at(200, 100)).isEqualTo(1);
        assertThat(TAPER.at(50, 149)).isEqualTo(1);
        assertThat(TAPER.at(49, 100)).isLessThan(1);
    }

    @Test
    void itIsSymmetricAndFallsToZero() {
        for (int x = 0; x < 400; x++) {
            assertThat(TAPER.at(x, 30)).isEqualTo(TAPER.at(399 - x, 169)).isBetween(0.0, 1.0);
        }
        // 10 s^3 at half a pixel of fifty
        assertThat(TAPER.at(0, 100)).isCloseTo(10e-6, offset(2e-7));
        assertThat(TAPER.at(0, 0)).isLessThan(1e-9);
    }

    /** Twice continuously differentiable: second differences stay below max |w''| = 5.78 / width^2. */
    @Test
    void secondDifferencesAreBoundedAndContinuous() {
        double largest = 0;
        double jump = 0;
        double before = 0;
        for (int x = 1; x < 200; x++) {
            double second = TAPER.at(x + 1, 100) - 2 * TAPER.at(x, 100) + TAPER.at(x - 1, 100);
            largest = Math.max(largest, Math.abs(second));
            jump = x == 1 ? 0 : Math.max(jump, Math.abs(second - before));
            before = second;
        }
        assertThat(largest * 50 * 50).isBetween(5.6, 5.78);
        assertThat(jump * 50 * 50).isLessThan(60.0 / 50 * 1.05); // max |w'''| = 60 / width^3
    }

    /** Exact: integrals of w and w^2 over the taper's width are 1/2 and 181/462. */
    @Test
    void meanPowersAreTheIntegrals() {
        double one = (400 - 100 + 100 * 0.5) / 400;
        double other = (200 - 100 + 100 * 0.5) / 200;
        assertThat(TAPER.meanPower(1)).isCloseTo(one * other, offset(1e-6));
        double square = (400 - 100 + 100 * 181.0 / 462) / 400;
        double otherSquare = (200 - 100 + 100 * 181.0 / 462) / 200;
        assertThat(TAPER.meanPower(2)).isCloseTo(square * otherSquare, offset(1e-6));
    }
}
