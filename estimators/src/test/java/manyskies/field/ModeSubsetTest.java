package manyskies.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import manyskies.flat.FlatGrid;
import org.junit.jupiter.api.Test;

class ModeSubsetTest {
    private static final FlatGrid GRID = new FlatGrid(6, 8, 1e-3);
    private final ModeSubset subset = ModeSubset.of(GRID, ModeSubsetTest::keep);

    private static boolean keep(int mode) {
        return mode % 3 == 1;
    }

    private static Modes counting(ModeSpace space) {
        double[] values = new double[2 * space.size()];
        Arrays.setAll(values, i -> i);
        return Modes.of(space, values);
    }

    @Test
    void keptModesStandInTheirOrder() {
        Modes packed = subset.pack(counting(GRID));
        assertThat(subset.size()).isEqualTo(11); // of 32: 1, 4, .. 31
        assertThat(packed.space()).isSameAs(subset);
        assertThat(packed.values()).startsWith(2, 3, 8, 9, 14, 15).hasSize(22);
    }

    @Test
    void eachModeTakesItsFactor() {
        double[] factor = new double[subset.size()];
        factor[1] = 10;
        double[] packed = subset.pack(counting(GRID), factor).values();
        assertThat(packed[2]).isEqualTo(80);
        assertThat(packed[3]).isEqualTo(90);
        assertThat(Arrays.stream(packed).sum()).isEqualTo(170);
    }

    @Test
    void unpackedModesAreZeroWhereNotKept() {
        Modes all = counting(GRID);
        Modes back = subset.unpack(subset.pack(all));
        for (int mode = 0; mode < GRID.size(); mode++) {
            assertThat(back.re(mode)).isEqualTo(keep(mode) ? all.re(mode) : 0);
            assertThat(back.im(mode)).isEqualTo(keep(mode) ? all.im(mode) : 0);
        }
        assertThatThrownBy(() -> subset.unpack(all))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("modes of " + GRID + " are not of 11 modes of " + GRID);
    }

    @Test
    void itsGeometryIsThatOfTheWhole() {
        double[] multipole = new double[GRID.size()];
        Arrays.setAll(multipole, GRID::multipole);
        double[] packed = subset.pack(multipole);
        for (int i = 0; i < subset.size(); i++) {
            assertThat(subset.multipole(i)).isEqualTo(GRID.multipole(3 * i + 1));
            assertThat(packed[i]).isEqualTo(subset.multipole(i));
            assertThat(subset.fullSkyMultipole(i)).isEqualTo(GRID.fullSkyMultipole(3 * i + 1));
            assertThat(subset.multiplicity(i)).isEqualTo(GRID.multiplicity(3 * i + 1));
        }
        assertThat(subset.area()).isEqualTo(GRID.area());
    }

    @Test
    void equalSubsetsHoldTheSameModesOfEqualSpaces() {
        ModeSubset same = ModeSubset.of(new FlatGrid(6, 8, 1e-3), ModeSubsetTest::keep);
        assertThat(same).isEqualTo(subset).hasSameHashCodeAs(subset);
        assertThat(ModeSubset.of(GRID, mode -> mode % 3 == 2)).isNotEqualTo(subset);
        assertThat(ModeSubset.of(new FlatGrid(6, 8, 2e-3), ModeSubsetTest::keep))
                .isNotEqualTo(subset);
        Modes sum = subset.pack(counting(GRID)).combine(1, same.pack(counting(GRID)), 1);
        assertThat(sum.values()[2]).isEqualTo(16);
    }

    @Test
    void modesOfAnotherSpaceAreRefused() {
        FlatGrid other = new FlatGrid(8, 6, 1e-3);
        assertThatThrownBy(() -> subset.pack(counting(other)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("modes of " + other + " are no modes of " + GRID);
        assertThatThrownBy(() -> subset.pack(counting(GRID)).combine(1, counting(GRID), 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "modes of 11 modes of "
                                + GRID
                                + " cannot be combined with modes of "
                                + GRID);
    }

    @Test
    void theRightNumberOfFactorsIsAskedFor() {
        assertThatThrownBy(() -> subset.pack(counting(GRID), new double[3]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("expected 11 factors, one per kept mode, found 3");
        assertThatThrownBy(() -> subset.pack(new double[3]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("expected 32 numbers, one per mode of the whole space, found 3");
    }
}
