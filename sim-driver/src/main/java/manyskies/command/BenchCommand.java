package manyskies.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import manyskies.specification.Specification;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Times the stages of one realisation on one thread. */
@Command(
        name = "bench",
        description =
                "Time each stage of a realisation on one thread, in units of one Fourier transform.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example: manyskies bench conf/first-light.yaml"})
final class BenchCommand implements Callable<Integer> {
    private final Services services;

    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "SPEC", description = "specification file (YAML)")
    private Path specificationFile;

    BenchCommand(Services services) {
        this.services = services;
    }

    @Override
    public Integer call() throws Exception {
        Specification specification = SpecificationFile.read(services, specificationFile);
        spec.commandLine().getOut().print(services.realisations().get().stageTimes(specification));
        return ExitCode.OK.code();
    }
}
