package tepor.viewer.command;

import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Option;
import tepor.viewer.export.Version;

/** The command itself, which only gathers its subcommands. */
@Command(
        name = "tepor",
        mixinStandardHelpOptions = true,
        versionProvider = TeporCommand.VersionText.class,
        header = "Temperatures and heat flows of a long part's cross-section, each with its interval.",
        synopsisSubcommandLabel = "(answer | inspect)",
        footer = {
            "",
            "Exit status: 0 everything answered, no limit broken or undecided; 1 a limit is broken;",
            "2 a limit is undecided; 3 the case is wrong, nothing was written; 4 the computation could",
            "not be finished; 64 wrong command line.",
            "",
            "A result is a calculation on the stated inputs. It replaces neither local codes nor the",
            "judgement of a licensed engineer."
        })
final class TeporCommand {
    @Option(
            names = "--debug",
            hidden = true,
            scope = picocli.CommandLine.ScopeType.INHERIT,
            description = "Print the stack trace of an unexpected failure.")
    boolean debug;

    /** Reads the version only when it is asked for. */
    static final class VersionText implements IVersionProvider {
        @Override
        public String[] getVersion() {
            return new String[] {"tepor " + Version.text()};
        }
    }
}
