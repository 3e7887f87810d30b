package tepor.solver.linear;

import java.util.Arrays;

/**
 * A sparse matrix in compressed rows; immutable by agreement (its arrays are shared, and nobody writes to them).
 *
 * <p>Row i holds the entries {@code rowStart[i]} to {@code rowStart[i + 1]}, exclusive, of {@code column} and
 * {@code value}. Columns ascend within a row where the text says "sorted", and never repeat.
 */
final class CompressedRows {
    final int rowCount;
    final int columnCount;
    final int[] rowStart;
    final int[] column;
    final double[] value;

    /**
     * @param columnCount number of columns
     * @param rowStart rowCount + 1 ascending positions, the first 0
     * @param column at least {@code rowStart[rowCount]} columns, from 0
     * @param value as many values
     */
    CompressedRows(int columnCount, int[] rowStart, int[] column, double[] value) {
        this.rowCount = rowStart.length - 1;
        this.columnCount = columnCount;
        this.rowStart = rowStart;
        this.column = column;
        this.value = value;
    }

    int entryCount() {
        return rowStart[rowCount];
    }

    /** y = A x; x has columnCount entries, y rowCount. */
    void multiply(double[] x, double[] y) {
        int[] start = rowStart;
        int[] col = column;
        double[] a = value;
        for (int i = 0; i < rowCount; i++) {
            double sum = 0;
            for (int k = start[i], end = start[i + 1]; k < end; k++) {
                sum += a[k] * x[col[k]];
            }
            y[i] = sum;
        }
    }

    /** y = y + α A x; x has columnCount entries, y rowCount. */
    void multiplyAdd(double alpha, double[] x, double[] y) {
        int[] start = rowStart;
        int[] col = column;
        double[] a = value;
        for (int i = 0; i < rowCount; i++) {
            double sum = 0;
            for (int k = start[i], end = start[i + 1]; k < end; k++) {
                sum += a[k] * x[col[k]];
            }
            y[i] += alpha * sum;
        }
    }

    /** y = Aᵀ x; x has rowCount entries, y columnCount. */
    void multiplyTransposed(double[] x, double[] y) {
        int[] start = rowStart;
        int[] col = column;
        double[] a = value;
        Arrays.fill(y, 0, columnCount, 0);
        for (int i = 0; i < rowCount; i++) {
            double xi = x[i];
            for (int k = start[i], end = start[i + 1]; k < end; k++) {
                y[col[k]] += a[k] * xi;
            }
        }
    }

    /** The transposed matrix, sorted whether or not this one is. */
    CompressedRows transposed() {
        int[] start = new int[columnCount + 1];
        int entries = entryCount();
        for (int k = 0; k < entries; k++) {
            start[column[k] + 1]++;
        }
        for (int j = 0; j < columnCount; j++) {
            start[j + 1] += start[j];
        }
        int[] next = Arrays.copyOf(start, columnCount);
        int[] col = new int[entries];
        double[] val = new double[entries];
        for (int i = 0; i < rowCount; i++) {
            for (int k = rowStart[i]; k < rowStart[i + 1]; k++) {
                int slot = next[column[k]]++;
                col[slot] = i;
                val[slot] = value[k];
            }
        }
        return new CompressedRows(rowCount, start, col, val);
    }

    /**
     * The product of this matrix and another (Gustavson 1978, "Two fast algorithms for sparse matrices", ACM TOMS 4).
     * Not sorted.
     */
    CompressedRows times(CompressedRows b) {
        int[] start = new int[rowCount + 1];
        int[] col = new int[Math.max(16, entryCount())];
        double[] val = new double[col.length];
        int[] slotOf =
                new int[b.columnCount]; // where column j stands in the row at work; below its start: not yet there
        Arrays.fill(slotOf, -1);
        int entries = 0;
        for (int i = 0; i < rowCount; i++) {
            int first = entries;
            for (int k = rowStart[i]; k < rowStart[i + 1]; k++) {
                double aik = value[k];
                int row = column[k];
                int end = b.rowStart[row + 1];
                if (entries + end - b.rowStart[row] > col.length) {
                    int length = Math.max(2 * col.length, entries + end - b.rowStart[row]);
                    col = Arrays.copyOf(col, length);
                    val = Arrays.copyOf(val, length);
                }
                for (int m = b.rowStart[row]; m < end; m++) {
                    int j = b.column[m];
                    int slot = slotOf[j];
                    if (slot < first) {
                        slotOf[j] = entries;
                        col[entries] = j;
                        val[entries++] = aik * b.value[m];
                    } else {
                        val[slot] += aik * b.value[m];
                    }
                }
            }
            start[i + 1] = entries;
        }
        return new CompressedRows(b.columnCount, start, Arrays.copyOf(col, entries), Arrays.copyOf(val, entries));
    }

    /** Pᵀ A P, sorted, where this matrix is A and symmetric. */
    CompressedRows galerkin(CompressedRows p) {
        return p.transposed().times(times(p)).transposed(); // symmetric but for rounding; transposing sorts it
    }

    /**
     * For each row of a sorted square matrix, the slot of its diagonal.
     *
     * @throws IllegalArgumentException where a row has none
     */
    int[] diagonalSlots() {
        int[] diagonal = new int[rowCount];
        for (int i = 0; i < rowCount; i++) {
            int slot = Arrays.binarySearch(column, rowStart[i], rowStart[i + 1], i);
            if (slot < 0) {
                throw new IllegalArgumentException("row " + i + " of the matrix has no diagonal entry");
            }
            diagonal[i] = slot;
        }
        return diagonal;
    }
}
