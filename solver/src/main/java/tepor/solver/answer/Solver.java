package tepor.solver.answer;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Place;
import tepor.mesher.refinement.RefinementReport;
import tepor.solver.field.Solution;
import tepor.solver.field.UnsolvedException;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;

/** Answers cases. */
public final class Solver {
    /** No case should need so many; ends a loop that noise in the meshes might keep going. */
    private static final int ROUNDS_AT_MOST = 14;

    private final Case subject;
    private final Progress progress;
    private final MeshFinder meshes;
    private final AskConvergence convergence;
    private final List<Answer.Round> history = new ArrayList<>();
    private final List<Finding> warnings;
    private double secondsAssembly;
    private double secondsLinear;

    private Solver(Case subject, Progress progress) {
        this.subject = subject;
        this.progress = progress;
        meshes = new MeshFinder(subject, progress::stopped);
        convergence = new AskConvergence(subject);
        warnings = new ArrayList<>(subject.warnings());
        warnings.addAll(CrossingCheck.check(subject));
    }

    /**
     * Answers every ask of a case.
     *
     * @throws tepor.mesher.outline.FaultyInputException if the case has no answer, such as for a part that nothing ties to
     *     a temperature
     * @throws UnfinishedException if the computation could not be finished
     * @throws java.util.concurrent.CancellationException if told to stop
     */
    public static Answer answer(Case subject, Progress progress) {
        try {
            return new Solver(subject, progress).answer();
        } catch (UnsolvedException e) {
            UnfinishedException unfinished = new UnfinishedException(e.getMessage());
            unfinished.initCause(e);
            throw unfinished;
        }
    }

    /** Checks and meshes a case, solves nothing. Throws as {@link #answer} does. */
    public static Inspection inspect(Case subject, Progress progress) {
        Solver solver = new Solver(subject, progress);
        progress.stage("meshing");
        MeshResult mesh = solver.meshes.first();
        FloatingPartCheck.check(subject, mesh.mesh());
        solver.warnOfLimit(mesh);
        return new Inspection(subject, mesh, solver.meshes.seconds(), InsulatedFinder.find(subject), solver.warnings);
    }

    /**
     * Writes the equations of an answer's last mesh, fixed temperatures eliminated, in Matrix Market form: the solution of
     * the system is the temperature of each free node in kelvin.
     *
     * @param stem written are stem.mtx and stem_rhs.mtx, each whole or not at all
     */
    public static void writeSystem(Answer answer, Path stem) throws IOException {
        SystemFiles.write(answer, stem);
    }

    private Answer answer() {
        long t0 = System.nanoTime();
        progress.stage("meshing");
        MeshResult mesh = meshes.first();
        FloatingPartCheck.check(subject, mesh.mesh());
        CaseSolutions solutions = null;
        AskEvaluator evaluator = null;
        while (mesh != null) {
            solutions = new CaseSolutions(subject, mesh.mesh(), progress::stopped);
            evaluator = new AskEvaluator(solutions);
            progress.stage("solving");
            Solution nominal = solutions.nominal();
            convergence.add(evaluator, mesh.mesh().triangleCount());
            secondsAssembly += solutions.secondsAssembly();
            secondsLinear += solutions.secondsLinear();
            history.add(convergence.round(mesh.mesh().triangleCount()));
            progress.round(history.size(), mesh.mesh().triangleCount(), convergence.widestRelative());
            boolean atLimit = mesh.report().count(RefinementReport.Reason.ELEMENT_LIMIT) > 0;
            if (!subject.accuracy().adapt()
                    || convergence.settled()
                    || atLimit
                    || history.size() == ROUNDS_AT_MOST
                    || nominal.unknowns() == 0) {
                break;
            }
            progress.stage("meshing");
            MeshResult next =
                    meshes.next(mesh.mesh(), solutions.all(), convergence.widestRelative(), convergence.places());
            if (next == null) {
                break;
            }
            mesh = next;
        }
        warnOfLimit(mesh);
        warnOfMissedTolerances();
        Solution nominal = solutions.nominal();
        return new Answer(
                subject,
                mesh,
                nominal.field(),
                convergence.answers(evaluator),
                LedgerBuilder.build(solutions, subject.inputs().nominal()),
                InsulatedFinder.find(subject),
                history,
                new Answer.Figures(
                        nominal.unknowns(),
                        solutions.iterations(),
                        nominal.residual(),
                        meshes.seconds(),
                        secondsAssembly,
                        secondsLinear,
                        1e-9 * (System.nanoTime() - t0)),
                warnings);
    }

    private void warnOfLimit(MeshResult mesh) {
        long count = mesh.report().count(RefinementReport.Reason.ELEMENT_LIMIT);
        if (count > 0) {
            warn(
                    "element-limit",
                    casePlace(),
                    "the mesh stopped at its limit of " + subject.mesh().trianglesAtMost() + " triangles with " + count
                            + " of them coarser or worse than asked",
                    "raise elements_at_most under [mesh], or ask for larger sizes");
        }
    }

    private void warnOfMissedTolerances() {
        if (!subject.accuracy().adapt()) {
            if (!subject.asks().isEmpty()) {
                warn(
                        "mesh-error-unknown",
                        casePlace(),
                        "adapt = false: one mesh cannot show how far off it is, so no mesh error is stated",
                        "leave adapt out to have the mesh refined until each answer is close enough");
            }
            return;
        }
        for (int i = 0; i < subject.asks().size(); i++) {
            Ask ask = subject.asks().get(i);
            if (!convergence.error(i).reached()) {
                warn(
                        "tolerance-missed",
                        ask.head().place(),
                        "the mesh error of '" + ask.name()
                                + "' is not yet within what was asked; refinement stopped at "
                                + history.get(history.size() - 1).triangles() + " triangles",
                        history.size() == ROUNDS_AT_MOST
                                ? "widen `within`: " + ROUNDS_AT_MOST + " rounds are the most that are made"
                                : "raise elements_at_most under [mesh], or widen `within`");
            }
        }
    }

    private Place casePlace() {
        return new Place(
                subject.files().isEmpty()
                        ? subject.name()
                        : subject.files().get(0).name(),
                0,
                0);
    }

    private void warn(String code, Place place, String what, String remedy) {
        warnings.add(new Finding(Finding.Severity.WARNING, code, place, what, remedy));
    }
}
