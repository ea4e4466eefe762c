package manyskies.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import manyskies.farm.FarmSettings;
import manyskies.specification.CanonicalYaml;
import manyskies.specification.Specification;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Says what a specification would run, and for how long; writes nothing. */
@Command(
        name = "check",
        description =
                "Show the resolved specification, what would run, its memory, and when it would end"
                        + " (a few realisations are timed). Writes nothing.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example: manyskies check conf/first-light.yaml --cores 8"})
final class CheckCommand implements Callable<Integer> {
    private final Services services;

    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "SPEC", description = "specification file (YAML)")
    private Path specificationFile;

    @Mixin private Cores cores;

    CheckCommand(Services services) {
        this.services = services;
    }

    @Override
    public Integer call() throws Exception {
        PrintWriter out = spec.commandLine().getOut();
        Specification specification = SpecificationFile.read(services, specificationFile);
        Realisations realisations = services.realisations().get();
        Heap heap = new Heap(services.heap(), realisations.memory(specification));
        out.println(CanonicalYaml.write(specification));
        Forecast forecast = new Forecast(Plan.of(specification), heap, out);
        forecast.printPlan();
        FarmSettings settings = cores.settings(heap, out);
        forecast.printMemory(settings.cores());
        out.flush(); // the timing takes a while
        Cost cost = Cost.measure(realisations.work(specification), Plan.of(specification));
        forecast.printCost(cost, settings.cores(), services.clock());
        return ExitCode.OK.code();
    }
}
