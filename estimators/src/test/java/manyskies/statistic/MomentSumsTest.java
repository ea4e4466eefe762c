package manyskies.statistic;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MomentSumsTest {
    private static final List<double[]> ROWS = rows();

    /** Bandpowers far from zero compared with their scatter, as those of phi are. */
    private static List<double[]> rows() {
        List<double[]> rows = new Draws(1).correlated(37, 4, 0.7);
        rows.forEach(
                row -> {
                    for (int i = 0; i < row.length; i++) {
                        row[i] = 1e-7 * (1000 + row[i]);
                    }
                });
        return rows;
    }

    /** Second method: two passes, each element on its own. */
    @Test
    void momentsAreThoseOfTwoPasses() {
        MeanVector mean = Draws.mean(ROWS);
        for (int i = 0; i < 4; i++) {
            assertThat(mean.value(i)).isCloseTo(plainMean(i), within(1e-13 * plainMean(i)));
            for (int j = 0; j < 4; j++) {
                assertThat(mean.covariance().value(i, j))
                        .isCloseTo(plainCovariance(i, j), within(1e-9 * plainCovariance(0, 0)));
            }
            assertThat(mean.error(i))
                    .isCloseTo(Math.sqrt(plainCovariance(i, i) / 37), within(1e-9 * mean.error(0)));
        }
        assertThat(mean.count()).isEqualTo(37);
    }

    private static double plainMean(int i) {
        return ROWS.stream().mapToDouble(row -> row[i]).sum() / ROWS.size();
    }

    private static double plainCovariance(int i, int j) {
        return ROWS.stream()
                        .mapToDouble(row -> (row[i] - plainMean(i)) * (row[j] - plainMean(j)))
                        .sum()
                / (ROWS.size() - 1);
    }

    /** Invariant: the same bits however rows are grouped. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 5, 16, 36})
    void groupingDoesNotMatter(int group) {
        MomentSums sums = new MomentSums(4);
        List<double[]> rest = new ArrayList<>(ROWS);
        while (!rest.isEmpty()) {
            List<double[]> next = rest.subList(0, Math.min(group, rest.size()));
            sums.add(next);
            next.clear();
            sums.add(List.of());
        }
        MeanVector grouped = sums.mean();
        MeanVector whole = Draws.mean(ROWS);
        for (int i = 0; i < 4; i++) {
            assertThat(grouped.value(i)).isEqualTo(whole.value(i));
            for (int j = 0; j < 4; j++) {
                assertThat(grouped.covariance().value(i, j))
                        .isEqualTo(whole.covariance().value(i, j));
            }
        }
    }

    @Test
    void oneRowHasNoScatter() {
        assertThatThrownBy(() -> Draws.mean(ROWS.subList(0, 1)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a scatter needs at least 2 realisations, found 1");
    }

    @Test
    void aRowOfAnotherLengthIsRefusedAndNothingAdded() {
        MomentSums sums = new MomentSums(3);
        assertThatThrownBy(() -> sums.add(List.of(new double[3], new double[2])))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a row has 2 elements, expected 3");
        assertThat(sums.count()).isZero();
    }
}
