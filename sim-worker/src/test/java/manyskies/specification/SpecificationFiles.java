package manyskies.specification;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.SpectraWriter;
import manyskies.spectrum.Spectrum;

/** A folder with a small table of spectra, for files of specifications beside it. */
final class SpecificationFiles {
    static final Set<String> ESTIMATORS = Set.of("tt", "te", "tb", "ee", "eb", "mv", "joint");

    /** Every key written out; edits of it make the faulty files. */
    static final String FULL =
            """
            name: trial
            seed: 7
            spectra: table.txt
            patch:
              pixels: [256, 240]
              pixel-size: 2 arcmin
            survey:
              beam: 1.5 arcmin
              noise:
                temperature: {depth: 5 uK-arcmin, knee: 800, slope: 3}
                polarisation: 7.07 uK-arcmin
              splits: 2
              edge-taper: 1 deg
              curl: 0.5
              spline-degree: 7
            analysis:
              temperature: {lmin: 100, lmax: 3000}
              polarisation: {lmin: 200, lmax: 2500}
              weights: lensed
              estimators: [tt, eb, mv]
              bands: {from: 50, to: 1550, width: 100}
            sets:
              data: 128
              pairs: 64
            block: 16
            """;

    /** What has no default. */
    static final String SHORTEST =
            """
            spectra: table.txt
            patch:
              pixels: 256
              pixel-size: 2 arcmin
            survey:
              noise:
                temperature: 5 uK-arcmin
            sets:
              data: 64
            """;

    private final Path folder;

    SpecificationFiles(Path folder) {
        this.folder = folder;
        write("table.txt", SpectraWriter.write(spectra(4000), List.of()));
    }

    /** Made-up smooth spectra, positive definite at every l, with no simple decimals. */
    static Spectra spectra(int lmax) {
        Map<Spectrum, double[]> values = new EnumMap<>(Spectrum.class);
        double[] tt = new double[lmax + 1];
        double[] ee = new double[lmax + 1];
        double[] te = new double[lmax + 1];
        double[] pp = new double[lmax + 1];
        for (int l = 2; l <= lmax; l++) {
            tt[l] = 1e3 / l / (l + 1.0);
            ee[l] = 1e1 / l / (l + 1.0);
            te[l] = 1e1 / l / (l + 1.0) / 3;
            pp[l] = 1e-7 / l / l / (l + 1.0);
        }
        values.put(Spectrum.TT, tt);
        values.put(Spectrum.EE, ee);
        values.put(Spectrum.TE, te);
        values.put(Spectrum.PP, pp);
        return Spectra.of(lmax, values);
    }

    Path write(String name, String text) {
        try {
            return Files.writeString(folder.resolve(name), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    Specification read(String text) throws SpecificationException {
        return SpecificationReader.read(write("sky.yaml", text), ESTIMATORS);
    }

    /** The faults of a text; none if it is read. */
    List<Fault> faults(String text) {
        try {
            read(text);
            return List.of();
        } catch (SpecificationException e) {
            return e.faults();
        }
    }
}
