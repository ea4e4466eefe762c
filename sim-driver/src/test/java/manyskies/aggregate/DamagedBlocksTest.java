package manyskies.aggregate;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.spectrum.Bands;
import org.junit.jupiter.api.Test;

/** Blocks that do not fit their run: each is named, with what was found and what mends it. */
class DamagedBlocksTest {
    private static final SyntheticRun RUN = SyntheticRun.of(1, 15, 5);

    private static void refused(Iterable<Block> data, String... sentence) {
        var thrown =
                assertThatThrownBy(
                                () ->
                                        new Aggregation(RUN.facts(), SyntheticRun.known())
                                                .of(set -> set.equals("data") ? data : List.of()))
                        .isInstanceOf(IllegalArgumentException.class);
        for (String part : sentence) {
            thrown.hasMessageContaining(part);
        }
    }

    private static List<Block> data() {
        List<Block> data = new ArrayList<>(RUN.blocks());
        data.removeIf(block -> !block.id().set().equals("data"));
        return data;
    }

    @Test
    void blocksOutOfOrder() {
        List<Block> data = data();
        data.add(data.remove(0));
        refused(data, "data-000000 begins at realisation 0, after data-000002 with 10 to 14;");
    }

    @Test
    void blocksThatShareARealisation() {
        List<Block> data = data();
        Block second = data.get(1);
        BlockId id = new BlockId("data", 1, 4, 5);
        data.set(1, Block.of(id, second.columns(), second.fieldSums()));
        refused(
                data,
                "data-000001 begins at realisation 4, after data-000000 with 0 to 4;",
                "share no realisation");
    }

    @Test
    void aBlockOfAnotherSet() {
        refused(
                RUN.blocks().subList(2, 4),
                "pairs-000000 was handed over as a block of the set data");
    }

    @Test
    void aBlockWithOtherColumns() {
        List<Block> data = data();
        Map<String, List<double[]>> columns = new TreeMap<>(data.get(2).columns());
        columns.remove("tt.auto");
        data.set(2, Block.of(data.get(2).id(), columns, data.get(2).fieldSums()));
        refused(
                data,
                "data-000002 has the columns [eb.auto, ",
                "the blocks before it [",
                "delete this block and run again");
    }

    @Test
    void aBlockWithOtherBands() {
        List<Block> data = data();
        Map<String, List<double[]>> columns = new TreeMap<>(data.get(1).columns());
        List<double[]> rows = new ArrayList<>();
        columns.get("eb.auto").forEach(row -> rows.add(new double[] {1, 2}));
        columns.put("eb.auto", rows);
        data.set(1, Block.of(data.get(1).id(), columns, data.get(1).fieldSums()));
        refused(
                data,
                "data-000001: column eb.auto has 2 bandpowers, the run has 3 bands; delete this");
    }

    @Test
    void aBlockWithFieldsOfAnotherPatch() {
        List<Block> data = data();
        Map<String, double[]> fields = new TreeMap<>(data.get(1).fieldSums());
        fields.put("tt", new double[10]);
        data.set(1, Block.of(data.get(1).id(), data.get(1).columns(), fields));
        refused(data, "data-000001: field tt has 10 numbers, the run's patch needs 168; delete");
        fields.remove("tt");
        data.set(1, Block.of(data.get(1).id(), data.get(1).columns(), fields));
        refused(data, "data-000001 has the fields [eb], the blocks before it [eb, tt]; delete");
    }

    @Test
    void computedNumbersThatDoNotFit() {
        assertThatThrownBy(() -> known(new double[2]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("tt.response has 2 numbers, the run has 3 bands");
        assertThatThrownBy(() -> known(new double[] {1, Double.NaN, 1}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("tt.response is NaN in band 1; it is finite");
    }

    private static AnalyticBands known(double[] response) {
        return AnalyticBands.of(
                List.of("tt"),
                Bands.between(40, 120, 200, 300),
                SyntheticRun.GRID,
                Map.of("tt.response", response));
    }
}
