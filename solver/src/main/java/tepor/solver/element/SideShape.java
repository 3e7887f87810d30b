package tepor.solver.element;

/**
 * Shape functions and quadrature on a straight triangle side, as arrays ready for use.
 *
 * <p>Node order: start, end, middle (six-node triangles only). Three-point Gauss: exact to degree 5, which covers the
 * product of two quadratic shape functions.
 */
public final class SideShape {
    private static final double GAUSS = Math.sqrt(0.6);

    /** Points on [0, 1] from the start. */
    private static final double[] POINT = {0.5 * (1 - GAUSS), 0.5, 0.5 * (1 + GAUSS)};

    /** Weights, which sum to 1 (multiply by the length). */
    private static final double[] WEIGHT = {5.0 / 18, 8.0 / 18, 5.0 / 18};

    private static final SideShape LINEAR = new SideShape(2);
    private static final SideShape QUADRATIC = new SideShape(3);

    private final int nodeCount;
    private final double[] value;

    private SideShape(int nodeCount) {
        this.nodeCount = nodeCount;
        value = new double[POINT.length * nodeCount];
        for (int p = 0; p < POINT.length; p++) {
            double t = POINT[p];
            if (nodeCount == 2) {
                value[2 * p] = 1 - t;
                value[2 * p + 1] = t;
            } else {
                value[3 * p] = (1 - t) * (1 - 2 * t);
                value[3 * p + 1] = t * (2 * t - 1);
                value[3 * p + 2] = 4 * t * (1 - t);
            }
        }
    }

    /** The shape on the sides of triangles with this number of nodes. */
    public static SideShape of(int nodesPerTriangle) {
        return nodesPerTriangle == 3 ? LINEAR : QUADRATIC;
    }

    /** 2 or 3. */
    public int nodeCount() {
        return nodeCount;
    }

    public int pointCount() {
        return POINT.length;
    }

    /** Where point p lies, 0 at the side's start, 1 at its end. */
    public double point(int p) {
        return POINT[p];
    }

    /** Weight of point p; the weights sum to 1. */
    public double weight(int p) {
        return WEIGHT[p];
    }

    /** Value of shape function i at point p. */
    public double value(int p, int i) {
        return value[nodeCount * p + i];
    }
}
