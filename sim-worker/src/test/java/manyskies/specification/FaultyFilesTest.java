package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Each kind of faulty file gives its sentence, its line and its mend, and nothing else. */
class FaultyFilesTest {
    @TempDir static Path folder;
    private static SpecificationFiles files;

    @BeforeAll
    static void writeTable() {
        files = new SpecificationFiles(folder);
    }

    @ParameterizedTest(name = "{0} -> {1}")
    @MethodSource({"keys", "values", "patches", "surveys", "ranges", "bands", "counts", "syntax"})
    void oneFaultGivesOneSentence(String from, String to, int line, String sentence) {
        assertThat(SpecificationFiles.FULL).contains(from);
        String text = edited(from, to);
        assertThat(files.faults(text)).containsExactly(new Fault(line, sentence));
    }

    static List<Arguments> keys() {
        return List.of(
                edit(
                        "seed: 7",
                        "sede: 7",
                        2,
                        "'sede' is no key of a specification; the nearest is 'seed'."),
                edit(
                        "seed: 7",
                        "telescope: 7",
                        2,
                        "'telescope' is no key of a specification; allowed are name, seed, spectra, patch, survey, analysis, sets, block."),
                edit(
                        "lmin: 100, lmax",
                        "lmin: 100, lmaks",
                        17,
                        "'lmaks' is no key of analysis.temperature; the nearest is 'lmax'."),
                edit(
                        "  pixels: ",
                        "  pixles: ",
                        5,
                        "'pixles' is no key of patch; the nearest is 'pixels'."),
                edit(
                        "seed: 7",
                        "name: other",
                        2,
                        "name stands twice, first in line 1; remove one."),
                edit(
                        "  beam: 1.5 arcmin",
                        "  beam: 1.5 arcmin\n  beam: 2 arcmin",
                        9,
                        "survey.beam stands twice, first in line 8; remove one."),
                edit(
                        "seed: 7",
                        "[seed]: 7",
                        2,
                        "'[...]' is no key of a specification; allowed are name, seed, spectra, patch, survey, analysis, sets, block."),
                edit("seed: 7", "seed:", 2, "seed is empty; it must be a whole number of 64 bits."),
                edit(
                        "spectra: table.txt",
                        "# none",
                        1,
                        "spectra is missing; write for example 'spectra: spectra/fiducial_unlensed.txt'."),
                edit(
                        "  pixel-size: 2 arcmin\n",
                        "",
                        4,
                        "patch.pixel-size is missing; write for example 'pixel-size: 2 arcmin'."),
                edit(
                        "  data: 128\n",
                        "",
                        22,
                        "sets.data is missing; write for example 'data: 128'."),
                edit(
                        "{depth: 5 uK-arcmin, knee: 800, slope: 3}",
                        "{knee: 800, slope: 3}",
                        10,
                        "survey.noise.temperature.depth is missing; write for example 'depth: 5 uK-arcmin'."));
    }

    static List<Arguments> values() {
        return List.of(
                edit(
                        "name: trial",
                        "name: my run",
                        1,
                        "name is 'my run'; it must begin with a letter or digit and have at most 100 letters, digits, '.', '_', '-'."),
                edit(
                        "name: trial",
                        "name: ../trial",
                        1,
                        "name is '../trial'; it must begin with a letter or digit and have at most 100 letters, digits, '.', '_', '-'."),
                edit(
                        "seed: 7",
                        "seed: 7.5",
                        2,
                        "seed is '7.5'; it must be a whole number of 64 bits."),
                edit(
                        "seed: 7",
                        "seed: 9223372036854775808",
                        2,
                        "seed is '9223372036854775808'; it must be a whole number of 64 bits."),
                edit(
                        "seed: 7",
                        "seed: [1, 2]",
                        2,
                        "seed is a list; it must be a whole number of 64 bits."),
                edit(
                        "2 arcmin",
                        "2",
                        6,
                        "patch.pixel-size is 2 without a unit; allowed units are arcmin, deg, arcsec, rad."),
                edit(
                        "2 arcmin",
                        "2 uK-arcmin",
                        6,
                        "patch.pixel-size is '2 uK-arcmin'; 'uK-arcmin' is no unit of an angle, allowed are arcmin, deg, arcsec, rad."),
                edit(
                        "2 arcmin",
                        "two arcmin",
                        6,
                        "patch.pixel-size is 'two arcmin'; write an angle such as '5 arcmin'."),
                edit(
                        "2 arcmin",
                        "-2 arcmin",
                        6,
                        "patch.pixel-size is -2 arcmin; an angle must be positive."),
                edit(
                        "2 arcmin",
                        "none",
                        6,
                        "patch.pixel-size is 'none'; write an angle such as '5 arcmin'."),
                edit(
                        "1.5 arcmin",
                        "0 arcmin",
                        8,
                        "survey.beam is 0 arcmin; an angle must be positive, or 'none'."),
                edit(
                        "7.07 uK-arcmin",
                        "7.07 arcmin",
                        11,
                        "survey.noise.polarisation is '7.07 arcmin'; 'arcmin' is no unit of a depth, allowed are uK-arcmin."),
                edit(
                        "7.07 uK-arcmin",
                        "-7.07 uK-arcmin",
                        11,
                        "survey.noise.polarisation is -7.07 uK-arcmin; a depth must be positive."),
                edit(
                        "7.07 uK-arcmin",
                        "7.07",
                        11,
                        "survey.noise.polarisation is 7.07 without a unit; allowed units are uK-arcmin."),
                edit(
                        "{lmin: 200, lmax: 2500}",
                        "2500",
                        18,
                        "analysis.polarisation is no mapping; its keys are lmin, lmax."));
    }

