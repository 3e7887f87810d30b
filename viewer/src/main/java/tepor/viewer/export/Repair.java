package tepor.viewer.export;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;
import tepor.mesher.mending.Change;
import tepor.mesher.mending.MendedOutline;
import tepor.solver.casefile.DrawnCase;

/**
 * Outlines that were mended and written.
 *
 * @param drawn as drawn
 * @param mended as written
 * @param file where to
 */
public record Repair(DrawnCase drawn, MendedOutline mended, Path file) {
    /** Writes what was changed and what remains as one JSON object, for a case that is faulty otherwise. */
    public void write(OutputStream out) throws IOException {
        try (JsonText json = new JsonText(out)) {
            json.object(() -> {
                json.whole("format", 1);
                json.text("case", drawn.name());
                json.text("tepor", Version.text());
                write(json);
            });
        }
    }

    /** Adds the key {@code repair} to an object. */
    void write(JsonText json) throws IOException {
        json.object("repair", () -> {
            json.text("file", file.toString());
            json.array("changes", () -> {
                for (Change change : mended.changes()) {
                    json.object(() -> change(json, change));
                }
            });
            CommonJson common = new CommonJson(json);
            common.findings("remaining", mended.remaining());
            common.findings("unreadable", drawn.findings());
        });
    }

    private static void change(JsonText json, Change change) throws IOException {
        json.text("code", change.code());
        json.text("region", change.region());
        json.text("text", change.what());
        new CommonJson(json).point("at", change.at().x, change.at().y);
        json.number("size", change.size());
        json.text("file", change.place().file());
        json.whole("line", change.place().line());
    }
}
