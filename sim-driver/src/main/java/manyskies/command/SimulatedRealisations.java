package manyskies.command;

import java.nio.file.Path;
import java.util.List;
import manyskies.aggregate.AnalyticBands;
import manyskies.farm.BlockWork;
import manyskies.specification.Specification;

/** The program's own simulations. */
final class SimulatedRealisations implements Realisations {

    @Override
    public BlockWork work(Specification specification) {
        throw missing();
    }

    @Override
    public Memory memory(Specification specification) {
        throw missing();
    }

    @Override
    public AnalyticBands known(Specification specification) {
        throw missing();
    }

    @Override
    public List<Path> writeMaps(Specification specification, int index, Path folder) {
        throw missing();
    }

    @Override
    public String stageTimes(Specification specification) {
        throw missing();
    }

    private static UnsupportedOperationException missing() {
        return new UnsupportedOperationException("manyskies.realisation is not there yet");
    }
}
