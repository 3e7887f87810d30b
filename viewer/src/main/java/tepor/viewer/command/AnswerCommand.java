package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;
import tepor.solver.answer.Verdict;
import tepor.solver.model.Case;
import tepor.viewer.picture.PictureOptions;

/** {@code tepor answer}. */
@Command(
        name = "answer",
        mixinStandardHelpOptions = true,
        versionProvider = TeporCommand.VersionText.class,
        description = "Answer cases: print the answers, and write them with a report and pictures.")
final class AnswerCommand implements Callable<Status> {
    @Parameters(
            arity = "1..*",
            paramLabel = "CASE",
            description = "A case file, or a folder that holds a case.toml. Several are answered one after the other.")
    private List<Path> cases;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            description = "Folder for the output; for several cases, one folder each inside it. Default: ./NAME-answer")
    private Path out;

    @Option(names = "--mesh", description = "Draw the mesh into the pictures.")
    private boolean mesh;

    @Option(names = "--flux", description = "Draw heat flux arrows into the pictures.")
    private boolean flux;

    @Option(
            names = "--system",
            paramLabel = "FILE",
            description = "Write the equations as FILE.mtx and FILE_rhs.mtx in Matrix Market form (one case only).")
    private Path system;

    @Spec
    private CommandSpec spec;

    private final Calculation calculation;
    private final Terminal terminal;
    private final FailureReport failures;
    private final BooleanSupplier stopped;

    AnswerCommand(Calculation calculation, Terminal terminal, FailureReport failures, BooleanSupplier stopped) {
        this.calculation = calculation;
        this.terminal = terminal;
        this.failures = failures;
        this.stopped = stopped;
    }

    @Override
    public Status call() {
        checkLine();
        Status worst = Status.ANSWERED;
        for (int i = 0; i < cases.size(); i++) {
            if (i > 0) {
                terminal.out().println();
            }
            worst = worst.or(answer(cases.get(i)));
            if (stopped.getAsBoolean()) {
                break;
            }
        }
        return worst;
    }

    private void checkLine() {
        if (system != null && cases.size() > 1) {
            throw new ParameterException(spec.commandLine(), "--system takes one case, not " + cases.size());
        }
        Map<String, Path> byName = new HashMap<>();
        for (Path one : cases) {
            Path other = byName.put(CasePath.name(one), one);
            if (other != null) {
                throw new ParameterException(
                        spec.commandLine(),
                        other + " and " + one + " would both be written to " + CasePath.name(one)
                                + "-answer; answer them one at a time, each with its own --out");
            }
        }
    }

    private Status answer(Path argument) {
        String what = argument.toString();
        try {
            Case subject = calculation.read(CasePath.file(argument));
            Answer answer = compute(subject);
            AnswerText.warnings(answer.warnings(), terminal.err());
            new AnswerText(answer, terminal.out()).print();
            write(answer);
            return status(answer);
        } catch (IOException | RuntimeException | OutOfMemoryError | StackOverflowError e) {
            return failures.of(what, e);
        }
    }

    /** Writes the files, and says where they are. */
    private void write(Answer answer) throws IOException {
        Path folder = folder(answer.subject());
        List<String> files = new AnswerFiles(answer, layers()).write(folder, stopped);
        terminal.out().println();
        terminal.out().println("Written to " + folder + ": " + String.join(", ", files));
        if (system != null) {
            calculation.writeSystem(answer, system);
            terminal.out().println("Equations: " + system + ".mtx, " + system + "_rhs.mtx");
        }
        terminal.out().flush();
    }

    private Set<PictureOptions.Layer> layers() {
        Set<PictureOptions.Layer> layers = EnumSet.noneOf(PictureOptions.Layer.class);
        if (mesh) {
            layers.add(PictureOptions.Layer.MESH);
        }
        if (flux) {
            layers.add(PictureOptions.Layer.FLUX);
        }
        return layers;
    }

    private Answer compute(Case subject) {
        try (ProgressLine progress = new ProgressLine(subject.name(), terminal, stopped)) {
            Answer answer = calculation.answer(subject, progress);
            if (stopped.getAsBoolean()) {
                throw new CancellationException();
            }
            return answer;
        }
    }

    private Path folder(Case subject) {
        String own = subject.name() + "-answer";
        if (out == null) {
            return Path.of(own);
        }
        return cases.size() == 1 ? out : out.resolve(own);
    }

    private static Status status(Answer answer) {
        Status worst = Status.ANSWERED;
        for (AskAnswer ask : answer.asks()) {
            if (ask.verdict() == Verdict.BROKEN) {
                worst = worst.or(Status.BROKEN);
            } else if (ask.verdict() == Verdict.UNDECIDED) {
                worst = worst.or(Status.UNDECIDED);
            }
        }
        return worst;
    }
}
