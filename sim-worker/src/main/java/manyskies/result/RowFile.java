package manyskies.result;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Map;
import org.apache.hadoop.conf.Configuration;
import org.apache.parquet.conf.ParquetConfiguration;
import org.apache.parquet.conf.PlainParquetConfiguration;
import org.apache.parquet.hadoop.ParquetWriter;
import org.apache.parquet.hadoop.api.WriteSupport;
import org.apache.parquet.hadoop.metadata.CompressionCodecName;
import org.apache.parquet.io.api.RecordConsumer;
import org.apache.parquet.schema.MessageType;

/**
 * Writes rows as the bytes of a Parquet file, without objects per row.
 *
 * <p>Plain encoding, no dictionary, no compression: noise does not compress, any reader opens the
 * file, no native library is loaded, and equal rows give equal bytes.
 */
final class RowFile {

    /** Says one row, field after field in the schema's order. */
    interface Row {
        void say(RecordConsumer to, int row);
    }

    private RowFile() {}

    static byte[] encode(MessageType schema, int rows, Row content) {
        MemoryOutput memory = new MemoryOutput();
        try (ParquetWriter<Integer> writer = new Builder(memory, schema, content).build()) {
            for (int row = 0; row < rows; row++) {
                writer.write(row);
            }
        } catch (IOException e) { // memory does not fail
            throw new UncheckedIOException(e);
        }
        return memory.bytes();
    }

    private static final class Builder extends ParquetWriter.Builder<Integer, Builder> {
        private final Support support;

        Builder(MemoryOutput memory, MessageType schema, Row content) {
            super(memory);
            support = new Support(schema, content);
            withConf(new PlainParquetConfiguration());
            withCompressionCodec(CompressionCodecName.UNCOMPRESSED);
            withDictionaryEncoding(false);
        }

        @Override
        protected Builder self() {
            return this;
        }

        @Override
        @SuppressWarnings("deprecation") // abstract, so it must be there; never called
        protected WriteSupport<Integer> getWriteSupport(Configuration unused) {
            return support;
        }

        @Override
        protected WriteSupport<Integer> getWriteSupport(ParquetConfiguration unused) {
            return support;
        }
    }

    /** A record is the number of its row. */
    private static final class Support extends WriteSupport<Integer> {
        private final MessageType schema;
        private final Row content;
        private RecordConsumer to;

        Support(MessageType schema, Row content) {
            this.schema = schema;
            this.content = content;
        }

        @Override
        @SuppressWarnings("deprecation") // abstract, so it must be there; never called
        public WriteContext init(Configuration unused) {
            return new WriteContext(schema, Map.of());
        }

        @Override
        public WriteContext init(ParquetConfiguration unused) {
            return new WriteContext(schema, Map.of());
        }

        @Override
        public void prepareForWrite(RecordConsumer consumer) {
            to = consumer;
        }

        @Override
        public void write(Integer row) {
            to.startMessage();
            content.say(to, row);
            to.endMessage();
        }
    }
}
