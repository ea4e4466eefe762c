package manyskies.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunFolderTest {
    private static final Clock CLOCK =
            Clock.fixed(Instant.parse("2026-01-02T03:04:05.678Z"), ZoneOffset.UTC);

    @TempDir private Path parent;

    private Path run() {
        return parent.resolve("runs").resolve("first");
    }

    @Test
    void aNewFolderGetsItsSpecificationAndAnOldOneKeepsIt() throws IOException {
        try (RunFolder folder =
                RunFolder.createOrOpen(run(), "name: a\n", Map.of("spectra.txt", "2 1.0\n"))) {
            assertThat(folder.specification()).contains("name: a\n");
            assertThat(folder.committed()).isEmpty();
        }
        assertThat(run().resolve("spectra.txt")).hasContent("2 1.0\n");
        try (RunFolder folder = RunFolder.createOrOpen(run(), "name: b\n", Map.of())) {
            assertThat(folder.specification()).contains("name: a\n");
            folder.replace("specification.yaml", "name: c\n".getBytes(StandardCharsets.UTF_8));
            assertThat(folder.specification()).contains("name: c\n");
        }
    }

    @Test
    void blocksComeBackInOrder() {
        try (RunFolder folder = RunFolder.open(run())) {
            for (int number : new int[] {2, 0, 10, 1}) {
                folder.commit(TestBlocks.encoded(number));
            }
            folder.commit(TestBlocks.encoded(0)); // again
        }
        RunFolder folder = RunFolder.reading(run());
        assertThat(folder.committed())
                .containsExactly(
                        TestBlocks.id(0), TestBlocks.id(1), TestBlocks.id(2), TestBlocks.id(10));
        assertThat(folder.blocks("data")).extracting(Block::id).isEqualTo(folder.committed());
        assertThat(folder.read(TestBlocks.id(10)).columns().get("tt.auto").get(3))
                .isEqualTo(TestBlocks.block(10).columns().get("tt.auto").get(3));
        assertThatThrownBy(() -> folder.commit(TestBlocks.encoded(3)))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage(run() + " was opened to be read");
    }

    @Test
    void aFolderThatIsNotThereHasNoBlocks() {
        assertThat(RunFolder.reading(run()).committed()).isEmpty();
        assertThat(RunFolder.reading(run()).specification()).isEmpty();
        assertThat(run()).doesNotExist();
    }

    @Test
    void aSecondDriverIsKeptOut() {
        try (RunFolder first = RunFolder.open(run())) {
            assertThatThrownBy(() -> RunFolder.open(run()))
                    .isInstanceOf(RunFolderException.class)
                    .hasMessage(
                            run()
                                    + ": another manyskies is at work in this folder and has locked"
                                    + " .lock. Wait for its end or stop it; 'manyskies status' counts"
                                    + " its blocks.");
            first.commit(TestBlocks.encoded(0));
            assertThat(RunFolder.reading(run()).committed()).hasSize(1);
        }
        RunFolder.open(run()).close();
    }

    /** The lock of a process that was killed is gone. */
    @Test
    void aDriverInAnotherProcessIsKeptOutUntilItIsKilled() throws Exception {
        Path java = Path.of(System.getProperty("java.home"), "bin", "java");
        Process other =
                new ProcessBuilder(
                                java.toString(),
                                "-cp",
                                System.getProperty("java.class.path"),
                                LockHolder.class.getName(),
                                run().toString())
                        .redirectError(ProcessBuilder.Redirect.DISCARD)
                        .start();
        try {
            assertThat(other.getInputStream().read()).isEqualTo('!');
            assertThatThrownBy(() -> RunFolder.open(run()))
                    .isInstanceOf(RunFolderException.class)
                    .hasMessageContaining("another manyskies is at work");
        } finally {
            other.destroyForcibly();
        }
        assertThat(other.waitFor(60, TimeUnit.SECONDS)).isTrue();
        RunFolder.open(run()).close();
    }

    @Test
    void leftoversAreClearedOnOpening() throws IOException {
        try (RunFolder folder = RunFolder.open(run())) {
            folder.commit(TestBlocks.encoded(0));
            folder.journal(CLOCK).line("two\nlines");
        }
        Files.writeString(
                run().resolve("journal.log"), "torn", java.nio.file.StandardOpenOption.APPEND);
        Files.createDirectories(run().resolve("tables"));
        for (String name :
                new String[] {
                    "specification.yaml.7.unfinished",
                    "blocks/data-000001.parquet.7.unfinished",
                    "tables/bandpowers.csv.7.unfinished",
                    "blocks/data-000002.sha256",
                    "fields/data-000003.parquet"
                }) {
            Files.writeString(run().resolve(name), "half");
        }
        RunFolder.open(run()).close();
        try (var all = Files.walk(run())) {
            assertThat(all.filter(Files::isRegularFile).map(run()::relativize).map(Path::toString))
                    .containsExactlyInAnyOrder(
                            ".lock",
                            "journal.log",
                            "blocks/data-000000.parquet",
                            "blocks/data-000000.sha256",
                            "fields/data-000000.parquet");
        }
        assertThat(run().resolve("journal.log")).hasContent("2026-01-02T03:04:05Z two lines\n");
    }

    @Test
    void aBlockThatChangedOnTheWayIsRefused() {
        try (RunFolder folder = RunFolder.open(run())) {
            EncodedBlock block = TestBlocks.encoded(0);
            block.fields()[20] ^= 1;
            assertThatThrownBy(() -> folder.commit(block))
                    .isInstanceOf(RunFolderException.class)
                    .hasMessageStartingWith(
                            "data-000000: its bytes changed between the task and the commit");
            assertThat(folder.committed()).isEmpty();
        }
    }

    @Test
    void aSetWhoseNameIsNoFileNameIsRefused() {
        BlockId id = new BlockId("../x", 0, 0, 1);
        try (RunFolder folder = RunFolder.open(run())) {
            assertThatThrownBy(() -> folder.commit(new EncodedBlock(id, new byte[0], new byte[0])))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessageStartingWith("set '../x': a set's name has lower case letters");
        }
    }

    /** Simulated, for permissions do not bind every user who runs this test. */
    @Test
    void aReadOnlyDiskIsSaidInASentence() {
        FailingFiles files =
                FailingFiles.withError(0, FailingFiles.Moment.BEFORE, "Read-only file system");
        assertThatThrownBy(() -> RunFolder.open(files, run()))
                .isInstanceOf(RunFolderException.class)
                .hasMessage(
                        run()
                                + ": cannot be written, the file system is read-only. What was"
                                + " committed before is kept; allow writing there or choose"
                                + " another folder with --out, then the same command goes on"
                                + " from there.");
    }

    @Test
    void aFolderWithoutPermissionIsSaidInASentence() throws IOException {
        Path closed = Files.createDirectory(parent.resolve("closed"));
        assertThat(closed.toFile().setWritable(false)).isTrue();
        Assumptions.assumeFalse(
                Files.isWritable(closed), "permissions do not bind this user (root?)");
        assertThatThrownBy(() -> RunFolder.open(closed.resolve("run")))
                .isInstanceOf(RunFolderException.class)
                .hasMessageContaining("permission is denied");
    }

    @Test
    void aFileInTheWayIsSaidInASentence() throws IOException {
        Files.writeString(parent.resolve("runs"), "");
        assertThatThrownBy(() -> RunFolder.open(run()))
                .isInstanceOf(RunFolderException.class)
                .hasMessageContaining(": cannot be written, ");
    }

    /** Second method: the usual tool for checksums reads the seals. */
    @Test
    void theUsualToolChecksTheSeals() throws Exception {
        try (RunFolder folder = RunFolder.open(run())) {
            folder.commit(TestBlocks.encoded(0));
            folder.commit(TestBlocks.encoded(1));
        }
        assertThat(sha256sum()).isZero();
        Files.writeString(run().resolve("fields/data-000001.parquet"), "x");
        assertThat(sha256sum()).isNotZero();
    }

    private int sha256sum() throws InterruptedException {
        try {
            return new ProcessBuilder(
                            "sha256sum", "--check", "data-000000.sha256", "data-000001.sha256")
                    .directory(run().resolve("blocks").toFile())
                    .redirectErrorStream(true)
                    .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                    .start()
                    .waitFor();
        } catch (IOException e) {
            return Assumptions.abort("there is no sha256sum here");
        }
    }
}
