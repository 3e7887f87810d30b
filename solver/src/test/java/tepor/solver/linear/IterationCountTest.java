package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;

import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.Vector;
import no.uib.cipr.matrix.sparse.CG;
import no.uib.cipr.matrix.sparse.IterativeSolverNotConvergedException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Iterations to a relative residual of 1e−10. No table of such counts was found published; the reference is one measured
 * when the method was chosen, on problems described like these (perturbed meshes, films at both ends): smoothed
 * aggregation with Krylov cycles took 16, 20, 19, 46 iterations on 14 641 linear unknowns (constant, 8 × 8 checkerboard of
 * 1 : 1e4, 60 inclusions of 1e±4, anisotropy 100 : 1 along the axis) and 13, 19, 18, 56 on 58 081 quadratic ones; with
 * V-cycles 16, 35, 28, 47 and 16, 42, 29, 57. A band is the Krylov count +15 % (+30 % where anisotropic and quadratic, for
 * there the smoother is half of theirs), and half of it below.
 */
class IterationCountTest {
    private static int iterations(String name, boolean quadratic, int n) {
        ModelProblem problem = ModelProblem.named(name, quadratic, n);
        DenseVector load = new DenseVector(problem.load, false);
        SolveMonitor monitor = new SolveMonitor(1e-10 * load.norm(Vector.Norm.Two), 1000, () -> false);
        CG conjugateGradients = new CG(load);
        conjugateGradients.setPreconditioner(problem.solver().preconditioner());
        conjugateGradients.setIterationMonitor(monitor);
        try {
            conjugateGradients.solve(problem.matrix, load, new DenseVector(load.size()));
        } catch (IterativeSolverNotConvergedException e) {
            throw new AssertionError(e);
        }
        assertThat(monitor.stagnated()).isFalse();
        return monitor.iterations();
    }

    @ParameterizedTest
    @CsvSource({
        "false, constant, 16, 15",
        "false, checkerboard, 20, 15",
        "false, inclusions, 19, 15",
        "false, anisotropic, 46, 15",
        "true, constant, 13, 15",
        "true, checkerboard, 19, 15",
        "true, inclusions, 18, 15",
        "true, anisotropic, 56, 30"
    })
    void areThoseOfTheReference(boolean quadratic, String name, int reference, int percent) {
        assertThat(iterations(name, quadratic, 120))
                .isBetween(reference / 2, (int) Math.ceil(reference * (1 + percent / 100.0)));
    }

    /** Twice the cells each way, four times the unknowns. */
    @ParameterizedTest
    @CsvSource({
        "false, constant",
        "false, weak films",
        "false, checkerboard",
        "false, strong checkerboard",
        "false, inclusions",
        "false, anisotropic",
        "false, layers",
        "true, constant",
        "true, weak films",
        "true, checkerboard",
        "true, strong checkerboard",
        "true, inclusions",
        "true, anisotropic",
        "true, layers"
    })
    void hardlyGrowWithTheMesh(boolean quadratic, String name) {
        int coarse = iterations(name, quadratic, 48);
        int fine = iterations(name, quadratic, 96);
        assertThat(fine).isLessThanOrEqualTo((int) (1.2 * coarse) + 1);
        if (!name.equals("anisotropic")) {
            assertThat(fine).as("on %s", name).isLessThanOrEqualTo(25);
        }
    }

    /** The known hard case of point smoothers; stated here so that a change shows. */
    @Test
    void rotatedAnisotropyTakesTheLongest() {
        assertThat(iterations("rotated", false, 96)).isBetween(50, 95);
        assertThat(iterations("rotated", true, 64)).isBetween(40, 95);
    }
}
