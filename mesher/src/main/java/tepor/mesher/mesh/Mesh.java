package tepor.mesher.mesh;

import java.util.BitSet;

/**
 * A conforming triangle mesh of a section, written for reading by index. Immutable.
 *
 * <p>Nodes are numbered from 0; the first {@link #cornerCount()} nodes are corners of triangles, the rest (six-node
 * triangles only) lie in the middle of sides. A triangle's nodes are its three corners, counter-clockwise, then the nodes
 * in the middle of its sides 0, 1 and 2; side i lies <em>opposite</em> corner i, and runs from corner (i+1)%3 to corner
 * (i+2)%3. Where two parts of the section touch in a single point only, each has a node of its own there.
 *
 * <p>In six-node triangles the node in the middle of a side that is a facet on an arc lies on that arc's circle: the side is
 * curved, the parabola through its three nodes. All other sides are straight, with the node in their middle. The map from
 * the reference triangle to each curved triangle has a positive Jacobian everywhere: this was proven when the mesh was made.
 *
 * <p>A <em>facet</em> is a triangle side that lies on a segment of the section: on the boundary, or between regions. A
 * facet runs in the direction of its segment; the triangle on its left has it as a side in that same direction.
 */
public final class Mesh {
    /** No triangle, no neighbour. */
    public static final int NONE = -1;

    /** A middle node farther off the middle than this makes a side curved. */
    private static final double ROUND_OFF_ULPS = 8;

    private final int nodesPerTriangle;
    private final int cornerCount;
    private final double[] xy;
    private final int[] node;
    private final int[] neighbour;
    private final int[] region;
    private final int[] facetSegment;
    private final int[] facetLeft;
    private final int[] facetRight;
    private final BitSet curved = new BitSet();

    /**
     * @param nodesPerTriangle 3 or 6
     * @param cornerCount number of nodes that are corners; these come first
     * @param xy 2·nodeCount coordinates, metres
     * @param node nodesPerTriangle·triangleCount nodes, in the order told above
     * @param neighbour 3·triangleCount triangles: the one across side i, or {@link #NONE}
     * @param region triangleCount region numbers of the section
     * @param facetSegment facetCount segment numbers of the section
     * @param facetLeft facetCount entries 3·triangle + side of the triangle on the left, or {@link #NONE}
     * @param facetRight facetCount entries 3·triangle + side of the triangle on the right, or {@link #NONE}
     */
    public Mesh(
            int nodesPerTriangle,
            int cornerCount,
            double[] xy,
            int[] node,
            int[] neighbour,
            int[] region,
            int[] facetSegment,
            int[] facetLeft,
            int[] facetRight) {
        this(
                nodesPerTriangle,
                cornerCount,
                new Arrays(
                        xy.clone(),
                        node.clone(),
                        neighbour.clone(),
                        region.clone(),
                        facetSegment.clone(),
                        facetLeft.clone(),
                        facetRight.clone()));
    }

    /** A mesh that keeps the arrays themselves: whoever made them must not touch them any more. */
    Mesh(int nodesPerTriangle, int cornerCount, Arrays arrays) {
        this.nodesPerTriangle = nodesPerTriangle;
        this.cornerCount = cornerCount;
        xy = arrays.xy;
        node = arrays.node;
        neighbour = arrays.neighbour;
        region = arrays.region;
        facetSegment = arrays.facetSegment;
        facetLeft = arrays.facetLeft;
        facetRight = arrays.facetRight;
        if (nodesPerTriangle == 6) {
            findCurved();
        }
    }

    /** What a mesh is made of; see the constructor. */
    record Arrays(
            double[] xy,
            int[] node,
            int[] neighbour,
            int[] region,
            int[] facetSegment,
            int[] facetLeft,
            int[] facetRight) {}

    private void findCurved() {
        for (int t = 0; t < region.length; t++) {
            for (int i = 0; i < 3; i++) {
                int a = node(t, (i + 1) % 3);
                int b = node(t, (i + 2) % 3);
                int m = node(t, 3 + i);
                double off = Math.max(Math.abs(x(m) - 0.5 * (x(a) + x(b))), Math.abs(y(m) - 0.5 * (y(a) + y(b))));
                if (off > ROUND_OFF_ULPS * Math.ulp(Math.max(Math.abs(x(m)), Math.abs(y(m))))) {
                    curved.set(t);
                }
            }
        }
    }

    /** 3 or 6. */
    public int nodesPerTriangle() {
        return nodesPerTriangle;
    }

    public int nodeCount() {
        return xy.length / 2;
    }

    /** Nodes below this number are corners, the others lie in the middle of sides. */
    public int cornerCount() {
        return cornerCount;
    }

