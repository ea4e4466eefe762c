package manyskies.command;

import java.nio.file.Path;
import java.util.List;
import manyskies.aggregate.AnalyticBands;
import manyskies.farm.BlockWork;
import manyskies.flat.FlatGrid;
import manyskies.flat.ProductGrid;
import manyskies.realisation.RunModel;
import manyskies.specification.Analysis;
import manyskies.specification.Patch;
import manyskies.specification.Specification;

/** The program's own simulations. */
final class SimulatedRealisations implements Realisations {

    // Arrays of 8 bytes a pixel that are alive at once, in maps and in maps of the grid of
    // products.
    // Measured for a pair of skies and all estimators: 140 MiB a task and 46 MiB shared at 512 x
    // 512
    // pixels (2 and 1 MiB an array), 518 and 185 MiB at 1024 x 1024; these are a seventh or more
    // above.
    private static final long MAPS_PER_TASK = 40;
    private static final long PRODUCTS_PER_TASK = 80;
    private static final long MAPS_SHARED = 12;
    private static final long PRODUCTS_SHARED = 32;

    @Override
    public BlockWork work(Specification specification) {
        return new SimulationWork(specification);
    }

    @Override
    public Memory memory(Specification specification) {
        Patch patch = specification.patch();
        Analysis analysis = specification.analysis();
        FlatGrid grid = new FlatGrid(patch.nx(), patch.ny(), patch.pixel());
        FlatGrid product =
                ProductGrid.of(
                        grid,
                        Math.max(analysis.temperature().lmax(), analysis.polarisation().lmax()),
                        analysis.bands().upper(analysis.bands().count() - 1));
        long map = (long) Double.BYTES * grid.pixels();
        long products = (long) Double.BYTES * product.pixels();
        return new Memory(
                MAPS_PER_TASK * map + PRODUCTS_PER_TASK * products,
                MAPS_SHARED * map + PRODUCTS_SHARED * products);
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
