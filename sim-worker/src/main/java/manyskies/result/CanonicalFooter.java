package manyskies.result;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.parquet.format.ColumnChunk;
import org.apache.parquet.format.ColumnMetaData;
import org.apache.parquet.format.FileMetaData;
import org.apache.parquet.format.PageEncodingStats;
import org.apache.parquet.format.RowGroup;
import org.apache.parquet.format.Util;

/**
 * The same table, the same bytes, in every JVM.
 *
 * <p>Parquet's writer lists the encodings of a column in the order of a hash set of enums, which
 * differs from one JVM to the next. The footer is written anew with these lists sorted; the order
 * means nothing to a reader. A file ends with footer, its length (4 bytes, little endian), PAR1.
 */
final class CanonicalFooter {
    private static final int TAIL = 8;

    private CanonicalFooter() {}

    /** The file with a sorted footer. */
    static byte[] of(byte[] file) {
        ByteBuffer bytes = ByteBuffer.wrap(file).order(ByteOrder.LITTLE_ENDIAN);
        int length = bytes.getInt(file.length - TAIL);
        int start = file.length - TAIL - length;
        try {
            byte[] footer = sorted(new ByteArrayInputStream(file, start, length));
            ByteBuffer out = ByteBuffer.allocate(start + footer.length + TAIL);
            out.order(ByteOrder.LITTLE_ENDIAN).put(file, 0, start).put(footer);
            out.putInt(footer.length).put(file, file.length - 4, 4);
            return out.array();
        } catch (IOException e) { // memory does not fail
            throw new UncheckedIOException(e);
        }
    }

    private static byte[] sorted(ByteArrayInputStream footer) throws IOException {
        FileMetaData meta = Util.readFileMetaData(footer);
        for (RowGroup group : meta.getRow_groups()) {
            for (ColumnChunk chunk : group.getColumns()) {
                sort(chunk.getMeta_data());
            }
        }
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        Util.writeFileMetaData(meta, out);
        return out.toByteArray();
    }

    private static void sort(ColumnMetaData column) {
        column.setEncodings(column.getEncodings().stream().sorted().toList());
        if (column.isSetEncoding_stats()) {
            List<PageEncodingStats> stats = new ArrayList<>(column.getEncoding_stats());
            stats.sort(
                    Comparator.comparing(PageEncodingStats::getPage_type)
                            .thenComparing(PageEncodingStats::getEncoding));
            column.setEncoding_stats(stats);
        }
    }
}
