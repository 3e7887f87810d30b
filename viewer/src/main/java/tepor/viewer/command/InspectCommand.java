package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.function.BooleanSupplier;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tepor.solver.answer.Inspection;
import tepor.solver.model.Case;
import tepor.viewer.export.InspectionJson;
import tepor.viewer.export.PictureFiles;

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

    @Option(
            names = "--out",
            paramLabel = "PICTURE",
            description = "Where to draw the named outline, ending in .png or .svg. "
                    + "Default: ./NAME-outline.png; with --json, none.")
    private Path out;

    @Spec
    private CommandSpec spec;

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
        if (out != null && !PictureFiles.isPicture(out)) {
            throw new ParameterException(spec.commandLine(), "--out " + out + " must end in .png or .svg");
        }
        try {
            Inspection inspection = inspect(calculation.read(CasePath.file(argument)));
            AnswerText.warnings(inspection.warnings(), terminal.err());
            if (json) {
                InspectionJson.write(inspection, terminal.out());
            } else {
                new InspectionText(inspection, terminal.out()).print();
            }
            draw(inspection);
            terminal.out().flush();
            return Status.ANSWERED;
        } catch (IOException | RuntimeException | OutOfMemoryError | StackOverflowError e) {
            return failures.of(argument.toString(), e);
        }
    }

    private void draw(Inspection inspection) throws IOException {
        Path picture = out;
        if (picture == null && !json) {
            picture = Path.of(inspection.subject().name() + "-outline.png");
        }
        if (picture != null) {
            PictureFiles.outline(inspection, picture);
        }
        if (picture != null && !json) {
            terminal.out().println();
            terminal.out().println("Drawn in " + picture);
        }
    }

    private Inspection inspect(Case subject) {
        try (ProgressLine progress = new ProgressLine(subject.name(), terminal, stopped)) {
            return calculation.inspect(subject, progress);
        }
    }
}
