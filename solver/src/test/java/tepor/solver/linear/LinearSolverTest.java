package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.solver.linear.SolveReport.Reason;

class LinearSolverTest {
    /** Between films of 1 and conductivity 1 over a length of 1, resistances 1 + 1 + 1: x falls from 2/3 to 1/3. */
    @Test
    void aSlabBetweenFilmsIsExactOnAnyMesh() {
        for (ModelProblem problem : new ModelProblem[] {
            ModelProblem.linear(40, ModelProblem.constant(1)), ModelProblem.quadratic(40, ModelProblem.constant(1))
        }) {
            double[] x = new double[problem.load.length];
            SolveReport report = problem.solver().solve(problem.load, x);
            assertThat(report.usable()).isTrue();
            assertThat(x[0]).isCloseTo(2.0 / 3, within(1e-11));
            assertThat(x[40]).isCloseTo(1.0 / 3, within(1e-11));
            assertThat(Arrays.stream(x).max().orElseThrow()).isLessThan(2.0 / 3 + 1e-11);
        }
    }

    @Test
    void theReportedResidualIsTheTrueOne() {
        ModelProblem problem = ModelProblem.linear(40, ModelProblem.inclusions());
        double[] x = new double[problem.load.length];
        SolveReport report = problem.solver().solve(problem.load, x, 1e-5, () -> false);
        double[] residual = problem.load.clone();
        problem.matrix.rows().multiplyAdd(-1, x, residual);
        double square = Arrays.stream(residual).map(r -> r * r).sum();
        double loadSquare = Arrays.stream(problem.load).map(r -> r * r).sum();
        assertThat(report.residual()).isCloseTo(Math.sqrt(square / loadSquare), within(1e-10));
        assertThat(report.residual()).isBetween(1e-8, 1e-5);
        assertThat(report.reason()).isEqualTo(Reason.CONVERGED);
    }

    /**
     * Contrast 1e4 and 1e8: the residual is rounding, yet a further correction finds nothing to correct. The correction
     * takes up where the first run left off, so that both together take hardly more iterations than one run would.
     */
    @ParameterizedTest
    @CsvSource({"checkerboard, 1e-14, 30", "weak films, 1e-14, 25", "strong checkerboard, 1e-11, 37"})
    void digitsDoNotSufferFromContrast(String name, double tolerance, int mostIterations) {
        ModelProblem problem = ModelProblem.named(name, true, 32);
        LinearSolver solver = problem.solver();
        double[] x = new double[problem.load.length];
        SolveReport report = solver.solve(problem.load, x);
        assertThat(report.reason()).isEqualTo(Reason.ROUND_OFF);
        assertThat(report.iterations()).isLessThanOrEqualTo(mostIterations);
        double[] further = x.clone();
        solver.solve(problem.load, further, 1e-30, () -> false);
        assertThat(x).containsExactly(further, within(tolerance));
    }

    /** The sum of the balance is what all that enters leaves: it must close to the films' own rounding. */
    @Test
    void heatInIsHeatOutAtHighContrast() {
        ModelProblem problem = ModelProblem.named("checkerboard", true, 32);
        double[] x = new double[problem.load.length];
        problem.solver().solve(problem.load, x);
        double[] residual = new double[x.length];
        Residual.compute(problem.matrix.rows(), problem.load, x, residual);
        double heat = Arrays.stream(problem.load).sum() / 3;
        assertThat(Arrays.stream(residual).sum()).isCloseTo(0, within(1e-9 * heat));
    }

    @Test
    void zeroOnTheRightGivesZeroWhateverTheStart() {
        ModelProblem problem = ModelProblem.linear(20, ModelProblem.constant(1));
        double[] x = new double[problem.load.length];
        Arrays.fill(x, 5);
        SolveReport report = problem.solver().solve(new double[x.length], x);
        assertThat(x).containsOnly(0);
        assertThat(report).isEqualTo(new SolveReport(0, 0, Reason.CONVERGED));
    }

    @Test
    void scalingChangesNothingButTheScale() {
        double[] reference = null;
        int iterations = 0;
        for (double scale : new double[] {1, 0x1p-40, 0x1p40}) {
            ModelProblem problem = ModelProblem.scaled(40, true, ModelProblem.checkerboard(1e4), scale);
            double[] x = new double[problem.load.length];
            SolveReport report = problem.solver().solve(problem.load, x);
            if (reference == null) {
                reference = x;
                iterations = report.iterations();
            }
            assertThat(x).as("powers of two scale every number exactly").containsExactly(reference);
            assertThat(report.iterations()).isEqualTo(iterations);
        }
        for (double scale : new double[] {1e-12, 1e12}) {
            ModelProblem problem = ModelProblem.scaled(40, true, ModelProblem.checkerboard(1e4), scale);
            double[] x = new double[problem.load.length];
            SolveReport report = problem.solver().solve(problem.load, x);
            assertThat(x).containsExactly(reference, within(1e-9));
            assertThat(report.iterations()).isBetween(iterations - 1, iterations + 1);
        }
    }

