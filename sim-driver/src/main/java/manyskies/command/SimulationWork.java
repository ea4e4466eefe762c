package manyskies.command;

import java.util.Queue;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ConcurrentMap;
import manyskies.farm.BlockWork;
import manyskies.realisation.BlockRunner;
import manyskies.realisation.RunModel;
import manyskies.result.Block;
import manyskies.result.BlockCodec;
import manyskies.result.BlockId;
import manyskies.result.EncodedBlock;
import manyskies.specification.Specification;
import manyskies.specification.SpecificationHash;

/**
 * A block of simulated skies.
 *
 * <p>Only the specification travels. A JVM makes the model of a run once and keeps it, with the
 * runners that are idle; a runner serves one block at a time.
 *
 * @param specification what is run
 */
record SimulationWork(Specification specification) implements BlockWork {
    private static final ConcurrentMap<String, Bench> BENCHES = new ConcurrentHashMap<>();

    @Override
    public EncodedBlock run(BlockId id) {
        Bench bench = bench(specification);
        BlockRunner runner = bench.take();
        Block block = runner.run(id);
        bench.idle.add(runner); // not after a failure: its scratch may be half written
        return BlockCodec.encode(block);
    }

    /** The model of a run in this JVM. */
    static RunModel model(Specification specification) {
        return bench(specification).model;
    }

    private static Bench bench(Specification specification) {
        return BENCHES.computeIfAbsent(
                SpecificationHash.identity(specification),
                identity -> new Bench(RunModel.of(specification)));
    }

    private static final class Bench {
        private final RunModel model;
        private final Queue<BlockRunner> idle = new ConcurrentLinkedQueue<>();

        Bench(RunModel model) {
            this.model = model;
        }

        BlockRunner take() {
            BlockRunner runner = idle.poll();
            return runner == null ? BlockRunner.of(model) : runner;
        }
    }
}
