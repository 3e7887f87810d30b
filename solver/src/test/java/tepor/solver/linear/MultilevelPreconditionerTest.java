package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.Vector;
import no.uib.cipr.matrix.sparse.SparseVector;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MultilevelPreconditionerTest {
    private static final int CELLS = 48;

    private static DenseVector random(int size, long seed) {
        return new DenseVector(
                new Random(seed).doubles(size).map(v -> 2 * v - 1).toArray(), false);
    }

    /** The rounding of the coarse solutions grows with the contrast of the conductivities, and with it the tolerance. */
    @ParameterizedTest
    @CsvSource({
        "constant, false, 1e-12",
        "constant, true, 1e-12",
        "anisotropic, true, 1e-12",
        "fixed ends, true, 1e-12",
        "inclusions, false, 1e-9",
        "checkerboard, false, 1e-9",
        "checkerboard, true, 1e-9"
    })
    void isSymmetricAndPositiveDefinite(String name, boolean quadratic, double tolerance) {
        ModelProblem problem = ModelProblem.named(name, quadratic, CELLS);
        MultilevelPreconditioner b = problem.solver().preconditioner();
        int n = problem.matrix.numRows();
        assertThat(b.levelCount()).isGreaterThanOrEqualTo(3);
        for (int trial = 0; trial < 10; trial++) {
            DenseVector x = random(n, 2 * trial);
            DenseVector y = random(n, 2 * trial + 1);
            Vector bx = b.apply(x, new DenseVector(n));
            Vector by = b.apply(y, new DenseVector(n));
            double size = Math.sqrt(x.dot(bx) * y.dot(by)); // bounds |xᵀBy| where B is definite
            assertThat(x.dot(bx)).isPositive();
            assertThat(y.dot(by)).isPositive();
            assertThat(x.dot(by) - y.dot(bx)).isCloseTo(0, within(tolerance * size));
        }
    }

    @Test
    void isLinearAndOverwritesWhatItsOutputHeld() {
        ModelProblem problem = ModelProblem.named("checkerboard", true, CELLS);
        MultilevelPreconditioner b = problem.solver().preconditioner();
        int n = problem.matrix.numRows();
        DenseVector x = random(n, 1);
        DenseVector clean = new DenseVector(n);
        b.apply(x, clean);
        DenseVector dirty = new DenseVector(n);
        Arrays.fill(dirty.getData(), Double.NaN);
        b.apply(random(n, 2), new DenseVector(n));
        b.apply(x, dirty);
        assertThat(dirty.getData()).containsExactly(clean.getData());
        b.apply(x.copy().scale(-4), dirty);
        assertThat(dirty.scale(-0.25).getData()).containsExactly(clean.getData());
        assertThat(x.getData()).containsExactly(random(n, 1).getData());
    }

    @Test
    void isTheInverseWhereOneLevelSuffices() {
        ModelProblem problem = ModelProblem.linear(12, ModelProblem.inclusions());
        MultilevelPreconditioner b = problem.solver().preconditioner();
        assertThat(b.levelCount()).isEqualTo(1);
        DenseVector exact = random(problem.matrix.numRows(), 1);
        Vector back = b.apply(problem.matrix.mult(exact, new DenseVector(exact.size())), new DenseVector(exact.size()));
        assertThat(back.add(-1, exact).norm(Vector.Norm.Infinity)).isLessThan(1e-9);
    }

    /** A bar that is insulated all round: its matrix has the constants for a null space, and a last pivot of rounding. */
    @Test
    void aSemidefiniteMatrixStillGivesADefiniteMap() {
        for (int nodes = 20; nodes < 60; nodes++) {
            int[] elements = new int[2 * (nodes - 1)];
            Arrays.setAll(elements, k -> (k + 1) / 2);
            SparsityPattern pattern = new SparsityPattern(nodes, 2, elements);
            double[] value = new double[pattern.slotCount()];
            Random random = new Random(nodes);
            for (int e = 0; e < nodes - 1; e++) {
                double k = random.nextDouble();
                pattern.add(e, new double[] {k, -k, -k, k}, value);
            }
            DenseVector x = random(nodes, 1);
            Vector bx =
                    new MultilevelPreconditioner(new SymmetricMatrix(pattern, value)).apply(x, new DenseVector(nodes));
            assertThat(x.dot(bx)).isPositive().isFinite();
        }
    }

    @Test
    void quadraticProblemsAreCoarsenedToTheirCorners() {
        MultilevelPreconditioner b =
                ModelProblem.quadratic(CELLS, ModelProblem.constant(1)).solver().preconditioner();
        assertThat(b.unknowns(0)).isEqualTo((2 * CELLS + 1) * (2 * CELLS + 1));
        assertThat(b.unknowns(1)).isEqualTo((CELLS + 1) * (CELLS + 1));
        assertThat(b.unknowns(2)).as("aggregates of five and more").isLessThan(b.unknowns(1) / 5);
        assertThat(b.unknowns(b.levelCount() - 1)).isLessThanOrEqualTo(300);
    }

    /** On straight triangles PᵀA₂P is the matrix of the linear functions, for they are quadratic ones too. */
    @Test
    void cornerInterpolationGivesTheMatrixOfLinearTriangles() {
        ModelProblem quadratic = ModelProblem.quadratic(20, ModelProblem.inclusions());
        ModelProblem linear = ModelProblem.linear(20, ModelProblem.inclusions());
        CompressedRows coarse =
                quadratic.matrix.rows().galerkin(CornerInterpolation.of(quadratic.corners, quadratic.matrix.numRows()));
        CompressedRows expected = linear.matrix.rows();
        assertThat(coarse.column).containsExactly(expected.column);
        for (int k = 0; k < expected.value.length; k++) {
            assertThat(coarse.value[k]).isCloseTo(expected.value[k], within(1e-10));
        }
    }

    @Test
    void sameMatrixGivesSameBitsAndSetMatrixRebuilds() {
        ModelProblem problem = ModelProblem.named("inclusions", false, CELLS);
        int n = problem.matrix.numRows();
        DenseVector first = new DenseVector(n);
        problem.solver().preconditioner().apply(random(n, 1), first);
        MultilevelPreconditioner other =
                ModelProblem.named("constant", false, CELLS).solver().preconditioner();
        other.setMatrix(problem.matrix);
        DenseVector second = new DenseVector(n);
        other.apply(random(n, 1), second);
        assertThat(second.getData()).containsExactly(first.getData());
    }

    @Test
    void takesOtherVectorsThanDenseOnes() {
        ModelProblem problem = ModelProblem.named("constant", false, CELLS);
        int n = problem.matrix.numRows();
        MultilevelPreconditioner b = problem.solver().preconditioner();
        DenseVector rhs = random(n, 1);
        DenseVector expected = new DenseVector(n);
        b.apply(rhs, expected);
        Vector sparse = b.transApply(new SparseVector(rhs), new SparseVector(n));
        assertThat(new DenseVector(sparse).getData()).containsExactly(expected.getData());
    }

    @Test
    void aLargeDiagonalMatrixNeedsNoCoarseLevel() {
        int n = 1000;
        double[] value = new double[n];
        Arrays.setAll(value, i -> 1 + i);
        SymmetricMatrix matrix = new SymmetricMatrix(new SparsityPattern(n, 1, new int[0]), value);
        DenseVector x = new DenseVector(n);
        double[] ones = new double[n];
        Arrays.fill(ones, 1);
        new MultilevelPreconditioner(matrix).apply(new DenseVector(value), x);
        assertThat(x.getData()).containsExactly(ones, within(1e-15));
    }

    @Test
    void refusesDiagonalsThatAreNotPositiveAndCornersThatAreNone() {
        SparsityPattern pattern = new SparsityPattern(2, 2, new int[] {0, 1});
        assertThatThrownBy(() -> new MultilevelPreconditioner(new SymmetricMatrix(pattern, new double[] {1, 0, 0, -2})))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("row 1 has the diagonal -2.0");
        SymmetricMatrix good = new SymmetricMatrix(pattern, new double[] {1, 0, 0, 1});
        assertThatThrownBy(() -> MultilevelPreconditioner.quadratic(good, new int[] {0, 0, 0, 1}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("unknown 1 is to lie between corners, of which 1 is none");
        assertThatThrownBy(() -> MultilevelPreconditioner.quadratic(good, new int[] {0, 0}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("two each");
        DenseVector x = new DenseVector(2);
        assertThatThrownBy(() -> new MultilevelPreconditioner(good).apply(x, x))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
