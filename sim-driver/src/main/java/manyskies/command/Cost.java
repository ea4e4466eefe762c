package manyskies.command;

import java.time.Duration;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Map;
import manyskies.farm.BlockWork;
import manyskies.result.BlockId;

/**
 * Seconds per realisation of each set, measured on one thread after a warm-up.
 *
 * @param seconds set to seconds
 * @param timed how many realisations were timed of each set
 */
record Cost(Map<String, Double> seconds, int timed) {
    private static final int WARM_UP = 2;
    private static final int TIMED = 3;

    static Cost measure(BlockWork work, Plan plan) {
        Map<String, Double> seconds = new LinkedHashMap<>();
        for (String set : plan.sets()) {
            realise(work, set, WARM_UP);
            long start = System.nanoTime();
            realise(work, set, TIMED);
            seconds.put(set, (System.nanoTime() - start) * 1e-9 / TIMED);
        }
        return new Cost(seconds, TIMED);
    }

    private static void realise(BlockWork work, String set, int count) {
        for (int index = 0; index < count; index++) {
            work.run(new BlockId(set, index, index, 1));
        }
    }

    /** How long these blocks take on so many cores, if cores do not hinder each other. */
    Duration of(Collection<BlockId> blocks, int cores) {
        double total = blocks.stream().mapToDouble(id -> id.count() * seconds.get(id.set())).sum();
        return Duration.ofMillis(Math.round(1000 * total / cores));
    }
}
