package tepor.solver.trust;

import java.util.ArrayList;
import java.util.List;

/**
 * Judges from the movement of one figure over the rounds of refinement how far off the mesh may be. An estimate, not a
 * bound.
 *
 * <p>A figure is settled once it moved by no more than a quarter of its tolerance twice running. Three times its last
 * movement is its error, or three times half the movement before where that is more: a single small movement may be chance,
 * as at corners, where the last one alone was measured to fall short.
 *
 * <p>Movements are taken as for a doubling of the triangles. With a growth g below that a figure moves little whatever its
 * error: for an error that falls as 1/N it moves by (g − 1) times what is left, so the movement is divided by g − 1.
 */
public final class Convergence {
    private static final double SETTLED = 0.25;
    private static final double SAFETY = 3;

    /** The equations are not solved more closely than this, relative to the figure. */
    private static final double ROUND_OFF = 1e-9;

    /** A growth below this says nothing any more. */
    private static final double LEAST_GROWTH = 1.05;

    private final List<Integer> triangles = new ArrayList<>();
    private final List<Double> values = new ArrayList<>();
    private double within = Double.NaN;

    /**
     * Takes the figure of a further round.
     *
     * @param value the figure
     * @param tolerance how close the mesh must bring it, in its unit
     * @param triangleCount of the round's mesh
     */
    public void add(double value, double tolerance, int triangleCount) {
        values.add(value);
        triangles.add(triangleCount);
        within = tolerance;
    }

    /** Half-width of the error interval; infinite after a single round. */
    public double error() {
        if (values.size() < 2) {
            return Double.POSITIVE_INFINITY;
        }
        double moved = values.size() < 3 ? movement(0) : Math.max(movement(0), 0.5 * movement(1));
        return Math.max(SAFETY * moved, ROUND_OFF * Math.abs(values.get(values.size() - 1)));
    }

    /** Whether the figure moved by no more than a quarter of its tolerance twice running. */
    public boolean settled() {
        return values.size() >= 3 && movement(0) <= SETTLED * within && movement(1) <= SETTLED * within;
    }

    /** Movement in the last round (back = 0) or the one before (back = 1), as for a doubling of the triangles. */
    private double movement(int back) {
        int last = values.size() - 1 - back;
        double growth = Math.max(LEAST_GROWTH, (double) triangles.get(last) / triangles.get(last - 1));
        return Math.abs(values.get(last) - values.get(last - 1)) / Math.min(1, growth - 1);
    }
}
