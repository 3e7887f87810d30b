package tepor.solver.model;

/** How close the mesh must bring an answer. */
public sealed interface Within {
    /** An absolute tolerance in the SI unit of the answer (kelvin for temperatures). */
    record Absolute(double value) implements Within {}

    /**
     * A fraction of what {@code case-file} reference defines for the kind of ask: for temperatures the spread between the
     * section's highest and lowest, for flows the larger of |value| and 0.1 % of the heat passing through, for a
     * transmittance its coupling, for a factor 1. The default is 0.01.
     */
    record Fraction(double value) implements Within {}
}
