package tepor.solver.answer;

import java.io.IOException;
import java.nio.file.Path;
import tepor.solver.model.Case;

/** Answers cases. */
public final class Solver {
    private Solver() {}

    /**
     * Answers every ask of a case.
     *
     * @throws tepor.mesher.outline.FaultyInputException if the case has no answer, such as for a part that nothing ties to
     *     a temperature
     * @throws UnfinishedException if the computation could not be finished
     * @throws java.util.concurrent.CancellationException if told to stop
     */
    public static Answer answer(Case subject, Progress progress) {
        throw new IllegalStateException("not joined yet");
    }

    /** Checks and meshes a case, solves nothing. Throws as {@link #answer} does. */
    public static Inspection inspect(Case subject, Progress progress) {
        throw new IllegalStateException("not joined yet");
    }

    /**
     * Writes the equations of an answer's last mesh, fixed temperatures eliminated, in Matrix Market form.
     *
     * @param stem written are stem.mtx and stem_rhs.mtx, each whole or not at all
     */
    public static void writeSystem(Answer answer, Path stem) throws IOException {
        throw new IOException("not joined yet");
    }
}
