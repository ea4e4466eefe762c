package manyskies.spectrum;

import java.util.ArrayList;
import java.util.List;

/**
 * A table of spectra that cannot be used: every fault found, each a sentence with its place and its
 * mend.
 *
 * <p>The message names the table, counts the faults and lists the first {@value #SHOWN} of them.
 */
public final class SpectraException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    /** A table wrong in every row should not fill the screen. */
    private static final int SHOWN = 20;

    private final ArrayList<String> faults;

    SpectraException(String table, List<String> faults) {
        super(message(table, faults));
        this.faults = new ArrayList<>(faults);
    }

    /** All faults in the order of the table, each a sentence. */
    public List<String> faults() {
        return List.copyOf(faults);
    }

    private static String message(String table, List<String> faults) {
        int count = faults.size();
        StringBuilder text = new StringBuilder(table);
        text.append(": ").append(count).append(count == 1 ? " fault" : " faults");
        text.append(", the table was not used.");
        faults.stream().limit(SHOWN).forEach(fault -> text.append("\n  ").append(fault));
        if (count > SHOWN) {
            text.append("\n  ... and ").append(count - SHOWN).append(" more.");
        }
        return text.toString();
    }
}
