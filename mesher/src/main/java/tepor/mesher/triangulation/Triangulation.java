package tepor.mesher.triangulation;

import java.util.Arrays;

/**
 * A triangulation in flat arrays, changed in place.
 *
 * <p>A side is numbered 3·triangle + i; it lies opposite corner i and runs counter-clockwise about its triangle, from corner
 * (i+1)%3 to corner (i+2)%3. The <em>twin</em> of a side is the same line seen from the triangle across it. While points are
 * first inserted the plane outside the convex hull is covered by ghost triangles, which have {@link #GHOST} for a corner;
 * once the section has been carved out there are none, and a side on the boundary has no twin.
 *
 * <p>A side may be <em>constrained</em>: it is a piece of a segment. Its code is 2·segment if it runs in the direction of the
 * segment (its triangle lies on the segment's left), 2·segment + 1 if it runs against it.
 */
public final class Triangulation {
    /** No twin, no constraint, no region. */
    public static final int NONE = -1;
    /** The vertex at infinity. */
    public static final int GHOST = -1;

    /** x and y of each vertex. */
    double[] xy;
    /** Three vertices for each triangle, counter-clockwise. */
    int[] corner;
    /** For each side its twin, or {@link #NONE}. */
    int[] twin;
    /** For each side its constraint code, or {@link #NONE}. */
    int[] constraint;
    /** For each triangle its region. */
    int[] region;
    /** For each triangle how often it was made anew; tells a stale reference from a good one. */
    int[] version;

    private int vertexCount;
    private int triangleCount;

    /**
     * A triangulation without triangles.
     *
     * @param xy 2·vertexCount coordinates, copied
     * @param triangleCapacity number of triangles for which room is made at first
     */
    public Triangulation(double[] xy, int triangleCapacity) {
        this.xy = xy.clone();
        vertexCount = xy.length / 2;
        int capacity = Math.max(16, triangleCapacity);
        corner = new int[3 * capacity];
        twin = new int[3 * capacity];
        constraint = new int[3 * capacity];
        region = new int[capacity];
        version = new int[capacity];
    }

    /** The side after this one, counter-clockwise in the same triangle. */
    public static int next(int side) {
        return side % 3 == 2 ? side - 2 : side + 1;
    }

    /** The side before this one, counter-clockwise in the same triangle. */
    public static int previous(int side) {
        return side % 3 == 0 ? side + 2 : side - 1;
    }

    public int vertexCount() {
        return vertexCount;
    }

    public double x(int vertex) {
        return xy[2 * vertex];
    }

    public double y(int vertex) {
        return xy[2 * vertex + 1];
    }

    public int triangleCount() {
        return triangleCount;
    }

    /** Vertex opposite a side; for side 3·t + i that is corner i of triangle t. */
    public int apex(int side) {
        return corner[side];
    }

    /** Vertex from which a side runs. */
    public int origin(int side) {
        return corner[next(side)];
    }

    /** Vertex to which a side runs. */
    public int destination(int side) {
        return corner[previous(side)];
    }

    /** The same side seen from the other triangle, or {@link #NONE}. */
    public int twin(int side) {
        return twin[side];
    }

    /** Constraint code of a side, or {@link #NONE}. */
    public int constraint(int side) {
        return constraint[side];
    }

    /** Region of a triangle. */
    public int region(int triangle) {
        return region[triangle];
    }

    /** How often the triangle of this number was made anew. */
    public int version(int triangle) {
        return version[triangle];
    }

    /** Whether the triangle has the vertex at infinity for a corner. */
    public boolean isGhost(int triangle) {
        return (corner[3 * triangle] | corner[3 * triangle + 1] | corner[3 * triangle + 2]) < 0;
    }

    /** Appends a vertex which is in no triangle yet and returns its number. */
    public int addVertex(double x, double y) {
        if (2 * vertexCount == xy.length) {
            xy = Arrays.copyOf(xy, Math.max(32, xy.length + xy.length / 2 & ~1));
        }
        xy[2 * vertexCount] = x;
        xy[2 * vertexCount + 1] = y;
        return vertexCount++;
    }