    static List<Arguments> patches() {
        return List.of(
                edit(
                        "[256, 240]",
                        "250.5",
                        5,
                        "patch.pixels is 250.5; it must be one even whole number from 16 to 8192, or two: [x, y]."),
                edit(
                        "[256, 240]",
                        "255",
                        5,
                        "patch.pixels is 255; it must be even with no prime factor above 5; the nearest are 250 and 256."),
                edit(
                        "[256, 240]",
                        "[256, 254]",
                        5,
                        "patch.pixels is 254; it must be even with no prime factor above 5; the nearest are 250 and 256."),
                edit(
                        "[256, 240]",
                        "8",
                        5,
                        "patch.pixels is 8; it must be one even whole number from 16 to 8192, or two: [x, y]."),
                edit(
                        "[256, 240]",
                        "16384",
                        5,
                        "patch.pixels is 16384; it must be one even whole number from 16 to 8192, or two: [x, y]."),
                edit(
                        "[256, 240]",
                        "[256, 256, 256]",
                        5,
                        "patch.pixels is a list of 3; it must be one even whole number from 16 to 8192, or two: [x, y]."),
                edit(
                        "[256, 240]",
                        "[]",
                        5,
                        "patch.pixels is a list of 0; it must be one even whole number from 16 to 8192, or two: [x, y]."),
                edit(
                        "[256, 240]",
                        "{x: 256}",
                        5,
                        "patch.pixels is a mapping; it must be one even whole number from 16 to 8192, or two: [x, y]."),
                edit(
                        "pixels: [256, 240]\n  pixel-size: 2 arcmin",
                        "pixels: 8192\n  pixel-size: 1 arcmin",
                        6,
                        "patch.pixel-size is 1 arcmin; the patch would be wider than 90 deg, where a flat sky means nothing; make it smaller."));
    }

    static List<Arguments> surveys() {
        return List.of(
                edit(
                        "knee: 800, slope: 3",
                        "knee: 800",
                        10,
                        "survey.noise.temperature.knee is 800 without a slope; write for example 'slope: 3', or leave out the knee."),
                edit(
                        "knee: 800, slope: 3",
                        "slope: 3",
                        10,
                        "survey.noise.temperature.slope is 3 without a knee; write for example 'knee: 800', or leave out the slope."),
                edit(
                        "knee: 800",
                        "knee: -800",
                        10,
                        "survey.noise.temperature.knee is -800; it must be a multipole, 0 for white noise."),
                edit(
                        "slope: 3",
                        "slope: 0",
                        10,
                        "survey.noise.temperature.slope is 0; it must be a positive number up to 10: N_l grows as l^-slope below the knee."),
                edit(
                        "splits: 2",
                        "splits: 0",
                        12,
                        "survey.splits is 0; it must be a whole number from 1 to 64."),
                edit(
                        "splits: 2",
                        "splits: 65",
                        12,
                        "survey.splits is 65; it must be a whole number from 1 to 64."),
                edit(
                        "1 deg",
                        "4 deg",
                        13,
                        "survey.edge-taper is 4 deg; it must be less than half of the patch's shorter side, 4 deg."),
                edit(
                        "1 deg",
                        "1 degree",
                        13,
                        "survey.edge-taper is '1 degree'; 'degree' is no unit of an angle, allowed are arcmin, deg, arcsec, rad."),
                edit(
                        "1.5 arcmin",
                        "5 deg",
                        8,
                        "survey.beam is 5 deg; it must be less than half of the patch's shorter side, 4 deg."),
                edit(
                        "curl: 0.5",
                        "curl: -0.5",
                        14,
                        "survey.curl is -0.5; it must be a number from 0 to 10."),
                edit(
                        "curl: 0.5",
                        "curl: much",
                        14,
                        "survey.curl is 'much'; it must be a number from 0 to 10."),
                edit(
                        "curl: 0.5",
                        "curl: 1e999",
                        14,
                        "survey.curl is 1e999; it must be a number from 0 to 10."),
                edit(
                        "spline-degree: 7",
                        "spline-degree: 4",
                        15,
                        "survey.spline-degree is 4; it must be 3, 5 or 7."));
    }

