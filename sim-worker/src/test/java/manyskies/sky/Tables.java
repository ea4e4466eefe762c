package manyskies.sky;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/** The fiducial spectra of {@code conf/spectra}, for tests. */
public final class Tables {
    private Tables() {}

    /** The unlensed fiducial table. */
    public static Spectra unlensed() {
        try {
            return read(Files.readAllLines(Path.of("../conf/spectra/fiducial_unlensed.txt")));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Spectra read(List<String> lines) {
        List<String[]> rows =
                lines.stream()
                        .filter(line -> !line.startsWith("#"))
                        .map(line -> line.trim().split("\\s+", -1))
                        .toList();
        int lmax = Integer.parseInt(rows.get(rows.size() - 1)[0]);
        Map<Spectrum, double[]> table = new EnumMap<>(Spectrum.class);
        Spectrum[] columns = {
            Spectrum.TT,
            Spectrum.EE,
            Spectrum.BB,
            Spectrum.TE,
            Spectrum.PP,
            Spectrum.TP,
            Spectrum.EP
        };
        for (int c = 0; c < columns.length; c++) {
            double[] values = new double[lmax + 1];
            for (String[] row : rows) {
                values[Integer.parseInt(row[0])] = Double.parseDouble(row[c + 1]);
            }
            table.put(columns[c], values);
        }
        return Spectra.of(lmax, table);
    }
}
