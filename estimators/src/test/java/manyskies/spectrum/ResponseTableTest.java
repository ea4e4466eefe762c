package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Responses computed by an independent program (provenance in the head of check/*.csv) against
 * those of our spectra by direct quadrature.
 *
 * <p>In the file of the gradient case R_EB keeps C^BB (C^{B gradB}) in f_EB, R_EB_noBB leaves it
 * out; the same in the lensed case.
 */
@Tag("slow")
class ResponseTableTest {
    private static final String LENSED = "C_lensed_direct.csv";
    private static final String GRADIENT = "C_grad_direct.csv";

    /**
     * A known disagreement. With all lenses our gradient spectra give R_TT, R_TE and R_EE up to 0.6
     * per cent below the table at low L. Leaving out the lenses below this L removes it in all
     * columns at once. The value is fitted to the table (22 leaves 1.2e-3, 26 leaves 1.1e-3 in
     * R_TE), and that the table lacks these lenses is an inference: its head does not say so. Our
     * spectra keep all lenses; LensedGradientSpectraTest shows that they do.
     */
    private static final int FIRST_LENS = 24;

    private static Spectra lensed;
    private static Spectra gradient;
    private static Spectra gradientOfCut;

    @BeforeAll
    static void lens() throws IOException {
        Spectra unlensed = SpectraReaderTest.fiducial();
        lensed = LensedSpectra.of(unlensed);
        gradient = LensedGradientSpectra.of(unlensed);
        double[] cut = unlensed.values(Spectrum.PP);
        Arrays.fill(cut, 0, FIRST_LENS, 0);
        gradientOfCut = LensedGradientSpectra.of(unlensed.with(Map.of(Spectrum.PP, cut)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "EE", "TB", "EB", "EB_noBB"})
    void lensedWeightsGiveTheTable(String estimator) throws IOException {
        assertThat(worst(estimator, LENSED, lensed)).isLessThan(2e-4);
    }

    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "EE", "TB", "EB", "EB_noBB"})
    void gradientWeightsWithoutTheLargestLensesGiveTheTable(String estimator) throws IOException {
        assertThat(worst(estimator, GRADIENT, gradientOfCut)).isLessThan(5e-4);
    }

    /** The disagreement as it stands: 4.5e-3 (TT), 6.1e-3 (TE), 4.1e-3 (EE), 3.7e-3 (TB). */
    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "EE", "TB", "EB", "EB_noBB"})
    void gradientWeightsComeNearTheTable(String estimator) throws IOException {
        assertThat(worst(estimator, GRADIENT, gradient)).isLessThan(7e-3);
    }

    /** The twin: lensed in place of gradient spectra is seen. */
    @ParameterizedTest
    @ValueSource(strings = {"TT", "TE", "EE", "TB", "EB", "EB_noBB"})
    void lensedWeightsAreNotTheGradientTable(String estimator) throws IOException {
        assertThat(worst(estimator, GRADIENT, lensed)).isGreaterThan(2e-3);
    }

    /** The twin of the column: with or without C^BB is seen. */
    @Test
    void leavingOutBbIsSeen() throws IOException {
        DirectResponse with = new DirectResponse(lensed, lensed, true);
        double table = column("R_EB_noBB", LENSED).get(20);
        assertThat(Math.abs(with.of("EB", 20) / table - 1)).isGreaterThan(5e-3);
    }

    private static double worst(String estimator, String file, Spectra weights) throws IOException {
        boolean withBb = !estimator.endsWith("_noBB");
        DirectResponse direct = new DirectResponse(weights, lensed, withBb);
        double worst = 0;
        for (Map.Entry<Integer, Double> row : column("R_" + estimator, file).entrySet()) {
            double ours = direct.of(estimator.substring(0, 2), row.getKey());
            worst = Math.max(worst, Math.abs(ours / row.getValue() - 1));
        }
        return worst;
    }

    /** A column of a check file by L. */
    private static Map<Integer, Double> column(String name, String file) throws IOException {
        Map<Integer, Double> values = new TreeMap<>();
        try (InputStream in = ResponseTableTest.class.getResourceAsStream("/check/" + file)) {
            List<String> lines =
                    new String(in.readAllBytes(), StandardCharsets.UTF_8)
                            .lines()
                            .filter(line -> !line.startsWith("#"))
                            .toList();
            int at = List.of(lines.get(0).split(",", -1)).indexOf(name);
            for (String line : lines.subList(1, lines.size())) {
                String[] fields = line.split(",", -1);
                values.put(Integer.valueOf(fields[0]), Double.valueOf(fields[at]));
            }
        }
        return values;
    }
}
