package tepor.solver.element;

/**
 * Shape functions and quadrature on a triangle side, as arrays ready for use.
 *
 * <p>Node order: start, end, middle (six-node triangles only). On straight sides three-point Gauss: exact to degree 5, which
 * covers the product of two quadratic shape functions. On curved ones the length element, a square root, comes in: there
 * four-point Gauss, exact to degree 7.
 */
public final class SideShape {
    private static final double GAUSS = Math.sqrt(0.6);

    /** Points on [0, 1] from the start. */
    private static final double[] POINT_3 = {0.5 * (1 - GAUSS), 0.5, 0.5 * (1 + GAUSS)};

    /** Weights, which sum to 1 (multiply by the length). */
    private static final double[] WEIGHT_3 = {5.0 / 18, 8.0 / 18, 5.0 / 18};

    /** Closed forms of the four-point rule: √((3 ± 2√(6/5))/7), weights (18 ∓ √30)/36. */
    private static final double OUTER = Math.sqrt((3 + 2 * Math.sqrt(1.2)) / 7);

    private static final double INNER = Math.sqrt((3 - 2 * Math.sqrt(1.2)) / 7);
    private static final double[] POINT_4 = {0.5 * (1 - OUTER), 0.5 * (1 - INNER), 0.5 * (1 + INNER), 0.5 * (1 + OUTER)
    };
    private static final double[] WEIGHT_4 = {
        (18 - Math.sqrt(30)) / 72, (18 + Math.sqrt(30)) / 72, (18 + Math.sqrt(30)) / 72, (18 - Math.sqrt(30)) / 72
    };

    private static final SideShape LINEAR = new SideShape(2, POINT_3, WEIGHT_3);
    private static final SideShape QUADRATIC = new SideShape(3, POINT_3, WEIGHT_3);

    /** The shape on curved sides. */
    static final SideShape CURVED = new SideShape(3, POINT_4, WEIGHT_4);

    private final int nodeCount;
    private final double[] point;
    private final double[] weight;
    private final double[] value;

    private SideShape(int nodeCount, double[] point, double[] weight) {
        this.nodeCount = nodeCount;
        this.point = point;
        this.weight = weight;
        value = new double[point.length * nodeCount];
        for (int p = 0; p < point.length; p++) {
            double t = point[p];
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

    /** The shape on straight sides of triangles with this number of nodes. */
    public static SideShape of(int nodesPerTriangle) {
        return nodesPerTriangle == 3 ? LINEAR : QUADRATIC;
    }

    /** 2 or 3. */
    public int nodeCount() {
        return nodeCount;
    }

    public int pointCount() {
        return point.length;
    }

    /** Where point p lies, 0 at the side's start, 1 at its end. */
    public double point(int p) {
        return point[p];
    }

    /** Weight of point p; the weights sum to 1. */
    public double weight(int p) {
        return weight[p];
    }

    /** Value of shape function i at point p. */
    public double value(int p, int i) {
        return value[nodeCount * p + i];
    }
}
