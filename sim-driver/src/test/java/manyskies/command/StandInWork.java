package manyskies.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import manyskies.farm.BlockWork;
import manyskies.flat.FlatGrid;
import manyskies.result.Block;
import manyskies.result.BlockCodec;
import manyskies.result.BlockId;
import manyskies.result.EncodedBlock;
import manyskies.specification.Patch;
import manyskies.specification.Specification;

/**
 * Blocks of the right shape whose numbers are a hash of their address: cheap, and another index or
 * another order of summation would show in the last bit.
 *
 * @param specification what is run
 * @param milliseconds how long a realisation takes
 * @param failing index of data that fails, or -1
 */
record StandInWork(Specification specification, long milliseconds, int failing)
        implements BlockWork {

    @Override
    public EncodedBlock run(BlockId id) {
        Map<String, List<double[]>> columns = new TreeMap<>();
        Map<String, double[]> sums = new TreeMap<>();
        for (int index = id.first(); index < id.first() + id.count(); index++) {
            takeTime();
            if (id.set().equals(Plan.DATA) && index == failing) {
                throw new IllegalStateException("realisation " + index + " of set data failed");
            }
            realise(id.set(), index, columns, sums);
        }
        return BlockCodec.encode(Block.of(id, columns, sums));
    }

    private void takeTime() {
        try {
            Thread.sleep(milliseconds);
        } catch (InterruptedException e) {
            throw new IllegalStateException("nobody interrupts a task", e);
        }
    }

    private void realise(
            String set,
            int index,
            Map<String, List<double[]>> columns,
            Map<String, double[]> sums) {
        if (set.equals(Plan.DATA)) {
            add(columns, "input.auto", set, index);
        }
        for (String estimator : specification.analysis().estimators()) {
            if (set.equals(Plan.PAIRS)) {
                add(columns, estimator + ".n0_mc", set, index);
                continue;
            }
            for (String quantity : List.of("auto", "cross_input", "curl_auto", "curl_cross")) {
                add(columns, estimator + "." + quantity, set, index);
            }
            double[] field = numbers(estimator + set + index, 2 * grid().size());
            double[] sum = sums.computeIfAbsent(estimator, name -> new double[field.length]);
            for (int i = 0; i < field.length; i++) {
                sum[i] += field[i];
            }
        }
    }

    private void add(Map<String, List<double[]>> columns, String name, String set, int index) {
        columns.computeIfAbsent(name, key -> new ArrayList<>())
                .add(numbers(name + set + index, specification.analysis().bands().count()));
    }

    FlatGrid grid() {
        Patch patch = specification.patch();
        return new FlatGrid(patch.nx(), patch.ny(), patch.pixel());
    }

    /** Numbers in (0, 1], a multiplicative hash of name and position. */
    static double[] numbers(String name, int count) {
        double[] numbers = new double[count];
        long state = name.hashCode();
        for (int i = 0; i < count; i++) {
            state = state * 6364136223846793005L + 1442695040888963407L;
            numbers[i] = ((state >>> 11) + 1) * 0x1p-53;
        }
        return numbers;
    }
}
