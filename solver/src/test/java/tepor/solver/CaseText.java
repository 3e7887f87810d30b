package tepor.solver;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Collectors;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshCheck;
import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;
import tepor.solver.answer.Progress;
import tepor.solver.answer.Solver;
import tepor.solver.casefile.CaseReader;
import tepor.solver.model.Case;

/** Cases written in tests, read and answered the way a user's are. */
public final class CaseText {
    private CaseText() {}

    /** Reads a case from its text. */
    public static Case read(String toml) {
        try {
            Path folder = Files.createTempDirectory("case");
            Path file = folder.resolve("case.toml");
            try {
                Files.writeString(file, toml);
                return CaseReader.read(file);
            } finally {
                Files.deleteIfExists(file);
                Files.deleteIfExists(folder);
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Answers a case from its text; its mesh is audited. */
    public static Answer answer(String toml) {
        Case subject = read(toml);
        Answer answer = Solver.answer(subject, Progress.NONE);
        Mesh mesh = answer.mesh().mesh();
        if (!MeshCheck.problems(mesh, subject.section()).isEmpty()) {
            throw new AssertionError(MeshCheck.problems(mesh, subject.section()));
        }
        return answer;
    }

    /** The answers by name. */
    public static Map<String, AskAnswer> byName(Answer answer) {
        return answer.asks().stream().collect(Collectors.toMap(a -> a.ask().name(), a -> a));
    }

    /** A polygon about a circle or in it: corners at radius·factor, counter-clockwise, in WKT ring form. */
    public static String ring(double x, double y, double radius, int corners) {
        StringBuilder text = new StringBuilder("(");
        for (int i = 0; i <= corners; i++) {
            double angle = 2 * Math.PI * (i % corners) / corners;
            text.append(i == 0 ? "" : ", ")
                    .append(x + radius * Math.cos(angle))
                    .append(' ')
                    .append(y + radius * Math.sin(angle));
        }
        return text.append(")").toString();
    }
}
