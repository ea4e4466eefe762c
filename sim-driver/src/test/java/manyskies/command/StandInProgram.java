package manyskies.command;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;

/** The program with stand-in realisations of 25 ms, for tests that kill it. */
final class StandInProgram {
    private static final long MILLISECONDS = 25;

    private StandInProgram() {}

    public static void main(String[] arguments) {
        Services services =
                new Services(
                        () -> new StandInRealisations(MILLISECONDS, -1, 1 << 20),
                        Path.of(""),
                        1L << 30,
                        Clock.systemUTC(),
                        false);
        PrintWriter out = new PrintWriter(System.out, true, StandardCharsets.UTF_8);
        PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
        System.exit(Main.run(services, out, err, arguments));
    }
}
