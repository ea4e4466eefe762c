package manyskies.result;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Blocks whose numbers are made of their indices alone. */
final class TestBlocks {
    static final int COUNT = 4;

    private TestBlocks() {}

    static BlockId id(int number) {
        return new BlockId("data", number, COUNT * number, COUNT);
    }

    static Block block(int number) {
        return block(id(number));
    }

    /** Columns of 3, 2 and no bands, and fields of 5 modes; all doubles are awkward ones. */
    static Block block(BlockId id) {
        Map<String, List<double[]>> columns = new TreeMap<>();
        columns.put("tt.auto", rows(id, 3, 1e-9));
        columns.put("eb.cross_input", rows(id, 2, -1.0 / 3));
        columns.put("input.none", rows(id, 0, 1));
        return Block.of(
                id, columns, Map.of("tt", field(id, 0.1), "eb", field(id, Double.MIN_VALUE)));
    }

    private static List<double[]> rows(BlockId id, int bands, double scale) {
        List<double[]> rows = new ArrayList<>();
        for (int row = 0; row < id.count(); row++) {
            double[] values = new double[bands];
            for (int band = 0; band < bands; band++) {
                values[band] = scale * (id.first() + row + 1) / (band + 7);
            }
            rows.add(values);
        }
        return rows;
    }

    private static double[] field(BlockId id, double scale) {
        double[] field = new double[10];
        for (int i = 0; i < field.length; i++) {
            field[i] = scale * (i - 4) * (id.first() + 1);
        }
        return field;
    }

    static EncodedBlock encoded(int number) {
        return BlockCodec.encode(block(number));
    }
}
