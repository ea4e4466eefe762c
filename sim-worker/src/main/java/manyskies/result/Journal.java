package manyskies.result;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.temporal.ChronoUnit;

/** What ran where and when: lines at the end of {@code journal.log}, each with its time in UTC. */
public final class Journal {
    private final FileSystemOperations files;
    private final Path file;
    private final Clock clock;

    Journal(FileSystemOperations files, Path file, Clock clock) {
        this.files = files;
        this.file = file;
        this.clock = clock;
    }

    /**
     * Adds a line; line breaks in the text become spaces.
     *
     * @throws RunFolderException if it cannot be written
     */
    public synchronized void line(String text) {
        String line =
                clock.instant().truncatedTo(ChronoUnit.SECONDS)
                        + " "
                        + text.replaceAll("\\R", " ")
                        + "\n";
        try {
            files.append(file, line.getBytes(StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw RunFolderException.writing(file, e);
        }
    }

    /** Cuts off a last line that was not finished. */
    static void cutTornTail(FileSystemOperations files, Path file) throws IOException {
        if (!Files.exists(file)) {
            return;
        }
        byte[] bytes = Files.readAllBytes(file);
        int end = bytes.length;
        while (end > 0 && bytes[end - 1] != '\n') {
            end--;
        }
        if (end < bytes.length) {
            files.truncate(file, end);
        }
    }
}
