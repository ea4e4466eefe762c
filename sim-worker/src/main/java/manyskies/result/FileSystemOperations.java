package manyskies.result;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;

/** The steps by which files change; a seam, so that tests can let each of them fail. */
interface FileSystemOperations {

    /** What goes into a file. */
    @FunctionalInterface
    interface Content {
        void writeTo(OutputStream out) throws IOException;
    }

    /** Makes a folder and those above it; harmless if it is there. */
    void makeFolder(Path folder) throws IOException;

    /** Writes a new file or one anew, and waits until the disk has it. */
    void write(Path file, Content content) throws IOException;

    /** Adds to the end of a file, made if need be. */
    void append(Path file, byte[] bytes) throws IOException;

    /** Cuts a file. */
    void truncate(Path file, long size) throws IOException;

    /** Renames within a folder, replacing what stands there; nobody sees a state between. */
    void rename(Path from, Path to) throws IOException;

    /** Waits until the disk has the folder's names. */
    void sync(Path folder) throws IOException;

    /** Deletes a file; harmless if there is none. */
    void delete(Path file) throws IOException;
}
