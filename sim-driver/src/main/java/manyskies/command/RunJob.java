package manyskies.command;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import manyskies.farm.BlockFailure;
import manyskies.farm.Farm;
import manyskies.farm.FarmResult;
import manyskies.farm.FarmSettings;
import manyskies.farm.Interrupts;
import manyskies.farm.ProgressLine;
import manyskies.farm.StopSwitch;
import manyskies.result.BlockId;
import manyskies.result.Journal;
import manyskies.result.RunFolder;
import manyskies.specification.Specification;

/**
 * A run from start to end: open its folder, find what is missing, farm it, aggregate.
 *
 * <p>Nothing is remembered between two calls but the folder: a run that is killed, resumed or
 * extended goes through the same steps.
 */
final class RunJob {
    private final Services services;
    private final PrintWriter out;
    private final PrintWriter err;

    RunJob(Services services, PrintWriter out, PrintWriter err) {
        this.services = services;
        this.out = out;
        this.err = err;
    }

    ExitCode run(Specification asked, Path path, FarmSettings settings) throws Exception {
        Instant start = services.clock().instant();
        Plan plan = Plan.of(asked);
        RunSpecification.requireSameRun(path, asked);
        try (RunFolder folder = RunFolder.open(path)) {
            RunSpecification.write(folder, asked);
            Log.into(path);
            List<BlockId> missing = missing(plan, folder);
            FarmResult result = journalled(asked, folder, missing, settings);
            if (result.stopped()) {
                return stopped(plan, folder);
            }
            out.print(headline(asked, folder));
            printEnd(path, result, start);
            return verdictOf(result);
        }
    }

    private String headline(Specification asked, RunFolder folder) {
        return RunTables.standing(asked, folder)
                .orElseGet(() -> RunTables.make(services.realisations().get(), asked, folder));
    }

    /** Sets damaged blocks aside, naming them, and lists what is then missing. */
    private List<BlockId> missing(Plan plan, RunFolder folder) {
        folder.setDamagedAside().forEach(damaged -> err.println(damaged.getMessage()));
        return plan.missing(folder.committed());
    }

    private FarmResult journalled(
            Specification asked, RunFolder folder, List<BlockId> missing, FarmSettings settings) {
        if (missing.isEmpty()) {
            return FarmResult.NOTHING_TO_DO;
        }
        Journal journal = folder.journal(services.clock());
        journal.line(
                "manyskies "
                        + ManyskiesCommand.Version.number()
                        + ", Java "
                        + System.getProperty("java.version")
                        + ", "
                        + settings.masterUrl()
                        + ": "
                        + Plan.count(missing.size())
                        + " to run");
        FarmResult result = farm(asked, folder, missing, settings);
        result.failures().forEach(failure -> journal.line(failure.message()));
        journal.line(
                Plan.count(result.committed()) + " run" + (result.stopped() ? ", stopped" : ""));
        return result;
    }

    private FarmResult farm(
            Specification asked, RunFolder folder, List<BlockId> missing, FarmSettings settings) {
        StopSwitch stop = new StopSwitch();
        Interrupts interrupts = Interrupts.throwing(stop);
        try (ProgressLine progress = progressLine(asked, missing, settings)) {
            return Farm.run(
                    settings,
                    missing,
                    services.realisations().get().work(asked),
                    folder::commit,
                    progress,
                    stop);
        } finally {
            interrupts.close();
        }
    }

    private ProgressLine progressLine(
            Specification asked, List<BlockId> missing, FarmSettings settings) {
        return new ProgressLine(
                err,
                services.terminal(),
                Plan.realisations(missing),
                settings.cores() * asked.block(),
                services.clock());
    }

    private ExitCode stopped(Plan plan, RunFolder folder) {
        int missing = plan.missing(folder.committed()).size();
        int total = plan.blocks().size();
        err.println(
                "stopped; "
                        + (total - missing)
                        + " of "
                        + total
                        + " blocks done; the same command resumes");
        return ExitCode.INTERRUPTED;
    }

    private void printEnd(Path path, FarmResult result, Instant start) {
        Duration time = Duration.between(start, services.clock().instant());
        out.println();
        out.println(
                (result.equals(FarmResult.NOTHING_TO_DO)
                                ? "Nothing was left to run"
                                : Plan.count(result.committed()) + " run")
                        + ", "
                        + Forecast.text(time)
                        + ".");
        out.println("Tables: " + path.resolve("tables"));
    }

    /** A block that failed is our fault, or the heap's; the others stand and have their tables. */
    private ExitCode verdictOf(FarmResult result) {
        List<BlockFailure> failures = result.failures();
        if (failures.isEmpty()) {
            return ExitCode.OK;
        }
        if (failures.stream().allMatch(BlockFailure::outOfMemory)) {
            err.println(
                    Plan.count(failures.size())
                            + " ran out of memory; use fewer --cores or a larger"
                            + " MANYSKIES_HEAP, the same command resumes.");
            return ExitCode.ENVIRONMENT;
        }
        err.println(failures.get(0).stackTrace());
        err.println(
                Plan.count(failures.size())
                        + " failed, missing from the tables. This is a fault of"
                        + " manyskies: please report it, with the lines above and the"
                        + " specification.");
        return ExitCode.OUR_FAULT;
    }
}
