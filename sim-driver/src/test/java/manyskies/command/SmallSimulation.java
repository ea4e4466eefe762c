package manyskies.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Collectors;

/**
 * The program's own simulations on a small and coarse patch, with all estimators: some tenths of a
 * second a realisation.
 */
final class SmallSimulation {
    private static final Path TABLE = Path.of("../conf/spectra/fiducial_unlensed.txt");
    private static final int LMAX = 1600; // of the table here; its lensing takes a second, not ten

    /** Every key written out; edits of it make the faulty files. */
    static final String SPECIFICATION =
            """
            name: small
            seed: 41
            spectra: table.txt
            patch:
              pixels: 128
              pixel-size: 4 arcmin
            survey:
              beam: 3 arcmin
              noise:
                temperature: {depth: 5 uK-arcmin, knee: 300, slope: 2}
                polarisation: 7 uK-arcmin
              splits: 1
              edge-taper: none
              curl: 0
              spline-degree: 5
            analysis:
              temperature: {lmin: 100, lmax: 1500}
              polarisation: {lmin: 100, lmax: 1500}
              weights: lensed-gradient
              estimators: [tt, te, tb, ee, eb, mv, joint]
              bands: {from: 50, to: 1050, width: 200}
            sets:
              data: 16
              pairs: 8
            block: 4
            """;

    private SmallSimulation() {}

    /** A folder with small.yaml, half.yaml (half the data), and the table they name. */
    static CommandLineHarness in(Path folder) throws IOException {
        Files.writeString(folder.resolve("table.txt"), table());
        Files.writeString(folder.resolve("small.yaml"), SPECIFICATION);
        Files.writeString(
                folder.resolve("half.yaml"), SPECIFICATION.replace("data: 16", "data: 8"));
        return new CommandLineHarness(folder).with(new SimulatedRealisations());
    }

    /** The fiducial table up to l = 1600. */
    static String table() throws IOException {
        return Files.readAllLines(TABLE).stream()
                .filter(line -> line.startsWith("#") || multipole(line) <= LMAX)
                .collect(Collectors.joining("\n", "", "\n"));
    }

    private static int multipole(String row) {
        return Integer.parseInt(row.substring(0, row.indexOf(' ')));
    }
}
