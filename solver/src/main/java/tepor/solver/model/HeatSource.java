package tepor.solver.model;

/**
 * Heat produced in a region, spread evenly over it.
 *
 * @param amount in the unit of the basis, positive when heat is produced
 * @param basis to what the amount refers
 */
public record HeatSource(Input amount, Basis basis) {
    /** To what an amount of heat refers. */
    public enum Basis {
        /** W/m: the whole region, per metre of depth. */
        PER_LENGTH,
        /** W/m³. */
        PER_VOLUME,
        /** W: the whole region over the whole depth of the case. */
        TOTAL
    }
}
