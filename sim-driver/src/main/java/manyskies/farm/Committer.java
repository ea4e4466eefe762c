package manyskies.farm;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Queue;
import manyskies.farm.TaskOutcome.Failed;
import manyskies.farm.TaskOutcome.Finished;

/**
 * The one thread that commits blocks.
 *
 * <p>Spark's scheduler thread only enqueues. After the first commit that fails nothing more is
 * committed: the disk is full or gone, and a later success would hide it.
 */
final class Committer implements AutoCloseable {
    private final BlockSink sink;
    private final Progress progress;
    private final Runnable onFailure;
    private final Thread thread = new Thread(this::work, "block-committer");

    // guarded by this
    private final Queue<TaskOutcome> arrived = new ArrayDeque<>();
    private final List<BlockFailure> failures = new ArrayList<>();
    private int committed;
    private boolean closed;
    private RuntimeException commitFailure;

    private Committer(BlockSink sink, Progress progress, Runnable onFailure) {
        this.sink = sink;
        this.progress = progress;
        this.onFailure = onFailure;
    }

    static Committer start(BlockSink sink, Progress progress, Runnable onFailure) {
        Committer committer = new Committer(sink, progress, onFailure);
        committer.thread.setDaemon(true);
        committer.thread.start();
        return committer;
    }

    /** Hands over an outcome; never waits. */
    synchronized void accept(TaskOutcome outcome) {
        arrived.add(outcome);
        notifyAll();
    }

    /** Waits until at most {@code limit} outcomes wait to be committed. */
    synchronized void awaitRoom(int limit) throws InterruptedException {
        while (arrived.size() > limit && commitFailure == null) {
            wait();
        }
    }

    /** Commits everything that has arrived, then ends the thread. */
    @Override
    public void close() {
        synchronized (this) {
            closed = true;
            notifyAll();
        }
        joinThread();
    }

    private void joinThread() {
        boolean interrupted = false;
        while (thread.isAlive()) {
            try {
                thread.join();
            } catch (InterruptedException e) {
                interrupted = true; // a commit is never left half done
            }
        }
        if (interrupted) {
            Thread.currentThread().interrupt();
        }
    }

    synchronized int committed() {
        return committed;
    }

    synchronized List<BlockFailure> failures() {
        return List.copyOf(failures);
    }

    synchronized Optional<RuntimeException> commitFailure() {
        return Optional.ofNullable(commitFailure);
    }

    private void work() {
        for (Optional<TaskOutcome> next = take(); next.isPresent(); next = take()) {
            settle(next.get());
        }
    }

    private synchronized Optional<TaskOutcome> take() {
        while (arrived.isEmpty() && !closed) {
            try {
                wait();
            } catch (InterruptedException e) {
                throw new IllegalStateException("nobody interrupts the committer", e);
            }
        }
        Optional<TaskOutcome> next = Optional.ofNullable(arrived.poll());
        notifyAll();
        return next;
    }

    private void settle(TaskOutcome outcome) {
        if (outcome instanceof Finished finished) {
            commit(finished);
        } else if (outcome instanceof Failed failed) {
            synchronized (this) {
                failures.add(failed.failure());
            }
            progress.blockFailed(failed.failure());
        }
    }

    private void commit(Finished finished) {
        if (commitFailure().isPresent()) {
            return;
        }
        try {
            sink.commit(finished.block());
        } catch (RuntimeException e) {
            synchronized (this) {
                commitFailure = e;
                notifyAll();
            }
            onFailure.run();
            return;
        }
        synchronized (this) {
            committed++;
        }
        progress.blockDone(finished.block().id());
    }
}
