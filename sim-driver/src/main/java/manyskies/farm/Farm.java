package manyskies.farm;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Queue;
import java.util.concurrent.atomic.AtomicReference;
import manyskies.result.BlockId;

/**
 * Computes blocks with Spark, a task per block, and commits them with one thread.
 *
 * <p>Blocks go out in small jobs of one block per core, two jobs at a time: the second fills the
 * cores while the first drains, and what is computed but not yet committed stays bounded. Results
 * come back to this JVM, so that no shared disk is needed. The order in which blocks finish is
 * nobody's business: a block's bytes depend on its id alone.
 *
 * <p>Not reusable: one farm, one run.
 */
public final class Farm {
    private static final int JOBS_AT_A_TIME = 2;

    private final FarmSettings settings;
    private final BlockTask task;
    private final StopSwitch stop;
    private final Queue<BlockId> waiting;
    private final AtomicReference<Throwable> sparkFailure = new AtomicReference<>();
    private volatile boolean giveUp;

    private Farm(FarmSettings settings, List<BlockId> blocks, BlockWork work, StopSwitch stop) {
        this.settings = settings;
        this.task = new BlockTask(work);
        this.stop = stop;
        this.waiting = new ArrayDeque<>(blocks);
    }

    /**
     * Computes and commits the blocks; returns when all are done or the switch is thrown.
     *
     * <p>A block whose work throws is reported and the others go on. With nothing to do Spark is not
     * started.
     *
     * @throws FarmException if Spark does not start, loses its hosts or gives a task up
     * @throws RuntimeException whatever the sink throws; blocks committed before it stand
     */
    public static FarmResult run(
            FarmSettings settings,
            List<BlockId> blocks,
            BlockWork work,
            BlockSink sink,
            Progress progress,
            StopSwitch stop) {
        if (blocks.isEmpty()) {
            return FarmResult.NOTHING_TO_DO;
        }
        return new Farm(settings, blocks, work, stop).run(blocks.size(), sink, progress);
    }

    private FarmResult run(int total, BlockSink sink, Progress progress) {
        try (Cluster cluster = Cluster.start(settings)) {
            Committer committer =
                    Committer.start(sink, progress, () -> abandon(cluster)); // closed below
            stop.onStop(() -> abandon(cluster));
            Watchdog watchdog = Watchdog.start(cluster, settings, this::lost);
            try {
                submitAll(cluster, committer);
            } finally {
                watchdog.close();
                committer.close();
            }
            return result(total, committer);
        }
    }

    private FarmResult result(int total, Committer committer) {
        Optional<RuntimeException> commitFailure = committer.commitFailure();
        if (commitFailure.isPresent()) {
            throw commitFailure.get();
        }
        int settled = committer.committed() + committer.failures().size();
        boolean stopped = stop.stopped() && settled < total;
        if (sparkFailure.get() != null && !stopped) {
            throw lostWork(committer.committed(), total, sparkFailure.get());
        }
        return new FarmResult(committer.committed(), committer.failures(), stopped);
    }

    private static FarmException lostWork(int committed, int total, Throwable cause) {
        if (cause instanceof FarmException lost) {
            return lost;
        }
        String first = String.valueOf(cause.getMessage()).lines().findFirst().orElse("");
        return new FarmException(
                "Spark gave up: "
                        + first
                        + "; "
                        + committed
                        + " of "
                        + total
                        + " blocks were committed and stay, the same command resumes",
                cause);
    }

    private void submitAll(Cluster cluster, Committer committer) {
        List<Thread> submitters = new ArrayList<>();
        for (int i = 0; i < JOBS_AT_A_TIME; i++) {
            Thread thread = new Thread(() -> submit(cluster, committer), "job-submitter-" + i);
            thread.setDaemon(true);
            thread.start();
            submitters.add(thread);
        }
        for (Thread thread : submitters) {
            join(thread, cluster);
        }
    }

    /** A host that is lost can leave a job waiting for ever: then its thread is left behind. */
    private void join(Thread thread, Cluster cluster) {
        try {
            while (thread.isAlive() && !(giveUp && !isEnding(thread))) {
                thread.join(100);
            }
        } catch (InterruptedException e) {
            stop.stop();
            abandon(cluster);
            Thread.currentThread().interrupt();
        }
    }

    private static boolean isEnding(Thread thread) throws InterruptedException {
        thread.join(2000);
        return !thread.isAlive();
    }

    private void submit(Cluster cluster, Committer committer) {
        try {
            for (List<BlockId> job = nextJob(); !job.isEmpty(); job = nextJob()) {
                cluster.run(job, task, committer::accept);
                committer.awaitRoom(settings.cores());
            }
        } catch (Exception e) { // Spark's are checked in fact though not in signature
            if (!giveUp) {
                sparkFailure.compareAndSet(null, e);
                abandon(cluster);
            }
        }
    }

    private List<BlockId> nextJob() {
        List<BlockId> job = new ArrayList<>();
        synchronized (waiting) {
            while (!giveUp && job.size() < settings.cores() && !waiting.isEmpty()) {
                job.add(waiting.remove());
            }
        }
        return job;
    }

    private void lost(FarmException why) {
        sparkFailure.compareAndSet(null, why);
        giveUp = true;
    }

    private void abandon(Cluster cluster) {
        giveUp = true;
        cluster.cancel();
    }
}
