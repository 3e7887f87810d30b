package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.function.BooleanSupplier;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tepor.solver.answer.Inspection;
import tepor.solver.model.Case;
import tepor.viewer.export.InspectionJson;

/** {@code tepor inspect}. */
@Command(
        name = "inspect",
        mixinStandardHelpOptions = true,
        versionProvider = TeporCommand.VersionText.class,
        description = "Check and mesh a case, solve nothing: print regions, edges, what is insulated, and the mesh.")
final class InspectCommand implements Callable<Status> {
    @Parameters(paramLabel = "CASE", description = "A case file, or a folder that holds a case.toml.")
    private Path argument;

    @Option(names = "--json", description = "Print one JSON object, and nothing else, on standard output.")
    private boolean json;

    private final Calculation calculation;
    private final Terminal terminal;
    private final FailureReport failures;
    private final BooleanSupplier stopped;

    InspectCommand(Calculation calculation, Terminal terminal, FailureReport failures, BooleanSupplier stopped) {
        this.calculation = calculation;
        this.terminal = terminal;
        this.failures = failures;
        this.stopped = stopped;
    }

    @Override
    public Status call() {
        try {
            Inspection inspection = inspect(calculation.read(CasePath.file(argument)));
            AnswerText.warnings(inspection.warnings(), terminal.err());
            if (json) {
                InspectionJson.write(inspection, terminal.out());
            } else {
                new InspectionText(inspection, terminal.out()).print();
            }
            terminal.out().flush();
            return Status.ANSWERED;
        } catch (IOException | RuntimeException | OutOfMemoryError | StackOverflowError e) {
            return failures.of(argument.toString(), e);
        }
    }

    private Inspection inspect(Case subject) {
        try (ProgressLine progress = new ProgressLine(subject.name(), terminal, stopped)) {
            return calculation.inspect(subject, progress);
        }
    }
}
