package manyskies.result;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.parquet.column.ColumnReader;
import org.apache.parquet.io.api.RecordConsumer;
import org.apache.parquet.schema.MessageType;
import org.apache.parquet.schema.PrimitiveType.PrimitiveTypeName;
import org.apache.parquet.schema.Types;

/**
 * The file under {@code fields/}: one row per mode.
 *
 * <p>Columns: {@code mode} (int32, from 0), and per field sum {@code name.re} and {@code name.im}.
 */
final class FieldFile {
    private static final String MODE = "mode";
    private static final String REAL = ".re";
    private static final String IMAGINARY = ".im";

    private FieldFile() {}

    static byte[] encode(Block block) {
        int modes = modes(block);
        List<Map.Entry<String, double[]>> fields = List.copyOf(block.fieldSums().entrySet());
        return RowFile.encode(schema(block), modes, (to, row) -> say(to, row, fields));
    }

    private static int modes(Block block) {
        int length =
                block.fieldSums().values().stream()
                        .mapToInt(sum -> sum.length)
                        .findFirst()
                        .orElse(0);
        block.fieldSums()
                .forEach(
                        (name, sum) -> {
                            if (sum.length != length || length % 2 != 0) {
                                throw new IllegalArgumentException(
                                        block.id().stem()
                                                + ": field "
                                                + name
                                                + " has "
                                                + sum.length
                                                + " numbers; all fields have equally many, two per"
                                                + " mode");
                            }
                        });
        return length / 2;
    }

    private static MessageType schema(Block block) {
        Types.MessageTypeBuilder schema = Types.buildMessage();
        schema.required(PrimitiveTypeName.INT32).named(MODE);
        for (String field : block.fieldSums().keySet()) {
            schema.required(PrimitiveTypeName.DOUBLE).named(field + REAL);
            schema.required(PrimitiveTypeName.DOUBLE).named(field + IMAGINARY);
        }
        return schema.named("fields");
    }

    private static void say(RecordConsumer to, int mode, List<Map.Entry<String, double[]>> fields) {
        to.startField(MODE, 0);
        to.addInteger(mode);
        to.endField(MODE, 0);
        int column = 1;
        for (Map.Entry<String, double[]> field : fields) {
            number(to, field.getKey() + REAL, column++, field.getValue()[2 * mode]);
            number(to, field.getKey() + IMAGINARY, column++, field.getValue()[2 * mode + 1]);
        }
    }

    private static void number(RecordConsumer to, String name, int column, double value) {
        to.startField(name, column);
        to.addDouble(value);
        to.endField(name, column);
    }

    /**
     * The field sums of a file.
     *
     * @throws IllegalArgumentException if the bytes are none of such a file
     */
    static Map<String, double[]> decode(byte[] bytes) {
        Map<String, List<double[]>> pieces = new TreeMap<>(); // of the row groups, in order
        ColumnFile.decode(
                bytes,
                schema ->
                        schema.getFields().stream()
                                .skip(1)
                                .forEach(field -> pieces.put(field.getName(), new ArrayList<>())),
                (column, values, count) -> {
                    if (!column.getPath()[0].equals(MODE)) {
                        pieces.get(column.getPath()[0]).add(numbers(values, count));
                    }
                });
        Map<String, double[]> sums = new TreeMap<>();
        for (String name : pieces.keySet()) {
            if (name.endsWith(REAL)) {
                String field = name.substring(0, name.length() - REAL.length());
                sums.put(field, interleave(pieces.get(name), pieces.get(field + IMAGINARY)));
            }
        }
        return sums;
    }

    private static double[] numbers(ColumnReader values, long count) {
        double[] numbers = new double[Math.toIntExact(count)];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = values.getDouble();
            values.consume();
        }
        return numbers;
    }

    private static double[] interleave(List<double[]> real, List<double[]> imaginary) {
        double[] modes = new double[2 * real.stream().mapToInt(piece -> piece.length).sum()];
        int at = 0;
        for (int piece = 0; piece < real.size(); piece++) {
            for (int i = 0; i < real.get(piece).length; i++) {
                modes[at++] = real.get(piece)[i];
                modes[at++] = imaginary.get(piece)[i];
            }
        }
        return modes;
    }
}
