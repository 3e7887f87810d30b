package tepor.mesher.triangulation;

import java.util.Arrays;
import java.util.function.IntConsumer;

/**
 * The hole that a new vertex makes in a constrained Delaunay triangulation, and its filling by a fan of triangles.
 *
 * <p>The cavity of a point p holds the triangles whose circumcircle has p inside and which p sees past the constrained sides
 * (Bowyer 1981, Watson 1981, Comput. J. 24; constrained: Shewchuk 2002). Digging changes nothing, so a caller can look at
 * the border first and think better of it. As predicates are exact, p lies strictly on the inner side of all of the border,
 * so that no triangle of the fan is flat or turned over.
 */
public final class Cavity {
    private final Triangulation mesh;
    private final Predicates predicates;
    private double px;
    private double py;

    private int epoch;
    private int[] seen = new int[64];
    private int[] stack = new int[64];
    private int depth;
    private int[] dug = new int[64];
    private int dugCount;

    private int borderCount;
    private int[] border = new int[64];
    private int[] origin = new int[64];
    private int[] destination = new int[64];
    private int[] across = new int[64];
    private int[] code = new int[64];
    private int[] region = new int[64];

    /** Border sides on the first side of a split segment; −1 if no segment is split. */
    private int firstPart;
    /** Whether the split segment has triangles on one side only, so that the border does not close. */
    private boolean open;

    /** Whether the point lies off the segment that it splits. */
    private boolean aside;

    private int hindrance = Triangulation.NONE;
    private int leftCode;
    private int rightCode;

    public Cavity(Triangulation mesh, Predicates predicates) {
        this.mesh = mesh;
        this.predicates = predicates;
    }

    /** Digs the cavity of a point that lies in the triangle, or on an unconstrained side of it, and not on a corner. */
    public void dig(double x, double y, int triangle) {
        begin(x, y);
        firstPart = -1;
        open = false;
        take(triangle);
        push(3 * triangle + 2);
        push(3 * triangle + 1);
        push(3 * triangle);
        run();
        collect();
    }

    /**
     * Digs the cavity of a point that splits a constrained side. The point need not lie on the side to the last bit.
     *
     * @return false if the point does not see all the other sides of the one or two triangles at the side: then it must not
     *     be inserted
     */
    public boolean digSplit(double x, double y, int side) {
        int other = mesh.twin[side];
        if (!sees(x, y, side) || (other >= 0 && !sees(x, y, other))) {
            return false;
        }
        digBothSides(x, y, side);
        collect();
        return true;
    }

    /**
     * Digs the cavity of a point that splits a constrained side, but lies off it, as the middle of an arc lies off its
     * chord. The cavity also takes in what hides the point from its border; the fan need not be Delaunay, so
     * {@link #restore} must follow {@link #fill}.
     *
     * @return false if a constrained side, {@link #hindrance}, hides the point: then it must not be inserted
     */
    public boolean digAside(double x, double y, int side) {
        aside = true;
        digBothSides(x, y, side);
        aside = false;
        for (int i = 0; i < borderCount; i++) {
            if (!sideSees(x, y, border[i])) {
                hindrance = border[i];
                return false;
            }
        }
        collect();
        return true;
    }

    private void digBothSides(double x, double y, int side) {
        int other = mesh.twin[side];
        begin(x, y);
        open = other < 0;
        leftCode = mesh.constraint[side];
        rightCode = open ? Triangulation.NONE : mesh.constraint[other];
        take(side / 3);
        if (!open) {
            take(other / 3);
        }
        push(Triangulation.previous(side));
        push(Triangulation.next(side));
        run();
        firstPart = borderCount;
        if (!open) {
            push(Triangulation.previous(other));
            push(Triangulation.next(other));
            run();
        }
    }

    /** The side that made {@link #digAside} fail. */
    public int hindrance() {
        return hindrance;
    }

