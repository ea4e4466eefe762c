package manyskies.result;

import java.io.ByteArrayInputStream;
import org.apache.parquet.io.DelegatingSeekableInputStream;
import org.apache.parquet.io.InputFile;
import org.apache.parquet.io.SeekableInputStream;

/** A Parquet file in memory, to be read. */
final class MemoryInput implements InputFile {
    private final byte[] bytes;

    MemoryInput(byte[] bytes) {
        this.bytes = bytes;
    }

    @Override
    public long getLength() {
        return bytes.length;
    }

    @Override
    public SeekableInputStream newStream() {
        Cursor cursor = new Cursor(bytes);
        return new DelegatingSeekableInputStream(cursor) {
            @Override
            public long getPos() {
                return cursor.position();
            }

            @Override
            public void seek(long position) {
                cursor.seek(position);
            }
        };
    }

    /** Lets the stream's position be seen and set. */
    private static final class Cursor extends ByteArrayInputStream {
        Cursor(byte[] bytes) {
            super(bytes);
        }

        int position() {
            return pos;
        }

        void seek(long position) {
            pos = Math.toIntExact(position);
        }
    }
}
