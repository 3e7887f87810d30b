package tepor.viewer.command;

import java.io.IOException;
import java.io.PrintStream;
import java.util.List;
import tepor.mesher.mending.Change;
import tepor.mesher.mending.MendedOutline;
import tepor.mesher.mending.OutlineText;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.mesher.section.RegionShape;
import tepor.viewer.export.MendedFile;
import tepor.viewer.export.Repair;

/** Writes mended outlines, and says what was changed and what remains. */
final class RepairText {
    private final Repair repair;
    private final PrintStream out;

    RepairText(Repair repair, PrintStream out) {
        this.repair = repair;
        this.out = out;
    }

    void write() throws IOException {
        MendedOutline mended = repair.mended();
        for (RegionShape shape : mended.shapes()) {
            if (!OutlineText.isWritable(shape.name())) {
                throw new FaultyInputException(List.of(new Finding(
                        Finding.Severity.ERROR,
                        "name-not-writable",
                        shape.place(),
                        "the name '" + shape.name() + "' cannot stand before a record of well-known text",
                        "leave out '#', line breaks, and blanks around it")));
            }
        }
        if (mended.shapes().isEmpty()) {
            out.println("No outline could be read: nothing to mend, and " + repair.file() + " is not written");
            repair.drawn().findings().forEach(out::println);
            return;
        }
        MendedFile.write(repair.drawn(), mended, repair.file());
        for (Change change : mended.changes()) {
            out.println(change);
        }
        repair.drawn().findings().forEach(f -> out.println("in reading: " + f));
        mended.remaining().forEach(f -> out.println("remains: " + f));
        int count = mended.changes().size();
        out.println((count == 0 ? "Nothing was to be mended" : count == 1 ? "1 change" : count + " changes")
                + "; written to " + repair.file());
        out.println("To use it: file = \"" + repair.file() + "\" under [outline]"
                + (repair.drawn().inline() ? ", and leave out the outlines written in the case" : ""));
        out.println();
    }
}