    /**
     * Makes the triangulation constrained Delaunay again by flips (Lawson 1977), after {@link #digAside} and {@link #fill}.
     *
     * @param changed called with the first side of each triangle that a flip changed
     */
    public void restore(IntConsumer changed) {
        depth = 0;
        for (int i = 0; i < borderCount; i++) {
            push(border[i]);
            push(border[i] + 1);
        }
        while (depth > 0) {
            int side = stack[--depth];
            int other = mesh.twin[side];
            if (other < 0 || mesh.constraint[side] >= 0) {
                continue;
            }
            int q = mesh.apex(other);
            int a = mesh.apex(side);
            int b = mesh.origin(side);
            int c = mesh.destination(side);
            if (predicates.inCircle(
                            mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c), mesh.x(q), mesh.y(q))
                    > 0) {
                mesh.flip(side);
                for (int t : new int[] {side / 3, other / 3}) {
                    mesh.version[t]++;
                    changed.accept(3 * t);
                    push(3 * t);
                    push(3 * t + 1);
                    push(3 * t + 2);
                }
            }
        }
    }

    /** Number of sides around the cavity, counter-clockwise; also the number of triangles which {@link #fill} makes. */
    public int borderCount() {
        return borderCount;
    }

    /** Side i of the border, as a side of a triangle in the cavity; after {@link #fill}, of a triangle of the fan. */
    public int borderSide(int i) {
        return border[i];
    }

    /** Fills the cavity with triangles from its border to a vertex, which must lie where the cavity was dug. */
    public void fill(int vertex) {
        for (int i = 0; i < borderCount; i++) {
            int triangle = i < dugCount ? dug[i] : mesh.addTriangle(vertex, vertex, vertex);
            int side = 3 * triangle;
            mesh.corner[side] = vertex;
            mesh.corner[side + 1] = origin[i];
            mesh.corner[side + 2] = destination[i];
            mesh.link(side, across[i]);
            mesh.constraint[side] = code[i];
            mesh.constraint[side + 1] = Triangulation.NONE;
            mesh.constraint[side + 2] = Triangulation.NONE;
            mesh.region[triangle] = region[i];
            mesh.version[triangle]++;
            border[i] = side;
        }
        for (int i = 1; i < borderCount; i++) {
            mesh.link(border[i - 1] + 1, border[i] + 2);
        }
        int first = border[0] + 2;
        int last = border[borderCount - 1] + 1;
        if (open) {
            mesh.twin[first] = Triangulation.NONE;
            mesh.twin[last] = Triangulation.NONE;
        } else {
            mesh.link(last, first);
        }
        if (firstPart >= 0) {
            mesh.constraint[first] = leftCode;
            mesh.constraint[border[firstPart - 1] + 1] = leftCode;
            if (!open) {
                mesh.constraint[border[firstPart] + 2] = rightCode;
                mesh.constraint[last] = rightCode;
            }
        }
    }

    private boolean sees(double x, double y, int side) {
        return sideSees(x, y, Triangulation.next(side)) && sideSees(x, y, Triangulation.previous(side));
    }

    private boolean sideSees(double x, double y, int side) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        return predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), x, y) > 0;
    }

    private void begin(double x, double y) {
        px = x;
        py = y;
        epoch++;
        depth = 0;
        dugCount = 0;
        borderCount = 0;
        if (seen.length < mesh.triangleCount()) {
            seen = Arrays.copyOf(seen, Math.max(mesh.region.length, mesh.triangleCount()));
        }
    }

    private void take(int triangle) {
        seen[triangle] = epoch;
        if (dugCount == dug.length) {
            dug = Arrays.copyOf(dug, 2 * dugCount);
        }
        dug[dugCount++] = triangle;
    }

    private void push(int side) {
        if (depth == stack.length) {
            stack = Arrays.copyOf(stack, 2 * depth);
        }
        stack[depth++] = side;
    }

    // Depth first in counter-clockwise order, so that the border comes out in order too. No vertex lies inside a
    // cavity, hence its triangles form a tree, and none is met twice.
    private void run() {
        int[] twin = mesh.twin;
        int[] constraint = mesh.constraint;
        while (depth > 0) {
            int side = stack[--depth];
            int other = twin[side];
            if (other >= 0
                    && constraint[side] < 0
                    && seen[other / 3] != epoch
                    && (inConflict(other / 3) || (aside && !sideSees(px, py, side)))) {
                take(other / 3);
                push(Triangulation.previous(other));
                push(Triangulation.next(other));
            } else {
                if (borderCount == border.length) {
                    growBorder();
                }
                border[borderCount++] = side;
            }
        }
    }

    private boolean inConflict(int triangle) {
        int a = mesh.corner[3 * triangle];
        int b = mesh.corner[3 * triangle + 1];
        int c = mesh.corner[3 * triangle + 2];
        if ((a | b | c) < 0) {
            return a < 0 ? beyond(b, c) : b < 0 ? beyond(c, a) : beyond(a, b);
        }
        double[] xy = mesh.xy;
        return predicates.inCircle(xy[2 * a], xy[2 * a + 1], xy[2 * b], xy[2 * b + 1], xy[2 * c], xy[2 * c + 1], px, py)
                > 0;
    }

    // The circle of a ghost triangle is the open half-plane outside its side of the hull, and that side without its
    // ends.
    private boolean beyond(int a, int b) {
        double ax = mesh.x(a);
        double ay = mesh.y(a);
        double bx = mesh.x(b);
        double by = mesh.y(b);
        double turn = predicates.orientation(ax, ay, bx, by, px, py);
        if (turn != 0) {
            return turn > 0;
        }
        boolean byX = ax != bx;
        double from = byX ? ax : ay;
        double to = byX ? bx : by;
        double at = byX ? px : py;
        return Math.min(from, to) < at && at < Math.max(from, to);
    }

    private void collect() {
        for (int i = 0; i < borderCount; i++) {
            int side = border[i];
            origin[i] = mesh.origin(side);
            destination[i] = mesh.destination(side);
            across[i] = mesh.twin[side];
            code[i] = mesh.constraint[side];
            region[i] = mesh.region[side / 3];
        }
    }

    private void growBorder() {
        int length = 2 * border.length;
        border = Arrays.copyOf(border, length);
        origin = Arrays.copyOf(origin, length);
        destination = Arrays.copyOf(destination, length);
        across = Arrays.copyOf(across, length);
        code = Arrays.copyOf(code, length);
        region = Arrays.copyOf(region, length);
    }
}
