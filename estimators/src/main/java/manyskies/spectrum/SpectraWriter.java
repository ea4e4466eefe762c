package manyskies.spectrum;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Writes power spectra as a table of C_l that {@link SpectraReader} reads back to the last bit.
 *
 * <p>Rows from l = 2; all spectra, absent ones as zeros; numbers as Java writes a double, which
 * always reads back as the same double. The caller writes the text to its file.
 */
public final class SpectraWriter {
    private SpectraWriter() {}

    /**
     * The table as text.
     *
     * @param remarks lines for the table's head, such as where the spectra come from; one line each
     * @throws IllegalArgumentException if a spectrum is not zero at l = 0 or 1, which a table cannot
     *     hold, or a remark has a line break
     */
    public static String write(Spectra spectra, List<String> remarks) {
        StringBuilder text = new StringBuilder();
        for (String remark : remarks) {
            if (remark.lines().count() > 1) {
                throw new IllegalArgumentException("a remark is one line, found: " + remark);
            }
            text.append("# ").append(remark).append('\n');
        }
        text.append(
                "# columns are C_l (not D_l): T, E, B in uK; P, the potential, dimensionless\n");
        text.append("# l ").append(names()).append('\n');
        List<double[]> columns = new ArrayList<>();
        for (Spectrum name : Spectrum.values()) {
            columns.add(fromTwo(name, spectra.values(name)));
        }
        for (int l = 2; l <= spectra.lmax(); l++) {
            text.append(l);
            for (double[] column : columns) {
                text.append(' ').append(column[l]);
            }
            text.append('\n');
        }
        return text.toString();
    }

    private static String names() {
        return Arrays.stream(Spectrum.values()).map(Enum::name).collect(Collectors.joining(" "));
    }

    private static double[] fromTwo(Spectrum name, double[] values) {
        for (int l = 0; l < 2; l++) {
            if (values[l] != 0) {
                throw new IllegalArgumentException(
                        name
                                + " is "
                                + values[l]
                                + " at l = "
                                + l
                                + "; a table begins at l = 2, set it to zero");
            }
        }
        return values;
    }
}
