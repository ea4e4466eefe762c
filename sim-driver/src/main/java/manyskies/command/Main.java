package manyskies.command;

import java.io.PrintWriter;
import java.nio.charset.Charset;
import picocli.CommandLine;

/** The program: a command line in, an exit code out. */
public final class Main {
    private Main() {}

    /** Runs one command and ends the JVM with its {@link ExitCode}. */
    public static void main(String[] arguments) {
        Charset console = Charset.defaultCharset();
        PrintWriter out = new PrintWriter(System.out, true, console);
        PrintWriter err = new PrintWriter(System.err, true, console);
        System.exit(run(Services.ofThisProgram(), out, err, arguments));
    }

    /**
     * Runs one command.
     *
     * @return the exit code
     */
    static int run(Services services, PrintWriter out, PrintWriter err, String... arguments) {
        CommandLine line = new CommandLine(new ManyskiesCommand());
        ManyskiesCommand.subcommands(services).forEach(line::addSubcommand);
        line.setOut(out);
        line.setErr(err);
        line.setExecutionExceptionHandler(new Failures());
        line.setParameterExceptionHandler(Failures::usage);
        line.setCaseInsensitiveEnumValuesAllowed(true);
        int code = line.execute(arguments);
        out.flush();
        err.flush();
        return code;
    }
}
