package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import no.uib.cipr.matrix.DenseMatrix;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.Matrix;
import no.uib.cipr.matrix.MatrixEntry;
import no.uib.cipr.matrix.Vector;
import no.uib.cipr.matrix.sparse.SparseVector;
import org.junit.jupiter.api.Test;

class SymmetricMatrixTest {
    private final SymmetricMatrix matrix = ModelProblem.fixedEnds(5, true, ModelProblem.inclusions()).matrix;
    private final Matrix dense = new DenseMatrix(matrix);
    private final DenseVector x = random(1);

    private DenseVector random(long seed) {
        return new DenseVector(new Random(seed).doubles(matrix.numRows()).toArray());
    }

    @Test
    void productsAreThoseOfTheDenseMatrix() {
        int n = matrix.numRows();
        assertClose(matrix.mult(x, random(2)), dense.mult(x, new DenseVector(n)));
        assertClose(matrix.mult(-3, x, random(2)), dense.mult(-3, x, new DenseVector(n)));
        assertClose(matrix.multAdd(x, random(2)), dense.multAdd(x, random(2)));
        assertClose(matrix.multAdd(-3, x, random(2)), dense.multAdd(-3, x, random(2)));
        assertClose(matrix.transMult(x, random(2)), dense.transMult(x, new DenseVector(n)));
        assertClose(matrix.transMult(-3, x, random(2)), dense.transMult(-3, x, new DenseVector(n)));
        assertClose(matrix.transMultAdd(x, random(2)), dense.transMultAdd(x, random(2)));
        assertClose(matrix.transMultAdd(-3, x, random(2)), dense.transMultAdd(-3, x, random(2)));
    }

    @Test
    void takesOtherVectorsThanDenseOnes() {
        Vector sparse = new SparseVector(x);
        assertClose(matrix.mult(sparse, random(2)), dense.mult(x, new DenseVector(matrix.numRows())));
    }

    private static void assertClose(Vector actual, Vector expected) {
        double scale = expected.norm(Vector.Norm.Infinity);
        for (int i = 0; i < expected.size(); i++) {
            assertThat(actual.get(i)).isCloseTo(expected.get(i), within(1e-14 * scale));
        }
    }

    @Test
    void isSymmetricWithTheEntriesThatItIterates() {
        int count = 0;
        for (MatrixEntry entry : matrix) {
            assertThat(entry.get()).isEqualTo(dense.get(entry.row(), entry.column()));
            assertThat(matrix.get(entry.column(), entry.row()))
                    .isCloseTo(entry.get(), within(1e-15 * Math.abs(entry.get()) + 1e-15));
            count++;
        }
        assertThat(count).isEqualTo(matrix.entryCount());
        assertThat(matrix.get(0, matrix.numRows() - 1)).isZero();
    }

    @Test
    void productsOfOtherSizesAreRefused() {
        assertThatThrownBy(() -> matrix.mult(new DenseVector(3), x)).isInstanceOf(IndexOutOfBoundsException.class);
        assertThatThrownBy(() -> matrix.multAdd(2, x, new DenseVector(3)))
                .isInstanceOf(IndexOutOfBoundsException.class);
        assertThatThrownBy(() -> matrix.get(0, matrix.numRows())).isInstanceOf(IndexOutOfBoundsException.class);
    }

    @Test
    void valuesOfAnotherNumberAreRefused() {
        SparsityPattern pattern = new SparsityPattern(3, 3, new int[] {0, 1, 2});
        assertThatThrownBy(() -> new SymmetricMatrix(pattern, new double[8]))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("8 values for a pattern of 9");
    }
}
