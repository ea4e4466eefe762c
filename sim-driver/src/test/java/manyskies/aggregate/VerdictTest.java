package manyskies.aggregate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import manyskies.flat.FlatGrid;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.specification.Sets;
import manyskies.spectrum.Bandpowers;
import manyskies.statistic.HotellingTest;
import manyskies.statistic.Measurement;
import org.hipparchus.random.Well19937c;
import org.junit.jupiter.api.Test;

/** Verdicts on runs drawn with known transfer functions. */
class VerdictTest {
    private static final int RUNS = 500;

    /** Kolmogorov's distance by Massart 1990 (Annals of Probability 18, 1269): rate 1e-6. */
    private static final double BOUND = Math.sqrt(Math.log(2e6) / (2 * RUNS));

    private static List<Summary> summaries(double transfer, double curl) {
        List<Summary> out = new ArrayList<>();
        for (int run = 0; run < RUNS; run++) {
            out.add(new SyntheticRun(1000 + run, 30, 6, 10, transfer, curl).tables().summary());
        }
        return out;
    }

    private static double distance(List<Summary> runs, Function<EstimatorSummary, Check> which) {
        double[] tails =
                runs.stream()
                        .map(run -> which.apply(run.estimators().get(1)).test().orElseThrow())
                        .mapToDouble(HotellingTest::probabilityToExceed)
                        .sorted()
                        .toArray();
        double distance = 0;
        for (int i = 0; i < tails.length; i++) {
            double below = tails[i] - (double) i / tails.length;
            double above = (i + 1.0) / tails.length - tails[i];
            distance = Math.max(distance, Math.max(below, above));
        }
        return distance;
    }

    /**
     * Exact: noise of cross-spectra is Gaussian here, so that probabilities to exceed are uniform.
     * Twins: transfer functions 4 per cent low (one sky's error 20 per cent, 30 skies), a curl of 4
     * per cent of the input.
     */
    @Test
    void probabilitiesAreUniformForARightRunAndNotForAWrongOne() {
        List<Summary> right = summaries(1, 0);
        assertThat(distance(right, EstimatorSummary::transfer)).isLessThan(BOUND);
        assertThat(distance(right, EstimatorSummary::curl)).isLessThan(BOUND);
        // the family rate is at most 0.01 for the Gaussian checks; n0 is mildly skewed. 500 runs
        // at a rate of 0.01: more than 18 has a probability below 1e-5 (binomial)
        assertThat(right.stream().filter(VerdictTest::gaussianChecksFail).count())
                .isLessThanOrEqualTo(18);
        List<Summary> wrong = summaries(0.96, 0.04);
        assertThat(distance(wrong, EstimatorSummary::transfer)).isGreaterThan(BOUND);
        assertThat(distance(wrong, EstimatorSummary::curl)).isGreaterThan(BOUND);
    }

    private static boolean gaussianChecksFail(Summary run) {
        return run.estimators().stream()
                .flatMap(e -> java.util.stream.Stream.of(e.transfer(), e.curl()))
                .anyMatch(check -> check.verdict(run.threshold()) == Verdict.INCONSISTENT);
    }

    @Test
    void aTransferTwentyPerCentLowIsCalledInconsistentAndItsBandNamed() {
        Summary summary = new SyntheticRun(7, 60, 10, 60, 0.8, 0).tables().summary();
        Check check = summary.estimators().get(0).transfer();
        assertThat(summary.threshold()).isEqualTo(0.01 / 6);
        assertThat(check.verdict(summary.threshold())).isEqualTo(Verdict.INCONSISTENT);
        assertThat(summary.anyInconsistent()).isTrue();
        assertThat(check.mean().orElseThrow().value()).isCloseTo(0.8, within(0.09));
        assertThat(check.largest().orElseThrow().sigma()).isLessThan(-5);
        assertThat(summary.estimators().get(0).curl().verdict(summary.threshold()))
                .isEqualTo(Verdict.CONSISTENT);
        // a second method for the error, with 6 blocks precise to about 30 per cent
        assertThat(check.jackknifeError().orElseThrow() / check.mean().orElseThrow().error())
                .isBetween(0.3, 2.5);
    }

    /**
     * Mean field of nothing: z = value / error per band. With about 20 modes and more z is near
     * Gaussian of unit variance; over 300 runs and 3 bands the mean of z^2 scatters by about
     * sqrt(2.5 / 900) = 0.053; six of those, plus 0.1 for the noise of the error itself. Twin: a mean
     * field of half the noise power of one half's mean.
     */
    private static double meanSquareOfMeanField(double power) {
        FlatGrid grid = SyntheticRun.GRID;
        Bandpowers bandpowers = Bandpowers.of(grid, SyntheticRun.BANDS);
        Well19937c random = new Well19937c(31);
        double[] meanField = SyntheticRun.gaussianField(Math.sqrt(power), random);
        double sum = 0;
        for (int run = 0; run < 300; run++) {
            FieldHalves halves = new FieldHalves(grid);
            for (int number = 0; number < 4; number++) {
                double[] field = SyntheticRun.gaussianField(Math.sqrt(8), random);
                for (int i = 0; i < field.length; i++) {
                    field[i] += 8 * meanField[i];
                }
                BlockId id = new BlockId("data", number, 8 * number, 8);
                halves.add(Block.of(id, java.util.Map.of(), java.util.Map.of("tt", field)));
            }
            for (Measurement m : halves.spectrum("tt", bandpowers).orElseThrow()) {
                sum += m.value() * m.value() / (m.error() * m.error()) / 900;
            }
        }
        return sum;
    }

