package manyskies.result;

import java.io.IOException;
import java.util.function.Consumer;
import org.apache.parquet.ParquetReadOptions;
import org.apache.parquet.column.ColumnDescriptor;
import org.apache.parquet.column.ColumnReader;
import org.apache.parquet.column.impl.ColumnReadStoreImpl;
import org.apache.parquet.column.page.PageReadStore;
import org.apache.parquet.conf.PlainParquetConfiguration;
import org.apache.parquet.example.data.simple.convert.GroupRecordConverter;
import org.apache.parquet.hadoop.ParquetFileReader;
import org.apache.parquet.schema.MessageType;

/** Reads the bytes of a Parquet file column by column, without objects per row. */
final class ColumnFile {

    /** Takes the values of one column, row group after row group. */
    interface Columns {
        /** A reader at the first of {@code count} values. */
        void column(ColumnDescriptor column, ColumnReader values, long count);
    }

    private ColumnFile() {}

    /**
     * Reads all columns.
     *
     * @param schema told first
     * @throws IllegalArgumentException if the bytes are no Parquet file
     */
    static void decode(byte[] bytes, Consumer<MessageType> schema, Columns columns) {
        ParquetReadOptions options =
                ParquetReadOptions.builder(new PlainParquetConfiguration()).build();
        try (ParquetFileReader file = ParquetFileReader.open(new MemoryInput(bytes), options)) {
            schema.accept(file.getFileMetaData().getSchema());
            for (PageReadStore group = file.readNextRowGroup();
                    group != null;
                    group = file.readNextRowGroup()) {
                read(file, group, columns);
            }
        } catch (IOException e) {
            throw new IllegalArgumentException("no readable Parquet file: " + e.getMessage(), e);
        }
    }

    private static void read(ParquetFileReader file, PageReadStore group, Columns columns) {
        MessageType schema = file.getFileMetaData().getSchema();
        ColumnReadStoreImpl store =
                new ColumnReadStoreImpl(
                        group,
                        new GroupRecordConverter(schema).getRootConverter(),
                        schema,
                        file.getFileMetaData().getCreatedBy());
        for (ColumnDescriptor column : schema.getColumns()) {
            long count = group.getPageReader(column).getTotalValueCount();
            columns.column(column, store.getColumnReader(column), count);
        }
    }
}
