package manyskies.aggregate;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import manyskies.statistic.HotellingTest;
import manyskies.statistic.Measurement;

/**
 * The headline numbers as text for a console, at most 100 columns wide for names of up to six
 * letters.
 */
public final class HeadlineTable {
    private static final List<String> TITLES =
            List.of(
                    "",
                    "transfer",
                    "chi2",
                    "PTE",
                    "verdict",
                    "curl x phi",
                    "N0 MC/analytic",
                    "S/N");

    /** However small an error is. */
    private static final int MOST_DECIMALS = 5;

    private static final int COLUMNS = 100;

    private HeadlineTable() {}

    /** The table with a line about its counts above and a line on how to read it below. */
    public static String render(Summary summary) {
        List<List<String>> lines = new ArrayList<>();
        lines.add(TITLES);
        summary.estimators().forEach(e -> lines.add(cells(e, summary.threshold())));
        StringBuilder text = new StringBuilder(counts(summary));
        lines.forEach(line -> append(text, line, widths(lines)));
        summary.notes().forEach(note -> text.append(wrapped("note: " + note)));
        return text.append(legend(summary)).toString();
    }

    private static String counts(Summary summary) {
        StringBuilder text = new StringBuilder(summary.facts().name()).append(": ");
        for (SetCount set : summary.sets()) {
            text.append(set.realisations()).append(" of ").append(set.planned());
            text.append(' ').append(set.set()).append(", ");
        }
        int bands = summary.bandEdges().size() - 1;
        return text.append(bands).append(bands == 1 ? " band\n" : " bands\n").toString();
    }

    private static List<String> cells(EstimatorSummary e, double threshold) {
        Optional<HotellingTest> test = e.transfer().test();
        return List.of(
                e.estimator(),
                number(e.transfer().mean()),
                test.map(t -> format(1, t.tSquared())).orElse("-"),
                test.map(t -> probability(t.probabilityToExceed())).orElse("-"),
                words(e.transfer(), threshold),
                words(e.curl(), threshold),
                number(e.n0().mean()) + mark(e.n0(), threshold),
                e.signalToNoise().map(s -> format(1, s)).orElse("-"));
    }

    private static String words(Check check, double threshold) {
        Verdict verdict = check.verdict(threshold);
        return verdict == Verdict.TOO_FEW ? "needs " + check.needed() : verdict.words();
    }

    /** The ratio of n0 has no column for its verdict. */
    private static String mark(Check check, double threshold) {
        return check.verdict(threshold) == Verdict.INCONSISTENT ? " *" : "";
    }

    private static String probability(double p) {
        return p < 0.001 ? String.format(Locale.ROOT, "%.0e", p) : format(3, p);
    }

    /** With two digits of the error. */
    private static String number(Optional<Measurement> measurement) {
        if (measurement.isEmpty()) {
            return "-";
        }
        double error = measurement.get().error();
        int decimals = 2;
        while (decimals < MOST_DECIMALS && error * Math.pow(10, decimals) < 10) {
            decimals++;
        }
        return format(decimals, measurement.get().value()) + " +- " + format(decimals, error);
    }

    private static String format(int decimals, double value) {
        return String.format(Locale.ROOT, "%." + decimals + "f", value);
    }

    /** Lines of at most {@link #COLUMNS} letters, broken between words. */
    private static String wrapped(String sentence) {
        int end = sentence.length() <= COLUMNS ? -1 : sentence.lastIndexOf(' ', COLUMNS);
        return end < 2 // nothing but the indent before it
                ? sentence + "\n"
                : sentence.substring(0, end) + "\n" + wrapped("  " + sentence.substring(end + 1));
    }

    private static int[] widths(List<List<String>> lines) {
        int[] widths = new int[TITLES.size()];
        for (List<String> line : lines) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], line.get(i).length());
            }
        }
        return widths;
    }

    private static void append(StringBuilder text, List<String> line, int[] widths) {
        StringBuilder row = new StringBuilder();
        for (int i = 0; i < widths.length; i++) {
            row.append(line.get(i)).append(" ".repeat(widths[i] - line.get(i).length() + 2));
        }
        text.append(row.toString().stripTrailing()).append('\n');
    }

    private static String legend(Summary summary) {
        return String.format(
                Locale.ROOT,
                "Look for 'inconsistent' (for N0: *): a probability to exceed (PTE) below %.1e, which"
                        + " is\n%s shared by %d checks. Transfer should be 1, curl x phi 0, N0 ratio"
                        + " 1; bands: bandpowers.csv\n",
                summary.threshold(),
                Summary.FALSE_ALARM,
                summary.verdicts());
    }
}
