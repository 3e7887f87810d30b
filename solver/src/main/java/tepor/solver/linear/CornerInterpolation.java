package tepor.solver.linear;

import java.util.Arrays;

/**
 * The prolongation from linear to quadratic functions on the same triangles: a corner keeps its value, the middle node of
 * a side has the mean of the side's two corners.
 */
final class CornerInterpolation {
    private CornerInterpolation() {}

    /**
     * @param corners as in {@link MultilevelPreconditioner#quadratic}
     * @param unknowns number of quadratic unknowns
     * @return one row per unknown, one column per corner unknown, in their order
     * @throws IllegalArgumentException where the length is another, or a corner named is not marked as one
     */
    static CompressedRows of(int[] corners, int unknowns) {
        if (corners.length != 2 * unknowns) {
            throw new IllegalArgumentException(
                    corners.length + " corners named for " + unknowns + " unknowns: two each");
        }
        int[] cornerNumber = new int[unknowns];
        Arrays.fill(cornerNumber, -1);
        int cornerCount = 0;
        for (int i = 0; i < unknowns; i++) {
            if (corners[2 * i] == i && corners[2 * i + 1] == i) {
                cornerNumber[i] = cornerCount++;
            }
        }
        int[] start = new int[unknowns + 1];
        int[] column = new int[2 * unknowns];
        double[] value = new double[2 * unknowns];
        int entries = 0;
        for (int i = 0; i < unknowns; i++) {
            if (cornerNumber[i] >= 0) {
                column[entries] = cornerNumber[i];
                value[entries++] = 1;
            } else {
                for (int side = 2 * i; side < 2 * i + 2; side++) {
                    int corner = corners[side];
                    if (corner < -1 || corner >= unknowns || corner >= 0 && cornerNumber[corner] < 0) {
                        throw new IllegalArgumentException(
                                "unknown " + i + " is to lie between corners, of which " + corner + " is none");
                    }
                    if (corner >= 0) {
                        column[entries] = cornerNumber[corner];
                        value[entries++] = 0.5;
                    }
                }
            }
            start[i + 1] = entries;
        }
        return new CompressedRows(cornerCount, start, Arrays.copyOf(column, entries), Arrays.copyOf(value, entries));
    }
}
