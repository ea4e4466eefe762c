package manyskies.sky;

import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.SpectraReader;
import manyskies.spectrum.Spectrum;

/** The fiducial spectra of {@code conf/spectra}, for tests. */
public final class Tables {
    private static final Spectra UNLENSED = read(Path.of("../conf/spectra/fiducial_unlensed.txt"));

    private Tables() {}

    /** The unlensed fiducial table. */
    public static Spectra unlensed() {
        return UNLENSED;
    }

    private static Spectra read(Path table) {
        try (Reader text = Files.newBufferedReader(table)) {
            return SpectraReader.unlensed().read(text, table.toString());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The same with all spectra times a factor. */
    static Spectra times(Spectra spectra, double factor) {
        Spectra out = spectra;
        for (Spectrum name : Spectrum.values()) {
            double[] scaled = Arrays.stream(spectra.values(name)).map(c -> factor * c).toArray();
            out = out.with(Map.of(name, scaled));
        }
        return out;
    }

    /** The same with B modes, of a tenth of E's power. */
    static Spectra withCurl(Spectra spectra) {
        double[] b = Arrays.stream(spectra.values(Spectrum.EE)).map(c -> 0.1 * c).toArray();
        return spectra.with(Map.of(Spectrum.BB, b));
    }
}
