package manyskies.result;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;

/**
 * Files that stand whole under their names or not at all: written beside, synced, renamed, and the
 * folder synced.
 */
public final class AtomicFile {
    /** Ends the names of files that are being written. */
    static final String UNFINISHED = ".unfinished";

    private static final FileSystemOperations LOCAL = new LocalFiles();

    private AtomicFile() {}

    /** Something that writes itself to a stream. */
    @FunctionalInterface
    public interface Content {
        /** Writes all of it; does not close the stream. */
        void writeTo(OutputStream out) throws IOException;
    }

    /**
     * Writes a file or replaces it; makes its folder.
     *
     * @throws RunFolderException if it cannot be written; what stood there before is kept
     */
    public static void write(Path file, byte[] bytes) {
        write(file, out -> out.write(bytes));
    }

    /**
     * Writes a file or replaces it, from a stream; makes its folder.
     *
     * @throws RunFolderException if it cannot be written; what stood there before is kept
     */
    public static void write(Path file, Content content) {
        write(LOCAL, file, content);
    }

    static void write(FileSystemOperations files, Path file, Content content) {
        try {
            Path folder = file.toAbsolutePath().getParent();
            files.makeFolder(folder);
            Path beside = stage(files, file, content);
            publish(files, beside, file);
            files.sync(folder);
        } catch (IOException e) {
            throw RunFolderException.writing(file, e);
        }
    }

    /** Writes beside the target; removes what it wrote if that fails. */
    static Path stage(FileSystemOperations files, Path file, Content content) throws IOException {
        Path beside = beside(file);
        try {
            files.write(beside, content::writeTo);
        } catch (IOException e) {
            clear(files, beside, e);
            throw e;
        }
        return beside;
    }

    /** Renames to the target; removes what stood beside if that fails. */
    static void publish(FileSystemOperations files, Path beside, Path file) throws IOException {
        try {
            files.rename(beside, file);
        } catch (IOException e) {
            clear(files, beside, e);
            throw e;
        }
    }

    /** Opening the run folder clears what is left if even this fails. */
    static void clear(FileSystemOperations files, Path beside, IOException reason) {
        try {
            files.delete(beside);
        } catch (IOException e) {
            reason.addSuppressed(e);
        }
    }

    /** Two programs that write one table at a time, which is allowed, do not share this file. */
    private static Path beside(Path file) {
        return file.resolveSibling(
                file.getFileName() + "." + ProcessHandle.current().pid() + UNFINISHED);
    }
}
