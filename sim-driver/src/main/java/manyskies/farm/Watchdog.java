package manyskies.farm;

import java.time.Duration;
import java.util.function.Consumer;

/**
 * Sees that there is somebody to compute.
 *
 * <p>When a master goes unreachable a Spark driver waits in its job for many minutes; without an
 * executor for {@link #PATIENCE} the farm gives up instead, with one sentence.
 */
final class Watchdog implements AutoCloseable {
    static final Duration PATIENCE = Duration.ofSeconds(60);
    private static final Duration STEP = Duration.ofSeconds(1);

    private final Cluster cluster;
    private final FarmSettings settings;
    private final Consumer<FarmException> onLoss;
    private final Thread thread = new Thread(this::watch, "cluster-watchdog");

    private Watchdog(Cluster cluster, FarmSettings settings, Consumer<FarmException> onLoss) {
        this.cluster = cluster;
        this.settings = settings;
        this.onLoss = onLoss;
    }

    static Watchdog start(Cluster cluster, FarmSettings settings, Consumer<FarmException> onLoss) {
        Watchdog watchdog = new Watchdog(cluster, settings, onLoss);
        watchdog.thread.setDaemon(true);
        watchdog.thread.start();
        return watchdog;
    }

    private void watch() {
        long idleSteps = 0;
        try {
            while (!cluster.isStopped() && idleSteps < PATIENCE.toSeconds()) {
                Thread.sleep(STEP.toMillis());
                idleSteps = settings.isLocal() || cluster.executors() > 0 ? 0 : idleSteps + 1;
            }
        } catch (InterruptedException e) {
            return; // closed
        }
        onLoss.accept(new FarmException(sentence()));
    }

    private String sentence() {
        return "no host of "
                + settings.masterUrl()
                + " has been computing for "
                + PATIENCE.toSeconds()
                + " s; see that the master and its workers are up. Committed blocks stay, the same"
                + " command resumes.";
    }

    @Override
    public void close() {
        thread.interrupt();
    }
}
