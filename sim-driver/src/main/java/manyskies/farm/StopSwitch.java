package manyskies.farm;

import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;

/** Asks a farm to end early and cleanly; once thrown it stays thrown. */
public final class StopSwitch {
    private final AtomicBoolean stopped = new AtomicBoolean();
    private final AtomicReference<Runnable> action = new AtomicReference<>(StopSwitch::nothing);

    private static void nothing() {}

    /** Throws the switch; returns at once. */
    public void stop() {
        if (stopped.compareAndSet(false, true)) {
            action.get().run();
        }
    }

    /** Whether it was thrown. */
    public boolean stopped() {
        return stopped.get();
    }

    /** What to do when it is thrown, done at once if it was. */
    void onStop(Runnable newAction) {
        action.set(newAction);
        if (stopped()) {
            newAction.run();
        }
    }
}
