package manyskies.command;

import java.nio.file.Path;
import java.util.List;
import manyskies.aggregate.AnalyticBands;
import manyskies.farm.BlockWork;
import manyskies.realisation.RunModel;
import manyskies.specification.Patch;
import manyskies.specification.Specification;

/** The program's own simulations. */
final class SimulatedRealisations implements Realisations {

    /** Maps of 8 bytes a pixel that a block in progress and its encoding hold; counted generously. */
    private static final long MAPS_PER_TASK = 64;

    /** Likewise what the model of a run holds: weights, responses, filters. */
    private static final long MAPS_SHARED = 48;

    @Override
    public BlockWork work(Specification specification) {
        return new SimulationWork(specification);
    }

    @Override
    public Memory memory(Specification specification) {
        Patch patch = specification.patch();
        long map = (long) Double.BYTES * patch.nx() * patch.ny();
        return new Memory(MAPS_PER_TASK * map, MAPS_SHARED * map);
    }

    @Override
    public AnalyticBands known(Specification specification) {
        RunModel model = SimulationWork.model(specification);
        return AnalyticBands.of(
                specification.analysis().estimators(),
                specification.analysis().bands(),
                model.reconstructed(),
                model.analytic());
    }

    @Override
    public List<Path> writeMaps(Specification specification, int index, Path folder) {
        return new SkyMaps(SimulationWork.model(specification)).write(index, folder);
    }

    @Override
    public String stageTimes(Specification specification) {
        return new StageTimes(SimulationWork.model(specification)).table();
    }
}
