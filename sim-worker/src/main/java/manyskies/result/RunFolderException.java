package manyskies.result;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.util.Locale;

/**
 * A run folder that cannot be used or written: the message names the file, what stands in the way,
 * what is kept and how to go on.
 */
public class RunFolderException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    RunFolderException(String message) {
        super(message);
    }

    RunFolderException(String message, IOException cause) {
        super(message, cause);
    }

    /** A file that could not be written. */
    static RunFolderException writing(Path file, IOException cause) {
        return new RunFolderException(
                file
                        + ": cannot be written, "
                        + reason(cause)
                        + ". What was committed before is kept; "
                        + mend(cause)
                        + ", then the same command goes on from there.",
                cause);
    }

    /** A file that could not be read. */
    static RunFolderException reading(Path file, IOException cause) {
        return new RunFolderException(
                file + ": cannot be read, " + reason(cause) + ". Nothing was changed.", cause);
    }

    private static String reason(IOException cause) {
        if (isFull(cause)) {
            return "the disk or the quota is full";
        }
        if (isReadOnly(cause)) {
            return "the file system is read-only";
        }
        if (cause instanceof AccessDeniedException) {
            return "permission is denied";
        }
        if (cause instanceof NoSuchFileException) {
            return "its folder or it itself is gone";
        }
        if (cause instanceof FileAlreadyExistsException || cause instanceof NotDirectoryException) {
            return "a file stands where a folder should be";
        }
        return cause instanceof FileSystemException file && file.getReason() != null
                ? file.getReason()
                : String.valueOf(cause.getMessage());
    }

    private static String mend(IOException cause) {
        if (isFull(cause)) {
            return "make room";
        }
        if (isReadOnly(cause) || cause instanceof AccessDeniedException) {
            return "allow writing there or choose another folder with --out";
        }
        if (cause instanceof FileAlreadyExistsException || cause instanceof NotDirectoryException) {
            return "move it away or choose another folder with --out";
        }
        return "see to the disk";
    }

    /** Java has no type for these two; the words are the operating system's. */
    private static boolean isFull(IOException cause) {
        String text = words(cause);
        return text.contains("no space left") || text.contains("quota exceeded");
    }

    private static boolean isReadOnly(IOException cause) {
        return words(cause).contains("read-only file system");
    }

    private static String words(IOException cause) {
        return String.valueOf(cause.getMessage()).toLowerCase(Locale.ROOT);
    }
}
