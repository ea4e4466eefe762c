package manyskies.realisation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.statistic.HotellingTest;
import manyskies.statistic.MeanVector;
import manyskies.statistic.MomentSums;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** From a specification to measured blocks. */
class BlockRunnerTest {
    /** False-alarm rate of each statistical test here; seven estimators and three tests share it. */
    private static final double FALSE_ALARM = 1e-6;

    private static final int SKIES = 48;
    private static RunModel model;
    private static Block data;
    private static Block pairs;

    @BeforeAll
    static void run() {
        model = RunModel.of(SmallRun.with(0, 0, SmallRun.ALL));
        BlockRunner runner = BlockRunner.of(model);
        data = runner.run(new BlockId("data", 0, 0, SKIES));
        pairs = runner.run(new BlockId("pairs", 0, 0, 32));
    }

    static List<String> estimators() {
        return SmallRun.ALL;
    }

    /** Invariant: a realisation depends on nothing but its specification, set and index. */
    @Test
    void aRealisationIsTheSameInAnyBlockByAnyRunner() {
        Block alone = BlockRunner.of(model).run(new BlockId("data", 5, 5, 1));
        alone.columns()
                .forEach(
                        (name, rows) ->
                                assertThat(rows.get(0)).isEqualTo(data.columns().get(name).get(5)));
        assertThat(alone.columns().keySet()).isEqualTo(data.columns().keySet());
    }

    @Test
    void skiesOfDifferentIndicesDiffer() {
        List<double[]> input = data.columns().get("input.auto");
        assertThat(input.get(0)).isNotEqualTo(input.get(1));
    }

    /** Statistical: with lensed-gradient weights the cross-spectrum with the input is the input's. */
    @ParameterizedTest
    @MethodSource("estimators")
    void theTransferFunctionIsOne(String name) {
        assertThat(transferTest(name, 1).probabilityToExceed()).isGreaterThan(FALSE_ALARM);
    }

    /** The twin: a response ten per cent wrong does not pass. */
    @ParameterizedTest
    @ValueSource(strings = {"tt", "eb", "mv", "joint"})
    void theTransferTestSeesTenPerCent(String name) {
        assertThat(transferTest(name, 1.1).probabilityToExceed()).isLessThan(FALSE_ALARM);
    }

    private static HotellingTest transferTest(String name, double fault) {
        List<double[]> cross = data.columns().get(name + ".cross_input");
        List<double[]> input = data.columns().get("input.auto");
        List<double[]> difference = new ArrayList<>();
        for (int sky = 0; sky < SKIES; sky++) {
            double[] row = new double[SmallRun.BANDS.count()];
            for (int band = 0; band < row.length; band++) {
                row[band] = fault * cross.get(sky)[band] - input.get(sky)[band];
            }
            difference.add(row);
        }
        return HotellingTest.of(mean(difference), 0);
    }

    /** Statistical: parity forbids a correlation of the curl estimate with phi. */
    @ParameterizedTest
    @MethodSource("estimators")
    void theCurlEstimateKnowsNothingOfPhi(String name) {
        MeanVector cross = mean(data.columns().get(name + ".curl_cross"));
        assertThat(HotellingTest.of(cross, 0).probabilityToExceed()).isGreaterThan(FALSE_ALARM);
    }

    /** Statistical: pairs of independent skies have the analytic noise, lens and curl alike. */
    @ParameterizedTest
    @MethodSource("estimators")
    void theMonteCarloNoiseIsTheAnalyticOne(String name) {
        for (String curl : List.of("", "curl_")) {
            MeanVector found = mean(pairs.columns().get(name + "." + curl + "n0_mc"));
            double[] expected = model.analytic().get(name + "." + curl + "n0_analytic");
            assertThat(HotellingTest.of(found, expected).probabilityToExceed())
                    .isGreaterThan(FALSE_ALARM);
        }
    }

    /** The twin: noise ten per cent wrong does not pass. */
    @Test
    void theNoiseTestSeesTenPerCent() {
        MeanVector found = mean(pairs.columns().get("mv.n0_mc"));
        double[] wrong = model.analytic().get("mv.n0_analytic").clone();
        for (int band = 0; band < wrong.length; band++) {
            wrong[band] *= 1.1;
        }
        assertThat(HotellingTest.of(found, wrong).probabilityToExceed()).isLessThan(FALSE_ALARM);
    }

    /** Maniyar et al. 2021 (2101.12193): joint is at most about 10 per cent better than mv. */
    @Test
    void theJointEstimatorIsQuieterThanTheCombinationByTenPerCentAtMost() {
        double[] mv = model.analytic().get("mv.n0_analytic");
        double[] joint = model.analytic().get("joint.n0_analytic");
        for (int band = 0; band < mv.length; band++) {
            assertThat(joint[band] / mv[band]).isBetween(0.88, 1.0);
        }
    }

    @Test
    void anUnknownSetIsNamed() {
        BlockRunner runner = BlockRunner.of(model);
        assertThatThrownBy(() -> runner.run(new BlockId("dat", 0, 3, 1)))
                .isInstanceOf(RealisationException.class)
                .hasMessage("realisation 3 of set dat failed: there is no set 'dat'");
    }

    private static MeanVector mean(List<double[]> rows) {
        MomentSums sums = new MomentSums(rows.get(0).length);
        sums.add(rows);
        return sums.mean();
    }
}
