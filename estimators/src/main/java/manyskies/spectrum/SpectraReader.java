package manyskies.spectrum;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Reads power spectra from a text table, whitespace or CSV; the caller opens and closes it.
 *
 * <p>One line names the columns, in any order and case, with or without a leading '#': l (or ell),
 * TT, EE, BB, TE, PP, TP, EP. A comment line says "columns are C_l" or "columns are D_l"; there is
 * no guess. D_l tables hold l(l+1) C_l/2pi for T, E, B in uK^2, [L(L+1)]^2 C_L^PP/2pi for the
 * potential and [L(L+1)]^(3/2) C_L^XP/2pi in uK for its cross-spectra.
 *
 * <p>Rows run from l = 2 (rows of l = 0 and 1 may precede; they are read as zero) to l = 100 or
 * more, one by one. Checked at every l: auto-spectra are not negative and (T, E, P) is positive
 * semi-definite. Out: C_l, absent columns zero. Immutable.
 */
public final class SpectraReader {
    private final Set<Spectrum> required;

    private SpectraReader(Set<Spectrum> required) {
        this.required = required;
    }

    /** A reader of unlensed tables: TT, EE, TE and PP must be there. */
    public static SpectraReader unlensed() {
        return requiring(Spectrum.TT, Spectrum.EE, Spectrum.TE, Spectrum.PP);
    }

    /** A reader of tables in which the given columns, besides l, must be there. */
    public static SpectraReader requiring(Spectrum... columns) {
        EnumSet<Spectrum> set = EnumSet.noneOf(Spectrum.class);
        set.addAll(List.of(columns));
        return new SpectraReader(set);
    }

    /**
     * The spectra of a table.
     *
     * @param table what messages call it, such as its file name
     * @throws SpectraException with every fault of the table
     * @throws IOException if the text cannot be read
     */
    public Spectra read(Reader text, String table) throws IOException {
        List<String> faults = new ArrayList<>();
        List<String> lines = lines(text);
        if (lines.stream().allMatch(String::isBlank)) {
            faults.add("the table is empty; give rows from l = 2 up below a line of column names.");
            throw new SpectraException(table, faults);
        }
        Optional<Convention> convention = TableHeader.convention(lines, faults);
        Optional<TableHeader> header = TableHeader.find(lines, required, faults);
        List<TableRows.Row> rows =
                header.map(found -> TableRows.below(found, lines, faults)).orElse(List.of());
        Map<Spectrum, Integer> columns = header.map(TableHeader::columns).orElse(Map.of());
        if (convention.isPresent() && columns.keySet().containsAll(required)) {
            new PositiveCheck(table, columns, rows, convention.get()).addFaults(faults);
        }
        if (!faults.isEmpty()) {
            throw new SpectraException(table, faults);
        }
        return spectra(columns, rows, convention.orElseThrow());
    }

    private static List<String> lines(Reader text) throws IOException {
        List<String> lines = new ArrayList<>();
        BufferedReader buffered = new BufferedReader(text);
        for (String line = buffered.readLine(); line != null; line = buffered.readLine()) {
            lines.add(lines.isEmpty() ? withoutByteOrderMark(line) : line);
        }
        return lines;
    }

    /** Spreadsheets put one before CSV. */
    private static String withoutByteOrderMark(String line) {
        return line.startsWith("\uFEFF") ? line.substring(1) : line;
    }

    private static Spectra spectra(
            Map<Spectrum, Integer> columns, List<TableRows.Row> rows, Convention convention) {
        int lmax = rows.get(rows.size() - 1).l;
        Map<Spectrum, double[]> values = new EnumMap<>(Spectrum.class);
        columns.forEach(
                (name, column) -> {
                    double[] cl = new double[lmax + 1];
                    for (TableRows.Row row : rows) {
                        if (row.l >= 2) {
                            cl[row.l] = convention.toCl(name, row.l, row.field(column));
                        }
                    }
                    values.put(name, cl);
                });
        return Spectra.of(lmax, values);
    }
}
