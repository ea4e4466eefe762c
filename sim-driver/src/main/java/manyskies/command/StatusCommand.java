package manyskies.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.Callable;
import manyskies.result.BlockId;
import manyskies.result.RunFolder;
import manyskies.specification.Specification;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Counts what a run has finished; also while it works. */
@Command(
        name = "status",
        description = "Count the finished blocks of a run; also while it works.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example: manyskies status runs/first-light"})
final class StatusCommand implements Callable<Integer> {
    private final Services services;

    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "RUN", description = "a run folder")
    private Path run;

    StatusCommand(Services services) {
        this.services = services;
    }

    @Override
    public Integer call() throws Exception {
        PrintWriter out = spec.commandLine().getOut();
        Path path = services.folder().resolve(run);
        Specification specification = RunSpecification.read(path);
        Plan plan = Plan.of(specification);
        Set<BlockId> done = Set.copyOf(RunFolder.reading(path).committed());
        out.printf(Locale.ROOT, "%s%n", specification.name());
        for (String set : plan.sets()) {
            print(out, set, plan.ofSet(set), done);
        }
        return ExitCode.OK.code();
    }

    private static void print(PrintWriter out, String set, List<BlockId> all, Set<BlockId> done) {
        List<BlockId> finished = all.stream().filter(done::contains).toList();
        out.printf(
                Locale.ROOT,
                "  %-8s %d of %d blocks, %d of %d realisations%n",
                set,
                finished.size(),
                all.size(),
                Plan.realisations(finished),
                Plan.realisations(all));
    }
}
