package tepor.solver.linear;

import java.util.Arrays;
import java.util.Iterator;
import java.util.NoSuchElementException;
import no.uib.cipr.matrix.AbstractMatrix;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.Matrix;
import no.uib.cipr.matrix.MatrixEntry;
import no.uib.cipr.matrix.Vector;

/**
 * A symmetric sparse matrix with both triangles stored in compressed rows, as a matrix of MTJ. Its values do not change:
 * whatever would change an entry throws {@link UnsupportedOperationException}.
 *
 * <p>Products with {@link DenseVector}s allocate nothing. Symmetry is taken on trust: the transposed products are the
 * plain ones.
 */
public final class SymmetricMatrix extends AbstractMatrix {
    private final CompressedRows rows;

    /**
     * @param pattern where the entries are
     * @param value {@link SparsityPattern#slotCount()} values by slot, symmetric; kept, not copied: do not write to it
     *     afterwards
     * @throws IllegalArgumentException where the number of values is another
     */
    public SymmetricMatrix(SparsityPattern pattern, double[] value) {
        this(new CompressedRows(pattern.unknowns(), pattern.rowStart(), pattern.column(), value));
        if (value.length != pattern.slotCount()) {
            throw new IllegalArgumentException(
                    value.length + " values for a pattern of " + pattern.slotCount() + " entries");
        }
    }

    /** @param rows square, sorted and symmetric */
    SymmetricMatrix(CompressedRows rows) {
        super(rows.rowCount, rows.columnCount);
        this.rows = rows;
    }

    CompressedRows rows() {
        return rows;
    }

    /** Number of stored entries, both triangles. */
    public int entryCount() {
        return rows.entryCount();
    }

    @Override
    public double get(int row, int column) {
        check(row, column);
        int slot = Arrays.binarySearch(rows.column, rows.rowStart[row], rows.rowStart[row + 1], column);
        return slot < 0 ? 0 : rows.value[slot];
    }

    /** y = A x. */
    @Override
    public Vector mult(Vector x, Vector y) {
        if (x instanceof DenseVector dx && y instanceof DenseVector dy) {
            checkMultAdd(x, y);
            rows.multiply(dx.getData(), dy.getData());
            return y;
        }
        return super.mult(x, y);
    }

    /** y = y + α A x. */
    @Override
    public Vector multAdd(double alpha, Vector x, Vector y) {
        if (x instanceof DenseVector dx && y instanceof DenseVector dy) {
            checkMultAdd(x, y);
            rows.multiplyAdd(alpha, dx.getData(), dy.getData());
            return y;
        }
        return super.multAdd(alpha, x, y);
    }

    @Override
    public Vector transMult(Vector x, Vector y) {
        return mult(x, y);
    }

    @Override
    public Vector transMultAdd(double alpha, Vector x, Vector y) {
        return multAdd(alpha, x, y);
    }

    /** This matrix itself: it does not change. */
    @Override
    public Matrix copy() {
        return this;
    }

    @Override
    public Matrix transpose() {
        return this;
    }

    /** The stored entries, row by row; the entry handed out is one object that moves on. */
    @Override
    public Iterator<MatrixEntry> iterator() {
        return new EntryIterator();
    }

    private final class EntryIterator implements Iterator<MatrixEntry>, MatrixEntry {
        private int row;
        private int slot = -1;

        @Override
        public boolean hasNext() {
            return slot + 1 < rows.entryCount();
        }

        @Override
        public MatrixEntry next() {
            if (!hasNext()) {
                throw new NoSuchElementException();
            }
            slot++;
            while (slot >= rows.rowStart[row + 1]) {
                row++;
            }
            return this;
        }

        @Override
        public int row() {
            return row;
        }

        @Override
        public int column() {
            return rows.column[slot];
        }

        @Override
        public double get() {
            return rows.value[slot];
        }

        @Override
        public void set(double value) {
            throw new IllegalStateException("the values of a SymmetricMatrix do not change");
        }
    }
}
