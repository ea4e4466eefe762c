package manyskies.specification;

import java.io.IOException;
import java.io.StringReader;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import java.util.regex.Pattern;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.SpectraException;
import manyskies.spectrum.SpectraReader;
import org.snakeyaml.engine.v2.nodes.Node;

/**
 * Reads a specification file, with every default resolved, or finds all its faults at once.
 *
 * <p>Needed are {@code spectra}, {@code patch}, {@code survey.noise.temperature} and {@code
 * sets.data}. Defaults: name, the file's name without its ending; seed 1; no beam; polarisation
 * noise white, sqrt(2) times the depth of temperature; one split; no edge taper; no curl; splines
 * of degree 5; filters from l = 100 to 3000 (less, in whole hundreds, where pixels or spectra do
 * not reach so far); lensed-gradient weights; estimators tt, te, tb, ee, eb, mv, joint; bands of
 * width 100 from L = 40 to 1540; half as many pairs as data; blocks of 16.
 *
 * <p>The spectra file is found relative to the specification. Stateless; reads two files, writes
 * nothing.
 */
public final class SpecificationReader {
    /** Keys of a file in canonical order. */
    static final List<String> KEYS =
            List.of("name", "seed", "spectra", "patch", "survey", "analysis", "sets", "block");

    private static final int MOST_MEBIBYTES = 1;
    private static final int MOST_SPECTRA_MEBIBYTES = 64;
    private static final int MOST_SPECTRA_FAULTS = 20;
    private static final long DEFAULT_SEED = 1;
    private static final int DEFAULT_BLOCK = 16;
    private static final int LARGEST_BLOCK = 4096;
    private static final Pattern NAME = Pattern.compile("[A-Za-z0-9][A-Za-z0-9._-]{0,99}");
    private static final String NAMES =
            "it must begin with a letter or digit and have at most 100 letters, digits, '.', '_', '-'";

    private final Path file;
    private final Set<String> estimators;
    private final Faults faults = new Faults();

    private SpecificationReader(Path file, Set<String> estimators) {
        this.file = file;
        this.estimators = Set.copyOf(estimators);
    }

    /**
     * The specification in a file.
     *
     * @param file a YAML file of at most 1 MiB
     * @param knownEstimators names of the estimators that are installed
     * @throws SpecificationException with all faults, if there is one
     */
    public static Specification read(Path file, Set<String> knownEstimators)
            throws SpecificationException {
        SpecificationReader reader = new SpecificationReader(file, knownEstimators);
        Optional<Specification> found = reader.root().flatMap(reader::specification);
        if (found.isEmpty() || !reader.faults.none()) {
            throw new SpecificationException(file.toString(), reader.faults.sorted());
        }
        return found.get();
    }

    private Optional<Node> root() {
        try {
            Optional<Node> root = YamlTree.of(FileText.read(file, MOST_MEBIBYTES), faults);
            if (root.isEmpty() && faults.none()) {
                faults.add(0, "the file is empty; its keys are " + String.join(", ", KEYS) + ".");
            }
            return root;
        } catch (FileText.Unreadable e) {
            faults.add(0, "the file " + e.getMessage());
            return Optional.empty();
        }
    }

    private Optional<Specification> specification(Node root) {
        Section top = Section.file(root, faults, KEYS);
        String name = name(top);
        long seed = seed(top);
        top.require("spectra", "spectra: spectra/fiducial_unlensed.txt");
        String spectraFile = top.text("spectra", "it must be the path of a table").orElse("");
        Optional<Spectra> spectra = spectraFile.isEmpty() ? Optional.empty() : spectra(top);
        PatchReader.Shape shape = PatchReader.read(top.section("patch", PatchReader.KEYS));
        Survey survey = SurveyReader.read(top.section("survey", SurveyReader.KEYS), shape);
        double tableLmax = spectra.map(s -> (double) s.lmax()).orElse(Double.NaN);
        Section belief = top.section("analysis", AnalysisReader.KEYS);
        Optional<Analysis> analysis = AnalysisReader.read(belief, shape, tableLmax, estimators);
        double block = top.whole("block", DEFAULT_BLOCK, 1, LARGEST_BLOCK);
        Sets sets = SetsReader.read(top.section("sets", SetsReader.KEYS), block);
        return faults.none()
                ? Optional.of(
                        new Specification(
                                name,
                                seed,
                                shape.patch(),
                                spectra.orElseThrow(),
                                spectraFile,
                                survey,
                                analysis.orElseThrow(),
                                sets,
                                (int) block))
                : Optional.empty();
    }

    private String name(Section top) {
        if (top.has("name")) {
            String name = top.text("name", NAMES).orElse("");
            if (!name.isEmpty() && !NAME.matcher(name).matches()) {
                top.fault("name", "'" + name + "'", NAMES);
            }
            return name;
        }
        String stem = file.getFileName().toString().replaceFirst("\\.[A-Za-z]+$", "");
        if (!NAME.matcher(stem).matches()) {
            faults.add(
                    1,
                    "the file's name, '"
                            + stem
                            + "', cannot name the run: "
                            + NAMES
                            + "; add a key 'name'.");
        }
        return stem;
    }

    private long seed(Section top) {
        String allowed = "it must be a whole number of 64 bits";
        Optional<String> text = top.text("seed", allowed);
        if (text.isEmpty()) {
            return DEFAULT_SEED;
        }
        OptionalLong seed = Decimal.parseLong(text.get());
        if (seed.isEmpty()) {
            top.fault("seed", "'" + text.get() + "'", allowed);
        }
        return seed.orElse(0);
    }

    private Optional<Spectra> spectra(Section top) {
        String name = top.text("spectra", "").orElseThrow();
        try {
            String text = FileText.read(file.resolveSibling(name), MOST_SPECTRA_MEBIBYTES);
            return Optional.of(SpectraReader.unlensed().read(new StringReader(text), name));
        } catch (InvalidPathException e) {
            top.fault("spectra", "'" + name + "'", "that is no path: " + e.getReason());
        } catch (FileText.Unreadable e) {
            top.faults()
                    .add(top.line("spectra"), "the spectra file " + sought(name) + e.getMessage());
        } catch (SpectraException e) {
            addAll(top.line("spectra"), name, e.faults());
        } catch (IOException e) {
            throw new IllegalStateException("a text in memory could not be read", e);
        }
        return Optional.empty();
    }

    /** The name as it was given and, of a relative one, from where it leads. */
    private String sought(String name) {
        return Path.of(name).isAbsolute()
                ? name + " "
                : name + " (relative to " + file.getFileName() + ") ";
    }

    private void addAll(int line, String table, List<String> found) {
        found.stream().limit(MOST_SPECTRA_FAULTS).forEach(f -> faults.add(line, table + ": " + f));
        if (found.size() > MOST_SPECTRA_FAULTS) {
            int more = found.size() - MOST_SPECTRA_FAULTS;
            faults.add(line, table + ": " + more + " more faults of this kind.");
        }
    }
}
