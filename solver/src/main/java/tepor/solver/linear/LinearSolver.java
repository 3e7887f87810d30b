package tepor.solver.linear;

import java.util.Arrays;
import java.util.function.BooleanSupplier;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.sparse.CG;
import no.uib.cipr.matrix.sparse.IterativeSolverNotConvergedException;

/**
 * Solves A x = b by conjugate gradients (MTJ's) with a {@link MultilevelPreconditioner}, which is built once and serves
 * every right-hand side. All its decisions are relative: scaling A or b changes nothing but the scale of x.
 *
 * <p>Not for use by several threads at once: the workspace is its own.
 */
public final class LinearSolver {
    /** |b − Ax| / |b| to reach where the caller states none. */
    public static final double TOLERANCE = 1e-12;

    private static final int ITERATION_LIMIT = 1000;
    private static final int RESTARTS = 2;
    /** Up to so many times the estimated rounding of b − Ax, a residual is called rounding. */
    private static final double ROUNDING_MARGIN = 8;
    /** A relative residual above this is no solution, even where rounding explains it: the matrix is as good as singular. */
    private static final double LARGEST_ROUNDING = 1e-3;

    private final SymmetricMatrix a;
    private final MultilevelPreconditioner preconditioner;
    private final CG conjugateGradients;
    private final double[] residual;

    /**
     * For matrices of three-node triangles, or any other near M-matrix.
     *
     * @throws IllegalArgumentException where a diagonal entry is not positive
     */
    public LinearSolver(SymmetricMatrix a) {
        this(a, new MultilevelPreconditioner(a));
    }

    /**
     * For matrices of six-node triangles.
     *
     * @param corners as in {@link MultilevelPreconditioner#quadratic}
     * @throws IllegalArgumentException for the reasons told there
     */
    public static LinearSolver quadratic(SymmetricMatrix a, int[] corners) {
        return new LinearSolver(a, MultilevelPreconditioner.quadratic(a, corners));
    }

    private LinearSolver(SymmetricMatrix a, MultilevelPreconditioner preconditioner) {
        this.a = a;
        this.preconditioner = preconditioner;
        residual = new double[a.numRows()];
        conjugateGradients = new CG(new DenseVector(residual, false));
        conjugateGradients.setPreconditioner(preconditioner);
    }

    /** Solves to {@link #TOLERANCE}, without a way to stop it. */
    public SolveReport solve(double[] b, double[] x) {
        return solve(b, x, TOLERANCE, () -> false);
    }

    /**
     * @param b right-hand side, one entry per row; not changed
     * @param x in: where to start, all 0 where nothing better is known; out: the solution
     * @param tolerance |b − Ax| / |b| to reach
     * @param stop asked before each iteration
     * @throws IllegalArgumentException where a length is wrong, or b or x is not finite
     * @throws java.util.concurrent.CancellationException where stop says so; x then holds an unfinished solution
     */
    public SolveReport solve(double[] b, double[] x, double tolerance, BooleanSupplier stop) {
        check(b, "right-hand side");
        check(x, "start");
        double bNorm = norm(b);
        if (bNorm == 0) {
            Arrays.fill(x, 0);
            return new SolveReport(0, 0, SolveReport.Reason.CONVERGED);
        }
        double target = tolerance * bNorm;
        int iterations = 0;
        double before = Double.POSITIVE_INFINITY;
        for (int run = 0; ; run++) {
            SolveMonitor monitor = new SolveMonitor(target, ITERATION_LIMIT - iterations, stop);
            boolean positive = run(b, x, monitor);
            iterations += monitor.iterations();
            double now = residualNorm(b, x);
            boolean rounding = now <= Math.min(ROUNDING_MARGIN * roundingOfResidual(b, x), LARGEST_ROUNDING * bNorm);
            SolveReport.Reason reason;
            if (!positive) {
                reason = SolveReport.Reason.NOT_POSITIVE_DEFINITE;
            } else if (now <= target) {
                reason = SolveReport.Reason.CONVERGED;
            } else if (rounding) {
                reason = SolveReport.Reason.ROUND_OFF;
            } else if (iterations >= ITERATION_LIMIT) {
                reason = SolveReport.Reason.ITERATION_LIMIT;
            } else if (monitor.stagnated() || run == RESTARTS || now > before / 2) {
                reason = SolveReport.Reason.STAGNATED;
            } else {
                before = now; // the residual that the recurrence carries has drifted from the true one: start over from
                // it
                continue;
            }
            return new SolveReport(iterations, now / bNorm, reason);
        }
    }

    /** @return whether every direction met had pᵀAp > 0 */
    private boolean run(double[] b, double[] x, SolveMonitor monitor) {
        conjugateGradients.setIterationMonitor(monitor);
        try {
            conjugateGradients.solve(new CurvatureProbe(a), new DenseVector(b, false), new DenseVector(x, false));
            return true;
        } catch (CurvatureProbe.NotPositiveException e) {
            return false;
        } catch (IterativeSolverNotConvergedException e) {
            throw new IllegalStateException("SolveMonitor reports by its state, never by this", e);
        }
    }

    private void check(double[] vector, String what) {
        if (vector.length != a.numRows()) {
            throw new IllegalArgumentException(
                    "the " + what + " has " + vector.length + " entries, the matrix " + a.numRows() + " rows");
        }
        for (int i = 0; i < vector.length; i++) {
            if (!Double.isFinite(vector[i])) {
                throw new IllegalArgumentException("entry " + i + " of the " + what + " is " + vector[i]);
            }
        }
    }

    private double residualNorm(double[] b, double[] x) {
        System.arraycopy(b, 0, residual, 0, b.length);
        a.rows().multiplyAdd(-1, x, residual);
        return norm(residual);
    }

    /** Euclidean norm of ε (|b| + |A| |x|): what storing x to double precision does to b − Ax, about. */
    private double roundingOfResidual(double[] b, double[] x) {
        CompressedRows rows = a.rows();
        double sum = 0;
        for (int i = 0; i < b.length; i++) {
            double size = Math.abs(b[i]);
            for (int k = rows.rowStart[i]; k < rows.rowStart[i + 1]; k++) {
                size += Math.abs(rows.value[k] * x[rows.column[k]]);
            }
            sum += size * size;
        }
        return 0x1p-53 * Math.sqrt(sum);
    }

    private static double norm(double[] v) {
        double sum = 0;
        for (double e : v) {
            sum += e * e;
        }
        return Math.sqrt(sum);
    }

    /** The preconditioner in use, as for figures about its levels. */
    public MultilevelPreconditioner preconditioner() {
        return preconditioner;
    }
}
