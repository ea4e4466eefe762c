package manyskies.farm;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;

/**
 * How fast realisations come, and when the last will.
 *
 * <p>The first blocks pay for starting Spark and warming the JVM, and come in a burst, one per core.
 * So the rate is counted from the moment the first {@code warmUp} realisations were done:
 * rate = (done - done_0) / (t - t_0).
 */
final class Pace {
    private final int total;
    private final int warmUp;
    private Instant warm;
    private Instant last;
    private int doneWhenWarm;
    private int done;

    /**
     * Starts counting.
     *
     * @param total realisations to come
     * @param warmUp realisations after which the rate is believed
     * @param start now
     */
    Pace(int total, int warmUp, Instant start) {
        this.total = total;
        this.warmUp = warmUp;
        this.warm = start;
        this.last = start;
    }

    void add(int realisations, Instant now) {
        boolean wasWarm = done >= warmUp;
        done += realisations;
        last = now;
        if (!wasWarm) {
            warm = now;
            doneWhenWarm = done;
        }
    }

    int done() {
        return done;
    }

    int total() {
        return total;
    }

    /** Realisations a second since the warm-up; nothing before, when it would be far too low. */
    Optional<Double> rate() {
        return perSecond(done - doneWhenWarm, Duration.between(warm, last));
    }

    private static Optional<Double> perSecond(int realisations, Duration time) {
        double seconds = time.toMillis() / 1000.0;
        return realisations > 0 && seconds > 0
                ? Optional.of(realisations / seconds)
                : Optional.empty();
    }

    /** When the last realisation will be done, if the rate holds. */
    Optional<Instant> end() {
        return rate().map(r -> last.plusMillis(Math.round(1000 * (total - done) / r)));
    }
}
