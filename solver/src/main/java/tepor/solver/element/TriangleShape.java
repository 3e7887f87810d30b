package tepor.solver.element;

/**
 * The shape functions of a triangle on its barycentric coordinates λ₀, λ₁, λ₂.
 *
 * <p>Node order as in {@link tepor.mesher.mesh.Mesh}: three corners, then the middle of the side opposite each corner.
 */
public interface TriangleShape {
    /** 3 or 6. */
    int nodeCount();

    /** Values of all shape functions at a point. {@code out} has nodeCount entries. */
    void values(double l0, double l1, double l2, double[] out);

    /**
     * Derivatives of all shape functions by λ₀, λ₁, λ₂, as if these were independent.
     *
     * @param out 3·nodeCount entries, three for each node
     */
    void slopes(double l0, double l1, double l2, double[] out);

    /** Lowest quadrature degree that integrates the stiffness of a straight triangle of constant conductivity exactly. */
    int stiffnessDegree();
}
