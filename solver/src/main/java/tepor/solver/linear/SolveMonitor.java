package tepor.solver.linear;

import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import no.uib.cipr.matrix.Vector;
import no.uib.cipr.matrix.sparse.AbstractIterationMonitor;

/** Ends conjugate gradients when the residual is small enough, no longer falls, or the iterations are used up. */
final class SolveMonitor extends AbstractIterationMonitor {
    /** The residual must fall by a tenth within so many iterations. */
    private static final int PATIENCE = 100;

    private static final double PROGRESS = 0.9;

    private final double target;
    private final int limit;
    private final BooleanSupplier stop;
    private double milestone = Double.POSITIVE_INFINITY;
    private int milestoneIteration;
    private boolean stagnated;

    /**
     * @param target |r| to reach
     * @param limit largest number of iterations
     * @param stop asked before each iteration
     */
    SolveMonitor(double target, int limit, BooleanSupplier stop) {
        this.target = target;
        this.limit = limit;
        this.stop = stop;
    }

    boolean stagnated() {
        return stagnated;
    }

    @Override
    protected boolean convergedI(double r, Vector x) {
        return convergedI(r);
    }

    /** @throws CancellationException where the caller wants a stop */
    @Override
    protected boolean convergedI(double r) {
        if (stop.getAsBoolean()) {
            throw new CancellationException("stopped while solving the heat balance");
        }
        if (r < PROGRESS * milestone) {
            milestone = r;
            milestoneIteration = iter;
        }
        stagnated = iter - milestoneIteration >= PATIENCE;
        return r <= target || stagnated || iter >= limit;
    }
}
