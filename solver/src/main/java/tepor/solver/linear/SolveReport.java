package tepor.solver.linear;

/**
 * How the solution of a linear system went.
 *
 * @param iterations of conjugate gradients, all restarts together
 * @param residual |b − Ax| / |b| in the Euclidean norm, computed from the solution itself; 0 where b is 0
 * @param reason why it ended
 */
public record SolveReport(int iterations, double residual, Reason reason) {
    /** Why a solution ended. */
    public enum Reason {
        /** The residual is within the tolerance. */
        CONVERGED,
        /** The residual is above the tolerance, but no larger than what rounding the solution's digits makes it. */
        ROUND_OFF,
        /** The residual stopped falling well above rounding. */
        STAGNATED,
        /** The largest number of iterations was reached. */
        ITERATION_LIMIT,
        /** A direction p with pᵀAp ≤ 0 (or no number) was met; the vector holds the last solution before it. */
        NOT_POSITIVE_DEFINITE
    }

    /** Whether the solution is as good as was asked, or as double precision allows. */
    public boolean usable() {
        return reason == Reason.CONVERGED || reason == Reason.ROUND_OFF;
    }
}