    static List<Arguments> ranges() {
        return List.of(
                edit(
                        "{lmin: 100, lmax: 3000}",
                        "{lmin: 3000, lmax: 2500}",
                        17,
                        "analysis.temperature.lmax is 2500; lmin must be below lmax, but they are 3000 and 2500."),
                edit(
                        "{lmin: 100, lmax: 3000}",
                        "{lmin: 3000}",
                        17,
                        "analysis.temperature.lmin is 3000; lmin must be below lmax, but they are 3000 and 3000, the default with these pixels and spectra."),
                edit(
                        "{lmin: 100, lmax: 3000}",
                        "{lmin: 1, lmax: 3000}",
                        17,
                        "analysis.temperature.lmin is 1; it must be a multipole from 2 up."),
                edit(
                        "{lmin: 100, lmax: 3000}",
                        "{lmin: 100, lmax: 4010}",
                        17,
                        "analysis.temperature.lmax is 4010; the spectra end at l = 4000."),
                edit(
                        "lmax: 3000",
                        "lmax: 3 000",
                        17,
                        "analysis.temperature.lmax is '3 000'; it must be a multipole above 2."),
                edit(
                        "2 arcmin",
                        "3 arcmin",
                        17,
                        "analysis.temperature.lmax is 3000; it must be at most 0.75 of the patch's Nyquist multipole, 2700; for this lmax pixels have at most 2.7 arcmin."),
                edit(
                        "weights: lensed",
                        "weights: lensed-gradients",
                        19,
                        "analysis.weights is 'lensed-gradients'; the nearest is 'lensed-gradient'."),
                edit(
                        "weights: lensed",
                        "weights: best",
                        19,
                        "analysis.weights is 'best'; allowed are lensed-gradient, lensed, unlensed."),
                edit(
                        "[tt, eb, mv]",
                        "[tt, ebb, mv]",
                        20,
                        "'ebb' is no estimator that is installed; the nearest is 'eb'."),
                edit(
                        "[tt, eb, mv]",
                        "[tt, shear, mv]",
                        20,
                        "'shear' is no estimator that is installed; allowed are eb, ee, joint, mv, tb, te, tt."),
                edit(
                        "[tt, eb, mv]",
                        "[tt, eb, tt]",
                        20,
                        "analysis.estimators is a list with 'tt' twice; remove one."),
                edit(
                        "[tt, eb, mv]",
                        "[]",
                        20,
                        "analysis.estimators is an empty list; list some of eb, ee, joint, mv, tb, te, tt."),
                edit(
                        "[tt, eb, mv]",
                        "{tt: 1}",
                        20,
                        "analysis.estimators is a mapping; list some of eb, ee, joint, mv, tb, te, tt."));
    }

    static List<Arguments> bands() {
        return List.of(
                edit(
                        "from: 50, to: 1550",
                        "from: 0, to: 1500",
                        21,
                        "analysis.bands.from is 0; L = 0 is not reconstructed, and the patch's lowest mode is |l| = 42.19; begin at 43."),
                edit(
                        "to: 1550",
                        "to: 1500",
                        21,
                        "analysis.bands.to is 1500; it must be from plus a whole number of widths; the nearest are 1450 and 1550."),
                edit(
                        "to: 1550",
                        "to: 40",
                        21,
                        "analysis.bands.to is 40; it must be above from, 50."),
                edit(
                        "width: 100",
                        "width: 0",
                        21,
                        "analysis.bands.width is 0; a band's width must be positive."),
                edit(
                        "width: 100",
                        "width: 10",
                        21,
                        "analysis.bands.from is 50; the band from 50 to 60 holds no mode of the patch; make bands wider than the spacing 42.19."),
                edit(
                        "width: 100",
                        "width: 0.5",
                        21,
                        "analysis.bands.width is 0.5; that makes more than 1000 bands, make them wider."),
                edit(
                        "from: 50, to: 1550",
                        "from: 50, to: 3050",
                        21,
                        "analysis.bands.to is 3050; the filters' multipoles allow L up to 3000."),
                edit(
                        "{from: 50, to: 1550, width: 100}",
                        "{from: 50, width: 100}",
                        21,
                        "analysis.bands.to is missing; write for example 'to: 1540'."),
                edit(
                        "{from: 50, to: 1550, width: 100}",
                        "{edges: [50]}",
                        21,
                        "analysis.bands.edges is a list of 1; a band needs two edges or more."),
                edit(
                        "{from: 50, to: 1550, width: 100}",
                        "{edges: [50, 200, 200]}",
                        21,
                        "analysis.bands.edges is 200 after 200; edges must rise."),
                edit(
                        "{from: 50, to: 1550, width: 100}",
                        "{edges: [5, 40, 200]}",
                        21,
                        "analysis.bands.edges is 5; the band from 5 to 40 holds no mode of the patch; its lowest is |l| = 42.19, begin at 43."),
                edit(
                        "{from: 50, to: 1550, width: 100}",
                        "{edges: [50, x]}",
                        21,
                        "analysis.bands.edges is 'x'; it must be a multipole, 0 or above."),
                edit(
                        "from: 50, to: 1550, width: 100",
                        "from: 50, edges: [50, 100]",
                        21,
                        "analysis.bands.from stands beside edges; give from, to and width, or edges alone."),
                edit(
                        "{from: 50, to: 1550, width: 100}",
                        "100",
                        21,
                        "analysis.bands is no mapping; its keys are from, to, width, edges."));
    }

