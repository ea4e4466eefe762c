package manyskies.aggregate;

import java.util.Optional;
import manyskies.statistic.Deviation;
import manyskies.statistic.HotellingTest;
import manyskies.statistic.MeanVector;
import manyskies.statistic.Measurement;

/**
 * Bands that should have one expected value: their mean, their worst band, and a test of all.
 *
 * @param expected the value each band should have
 * @param count realisations that are there
 * @param needed realisations below which the test is refused
 * @param mean weighted mean over bands, if measured
 * @param jackknifeError error of that mean by leaving out blocks, a second method
 * @param largest the band farthest from the expected value, in units of its error
 * @param test Hotelling's test of all bands together
 * @param reason why there is no test, or empty
 */
public record Check(
        double expected,
        long count,
        long needed,
        Optional<Measurement> mean,
        Optional<Double> jackknifeError,
        Optional<Deviation> largest,
        Optional<HotellingTest> test,
        String reason) {

    /** A check of bands that are not there. */
    static Check notMeasured(double expected, long count, int bands, String reason) {
        return new Check(
                expected,
                count,
                HotellingTest.needed(bands),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                reason);
    }

    /**
     * A check of measured bands.
     *
     * @param expected the value each shown band should have
     * @param shown the bands as they are shown
     * @param tested the same statement as a plain mean, for which the test's law is exact
     * @param testedValue the value each element of the latter should have
     */
    static Check of(double expected, MeanVector shown, MeanVector tested, double testedValue) {
        Check bare = notMeasured(expected, shown.count(), shown.size(), "");
        try {
            Measurement mean = shown.weightedMean();
            Deviation largest = shown.largestDeviation(expected);
            return bare.withMean(mean, largest).withTest(tested, testedValue);
        } catch (IllegalArgumentException e) {
            return notMeasured(expected, shown.count(), shown.size(), e.getMessage());
        }
    }

    private Check withMean(Measurement found, Deviation worst) {
        return new Check(
                expected,
                count,
                needed,
                Optional.of(found),
                jackknifeError,
                Optional.of(worst),
                test,
                reason);
    }

    private Check withTest(MeanVector tested, double value) {
        try {
            HotellingTest found = HotellingTest.of(tested, value);
            return new Check(
                    expected,
                    count,
                    needed,
                    mean,
                    jackknifeError,
                    largest,
                    Optional.of(found),
                    reason);
        } catch (IllegalArgumentException e) {
            return new Check(
                    expected, count, needed, mean, jackknifeError, largest, test, e.getMessage());
        }
    }

    /** This check with the error of its mean by a second method. */
    Check withJackknife(Optional<Double> error) {
        return new Check(expected, count, needed, mean, error, largest, test, reason);
    }

    /** The verdict at a threshold of the probability to exceed. */
    public Verdict verdict(double threshold) {
        if (test.isPresent()) {
            return test.get().probabilityToExceed() >= threshold
                    ? Verdict.CONSISTENT
                    : Verdict.INCONSISTENT;
        }
        return count < needed ? Verdict.TOO_FEW : Verdict.NOT_MEASURED;
    }
}
