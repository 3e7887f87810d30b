package tepor.solver.linear;

/**
 * The prolongation of smoothed aggregation, P = (I − ω D⁻¹ A^F) P₀ (Vaněk, Mandel & Brezina 1996, equations 4.1 to 4.3):
 * P₀ is 1 where an unknown belongs to an aggregate, A^F the matrix without its weak couplings, D its diagonal.
 */
final class SmoothedProlongation {
    /** Below this share of its diagonal, what is left after dropping weak couplings says nothing. */
    private static final double LEAST_DIAGONAL = 0.05;

    private static final int POWER_STEPS = 15;
    private static final double POWER_MARGIN = 1.1; // power iteration comes from below

    private SmoothedProlongation() {}

    /**
     * @param a sorted, symmetric
     * @param diagonal of a, positive
     * @param threshold θ of strong couplings
     * @return one row per unknown, one column per aggregate; not sorted
     */
    static CompressedRows of(CompressedRows a, double[] diagonal, double threshold) {
        Aggregation aggregation = new Aggregation(a, diagonal, threshold);
        CompressedRows jacobi = scaledFiltered(a, diagonal, aggregation.strong);
        double omega = 4.0 / 3 / (POWER_MARGIN * spectralRadius(jacobi));
        for (int i = 0; i < jacobi.rowCount; i++) {
            for (int k = jacobi.rowStart[i]; k < jacobi.rowStart[i + 1]; k++) {
                jacobi.value[k] = (jacobi.column[k] == i ? 1 : 0) - omega * jacobi.value[k];
            }
        }
        return jacobi.times(tentative(aggregation));
    }

    /** D⁻¹ A^F. */
    private static CompressedRows scaledFiltered(CompressedRows a, double[] diagonal, boolean[] strong) {
        int n = a.rowCount;
        int[] start = new int[n + 1];
        int[] column = new int[a.entryCount()];
        double[] value = new double[a.entryCount()];
        int entries = 0;
        for (int i = 0; i < n; i++) {
            double weak = 0;
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
                weak += strong[k] || a.column[k] == i ? 0 : a.value[k];
            }
            // Dropped couplings go to the diagonal, which keeps the row's sum. Where little is left of it, the row is
            // kept whole: an unknown among much better conductors is the mean of them all.
            boolean whole = diagonal[i] + weak <= LEAST_DIAGONAL * diagonal[i];
            double pivot = whole ? diagonal[i] : diagonal[i] + weak;
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
                boolean onDiagonal = a.column[k] == i;
                if (onDiagonal || strong[k] || whole) {
                    column[entries] = a.column[k];
                    value[entries++] = onDiagonal ? 1 : a.value[k] / pivot;
                }
            }
            start[i + 1] = entries;
        }
        return new CompressedRows(n, start, column, value);
    }

    private static CompressedRows tentative(Aggregation aggregation) {
        int n = aggregation.aggregate.length;
        int[] start = new int[n + 1];
        int[] column = new int[n];
        double[] value = new double[n];
        for (int i = 0; i < n; i++) {
            start[i + 1] = start[i];
            if (aggregation.aggregate[i] >= 0) {
                column[start[i]] = aggregation.aggregate[i];
                value[start[i + 1]++] = 1;
            }
        }
        return new CompressedRows(aggregation.count(), start, column, value);
    }

    /** Largest eigenvalue by power iteration, from a start that is the same every time. */
    private static double spectralRadius(CompressedRows matrix) {
        int n = matrix.rowCount;
        double[] x = new double[n];
        double[] y = new double[n];
        long state = 1;
        for (int i = 0; i < n; i++) {
            state = state * 6364136223846793005L + 1442695040888963407L; // Knuth's linear congruence
            x[i] = (state >> 11) * 0x1p-52;
        }
        double radius = 1;
        for (int step = 0; step < POWER_STEPS; step++) {
            matrix.multiply(x, y);
            double xx = 0;
            double yy = 0;
            for (int i = 0; i < n; i++) {
                xx += x[i] * x[i];
                yy += y[i] * y[i];
            }
            radius = Math.sqrt(yy / xx);
            double scale = 1 / Math.sqrt(yy);
            for (int i = 0; i < n; i++) {
                x[i] = y[i] * scale;
            }
        }
        return radius;
    }
}
