package manyskies.command;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;

/** Runs command lines in this JVM, in a folder of its own. */
final class CommandLineHarness {
    /** A clock that stands still, so that no progress line depends on the machine's load. */
    private static final Clock NOON =
            Clock.fixed(Instant.parse("2026-03-01T12:00:00Z"), ZoneOffset.UTC);

    private final Path folder;
    private Realisations realisations = StandInRealisations.plain();

    CommandLineHarness(Path folder) {
        this.folder = folder;
    }

    CommandLineHarness with(Realisations other) {
        realisations = other;
        return this;
    }

    Ran run(String... arguments) {
        Services services = new Services(() -> realisations, folder, 1L << 30, NOON, false);
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int code = Main.run(services, new PrintWriter(out), new PrintWriter(err), arguments);
        return new Ran(code, out.toString(), err.toString());
    }

    /** Writes a small specification; pixels so coarse that all is done in milliseconds. */
    Path specification(String file, int data, int pairs) throws IOException {
        return specification(file, data, pairs, "6 uK-arcmin");
    }

    Path specification(String file, int data, int pairs, String depth) throws IOException {
        Path spectra = Path.of("../conf/spectra/fiducial_unlensed.txt").toAbsolutePath();
        String text =
                String.join(
                        "\n",
                        "name: small",
                        "spectra: " + spectra,
                        "patch: {pixels: 32, pixel-size: 10 arcmin}",
                        "survey: {noise: {temperature: " + depth + "}}",
                        "analysis: {estimators: [tt, eb]}",
                        "sets: {data: " + data + ", pairs: " + pairs + "}",
                        "block: 4",
                        "");
        return Files.writeString(folder.resolve(file), text);
    }

    /** SHA-256 of every file under blocks, fields and tables of a run, but those set aside. */
    static Map<String, String> digests(Path run) throws IOException {
        Map<String, String> digests = new TreeMap<>();
        for (String part : new String[] {"blocks", "fields", "tables"}) {
            try (Stream<Path> files = Files.walk(run.resolve(part))) {
                for (Path file : files.filter(CommandLineHarness::counts).toList()) {
                    digests.put(run.relativize(file).toString(), sha256(Files.readAllBytes(file)));
                }
            }
        }
        return digests;
    }

    private static boolean counts(Path file) {
        return Files.isRegularFile(file) && !file.toString().endsWith(".damaged");
    }

    private static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }

    /**
     * How a command ended.
     *
     * @param code its exit code
     * @param out standard output
     * @param err standard error
     */
    record Ran(int code, String out, String err) {}
}
