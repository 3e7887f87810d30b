package tepor.solver.linear;

/**
 * Cholesky factor L Lᵀ of a small matrix, for the coarsest level, solved with no allocation.
 *
 * <p>A pivot that cancels to rounding is replaced by its diagonal, so that a semidefinite matrix still gives a definite
 * map: as a preconditioner need only be near the inverse, conjugate gradients on the true matrix judge the rest.
 */
final class DenseCholesky {
    private final int size;
    private final double[] factor; // lower triangle, row by row: entry (i, j), j ≤ i, at i(i+1)/2 + j

    /** @param a sorted, symmetric, with positive diagonal */
    DenseCholesky(CompressedRows a) {
        size = a.rowCount;
        double[] l = new double[size * (size + 1) / 2];
        for (int i = 0; i < size; i++) {
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1] && a.column[k] <= i; k++) {
                l[i * (i + 1) / 2 + a.column[k]] = a.value[k];
            }
        }
        for (int i = 0; i < size; i++) {
            int rowI = i * (i + 1) / 2;
            double diagonal = l[rowI + i];
            for (int j = 0; j <= i; j++) {
                int rowJ = j * (j + 1) / 2;
                double sum = l[rowI + j];
                for (int k = 0; k < j; k++) {
                    sum -= l[rowI + k] * l[rowJ + k];
                }
                if (j < i) {
                    l[rowI + j] = sum / l[rowJ + j];
                } else {
                    boolean cancelled = !(sum > size * Math.ulp(diagonal));
                    l[rowI + i] = Math.sqrt(cancelled ? diagonal : sum);
                }
            }
        }
        factor = l;
    }

    /** x = (L Lᵀ)⁻¹ b; the two may be one array. */
    void solve(double[] b, double[] x) {
        double[] l = factor;
        for (int i = 0, row = 0; i < size; row += ++i) {
            double sum = b[i];
            for (int k = 0; k < i; k++) {
                sum -= l[row + k] * x[k];
            }
            x[i] = sum / l[row + i];
        }
        for (int i = size - 1; i >= 0; i--) {
            int row = i * (i + 1) / 2;
            double xi = x[i] / l[row + i];
            x[i] = xi;
            for (int k = 0; k < i; k++) {
                x[k] -= l[row + k] * xi;
            }
        }
    }
}