    @Test
    void aGoodStartSavesIterationsAndAnExactOneNeedsNone() {
        ModelProblem problem = ModelProblem.linear(40, ModelProblem.constant(1));
        LinearSolver solver = problem.solver();
        double[] x = new double[problem.load.length];
        int fromZero = solver.solve(problem.load, x, 1e-10, () -> false).iterations();
        assertThat(solver.solve(problem.load, x, 1e-9, () -> false).iterations())
                .isZero();
        for (int i = 0; i < x.length; i++) {
            x[i] *= 1 + 1e-6 * (i % 7);
        }
        int fromNear = solver.solve(problem.load, x, 1e-10, () -> false).iterations();
        assertThat(fromNear).isBetween(1, fromZero - 3);
    }

    @Test
    void oneSolverServesManyRightHandSidesWithoutTrace() {
        ModelProblem problem = ModelProblem.quadratic(24, ModelProblem.inclusions());
        LinearSolver solver = problem.solver();
        double[] first = new double[problem.load.length];
        solver.solve(problem.load, first);
        double[] other = new double[problem.load.length];
        double[] otherLoad = new double[problem.load.length];
        otherLoad[7] = 3;
        solver.solve(otherLoad, other);
        double[] again = new double[problem.load.length];
        solver.solve(problem.load, again);
        assertThat(again).containsExactly(first);
        double[] anew = new double[problem.load.length];
        problem.solver().solve(problem.load, anew);
        assertThat(anew).containsExactly(first);
    }

    @Test
    void anIndefiniteMatrixIsFoundOut() {
        ModelProblem problem = ModelProblem.linear(40, ModelProblem.constant(1));
        double[] value = problem.matrix.rows().value.clone();
        for (int i = 0; i < problem.load.length; i++) {
            value[problem.pattern.slot(i, i)] -= 0.05; // below the smallest eigenvalues, above 0 on the diagonal
        }
        LinearSolver solver = new LinearSolver(new SymmetricMatrix(problem.pattern, value));
        double[] x = new double[problem.load.length];
        SolveReport report = solver.solve(problem.load, x);
        assertThat(report.reason()).isEqualTo(Reason.NOT_POSITIVE_DEFINITE);
        assertThat(report.usable()).isFalse();
        assertThat(Arrays.stream(x).allMatch(Double::isFinite)).isTrue();
    }

    /** Insulated all round, heated at one point: no temperature is steady. */
    @ParameterizedTest
    @ValueSource(ints = {200, 1000, 40_000})
    void aFloatingBodyWithHeatIsNotCalledSolved(int nodes) {
        SparsityPattern pattern = new SparsityPattern(nodes, 2, chain(nodes));
        double[] value = new double[pattern.slotCount()];
        for (int e = 0; e < nodes - 1; e++) {
            pattern.add(e, new double[] {1, -1, -1, 1}, value);
        }
        double[] b = new double[nodes];
        b[3] = 1;
        SolveReport report = new LinearSolver(new SymmetricMatrix(pattern, value)).solve(b, new double[nodes]);
        assertThat(report.usable()).isFalse();
        assertThat(report.residual()).isGreaterThan(1e-3);
    }

    private static int[] chain(int nodes) {
        int[] elements = new int[2 * (nodes - 1)];
        Arrays.setAll(elements, k -> (k + 1) / 2);
        return elements;
    }

    @Test
    void stopsWhenAsked() {
        ModelProblem problem = ModelProblem.linear(40, ModelProblem.constant(1));
        AtomicInteger asked = new AtomicInteger();
        assertThatThrownBy(() -> problem.solver()
                        .solve(
                                problem.load,
                                new double[problem.load.length],
                                1e-12,
                                () -> asked.incrementAndGet() == 4))
                .isInstanceOf(CancellationException.class);
        assertThat(asked).hasValue(4);
    }

    @Test
    void refusesWrongSizesAndWhatIsNoNumber() {
        ModelProblem problem = ModelProblem.linear(4, ModelProblem.constant(1));
        LinearSolver solver = problem.solver();
        assertThatThrownBy(() -> solver.solve(new double[3], new double[25]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("right-hand side has 3 entries, the matrix 25 rows");
        double[] b = problem.load.clone();
        b[4] = Double.NaN;
        assertThatThrownBy(() -> solver.solve(b, new double[25]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("entry 4 of the right-hand side is NaN");
    }
}
