package tepor.solver.model;

/** How a material conducts. */
public sealed interface Conductivity {
    /** The same in every direction. {@code k} in W/(m·K). */
    record Uniform(Input k) implements Conductivity {}

    /**
     * By direction.
     *
     * @param along W/(m·K), in the direction of the angle
     * @param across W/(m·K), at right angles to it
     * @param angle radians from +x, counter-clockwise
     */
    record Directional(Input along, Input across, Input angle) implements Conductivity {}
}
