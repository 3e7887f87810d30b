package tepor.solver.assembly;

/** Takes the derivatives of element residuals by nodal temperatures, W/(m·K). */
public interface TangentSink {
    /**
     * Adds the matrix of a triangle.
     *
     * @param triangle its number
     * @param entries n·n, row by row, n the nodes per triangle, in the triangle's node order
     */
    void addTriangle(int triangle, double[] entries);

    /**
     * Adds the matrix of a boundary facet.
     *
     * @param facet its number
     * @param entries m·m, row by row, m the nodes per facet (2 or 3), in the facet's node order
     */
    void addFacet(int facet, double[] entries);
}
