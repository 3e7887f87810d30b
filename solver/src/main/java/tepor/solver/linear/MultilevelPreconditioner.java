package tepor.solver.linear;

import java.util.ArrayList;
import java.util.List;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.Matrix;
import no.uib.cipr.matrix.Vector;
import no.uib.cipr.matrix.sparse.Preconditioner;

/**
 * Algebraic multigrid by smoothed aggregation (Vaněk, Mandel & Brezina 1996, Computing 56:179–196) as a preconditioner of
 * MTJ: one cycle from a zero guess, with one forward Gauss–Seidel sweep before and one backward sweep after each
 * coarse-level correction. For a symmetric positive definite matrix this is a fixed linear map that is symmetric positive
 * definite itself, as conjugate gradients need.
 *
 * <p>Every coarse level that is not solved directly is visited twice (a W-cycle): a single visit degrades where good
 * conductors meet in points only.
 *
 * <p>Matrices of six-node triangles are first coarsened to the linear functions on the same triangles
 * ({@link #quadratic}).
 *
 * <p>Not for use by several threads at once: the workspace is its own.
 */
public final class MultilevelPreconditioner implements Preconditioner {
    private static final int DIRECT_SIZE = 300;
    private static final double STRENGTH = 0.08; // θ of the finest aggregated level, halved at each coarser one
    private static final double STALLED = 0.9; // a coarser level of more than this share is none
    private static final int VISITS = 2;

    private final int[] corners;
    private final List<Level> levels = new ArrayList<>();
    private DenseCholesky coarsest;

    /**
     * @param a symmetric positive definite, as of three-node triangles
     * @throws IllegalArgumentException where a diagonal entry is not positive
     */
    public MultilevelPreconditioner(SymmetricMatrix a) {
        this(a, null);
    }

    private MultilevelPreconditioner(SymmetricMatrix a, int[] corners) {
        this.corners = corners;
        build(a);
    }

    /**
     * For matrices of six-node triangles.
     *
     * @param a symmetric positive definite
     * @param corners 2 · rows unknowns: for the unknown i of a corner (or of anything that belongs to no side) twice i
     *     itself; for the unknown of a side's middle node the unknowns of the two corners, −1 where a corner's value is
     *     not an unknown
     * @throws IllegalArgumentException where a diagonal entry is not positive, the length is another, or a corner named is
     *     not marked as one
     */
    public static MultilevelPreconditioner quadratic(SymmetricMatrix a, int[] corners) {
        return new MultilevelPreconditioner(a, corners.clone());
    }

    private void build(SymmetricMatrix matrix) {
        levels.clear();
        coarsest = null;
        CompressedRows a = matrix.rows();
        double threshold = STRENGTH;
        while (a != null) {
            int[] diagonalSlot = a.diagonalSlots();
            double[] diagonal = diagonal(a, diagonalSlot);
            CompressedRows prolongation = null;
            if (levels.isEmpty() && corners != null) {
                prolongation = CornerInterpolation.of(corners, a.rowCount);
            } else if (a.rowCount <= DIRECT_SIZE) {
                coarsest = new DenseCholesky(a);
            } else {
                prolongation = SmoothedProlongation.of(a, diagonal, threshold);
                threshold /= 2;
                if (prolongation.columnCount > STALLED * a.rowCount) {
                    prolongation = null;
                }
            }
            levels.add(new Level(a, diagonalSlot, prolongation));
            a = prolongation == null ? null : a.galerkin(prolongation);
        }
    }

    private static double[] diagonal(CompressedRows a, int[] diagonalSlot) {
        double[] diagonal = new double[a.rowCount];
        for (int i = 0; i < a.rowCount; i++) {
            diagonal[i] = a.value[diagonalSlot[i]];
            if (!(diagonal[i] > 0)) {
                throw new IllegalArgumentException(
                        "not positive definite: row " + i + " has the diagonal " + diagonal[i]);
            }
        }
        return diagonal;
    }

    /** Number of levels, the given matrix included. */
    public int levelCount() {
        return levels.size();
    }

    /** Unknowns of a level, 0 being the given matrix. */
    public int unknowns(int level) {
        return levels.get(level).a.rowCount;
    }

    /**
     * Builds the hierarchy for another matrix of the same size.
     *
     * @throws IllegalArgumentException where the matrix is no {@link SymmetricMatrix}, or for the constructor's reasons
     */
    @Override
    public void setMatrix(Matrix a) {
        if (!(a instanceof SymmetricMatrix symmetric)) {
            throw new IllegalArgumentException("a SymmetricMatrix is needed, not a " + a.getClass());
        }
        build(symmetric);
    }

    /**
     * x = B b. What x held before has no influence.
     *
     * @param b not changed
     * @param x another vector than b
     * @return x
     */
    @Override
    public Vector apply(Vector b, Vector x) {
        DenseVector rhs = b instanceof DenseVector dense ? dense : new DenseVector(b);
        DenseVector sol = x instanceof DenseVector dense ? dense : new DenseVector(x.size());
        if (b == x || b.size() != unknowns(0) || x.size() != unknowns(0)) {
            throw new IllegalArgumentException("two vectors of " + unknowns(0) + " entries are needed");
        }
        cycle(0, rhs.getData(), sol.getData());
        return sol == x ? x : x.set(sol);
    }

    /** The map is symmetric: {@link #apply}. */
    @Override
    public Vector transApply(Vector b, Vector x) {
        return apply(b, x);
    }

    private void cycle(int depth, double[] b, double[] x) {
        Level level = levels.get(depth);
        if (level.prolongation == null && coarsest != null) {
            coarsest.solve(b, x);
            return;
        }
        level.sweepForwardFromZero(b, x);
        if (level.prolongation != null) {
            level.residualAfterForwardSweep(x, level.r);
            Level coarse = levels.get(depth + 1);
            level.prolongation.multiplyTransposed(level.r, coarse.b);
            cycle(depth + 1, coarse.b, coarse.x);
            for (int v = 1; v < VISITS && depth + 2 < levels.size(); v++) {
                coarse.a.multiplyAdd(-1, coarse.x, coarse.b); // coarse.b is the residual now
                cycle(depth + 1, coarse.b, coarse.correction);
                for (int i = 0; i < coarse.x.length; i++) {
                    coarse.x[i] += coarse.correction[i];
                }
            }
            level.prolongation.multiplyAdd(1, coarse.x, x);
        }
        level.sweepBackward(b, x);
    }
}
