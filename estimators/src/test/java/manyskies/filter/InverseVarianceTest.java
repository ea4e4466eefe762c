package manyskies.filter;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.EnumMap;
import manyskies.field.SkyField;
import manyskies.flat.FlatGrid;
import manyskies.spectrum.ModeSpectra;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

class InverseVarianceTest {
    private static final FlatGrid GRID = new FlatGrid(8, 12, 1e-3);
    private static final double STEP = GRID.stepX();

    private static boolean low(double l) {
        return l < 3 * STEP;
    }

    private static boolean high(double l) {
        return l > 2 * STEP;
    }

    private static boolean none(double l) {
        return l < 0;
    }

    private static ModeSpectra total(double tt, double te, double ee, double bb) {
        EnumMap<Spectrum, double[]> c = new EnumMap<>(Spectrum.class);
        c.put(Spectrum.TT, flat(tt));
        c.put(Spectrum.TE, flat(te));
        c.put(Spectrum.EE, flat(ee));
        c.put(Spectrum.BB, flat(bb));
        return ModeSpectra.sample(Spectra.of(9000, c), GRID);
    }

    private static double[] flat(double value) {
        double[] out = new double[9001];
        Arrays.fill(out, value);
        return out;
    }

    /** Exact, by hand: the inverse of ((4, 1), (1, 2)) is ((2, -1), (-1, 4)) / 7. */
    @Test
    void bothKeptTheJointFilterInvertsTheMatrix() {
        InverseVariance filter =
                InverseVariance.of(
                        total(4, 1, 2, 5), InverseVarianceTest::low, InverseVarianceTest::low);
        int mode = GRID.mode(1, 1);
        assertThat(filter.separate(SkyField.T)[mode]).isEqualTo(0.25);
        assertThat(filter.separate(SkyField.E)[mode]).isEqualTo(0.5);
        assertThat(filter.separate(SkyField.B)[mode]).isEqualTo(0.2);
        assertJoint(filter, mode, 2.0 / 7, -1.0 / 7, 4.0 / 7, 0.2);
    }

    /** Where only one of T and E is kept, it is filtered on its own. */
    @Test
    void aloneEachIsFilteredOnItsOwn() {
        InverseVariance filter =
                InverseVariance.of(
                        total(4, 1, 2, 5), InverseVarianceTest::low, InverseVarianceTest::high);
        assertJoint(filter, GRID.mode(1, 0), 0.25, 0, 0, 0);
        assertJoint(filter, GRID.mode(3, 2), 0, 0, 0.5, 0.2);
        assertJoint(filter, GRID.mode(2, 2), 2.0 / 7, -1.0 / 7, 4.0 / 7, 0.2);
        assertJoint(filter, GRID.mode(0, 0), 0, 0, 0, 0); // a mean has no direction
    }

    private static void assertJoint(
            InverseVariance filter, int mode, double tt, double te, double ee, double bb) {
        assertThat(filter.joint(SkyField.T, SkyField.T)[mode]).isEqualTo(tt, within());
        assertThat(filter.joint(SkyField.T, SkyField.E)[mode]).isEqualTo(te, within());
        assertThat(filter.joint(SkyField.E, SkyField.T)[mode]).isEqualTo(te, within());
        assertThat(filter.joint(SkyField.E, SkyField.E)[mode]).isEqualTo(ee, within());
        assertThat(filter.joint(SkyField.B, SkyField.B)[mode]).isEqualTo(bb, within());
        assertThat(filter.joint(SkyField.T, SkyField.B)).isNull();
        assertThat(filter.joint(SkyField.B, SkyField.E)).isNull();
    }

    private static Offset<Double> within() {
        return Offset.offset(1e-15);
    }

    @Test
    void aFieldWithoutPowerCannotBeFiltered() {
        assertThatThrownBy(
                        () ->
                                InverseVariance.of(
                                        total(4, 1, 2, 0),
                                        InverseVarianceTest::none,
                                        l -> l == STEP))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "total C_l^BB is 0.0 at l = "
                                + STEP
                                + "; a filter needs a positive one: add noise or lower lmax");
    }

    @Test
    void onlyKeptMultipolesAreChecked() {
        assertThat(
                        InverseVariance.of(
                                        total(4, 0, 0, 0),
                                        InverseVarianceTest::low,
                                        InverseVarianceTest::none)
                                .separate(SkyField.E))
                .containsOnly(0);
    }

    @Test
    void moreCorrelationThanPowerIsRefused() {
        assertThatThrownBy(
                        () ->
                                InverseVariance.of(
                                        total(4, 3, 1, 1),
                                        InverseVarianceTest::low,
                                        InverseVarianceTest::low))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageMatching(
                        "total C_l\\^TE = 3.0 exceeds sqrt\\(TT EE\\) = 2.0 at l = \\d+\\.\\d+;"
                                + " check the columns of the spectra");
    }
}
