package tepor.viewer.export;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import tepor.mesher.mending.Change;
import tepor.mesher.mending.MendedOutline;
import tepor.mesher.mending.OutlineText;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.section.RegionShape;
import tepor.solver.casefile.DrawnCase;

/** Writes mended outlines as a file of well-known text which a case can name. */
public final class MendedFile {
    private MendedFile() {}

    /** Whether a file is one of those that the case was read from. */
    public static boolean isInput(Path file, DrawnCase drawn) throws IOException {
        for (Path input : drawn.files()) {
            boolean same = Files.exists(file) && Files.exists(input)
                    ? Files.isSameFile(file, input)
                    : file.toAbsolutePath()
                            .normalize()
                            .equals(input.toAbsolutePath().normalize());
            if (same) {
                return true;
            }
        }
        return false;
    }

    /** What the file holds: the changes as comments, the regions in their order, and what else was drawn. */
    public static String text(DrawnCase drawn, MendedOutline mended) {
        OutlineText text = new OutlineText(drawn.unit());
        text.comment("Outlines of " + drawn.name() + ", mended by Tepor " + Version.text() + "; coordinates in "
                + drawn.unit().symbol());
        text.comment(mended.changes().isEmpty() ? "Nothing was changed." : "Changed:");
        for (Change change : mended.changes()) {
            text.comment(change.what());
        }
        for (RegionShape shape : mended.shapes()) {
            text.record(shape.name(), shape.polygons());
        }
        for (OutlineElement other : drawn.others()) {
            text.record(other.name(), other.shape());
        }
        return text.toString();
    }

    /** Writes the file whole or not at all. */
    public static void write(DrawnCase drawn, MendedOutline mended, Path file) throws IOException {
        byte[] bytes = text(drawn, mended).getBytes(StandardCharsets.UTF_8);
        WholeFile.write(file, out -> out.write(bytes));
    }
}
