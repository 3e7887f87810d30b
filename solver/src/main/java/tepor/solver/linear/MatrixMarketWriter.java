package tepor.solver.linear;

import java.io.IOException;
import java.io.Writer;

/**
 * Writes a linear system in the Matrix Market exchange format (Boisvert, Pozo & Remington 1996, "The Matrix Market exchange
 * formats: initial design", NISTIR 5935), every number with all its digits.
 */
public final class MatrixMarketWriter {
    private MatrixMarketWriter() {}

    /**
     * Writes the lower triangle as {@code coordinate real symmetric}, rows and columns from 1.
     *
     * @param out not closed
     * @throws IOException from the writer
     */
    public static void writeMatrix(SymmetricMatrix matrix, Writer out) throws IOException {
        CompressedRows rows = matrix.rows();
        int entries = 0;
        for (int i = 0; i < rows.rowCount; i++) {
            for (int k = rows.rowStart[i]; k < rows.rowStart[i + 1] && rows.column[k] <= i; k++) {
                entries++;
            }
        }
        out.write("%%MatrixMarket matrix coordinate real symmetric\n");
        out.write(rows.rowCount + " " + rows.columnCount + " " + entries + "\n");
        for (int i = 0; i < rows.rowCount; i++) {
            for (int k = rows.rowStart[i]; k < rows.rowStart[i + 1] && rows.column[k] <= i; k++) {
                out.write((i + 1) + " " + (rows.column[k] + 1) + " " + rows.value[k] + "\n");
            }
        }
    }

    /**
     * Writes a vector as a matrix of one column, {@code array real general}.
     *
     * @param out not closed
     * @throws IOException from the writer
     */
    public static void writeVector(double[] vector, Writer out) throws IOException {
        out.write("%%MatrixMarket matrix array real general\n");
        out.write(vector.length + " 1\n");
        for (double entry : vector) {
            out.write(entry + "\n");
        }
    }
}
