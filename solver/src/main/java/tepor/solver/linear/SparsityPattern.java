package tepor.solver.linear;

import java.util.Arrays;

/**
 * Where a symmetric sparse matrix has entries: made once from the elements that couple the unknowns, then used for many
 * sets of values. Both triangles are there, and every diagonal. Immutable.
 *
 * <p>An entry is addressed by its slot, from 0, in an array of {@link #slotCount()} values, in which rows follow each
 * other and columns ascend within a row.
 */
public final class SparsityPattern {
    private final int unknowns;
    private final int nodesPerElement;
    private final int[] rowStart;
    private final int[] column;
    private final int[] elementSlot;

    /**
     * Time and memory are linear in elements · nodesPerElement².
     *
     * @param unknowns number of rows
     * @param nodesPerElement nodes of each element, at least 1
     * @param elementUnknowns nodesPerElement · elementCount unknowns, element by element; −1 where the node's value is
     *     not an unknown
     * @throws IllegalArgumentException where the length is no multiple, or an unknown is out of range
     */
    public SparsityPattern(int unknowns, int nodesPerElement, int[] elementUnknowns) {
        if (unknowns < 0 || nodesPerElement < 1 || elementUnknowns.length % nodesPerElement != 0) {
            throw new IllegalArgumentException(elementUnknowns.length + " entries do not make whole elements of "
                    + nodesPerElement + " nodes over " + unknowns + " unknowns");
        }
        for (int k = 0; k < elementUnknowns.length; k++) {
            if (elementUnknowns[k] < -1 || elementUnknowns[k] >= unknowns) {
                throw new IllegalArgumentException("element " + k / nodesPerElement + " names unknown "
                        + elementUnknowns[k] + "; there are " + unknowns + ", numbered from 0");
            }
        }
        this.unknowns = unknowns;
        this.nodesPerElement = nodesPerElement;

        int[] touchStart = new int[unknowns + 1]; // positions in elementUnknowns, sorted by unknown
        for (int u : elementUnknowns) {
            if (u >= 0) {
                touchStart[u + 1]++;
            }
        }
        for (int i = 0; i < unknowns; i++) {
            touchStart[i + 1] += touchStart[i];
        }
        int[] touch = new int[touchStart[unknowns]];
        int[] next = Arrays.copyOf(touchStart, unknowns);
        for (int k = 0; k < elementUnknowns.length; k++) {
            if (elementUnknowns[k] >= 0) {
                touch[next[elementUnknowns[k]]++] = k;
            }
        }

        rowStart = countRows(elementUnknowns, touchStart, touch);
        column = fillColumns(elementUnknowns, touchStart, touch);
        elementSlot = mapElements(elementUnknowns, touchStart, touch);
    }

    private int[] countRows(int[] elementUnknowns, int[] touchStart, int[] touch) {
        int[] start = new int[unknowns + 1];
        int[] seenBy = new int[unknowns];
        Arrays.fill(seenBy, -1);
        for (int i = 0; i < unknowns; i++) {
            seenBy[i] = i;
            int count = 1;
            for (int t = touchStart[i]; t < touchStart[i + 1]; t++) {
                int first = touch[t] - touch[t] % nodesPerElement;
                for (int k = first; k < first + nodesPerElement; k++) {
                    int j = elementUnknowns[k];
                    if (j >= 0 && seenBy[j] != i) {
                        seenBy[j] = i;
                        count++;
                    }
                }
            }
            start[i + 1] = Math.addExact(start[i], count);
        }
        return start;
    }

    private int[] fillColumns(int[] elementUnknowns, int[] touchStart, int[] touch) {
        // Rows are visited in ascending order and each writes its number into the rows it couples with: as the pattern
        // is symmetric, this gives each row its columns in ascending order without sorting.
        int[] col = new int[rowStart[unknowns]];
        int[] next = Arrays.copyOf(rowStart, unknowns);
        int[] seenBy = new int[unknowns];
        Arrays.fill(seenBy, -1);
        for (int i = 0; i < unknowns; i++) {
            seenBy[i] = i;
            col[next[i]++] = i;
            for (int t = touchStart[i]; t < touchStart[i + 1]; t++) {
                int first = touch[t] - touch[t] % nodesPerElement;
                for (int k = first; k < first + nodesPerElement; k++) {
                    int j = elementUnknowns[k];
                    if (j >= 0 && seenBy[j] != i) {
                        seenBy[j] = i;
                        col[next[j]++] = i;
                    }
                }
            }
        }
        return col;
    }

    private int[] mapElements(int[] elementUnknowns, int[] touchStart, int[] touch) {
        int[] slots = new int[Math.multiplyExact(elementUnknowns.length, nodesPerElement)];
        Arrays.fill(slots, -1);
        int[] slotInRow = new int[unknowns];
        for (int i = 0; i < unknowns; i++) {
            for (int s = rowStart[i]; s < rowStart[i + 1]; s++) {
                slotInRow[column[s]] = s;
            }
            for (int t = touchStart[i]; t < touchStart[i + 1]; t++) {
                int first = touch[t] - touch[t] % nodesPerElement;
                for (int k = 0; k < nodesPerElement; k++) {
                    int j = elementUnknowns[first + k];
                    if (j >= 0) {
                        slots[touch[t] * nodesPerElement + k] = slotInRow[j];
                    }
                }
            }
        }
        return slots;
    }

    /** Number of rows, and of columns. */
    public int unknowns() {
        return unknowns;
    }

    /** Number of entries, both triangles: the length of the array of values. */
    public int slotCount() {
        return rowStart[unknowns];
    }

    /** Nodes of each element, as given. */
    public int nodesPerElement() {
        return nodesPerElement;
    }

    /**
     * The slot of an entry, found by halving.
     *
     * @return −1 where the pattern has no such entry
     * @throws IndexOutOfBoundsException where an index is out of range
     */
    public int slot(int row, int col) {
        if (col < 0 || col >= unknowns) {
            throw new IndexOutOfBoundsException("column " + col + " of " + unknowns);
        }
        int slot = Arrays.binarySearch(column, rowStart[row], rowStart[row + 1], col);
        return slot < 0 ? -1 : slot;
    }

    /**
     * The slot where entry (i, j) of an element's matrix belongs, in constant time.
     *
     * @param element from 0, in the order given
     * @param i local row, 0 to nodesPerElement − 1
     * @param j local column
     * @return −1 where either node's value is not an unknown
     */
    public int elementSlot(int element, int i, int j) {
        return elementSlot[(element * nodesPerElement + i) * nodesPerElement + j];
    }

    /**
     * Adds one element's matrix into the values.
     *
     * @param element from 0, in the order given
     * @param elementMatrix nodesPerElement² entries, row by row; rows and columns of nodes that are no unknowns are
     *     skipped
     * @param value {@link #slotCount()} values, added to
     */
    public void add(int element, double[] elementMatrix, double[] value) {
        int size = nodesPerElement * nodesPerElement;
        int first = element * size;
        for (int k = 0; k < size; k++) {
            int slot = elementSlot[first + k];
            if (slot >= 0) {
                value[slot] += elementMatrix[k];
            }
        }
    }

    int[] rowStart() {
        return rowStart;
    }

    int[] column() {
        return column;
    }
}
