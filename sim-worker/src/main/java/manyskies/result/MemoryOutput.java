package manyskies.result;

import java.io.ByteArrayOutputStream;
import org.apache.parquet.io.OutputFile;
import org.apache.parquet.io.PositionOutputStream;

/** A Parquet file in memory. */
final class MemoryOutput implements OutputFile {
    private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();

    /** The finished file. */
    byte[] bytes() {
        return CanonicalFooter.of(bytes.toByteArray());
    }

    @Override
    public PositionOutputStream create(long blockSizeHint) {
        return createOrOverwrite(blockSizeHint);
    }

    @Override
    public PositionOutputStream createOrOverwrite(long blockSizeHint) {
        bytes.reset();
        return new PositionOutputStream() {
            @Override
            public long getPos() {
                return bytes.size();
            }

            @Override
            public void write(int value) {
                bytes.write(value);
            }

            @Override
            public void write(byte[] from, int offset, int length) {
                bytes.write(from, offset, length);
            }
        };
    }

    @Override
    public boolean supportsBlockSize() {
        return false;
    }

    @Override
    public long defaultBlockSize() {
        return 0;
    }
}
