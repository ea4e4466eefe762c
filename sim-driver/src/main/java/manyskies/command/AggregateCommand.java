package manyskies.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import manyskies.result.RunFolder;
import manyskies.specification.Specification;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Makes the tables of a run from the blocks that are there; also while it works. */
@Command(
        name = "aggregate",
        description =
                "Make the tables of a run from the blocks that are finished; also while it works.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example: manyskies aggregate runs/first-light"})
final class AggregateCommand implements Callable<Integer> {
    private final Services services;

    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "RUN", description = "a run folder")
    private Path run;

    AggregateCommand(Services services) {
        this.services = services;
    }

    @Override
    public Integer call() throws Exception {
        PrintWriter out = spec.commandLine().getOut();
        Path path = services.folder().resolve(run);
        Specification specification = RunSpecification.read(path);
        Log.into(path);
        RunFolder folder = RunFolder.reading(path);
        out.print(RunTables.make(services.realisations().get(), specification, folder));
        out.println();
        out.println("Tables: " + path.resolve("tables"));
        return ExitCode.OK.code();
    }
}
