package manyskies.aggregate;

import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * Tables as comma-separated text, with a header line.
 *
 * <p>Numbers have as many digits as tell them from their neighbours ({@link Numbers}), so that equal
 * bits give equal files and reading gives the bits back.
 */
final class CsvTables {
    private CsvTables() {}

    static byte[] bandpowers(List<BandRow> rows) {
        StringBuilder text =
                new StringBuilder("estimator,quantity,band,l_min,l_max,l_mean,value,error,count\n");
        for (BandRow row : rows) {
            text.append(row.estimator()).append(',');
            text.append(row.quantity()).append(',');
            text.append(row.band()).append(',');
            text.append(Numbers.text(row.lMin())).append(',');
            text.append(Numbers.text(row.lMax())).append(',');
            text.append(Numbers.text(row.lMean())).append(',');
            text.append(Numbers.text(row.measurement().value())).append(',');
            text.append(Numbers.text(row.measurement().error())).append(',');
            text.append(row.measurement().count()).append('\n');
        }
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    static byte[] covariance(LabelledCovariance table) {
        StringBuilder text =
                new StringBuilder(
                        "row,column,row_estimator,row_band,column_estimator,column_band,"
                                + "value,error,count\n");
        for (int i = 0; i < table.size(); i++) {
            for (int j = 0; j < table.size(); j++) {
                appendElement(text, table, i, j);
            }
        }
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    private static void appendElement(StringBuilder text, LabelledCovariance table, int i, int j) {
        var covariance = table.covariance().orElseThrow();
        text.append(i).append(',').append(j).append(',');
        text.append(table.estimator(i)).append(',').append(table.band(i)).append(',');
        text.append(table.estimator(j)).append(',').append(table.band(j)).append(',');
        text.append(Numbers.text(covariance.value(i, j))).append(',');
        text.append(Numbers.text(covariance.error(i, j))).append(',');
        text.append(covariance.count()).append('\n');
    }
}
