package tepor.viewer.picture.contour;

/**
 * How one triangle is divided into n² smaller ones: points (j, k) with j, k ≥ 0 and j + k ≤ n, barycentric coordinates
 * (n − j − k, j, k) / n.
 *
 * <p>Side i lies opposite corner i and runs from corner (i+1)%3 to corner (i+2)%3, as in the mesh.
 */
final class LatticePattern {
    final int n;
    final int pointCount;
    /** Barycentric coordinates of each point, 3·pointCount. */
    final double[] weight;
    /** For each point: the side on which it lies but for its ends, −1 inside, or −2 at a corner. */
    final int[] pointSide;
    /** For each point: its position along the side (1 … n−1), its number inside, or its corner. */
    final int[] pointPosition;
    /** Number of points inside. */
    final int innerPointCount;

    /** Points of each small triangle, counter-clockwise, 3·n². */
    final int[] corner;
    /** Edges of each small triangle; edge i runs from its corner i to its corner (i+1)%3, 3·n². */
    final int[] edge;

    final int edgeCount;
    /** Points at both ends of each edge, 2·edgeCount. */
    final int[] edgeEnd;
    /** For each edge: the side on which it lies, or −1 inside. */
    final int[] edgeSide;
    /** For each edge: its position along the side (0 … n−1), or its number inside. */
    final int[] edgePosition;
    /** Number of edges inside. */
    final int innerEdgeCount;

    private int edges;
    private int triangles;

    LatticePattern(int n) {
        this.n = n;
        pointCount = (n + 1) * (n + 2) / 2;
        weight = new double[3 * pointCount];
        pointSide = new int[pointCount];
        pointPosition = new int[pointCount];
        edgeCount = 3 * n * (n + 1) / 2;
        edgeEnd = new int[2 * edgeCount];
        edgeSide = new int[edgeCount];
        edgePosition = new int[edgeCount];
        corner = new int[3 * n * n];
        edge = new int[3 * n * n];
        innerPointCount = numberPoints();
        makeTriangles();
        innerEdgeCount = edgeCount - 3 * n;
    }

    private int point(int j, int k) {
        // Rows of equal k hold n + 1 − k points.
        return k * (n + 1) - k * (k - 1) / 2 + j;
    }

    private int numberPoints() {
        int inner = 0;
        for (int k = 0; k <= n; k++) {
            for (int j = 0; j + k <= n; j++) {
                int p = point(j, k);
                int i = n - j - k;
                weight[3 * p] = i / (double) n;
                weight[3 * p + 1] = j / (double) n;
                weight[3 * p + 2] = k / (double) n;
                if (i == n || j == n || k == n) {
                    pointSide[p] = -2;
                    pointPosition[p] = i == n ? 0 : j == n ? 1 : 2;
                } else if (i == 0 || j == 0 || k == 0) {
                    pointSide[p] = i == 0 ? 0 : j == 0 ? 1 : 2;
                    pointPosition[p] = i == 0 ? k : j == 0 ? i : j;
                } else {
                    pointSide[p] = -1;
                    pointPosition[p] = inner++;
                }
            }
        }
        return inner;
    }

    private void makeTriangles() {
        // Every edge belongs to exactly one triangle that points up; those that point down share their three.
        int[] upEdge = new int[3 * pointCount];
        int inner = 0;
        for (int k = 0; k < n; k++) {
            for (int j = 0; j + k < n; j++) {
                int a = point(j, k);
                int b = point(j + 1, k);
                int c = point(j, k + 1);
                int i = n - j - k;
                int ab = addEdge(a, b, k == 0 ? 2 : -1, k == 0 ? j : inner);
                inner += k == 0 ? 0 : 1;
                int bc = addEdge(b, c, i == 1 ? 0 : -1, i == 1 ? k : inner);
                inner += i == 1 ? 0 : 1;
                int ca = addEdge(c, a, j == 0 ? 1 : -1, j == 0 ? i - 1 : inner);
                inner += j == 0 ? 0 : 1;
                upEdge[3 * a] = ab;
                upEdge[3 * a + 1] = bc;
                upEdge[3 * a + 2] = ca;
                addTriangle(a, b, c, ab, bc, ca);
            }
        }
        for (int k = 0; k < n; k++) {
            for (int j = 0; j + k < n - 1; j++) {
                int a = point(j + 1, k);
                int b = point(j + 1, k + 1);
                int c = point(j, k + 1);
                addTriangle(a, b, c, upEdge[3 * a + 2], upEdge[3 * c], upEdge[3 * point(j, k) + 1]);
            }
        }
    }

    private int addEdge(int a, int b, int side, int position) {
        edgeEnd[2 * edges] = a;
        edgeEnd[2 * edges + 1] = b;
        edgeSide[edges] = side;
        edgePosition[edges] = position;
        return edges++;
    }

    private void addTriangle(int a, int b, int c, int ab, int bc, int ca) {
        corner[3 * triangles] = a;
        corner[3 * triangles + 1] = b;
        corner[3 * triangles + 2] = c;
        edge[3 * triangles] = ab;
        edge[3 * triangles + 1] = bc;
        edge[3 * triangles + 2] = ca;
        triangles++;
    }
}
