package manyskies.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import manyskies.farm.FarmSettings;
import manyskies.specification.Specification;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Runs, resumes or extends a run, then makes its tables. */
@Command(
        name = "run",
        description =
                "Run a specification, then aggregate. Given again, the command resumes; with larger"
                        + " counts in 'sets' it extends the run.",
        mixinStandardHelpOptions = true,
        footer = {
            "",
            "Ctrl-C ends cleanly and keeps what is finished.",
            "Example: manyskies run conf/first-light.yaml --cores 8 --out runs/tonight"
        })
final class RunCommand implements Callable<Integer> {
    private final Services services;

    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "SPEC", description = "specification file (YAML)")
    private Path specificationFile;

    @Option(
            names = "--out",
            paramLabel = "RUN",
            description = "the run folder; by default runs/<name of the specification>")
    private Optional<Path> folder = Optional.empty();

    @Mixin private Cores cores;

    RunCommand(Services services) {
        this.services = services;
    }

    @Override
    public Integer call() throws Exception {
        PrintWriter err = spec.commandLine().getErr();
        Specification specification = SpecificationFile.read(services, specificationFile);
        Realisations realisations = services.realisations().get();
        Heap heap = new Heap(services.heap(), realisations.memory(specification));
        FarmSettings settings = cores.settings(heap, err);
        Path run = folder.orElse(Path.of("runs", specification.name()));
        RunJob job = new RunJob(services, spec.commandLine().getOut(), err);
        return job.run(specification, services.folder().resolve(run), settings).code();
    }
}
