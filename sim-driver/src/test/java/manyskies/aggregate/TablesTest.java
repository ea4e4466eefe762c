package manyskies.aggregate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The files: what stands in them, and that they are replaced whole. */
class TablesTest {
    private static final Tables TABLES = SyntheticRun.of(1, 21, 5).tables();

    @TempDir private Path folder;

    private static List<String> lines(String name) {
        return new String(TABLES.files().get(name), StandardCharsets.UTF_8).lines().toList();
    }

    @Test
    void bandpowersGiveTheirBitsBack() {
        List<String> lines = lines("bandpowers.csv");
        assertThat(lines.get(0))
                .isEqualTo("estimator,quantity,band,l_min,l_max,l_mean,value,error,count");
        assertThat(lines).hasSize(1 + TABLES.bands().size());
        // input auto; per estimator 3 computed, 4 + 2 columns, transfer, mean field, debiased
        assertThat(TABLES.bands()).hasSize(3 * (1 + 2 * (3 + 6 + 3)));
        for (int i = 0; i < TABLES.bands().size(); i++) {
            BandRow row = TABLES.bands().get(i);
            String[] cells = lines.get(i + 1).split(",", -1);
            assertThat(cells).hasSize(9);
            assertThat(cells[0] + " " + cells[1]).isEqualTo(row.estimator() + " " + row.quantity());
            assertThat(Double.parseDouble(cells[4])).isEqualTo(row.lMax());
            assertThat(Double.parseDouble(cells[6])).isEqualTo(row.measurement().value());
            assertThat(Double.parseDouble(cells[7])).isEqualTo(row.measurement().error());
            assertThat(Long.parseLong(cells[8])).isEqualTo(row.measurement().count());
        }
    }

    /** Exact; Java 17's own conversion writes the first as 1.9999999999999998E23. */
    @Test
    void numbersAreShortestWhateverTheJavaVersion() {
        assertThat(Numbers.text(Double.parseDouble("2e23"))).isEqualTo("2.0E23");
        assertThat(Numbers.text(0.1 + 0.2)).isEqualTo("0.30000000000000004");
        assertThat(Numbers.text(-0.0)).isEqualTo("-0.0");
    }

    /** Second method: another reader opens the Parquet file and finds what the text form says. */
    @Test
    void bothCovariancesAreOne() throws SQLException {
        TABLES.write(folder);
        List<String> lines = lines("covariance.csv");
        assertThat(lines.get(0))
                .isEqualTo(
                        "row,column,row_estimator,row_band,column_estimator,column_band,"
                                + "value,error,count");
        assertThat(lines).hasSize(37);
        try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
                ResultSet rows =
                        duck.createStatement()
                                .executeQuery(
                                        "select * from '"
                                                + folder.resolve("covariance.parquet")
                                                + "' order by \"row\", \"column\"")) {
            for (int line = 1; line < lines.size(); line++) {
                assertThat(rows.next()).isTrue();
                String[] cells = lines.get(line).split(",", -1);
                for (int cell = 0; cell < cells.length; cell++) {
                    String found =
                            cell == 6 || cell == 7
                                    ? Numbers.text(rows.getDouble(cell + 1))
                                    : rows.getString(cell + 1);
                    assertThat(found).isEqualTo(cells[cell]);
                }
            }
            assertThat(rows.next()).isFalse();
        }
    }

    /** Leaves of a JSON text: path to value. */
    private static Map<String, String> leaves(byte[] json) throws IOException {
        Map<String, String> leaves = new TreeMap<>();
        try (JsonParser parser = new JsonFactory().createParser(json)) {
            for (JsonToken t = parser.nextToken(); t != null; t = parser.nextToken()) {
                if (t.isScalarValue()) {
                    leaves.put(
                            parser.getParsingContext().pathAsPointer().toString(),
                            parser.getText());
                }
            }
        }
        return leaves;
    }

    @Test
    void theSummaryIsJsonWithVerdictsAndNumbers() throws IOException {
        Map<String, String> json = leaves(TABLES.files().get("summary.json"));
        assertThat(json)
                .containsEntry("/run", "drawn")
                .containsEntry("/hash", "0123abcd")
                .containsEntry("/sets/data/realisations", "21")
                .containsEntry("/sets/pairs/blocks", "5")
                .containsEntry("/false_alarm", "0.01")
                .containsEntry("/verdicts", "6")
                .containsEntry("/estimators/tt/transfer/verdict", "consistent")
                .containsEntry("/estimators/eb/transfer/expected", "1.0")
                .containsEntry("/estimators/eb/curl_cross/expected", "0.0")
                .containsEntry("/estimators/eb/debiased/n0", "n0_mc")
                .containsEntry("/estimators/eb/debiased/mean_field_removed", "true");
        Check transfer = TABLES.summary().estimators().get(0).transfer();
        assertThat(json.get("/estimators/tt/transfer/mean"))
                .isEqualTo(Numbers.text(transfer.mean().orElseThrow().value()));
        assertThat(json.get("/estimators/tt/transfer/probability_to_exceed"))
                .isEqualTo(Numbers.text(transfer.test().orElseThrow().probabilityToExceed()));
        int band = transfer.largest().orElseThrow().index();
        assertThat(json.get("/estimators/tt/transfer/largest_deviation/l_min"))
                .isEqualTo(Double.toString(SyntheticRun.BANDS.lower(band)));
        assertThat(json)
                .containsKey("/estimators/tt/transfer/mean_error_jackknife")
                .containsKey("/estimators/tt/n0_ratio/mean_error")
                .containsKey("/estimators/tt/debiased/signal_to_noise_of_one_sky");
    }

    @Test
    void filesAreReplacedWholeAndNothingElseIsLeft() throws IOException {
        Files.writeString(
                folder.resolve("bandpowers.csv"), "an earlier and longer table\n".repeat(999));
        TABLES.write(folder);
        try (var files = Files.list(folder)) {
            assertThat(files.map(file -> file.getFileName().toString()))
                    .containsExactlyInAnyOrderElementsOf(TABLES.files().keySet());
        }
        assertThat(Files.readAllBytes(folder.resolve("bandpowers.csv")))
                .isEqualTo(TABLES.files().get("bandpowers.csv"));
    }

    @Test
    void aFolderThatCannotBeMadeIsNamed() throws IOException {
        Path file = Files.writeString(folder.resolve("tables"), "in the way");
        assertThatThrownBy(() -> TABLES.write(file))
                .isInstanceOf(UncheckedIOException.class)
                .hasMessage(
                        file
                                + ": tables could not be written; blocks are untouched, aggregate"
                                + " again");
    }
}
