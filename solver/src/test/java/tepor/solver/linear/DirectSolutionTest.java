package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Deque;
import org.ejml.data.DMatrixRMaj;
import org.ejml.data.DMatrixSparseCSC;
import org.ejml.data.DMatrixSparseTriplet;
import org.ejml.ops.DConvertMatrixStruct;
import org.ejml.sparse.FillReducing;
import org.ejml.sparse.csc.factory.LinearSolverFactory_DSCC;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Solutions against a direct solver of another library (EJML's sparse Cholesky), whose own rounding is taken out by one
 * correction for a residual computed exactly: it alone would be 1e−9 off at contrasts of 1e4.
 */
class DirectSolutionTest {
    @ParameterizedTest
    @CsvSource({
        "constant, false, 40",
        "checkerboard, false, 40",
        "inclusions, false, 40",
        "rotated, false, 40",
        "constant, true, 24",
        "checkerboard, true, 24",
        "inclusions, true, 24",
        "anisotropic, true, 24",
        "graded, true, 24",
        "fixed ends, true, 24"
    })
    void agreesWithCholesky(String name, boolean quadratic, int n) {
        ModelProblem problem = ModelProblem.named(name, quadratic, n);
        double[] x = new double[problem.load.length];
        LinearSolver solver = problem.solver();
        assertThat(solver.preconditioner().levelCount()).isGreaterThan(1);
        SolveReport report = solver.solve(problem.load, x);
        assertThat(report.usable()).isTrue();
        assertThat(x).containsExactly(direct(problem), within(1e-11)); // the solution runs from 1 to 0
    }

    private static double[] direct(ModelProblem problem) {
        CompressedRows a = problem.matrix.rows();
        int[] order = reverseCuthillMcKee(a);
        int n = order.length;
        int[] place = new int[n];
        for (int k = 0; k < n; k++) {
            place[order[k]] = k;
        }
        DMatrixSparseTriplet triplet = new DMatrixSparseTriplet(n, n, a.entryCount());
        for (int i = 0; i < n; i++) {
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
                triplet.addItem(place[i], place[a.column[k]], a.value[k]);
            }
        }
        DMatrixSparseCSC matrix = DConvertMatrixStruct.convert(triplet, (DMatrixSparseCSC) null);
        var solver = LinearSolverFactory_DSCC.cholesky(FillReducing.NONE);
        assertThat(solver.setA(matrix)).isTrue();
        double[] x = new double[n];
        for (int step = 0; step < 2; step++) {
            DMatrixRMaj residual = new DMatrixRMaj(n, 1);
            for (int i = 0; i < n; i++) {
                residual.set(place[i], exactResidual(a, i, problem.load[i], x));
            }
            DMatrixRMaj correction = new DMatrixRMaj(n, 1);
            solver.solve(residual, correction);
            for (int i = 0; i < n; i++) {
                x[i] += correction.get(place[i]);
            }
        }
        return x;
    }

    private static double exactResidual(CompressedRows a, int row, double load, double[] x) {
        BigDecimal sum = new BigDecimal(load);
        for (int k = a.rowStart[row]; k < a.rowStart[row + 1]; k++) {
            sum = sum.subtract(new BigDecimal(a.value[k]).multiply(new BigDecimal(x[a.column[k]])));
        }
        return sum.doubleValue();
    }

    /** Cuthill & McKee 1969, "Reducing the bandwidth of sparse symmetric matrices", backwards; for connected matrices. */
    private static int[] reverseCuthillMcKee(CompressedRows a) {
        int[] order = new int[a.rowCount];
        boolean[] seen = new boolean[a.rowCount];
        Deque<Integer> queue = new ArrayDeque<>();
        queue.add(0);
        seen[0] = true;
        int next = a.rowCount;
        while (!queue.isEmpty()) {
            int i = queue.remove();
            order[--next] = i;
            Arrays.stream(a.column, a.rowStart[i], a.rowStart[i + 1])
                    .filter(j -> !seen[j])
                    .boxed()
                    .sorted(Comparator.comparingInt(j -> a.rowStart[j + 1] - a.rowStart[j]))
                    .forEach(j -> {
                        seen[j] = true;
                        queue.add(j);
                    });
        }
        assertThat(next).isZero();
        return order;
    }
}
