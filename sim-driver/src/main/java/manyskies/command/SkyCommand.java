package manyskies.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import manyskies.specification.Specification;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Writes the maps of one realisation, to look at. */
@Command(
        name = "sky",
        description = "Write the maps of one realisation as FITS and PNG, to look at.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example: manyskies sky conf/first-light.yaml --index 3 --to maps"})
final class SkyCommand implements Callable<Integer> {
    private final Services services;

    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "SPEC", description = "specification file (YAML)")
    private Path specificationFile;

    @Option(
            names = "--index",
            required = true,
            paramLabel = "N",
            description =
                    "index of the realisation in set 'data', from 0; it need not be one of the run's")
    private int index;

    @Option(
            names = "--to",
            paramLabel = "DIR",
            description = "folder for the maps; by default skies/<name of the specification>-<N>")
    private Optional<Path> to;

    SkyCommand(Services services) {
        this.services = services;
    }

    @Override
    public Integer call() throws Exception {
        Specification specification = SpecificationFile.read(services, specificationFile);
        if (index < 0) {
            throw new InputException("--index is " + index + "; indices begin at 0.");
        }
        Path folder = to.orElse(Path.of("skies", specification.name() + "-" + index));
        PrintWriter out = spec.commandLine().getOut();
        services.realisations()
                .get()
                .writeMaps(specification, index, services.folder().resolve(folder))
                .forEach(out::println);
        return ExitCode.OK.code();
    }
}
