package tepor.solver.linear;

/** One level of the hierarchy: its matrix, its smoother, the prolongation from the next coarser level, and workspace. */
final class Level {
    final CompressedRows a;
    /** From the next coarser level; null on the coarsest. */
    final CompressedRows prolongation;

    /** Workspace of this size: right-hand side, solution and residual of this level. */
    final double[] b;

    final double[] x;
    final double[] r;
    final double[] correction;

    private final int[] diagonalSlot;
    private final double[] inverseDiagonal;

    Level(CompressedRows a, int[] diagonalSlot, CompressedRows prolongation) {
        this.a = a;
        this.prolongation = prolongation;
        this.diagonalSlot = diagonalSlot;
        int n = a.rowCount;
        b = new double[n];
        x = new double[n];
        r = new double[n];
        correction = new double[n];
        inverseDiagonal = new double[n];
        for (int i = 0; i < n; i++) {
            inverseDiagonal[i] = 1 / a.value[diagonalSlot[i]];
        }
    }

    /** One forward Gauss–Seidel sweep on A x = b from x = 0; whatever x held is overwritten. */
    void sweepForwardFromZero(double[] rhs, double[] sol) {
        int[] start = a.rowStart;
        int[] column = a.column;
        double[] value = a.value;
        for (int i = 0; i < a.rowCount; i++) {
            double sum = rhs[i];
            for (int k = start[i], diagonal = diagonalSlot[i]; k < diagonal; k++) {
                sum -= value[k] * sol[column[k]];
            }
            sol[i] = sum * inverseDiagonal[i];
        }
    }

    /** r = b − A x right after {@link #sweepForwardFromZero}: as (L + D) x = b, only −U x is left. */
    void residualAfterForwardSweep(double[] sol, double[] res) {
        int[] start = a.rowStart;
        int[] column = a.column;
        double[] value = a.value;
        for (int i = 0; i < a.rowCount; i++) {
            double sum = 0;
            for (int k = diagonalSlot[i] + 1, end = start[i + 1]; k < end; k++) {
                sum -= value[k] * sol[column[k]];
            }
            res[i] = sum;
        }
    }

    /** One backward Gauss–Seidel sweep on A x = b. */
    void sweepBackward(double[] rhs, double[] sol) {
        int[] start = a.rowStart;
        int[] column = a.column;
        double[] value = a.value;
        for (int i = a.rowCount - 1; i >= 0; i--) {
            double sum = rhs[i];
            int diagonal = diagonalSlot[i];
            for (int k = start[i]; k < diagonal; k++) {
                sum -= value[k] * sol[column[k]];
            }
            for (int k = diagonal + 1, end = start[i + 1]; k < end; k++) {
                sum -= value[k] * sol[column[k]];
            }
            sol[i] = sum * inverseDiagonal[i];
        }
    }
}
