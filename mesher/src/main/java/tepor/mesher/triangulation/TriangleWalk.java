package tepor.mesher.triangulation;

/**
 * Finds the triangle in which a point lies by walking there, from triangle to triangle across sides that part the triangle
 * from the point (Devillers, Pion & Teillaud 2002, <em>Walking in a triangulation</em>). Constrained sides are not crossed.
 */
public final class TriangleWalk {
    /** What a walk found. */
    public enum Found {
        /** The point lies inside {@link #triangle()}. */
        INSIDE,
        /** The point lies on {@link #side()}. */
        ON_SIDE,
        /** The point lies on the corner opposite {@link #side()}. */
        ON_CORNER,
        /** {@link #side()} is constrained and stands in the way. */
        BLOCKED
    }

    private final Triangulation mesh;
    private final Predicates predicates;
    private int side;
    private int triangle;
    private int random = 1;
    private Found result = Found.INSIDE;

    public TriangleWalk(Triangulation mesh, Predicates predicates) {
        this.mesh = mesh;
        this.predicates = predicates;
    }

    /** Where the last walk ended. */
    public int triangle() {
        return triangle;
    }

    /** The side that the last walk found. */
    public int side() {
        return side;
    }

    /**
     * Walks to a point.
     *
     * @param start triangle to start from
     */
    public Found walk(int start, double x, double y) {
        triangle = start;
        int entry = Triangulation.NONE;
        if (mesh.isGhost(triangle)) {
            int hull = 3 * triangle;
            while (mesh.corner[hull] >= 0) {
                hull++;
            }
            triangle = mesh.twin[hull] / 3;
        }
        while (true) {
            int crossed = tryTriangle(entry, x, y);
            if (crossed < 0) {
                return result;
            }
            entry = mesh.twin[crossed];
            triangle = entry / 3;
            if (mesh.isGhost(triangle)) {
                return Found.INSIDE;
            }
        }
    }

    // Returns the side to cross, or NONE once the walk has ended with a result.
    private int tryTriangle(int entry, double x, double y) {
        // A fixed order of the sides could run in circles where constraints spoil the Delaunay property.
        random = random * 1664525 + 1013904223;
        int shift = (random >>> 16) % 3;
        int blocked = Triangulation.NONE;
        int zero = Triangulation.NONE;
        int secondZero = Triangulation.NONE;
        for (int i = 0; i < 3; i++) {
            int s = 3 * triangle + (shift + i) % 3;
            if (s == entry) {
                continue;
            }
            int a = mesh.origin(s);
            int b = mesh.destination(s);
            double turn = predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), x, y);
            if (turn < 0) {
                if (mesh.constraint[s] < 0) {
                    return s;
                }
                blocked = s;
            } else if (turn == 0) {
                secondZero = zero;
                zero = s;
            }
        }
        if (blocked >= 0) {
            side = blocked;
            result = Found.BLOCKED;
        } else if (secondZero >= 0) {
            side = 9 * triangle + 3 - zero - secondZero;
            result = Found.ON_CORNER;
        } else if (zero >= 0) {
            side = zero;
            result = Found.ON_SIDE;
        } else {
            result = Found.INSIDE;
        }
        return Triangulation.NONE;
    }
}
