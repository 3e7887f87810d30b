package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Path;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Inspection;
import tepor.solver.answer.Progress;
import tepor.solver.answer.Solver;
import tepor.solver.casefile.CaseReader;
import tepor.solver.casefile.DrawnCase;
import tepor.solver.casefile.DrawnCaseReader;
import tepor.solver.model.Case;

/** What the commands ask of the solver; throws what {@link CaseReader} and {@link Solver} throw. */
public interface Calculation {
    /** The one that is used outside tests. */
    Calculation SOLVER = new Calculation() {
        @Override
        public Case read(Path file) {
            return CaseReader.read(file);
        }

        @Override
        public Answer answer(Case subject, Progress progress) {
            return Solver.answer(subject, progress);
        }

        @Override
        public Inspection inspect(Case subject, Progress progress) {
            return Solver.inspect(subject, progress);
        }

        @Override
        public void writeSystem(Answer answer, Path stem) throws IOException {
            Solver.writeSystem(answer, stem);
        }
    };

    /** Reads a case file. */
    Case read(Path file);

    /** Reads the outlines of a case, whatever else in it is wrong. */
    default DrawnCase readOutlines(Path file) {
        return DrawnCaseReader.read(file);
    }

    /** Answers every ask. */
    Answer answer(Case subject, Progress progress);

    /** Checks and meshes. */
    Inspection inspect(Case subject, Progress progress);

    /** Writes the equations as stem.mtx and stem_rhs.mtx. */
    void writeSystem(Answer answer, Path stem) throws IOException;
}
