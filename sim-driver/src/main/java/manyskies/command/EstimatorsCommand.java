package manyskies.command;

import java.io.PrintWriter;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import manyskies.estimator.EstimatorFactory;
import manyskies.estimator.Estimators;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Lists the estimators that are installed, with the fields they need. */
@Command(
        name = "estimators",
        description = "List the installed estimators and the fields they need.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example: manyskies estimators"})
final class EstimatorsCommand implements Callable<Integer> {
    @Spec private CommandSpec spec;

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        out.printf(Locale.ROOT, "%-10s %-6s %s%n", "name", "needs", "what it is");
        Estimators.installed().values().forEach(factory -> print(factory, out));
        return ExitCode.OK.code();
    }

    private static void print(EstimatorFactory factory, PrintWriter out) {
        String fields =
                factory.needs().stream()
                        .sorted()
                        .map(field -> field.name().substring(0, 1))
                        .collect(Collectors.joining());
        out.printf(Locale.ROOT, "%-10s %-6s %s%n", factory.name(), fields, factory.summary());
    }
}
