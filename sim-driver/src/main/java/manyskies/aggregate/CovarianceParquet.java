package manyskies.aggregate;

import manyskies.result.ParquetTable;

/** The covariance as a Parquet file with the columns and rows of its text form. */
final class CovarianceParquet {
    private CovarianceParquet() {}

    static byte[] encode(LabelledCovariance table) {
        ParquetTable.Rows rows =
                ParquetTable.withColumns("covariance")
                        .integer("row")
                        .integer("column")
                        .text("row_estimator")
                        .integer("row_band")
                        .text("column_estimator")
                        .integer("column_band")
                        .number("value")
                        .number("error")
                        .integer("count")
                        .rows();
        for (int i = 0; i < table.size(); i++) {
            for (int j = 0; j < table.size(); j++) {
                var covariance = table.covariance().orElseThrow();
                rows.add(
                        (long) i,
                        (long) j,
                        table.estimator(i),
                        (long) table.band(i),
                        table.estimator(j),
                        (long) table.band(j),
                        covariance.value(i, j),
                        covariance.error(i, j),
                        covariance.count());
            }
        }
        return rows.encode();
    }
}
