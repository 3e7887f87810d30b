package tepor.solver.answer;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import tepor.solver.casefile.CaseReader;
import tepor.solver.model.Case;

/** Cases written for hand checks, and the check of their first ask. */
final class CheckedCase {
    private final Path folder;

    /** @param folder where the case file is written */
    CheckedCase(Path folder) {
        this.folder = folder;
    }

    Optional<HandCheck> check(String text, double computed) {
        Case subject = read(text);
        return HandChecker.check(
                subject, subject.inputs().nominal(), subject.asks().get(0), computed);
    }

    private Case read(String text) {
        Path file = folder.resolve("case.toml");
        try {
            Files.writeString(file, "format = 1\ntitle = \"t\"\n" + text);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
        return CaseReader.read(file);
    }

    static String region(String name, String wkt) {
        return "[[region]]\nname = \"" + name + "\"\nmaterial = \"" + name + "\"\noutline = \"" + wkt + "\"\n";
    }

    static String material(String name, double k) {
        return "[material." + name + "]\nk = \"" + k + " W/(m.K)\"\n";
    }

    static String box(double x0, double y0, double x1, double y1) {
        return String.format(
                Locale.ROOT, "POLYGON ((%s %s, %s %s, %s %s, %s %s, %s %s))", x0, y0, x1, y0, x1, y1, x0, y1, x0, y0);
    }
}
