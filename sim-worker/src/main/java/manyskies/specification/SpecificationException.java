package manyskies.specification;

import java.util.List;
import java.util.Locale;

/**
 * A specification file that cannot be run: all its faults at once, in the order of its lines.
 *
 * <p>The message is the whole text to show to the file's author; no stack trace helps them.
 */
public final class SpecificationException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    /** The faults of a file; file is its name as the author gave it. */
    public SpecificationException(String file, List<Fault> faults) {
        super(message(file, faults));
        this.faults = List.copyOf(faults);
    }

    /** The faults in the order of their lines. */
    public List<Fault> faults() {
        return faults == null ? List.of() : faults;
    }

    private static String message(String file, List<Fault> faults) {
        int widest = faults.stream().mapToInt(Fault::line).max().orElse(0);
        int digits = Integer.toString(widest).length();
        StringBuilder text = new StringBuilder(file).append(": ").append(faults.size());
        text.append(faults.size() == 1 ? " fault" : " faults").append(", nothing was run.");
        for (Fault fault : faults) {
            text.append("\n  ");
            if (fault.line() > 0) {
                text.append(String.format(Locale.ROOT, "line %" + digits + "d  ", fault.line()));
            }
            text.append(fault.sentence());
        }
        return text.toString();
    }
}
