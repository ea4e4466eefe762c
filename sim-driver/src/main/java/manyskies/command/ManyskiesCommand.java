package manyskies.command;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;

/** The program's name, version and commands; does nothing itself. */
@Command(
        name = "manyskies",
        description = "A farm of simulated skies for CMB lensing estimators.",
        mixinStandardHelpOptions = true,
        versionProvider = ManyskiesCommand.Version.class,
        synopsisSubcommandLabel = "COMMAND",
        footerHeading = "%nExit codes:%n",
        footer = {
            "  0    done as asked, whatever the verdicts say",
            "  1    a fault of the program; what was finished is kept",
            "  2    faulty specification, file or command line; nothing was written",
            "  3    disk, memory or hosts failed; the same command resumes",
            "  130  ended by Ctrl-C; the same command resumes",
            "",
            "Example: manyskies run conf/first-light.yaml"
        })
final class ManyskiesCommand {

    /** The commands, in the order of the help. */
    static Map<String, Object> subcommands(Services services) {
        Map<String, Object> commands = new LinkedHashMap<>();
        commands.put("check", new CheckCommand(services));
        commands.put("run", new RunCommand(services));
        commands.put("status", new StatusCommand(services));
        commands.put("aggregate", new AggregateCommand(services));
        commands.put("sky", new SkyCommand(services));
        commands.put("estimators", new EstimatorsCommand());
        commands.put("bench", new BenchCommand(services));
        return commands;
    }

    /** The version in the jar's manifest. */
    static final class Version implements IVersionProvider {
        @Override
        public String[] getVersion() {
            return new String[] {"manyskies " + number()};
        }

        static String number() {
            return Optional.ofNullable(Version.class.getPackage().getImplementationVersion())
                    .orElse("(unpackaged)");
        }
    }
}
