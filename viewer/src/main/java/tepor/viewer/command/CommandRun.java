package tepor.viewer.command;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.BooleanSupplier;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** One call of the command line, from its arguments to its status. */
public final class CommandRun {
    private final Terminal terminal;
    private final FailureReport failures;
    private final CommandLine line;

    /**
     * @param calculation does the work
     * @param terminal where to print
     * @param stopped asked now and then whether the user wants to stop
     */
    public CommandRun(Calculation calculation, Terminal terminal, BooleanSupplier stopped) {
        this.terminal = terminal;
        this.failures = new FailureReport(terminal.err());
        this.line = new CommandLine(new TeporCommand())
                .addSubcommand(new AnswerCommand(calculation, terminal, failures, stopped))
                .addSubcommand(new InspectCommand(calculation, terminal, failures, stopped));
        line.setOut(new PrintWriter(terminal.out(), true, StandardCharsets.UTF_8));
        line.setErr(new PrintWriter(terminal.err(), true, StandardCharsets.UTF_8));
        line.setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF));
        line.setUsageHelpWidth(100);
        line.setExpandAtFiles(false);
        line.setParameterExceptionHandler(this::wrongLine);
        line.setExecutionExceptionHandler(
                (exception, command, parsed) -> failures.unexpected(exception).code());
        line.setExecutionStrategy(this::execute);
    }

    /** Runs the command; never throws. */
    public Status run(String... args) {
        int code = line.execute(args);
        for (Status status : Status.values()) {
            if (status.code() == code) {
                return status;
            }
        }
        return Status.UNFINISHED;
    }

    private int execute(CommandLine.ParseResult parsed) {
        Integer helped = CommandLine.executeHelpRequest(parsed);
        if (helped != null) {
            return Status.ANSWERED.code();
        }
        TeporCommand top = line.getCommand();
        failures.showTraces(top.debug || System.getenv("TEPOR_DEBUG") != null);
        List<CommandLine> commands = parsed.asCommandLineList();
        CommandLine last = commands.get(commands.size() - 1);
        if (!(last.getCommand() instanceof Callable<?> command)) {
            throw new ParameterException(last, "say what to do: answer or inspect");
        }
        try {
            return command.call() instanceof Status status ? status.code() : Status.UNFINISHED.code();
        } catch (ParameterException e) {
            throw e;
        } catch (Exception | OutOfMemoryError | StackOverflowError e) {
            return failures.unexpected(e).code();
        }
    }

    private int wrongLine(ParameterException exception, String[] args) {
        CommandLine command = exception.getCommandLine();
        terminal.err().println("tepor: error: " + exception.getMessage());
        if (!UnmatchedArgumentException.printSuggestions(exception, command.getErr())) {
            terminal.err().println("usage: " + usage(command));
        }
        command.getErr().flush();
        terminal.err().println("For help: " + command.getCommandSpec().qualifiedName() + " --help");
        return Status.USAGE.code();
    }

    private static String usage(CommandLine command) {
        return command.getHelp().synopsis(0).strip().replaceAll("\\s*\\R\\s*", " ");
    }
}
