package tepor.solver.quantity;

/** Converts between SI and the units people read. */
public final class Units {
    private Units() {}

    /**
     * A value in a unit.
     *
     * @param si SI value
     * @param unit as in {@link Quantity#unit()}
     * @param dimension what it measures; decides whether a temperature is one on a scale or a difference
     */
    public static double fromSi(double si, String unit, Dimension dimension) {
        throw new IllegalStateException("not joined yet");
    }
}
