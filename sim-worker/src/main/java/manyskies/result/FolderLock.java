package manyskies.result;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/**
 * Keeps a second driver out of a run folder: the operating system's lock on {@code RUN/.lock}, which
 * ends with the process, however that ends. The file itself stays.
 */
final class FolderLock implements AutoCloseable {
    private final FileChannel channel;

    private FolderLock(FileChannel channel) {
        this.channel = channel;
    }

    /**
     * Takes the lock.
     *
     * @throws RunFolderException if another driver has it, or there can be none
     */
    static FolderLock take(Path run) {
        Path file = run.resolve(".lock");
        try {
            return take(run, file);
        } catch (IOException e) {
            throw RunFolderException.writing(file, e);
        }
    }

    private static FolderLock take(Path run, Path file) throws IOException {
        FileChannel channel =
                FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        boolean locked = false;
        try {
            locked = tryLock(channel);
        } finally {
            if (!locked) {
                channel.close();
            }
        }
        if (!locked) {
            throw new RunFolderException(
                    run
                            + ": another manyskies is at work in this folder and has locked "
                            + file.getFileName()
                            + ". Wait for its end or stop it; 'manyskies status' counts its blocks.");
        }
        return new FolderLock(channel);
    }

    private static boolean tryLock(FileChannel channel) throws IOException {
        try {
            return channel.tryLock() != null;
        } catch (OverlappingFileLockException e) { // this very process holds it
            return false;
        }
    }

    @Override
    public void close() {
        try {
            channel.close();
        } catch (IOException e) {
            throw new RunFolderException("the lock of the run folder cannot be released", e);
        }
    }
}
