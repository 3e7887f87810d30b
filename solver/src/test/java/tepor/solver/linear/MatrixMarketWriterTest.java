package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.io.MatrixVectorReader;
import no.uib.cipr.matrix.sparse.CompRowMatrix;
import org.junit.jupiter.api.Test;

class MatrixMarketWriterTest {
    /** Header, size line and first entries as NISTIR 5935 words them. */
    @Test
    void writesTheLowerTriangleFromOne() throws IOException {
        SymmetricMatrix matrix =
                new SymmetricMatrix(new SparsityPattern(2, 2, new int[] {0, 1}), new double[] {2, -0.1, -0.1, 1e-300});
        StringWriter out = new StringWriter();
        MatrixMarketWriter.writeMatrix(matrix, out);
        assertThat(out.toString())
                .isEqualTo("%%MatrixMarket matrix coordinate real symmetric\n2 2 3\n1 1 2.0\n2 1 -0.1\n2 2 1.0E-300\n");
        StringWriter vector = new StringWriter();
        MatrixMarketWriter.writeVector(new double[] {1 / 3.0, -2}, vector);
        assertThat(vector.toString())
                .isEqualTo("%%MatrixMarket matrix array real general\n2 1\n0.3333333333333333\n-2.0\n");
    }

    @Test
    void readByAnotherLibraryEveryBitIsThere() throws IOException {
        ModelProblem problem = ModelProblem.quadratic(6, ModelProblem.inclusions());
        StringWriter out = new StringWriter();
        MatrixMarketWriter.writeMatrix(problem.matrix, out);
        CompRowMatrix read = new CompRowMatrix(new MatrixVectorReader(new StringReader(out.toString())));
        assertThat(read.numRows()).isEqualTo(problem.matrix.numRows());
        for (int i = 0; i < read.numRows(); i++) {
            for (int j = 0; j <= i; j++) {
                assertThat(read.get(i, j)).isEqualTo(problem.matrix.get(i, j));
                assertThat(read.get(j, i)).isEqualTo(problem.matrix.get(i, j));
            }
        }
        StringWriter vector = new StringWriter();
        MatrixMarketWriter.writeVector(problem.load, vector);
        String[] lines = vector.toString().split("\n");
        assertThat(lines).hasSize(2 + problem.load.length);
        for (int i = 0; i < problem.load.length; i++) {
            assertThat(Double.parseDouble(lines[2 + i])).isEqualTo(problem.load[i]);
        }
        assertThat(new DenseVector(problem.load).size()).isEqualTo(problem.load.length);
    }
}
