package tepor.solver.linear;

/**
 * b − A x, computed as if in twice the precision and then rounded (algorithm Dot2 of Ogita, Rump & Oishi 2005, "Accurate
 * sum and dot product", SIAM J. Sci. Comput. 26:1955–1988), and what rounding makes of it.
 */
final class Residual {
    private Residual() {}

    /**
     * @param a square
     * @param b right-hand side
     * @param x solution
     * @param r overwritten by b − A x
     */
    static void compute(CompressedRows a, double[] b, double[] x, double[] r) {
        int[] start = a.rowStart;
        int[] column = a.column;
        double[] value = a.value;
        for (int i = 0; i < a.rowCount; i++) {
            double sum = b[i];
            double error = 0;
            for (int k = start[i], end = start[i + 1]; k < end; k++) {
                double factor = x[column[k]];
                double product = -value[k] * factor;
                double next = sum + product;
                double part = next - sum;
                error += Math.fma(-value[k], factor, -product) + ((sum - (next - part)) + (product - part));
                sum = next;
            }
            r[i] = sum + error;
        }
    }

    /** Euclidean norm of ε (|b| + |A| |x|): what storing x to double precision does to b − A x, about. */
    static double rounding(CompressedRows a, double[] b, double[] x) {
        double square = 0;
        for (int i = 0; i < a.rowCount; i++) {
            double size = Math.abs(b[i]);
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
                size += Math.abs(a.value[k] * x[a.column[k]]);
            }
            square += size * size;
        }
        return 0x1p-53 * Math.sqrt(square);
    }
}
