package manyskies.command;

import java.nio.file.Path;

/** Where libraries log to. */
final class Log {
    private static final String FILE = "manyskies.log"; // log4j2.properties reads it

    private Log() {}

    /** Sends what libraries say to a file of the run, unless the user chose another. */
    static void into(Path run) {
        if (System.getProperty(FILE) == null) {
            System.setProperty(FILE, run.resolve("libraries.log").toString());
        }
    }
}
