package tepor.solver.answer;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;
import tepor.mesher.mesh.Mesh;
import tepor.solver.assembly.FacetIndex;
import tepor.solver.assembly.HeatBalance;
import tepor.solver.field.SteadySolver;
import tepor.solver.linear.MatrixMarketWriter;

/** Writes the equations of an answer to files, so that others can check them. */
final class SystemFiles {
    private SystemFiles() {}

    /** What is written to one file. */
    private interface Content {
        void write(Writer writer) throws IOException;
    }

    static void write(Answer answer, Path stem) throws IOException {
        Mesh mesh = answer.mesh().mesh();
        FacetIndex index = new FacetIndex(mesh, answer.subject().section().segmentCount());
        HeatBalance balance = new HeatBalance(
                answer.subject(), mesh, index, answer.subject().inputs().nominal());
        SteadySolver solver = new SteadySolver(mesh, balance.fixed());
        whole(stem, ".mtx", writer -> MatrixMarketWriter.writeMatrix(solver.matrix(balance), writer));
        whole(stem, "_rhs.mtx", writer -> MatrixMarketWriter.writeVector(solver.rightHandSide(balance), writer));
    }

    private static void whole(Path stem, String ending, Content content) throws IOException {
        Path target = stem.toAbsolutePath().resolveSibling(stem.getFileName() + ending);
        // Not a temporary file of the library: nobody but its owner may read those.
        Path part = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".part");
        try {
            try (Writer writer = Files.newBufferedWriter(part, StandardOpenOption.CREATE_NEW)) {
                content.write(writer);
            }
            Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(part);
        }
    }
}
