package manyskies.realisation;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import manyskies.field.Modes;
import manyskies.result.Block;
import manyskies.result.BlockId;

/** What a block has measured so far; rows and sums in the order of the indices. */
final class Measurements {
    private final Map<String, List<double[]>> columns = new TreeMap<>();
    private final Map<String, double[]> fieldSums = new TreeMap<>();

    void row(String column, double[] bandpowers) {
        columns.computeIfAbsent(column, name -> new ArrayList<>()).add(bandpowers);
    }

    void add(String field, Modes modes, double factor) {
        double[] values = modes.values();
        double[] sum = fieldSums.computeIfAbsent(field, name -> new double[values.length]);
        for (int i = 0; i < values.length; i++) {
            sum[i] += factor * values[i];
        }
    }

    Block block(BlockId id) {
        return Block.of(id, columns, fieldSums);
    }
}
