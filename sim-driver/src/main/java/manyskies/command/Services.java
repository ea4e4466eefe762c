package manyskies.command;

import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneId;
import java.util.function.Supplier;

/**
 * What the commands stand on, so that a test can put something else in its place.
 *
 * @param realisations the code of one realisation, made when a command first asks for it
 * @param folder what relative paths are relative to
 * @param heap bytes the heap can grow to
 * @param clock the wall clock
 * @param terminal whether the progress line can be redrawn
 */
record Services(
        Supplier<Realisations> realisations,
        Path folder,
        long heap,
        Clock clock,
        boolean terminal) {

    /** Set by the launcher, which can ask the shell. */
    private static final String TERMINAL = "manyskies.terminal";

    static Services ofThisProgram() {
        return new Services(
                SimulatedRealisations::new,
                Path.of(""),
                Runtime.getRuntime().maxMemory(),
                Clock.system(ZoneId.systemDefault()),
                Boolean.getBoolean(TERMINAL));
    }
}
