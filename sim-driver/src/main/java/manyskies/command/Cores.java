package manyskies.command;

import java.io.PrintWriter;
import java.util.Optional;
import manyskies.farm.FarmSettings;
import picocli.CommandLine.Option;

/** The options that say where a farm runs. */
final class Cores {
    @Option(
            names = "--cores",
            paramLabel = "N",
            description =
                    "blocks computed at a time; by default all cores of this machine whose blocks"
                            + " fit into the heap")
    private Optional<Integer> cores = Optional.empty();

    @Option(
            names = "--master",
            paramLabel = "URL",
            description = "a Spark master, for example spark://host:7077; by default this process")
    private Optional<String> master = Optional.empty();

    /**
     * The settings, with what fits into the heap.
     *
     * @throws InputException if the number of cores is not positive
     * @throws EnvironmentException if the heap is too small for the cores asked for, or for one
     */
    FarmSettings settings(Heap heap, PrintWriter notes) {
        int all = Runtime.getRuntime().availableProcessors();
        int wanted = cores.orElse(all);
        if (wanted < 1) {
            throw new InputException("--cores is " + wanted + "; at least one core is needed.");
        }
        master.ifPresent(Cores::requireMaster);
        FarmSettings settings = new FarmSettings(wanted, master);
        if (!settings.isLocal()) {
            return settings; // the executors' memory is the cluster's business
        }
        if (cores.isPresent() || heap.tasks() == 0) {
            heap.require(wanted);
        }
        if (wanted <= heap.tasks()) {
            return settings;
        }
        notes.println(
                heap.tasks()
                        + " of "
                        + all
                        + " cores are used: the blocks of more do not fit into the heap ("
                        + Heap.text(heap.bytes())
                        + ", set by MANYSKIES_HEAP).");
        return FarmSettings.local(heap.tasks());
    }

    private static void requireMaster(String url) {
        if (!url.matches("(spark|k8s)://.+|yarn|local.*")) {
            throw new InputException(
                    "--master is '"
                            + url
                            + "'; write the URL of a Spark master, for example"
                            + " spark://host:7077, or leave it out.");
        }
    }
}
