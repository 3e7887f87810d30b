package tepor.mesher.refinement;

/**
 * Validity of six-node triangles with curved sides.
 *
 * <p>The Jacobian of the map from the reference triangle is a quadratic; its six Bézier coefficients bound it from below.
 * Source: Johnen, Remacle & Geuzaine 2013, <em>Geometrical validity of curvilinear finite elements</em>, J. Comput. Phys.
 * 233:359–376.
 */
public final class CurvedTriangle {
    /** A least coefficient above this is positive whatever was rounded. */
    public static final double ROUND_OFF = 1e-9;

    private CurvedTriangle() {}

    /**
     * The least Bézier coefficient of the Jacobian, relative to the Jacobian of the straight triangle with the same corners.
     * Where it is positive the map is valid everywhere; 1 for a straight triangle.
     *
     * @param node 12 coordinates: x and y of three corners, counter-clockwise, then of the nodes in the middle of the sides
     *     opposite corner 0, 1 and 2
     */
    public static double leastJacobian(double[] node) {
        double straight = cross(node[0], node[1], node[2], node[3], node[0], node[1], node[4], node[5]);
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            double px = node[2 * i];
            double py = node[2 * i + 1];
            double qx = node[2 * j];
            double qy = node[2 * j + 1];
            double ijx = control(node, k, i, j, 0);
            double ijy = control(node, k, i, j, 1);
            double jkx = control(node, i, j, k, 0);
            double jky = control(node, i, j, k, 1);
            double kix = control(node, j, k, i, 0);
            double kiy = control(node, j, k, i, 1);
            double corner = 4 * cross(px, py, ijx, ijy, px, py, kix, kiy);
            double side = 2 * (cross(px, py, ijx, ijy, ijx, ijy, jkx, jky) + cross(ijx, ijy, qx, qy, px, py, kix, kiy));
            least = Math.min(least, Math.min(corner, side));
        }
        return straight > 0 ? least / straight : Double.NEGATIVE_INFINITY;
    }

    /** Bézier control point of the side opposite a corner, between two others: twice its node less half of both ends. */
    private static double control(double[] node, int opposite, int a, int b, int axis) {
        return 2 * node[6 + 2 * opposite + axis] - 0.5 * (node[2 * a + axis] + node[2 * b + axis]);
    }

    // (b − a) × (d − c)
    private static double cross(
            double ax, double ay, double bx, double by, double cx, double cy, double dx, double dy) {
        return (bx - ax) * (dy - cy) - (by - ay) * (dx - cx);
    }
}
