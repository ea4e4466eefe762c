package manyskies.aggregate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import manyskies.flat.FlatGrid;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.statistic.Measurement;
import org.hipparchus.random.Well19937c;
import org.junit.jupiter.api.Test;

/** Numbers of the tables by a second, obvious method, and their bits. */
class AggregationTest {
    private static final SyntheticRun RUN = SyntheticRun.of(1, 21, 5);
    private static final List<Block> BLOCKS = RUN.blocks();
    private static final Tables TABLES = RUN.tables();

    static Measurement row(Tables tables, String estimator, String quantity, int band) {
        List<BandRow> found = rows(tables, estimator, quantity);
        assertThat(found).as(estimator + " " + quantity).hasSize(3);
        return found.get(band).measurement();
    }

    static List<BandRow> rows(Tables tables, String estimator, String quantity) {
        return tables.bands().stream()
                .filter(r -> r.estimator().equals(estimator) && r.quantity().equals(quantity))
                .toList();
    }

    private static double[] column(String name, int band) {
        return BLOCKS.stream()
                .filter(block -> block.columns().containsKey(name))
                .flatMap(block -> block.columns().get(name).stream())
                .mapToDouble(r -> r[band])
                .toArray();
    }

    private static double mean(double[] x) {
        double sum = 0;
        for (double value : x) {
            sum += value;
        }
        return sum / x.length;
    }

    private static double errorOfMean(double[] x) {
        double sum = 0;
        for (double value : x) {
            sum += (value - mean(x)) * (value - mean(x));
        }
        return Math.sqrt(sum / (x.length - 1) / x.length);
    }

    @Test
    void columnsBecomeMeansWithErrors() {
        for (String name :
                List.of(
                        "input.auto",
                        "tt.auto",
                        "tt.cross_input",
                        "eb.curl_auto",
                        "eb.curl_cross",
                        "eb.n0_mc",
                        "tt.curl_n0_mc")) {
            for (int band = 0; band < 3; band++) {
                double[] x = column(name, band);
                int dot = name.indexOf('.');
                Measurement m = row(TABLES, name.substring(0, dot), name.substring(dot + 1), band);
                assertThat(m.value()).isCloseTo(mean(x), within(1e-13));
                assertThat(m.error()).isCloseTo(errorOfMean(x), within(1e-12));
                assertThat(m.count()).isEqualTo(21);
            }
        }
    }

    @Test
    void computedNumbersHaveNeitherErrorNorCount() {
        assertThat(row(TABLES, "tt", "response", 1)).isEqualTo(new Measurement(20, 0, 0));
        assertThat(row(TABLES, "eb", "n0_analytic", 2)).isEqualTo(new Measurement(1, 0, 0));
        assertThat(row(TABLES, "eb", "curl_n0_analytic", 2).value()).isEqualTo(1.5);
    }

    @Test
    void transferIsTheRatioOfSumsWithTheErrorOfItsResiduals() {
        for (int band = 0; band < 3; band++) {
            double[] cross = column("eb.cross_input", band);
            double[] input = column("input.auto", band);
            double ratio = mean(cross) / mean(input);
            double[] residual = new double[cross.length];
            for (int i = 0; i < residual.length; i++) {
                residual[i] = (cross[i] - ratio * input[i]) / mean(input);
            }
            Measurement m = row(TABLES, "eb", "transfer", band);
            assertThat(m.value()).isCloseTo(ratio, within(1e-13));
            assertThat(m.error()).isCloseTo(errorOfMean(residual), within(1e-12));
        }
    }

