package tepor.mesher.refinement;

import tepor.mesher.triangulation.Triangulation;

/**
 * Judges triangles by angle and size, and chooses where to put a vertex that betters one.
 *
 * <p>A triangle is too large if its longest side exceeds the size wanted at its corners, its centroid or the middle of a
 * side; these are asked only where they can matter for a size of its gradation.
 */
final class TriangleRule {
    private static final double COARSER = 1 + 1e-9;
    /** Part of the greatest distance at which an off-centre still gives the angle wanted: keeps clear of round-off. */
    private static final double OFF_CENTRE = 0.95;
    /** Side of the triangle which a vertex put in for the sake of size aims at, as a part of the size wanted. */
    private static final double AIM = 0.8;

    /** Greatest distance of a point of a triangle from its nearest corner, as a part of the longest side: 1/√3. */
    private static final double FARTHEST = 0.5774;

    private final Triangulation mesh;
    private final Vertices vertices;
    private final SizeField field;
    private final double squaredCosine4;
    private final double reach;

    /** Times how much coarser than wanted triangles may be at present. */
    private double coarseness = 1;

    private int shortest;
    private double shortestSquared;
    private boolean sharp;
    private boolean large;
    private double x;
    private double y;

    TriangleRule(Triangulation mesh, Vertices vertices, RefinementOptions options) {
        this.mesh = mesh;
        this.vertices = vertices;
        field = options.size();
        double cosine = Math.cos(options.smallestAngle());
        squaredCosine4 = 4 * cosine * cosine;
        reach = OFF_CENTRE * 0.5 / Math.tan(0.5 * options.smallestAngle());
    }

    /** Sets how many times larger than wanted triangles may be from now on. */
    void setCoarseness(double times) {
        coarseness = times;
    }

    /** Looks at a triangle. */
    void examine(int triangle) {
        int a = mesh.apex(3 * triangle);
        int b = mesh.apex(3 * triangle + 1);
        int c = mesh.apex(3 * triangle + 2);
        double ax = mesh.x(a);
        double ay = mesh.y(a);
        double bx = mesh.x(b);
        double by = mesh.y(b);
        double cx = mesh.x(c);
        double cy = mesh.y(c);
        double aa = square(cx - bx, cy - by);
        double bb = square(ax - cx, ay - cy);
        double cc = square(bx - ax, by - ay);
        double min = Math.min(aa, Math.min(bb, cc));
        double max = Math.max(aa, Math.max(bb, cc));
        double mid = aa + bb + cc - min - max;
        shortest = 3 * triangle + (aa == min ? 0 : bb == min ? 1 : 2);
        shortestSquared = min;
        // Law of cosines for the angle opposite the shortest side.
        double twiceProduct = max + mid - min;
        sharp = twiceProduct * twiceProduct > squaredCosine4 * mid * max;
        large = isLarge(a, b, c, Math.sqrt(max) / (COARSER * coarseness));
    }

    private boolean isLarge(int a, int b, int c, double longest) {
        double atCorners = Math.min(vertices.size(a), Math.min(vertices.size(b), vertices.size(c)));
        if (longest > atCorners) {
            return true;
        }
        // No point of a triangle lies farther from its nearest corner than this part of its longest side.
        double smallest = atCorners - field.gradation() * FARTHEST * coarseness * COARSER * longest;
        if (longest <= smallest) {
            return false;
        }
        double ax = mesh.x(a);
        double ay = mesh.y(a);
        double bx = mesh.x(b);
        double by = mesh.y(b);
        double cx = mesh.x(c);
        double cy = mesh.y(c);
        double atCentroid = field.at((ax + bx + cx) / 3, (ay + by + cy) / 3);
        if (longest > atCentroid) {
            return true;
        }
        if (2 * longest < Math.min(atCorners, atCentroid)) {
            return false;
        }
        return longest > field.at(0.5 * (ax + bx), 0.5 * (ay + by))
                || longest > field.at(0.5 * (bx + cx), 0.5 * (by + cy))
                || longest > field.at(0.5 * (cx + ax), 0.5 * (cy + ay));
    }

    /** Whether the triangle has an angle smaller than asked. */
    boolean isSharp() {
        return sharp;
    }

    /** Whether the triangle is larger than asked. */
    boolean isLarge() {
        return large;
    }

    /** The shortest side. */
    int shortest() {
        return shortest;
    }

    /** Square of the shortest side, m². */
    double shortestSquared() {
        return shortestSquared;
    }

    /**
     * Places a vertex on the bisector of the shortest side of the triangle examined last: at the circumcentre, or nearer,
     * where the new triangle at that side just has the angle (Üngör's off-centre) or the size wanted.
     *
     * @return false if the numbers do not allow it
     */
    boolean place() {
        int p = mesh.origin(shortest);
        int q = mesh.destination(shortest);
        int r = mesh.apex(shortest);
        double px = mesh.x(p);
        double py = mesh.y(p);
        double dx = mesh.x(q) - px;
        double dy = mesh.y(q) - py;
        double ex = mesh.x(r) - px;
        double ey = mesh.y(r) - py;
        double dd = dx * dx + dy * dy;
        double ee = ex * ex + ey * ey;
        double twiceCross = 2 * (dx * ey - dy * ex);
        double ux = (ey * dd - dy * ee) / twiceCross;
        double uy = (dx * ee - ex * dd) / twiceCross;
        double length = Math.sqrt(dd);
        double distance = ((uy - 0.5 * dy) * dx - (ux - 0.5 * dx) * dy) / length;
        double wanted = reach * length;
        if (large) {
            double size = coarseness * Math.min(vertices.size(p), vertices.size(q));
            double aim = AIM * size;
            if (length <= COARSER * size) {
                wanted = Math.min(wanted, Math.sqrt(aim * aim - 0.25 * dd));
            }
        }
        if (wanted < distance) {
            x = px + 0.5 * dx - dy * (wanted / length);
            y = py + 0.5 * dy + dx * (wanted / length);
        } else {
            x = px + ux;
            y = py + uy;
        }
        return Double.isFinite(x) && Double.isFinite(y);
    }

    /** Where {@link #place} put the vertex, metres. */
    double x() {
        return x;
    }

    /** Where {@link #place} put the vertex, metres. */
    double y() {
        return y;
    }

    private static double square(double dx, double dy) {
        return dx * dx + dy * dy;
    }
}
