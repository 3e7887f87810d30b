package tepor.viewer.export;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Inspection;
import tepor.viewer.picture.IsothermPicture;
import tepor.viewer.picture.OutlinePicture;
import tepor.viewer.picture.PictureOptions;

/** The pictures that go with an answer or an inspection. */
public final class PictureFiles {
    private PictureFiles() {}

    /**
     * Writes {@code isotherms.png} and {@code isotherms.svg}.
     *
     * @param folder takes them
     * @param more layers drawn besides the usual ones
     * @return the first of them, for the report
     */
    public static PictureFile isotherms(Answer answer, OutputFolder folder, Set<PictureOptions.Layer> more)
            throws IOException {
        PictureOptions options = PictureOptions.standard();
        for (PictureOptions.Layer layer : more) {
            options = options.with(layer);
        }
        IsothermPicture picture = new IsothermPicture(answer, options);
        Path png = folder.reserve("isotherms.png");
        Path svg = folder.reserve("isotherms.svg");
        CompletableFuture<Void> other = CompletableFuture.runAsync(() -> {
            try {
                SvgWriter.write(picture, svg);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        });
        try {
            PngWriter.write(picture, png);
        } finally {
            await(other);
        }
        return new PictureFile("image/png", picture.description(), Files.readAllBytes(png));
    }

    private static void await(CompletableFuture<Void> writing) throws IOException {
        try {
            writing.join();
        } catch (CompletionException e) {
            if (e.getCause() instanceof UncheckedIOException io) {
                throw io.getCause();
            }
            if (e.getCause() instanceof RuntimeException failure) {
                throw failure;
            }
            throw e;
        }
    }

    /** Whether the name of a file says what kind of picture it is to be. */
    public static boolean isPicture(Path file) {
        return isSvg(file) || file.toString().toLowerCase(Locale.ROOT).endsWith(".png");
    }

    /** Writes the outline with the names of its regions and edges, as PNG or SVG by the file's ending. */
    public static void outline(Inspection inspection, Path file) throws IOException {
        OutlinePicture picture = new OutlinePicture(inspection, PictureOptions.standard());
        if (isSvg(file)) {
            SvgWriter.write(picture, file);
        } else {
            PngWriter.write(picture, file);
        }
    }

    private static boolean isSvg(Path file) {
        return file.toString().toLowerCase(Locale.ROOT).endsWith(".svg");
    }
}
