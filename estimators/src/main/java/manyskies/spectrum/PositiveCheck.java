package manyskies.spectrum;

import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Whether (T, E, P) can have these spectra: their matrix is positive semi-definite at every l.
 *
 * <p>Pair by pair |C^XY| &le; sqrt(C^XX C^YY), then the determinant of the 3 x 3 matrix of
 * correlations, both to a relative rounding of 1e-12. Each of the four ways to fail gives one
 * sentence: the first multipole, its numbers, how many fail.
 */
final class PositiveCheck {
    private static final double ROUNDING = 1e-12;

    private final String table;
    private final Map<Spectrum, Integer> columns;
    private final List<TableRows.Row> rows;
    private final Convention convention;

    PositiveCheck(
            String table,
            Map<Spectrum, Integer> columns,
            List<TableRows.Row> rows,
            Convention convention) {
        this.table = table;
        this.columns = columns;
        this.rows = rows;
        this.convention = convention;
    }

    /** Adds what is wrong to the faults. */
    void addFaults(List<String> faults) {
        pair(Spectrum.TE, Spectrum.TT, Spectrum.EE, faults);
        pair(Spectrum.TP, Spectrum.TT, Spectrum.PP, faults);
        pair(Spectrum.EP, Spectrum.EE, Spectrum.PP, faults);
        triple(faults);
    }

    private void pair(Spectrum cross, Spectrum x, Spectrum y, List<String> faults) {
        int failures = 0;
        String first = "";
        for (TableRows.Row row : rows) {
            double value = value(row, cross);
            double bound = Math.sqrt(value(row, x)) * Math.sqrt(value(row, y));
            if (row.l >= 2 && Math.abs(value) > bound * (1 + ROUNDING)) {
                if (failures++ == 0) {
                    first =
                            String.format(
                                    Locale.ROOT,
                                    "C_l is not positive semi-definite at l = %d: %s = %.6g exceeds"
                                            + " sqrt(%s %s) = %.6g",
                                    row.l,
                                    cross,
                                    value,
                                    x,
                                    y,
                                    bound);
                }
            }
        }
        report(failures, first, List.of(x, y, cross), faults);
    }

    /** Where all three pairs hold; with them, the determinant decides. */
    private void triple(List<String> faults) {
        int failures = 0;
        String first = "";
        for (TableRows.Row row : rows) {
            double te = correlation(row, Spectrum.TE, Spectrum.TT, Spectrum.EE);
            double tp = correlation(row, Spectrum.TP, Spectrum.TT, Spectrum.PP);
            double ep = correlation(row, Spectrum.EP, Spectrum.EE, Spectrum.PP);
            double largest = Math.max(Math.abs(te), Math.max(Math.abs(tp), Math.abs(ep)));
            double determinant = 1 - te * te - tp * tp - ep * ep + 2 * te * tp * ep;
            if (row.l >= 2 && largest <= 1 + ROUNDING && determinant < -ROUNDING) {
                if (failures++ == 0) {
                    first =
                            String.format(
                                    Locale.ROOT,
                                    "C_l is not positive semi-definite at l = %d: the correlations"
                                            + " TE = %.6g, TP = %.6g, EP = %.6g have the"
                                            + " determinant %.6g, below 0",
                                    row.l,
                                    te,
                                    tp,
                                    ep,
                                    determinant);
                }
            }
        }
        report(
                failures,
                first,
                List.of(
                        Spectrum.TT,
                        Spectrum.EE,
                        Spectrum.TE,
                        Spectrum.PP,
                        Spectrum.TP,
                        Spectrum.EP),
                faults);
    }

    private void report(int failures, String first, List<Spectrum> involved, List<String> faults) {
        if (failures > 0) {
            faults.add(
                    first
                            + (failures == 1 ? "" : " (the first of " + failures + " such l)")
                            + "; check "
                            + columnNames(involved)
                            + " of "
                            + table
                            + ".");
        }
    }

    /** Such as "columns 2 to 4" or "columns 2, 3 and 5". */
    private String columnNames(List<Spectrum> involved) {
        int[] at =
                involved.stream()
                        .filter(columns::containsKey)
                        .mapToInt(name -> columns.get(name) + 1)
                        .sorted()
                        .toArray();
        int last = at.length - 1;
        if (at[last] - at[0] == last) {
            return "columns " + at[0] + " to " + at[last];
        }
        StringBuilder text = new StringBuilder("columns " + at[0]);
        for (int i = 1; i <= last; i++) {
            text.append(i == last ? " and " : ", ").append(at[i]);
        }
        return text.toString();
    }

    private double correlation(TableRows.Row row, Spectrum cross, Spectrum x, Spectrum y) {
        double bound = Math.sqrt(value(row, x)) * Math.sqrt(value(row, y));
        return bound == 0 ? 0 : value(row, cross) / bound;
    }

    private double value(TableRows.Row row, Spectrum name) {
        Integer column = columns.get(name);
        return column == null || row.l < 2 ? 0 : convention.toCl(name, row.l, row.field(column));
    }
}
