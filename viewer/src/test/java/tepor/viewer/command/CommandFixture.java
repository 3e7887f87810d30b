package tepor.viewer.command;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import java.util.function.Supplier;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Inspection;
import tepor.solver.answer.Progress;
import tepor.solver.model.Case;
import tepor.viewer.BusbarSample;

/** Runs commands in this process, with answers made by hand and with streams that are kept. */
final class CommandFixture implements Calculation {
    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();
    private final Map<String, Supplier<BusbarSample>> samples = new HashMap<>();
    private RuntimeException inReading;
    private Throwable inAnswering;
    private boolean stopped;

    /** Answers the case of this name with a sample. */
    CommandFixture sample(String name, Supplier<BusbarSample> sample) {
        samples.put(name, sample);
        return this;
    }

    CommandFixture failReading(RuntimeException failure) {
        inReading = failure;
        return this;
    }

    CommandFixture failAnswering(Throwable failure) {
        inAnswering = failure;
        return this;
    }

    CommandFixture stop() {
        stopped = true;
        return this;
    }

    int run(Object... args) {
        String[] texts = new String[args.length];
        for (int i = 0; i < args.length; i++) {
            texts[i] = args[i].toString();
        }
        Terminal terminal = new Terminal(
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                false);
        return new CommandRun(this, terminal, () -> stopped).run(texts).code();
    }

    String out() {
        return out.toString(StandardCharsets.UTF_8);
    }

    String err() {
        return err.toString(StandardCharsets.UTF_8);
    }

    /** An empty case file. */
    static Path caseFile(Path folder, String name) throws IOException {
        return Files.writeString(folder.resolve(name + ".toml"), "");
    }

    private BusbarSample sampleOf(String name) {
        return samples.getOrDefault(name, BusbarSample::new).get().name(name);
    }

    @Override
    public Case read(Path file) {
        if (inReading != null) {
            throw inReading;
        }
        return sampleOf(CasePath.name(file)).subject();
    }

    @Override
    public Answer answer(Case subject, Progress progress) {
        if (inAnswering instanceof RuntimeException exception) {
            throw exception;
        }
        if (inAnswering instanceof Error error) {
            throw error;
        }
        progress.round(1, 60, Double.NaN);
        return sampleOf(subject.name()).answer();
    }

    @Override
    public Inspection inspect(Case subject, Progress progress) {
        return sampleOf(subject.name()).inspection();
    }

    @Override
    public void writeSystem(Answer answer, Path stem) throws IOException {
        Files.writeString(Path.of(stem + ".mtx"), "%%MatrixMarket\n");
        Files.writeString(Path.of(stem + "_rhs.mtx"), "%%MatrixMarket\n");
    }
}
