package tepor.solver.element;

/** Chooses shape functions. */
public final class TriangleShapes {
    private TriangleShapes() {}

    /** The shape for a number of nodes, 3 or 6. */
    public static TriangleShape of(int nodesPerTriangle) {
        return nodesPerTriangle == 3 ? LinearTriangle.SHAPE : QuadraticTriangle.SHAPE;
    }
}
