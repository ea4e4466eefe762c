package manyskies.realisation;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import manyskies.specification.Analysis;
import manyskies.specification.MultipoleRange;
import manyskies.specification.Noise;
import manyskies.specification.Patch;
import manyskies.specification.Sets;
import manyskies.specification.Specification;
import manyskies.specification.Survey;
import manyskies.specification.Weights;
import manyskies.spectrum.Bands;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.SpectraReader;

/** An invented deep survey on a small patch, quick enough for tests. */
final class SmallRun {
    static final List<String> ALL = List.of("tt", "te", "tb", "ee", "eb", "mv", "joint");
    static final Bands BANDS = Bands.between(100, 300, 600, 1000, 1500);

    private static final double ARCMIN = Math.PI / 180 / 60;
    private static final Spectra FIDUCIAL = fiducial();

    private SmallRun() {}

    static Specification with(double taper, double curl, List<String> estimators) {
        return new Specification(
                "small",
                20261201,
                new Patch(256, 256, 2 * ARCMIN),
                FIDUCIAL,
                "fiducial",
                new Survey(
                        1.5 * ARCMIN,
                        Noise.white(3 * ARCMIN),
                        Noise.white(4.2 * ARCMIN),
                        1,
                        taper,
                        curl,
                        5),
                new Analysis(
                        new MultipoleRange(100, 3000),
                        new MultipoleRange(100, 3000),
                        Weights.LENSED_GRADIENT,
                        estimators,
                        BANDS),
                new Sets(64, 32),
                8);
    }

    private static Spectra fiducial() {
        Path file = Path.of("..", "conf", "spectra", "fiducial_unlensed.txt");
        try (var reader = Files.newBufferedReader(file)) {
            return SpectraReader.unlensed().read(reader, file.toString());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
