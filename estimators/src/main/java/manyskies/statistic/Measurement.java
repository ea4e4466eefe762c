package manyskies.statistic;

/**
 * A number measured from realisations.
 *
 * @param value the number
 * @param error its Monte Carlo error, one standard deviation; 0 for a number that was computed
 * @param count realisations behind it; 0 for a number that was computed
 */
public record Measurement(double value, double error, long count) {

    /**
     * Checks that value and error are finite and the error is not negative.
     *
     * @throws IllegalArgumentException if they are not
     */
    public Measurement {
        if (!Double.isFinite(value) || !Double.isFinite(error) || error < 0 || count < 0) {
            throw new IllegalArgumentException(
                    "a measurement is finite with an error and a count of 0 or more; found "
                            + value
                            + " +- "
                            + error
                            + " from "
                            + count);
        }
    }

    /** A number that was computed: no realisation stands behind it and it has no scatter. */
    public static Measurement computed(double value) {
        return new Measurement(value, 0, 0);
    }

    /** The difference of two numbers whose errors are independent, with the count of this one. */
    public Measurement minus(Measurement other) {
        double variance = error * error + other.error * other.error;
        return new Measurement(value - other.value, Math.sqrt(variance), count);
    }
}
