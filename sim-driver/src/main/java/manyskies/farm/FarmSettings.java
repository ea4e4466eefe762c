package manyskies.farm;

import java.util.Optional;

/**
 * Where the farm runs.
 *
 * @param cores blocks computed at a time; on a cluster, blocks of one Spark job
 * @param master a Spark master's URL, or empty for this JVM
 */
public record FarmSettings(int cores, Optional<String> master) {

    /**
     * Checks the number of cores.
     *
     * @throws IllegalArgumentException if it is not positive
     */
    public FarmSettings {
        if (cores < 1) {
            throw new IllegalArgumentException(
                    "--cores is " + cores + "; at least one core is needed");
        }
    }

    /** This JVM. */
    public static FarmSettings local(int cores) {
        return new FarmSettings(cores, Optional.empty());
    }

    /** Spark's master URL; local tasks get three tries, of which only failing I/O makes use. */
    public String masterUrl() {
        return master.orElse("local[" + cores + ",3]");
    }

    /** Whether tasks run in this JVM. */
    public boolean isLocal() {
        return masterUrl().startsWith("local");
    }
}
