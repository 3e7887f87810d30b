package tepor.solver.linear;

import java.util.Arrays;

/**
 * Groups the unknowns of a symmetric matrix into aggregates of strongly coupled neighbours (Vaněk, Mandel & Brezina 1996,
 * "Algebraic multigrid by smoothed aggregation for second and fourth order elliptic problems", Computing 56:179–196,
 * section 5.1).
 */
final class Aggregation {
    /** Per slot of the matrix: whether it is an off-diagonal entry with |a_ij| ≥ θ √(a_ii a_jj). */
    final boolean[] strong;
    /** Per unknown: its aggregate, or −1 where it is coupled with nothing. */
    final int[] aggregate;

    private final CompressedRows a;
    private final double[] diagonal;
    private int count;

    /**
     * @param a sorted, symmetric
     * @param diagonal of a, positive
     * @param threshold θ
     */
    Aggregation(CompressedRows a, double[] diagonal, double threshold) {
        this.a = a;
        this.diagonal = diagonal;
        strong = new boolean[a.entryCount()];
        aggregate = new int[a.rowCount];
        Arrays.fill(aggregate, -1);
        markStrong(threshold);
        groupUntouchedNeighbourhoods();
        joinNeighbours();
        groupTheRest();
        placeIsolated();
    }

    /** Number of aggregates. */
    int count() {
        return count;
    }

    private void markStrong(double threshold) {
        for (int i = 0; i < a.rowCount; i++) {
            for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
                int j = a.column[k];
                strong[k] =
                        j != i && Math.abs(a.value[k]) >= threshold * (Math.sqrt(diagonal[i]) * Math.sqrt(diagonal[j]));
            }
        }
    }

    private void groupUntouchedNeighbourhoods() {
        for (int i = 0; i < a.rowCount; i++) {
            boolean free = aggregate[i] < 0;
            boolean alone = true;
            for (int k = a.rowStart[i]; free && k < a.rowStart[i + 1]; k++) {
                if (strong[k]) {
                    alone = false;
                    free = aggregate[a.column[k]] < 0;
                }
            }
            if (free && !alone) {
                group(i);
            }
        }
    }

    private void group(int i) {
        aggregate[i] = count;
        for (int k = a.rowStart[i]; k < a.rowStart[i + 1]; k++) {
            if (strong[k] && aggregate[a.column[k]] < 0) {
                aggregate[a.column[k]] = count;
            }
        }
        count++;
    }

    private void joinNeighbours() {
        int[] before = aggregate.clone(); // joining through one who has only just joined would make chains
        for (int i = 0; i < a.rowCount; i++) {
            double strongest = 0;
            for (int k = a.rowStart[i]; before[i] < 0 && k < a.rowStart[i + 1]; k++) {
                int j = a.column[k];
                double strength = strong[k] && before[j] >= 0 ? Math.abs(a.value[k]) / Math.sqrt(diagonal[j]) : 0;
                if (strength > strongest) {
                    strongest = strength;
                    aggregate[i] = before[j];
                }
            }
        }
    }

    private void groupTheRest() {
        for (int i = 0; i < a.rowCount; i++) {
            for (int k = a.rowStart[i]; aggregate[i] < 0 && k < a.rowStart[i + 1]; k++) {
                if (strong[k]) {
                    group(i);
                }
            }
        }
    }

    /**
     * An unknown whose neighbours all have much larger diagonals follows the one that it couples with most: left out, it
     * would hold its aggregates to zero like a film.
     */
    private void placeIsolated() {
        int[] before = aggregate.clone();
        for (int i = 0; i < a.rowCount; i++) {
            double largest = 0;
            for (int k = a.rowStart[i]; before[i] < 0 && k < a.rowStart[i + 1]; k++) {
                int j = a.column[k];
                if (j != i && before[j] >= 0 && Math.abs(a.value[k]) > largest) {
                    largest = Math.abs(a.value[k]);
                    aggregate[i] = before[j];
                }
            }
        }
    }
}
