package tepor.solver.linear;

import java.util.Arrays;
import java.util.function.BooleanSupplier;
import no.uib.cipr.matrix.DenseVector;
import no.uib.cipr.matrix.sparse.CG;
import no.uib.cipr.matrix.sparse.IterativeSolverNotConvergedException;
import tepor.solver.linear.SolveReport.Reason;

/**
 * Solves A x = b by conjugate gradients (MTJ's) with a {@link MultilevelPreconditioner}, which is built once and serves
 * every right-hand side. All its decisions are relative: scaling A or b changes nothing but the scale of x.
 *
 * <p>The solution is refined in steps, each of which solves for the correction that the residual asks for, the residual
 * being computed in doubled precision (Wilkinson 1963, "Rounding Errors in Algebraic Processes", ch. 3). So the digits of x
 * do not suffer where conductivities differ by orders of magnitude, and the residual reported is the true one.
 *
 * <p>Not for use by several threads at once: the workspace is its own.
 */
public final class LinearSolver {
    /** |b − Ax| / |b| to reach where the caller states none. */
    public static final double TOLERANCE = 1e-12;

    private static final int ITERATION_LIMIT = 1000;
    /** The first solution and at most two corrections. */
    private static final int RUNS = 3;
    /** Each run reduces the residual to this share of itself: what one run can do for certain in double precision. */
    private static final double RUN_REDUCTION = 1e-7;
    /** Up to so many times the estimated rounding of b − Ax, a residual is called rounding. */
    private static final double ROUNDING_MARGIN = 8;
    /**
     * A residual is no rounding where so much of the right-hand side's sum stays unbalanced: heat put into a part that
     * nothing ties to a temperature drives the solution up until rounding hides it.
     */
    private static final double UNBALANCED = 1e-3;

    private final SymmetricMatrix a;
    private final MultilevelPreconditioner preconditioner;
    private final CG conjugateGradients;
    private final double[] residual;
    private final double[] correction;

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
        correction = new double[a.numRows()];
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
            return new SolveReport(0, 0, Reason.CONVERGED);
        }
        double target = tolerance * bNorm;
        Residual.compute(a.rows(), b, x, residual);
        double now = norm(residual);
        int iterations = 0;
        Reason reason = now <= target ? Reason.CONVERGED : null;
        for (int run = 1; reason == null; run++) {
            // Half the target, for the recurrence's residual and the true one part a little.
            double runTarget = Math.max(0.5 * target, RUN_REDUCTION * now);
            SolveMonitor monitor = new SolveMonitor(runTarget, ITERATION_LIMIT - iterations, stop);
            boolean positive = correct(x, monitor);
            iterations += monitor.iterations();
            double before = now;
            Residual.compute(a.rows(), b, x, residual);
            now = norm(residual);
            if (!positive) {
                reason = Reason.NOT_POSITIVE_DEFINITE;
            } else if (now <= target) {
                reason = Reason.CONVERGED;
            } else if (iterations >= ITERATION_LIMIT) {
                reason = Reason.ITERATION_LIMIT;
            } else if (run == RUNS || run > 1 && (isRounding(b, x, now) || now > before / 2)) {
                // The second run is made even where the residual is rounding already: it sets the digits of x right.
                reason = isRounding(b, x, now) ? Reason.ROUND_OFF : Reason.STAGNATED;
            } else if (monitor.stagnated()) {
                reason = Reason.STAGNATED;
            }
        }
        return new SolveReport(iterations, now / bNorm, reason);
    }

    /**
     * Adds to x the solution of A e = residual.
     *
     * @return whether every direction met had pᵀAp > 0
     */
    private boolean correct(double[] x, SolveMonitor monitor) {
        Arrays.fill(correction, 0);
        conjugateGradients.setIterationMonitor(monitor);
        boolean positive = true;
        try {
            conjugateGradients.solve(
                    new CurvatureProbe(a), new DenseVector(residual, false), new DenseVector(correction, false));
        } catch (CurvatureProbe.NotPositiveException e) {
            positive = false;
        } catch (IterativeSolverNotConvergedException e) {
            throw new IllegalStateException("SolveMonitor reports by its state, never by this", e);
        }
        for (int i = 0; i < x.length; i++) {
            x[i] += correction[i];
        }
        return positive;
    }

    private boolean isRounding(double[] b, double[] x, double residualNorm) {
        double unbalanced = 0;
        double all = 0;
        for (int i = 0; i < b.length; i++) {
            unbalanced += residual[i];
            all += Math.abs(b[i]);
        }
        return residualNorm <= ROUNDING_MARGIN * Residual.rounding(a.rows(), b, x)
                && Math.abs(unbalanced) <= UNBALANCED * all;
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
