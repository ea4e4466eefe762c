package manyskies.specification;

import java.io.Serializable;
import manyskies.spectrum.Spectra;

/**
 * A run, completely: with an index it determines a realisation to the last bit.
 *
 * <p>The spectra stand in it as numbers, so that a task needs no file.
 *
 * @param name name of the run
 * @param seed the run's seed; every random number is addressed from it
 * @param patch the sky patch
 * @param unlensed unlensed spectra of the truth, and of the belief
 * @param spectraFile where they were read, as written in the specification, for the record
 * @param survey what the simulated sky and instrument are
 * @param analysis what filters and estimators believe
 * @param sets how many realisations of which kind
 * @param block realisations per block: the unit of work, of commit and of error
 */
public record Specification(
        String name,
        long seed,
        Patch patch,
        Spectra unlensed,
        String spectraFile,
        Survey survey,
        Analysis analysis,
        Sets sets,
        int block)
        implements Serializable {

    /** The same run with another note of where its spectra were read. */
    public Specification withSpectraFile(String file) {
        return new Specification(name, seed, patch, unlensed, file, survey, analysis, sets, block);
    }
}
