package manyskies.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import manyskies.aggregate.AnalyticBands;
import manyskies.farm.BlockWork;
import manyskies.specification.Analysis;
import manyskies.specification.Specification;

/**
 * Realisations of {@link StandInWork}.
 *
 * @param milliseconds how long one takes
 * @param failing index of data that fails, or -1
 * @param perTask memory it claims to need
 */
record StandInRealisations(long milliseconds, int failing, long perTask) implements Realisations {

    static StandInRealisations plain() {
        return new StandInRealisations(0, -1, 1 << 20);
    }

    @Override
    public BlockWork work(Specification specification) {
        return new StandInWork(specification, milliseconds, failing);
    }

    @Override
    public Memory memory(Specification specification) {
        return new Memory(perTask, 0);
    }

    @Override
    public AnalyticBands known(Specification specification) {
        Analysis analysis = specification.analysis();
        Map<String, double[]> vectors = new HashMap<>();
        for (String name : analysis.estimators()) {
            for (String quantity : List.of("response", "n0_analytic", "curl_n0_analytic")) {
                String column = name + "." + quantity;
                vectors.put(column, StandInWork.numbers(column, analysis.bands().count()));
            }
        }
        return AnalyticBands.of(
                analysis.estimators(),
                analysis.bands(),
                new StandInWork(specification, 0, -1).grid(),
                vectors);
    }

    @Override
    public List<Path> writeMaps(Specification specification, int index, Path folder) {
        try {
            Files.createDirectories(folder);
            return List.of(Files.writeString(folder.resolve("sky.txt"), "sky " + index));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public String stageTimes(Specification specification) {
        return "stages of " + specification.name() + "\n";
    }
}
