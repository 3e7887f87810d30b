package tepor.solver.trust;

import java.util.ArrayList;
import java.util.List;

/**
 * Judges from the movement of one figure over the rounds of refinement how far off the mesh may be. An estimate, not a
 * bound.
 *
 * <p>A figure is settled once it moved by no more than a quarter of its tolerance twice running; three times its last movement
 * is its error.
 */
public final class Convergence {
    private static final double SETTLED = 0.25;
    private static final double SAFETY = 3;

    private final List<Double> values = new ArrayList<>();
    private double within = Double.NaN;

    /**
     * Takes the figure of a further round.
     *
     * @param value the figure
     * @param tolerance how close the mesh must bring it, in its unit
     */
    public void add(double value, double tolerance) {
        values.add(value);
        within = tolerance;
    }

    /** Half-width of the error interval; infinite after a single round. */
    public double error() {
        return values.size() < 2 ? Double.POSITIVE_INFINITY : SAFETY * movement(0);
    }

    /** Whether the figure moved by no more than a quarter of its tolerance twice running. */
    public boolean settled() {
        return values.size() >= 3 && movement(0) <= SETTLED * within && movement(1) <= SETTLED * within;
    }

    /** Movement in the last round (back = 0) or the one before (back = 1). */
    private double movement(int back) {
        int last = values.size() - 1 - back;
        return Math.abs(values.get(last) - values.get(last - 1));
    }
}
