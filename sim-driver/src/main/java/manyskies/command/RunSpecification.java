package manyskies.command;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import manyskies.estimator.Estimators;
import manyskies.result.RunFolder;
import manyskies.specification.CanonicalYaml;
import manyskies.specification.Sets;
import manyskies.specification.Specification;
import manyskies.specification.SpecificationDifference;
import manyskies.specification.SpecificationException;
import manyskies.specification.SpecificationHash;
import manyskies.specification.SpecificationReader;
import manyskies.spectrum.SpectraWriter;

/** The specification a run folder holds. */
final class RunSpecification {
    private static final String FILE = "specification.yaml";

    private RunSpecification() {}

    /**
     * The specification of a run.
     *
     * @throws InputException if the folder is none of a run
     * @throws SpecificationException if its specification was damaged
     */
    static Specification read(Path run) throws SpecificationException {
        requireNoFile(run);
        if (!Files.isDirectory(run)) {
            throw new InputException(run + ": there is no such folder; 'manyskies run' makes one.");
        }
        if (!isRun(run)) {
            throw new InputException(
                    run + ": this is no run folder, for it holds no " + FILE + ".");
        }
        return SpecificationReader.read(run.resolve(FILE), Estimators.installed().keySet());
    }

    private static void requireNoFile(Path run) {
        if (Files.isRegularFile(run)) {
            throw new InputException(run + ": this is a file; name the folder of a run.");
        }
    }

    private static boolean isRun(Path folder) {
        return Files.exists(folder.resolve(FILE));
    }

    /**
     * Refuses to mix two runs in one folder; larger counts are the same run, extended.
     *
     * @throws InputException saying what differs, or that there is a file in the folder's place
     */
    static void requireSameRun(Path run, Specification asked) throws SpecificationException {
        requireNoFile(run);
        if (!isRun(run)) {
            return;
        }
        Specification held = read(run);
        if (!SpecificationHash.identity(held).equals(SpecificationHash.identity(asked))) {
            throw new InputException(
                    run
                            + ": holds a run of another specification, nothing was run."
                            + lines(SpecificationDifference.between(held, asked))
                            + "\nGive this one another folder with --out, or another name.");
        }
        Sets before = held.sets();
        Sets after = asked.sets();
        if (after.data() < before.data() || after.pairs() < before.pairs()) {
            throw new InputException(
                    run
                            + ": holds more realisations than asked for, nothing was run."
                            + lines(SpecificationDifference.between(held, asked))
                            + "\nA run only grows: ask for at least as many, or use another folder.");
        }
    }

    private static String lines(List<String> differences) {
        StringBuilder text = new StringBuilder();
        differences.forEach(line -> text.append("\n  ").append(line));
        return text.toString();
    }

    /** Makes a specification the folder's; a folder that has it already is left as it is. */
    static void write(RunFolder folder, Specification asked) {
        folder.replace(
                CanonicalYaml.SPECTRA,
                SpectraWriter.write(asked.unlensed(), List.of()).getBytes(StandardCharsets.UTF_8));
        List<String> remarks =
                List.of(
                        "manyskies " + ManyskiesCommand.Version.number(),
                        "hash " + SpecificationHash.of(asked));
        folder.replace(FILE, CanonicalYaml.write(asked, remarks).getBytes(StandardCharsets.UTF_8));
    }
}
