package manyskies.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Files that are not what was committed are found, named, and never read as numbers. */
class DamageTest {
    private static final String SEAL = "blocks/data-000001.sha256";
    private static final String BANDPOWERS = "blocks/data-000001.parquet";
    private static final String FIELDS = "fields/data-000001.parquet";
    private static final String MEND = "; it will be computed again by 'manyskies run'";

    @TempDir private Path run;
    private RunFolder folder;

    @BeforeEach
    void commit() {
        folder = RunFolder.open(run);
        for (int number = 0; number < 3; number++) {
            folder.commit(TestBlocks.encoded(number));
        }
    }

    @AfterEach
    void close() {
        folder.close();
    }

    /** Every byte of the three files in turn, one bit of it. */
    @ParameterizedTest
    @ValueSource(strings = {SEAL, BANDPOWERS, FIELDS})
    void aFlippedBitIsFoundWhereverItIs(String name) throws IOException {
        byte[] good = Files.readAllBytes(run.resolve(name));
        for (int at = 0; at < good.length; at++) {
            byte[] bad = good.clone();
            bad[at] ^= (byte) (1 << at % 8);
            Files.write(run.resolve(name), bad);
            int where = at;
            assertThatThrownBy(() -> folder.read(TestBlocks.id(1)))
                    .as("byte %d", where)
                    .isInstanceOf(DamagedBlockException.class)
                    .hasMessageContaining("data-000001.")
                    .hasMessageEndingWith(MEND);
        }
        Files.write(run.resolve(name), good);
        assertThat(folder.read(TestBlocks.id(1)).id()).isEqualTo(TestBlocks.id(1));
    }

    @ParameterizedTest
    @ValueSource(strings = {BANDPOWERS, FIELDS})
    void truncationIsFoundWithoutReading(String name) throws IOException {
        byte[] good = Files.readAllBytes(run.resolve(name));
        for (int length : new int[] {0, 1, good.length / 2, good.length - 1}) {
            Files.write(run.resolve(name), java.util.Arrays.copyOf(good, length));
            assertThat(folder.committed()).containsExactly(TestBlocks.id(0), TestBlocks.id(2));
            damaged(name, "has " + length + " bytes, expected " + good.length);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {SEAL, FIELDS})
    void aMissingFileIsFound(String name) throws IOException {
        Files.delete(run.resolve(name));
        assertThat(folder.committed()).containsExactly(TestBlocks.id(0), TestBlocks.id(2));
        damaged(name, "is missing");
    }

    @Test
    void anEmptyOrForeignSealIsFound() throws IOException {
        Files.write(run.resolve(SEAL), new byte[0]);
        damaged(SEAL, "is no block's checksum file");
        Files.copy(
                run.resolve("blocks/data-000002.sha256"),
                run.resolve(SEAL),
                java.nio.file.StandardCopyOption.REPLACE_EXISTING);
        damaged(SEAL, "is no block's checksum file");
    }

    private void damaged(String name, String found) {
        String sentence = run.resolve(name) + ": " + found + MEND;
        assertThat(folder.damaged()).extracting(Throwable::getMessage).containsExactly(sentence);
        assertThatThrownBy(() -> folder.verify(TestBlocks.id(1))).hasMessage(sentence);
    }

    /** Aggregation must not go on without it in silence. */
    @Test
    void iteratingMeetsTheDamage() throws IOException {
        Files.write(run.resolve(BANDPOWERS), new byte[3]);
        var blocks = folder.blocks("data").iterator();
        assertThat(blocks.next().id()).isEqualTo(TestBlocks.id(0));
        assertThatThrownBy(blocks::next).isInstanceOf(DamagedBlockException.class);
        assertThat(folder.blocks("dat")).isEmpty();
    }

    @Test
    void damagedBlocksAreSetAsideAndCanBeCommittedAgain() throws IOException {
        byte[] good = Files.readAllBytes(run.resolve(BANDPOWERS));
        byte[] bad = good.clone();
        bad[40] ^= 1;
        Files.write(run.resolve(BANDPOWERS), bad);
        assertThat(folder.committed()).hasSize(3); // sizes alone do not show it
        List<DamagedBlockException> aside = folder.setDamagedAside();
        assertThat(aside).extracting(DamagedBlockException::stem).containsExactly("data-000001");
        assertThat(aside.get(0))
                .hasMessageStartingWith(
                        run.resolve(BANDPOWERS) + ": its contents have changed, SHA-256 is ");
        assertThat(folder.committed()).containsExactly(TestBlocks.id(0), TestBlocks.id(2));
        assertThat(Files.readAllBytes(run.resolve(BANDPOWERS + ".damaged"))).isEqualTo(bad);
        assertThat(run.resolve(FIELDS + ".damaged")).exists();
        folder.commit(TestBlocks.encoded(1));
        assertThat(folder.damaged()).isEmpty();
        assertThat(Files.readAllBytes(run.resolve(BANDPOWERS))).isEqualTo(good);
    }

    @Test
    void discardingNothingIsHarmless() {
        folder.discard(TestBlocks.id(17));
        assertThat(folder.committed()).hasSize(3);
    }
}
