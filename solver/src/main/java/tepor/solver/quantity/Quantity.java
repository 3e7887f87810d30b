package tepor.solver.quantity;

/**
 * A value with its dimension, the unit in which the user gave it, and its spread.
 *
 * @param value SI (kelvin for temperatures, radians for angles)
 * @param dimension what it measures
 * @param unit the unit as the user wrote it, in one spelling: {@code W/(m2.K)}; empty for pure numbers
 * @param spread how far off it may be; null where none was stated
 * @param text what the user wrote, for messages and reports
 */
public record Quantity(double value, Dimension dimension, String unit, Spread spread, String text) {
    public boolean hasSpread() {
        return spread != null;
    }
}
