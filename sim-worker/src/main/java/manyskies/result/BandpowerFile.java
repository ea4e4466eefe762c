package manyskies.result;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.parquet.column.ColumnDescriptor;
import org.apache.parquet.column.ColumnReader;
import org.apache.parquet.io.api.Binary;
import org.apache.parquet.io.api.RecordConsumer;
import org.apache.parquet.schema.LogicalTypeAnnotation;
import org.apache.parquet.schema.MessageType;
import org.apache.parquet.schema.PrimitiveType.PrimitiveTypeName;
import org.apache.parquet.schema.Type;
import org.apache.parquet.schema.Types;

/**
 * The file under {@code blocks/}: one row per realisation.
 *
 * <p>Columns: {@code set} (text), {@code index} (int32), and per column of the block, in the order
 * of their names, a list of doubles, one per band.
 */
final class BandpowerFile {
    private static final String SET = "set";
    private static final String INDEX = "index";
    private static final String LIST = "list"; // these two names are the format's own
    private static final String ELEMENT = "element";

    private BandpowerFile() {}

    static byte[] encode(Block block) {
        Binary set = Binary.fromString(block.id().set());
        return RowFile.encode(
                schema(block),
                block.id().count(),
                (to, row) -> {
                    field(to, SET, 0, () -> to.addBinary(set));
                    field(to, INDEX, 1, () -> to.addInteger(block.id().first() + row));
                    int column = 2;
                    for (Map.Entry<String, List<double[]>> entry : block.columns().entrySet()) {
                        list(to, entry.getKey(), column++, entry.getValue().get(row));
                    }
                });
    }

    private static MessageType schema(Block block) {
        Types.MessageTypeBuilder schema = Types.buildMessage();
        schema.required(PrimitiveTypeName.BINARY).as(LogicalTypeAnnotation.stringType()).named(SET);
        schema.required(PrimitiveTypeName.INT32).named(INDEX);
        for (String column : block.columns().keySet()) {
            schema.addField(
                    Types.list(Type.Repetition.REQUIRED)
                            .requiredElement(PrimitiveTypeName.DOUBLE)
                            .named(column));
        }
        return schema.named("bandpowers");
    }

    private static void list(RecordConsumer to, String name, int column, double[] values) {
        to.startField(name, column);
        to.startGroup();
        if (values.length > 0) {
            to.startField(LIST, 0);
            for (double value : values) {
                to.startGroup();
                field(to, ELEMENT, 0, () -> to.addDouble(value));
                to.endGroup();
            }
            to.endField(LIST, 0);
        }
        to.endGroup();
        to.endField(name, column);
    }

    private static void field(RecordConsumer to, String name, int column, Runnable value) {
        to.startField(name, column);
        value.run();
        to.endField(name, column);
    }

    /**
     * The columns of a file.
     *
     * @throws IllegalArgumentException if the bytes are none of such a file, or of another block's
     */
    static Map<String, List<double[]>> decode(BlockId id, byte[] bytes) {
        Map<String, List<double[]>> columns = new TreeMap<>();
        int[] rows = new int[1]; // of the row groups so far
        ColumnFile.decode(
                bytes,
                schema ->
                        schema.getFields().stream()
                                .skip(2)
                                .forEach(field -> columns.put(field.getName(), new ArrayList<>())),
                (column, values, count) -> {
                    String name = column.getPath()[0];
                    if (name.equals(SET)) {
                        requireSet(id, values, count);
                    } else if (name.equals(INDEX)) {
                        rows[0] = requireIndices(id, rows[0], values, count);
                    } else {
                        columns.get(name).addAll(lists(column, values, count));
                    }
                });
        if (rows[0] != id.count()) {
            throw new IllegalArgumentException(
                    id.stem() + " has " + rows[0] + " realisations, expected " + id.count());
        }
        return columns;
    }

    private static void requireSet(BlockId id, ColumnReader values, long count) {
        for (long i = 0; i < count; i++) {
            String set = values.getBinary().toStringUsingUTF8();
            if (!set.equals(id.set())) {
                throw new IllegalArgumentException(id.stem() + " holds the set " + set);
            }
            values.consume();
        }
    }

    private static int requireIndices(BlockId id, int before, ColumnReader values, long count) {
        int row = before;
        for (long i = 0; i < count; i++) {
            int index = values.getInteger();
            if (index != id.first() + row) {
                throw new IllegalArgumentException(
                        id.stem()
                                + " has realisation "
                                + index
                                + " in row "
                                + row
                                + ", expected "
                                + (id.first() + row));
            }
            values.consume();
            row++;
        }
        return row;
    }

    /** A list begins at repetition level 0; an empty one has no value, hence a lower definition. */
    private static List<double[]> lists(ColumnDescriptor column, ColumnReader values, long count) {
        List<List<Double>> lists = new ArrayList<>();
        for (long i = 0; i < count; i++) {
            if (values.getCurrentRepetitionLevel() == 0) {
                lists.add(new ArrayList<>());
            }
            if (values.getCurrentDefinitionLevel() == column.getMaxDefinitionLevel()) {
                lists.get(lists.size() - 1).add(values.getDouble());
            }
            values.consume();
        }
        return lists.stream()
                .map(list -> list.stream().mapToDouble(Double::doubleValue).toArray())
                .toList();
    }
}