    /** Plain sums over the half plane, blocks 0, 2, 4 against 1, 3; 11 + 10 skies. */
    @Test
    void meanFieldIsTheCrossSpectrumOfTwoHalves() {
        FlatGrid grid = SyntheticRun.GRID;
        double[][] halves = new double[2][2 * grid.size()];
        for (int number = 0; number < 5; number++) {
            for (int i = 0; i < halves[0].length; i++) {
                double skies = number % 2 == 0 ? 11 : 10;
                halves[number % 2][i] += BLOCKS.get(number).fieldSums().get("tt")[i] / skies;
            }
        }
        for (int band = 0; band < 3; band++) {
            double[] sums = new double[4]; // modes, cross, even, odd
            for (int mode = 0; mode < grid.size(); mode++) {
                if (SyntheticRun.BANDS.bandOf(grid.multipole(mode)) == band) {
                    double weight = grid.multiplicity(mode);
                    double[] e = {halves[0][2 * mode], halves[0][2 * mode + 1]};
                    double[] o = {halves[1][2 * mode], halves[1][2 * mode + 1]};
                    sums[0] += weight;
                    sums[1] += weight * (e[0] * o[0] + e[1] * o[1]) / grid.area();
                    sums[2] += weight * (e[0] * e[0] + e[1] * e[1]) / grid.area();
                    sums[3] += weight * (o[0] * o[0] + o[1] * o[1]) / grid.area();
                }
            }
            double n = sums[0];
            double error = Math.sqrt((sums[1] * sums[1] + sums[2] * sums[3]) / n) / n;
            Measurement m = row(TABLES, "tt", "mean_field", band);
            assertThat(m.value()).isCloseTo(sums[1] / n, within(1e-14));
            assertThat(m.error()).isCloseTo(error, within(1e-14));
            assertThat(m.count()).isEqualTo(21);
        }
    }

    @Test
    void debiasedIsAutoLessN0LessMeanField() {
        for (int band = 0; band < 3; band++) {
            Measurement auto = row(TABLES, "tt", "auto", band);
            Measurement n0 = row(TABLES, "tt", "n0_mc", band);
            Measurement field = row(TABLES, "tt", "mean_field", band);
            Measurement debiased = row(TABLES, "tt", "debiased", band);
            assertThat(debiased.value())
                    .isCloseTo(auto.value() - n0.value() - field.value(), within(1e-14));
            assertThat(debiased.error())
                    .isCloseTo(
                            Math.hypot(Math.hypot(auto.error(), n0.error()), field.error()),
                            within(1e-14));
        }
    }

    @Test
    void covarianceIsThatOfTheAutosOfAllEstimators() {
        LabelledCovariance c = TABLES.covariance();
        assertThat(c.size()).isEqualTo(6);
        assertThat(c.estimator(4)).isEqualTo("eb");
        assertThat(c.band(4)).isEqualTo(1);
        double[] x = column("tt.auto", 2);
        double[] y = column("eb.auto", 1);
        double sum = 0;
        for (int i = 0; i < x.length; i++) {
            sum += (x[i] - mean(x)) * (y[i] - mean(y));
        }
        assertThat(c.covariance().orElseThrow().value(2, 4)).isCloseTo(sum / 20, within(1e-13));
    }

    /** Invariant: where blocks come from and in which order does not matter to a single byte. */
    @Test
    void orderOfArrivalDoesNotMatter() {
        List<Block> shuffled = new ArrayList<>();
        List<Block> left = new ArrayList<>(RUN.blocks());
        Well19937c random = new Well19937c(5);
        while (!left.isEmpty()) {
            shuffled.add(left.remove(random.nextInt(left.size())));
        }
        Tables again =
                new Aggregation(RUN.facts(), SyntheticRun.known()).of(BlockSource.of(shuffled));
        again.files()
                .forEach((name, bytes) -> assertThat(bytes).isEqualTo(TABLES.files().get(name)));
        assertThat(again.files()).hasSize(4);
    }

    /** Invariant: bandpowers do not depend on the size of blocks, only on the rows' order. */
    @Test
    void meansAndCovarianceDoNotDependOnTheGrouping() {
        Map<String, List<double[]>> all = new TreeMap<>();
        for (Block block : BLOCKS) {
            if (block.id().set().equals("data")) {
                block.columns()
                        .forEach(
                                (name, rows) ->
                                        all.computeIfAbsent(name, n -> new ArrayList<>())
                                                .addAll(rows));
            }
        }
        Block whole = Block.of(new BlockId("data", 0, 0, 21), all, Map.of());
        Tables one =
                new Aggregation(RUN.facts(), SyntheticRun.known())
                        .of(BlockSource.of(List.of(whole)));
        for (String quantity : List.of("auto", "transfer", "curl_cross")) {
            assertThat(rows(one, "eb", quantity)).isEqualTo(rows(TABLES, "eb", quantity));
        }
        assertThat(CsvTables.covariance(one.covariance()))
                .isEqualTo(CsvTables.covariance(TABLES.covariance()));
    }
}
