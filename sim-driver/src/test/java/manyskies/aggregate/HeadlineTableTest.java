package manyskies.aggregate;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class HeadlineTableTest {

    @Test
    void aLineForEachEstimatorWithinAHundredColumns() {
        String text =
                HeadlineTable.render(new SyntheticRun(9, 60, 10, 60, 0.8, 0).tables().summary());
        assertThat(text.lines()).allMatch(line -> line.length() <= 100);
        assertThat(text.lines().findFirst())
                .contains("drawn: 60 of 60 data, 60 of 60 pairs, 3 bands");
        assertThat(text.lines().filter(line -> line.startsWith("tt ")).findFirst().orElseThrow())
                .matches(
                        "tt +0\\.\\d+ \\+- 0\\.0\\d+ +\\d+\\.\\d +\\de-\\d\\d +inconsistent"
                                + " +consistent +\\d\\.\\d+ \\+- 0\\.0\\d+ +\\d+\\.\\d");
        assertThat(text)
                .endsWith(
                        "Look for 'inconsistent' (for N0: *): a probability to exceed (PTE) below"
                                + " 1.7e-03, which is\n0.01 shared by 6 checks. Transfer should be 1,"
                                + " curl x phi 0, N0 ratio 1; bands: bandpowers.csv\n");
    }

    @Test
    void whatIsMissingIsADashAndTheNumberNeededIsSaid() {
        String text = HeadlineTable.render(SyntheticRun.of(9, 5, 5).tables().summary());
        assertThat(text.lines().filter(line -> line.startsWith("eb ")).findFirst().orElseThrow())
                .matches("eb +\\S+ \\+- \\S+ +- +- +needs 6 +needs 6 +\\S+ \\+- \\S+ +\\S+");
        assertThat(text).contains("note: tt, eb: no mean_field");
        assertThat(text.lines()).allMatch(line -> line.length() <= 100);
        assertThat(text).contains("and one of odd\n  number; debiased still holds it\n");
    }

    /** N0 has no column for its verdict: a star marks a belief that is 40 per cent off. */
    @Test
    void anN0ThatIsOffIsMarked() {
        SyntheticRun run = SyntheticRun.of(9, 60, 10);
        Summary summary =
                new Aggregation(run.facts(), SyntheticRun.known(SyntheticRun.N0 * 1.4))
                        .of(BlockSource.of(run.blocks()))
                        .summary();
        Check n0 = summary.estimators().get(0).n0();
        assertThat(n0.verdict(summary.threshold())).isEqualTo(Verdict.INCONSISTENT);
        assertThat(n0.mean().orElseThrow().value()).isBetween(0.6, 0.8);
        assertThat(HeadlineTable.render(summary))
                .containsPattern("tt .* 0\\.[67]\\d+ \\+- \\S+ \\* ");
        assertThat(HeadlineTable.render(run.tables().summary()).lines().limit(4))
                .noneMatch(line -> line.contains("*"));
    }
}
