package manyskies.sky;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.offset;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.random.Address;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class GaussianSkyTest {
    private static final double ARCMIN = Math.PI / 180 / 60;

    /** False-alarm rate of one run of a test, two-sided, shared by bands and fields (Bonferroni). */
    private static final double FALSE_ALARM = 1e-6;

    private static final int SKIES = 20;
    private static final double CURL = 0.3;
    private static final Spectra SPECTRA = Tables.withCurl(Tables.unlensed());

    static List<FlatGrid> grids() {
        return List.of(
                new FlatGrid(128, 128, 2 * ARCMIN),
                new FlatGrid(96, 60, 3 * ARCMIN),
                new FlatGrid(64, 128, ARCMIN));
    }

    private static List<UnlensedSky> skies(FlatGrid grid, Spectra spectra) {
        GaussianSky skies = GaussianSky.of(grid, spectra, CURL);
        return IntStream.range(0, SKIES)
                .mapToObj(index -> skies.draw(new Address(41, "power", index)))
                .toList();
    }

    /**
     * Exact: the sum over modes of multiplicity |x_l|^2 / (A C_l) is chi-squared, with as many
     * degrees of freedom as the whole plane has modes. Annuli of ten equal widths, and
     * all modes together.
     */
    private static double worstTail(List<Modes> fields, IntToDoubleFunction variance) {
        FlatGrid grid = (FlatGrid) fields.get(0).space();
        ModeDisc disc = ModeDisc.of(grid, SPECTRA.lmax());
        double[] sum = new double[11]; // ten annuli and all of them together
        double[] degrees = new double[11];
        for (int mode = 1; mode < grid.size(); mode++) {
            if (grid.multipole(mode) <= disc.limit()) {
                int band = (int) (10 * grid.multipole(mode) / disc.limit() * (1 - 1e-9));
                double norm = grid.multiplicity(mode) / variance.applyAsDouble(mode);
                for (Modes x : fields) {
                    double square = norm * x.realProduct(x, mode);
                    sum[band] += square;
                    sum[10] += square;
                    degrees[band] += grid.multiplicity(mode);
                    degrees[10] += grid.multiplicity(mode);
                }
            }
        }
        return IntStream.range(0, 11)
                .filter(band -> degrees[band] > 0)
                .mapToDouble(band -> ChiSquared.tail(sum[band], degrees[band]))
                .min()
                .orElseThrow();
    }

    private static double worstPower(FlatGrid grid, List<UnlensedSky> skies) {
        return IntStream.of(0, 1, 2, 3, 4)
                .mapToDouble(
                        which ->
                                worstTail(
                                        skies.stream().map(sky -> field(sky, which)).toList(),
                                        mode -> grid.area() * auto(grid, which, mode)))
                .min()
                .orElseThrow();
    }

    private static Modes field(UnlensedSky sky, int which) {
        return switch (which) {
            case 0 -> sky.temperature();
            case 1 -> sky.gradient();
            case 2 -> sky.phi();
            case 3 -> sky.curl().orElseThrow();
            default -> sky.psi().orElseThrow();
        };
    }

    private static double auto(FlatGrid grid, int which, int mode) {
        double l = grid.fullSkyMultipole(mode);
        return switch (which) {
            case 0 -> SPECTRA.at(Spectrum.TT, l);
            case 1 -> SPECTRA.at(Spectrum.EE, l);
            case 2 -> SPECTRA.at(Spectrum.PP, l);
            case 3 -> SPECTRA.at(Spectrum.BB, l);
            default -> CURL * SPECTRA.at(Spectrum.PP, l);
        };
    }

    @ParameterizedTest
    @MethodSource("grids")
    void drawnPowerIsThePowerAskedFor(FlatGrid grid) {
        assertThat(worstPower(grid, skies(grid, SPECTRA))).isGreaterThan(FALSE_ALARM / 55);
    }

    @ParameterizedTest
    @MethodSource("grids")
    void theCheckSeesFivePerCent(FlatGrid grid) {
        assertThat(worstPower(grid, skies(grid, Tables.times(SPECTRA, 1.05))))
                .isLessThan(FALSE_ALARM / 55);
    }

    /** Exact: x/sx + y/sy has variance 2 (1 + r); T with E, T with phi, E with phi. */
    private static double worstCorrelation(FlatGrid grid, List<UnlensedSky> skies, double shift) {
        int[][] pairs = {{0, 1}, {0, 2}, {1, 2}};
        Spectrum[] names = {Spectrum.TE, Spectrum.TP, Spectrum.EP};
        double worst = 1;
        for (int pair = 0; pair < 3; pair++) {
            int first = pairs[pair][0];
            int second = pairs[pair][1];
            Spectrum name = names[pair];
            List<Modes> sums =
                    skies.stream()
                            .map(
                                    sky ->
                                            unitSum(
                                                    grid,
                                                    field(sky, first),
                                                    first,
                                                    field(sky, second),
                                                    second))
                            .toList();
            IntToDoubleFunction variance =
                    mode -> {
                        double product = auto(grid, first, mode) * auto(grid, second, mode);
                        double c = SPECTRA.at(name, grid.fullSkyMultipole(mode));
                        return 2 * grid.area() * (1 + shift + c / Math.sqrt(product));
                    };
            worst = Math.min(worst, worstTail(sums, variance));
        }
        return worst;
    }

    private static Modes unitSum(FlatGrid grid, Modes x, int first, Modes y, int second) {
        double[] ofX =
                IntStream.range(0, grid.size()).mapToDouble(m -> root(grid, first, m)).toArray();
        double[] ofY =
                IntStream.range(0, grid.size()).mapToDouble(m -> root(grid, second, m)).toArray();
        return x.times(ofX).combine(1, y.times(ofY), 1);
    }

    private static double root(FlatGrid grid, int which, int mode) {
        double c = auto(grid, which, mode);
        return c > 0 ? 1 / Math.sqrt(c) : 0;
    }

    @ParameterizedTest
    @MethodSource("grids")
    void fieldsAreCorrelatedAsAskedFor(FlatGrid grid) {
        assertThat(worstCorrelation(grid, skies(grid, SPECTRA), 0)).isGreaterThan(FALSE_ALARM / 33);
    }

    /** Twin: a correlation coefficient wrong by 0.05. */
    @ParameterizedTest
    @MethodSource("grids")
    void theCheckSeesAWrongCorrelation(FlatGrid grid) {
        assertThat(worstCorrelation(grid, skies(grid, SPECTRA), 0.05)).isLessThan(FALSE_ALARM / 33);
    }

    @Test
    void sharedModesDoNotDependOnPixelsOrLimits() {
        FlatGrid coarse = new FlatGrid(48, 36, 4 * ARCMIN);
        FlatGrid fine = coarse.withPixels(96, 72);
        Address address = new Address(5, "pixels", 2);
        UnlensedSky few = GaussianSky.of(ModeDisc.of(coarse, 1500), SPECTRA, CURL).draw(address);
        UnlensedSky many = GaussianSky.of(fine, SPECTRA, CURL).draw(address);
        int shared = 0;
        for (int mode = 0; mode < coarse.size(); mode++) {
            if (coarse.multipole(mode) > 1500) {
                continue;
            }
            int same = fine.mode(mode % coarse.columns(), coarse.ky(mode / coarse.columns()));
            for (int which = 0; which < 5; which++) {
                double scale = 1e-14 * Math.sqrt(coarse.area() * auto(coarse, which, mode));
                assertThat(field(few, which).re(mode))
                        .isCloseTo(field(many, which).re(same), offset(scale));
                assertThat(field(few, which).im(mode))
                        .isCloseTo(field(many, which).im(same), offset(scale));
            }
            shared++;
        }
        assertThat(shared).isGreaterThan(200);
    }

    @Test
    void oneLensMayStandBeforeTwoSkies() {
        GaussianSky skies = GaussianSky.of(new FlatGrid(32, 32, 2 * ARCMIN), SPECTRA, CURL);
        Address lenses = new Address(5, "n1", 0);
        UnlensedSky a = skies.draw(lenses);
        UnlensedSky b = skies.draw(new Address(5, "n1 other CMB", 0), lenses);
        assertThat(a.phi().values()).isEqualTo(b.phi().values());
        assertThat(a.psi().orElseThrow().values()).isEqualTo(b.psi().orElseThrow().values());
        assertThat(a.temperature().values()).isNotEqualTo(b.temperature().values());
    }

    @Test
    void mapsAreReal() {
        FlatGrid grid = new FlatGrid(32, 20, 2 * ARCMIN);
        Modes t = GaussianSky.of(grid, SPECTRA, 0).draw(new Address(5, "real", 0)).temperature();
        assertThat(t.re(0)).isZero();
        for (int ky = 1; ky < 10; ky++) {
            assertThat(t.re(grid.mode(0, ky))).isEqualTo(t.re(grid.mode(0, -ky))).isNotZero();
            assertThat(t.im(grid.mode(0, ky))).isEqualTo(-t.im(grid.mode(0, -ky))).isNotZero();
        }
    }

    /** Positive semi-definite, with a field of no variance left: T a multiple of phi, no E. */
    @Test
    void fullCorrelationCanBeDrawn() {
        double[] p = SPECTRA.values(Spectrum.PP);
        Spectra tied =
                SPECTRA.with(
                        Map.of(
                                Spectrum.TT, scaled(p, 9),
                                Spectrum.TP, scaled(p, 3),
                                Spectrum.TE, scaled(p, 0),
                                Spectrum.EE, scaled(p, 0),
                                Spectrum.EP, scaled(p, 0)));
        FlatGrid grid = new FlatGrid(32, 32, 2 * ARCMIN);
        UnlensedSky sky = GaussianSky.of(grid, tied, 0).draw(new Address(5, "tied", 0));
        double[] t = sky.temperature().values();
        double[] three = scaled(sky.phi().values(), 3);
        assertThat(SkyLensingTest.distance(t, three)).isLessThan(1e-12);
        assertThat(Arrays.stream(sky.gradient().values()).map(Math::abs).max()).hasValue(0);
    }

    private static double[] scaled(double[] values, double factor) {
        return Arrays.stream(values).map(v -> factor * v).toArray();
    }

    @Test
    void impossibleSpectraAreRefused() {
        double[] tooMuch = scaled(SPECTRA.values(Spectrum.TT), 2);
        Spectra bad = SPECTRA.with(Map.of(Spectrum.TE, tooMuch));
        FlatGrid grid = new FlatGrid(32, 32, 2 * ARCMIN);
        assertThatThrownBy(() -> GaussianSky.of(grid, bad, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageStartingWith(
                        "C_l of (phi, T, E, B) is not positive semi-definite at l = ")
                .hasMessageContaining("found at EE")
                .hasMessageEndingWith("check the columns of the spectra there");
        assertThatThrownBy(() -> GaussianSky.of(grid, SPECTRA, -0.5))
                .hasMessage(
                        "the curl fraction is a power relative to phi's, 0 or more; found -0.5");
    }
}
