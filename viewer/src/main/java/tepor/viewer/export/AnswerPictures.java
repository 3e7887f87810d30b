package tepor.viewer.export;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import tepor.solver.answer.Answer;
import tepor.viewer.picture.IsothermPicture;
import tepor.viewer.picture.PictureOptions;

/** The pictures that go with an answer. */
public final class AnswerPictures {
    private AnswerPictures() {}

    /**
     * Writes {@code isotherms.png} and {@code isotherms.svg}.
     *
     * @param folder takes them
     * @param more layers drawn besides the usual ones
     * @return the first of them, for the report
     */
    public static PictureFile write(Answer answer, OutputFolder folder, Set<PictureOptions.Layer> more)
            throws IOException {
        PictureOptions options = PictureOptions.standard();
        for (PictureOptions.Layer layer : more) {
            options = options.with(layer);
        }
        IsothermPicture picture = new IsothermPicture(answer, options);
        Path png = folder.reserve("isotherms.png");
        PngWriter.write(picture, png);
        SvgWriter.write(picture, folder.reserve("isotherms.svg"));
        return new PictureFile("image/png", picture.description(), Files.readAllBytes(png));
    }
}
