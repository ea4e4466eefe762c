package manyskies.command;

import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.file.FileSystemException;
import java.util.List;
import manyskies.farm.FarmException;
import manyskies.result.RunFolderException;
import manyskies.specification.SpecificationException;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/**
 * The one place where exceptions become sentences and exit codes.
 *
 * <p>Faulty input gives a sentence and no stack trace, a failing environment likewise; anything else
 * is our fault, and whoever reports it needs the trace.
 */
final class Failures implements IExecutionExceptionHandler {

    @Override
    public int handleExecutionException(Exception thrown, CommandLine line, ParseResult parsed) {
        return report(thrown, line.getErr()).code();
    }

    static ExitCode report(Throwable thrown, PrintWriter err) {
        ExitCode code = codeOf(thrown);
        if (code == ExitCode.OUR_FAULT) {
            thrown.printStackTrace(err);
            err.println(
                    "This is a fault of manyskies: please report it, with the lines above and the"
                            + " specification.");
        } else {
            err.println(sentence(thrown));
        }
        return code;
    }

    private static ExitCode codeOf(Throwable thrown) {
        if (thrown instanceof SpecificationException || thrown instanceof InputException) {
            return ExitCode.BAD_INPUT;
        }
        if (thrown instanceof RunFolderException
                || thrown instanceof FarmException
                || thrown instanceof EnvironmentException
                || thrown instanceof UncheckedIOException
                || thrown instanceof FileSystemException) {
            return ExitCode.ENVIRONMENT;
        }
        return ExitCode.OUR_FAULT;
    }

    /** The message; for exceptions of files, whose message is a path, with the reason. */
    private static String sentence(Throwable thrown) {
        Throwable cause = thrown.getCause();
        if (thrown instanceof UncheckedIOException && cause != null) {
            boolean own = !cause.toString().equals(thrown.getMessage());
            return own ? thrown.getMessage() + " (" + sentence(cause) + ")" : sentence(cause);
        }
        if (thrown instanceof FileSystemException file) {
            String reason = file.getReason();
            return file.getFile()
                    + ": "
                    + (reason == null ? file.getClass().getSimpleName() : reason);
        }
        return thrown.getMessage();
    }

    /** A faulty command line: one sentence, and where help is. */
    static int usage(ParameterException fault, String[] arguments) {
        CommandLine line = fault.getCommandLine();
        line.getErr().println(usageSentence(fault));
        line.getErr().println("See '" + line.getCommandSpec().qualifiedName() + " --help'.");
        return ExitCode.BAD_INPUT.code();
    }

    private static String usageSentence(ParameterException fault) {
        String text = fault.getMessage();
        if (fault instanceof UnmatchedArgumentException unmatched) {
            List<String> near = unmatched.getSuggestions();
            String word = unmatched.getUnmatched().get(0);
            String kind = word.startsWith("-") ? "option" : "command or argument";
            text = "'" + word + "' is no " + kind + " here";
            text += near.isEmpty() ? "." : "; did you mean " + String.join(" or ", near) + "?";
        }
        return text;
    }
}
