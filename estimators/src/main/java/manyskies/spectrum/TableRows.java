package manyskies.spectrum;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * The rows of a table of spectra: every line of numbers, checked one by one.
 *
 * <p>A line with a fault gives its sentence and no row. Blank lines and lines that start with '#'
 * are passed over.
 */
final class TableRows {
    /** Numbers as tables write them; Java's own parser would also take 1f or 0x1p3. */
    private static final Pattern NUMBER =
            Pattern.compile("[-+]?(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d+)?");

    private static final int FIRST = 2;
    private static final int SMALLEST_LMAX = 100;

    /** A row without faults. */
    static final class Row {
        final int line;
        final int l;
        private final double[] fields;

        private Row(int line, int l, double[] fields) {
            this.line = line;
            this.l = l;
            this.fields = fields;
        }

        double field(int column) {
            return fields[column];
        }
    }

    private final TableHeader header;
    private final List<String> faults;
    private final List<Row> rows = new ArrayList<>();
    private double previous = Double.NaN; // l of the line before, if it has one

    private TableRows(TableHeader header, List<String> faults) {
        this.header = header;
        this.faults = faults;
    }

    /** The rows below the header; faults are added to the list. */
    static List<Row> below(TableHeader header, List<String> lines, List<String> faults) {
        TableRows table = new TableRows(header, faults);
        boolean first = true;
        for (int i = header.line(); i < lines.size(); i++) {
            String text = lines.get(i).strip();
            if (!text.isEmpty() && !text.startsWith("#")) {
                table.read(i + 1, header.split(text), first);
                first = false;
            }
        }
        table.checkEnd(first);
        return table.rows;
    }

    private void read(int line, String[] text, boolean first) {
        int before = faults.size();
        if (text.length != header.width()) {
            fault(
                    line,
                    text.length
                            + (text.length == 1 ? " field" : " fields")
                            + ", but the header (line "
                            + header.line()
                            + ") names "
                            + header.width()
                            + "; add or remove what differs.");
        }
        double[] fields = new double[header.width()];
        for (int column = 0; column < Math.min(text.length, fields.length); column++) {
            fields[column] = number(line, column, text[column]);
        }
        if (header.multipole().isPresent()) {
            checkMultipole(line, fields[header.multipole().getAsInt()], first);
            if (text.length == header.width()) { // else no column is sure to be its own
                header.columns().forEach((name, column) -> checkSign(line, name, fields[column]));
            }
            if (faults.size() == before) {
                rows.add(new Row(line, (int) previous, fields));
            }
        }
    }

    private double number(int line, int column, String text) {
        String where = "column " + (column + 1) + " is '" + text + "', ";
        if (text.matches("(?i)[-+]?(nan|inf|infinity)")) {
            fault(line, where + "but spectra are finite; compute it again or cut the table here.");
            return Double.NaN;
        }
        if (!NUMBER.matcher(text).matches()) {
            fault(line, where + "which is not a number; write it like 1.5 or 1.5e-3.");
            return Double.NaN;
        }
        double value = Double.parseDouble(text);
        if (Double.isInfinite(value)) {
            fault(line, where + "which is too large for a double; check its exponent.");
            return Double.NaN;
        }
        return value;
    }

    private void checkMultipole(int line, double l, boolean first) {
        if (Double.isNaN(l)) {
            previous = Double.NaN; // its fault is noted; the next line starts afresh
            return;
        }
        if (l != Math.rint(l) || l < 0 || l > Integer.MAX_VALUE - 1) {
            fault(line, "l = " + l + "; multipoles are whole numbers from 2 up; correct it.");
            previous = Double.NaN;
            return;
        }
        if (first && l > FIRST) {
            fault(line, "the table starts at l = " + (int) l + "; start it at l = 2.");
        }
        if (!first && !Double.isNaN(previous) && l != previous + 1) {
            fault(
                    line,
                    "l = "
                            + (int) l
                            + " follows l = "
                            + (int) previous
                            + "; multipoles rise by 1; add, remove or sort rows.");
        }
        previous = l;
    }

    private void checkSign(int line, Spectrum name, double value) {
        boolean auto =
                switch (name) {
                    case TT, EE, BB, PP -> true;
                    case TE, TP, EP -> false;
                };
        if (auto && value < 0) {
            fault(line, name + " = " + value + "; an auto-spectrum is never negative; correct it.");
        }
    }

    private void checkEnd(boolean noRows) {
        if (noRows) {
            faults.add("no row of numbers follows the header; add rows from l = 2 up.");
        } else if (previous < SMALLEST_LMAX) {
            faults.add(
                    "the table ends at l = "
                            + (int) previous
                            + "; it must reach l = "
                            + SMALLEST_LMAX
                            + " or more.");
        }
    }

    private void fault(int line, String sentence) {
        faults.add("line " + line + ": " + sentence);
    }
}
