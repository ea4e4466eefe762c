package manyskies.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.ObjectInputStream;
import java.io.ObjectOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class BlockCodecTest {
    @TempDir private Path folder;

    /** Exact: what comes back is what went in, bit for bit. */
    @Test
    void blocksComeBack() {
        Block block = TestBlocks.block(3);
        Block back = BlockCodec.decode(BlockCodec.encode(block));
        assertThat(back.id()).isEqualTo(block.id());
        assertThat(back.columns().keySet()).isEqualTo(block.columns().keySet());
        block.columns()
                .forEach(
                        (name, rows) ->
                                assertThat(back.columns().get(name).toArray(double[][]::new))
                                        .isDeepEqualTo(rows.toArray(double[][]::new)));
        assertThat(back.fieldSums().keySet()).isEqualTo(block.fieldSums().keySet());
        block.fieldSums()
                .forEach((name, sum) -> assertThat(back.fieldSums().get(name)).isEqualTo(sum));
    }

    @Test
    void blocksWithoutFieldsComeBack() {
        BlockId id = new BlockId("pairs", 0, 0, 1);
        Block block = Block.of(id, Map.of("tt.n0", List.of(new double[] {1})), Map.of());
        assertThat(BlockCodec.decode(BlockCodec.encode(block)).fieldSums()).isEmpty();
    }

    /** Fields of a large patch: several pages in the file. */
    @Test
    void longFieldsComeBack() {
        double[] field = new double[500_000];
        Arrays.setAll(field, i -> Math.sqrt(i) - 300);
        BlockId id = new BlockId("data", 0, 0, 1);
        Block block = Block.of(id, Map.of(), Map.of("tt", field));
        assertThat(BlockCodec.decode(BlockCodec.encode(block)).fieldSums().get("tt"))
                .isEqualTo(field);
    }

    @Test
    void equalBlocksAreEqualBytes() {
        EncodedBlock one = TestBlocks.encoded(3);
        EncodedBlock two = TestBlocks.encoded(3);
        assertThat(one.bandpowers()).isEqualTo(two.bandpowers());
        assertThat(one.fields()).isEqualTo(two.fields());
        assertThat(one.bandpowersHash()).isEqualTo(two.bandpowersHash()).hasSize(64);
        assertThat(TestBlocks.encoded(4).bandpowersHash()).isNotEqualTo(one.bandpowersHash());
    }

    /** Hash sets of enums, say, are ordered anew in each JVM: another one writes the same bytes. */
    @Test
    void equalBlocksAreEqualBytesInAnotherJvm() throws IOException {
        Process other =
                new ProcessBuilder(
                                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                                "-cp",
                                System.getProperty("java.class.path"),
                                BlockHashes.class.getName())
                        .redirectError(ProcessBuilder.Redirect.DISCARD)
                        .start();
        String found =
                new String(other.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        assertThat(found).isEqualTo(BlockHashes.text());
    }

    /** Second method: another reader finds the same bits in the bandpowers. */
    @Test
    void anotherReaderFindsTheBandpowers() throws IOException, SQLException {
        Block block = TestBlocks.block(3);
        Path file = Files.write(folder.resolve("b.parquet"), BlockCodec.encode(block).bandpowers());
        try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
                ResultSet found =
                        duck.createStatement().executeQuery("select * from '" + file + "'")) {
            for (int row = 0; row < TestBlocks.COUNT; row++) {
                assertThat(found.next()).isTrue();
                assertThat(found.getString("set")).isEqualTo("data");
                assertThat(found.getInt("index")).isEqualTo(3 * TestBlocks.COUNT + row);
                for (String column : block.columns().keySet()) {
                    Object[] values = (Object[]) found.getArray(column).getArray();
                    double[] expected = block.columns().get(column).get(row);
                    assertThat(Arrays.stream(values).mapToDouble(v -> (Double) v).toArray())
                            .isEqualTo(expected);
                }
            }
            assertThat(found.next()).isFalse();
        }
    }

    /** Second method: another reader finds the same bits in the fields. */
    @Test
    void anotherReaderFindsTheFields() throws IOException, SQLException {
        Block block = TestBlocks.block(3);
        Path file = Files.write(folder.resolve("f.parquet"), BlockCodec.encode(block).fields());
        try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
                ResultSet found =
                        duck.createStatement()
                                .executeQuery("select * from '" + file + "' order by mode")) {
            for (int mode = 0; mode < 5; mode++) {
                assertThat(found.next()).isTrue();
                assertThat(found.getInt("mode")).isEqualTo(mode);
                for (String name : block.fieldSums().keySet()) {
                    double[] expected = block.fieldSums().get(name);
                    assertThat(found.getDouble(name + ".re")).isEqualTo(expected[2 * mode]);
                    assertThat(found.getDouble(name + ".im")).isEqualTo(expected[2 * mode + 1]);
                }
            }
            assertThat(found.next()).isFalse();
        }
    }

    /** A task returns it: Java's own serialisation keeps it. */
    @Test
    void encodedBlocksTravel() throws IOException, ClassNotFoundException {
        EncodedBlock block = TestBlocks.encoded(1);
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ObjectOutputStream out = new ObjectOutputStream(bytes)) {
            out.writeObject(block);
        }
        try (ObjectInputStream in =
                new ObjectInputStream(new ByteArrayInputStream(bytes.toByteArray()))) {
            EncodedBlock back = (EncodedBlock) in.readObject();
            assertThat(back.id()).isEqualTo(block.id());
            assertThat(back.bandpowers()).isEqualTo(block.bandpowers());
            assertThat(back.fieldsHash()).isEqualTo(block.fieldsHash());
        }
    }

    @Test
    void filesOfAnotherBlockAreRefused() {
        EncodedBlock block = TestBlocks.encoded(3);
        refused(
                new BlockId("data", 3, 16, 4),
                block,
                "data-000003 has realisation 12 in row 0, expected 16");
        refused(new BlockId("data", 3, 12, 8), block, "data-000003 has 4 realisations, expected 8");
        refused(new BlockId("pairs", 3, 12, 4), block, "pairs-000003 holds the set data");
    }

    private static void refused(BlockId id, EncodedBlock block, String sentence) {
        assertThatThrownBy(
                        () ->
                                BlockCodec.decode(
                                        new EncodedBlock(id, block.bandpowers(), block.fields())))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(sentence);
    }

    @Test
    void fieldsOfDifferentLengthsAreRefused() {
        Block block =
                Block.of(
                        new BlockId("data", 0, 0, 1),
                        Map.of(),
                        Map.of("eb", new double[4], "tt", new double[6]));
        assertThatThrownBy(() -> BlockCodec.encode(block))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "data-000000: field tt has 6 numbers; all fields have equally many, two per"
                                + " mode");
    }
}
