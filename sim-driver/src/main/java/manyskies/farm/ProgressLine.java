package manyskies.farm;

import java.io.PrintWriter;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import manyskies.result.BlockId;

/**
 * One line of progress: realisations done, rate, projected end by the clock.
 *
 * <p>On a terminal the line is redrawn with every block; otherwise a plain line is written every 30
 * seconds, so that a log stays short.
 */
public final class ProgressLine implements Progress, AutoCloseable {
    private static final Duration PLAIN_EVERY = Duration.ofSeconds(30);
    private static final String ERASE_LINE = "\r\u001b[K";
    private static final DateTimeFormatter TODAY =
            DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);
    private static final DateTimeFormatter LATER =
            DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm", Locale.ROOT);

    private final PrintWriter out;
    private final boolean terminal;
    private final Clock clock;
    private final Pace pace;
    private Instant lastPlain;
    private boolean drawn;

    /**
     * A line that counts from now.
     *
     * @param out where it goes
     * @param terminal whether it can be redrawn
     * @param realisations how many are to come
     * @param warmUp after how many the rate is believed: a block per core
     * @param clock the wall clock, with its time zone
     */
    public ProgressLine(
            PrintWriter out, boolean terminal, int realisations, int warmUp, Clock clock) {
        this.out = out;
        this.terminal = terminal;
        this.clock = clock;
        this.lastPlain = clock.instant();
        this.pace = new Pace(realisations, warmUp, lastPlain);
    }

    @Override
    public synchronized void blockDone(BlockId id) {
        Instant now = clock.instant();
        pace.add(id.count(), now);
        if (terminal) {
            out.print(ERASE_LINE + text(now));
            drawn = true;
        } else if (Duration.between(lastPlain, now).compareTo(PLAIN_EVERY) >= 0) {
            out.println(text(now));
            lastPlain = now;
        }
        out.flush();
    }

    @Override
    public synchronized void blockFailed(BlockFailure failure) {
        erase();
        out.println(failure.message());
        out.flush();
    }

    /** Erases a redrawn line, so that what is printed next starts on a clean one. */
    @Override
    public synchronized void close() {
        erase();
        out.flush();
    }

    private void erase() {
        if (drawn) {
            out.print(ERASE_LINE);
            drawn = false;
        }
    }

    private String text(Instant now) {
        String count = pace.done() + " of " + pace.total() + " realisations";
        String rate = pace.rate().map(r -> ", " + perTime(r)).orElse("");
        String end = pace.end().map(e -> ", ends about " + time(e, now)).orElse("");
        return count + rate + end;
    }

    private static String perTime(double perSecond) {
        return perSecond >= 1
                ? String.format(Locale.ROOT, "%.1f a second", perSecond)
                : String.format(Locale.ROOT, "%.1f a minute", 60 * perSecond);
    }

    private String time(Instant end, Instant now) {
        ZonedDateTime there = end.atZone(clock.getZone());
        boolean today = there.toLocalDate().equals(now.atZone(clock.getZone()).toLocalDate());
        return there.format(today ? TODAY : LATER);
    }
}
