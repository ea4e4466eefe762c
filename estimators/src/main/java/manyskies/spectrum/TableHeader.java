package manyskies.spectrum;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * The head of a table of spectra: which column holds what, and whether it is C_l or D_l.
 *
 * <p>The line that names the columns is the first one before the numbers of whose fields at least
 * half are known names; a leading '#' does not count. With a comma in it the table is CSV, else
 * fields are separated by blanks.
 */
final class TableHeader {
    private static final Pattern STATEMENT =
            Pattern.compile("\\bcolumns\\s+are\\s+([CD])_(?:l|ell)\\b", Pattern.CASE_INSENSITIVE);
    private static final String KNOWN = "l, TT, EE, BB, TE, PP, TP, EP";

    private final int line; // counted from 1
    private final boolean commas;
    private final int width;
    private OptionalInt multipole = OptionalInt.empty();
    private final EnumMap<Spectrum, Integer> columns = new EnumMap<>(Spectrum.class);

    private TableHeader(int line, String text) {
        this.line = line;
        this.commas = text.indexOf(',') >= 0;
        this.width = split(text).length;
    }

    /** The header of the table; without one a fault is added and the result is empty. */
    static Optional<TableHeader> find(
            List<String> lines, Set<Spectrum> required, List<String> faults) {
        for (int i = 0; i < lines.size() && !startsWithNumber(lines.get(i)); i++) {
            String text = bare(lines.get(i));
            TableHeader header = new TableHeader(i + 1, text);
            String[] names = header.split(text);
            long known = List.of(names).stream().filter(TableHeader::isKnown).count();
            if (known >= 1 && 2 * known >= names.length) {
                header.assign(names, faults);
                header.require(required, faults);
                return Optional.of(header);
            }
        }
        faults.add(
                "no line names the columns; put one before the numbers, such as '# l TT EE TE PP'"
                        + " (known: "
                        + KNOWN
                        + ").");
        return Optional.empty();
    }

    /** C_l or D_l as a comment states; nothing or both is a fault, never a guess. */
    static Optional<Convention> convention(List<String> lines, List<String> faults) {
        EnumMap<Convention, Integer> stated = new EnumMap<>(Convention.class);
        for (int i = 0; i < lines.size(); i++) {
            Matcher matcher = STATEMENT.matcher(lines.get(i));
            while (lines.get(i).strip().startsWith("#") && matcher.find()) {
                boolean cl = matcher.group(1).equalsIgnoreCase("C");
                stated.putIfAbsent(cl ? Convention.C_L : Convention.D_L, i + 1);
            }
        }
        if (stated.isEmpty()) {
            faults.add(
                    "the table does not say whether it holds C_l or D_l = l(l+1) C_l/2pi; add a"
                            + " line '# columns are C_l' or '# columns are D_l'.");
        } else if (stated.size() == 2) {
            faults.add(
                    String.format(
                            Locale.ROOT,
                            "the table says both 'columns are C_l' (line %d) and 'columns are D_l'"
                                    + " (line %d); keep the one that is true.",
                            stated.get(Convention.C_L),
                            stated.get(Convention.D_L)));
        }
        return stated.size() == 1 ? stated.keySet().stream().findFirst() : Optional.empty();
    }

    /** Line of the header, from 1. */
    int line() {
        return line;
    }

    /** Fields of every row. */
    int width() {
        return width;
    }

    /** Column of l, from 0. */
    OptionalInt multipole() {
        return multipole;
    }

    /** Column of each spectrum, from 0. */
    Map<Spectrum, Integer> columns() {
        return columns;
    }

    /** Fields of a line, blanks around them removed. */
    String[] split(String text) {
        String[] fields = commas ? text.split(",", -1) : text.strip().split("\\s+", -1);
        for (int i = 0; i < fields.length; i++) {
            fields[i] = fields[i].strip();
        }
        return fields;
    }

    private void assign(String[] names, List<String> faults) {
        List<String> seen = new ArrayList<>();
        for (int column = 0; column < names.length; column++) {
            String name = canonical(names[column]);
            int before = seen.indexOf(name);
            seen.add(name);
            if (!isKnown(name)) {
                faults.add(
                        String.format(
                                Locale.ROOT,
                                "line %d: column %d is named '%s'; known are %s; rename or remove"
                                        + " it.",
                                line,
                                column + 1,
                                names[column],
                                KNOWN));
            } else if (before >= 0) {
                faults.add(
                        String.format(
                                Locale.ROOT,
                                "line %d: %s is named twice, columns %d and %d; rename or remove"
                                        + " one.",
                                line,
                                name,
                                before + 1,
                                column + 1));
            } else if (name.equals("l")) {
                multipole = OptionalInt.of(column);
            } else {
                columns.put(Spectrum.valueOf(name), column);
            }
        }
    }

    private void require(Set<Spectrum> required, List<String> faults) {
        if (multipole.isEmpty()) {
            faults.add("line " + line + ": no column is named l; name the multipole's column l.");
        }
        Set<Spectrum> missing = EnumSet.noneOf(Spectrum.class);
        missing.addAll(required);
        missing.removeAll(columns.keySet());
        for (Spectrum name : missing) {
            faults.add(
                    "line "
                            + line
                            + ": no column is named "
                            + name
                            + "; this table needs l, "
                            + names(required)
                            + "; add it or correct the header.");
        }
    }

    private static String names(Set<Spectrum> spectra) {
        return spectra.stream().map(Spectrum::name).collect(Collectors.joining(", "));
    }

    private static boolean startsWithNumber(String text) {
        return text.strip().matches("[-+.]?\\d.*");
    }

    private static String bare(String text) {
        return text.strip().replaceFirst("^#+", "").strip();
    }

    private static String canonical(String name) {
        String upper = name.toUpperCase(Locale.ROOT);
        return upper.equals("L") || upper.equals("ELL") ? "l" : upper;
    }

    private static boolean isKnown(String name) {
        String canonical = canonical(name);
        return canonical.equals("l")
                || List.of(Spectrum.values()).stream().anyMatch(s -> s.name().equals(canonical));
    }
}
