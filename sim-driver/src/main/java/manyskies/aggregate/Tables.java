package manyskies.aggregate;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The tables of a run.
 *
 * @param bands rows of {@code bandpowers.csv}
 * @param covariance of {@code covariance.csv} and {@code covariance.parquet}
 * @param summary of {@code summary.json}
 */
public record Tables(List<BandRow> bands, LabelledCovariance covariance, Summary summary) {

    /** Copies the list. */
    public Tables {
        bands = List.copyOf(bands);
    }

    /** The files: name to bytes. Equal tables have equal bytes. */
    public SortedMap<String, byte[]> files() {
        SortedMap<String, byte[]> files = new TreeMap<>();
        files.put("bandpowers.csv", CsvTables.bandpowers(bands));
        files.put("covariance.csv", CsvTables.covariance(covariance));
        files.put("covariance.parquet", CovarianceParquet.encode(covariance));
        files.put("summary.json", SummaryJson.encode(summary));
        return files;
    }

    /**
     * Writes the files into a folder, which is made if need be. Each replaces an earlier one whole:
     * it is written beside its place, synchronised and renamed.
     *
     * @throws UncheckedIOException if the folder cannot be written
     */
    public void write(Path folder) {
        try {
            Files.createDirectories(folder);
            for (Map.Entry<String, byte[]> file : files().entrySet()) {
                replace(folder, file.getKey(), file.getValue());
            }
        } catch (IOException e) {
            throw new UncheckedIOException(
                    folder + ": tables could not be written; blocks are untouched, aggregate again",
                    e);
        }
    }

    private static void replace(Path folder, String name, byte[] bytes) throws IOException {
        Path beside = folder.resolve("." + name + ".part");
        Files.write(beside, bytes);
        try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE)) {
            channel.force(true);
        }
        Files.move(
                beside,
                folder.resolve(name),
                StandardCopyOption.ATOMIC_MOVE,
                StandardCopyOption.REPLACE_EXISTING);
    }
}
