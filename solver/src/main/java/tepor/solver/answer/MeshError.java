package tepor.solver.answer;

/**
 * The interval in which (true − value) lies as far as the mesh is concerned, SI (K for temperatures).
 *
 * @param low lower end; −∞ where nothing is known yet
 * @param high upper end; +∞ where nothing is known yet
 * @param kind guaranteed or not
 * @param within what was asked
 * @param reached whether the interval's half-width is within it, and the answer was seen to settle: moved by no more than a
 *     quarter of it twice running
 */
public record MeshError(double low, double high, Kind kind, double within, boolean reached) {
    /** Whether an interval is guaranteed. */
    public enum Kind {
        BOUND,
        ESTIMATE
    }
}
