package manyskies.statistic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class MeanVectorTest {
    private static final MeanVector V =
            MeanVector.of(
                    new double[] {1, 3, 2},
                    Covariance.of(new double[][] {{4, 1, 0}, {1, 1, 0}, {0, 0, 2}}, 16));

    @Test
    void theWeightedMeanCarriesTheCorrelationInItsError() {
        Measurement mean = V.select(0, 1).weightedMean();
        // weights 1/5 and 4/5; variance (4 + 2 x 4 x 1 + 16) / 25 / 16
        assertThat(mean.value()).isCloseTo(13.0 / 5, within(1e-15));
        assertThat(mean.error()).isCloseTo(Math.sqrt(28.0 / 25 / 16), within(1e-15));
        assertThat(mean.count()).isEqualTo(16);
    }

    @Test
    void theLargestDeviationHasItsSign() {
        assertThat(V.largestDeviation(2)).isEqualTo(new Deviation(1, 4.0));
        assertThat(V.largestDeviation(3).index()).isEqualTo(0);
        assertThat(V.largestDeviation(3).sigma()).isEqualTo(-4.0);
    }

    @Test
    void linearMapsMoveMeanAndCovariance() {
        MeanVector d = V.select(0, 1).difference();
        assertThat(d.value(0)).isEqualTo(-2);
        assertThat(d.covariance().value(0, 0)).isEqualTo(4 + 1 - 2);
        MeanVector q = V.dividedBy(1, 2, 4);
        assertThat(q.value(1)).isEqualTo(1.5);
        assertThat(q.covariance().value(0, 1)).isEqualTo(0.5);
        assertThat(q.measurement(0)).isEqualTo(new Measurement(1, 0.5, 16));
    }

    @Test
    void independentErrorsAddInQuadrature() {
        assertThat(new Measurement(5, 3, 10).minus(new Measurement(2, 4, 7)))
                .isEqualTo(new Measurement(3, 5, 10));
        assertThat(new Measurement(5, 3, 10).minus(Measurement.computed(1)).error()).isEqualTo(3);
    }

    @Test
    void impossibleNumbersAreRefused() {
        assertThatThrownBy(() -> new Measurement(Double.NaN, 1, 1))
                .hasMessageContaining("found NaN +- 1.0 from 1");
        assertThatThrownBy(() -> MeanVector.of(new double[2], V.covariance()))
                .hasMessage("a mean of 2 elements has no covariance of 3");
    }
}