    /** Makes room for so many triangles, and the vertices of a mesh of that size. */
    public void reserve(int triangles) {
        if (triangles > region.length) {
            resize(triangles);
        }
        if (triangles > xy.length) {
            xy = Arrays.copyOf(xy, triangles & ~1);
        }
    }

    private void resize(int capacity) {
        corner = Arrays.copyOf(corner, 3 * capacity);
        twin = Arrays.copyOf(twin, 3 * capacity);
        constraint = Arrays.copyOf(constraint, 3 * capacity);
        region = Arrays.copyOf(region, capacity);
        version = Arrays.copyOf(version, capacity);
    }

    /** Appends a triangle; its twins and constraints are {@link #NONE}. */
    int addTriangle(int a, int b, int c) {
        if (triangleCount == region.length) {
            resize(triangleCount + triangleCount / 2);
        }
        int side = 3 * triangleCount;
        corner[side] = a;
        corner[side + 1] = b;
        corner[side + 2] = c;
        Arrays.fill(twin, side, side + 3, NONE);
        Arrays.fill(constraint, side, side + 3, NONE);
        region[triangleCount] = NONE;
        return triangleCount++;
    }

    /** Makes two sides twins of each other; the second may be {@link #NONE}. */
    void link(int side, int other) {
        twin[side] = other;
        if (other >= 0) {
            twin[other] = side;
        }
    }

    /**
     * Turns an unconstrained side within its two triangles: from (origin, destination) to (apex of the twin, apex). The
     * caller has made sure that the quadrilateral is strictly convex.
     */
    void flip(int side) {
        int other = twin[side];
        int p = corner[side];
        int q = corner[other];
        int u = origin(side);
        int w = destination(side);
        int wp = next(side);
        int pu = previous(side);
        int uq = next(other);
        int qw = previous(other);
        int wpTwin = twin[wp];
        int puTwin = twin[pu];
        int uqTwin = twin[uq];
        int qwTwin = twin[qw];
        int wpCode = constraint[wp];
        int puCode = constraint[pu];
        int uqCode = constraint[uq];
        int qwCode = constraint[qw];
        int s = side - side % 3;
        int o = other - other % 3;
        set(s, p, u, q);
        set(o, q, w, p);
        link(s, uqTwin);
        link(s + 1, o + 1);
        link(s + 2, puTwin);
        link(o, wpTwin);
        link(o + 2, qwTwin);
        constraint[s] = uqCode;
        constraint[s + 1] = NONE;
        constraint[s + 2] = puCode;
        constraint[o] = wpCode;
        constraint[o + 1] = NONE;
        constraint[o + 2] = qwCode;
    }

    private void set(int firstSide, int a, int b, int c) {
        corner[firstSide] = a;
        corner[firstSide + 1] = b;
        corner[firstSide + 2] = c;
    }

    /**
     * Keeps only some of the triangles, in their order; sides towards the others lose their twin.
     *
     * @param keep for each triangle whether it stays
     */
    void retain(boolean[] keep) {
        int[] renumbered = new int[triangleCount];
        int kept = 0;
        for (int t = 0; t < triangleCount; t++) {
            renumbered[t] = keep[t] ? kept++ : NONE;
        }
        for (int t = 0; t < triangleCount; t++) {
            int to = renumbered[t];
            if (to < 0) {
                continue;
            }
            for (int i = 0; i < 3; i++) {
                int across = twin[3 * t + i];
                int acrossTo = across < 0 ? NONE : renumbered[across / 3];
                corner[3 * to + i] = corner[3 * t + i];
                constraint[3 * to + i] = constraint[3 * t + i];
                twin[3 * to + i] = acrossTo < 0 ? NONE : 3 * acrossTo + across % 3;
            }
            region[to] = region[t];
        }
        triangleCount = kept;
    }
}
