package manyskies.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.Reader;
import java.io.StringReader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class SpectraReaderTest {
    private static final String NAME = "spectra.txt";
    private static final String HEAD = "# columns are C_l (not D_l)\n# l TT EE TE PP TP EP\n";

    /** Line 3 is l = 2, so l = n stands on line n + 1; ends at l = 120. */
    private static String good() {
        StringBuilder text = new StringBuilder(HEAD);
        IntStream.rangeClosed(2, 120).forEach(l -> text.append(row(l)));
        return text.toString();
    }

    private static String row(int l) {
        return l + " 9.0 4.0 3.0 1.0e-2 0.1 0.01\n";
    }

    private static UnaryOperator<String> at(int l, String newRow) {
        return text -> text.replace("\n" + row(l), "\n" + newRow);
    }

    private static UnaryOperator<String> header(String newHeader) {
        return text -> text.replace("# l TT EE TE PP TP EP", newHeader);
    }

    private static Spectra read(String text) throws IOException {
        return SpectraReader.unlensed().read(new StringReader(text), NAME);
    }

    private static SpectraException faulty(String text) {
        return catchThrowableOfType(SpectraException.class, () -> read(text));
    }

    static Stream<Arguments> faults() {
        return Stream.of(
                fault(
                        header("# TT EE TE PP TP EP other"),
                        "line 2: no column is named l; name the multipole's column l."),
                fault(
                        header("# l TT EE TE BB TP EP"),
                        "line 2: no column is named PP; this table needs l, TT, EE, TE, PP;"
                                + " add it or correct the header."),
                fault(
                        header("# l TT EE TE PP TP XE"),
                        "line 2: column 7 is named 'XE'; known are l, TT, EE, BB, TE, PP, TP, EP;"
                                + " rename or remove it."),
                fault(
                        header("# l TT EE TE PP TP tp"),
                        "line 2: TP is named twice, columns 6 and 7; rename or remove one."),
                fault(
                        header("# seven numbers a row"),
                        "no line names the columns; put one before the numbers, such as '# l TT EE"
                                + " TE PP' (known: l, TT, EE, BB, TE, PP, TP, EP)."),
                fault(
                        at(14, "14 9.0 4.0 3.0\n"),
                        "line 15: 4 fields, but the header (line 2) names 7; add or remove what"
                                + " differs."),
                fault(
                        at(14, "14 9.0 4.0 3.0 1.0e-2 0.1 0.01 7\n"),
                        "line 15: 8 fields, but the header (line 2) names 7; add or remove what"
                                + " differs."),
                fault(
                        at(14, "14 9.0 four 3.0 1.0e-2 0.1 0.01\n"),
                        "line 15: column 3 is 'four', which is not a number; write it like 1.5 or"
                                + " 1.5e-3."),
                fault(
                        at(14, "14 9.0 4.0D0 3.0 1.0e-2 0.1 0.01\n"),
                        "line 15: column 3 is '4.0D0', which is not a number; write it like 1.5 or"
                                + " 1.5e-3."),
                fault(
                        at(14, "14 9.0 NaN 3.0 1.0e-2 0.1 0.01\n"),
                        "line 15: column 3 is 'NaN', but spectra are finite; compute it again or"
                                + " cut the table here."),
                fault(
                        at(14, "14 9.0 -inf 3.0 1.0e-2 0.1 0.01\n"),
                        "line 15: column 3 is '-inf', but spectra are finite; compute it again or"
                                + " cut the table here."),
                fault(
                        at(14, "14 9.0 1e999 3.0 1.0e-2 0.1 0.01\n"),
                        "line 15: column 3 is '1e999', which is too large for a double; check its"
                                + " exponent."),
                fault(
                        at(14, "14.5 9.0 4.0 3.0 1.0e-2 0.1 0.01\n"),
                        "line 15: l = 14.5; multipoles are whole numbers from 2 up; correct it."),
                fault(
                        at(14, ""),
                        "line 15: l = 15 follows l = 13; multipoles rise by 1; add, remove or sort"
                                + " rows."),
                fault(at(2, ""), "line 3: the table starts at l = 3; start it at l = 2."),
                fault(
                        text -> text.substring(0, text.indexOf("\n90 ") + 1),
                        "the table ends at l = 89; it must reach l = 100 or more."),
                fault(
                        at(14, "14 9.0 -4.0 0 1.0e-2 0.1 0\n"),
                        "line 15: EE = -4.0; an auto-spectrum is never negative; correct it."),
                fault(
                        text -> "\n \n",
                        "the table is empty; give rows from l = 2 up below a line of column"
                                + " names."),
                fault(
                        text -> HEAD,
                        "no row of numbers follows the header; add rows from l = 2 up."),
                fault(
                        text -> text.replace("# columns are C_l (not D_l)", "# our own table"),
                        "the table does not say whether it holds C_l or D_l = l(l+1) C_l/2pi; add a"
                                + " line '# columns are C_l' or '# columns are D_l'."),
                fault(
                        text -> text + "# columns are D_l\n",
                        "the table says both 'columns are C_l' (line 1) and 'columns are D_l' (line"
                                + " 122); keep the one that is true."),
                fault(
                        at(14, "14 9.0 4.0 6.1 1.0e-2 0.1 0.01\n"),
                        "C_l is not positive semi-definite at l = 14: TE = 6.10000 exceeds sqrt(TT"
                                + " EE) = 6.00000; check columns 2 to 4 of spectra.txt."),
                fault(
                        at(14, "14 9.0 4.0 3.0 1.0e-2 -0.4 0\n")
                                        .andThen(at(16, "16 9.0 4.0 3.0 1.0e-2 0.4 0\n"))
                                ::apply,
                        "C_l is not positive semi-definite at l = 14: TP = -0.400000 exceeds"
                                + " sqrt(TT PP) = 0.300000 (the first of 2 such l); check columns"
                                + " 2, 5 and 6 of spectra.txt."),
                fault(
                        at(14, "14 9.0 4.0 0.0 1.0e-2 0.0 0.3\n"),
                        "C_l is not positive semi-definite at l = 14: EP = 0.300000 exceeds sqrt(EE"
                                + " PP) = 0.200000; check columns 3, 5 and 7 of spectra.txt."),
                fault(
                        at(14, "14 1.0 1.0 0.8 1.0 0.8 0\n"),
                        "C_l is not positive semi-definite at l = 14: the correlations TE ="
                                + " 0.800000, TP = 0.800000, EP = 0.00000 have the determinant"
                                + " -0.280000, below 0; check columns 2 to 7 of spectra.txt."));
    }

    private static Arguments fault(UnaryOperator<String> damage, String sentence) {
        return Arguments.of(damage, sentence);
    }

    @ParameterizedTest
    @MethodSource("faults")
    void aFaultIsASentence(UnaryOperator<String> damage, String sentence) {
        assertThat(faulty(damage.apply(good())).faults()).contains(sentence);
    }

    @ParameterizedTest
    @MethodSource("faults")
    void oneFaultDoesNotBreedOthers(UnaryOperator<String> damage, String sentence) {
        boolean headless =
                sentence.contains("no column is named l"); // an unknown name stands there
        assertThat(faulty(damage.apply(good())).faults()).hasSize(headless ? 2 : 1);
    }

    @Test
    void allFaultsComeAtOnceAndInOrder() {
        String text = at(14, "14 9.0 -4.0 0 1.0e-2 0.1 0\n").apply(at(20, "x y\n").apply(good()));
        SpectraException exception = faulty(text.replace("C_l (not D_l)", "what they are"));
        assertThat(exception.faults()).hasSize(5);
        assertThat(exception)
                .hasMessageStartingWith(
                        "spectra.txt: 5 faults, the table was not used.\n  the table does not say");
    }

    @Test
    void aLongListIsCutInTheMessageOnly() {
        String text = good().replace(" 4.0 3.0 ", " -4.0 0.0 ");
        assertThat(faulty(text).faults()).hasSize(119);
        assertThat(faulty(text)).hasMessageEndingWith("... and 99 more.");
    }

    @Test
    void columnsComeInAnyOrderAndCase() throws IOException {
        String text = good().replace("# l TT EE TE PP TP EP", "# ELL tt ee te pp tp ep");
        assertThat(read(text).values(Spectrum.EP)[50]).isEqualTo(0.01);
        Spectra csv =
                read(
                        "\uFEFFEE,TE,L,PP,TT\n# columns are C_l\n"
                                + rows("4.0 , 3.0,%d, 1.0e-2,9.0\n"));
        assertThat(csv.values(Spectrum.TT)[50]).isEqualTo(9.0);
        assertThat(csv.values(Spectrum.EE)[120]).isEqualTo(4.0);
        assertThat(csv.has(Spectrum.TP)).isFalse();
    }

    @Test
    void csvMayHaveItsHeaderCommented() throws IOException {
        Spectra csv =
                read("# columns are C_l\n#ell,TT,EE,TE,PP\n" + rows("%d,9.0,4.0,3.0,1.0e-2\n"));
        assertThat(csv.values(Spectrum.PP)[2]).isEqualTo(0.01);
        assertThat(csv.lmax()).isEqualTo(120);
    }

    @Test
    void monopoleAndDipoleAreReadAsZero() throws IOException {
        Spectra spectra = read(good().replace("\n2 9", "\n0 1 1 0 1 0 0\n1 1 1 0 1 0 0\n2 9"));
        assertThat(spectra.values(Spectrum.TT)).startsWith(0.0, 0.0, 9.0);
    }

    /** The definitions of D_l, by hand at l = 3: l(l+1) = 12. */
    @Test
    void scaledTablesBecomeCl() throws IOException {
        Spectra scaled = read(good().replace("C_l (not D_l)", "D_l (not C_l)"));
        assertThat(scaled.values(Spectrum.TT)[3]).isCloseTo(9.0 * Math.PI / 6, within(1e-14));
        assertThat(scaled.values(Spectrum.TE)[3]).isCloseTo(3.0 * Math.PI / 6, within(1e-14));
        assertThat(scaled.values(Spectrum.PP)[3]).isCloseTo(0.01 * Math.PI / 72, within(1e-18));
        assertThat(scaled.values(Spectrum.TP)[3])
                .isCloseTo(0.1 * 2 * Math.PI / Math.pow(12, 1.5), within(1e-16));
    }

    @Test
    void aSpectrumAtTheEdgeOfWhatIsAllowedPasses() throws IOException {
        assertThat(read(good().replace(" 3.0 1.0e-2 0.1 0.01", " 6.0 1.0e-2 0.0 0.0")).lmax())
                .isEqualTo(120);
    }

    @Test
    void theProjectsOwnTablesAreRead() throws IOException {
        for (String table : List.of("fiducial", "mnu000", "mnu012")) {
            Spectra unlensed = table(SpectraReader.unlensed(), table + "_unlensed.txt");
            assertThat(unlensed.lmax()).isEqualTo(6000);
            assertThat(unlensed.has(Spectrum.TP)).isTrue();
        }
        Spectra lensed = lensedTable();
        // the row of l = 20 as it stands in the file
        assertThat(lensed.values(Spectrum.BB)[20]).isEqualTo(1.79661390e-06);
        assertThat(lensed.values(Spectrum.TE)[20]).isEqualTo(1.93243413e-02);
    }

    static Spectra fiducial() throws IOException {
        return table(SpectraReader.unlensed(), "fiducial_unlensed.txt");
    }

    static Spectra lensedTable() throws IOException {
        return table(
                SpectraReader.requiring(Spectrum.TT, Spectrum.EE, Spectrum.BB, Spectrum.TE),
                "fiducial_lensed.txt");
    }

    private static Spectra table(SpectraReader reader, String name) throws IOException {
        try (Reader text = Files.newBufferedReader(Path.of("..", "conf", "spectra", name))) {
            return reader.read(text, name);
        }
    }

    private static String rows(String format) {
        StringBuilder text = new StringBuilder();
        IntStream.rangeClosed(2, 120).forEach(l -> text.append(format.replace("%d", "" + l)));
        return text.toString();
    }
}
