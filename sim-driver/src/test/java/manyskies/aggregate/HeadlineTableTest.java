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
                        "Look for 'inconsistent': it stands where the probability to exceed (PTE) is"
                                + " below 1.7e-03\n(0.01 shared by 6 checks). Transfer and N0 ratio"
                                + " are means over bands; bands are in bandpowers.csv.\n");
    }

    @Test
    void whatIsMissingIsADashAndTheNumberNeededIsSaid() {
        String text = HeadlineTable.render(SyntheticRun.of(9, 5, 5).tables().summary());
        assertThat(text.lines().filter(line -> line.startsWith("eb ")).findFirst().orElseThrow())
                .matches("eb +\\S+ \\+- \\S+ +- +- +needs 6 +needs 6 +\\S+ \\+- \\S+ +\\S+");
        assertThat(text).contains("note: eb: no mean_field");
    }
}
