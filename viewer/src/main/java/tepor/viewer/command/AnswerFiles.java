package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import tepor.solver.answer.Answer;
import tepor.viewer.export.AnswerJson;
import tepor.viewer.export.OutputFolder;
import tepor.viewer.export.PictureFile;
import tepor.viewer.export.PictureFiles;
import tepor.viewer.picture.PictureOptions;
import tepor.viewer.report.Report;

/** The files of one answer. */
final class AnswerFiles {
    private final Answer answer;
    private final Set<PictureOptions.Layer> layers;

    /** @param layers what the pictures show besides isotherms */
    AnswerFiles(Answer answer, Set<PictureOptions.Layer> layers) {
        this.answer = answer;
        this.layers = layers;
    }

    /**
     * Writes all files, or none.
     *
     * @return their names
     * @throws CancellationException if told to stop
     */
    List<String> write(Path folder, BooleanSupplier stopped) throws IOException {
        try (OutputFolder output = OutputFolder.begin(folder)) {
            output.write("answers.json", out -> AnswerJson.write(answer, out));
            PictureFile isotherms = PictureFiles.isotherms(answer, output, layers);
            output.write("report.html", out -> Report.write(answer, List.of(isotherms), out));
            if (stopped.getAsBoolean()) {
                throw new CancellationException();
            }
            output.publish();
            return output.names();
        }
    }
}
