package manyskies.aggregate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * Verdicts and headline numbers of a run.
 *
 * <p>All verdicts of a run share one false-alarm rate (Bonferroni): a check is inconsistent where
 * its probability to exceed is below {@link #FALSE_ALARM} divided by the number of checks that were
 * made. A run in which everything is as it should be then shows the word {@code inconsistent} anywhere
 * at most once in a hundred times, however many estimators it has.
 *
 * @param facts name, hash and plan of the run
 * @param sets how much of each set is there
 * @param bandEdges edges of the bands, one more than bands
 * @param estimators headlines in the order of the tables
 * @param notes what a reader must know, one sentence each; empty for a complete run
 */
public record Summary(
        RunFacts facts,
        List<SetCount> sets,
        List<Double> bandEdges,
        List<EstimatorSummary> estimators,
        List<String> notes) {

    /** Probability that a right run shows an inconsistent verdict. A choice, no source. */
    public static final double FALSE_ALARM = 0.01;

    /** Copies the lists. */
    public Summary {
        sets = List.copyOf(sets);
        bandEdges = List.copyOf(bandEdges);
        estimators = List.copyOf(estimators);
        notes = List.copyOf(notes);
    }

    /** Number of checks with a probability to exceed. */
    public long verdicts() {
        return checks().filter(check -> check.test().isPresent()).count();
    }

    /** The probability to exceed below which a check is inconsistent. */
    public double threshold() {
        return FALSE_ALARM / Math.max(1, verdicts());
    }

    /** Whether any check of any estimator is inconsistent. */
    public boolean anyInconsistent() {
        return checks().anyMatch(check -> check.verdict(threshold()) == Verdict.INCONSISTENT);
    }

    private Stream<Check> checks() {
        return estimators.stream().flatMap(e -> Stream.of(e.transfer(), e.curl(), e.n0()));
    }

    static List<String> notes(List<SetCount> sets, List<EstimatorSummary> estimators) {
        List<String> notes = new ArrayList<>();
        for (SetCount set : sets) {
            if (set.realisations() < set.planned()) {
                notes.add(
                        "set "
                                + set.set()
                                + ": "
                                + set.realisations()
                                + " of "
                                + set.planned()
                                + " realisations are there; the tables use those");
            }
        }
        addNote(
                notes,
                estimators.stream().filter(e -> !e.meanFieldRemoved()),
                "no mean_field, which needs field sums of at least one block of even and one of"
                        + " odd number; debiased still holds it");
        addNote(
                notes,
                estimators.stream()
                        .filter(e -> e.debiasedWith().equals(Optional.of("n0_analytic"))),
                "debiased with n0_analytic, as there are no pairs of skies for n0_mc");
        return notes;
    }

    private static void addNote(
            List<String> notes, Stream<EstimatorSummary> concerned, String sentence) {
        String names = concerned.map(EstimatorSummary::estimator).collect(Collectors.joining(", "));
        if (!names.isEmpty()) {
            notes.add(names + ": " + sentence);
        }
    }
}