    @Test
    void theErrorOfTheMeanFieldIsCalibratedAndAMeanFieldIsSeen() {
        assertThat(meanSquareOfMeanField(0)).isCloseTo(1, within(0.1 + 6 * 0.053));
        assertThat(meanSquareOfMeanField(0.5 / 16)).isGreaterThan(1.1 + 6 * 0.053);
    }

    @Test
    void tooFewRealisationsAreSaidWithTheNumberNeeded() {
        Summary summary = SyntheticRun.of(3, 5, 5).tables().summary();
        Check check = summary.estimators().get(0).transfer();
        assertThat(check.verdict(summary.threshold())).isEqualTo(Verdict.TOO_FEW);
        assertThat(check.needed()).isEqualTo(6);
        assertThat(check.reason())
                .isEqualTo(
                        "a test of 3 bandpowers with their own covariance needs at least 6"
                                + " realisations, found 5");
        assertThat(check.mean()).isPresent();
        assertThat(check.jackknifeError()).isEmpty();
        assertThat(summary.verdicts()).isZero();
        assertThat(summary.notes())
                .contains(
                        "tt, eb: no mean_field, which needs field sums of at least one block of even"
                                + " and one of odd number; debiased still holds it");
        assertThat(SyntheticRun.of(3, 6, 6).tables().summary().verdicts()).isEqualTo(6);
    }

    @Test
    void aRunWithoutPairsIsDebiasedWithTheAnalyticN0AndSaysSo() {
        Tables tables = new SyntheticRun(4, 20, 5, 0, 1, 0).tables();
        EstimatorSummary tt = tables.summary().estimators().get(0);
        assertThat(tt.debiasedWith()).isEqualTo(Optional.of("n0_analytic"));
        assertThat(tt.n0().verdict(0.01)).isEqualTo(Verdict.TOO_FEW);
        assertThat(tt.n0().reason()).isEqualTo("set pairs has 0 realisations");
        assertThat(tables.summary().notes())
                .contains(
                        "tt, eb: debiased with n0_analytic, as there are no pairs of skies for n0_mc");
        double expected =
                AggregationTest.row(tables, "tt", "auto", 0).value()
                        - 1
                        - AggregationTest.row(tables, "tt", "mean_field", 0).value();
        assertThat(AggregationTest.row(tables, "tt", "debiased", 0).value())
                .isCloseTo(expected, within(1e-14));
        assertThat(AggregationTest.rows(tables, "tt", "n0_mc")).isEmpty();
    }

    /** One realisation has no error, none has nothing: what is computed stays, with the reason. */
    @Test
    void oneRealisationOrNoneLeavesOnlyWhatIsComputed() {
        for (int count = 0; count < 2; count++) {
            Tables tables = SyntheticRun.of(5, count, 5).tables();
            assertThat(tables.bands())
                    .extracting(BandRow::quantity)
                    .containsOnly("response", "n0_analytic", "curl_n0_analytic");
            Check check = tables.summary().estimators().get(1).transfer();
            assertThat(check.verdict(0.01)).isEqualTo(Verdict.TOO_FEW);
            assertThat(check.reason()).isEqualTo("set data has " + count + " realisations");
            assertThat(tables.covariance().size()).isZero();
            assertThat(tables.files()).hasSize(4);
        }
    }

    @Test
    void aPartOfARunIsUsedAndSaidToBeAPart() {
        SyntheticRun run = SyntheticRun.of(6, 20, 5);
        List<Block> some = new ArrayList<>(run.blocks());
        some.removeIf(block -> block.id().number() == 1);
        Summary summary =
                new Aggregation(run.facts(), SyntheticRun.known())
                        .of(BlockSource.of(some))
                        .summary();
        assertThat(summary.sets())
                .containsExactly(new SetCount("data", 20, 15, 3), new SetCount("pairs", 20, 15, 3));
        assertThat(summary.notes())
                .contains("set data: 15 of 20 realisations are there; the tables use those");
    }

    @Test
    void bandsThatDoNotScatterAreNotTested() {
        List<double[]> same = new ArrayList<>();
        for (int i = 0; i < 9; i++) {
            same.add(new double[] {1, 1, 1});
        }
        Block block =
                Block.of(
                        new BlockId("data", 0, 0, 9),
                        java.util.Map.of("input.auto", same, "tt.cross_input", same),
                        java.util.Map.of());
        Summary summary =
                new Aggregation(new RunFacts("flat", "0", new Sets(9, 0)), SyntheticRun.known())
                        .of(BlockSource.of(Arrays.asList(block)))
                        .summary();
        Check check = summary.estimators().get(0).transfer();
        assertThat(check.verdict(0.01)).isEqualTo(Verdict.NOT_MEASURED);
        assertThat(check.reason()).contains("has no scatter over 9 realisations");
        assertThat(summary.estimators().get(1).transfer().reason())
                .isEqualTo("set data lacks one of [eb.cross_input, input.auto]");
    }
}
