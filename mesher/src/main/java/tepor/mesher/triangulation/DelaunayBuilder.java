package tepor.mesher.triangulation;

/** Makes the Delaunay triangulation of points, with ghost triangles around their convex hull. */
public final class DelaunayBuilder {
    private final Triangulation mesh;
    private final Predicates predicates;
    private final TriangleWalk walk;
    private final Cavity cavity;

    private DelaunayBuilder(double[] xy, Predicates predicates) {
        mesh = new Triangulation(xy, xy.length + 8);
        this.predicates = predicates;
        walk = new TriangleWalk(mesh, predicates);
        cavity = new Cavity(mesh, predicates);
    }

    /**
     * The Delaunay triangulation of points.
     *
     * @param xy 2·n coordinates, finite, no two points the same
     * @throws IllegalArgumentException if there are fewer than three points, if all lie on one line, or two are the same
     */
    public static Triangulation build(double[] xy, Predicates predicates) {
        return build(xy, HilbertOrder.inRounds(xy), predicates);
    }

    /**
     * The Delaunay triangulation of some of the points; the others become vertices in no triangle.
     *
     * @param xy 2·n coordinates
     * @param order numbers of the points to insert, in order of insertion
     * @throws IllegalArgumentException as above
     */
    static Triangulation build(double[] xy, int[] order, Predicates predicates) {
        DelaunayBuilder builder = new DelaunayBuilder(xy, predicates);
        builder.insertAll(order);
        return builder.mesh;
    }

    private void insertAll(int[] order) {
        if (order.length < 3) {
            throw new IllegalArgumentException("a triangulation needs at least three points, got " + order.length);
        }
        int third = 2;
        while (third < order.length && turn(order[0], order[1], order[third]) == 0) {
            third++;
        }
        if (third == order.length) {
            throw new IllegalArgumentException("all points lie on one line, or the first two are the same");
        }
        start(order[0], order[1], order[third]);
        int last = 0;
        for (int i = 2; i < order.length; i++) {
            if (i != third) {
                last = insert(order[i], last);
            }
        }
    }

    private double turn(int a, int b, int c) {
        return predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c));
    }

    private void start(int p, int q, int r) {
        boolean counterClockwise = turn(p, q, r) > 0;
        int a = p;
        int b = counterClockwise ? q : r;
        int c = counterClockwise ? r : q;
        mesh.addTriangle(a, b, c);
        int[] ring = {a, b, c};
        for (int i = 0; i < 3; i++) {
            // Across side i of the triangle, which runs from corner i+1 to corner i+2.
            mesh.addTriangle(Triangulation.GHOST, ring[(i + 2) % 3], ring[(i + 1) % 3]);
            mesh.link(i, 3 * (i + 1));
        }
        for (int i = 0; i < 3; i++) {
            // Ghost i holds (ghost, end, start): its side 1 runs start → ghost, and meets side 2 of the ghost before
            // it.
            mesh.link(3 * (i + 1) + 1, 3 * ((i + 2) % 3 + 1) + 2);
        }
    }

    private int insert(int vertex, int near) {
        double x = mesh.x(vertex);
        double y = mesh.y(vertex);
        if (walk.walk(near, x, y) == TriangleWalk.Found.ON_CORNER) {
            throw new IllegalArgumentException("two points are the same: (" + x + " " + y + ")");
        }
        cavity.dig(x, y, walk.triangle());
        cavity.fill(vertex);
        return cavity.borderSide(0) / 3;
    }
}
