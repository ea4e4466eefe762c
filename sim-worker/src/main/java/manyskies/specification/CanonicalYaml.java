package manyskies.specification;

import java.util.List;
import java.util.Map;

/**
 * A specification as YAML with every default resolved, in canonical order.
 *
 * <p>Each number is the shortest decimal that reads back as the same double, so {@link
 * SpecificationReader} finds an equal specification in the text, but for where the spectra were
 * read: the text names {@value #SPECTRA}, which stands beside it and is written by {@link
 * manyskies.spectrum.SpectraWriter}.
 */
public final class CanonicalYaml {
    /** Name of the table of spectra that stands beside the canonical text. */
    public static final String SPECTRA = "spectra.txt";

    private CanonicalYaml() {}

    /** The text, without remarks. */
    public static String write(Specification specification) {
        return write(specification, List.of());
    }

    /**
     * The text below remarks.
     *
     * @param remarks comment lines for the head, such as hash and version; one line each
     * @throws IllegalArgumentException if a remark has a line break
     */
    public static String write(Specification specification, List<String> remarks) {
        StringBuilder text = new StringBuilder();
        for (String remark : remarks) {
            if (remark.lines().count() > 1) {
                throw new IllegalArgumentException("a remark is one line, found: " + remark);
            }
            text.append("# ").append(remark).append('\n');
        }
        Map<String, String> entries = Entries.of(specification);
        String[] before = {};
        for (Map.Entry<String, String> entry : entries.entrySet()) {
            String[] path = entry.getKey().split("\\.");
            if (path[0].equals("patch") && before.length == 1) {
                text.append(spectra(specification));
            }
            append(text, path, before, entry.getValue());
            before = path;
        }
        return text.toString();
    }

    private static String spectra(Specification specification) {
        String original = specification.spectraFile().replaceAll("\\R", " ");
        String remark = original.equals(SPECTRA) ? "" : " # a copy of " + original;
        return "spectra: " + SPECTRA + remark + "\n";
    }

    /** Opens the mappings that the entry before was not in, then writes the value. */
    private static void append(StringBuilder text, String[] path, String[] before, String value) {
        int shared = 0;
        while (shared < Math.min(path.length, before.length) - 1
                && path[shared].equals(before[shared])) {
            shared++;
        }
        for (int level = shared; level < path.length; level++) {
            text.append("  ".repeat(level)).append(path[level]).append(':');
            text.append(level == path.length - 1 ? " " + value : "").append('\n');
        }
    }
}
