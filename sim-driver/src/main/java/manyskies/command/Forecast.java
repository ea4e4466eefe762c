package manyskies.command;

import java.io.PrintWriter;
import java.time.Clock;
import java.time.Duration;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import manyskies.result.BlockId;

/** Prints what would run, in how much memory, and until when. */
final class Forecast {
    private static final DateTimeFormatter END =
            DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT);

    private final Plan plan;
    private final Heap heap;
    private final PrintWriter out;

    Forecast(Plan plan, Heap heap, PrintWriter out) {
        this.plan = plan;
        this.heap = heap;
        this.out = out;
    }

    void printPlan() {
        out.println("What would run:");
        for (String set : plan.sets()) {
            List<BlockId> blocks = plan.ofSet(set);
            out.printf(
                    Locale.ROOT,
                    "  %-8s %d realisations in %s%n",
                    set,
                    Plan.realisations(blocks),
                    Plan.count(blocks.size()));
        }
    }

    void printMemory(int cores) {
        out.printf(
                Locale.ROOT,
                "Memory: %s for each block in progress, %s shared; %s for %d at a time, of a heap of"
                        + " %s.%n",
                Heap.text(heap.memory().perTask()),
                Heap.text(heap.memory().shared()),
                Heap.text(heap.need(cores)),
                cores,
                Heap.text(heap.bytes()));
    }

    void printCost(Cost cost, int cores, Clock clock) {
        cost.seconds()
                .forEach(
                        (set, seconds) ->
                                out.printf(
                                        Locale.ROOT,
                                        "Cost: %.3f s for a realisation of %s (one thread, mean of"
                                                + " %d after a warm-up).%n",
                                        seconds,
                                        set,
                                        cost.timed()));
        Duration time = cost.of(plan.blocks(), cores);
        out.printf(
                Locale.ROOT,
                "On %d cores: %s, so started now it would end about %s.%n",
                cores,
                text(time),
                END.format(ZonedDateTime.now(clock).plus(time)));
    }

    /** 42 s, 3 min 5 s, 7 h 12 min. */
    static String text(Duration time) {
        long seconds = Math.max(1, Math.round(time.toMillis() / 1000.0));
        if (seconds < 60) {
            return seconds + " s";
        }
        if (seconds < 3600) {
            return seconds / 60 + " min " + seconds % 60 + " s";
        }
        return seconds / 3600 + " h " + seconds % 3600 / 60 + " min";
    }
}