    /** Metres. */
    public double x(int iNode) {
        return xy[2 * iNode];
    }

    /** Metres. */
    public double y(int iNode) {
        return xy[2 * iNode + 1];
    }

    public int triangleCount() {
        return region.length;
    }

    /** Node i of a triangle, i below {@link #nodesPerTriangle()}. */
    public int node(int triangle, int i) {
        return node[nodesPerTriangle * triangle + i];
    }

    /** Triangle across side i, or {@link #NONE}. */
    public int neighbour(int triangle, int i) {
        return neighbour[3 * triangle + i];
    }

    /** Number of the region of the section in which the triangle lies. */
    public int region(int triangle) {
        return region[triangle];
    }

    public int facetCount() {
        return facetSegment.length;
    }

    /** Segment of the section on which the facet lies. */
    public int facetSegment(int facet) {
        return facetSegment[facet];
    }

    /** Triangle on the left of the facet, or {@link #NONE}. */
    public int facetLeftTriangle(int facet) {
        return facetLeft[facet] < 0 ? NONE : facetLeft[facet] / 3;
    }

    /** Which side of the triangle on its left the facet is. */
    public int facetLeftSide(int facet) {
        return facetLeft[facet] % 3;
    }

    /** Triangle on the right of the facet, or {@link #NONE}. */
    public int facetRightTriangle(int facet) {
        return facetRight[facet] < 0 ? NONE : facetRight[facet] / 3;
    }

    /** Which side of the triangle on its right the facet is. */
    public int facetRightSide(int facet) {
        return facetRight[facet] % 3;
    }

    /** Whether the facet lies on the boundary: it has a triangle on one side only. */
    public boolean isBoundaryFacet(int facet) {
        return facetLeft[facet] < 0 || facetRight[facet] < 0;
    }

    /**
     * Node i of a facet in the facet's direction: 0 its start, 1 its end, 2 its middle (six-node triangles only). Both
     * triangles of an interface share these nodes.
     */
    public int facetNode(int facet, int i) {
        boolean fromLeft = facetLeft[facet] >= 0;
        int code = fromLeft ? facetLeft[facet] : facetRight[facet];
        int triangle = code / 3;
        int side = code % 3;
        if (i == 2) {
            return node(triangle, 3 + side);
        }
        return node(triangle, (side + (fromLeft == (i == 0) ? 1 : 2)) % 3);
    }

    /** Whether a triangle has a curved side. */
    public boolean isCurved(int triangle) {
        return curved.get(triangle);
    }

    /** Whether a facet is curved. */
    public boolean isCurvedFacet(int facet) {
        int triangle = facetLeft[facet] >= 0 ? facetLeft[facet] / 3 : facetRight[facet] / 3;
        if (!curved.get(triangle)) {
            return false;
        }
        int a = facetNode(facet, 0);
        int b = facetNode(facet, 1);
        int m = facetNode(facet, 2);
        double off = Math.max(Math.abs(x(m) - 0.5 * (x(a) + x(b))), Math.abs(y(m) - 0.5 * (y(a) + y(b))));
        return off > ROUND_OFF_ULPS * Math.ulp(Math.max(Math.abs(x(m)), Math.abs(y(m))));
    }

    /** Length of the chord of a facet, metres: of the facet itself where it is straight. */
    public double facetLength(int facet) {
        int a = facetNode(facet, 0);
        int b = facetNode(facet, 1);
        return Math.hypot(x(b) - x(a), y(b) - y(a));
    }

    /** Area of a triangle, m²; exactly that within its curved sides. */
    public double area(int triangle) {
        int a = node(triangle, 0);
        int b = node(triangle, 1);
        int c = node(triangle, 2);
        double area = 0.5 * ((x(b) - x(a)) * (y(c) - y(a)) - (x(c) - x(a)) * (y(b) - y(a)));
        if (curved.get(triangle)) {
            for (int i = 0; i < 3; i++) {
                area += areaOutsideChord(triangle, i);
            }
        }
        return area;
    }

    // Between chord and parabola lie two thirds of the parallelogram that both span.
    private double areaOutsideChord(int triangle, int i) {
        int a = node(triangle, (i + 1) % 3);
        int b = node(triangle, (i + 2) % 3);
        int m = node(triangle, 3 + i);
        double bulgeX = x(m) - 0.5 * (x(a) + x(b));
        double bulgeY = y(m) - 0.5 * (y(a) + y(b));
        return 2.0 / 3.0 * (bulgeX * (y(b) - y(a)) - bulgeY * (x(b) - x(a)));
    }
}
