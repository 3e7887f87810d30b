package tepor.solver.field;

/**
 * A highest or lowest temperature and its place.
 *
 * @param kelvin K
 * @param x metres
 * @param y metres
 */
public record Extreme(double kelvin, double x, double y) {}
