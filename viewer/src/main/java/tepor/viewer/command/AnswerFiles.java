package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import tepor.solver.answer.Answer;
import tepor.viewer.export.AnswerJson;
import tepor.viewer.export.OutputFolder;
import tepor.viewer.export.PictureFile;
import tepor.viewer.report.Report;

/** The files of one answer. */
final class AnswerFiles {
    private final Answer answer;
    private final Choice choice;

    /** What the pictures show besides isotherms. */
    record Choice(boolean mesh, boolean flux) {}

    AnswerFiles(Answer answer, Choice choice) {
        this.answer = answer;
        this.choice = choice;
    }

    /**
     * Writes all files, or none.
     *
     * @return their names
     * @throws CancellationException if told to stop
     */
    List<String> write(Path folder, BooleanSupplier stopped) throws IOException {
        try (OutputFolder output = OutputFolder.begin(folder)) {
            List<PictureFile> pictures = List.of();
            output.write("answers.json", out -> AnswerJson.write(answer, out));
            output.write("report.html", out -> Report.write(answer, pictures, out));
            for (PictureFile picture : pictures) {
                output.write(picture.name(), out -> out.write(picture.bytes()));
            }
            if (stopped.getAsBoolean()) {
                throw new CancellationException();
            }
            output.publish();
            return output.names();
        }
    }
}
