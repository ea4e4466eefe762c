package manyskies.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import java.util.SplittableRandom;
import manyskies.command.CommandLineHarness.Ran;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Invariant: every file of blocks, fields and tables of simulated skies has the same SHA-256 whatever
 * the cores, the folder, interruptions, growth or damage. The reference is one run on one core.
 */
class BitIdentityTest {
    private static final long SEED = 20261201;
    private static final int TABLES = 6;
    private static final int KILLED = 137; // 128 + SIGKILL

    @TempDir private static Path folder;
    private static CommandLineHarness manyskies;
    private static Map<String, String> reference;

    @BeforeAll
    static void runOnOneCore() throws IOException {
        manyskies = SmallSimulation.in(folder);
        ok("run", "small.yaml", "--cores", "1", "--out", "reference");
        reference = digests("reference");
    }

    private static Ran ok(String... arguments) {
        Ran ran = manyskies.run(arguments);
        assertThat(ran.code()).as(ran.err()).isZero();
        return ran;
    }

    private static Map<String, String> digests(String run) throws IOException {
        return CommandLineHarness.digests(folder.resolve(run));
    }

    @Test
    void everyBlockAndTableIsCompared() {
        assertThat(reference).hasSize(6 * 3 + TABLES);
        assertThat(reference.keySet())
                .contains(
                        "blocks/data-000003.parquet",
                        "blocks/data-000003.sha256",
                        "fields/data-000003.parquet",
                        "blocks/pairs-000001.parquet",
                        "tables/bandpowers.csv",
                        "tables/covariance.csv",
                        "tables/covariance.parquet",
                        "tables/summary.json");
    }

    /** So that the comparison is seen to see something. */
    @Test
    void anotherSeedGivesOtherBytesInEveryFile() throws IOException {
        String other = SmallSimulation.SPECIFICATION.replace("seed: 41", "seed: 42");
        Files.writeString(folder.resolve("other.yaml"), other);
        ok("run", "other.yaml", "--cores", "2", "--out", "other");
        Map<String, String> digests = digests("other");
        assertThat(digests).hasSameSizeAs(reference);
        digests.forEach(
                (file, digest) -> {
                    if (!file.startsWith("fields/pairs")) { // pairs have no fields
                        assertThat(digest).as(file).isNotEqualTo(reference.get(file));
                    }
                });
    }

    @Test
    void twoCoresInAnotherFolder() throws IOException {
        ok("run", "small.yaml", "--cores", "2", "--out", "elsewhere/two cores");
        assertThat(digests("elsewhere/two cores")).isEqualTo(reference);
    }

    @Test
    void halfOfItThenExtended() throws IOException {
        ok("run", "half.yaml", "--cores", "2", "--out", "grown");
        assertThat(digests("grown")).hasSize(4 * 3 + TABLES);
        Ran extended = ok("run", "small.yaml", "--cores", "2", "--out", "grown");
        assertThat(extended.out()).contains("2 blocks run");
        assertThat(digests("grown")).isEqualTo(reference);
    }

    /** In JVMs of their own, whose compilers see other histories than this one's. */
    @Test
    void killedThreeTimesAtRandomMomentsAndResumed() throws IOException, InterruptedException {
        SplittableRandom moments = new SplittableRandom(SEED);
        killAfter(0, moments.nextInt(1000));
        killAfter(1, moments.nextInt(200));
        killAfter(2 + moments.nextInt(2), moments.nextInt(200));
        ChildProgram last = start();
        assertThat(last.exitCode()).as(last.error()).isZero();
        assertThat(digests("killed")).isEqualTo(reference);
    }

    private static ChildProgram start() throws IOException {
        return ChildProgram.start(
                Main.class, folder, "run", "small.yaml", "--cores", "2", "--out", "killed");
    }

    /** Kills a run so many milliseconds after so many blocks stand. */
    private static void killAfter(int blocks, int milliseconds)
            throws IOException, InterruptedException {
        ChildProgram child = start();
        child.awaitBlocks(folder.resolve("killed"), blocks);
        Thread.sleep(milliseconds);
        child.kill();
        assertThat(child.exitCode()).as("ended before it was killed").isEqualTo(KILLED);
    }

    /** What may befall a file; aggregate names it and changes nothing, run computes it again. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "truncated blocks/data-000001.parquet",
                "flipped fields/data-000002.parquet",
                "deleted blocks/pairs-000001.sha256"
            })
    void damageIsNamedAndMended(String damage) throws IOException {
        String kind = damage.substring(0, damage.indexOf(' '));
        String file = damage.substring(kind.length() + 1);
        String run = "damaged-" + kind + file.replaceAll("[^a-z]+", "-");
        copyOfReference(run);
        damage(folder.resolve(run).resolve(file), kind);
        Map<String, String> damaged = digests(run);

        Ran aggregate = manyskies.run("aggregate", run);
        assertThat(aggregate.code()).isEqualTo(ExitCode.ENVIRONMENT.code());
        assertThat(aggregate.err().lines()).hasSize(1);
        assertThat(aggregate.err()).contains(Path.of(file).getFileName().toString());
        assertThat(digests(run)).isEqualTo(damaged);

        Ran mended = ok("run", "small.yaml", "--cores", "2", "--out", run);
        assertThat(mended.err().lines()).hasSize(1);
        assertThat(mended.err())
                .contains(folder.resolve(run).resolve(file).toString())
                .contains("it will be computed again");
        assertThat(mended.out()).contains("1 block run");
        assertThat(digests(run)).isEqualTo(reference);
    }

    @ParameterizedTest
    @CsvSource({"deleted, bandpowers.csv", "flipped, covariance.parquet"})
    void aTableThatIsLostOrChangedIsMadeAgain(String kind, String table) throws IOException {
        String run = "table-" + kind;
        copyOfReference(run);
        damage(folder.resolve(run).resolve("tables").resolve(table), kind);
        Ran mended = ok("run", "small.yaml", "--out", run);
        assertThat(mended.out()).contains("Nothing was left to run");
        assertThat(digests(run)).isEqualTo(reference);
    }

    private static void copyOfReference(String run) throws IOException {
        Path from = folder.resolve("reference");
        try (var paths = Files.walk(from)) {
            for (Path path : paths.toList()) {
                Files.copy(path, folder.resolve(run).resolve(from.relativize(path).toString()));
            }
        }
    }

    private static void damage(Path file, String kind) throws IOException {
        byte[] bytes = Files.readAllBytes(file);
        switch (kind) {
            case "truncated" -> Files.write(file, Arrays.copyOf(bytes, bytes.length / 2));
            case "deleted" -> Files.delete(file);
            default -> {
                bytes[bytes.length / 2] ^= 1;
                Files.write(file, bytes);
            }
        }
    }
}
