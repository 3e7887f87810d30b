package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.BooleanSupplier;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tepor.solver.answer.Inspection;
import tepor.solver.casefile.DrawnCase;
import tepor.solver.model.Case;
import tepor.viewer.export.InspectionJson;
import tepor.viewer.export.MendedFile;
import tepor.viewer.export.PictureFiles;
import tepor.viewer.export.Repair;

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

    @Option(
            names = "--repair",
            paramLabel = "FILE",
            description = "Write the outlines mended into FILE, ending in .wkt, and list each change. "
                    + "No file of the case is ever overwritten.")
    private Path repairFile;

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
        if (repairFile != null && !repairFile.toString().endsWith(".wkt")) {
            throw new ParameterException(spec.commandLine(), "--repair " + repairFile + " must end in .wkt");
        }
        Optional<Repair> repair = Optional.empty();
        try {
            Path file = CasePath.file(argument);
            repair = repairFile == null ? Optional.empty() : Optional.of(repair(file));
            Inspection inspection = inspect(calculation.read(file));
            AnswerText.warnings(inspection.warnings(), terminal.err());
            if (json) {
                InspectionJson.write(inspection, repair, terminal.out());
            } else {
                new InspectionText(inspection, terminal.out()).print();
            }
            draw(inspection);
            terminal.out().flush();
            return Status.ANSWERED;
        } catch (ParameterException e) {
            throw e;
        } catch (IOException | RuntimeException | OutOfMemoryError | StackOverflowError e) {
            return failed(repair, e);
        }
    }

    private Status failed(Optional<Repair> repair, Throwable failure) {
        Status status = failures.of(argument.toString(), failure);
        if (repair.isPresent() && !repair.get().mended().shapes().isEmpty()) {
            terminal.err().println("save the mended outline, in " + repairFile);
        }
        if (json && repair.isPresent()) {
            try {
                repair.get().write(terminal.out());
                terminal.out().flush();
            } catch (IOException e) {
                return failures.of(argument.toString(), e);
            }
        }
        return status;
    }

    private Repair repair(Path file) throws IOException {
        DrawnCase drawn = calculation.readOutlines(file);
        if (MendedFile.isInput(repairFile, drawn)) {
            throw new ParameterException(
                    spec.commandLine(), "--repair " + repairFile + " is a file of the case; name another");
        }
        Repair repair = new Repair(drawn, drawn.mended(), repairFile);
        new RepairText(repair, json ? terminal.err() : terminal.out()).write();
        return repair;
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
