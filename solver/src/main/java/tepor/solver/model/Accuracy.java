package tepor.solver.model;

/**
 * How accuracy is sought.
 *
 * @param adapt whether the mesh is refined until each ask is within its tolerance
 * @param confidence of the stated interval, 0 to 1
 */
public record Accuracy(boolean adapt, double confidence) {}