    static List<Arguments> counts() {
        return List.of(
                edit(
                        "data: 128",
                        "data: 100",
                        23,
                        "sets.data is 100; it must be a multiple of block, 16, since a block is committed whole; the nearest are 96 and 112."),
                edit(
                        "data: 128",
                        "data: 8",
                        23,
                        "sets.data is 8; it must be a multiple of block, 16, since a block is committed whole; the nearest is 16."),
                edit(
                        "data: 128",
                        "data: 0",
                        23,
                        "sets.data is 0; it must be a whole number from 1 to 10000000."),
                edit(
                        "data: 128",
                        "data: many",
                        23,
                        "sets.data is 'many'; it must be a whole number from 1 to 10000000."),
                edit(
                        "pairs: 64",
                        "pairs: 8",
                        24,
                        "sets.pairs is 8; it must be a multiple of block, 16, since a block is committed whole; the nearest are 0 and 16."),
                edit(
                        "pairs: 64",
                        "pairs: -16",
                        24,
                        "sets.pairs is -16; it must be a whole number from 0 to 10000000."),
                edit(
                        "block: 16",
                        "block: 0",
                        25,
                        "block is 0; it must be a whole number from 1 to 4096."));
    }

    static List<Arguments> syntax() {
        return List.of(
                edit(
                        "[256, 240]",
                        "[256, 240",
                        6,
                        "the text is not YAML: expected ',' or ']', but got : while parsing a flow sequence begun in line 5; check indentation, colons, quotes and brackets here and in the line above."),
                edit(
                        "seed: 7",
                        "\tseed: 7",
                        2,
                        "the text is not YAML: found character '\\t(TAB)' that cannot start any token. (Do not use \\t(TAB) for indentation) while scanning for the next token; check indentation, colons, quotes and brackets here and in the line above."),
                edit(
                        "seed: 7",
                        "seed: \"7",
                        26,
                        "the text is not YAML: found unexpected end of stream while scanning a quoted scalar begun in line 2; check indentation, colons, quotes and brackets here and in the line above."),
                edit(
                        "  beam: 1.5 arcmin",
                        " beam: 1.5 arcmin",
                        9,
                        "the text is not YAML: mapping values are not allowed here; check indentation, colons, quotes and brackets here and in the line above."),
                edit("seed: 7", "seed: &s 7", 2, "'&s' is an anchor; write the value without it."),
                edit("seed: 7", "seed: *s", 2, "'*s' is an alias; write the value out."),
                edit(
                        "seed: 7",
                        "seed: !!int 7",
                        2,
                        "'tag:yaml.org,2002:int' is a tag; write the value without it."),
                edit(
                        "block: 16",
                        "block: 16\n---\nseed: 1",
                        26,
                        "a second document begins; a file holds one specification."),
                edit(
                        "seed: 7",
                        "seed: [[[[[[[[[[[[[[[[[[[[]]]]]]]]]]]]]]]]]]]]",
                        2,
                        "the nesting is deeper than 16; three levels suffice."),
                edit(
                        "seed: 7",
                        "seed: \u0001",
                        2,
                        "the text holds the control character U+0001; remove it."));
    }

    /** The full file with the first occurrence of a text replaced. */
    private static String edited(String from, String to) {
        int at = SpecificationFiles.FULL.indexOf(from);
        String after = SpecificationFiles.FULL.substring(at + from.length());
        return SpecificationFiles.FULL.substring(0, at) + to + after;
    }

    private static Arguments edit(String from, String to, int line, String sentence) {
        return Arguments.of(from, to, line, sentence);
    }
}
