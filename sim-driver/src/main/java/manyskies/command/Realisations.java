package manyskies.command;

import java.nio.file.Path;
import java.util.List;
import manyskies.aggregate.AnalyticBands;
import manyskies.farm.BlockWork;
import manyskies.specification.Specification;

/** What the commands ask of the code of one realisation; tests put a stand-in here. */
interface Realisations {

    /** The work of a farm. */
    BlockWork work(Specification specification);

    /** Memory that one block in progress needs, in bytes, and what all share. */
    Memory memory(Specification specification);

    /** What is known without any sky: responses, analytic noise. */
    AnalyticBands known(Specification specification);

    /**
     * Writes the maps of one realisation.
     *
     * @return the files written
     */
    List<Path> writeMaps(Specification specification, int index, Path folder);

    /** The table of stages, times and transforms of a realisation, ready to print. */
    String stageTimes(Specification specification);

    /**
     * Bytes.
     *
     * @param perTask for each block in progress
     * @param shared once for the JVM
     */
    record Memory(long perTask, long shared) {
        long total(int tasks) {
            return shared + tasks * perTask;
        }
    }
}
