package manyskies.result;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.parquet.conf.PlainParquetConfiguration;
import org.apache.parquet.example.data.Group;
import org.apache.parquet.example.data.simple.SimpleGroupFactory;
import org.apache.parquet.hadoop.ParquetWriter;
import org.apache.parquet.hadoop.example.ExampleParquetWriter;
import org.apache.parquet.hadoop.metadata.CompressionCodecName;
import org.apache.parquet.io.api.Binary;
import org.apache.parquet.schema.LogicalTypeAnnotation;
import org.apache.parquet.schema.MessageType;
import org.apache.parquet.schema.PrimitiveType.PrimitiveTypeName;
import org.apache.parquet.schema.Types;

/**
 * A small table of whole numbers, numbers and texts as the bytes of a Parquet file.
 *
 * <p>All columns are required. Uncompressed, default encodings, so that any reader
 * opens it; equal rows give equal bytes.
 */
public final class ParquetTable {
    private final Types.MessageTypeBuilder schema = Types.buildMessage();
    private final String name;

    private ParquetTable(String name) {
        this.name = name;
    }

    /** Begins a table of the given name; columns follow. */
    public static ParquetTable withColumns(String name) {
        return new ParquetTable(name);
    }

    /** Adds a column of whole numbers, 64 bits. */
    public ParquetTable integer(String column) {
        schema.required(PrimitiveTypeName.INT64).named(column);
        return this;
    }

    /** Adds a column of double-precision numbers. */
    public ParquetTable number(String column) {
        schema.required(PrimitiveTypeName.DOUBLE).named(column);
        return this;
    }

    /** Adds a column of texts, UTF-8. */
    public ParquetTable text(String column) {
        schema.required(PrimitiveTypeName.BINARY)
                .as(LogicalTypeAnnotation.stringType())
                .named(column);
        return this;
    }

    /** The columns are complete; rows follow. */
    public Rows rows() {
        return new Rows(schema.named(name));
    }

    /** Rows of a table, in order; they are encoded as they come. */
    public static final class Rows {
        private final MessageType schema;
        private final SimpleGroupFactory groups;
        private final MemoryOutput memory = new MemoryOutput();
        private final ParquetWriter<Group> writer;

        private Rows(MessageType schema) {
            this.schema = schema;
            groups = new SimpleGroupFactory(schema);
            try {
                writer =
                        ExampleParquetWriter.builder(memory)
                                .withConf(new PlainParquetConfiguration())
                                .withType(schema)
                                .withCompressionCodec(CompressionCodecName.UNCOMPRESSED)
                                .build();
            } catch (IOException e) { // memory does not fail
                throw new UncheckedIOException(e);
            }
        }

        /**
         * Adds a row.
         *
         * @param values one Long, Double or String per column, as the columns were declared
         * @throws IllegalArgumentException if there is not one value of the right kind per column
         */
        public void add(Object... values) {
            if (values.length != schema.getFieldCount()) {
                throw new IllegalArgumentException(
                        "a row of "
                                + schema.getName()
                                + " has "
                                + schema.getFieldCount()
                                + " columns, found "
                                + values.length
                                + " values");
            }
            Group group = groups.newGroup();
            for (int column = 0; column < values.length; column++) {
                put(group, column, values[column]);
            }
            try {
                writer.write(group);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }

        private void put(Group group, int column, Object value) {
            PrimitiveTypeName kind =
                    schema.getType(column).asPrimitiveType().getPrimitiveTypeName();
            if (value instanceof Long whole && kind == PrimitiveTypeName.INT64) {
                group.add(column, whole.longValue());
            } else if (value instanceof Double number && kind == PrimitiveTypeName.DOUBLE) {
                group.add(column, number.doubleValue());
            } else if (value instanceof String text && kind == PrimitiveTypeName.BINARY) {
                group.add(column, Binary.fromString(text));
            } else {
                throw new IllegalArgumentException(
                        "column "
                                + schema.getFieldName(column)
                                + " of "
                                + schema.getName()
                                + " is of kind "
                                + kind
                                + ", found "
                                + value);
            }
        }

        /** The bytes of the file; no row can follow. */
        public byte[] encode() {
            try {
                writer.close();
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
            return memory.bytes();
        }
    }
}
