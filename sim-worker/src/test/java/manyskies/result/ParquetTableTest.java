package manyskies.result;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ParquetTableTest {
    @TempDir private Path folder;

    private static ParquetTable.Rows rows() {
        return ParquetTable.withColumns("t").integer("n").number("x").text("name").rows();
    }

    /** Second method: another reader finds the same bits and texts. */
    @Test
    void anotherReaderOpensIt() throws IOException, SQLException {
        ParquetTable.Rows rows = rows();
        rows.add(3L, 0.1 + 0.2, "tt");
        rows.add(-4L, 1e-300, "\u00e9b");
        Path file = Files.write(folder.resolve("t.parquet"), rows.encode());
        try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
                ResultSet found =
                        duck.createStatement().executeQuery("select * from '" + file + "'")) {
            assertThat(found.next()).isTrue();
            assertThat(found.getLong("n")).isEqualTo(3);
            assertThat(found.getDouble("x")).isEqualTo(0.1 + 0.2);
            assertThat(found.getString("name")).isEqualTo("tt");
            assertThat(found.next()).isTrue();
            assertThat(found.getDouble("x")).isEqualTo(1e-300);
            assertThat(found.getString("name")).isEqualTo("\u00e9b");
            assertThat(found.next()).isFalse();
        }
    }

    @Test
    void equalRowsAreEqualBytesAndNoRowsAreATableToo() {
        assertThat(rows().encode()).isEqualTo(rows().encode()).isNotEmpty();
    }

    @Test
    void valuesOfAnotherKindAreRefused() {
        assertThatThrownBy(() -> rows().add(1L, 2L, "a"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("column x of t is of kind DOUBLE, found 2");
        assertThatThrownBy(() -> rows().add(1L))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("a row of t has 3 columns, found 1 values");
    }
}
