package tepor.solver.field;

import java.util.Arrays;
import java.util.function.IntToDoubleFunction;

/**
 * Makes the flows through the facets that meet in one node balance: each region around the node takes up exactly its
 * reaction, what leaves one region enters the other, and the flows change as little as they may (least squares).
 *
 * <p>With one flow c for each facet from its left to its right, and B the incidence of facets and regions, B c = r has the
 * solution of least norm c = Bᵀ(B Bᵀ)⁻¹ r. The matrix B Bᵀ is the Laplacian of the graph that has the regions for vertices
 * and the facets for edges, those to the outside leading to ground. Without any of these it is singular, and the reactions
 * then add up to nothing: one region's equation follows from the others'.
 */
final class NodeShares {
    /** What lies beyond the boundary. */
    static final int OUTSIDE = -1;

    /** The entries of the Laplacian are whole numbers, so that a pivot that should vanish is nothing but rounding. */
    private static final double VANISHING = 1e-9;

    private int facetCount;
    private int[] left = new int[8];
    private int[] right = new int[8];
    private double[] flow = new double[8];
    private int regionCount;
    private int[] region = new int[8];
    private double[] matrix = new double[64];
    private double[] potential = new double[8];

    /** Forgets all facets. */
    void clear() {
        facetCount = 0;
        regionCount = 0;
    }

    /**
     * Adds a facet.
     *
     * @param regionLeft region on its left, or {@link #OUTSIDE}
     * @param regionRight region on its right, or {@link #OUTSIDE}
     * @param predicted flow from left to right, W/m
     */
    void add(int regionLeft, int regionRight, double predicted) {
        if (facetCount == flow.length) {
            left = Arrays.copyOf(left, 2 * facetCount);
            right = Arrays.copyOf(right, 2 * facetCount);
            flow = Arrays.copyOf(flow, 2 * facetCount);
        }
        left[facetCount] = place(regionLeft);
        right[facetCount] = place(regionRight);
        flow[facetCount++] = predicted;
    }

    private int place(int number) {
        if (number == OUTSIDE) {
            return OUTSIDE;
        }
        for (int k = 0; k < regionCount; k++) {
            if (region[k] == number) {
                return k;
            }
        }
        if (regionCount == region.length) {
            region = Arrays.copyOf(region, 2 * regionCount);
            potential = new double[2 * regionCount];
            matrix = new double[4 * regionCount * regionCount];
        }
        region[regionCount] = number;
        return regionCount++;
    }

    /** @param reaction heat that a region takes up at the node through the facets, W/m, by its number */
    void balance(IntToDoubleFunction reaction) {
        int n = regionCount;
        Arrays.fill(matrix, 0, n * n, 0);
        for (int k = 0; k < n; k++) {
            potential[k] = reaction.applyAsDouble(region[k]);
        }
        for (int f = 0; f < facetCount; f++) {
            int a = left[f];
            int b = right[f];
            if (a >= 0) {
                matrix[n * a + a]++;
                potential[a] += flow[f];
            }
            if (b >= 0) {
                matrix[n * b + b]++;
                potential[b] -= flow[f];
            }
            if (a >= 0 && b >= 0) {
                matrix[n * a + b]--;
                matrix[n * b + a]--;
            }
        }
        solve(n);
        for (int f = 0; f < facetCount; f++) {
            flow[f] += (right[f] >= 0 ? potential[right[f]] : 0) - (left[f] >= 0 ? potential[left[f]] : 0);
        }
    }

    /** Flow through the facet added as number i, from left to right, W/m. */
    double flow(int i) {
        return flow[i];
    }

    /** Gauss's elimination; the matrix is positive semidefinite, so that no pivot is sought. */
    private void solve(int n) {
        for (int k = 0; k < n; k++) {
            for (int i = k + 1; i < n && matrix[n * k + k] > VANISHING; i++) {
                double factor = matrix[n * i + k] / matrix[n * k + k];
                for (int j = k; j < n; j++) {
                    matrix[n * i + j] -= factor * matrix[n * k + j];
                }
                potential[i] -= factor * potential[k];
            }
        }
        for (int k = n - 1; k >= 0; k--) {
            double sum = potential[k];
            for (int j = k + 1; j < n; j++) {
                sum -= matrix[n * k + j] * potential[j];
            }
            potential[k] = matrix[n * k + k] > VANISHING ? sum / matrix[n * k + k] : 0;
        }
    }
}
