package manyskies.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class AtomicFileTest {
    @TempDir private Path folder;

    @Test
    void makesItsFolderAndReplacesWhatStands() throws IOException {
        Path file = folder.resolve("tables/a.csv");
        AtomicFile.write(file, new byte[] {1, 2});
        AtomicFile.write(file, out -> out.write(new byte[] {3}));
        assertThat(file).hasBinaryContent(new byte[] {3});
        assertOnly(file);
    }

    /** Steps: make folder, write, rename, sync. */
    @ParameterizedTest
    @EnumSource
    void aFailureAtAnyStepLeavesOneOrTheOther(FailingFiles.Moment moment) throws IOException {
        Path file = folder.resolve("tables/a.csv");
        for (int step = 0; step < 4; step++) {
            AtomicFile.write(file, new byte[] {1, 2});
            FailingFiles files = FailingFiles.withError(step, moment, "Disk quota exceeded");
            assertThatThrownBy(() -> AtomicFile.write(files, file, out -> out.write(new byte[9])))
                    .isInstanceOf(RunFolderException.class)
                    .hasMessageStartingWith(
                            file + ": cannot be written, the disk or the quota is full.");
            assertThat(Files.size(file)).isIn(2L, 9L);
            assertOnly(file);
        }
    }

    private static void assertOnly(Path file) throws IOException {
        try (Stream<Path> all = Files.list(file.getParent())) {
            assertThat(all).containsExactly(file);
        }
    }
}
