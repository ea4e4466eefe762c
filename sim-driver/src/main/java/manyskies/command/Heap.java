package manyskies.command;

import java.util.Locale;
import manyskies.command.Realisations.Memory;

/**
 * How many blocks fit into the heap at a time.
 *
 * <p>Spark knows no memory per task: a heap too small for the tasks would kill the JVM in the middle
 * of the night, so it is refused at the start.
 *
 * @param bytes the heap
 * @param memory what blocks need
 */
record Heap(long bytes, Memory memory) {
    /** For Spark, results on their way to the disk, and the collector's elbow room. */
    static final long RESERVE = 256L << 20;

    /** Spark does not start in less (its own figure: 1.5 times 300 MiB). */
    static final long LEAST = 450L << 20;

    private static final double MEBIBYTE = 1 << 20;

    /** Blocks that fit at a time; 0 if not even one does. */
    int tasks() {
        if (bytes < LEAST) {
            return 0;
        }
        long free = bytes - RESERVE - memory.shared();
        return (int) Math.max(0, Math.min(Integer.MAX_VALUE, free / Math.max(1, memory.perTask())));
    }

    /**
     * Checks a number of cores that was asked for.
     *
     * @throws EnvironmentException if they do not fit, saying what would
     */
    void require(int cores) {
        if (cores <= tasks()) {
            return;
        }
        String fits =
                tasks() > 0
                        ? "use --cores " + tasks() + " or less, or MANYSKIES_HEAP="
                        : "set MANYSKIES_HEAP=";
        throw new EnvironmentException(
                String.format(
                        Locale.ROOT,
                        "%s %s of heap (%s for each block in progress, %s shared, %s to"
                                + " spare, and never less than %s); the heap is %s: %s%dm.",
                        cores == 1 ? "1 core needs" : cores + " cores need",
                        text(need(cores)),
                        text(memory.perTask()),
                        text(memory.shared()),
                        text(RESERVE),
                        text(LEAST),
                        text(bytes),
                        fits,
                        (long) Math.ceil(option(need(cores)) / MEBIBYTE)));
    }

    long need(int cores) {
        return Math.max(LEAST, RESERVE + memory.total(cores));
    }

    /**
     * The -Xmx for a heap: the parallel collector keeps a ninth of it, one survivor space, out of
     * what the JVM calls its heap. Measured: 267 of 278, 400 of 450, 911 of 1024, 1821 of 2048 MiB.
     */
    private static double option(long heap) {
        return heap * (9.0 / 8);
    }

    static String text(long bytes) {
        return String.format(Locale.ROOT, "%.0f MiB", bytes / MEBIBYTE);
    }
}
