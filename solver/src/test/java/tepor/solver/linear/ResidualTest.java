package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Random;
import org.junit.jupiter.api.Test;

class ResidualTest {
    @Test
    void isThatOfExactArithmeticWhereTermsCancel() {
        ModelProblem problem = ModelProblem.named("checkerboard", true, 8);
        CompressedRows a = problem.matrix.rows();
        double[] x = new Random(5).doubles(a.rowCount, 0.5, 0.5 + 1e-9).toArray();
        double[] r = new double[a.rowCount];
        Residual.compute(a, problem.load, x, r);
        for (int i = 0; i < a.rowCount; i++) {
            BigDecimal exact = new BigDecimal(problem.load[i]);
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
                exact = exact.subtract(new BigDecimal(a.value[k]).multiply(new BigDecimal(x[a.column[k]])));
            }
            assertThat(r[i]).isCloseTo(exact.doubleValue(), within(1e-14 * Math.abs(exact.doubleValue()) + 1e-25));
        }
    }

    /** One row, 3·1 + 4·1 on a right-hand side of 7: ε (7 + 7). */
    @Test
    void roundingIsHalfAnUlpOfAllTheTerms() {
        CompressedRows a = new CompressedRows(2, new int[] {0, 2}, new int[] {0, 1}, new double[] {3, -4});
        assertThat(Residual.rounding(a, new double[] {7}, new double[] {1, 1})).isEqualTo(14 * 0x1p-53);
    }
}
