package tepor.mesher.mesh;

import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.hprtree.HPRtree;

/**
 * Finds the triangle in which a point lies, straight or curved: by walking from the last one found, and through a spatial
 * index where the walk leaves the mesh. Keeps the last find, so it is for one thread.
 */
public final class TriangleFinder {
    private static final int WALK_AT_MOST = 64;

    /** A point on a side may lie off both its triangles by rounding. */
    private static final double ROUNDING = 1e-7;

    /** How far a point may lie off the mesh, as a share of the mesh's width and height: as far as an arc off a coarse chord. */
    private static final double FARTHEST = 1.0 / 16;

    private final Mesh mesh;
    private final TriangleMap map;
    private HPRtree tree;
    private double reach;
    private int last;

    public TriangleFinder(Mesh mesh) {
        this.mesh = mesh;
        map = new TriangleMap(mesh);
    }

    /**
     * The triangle in which the point lies, or, for a point off the mesh, the one to which it is nearest in barycentric
     * terms among those whose box it touches, or else among those whose boxes are near.
     *
     * @param x metres
     * @param y metres
     * @param barycentric three entries, overwritten with the point's coordinates in that triangle; negative where it is off
     * @return {@link Mesh#NONE} where no triangle is near
     */
    public int find(double x, double y, double[] barycentric) {
        int triangle = walk(x, y, barycentric);
        if (triangle == Mesh.NONE) {
            triangle = search(x, y, barycentric);
        }
        if (triangle != Mesh.NONE) {
            last = triangle;
        }
        return triangle;
    }

    private int walk(double x, double y, double[] l) {
        int t = last;
        for (int step = 0; step < WALK_AT_MOST && t != Mesh.NONE; step++) {
            int worst;
            if (mesh.isCurved(t)) {
                map.moveTo(t);
                if (map.contains(x, y) && map.locate(x, y, l)) {
                    return t;
                }
                worst = map.worstSide(x, y);
            } else {
                worst = barycentric(t, x, y, l);
                if (l[worst] >= 0) {
                    return t;
                }
            }
            t = mesh.neighbour(t, worst);
        }
        return Mesh.NONE;
    }

    private int search(double x, double y, double[] l) {
        if (tree == null) {
            build();
        }
        Envelope box = new Envelope(x, x, y, y);
        int best = best(box, x, y, l);
        for (double more = ROUNDING; best == Mesh.NONE && more < FARTHEST; more *= 8) {
            box.expandBy(more * reach);
            best = best(box, x, y, l);
        }
        if (best != Mesh.NONE) {
            map.moveTo(best);
            map.locate(x, y, l);
        }
        return best;
    }

    private int best(Envelope box, double x, double y, double[] l) {
        int best = Mesh.NONE;
        double bestLeast = Double.NEGATIVE_INFINITY;
        for (Object item : tree.query(box)) {
            int t = (Integer) item;
            double least;
            if (mesh.isCurved(t)) {
                map.moveTo(t);
                least = map.margin(x, y);
            } else {
                least = l[barycentric(t, x, y, l)];
            }
            if (least > bestLeast || (least == bestLeast && t < best)) {
                bestLeast = least;
                best = t;
            }
        }
        return best;
    }

    private void build() {
        tree = new HPRtree();
        Envelope all = new Envelope();
        for (int t = 0; t < mesh.triangleCount(); t++) {
            Envelope box = new Envelope();
            for (int i = 0; i < 3; i++) {
                box.expandToInclude(mesh.x(mesh.node(t, i)), mesh.y(mesh.node(t, i)));
            }
            for (int i = 3; i < 6 && mesh.isCurved(t); i++) {
                includeBulge(t, i, box);
            }
            box.expandBy(ROUNDING * (box.getWidth() + box.getHeight()));
            tree.insert(box, t);
            all.expandToInclude(box);
        }
        tree.build();
        reach = all.getWidth() + all.getHeight();
    }

    // A parabola lies within the triangle of its ends and the point twice as far off the chord as its middle.
    private void includeBulge(int t, int middle, Envelope box) {
        int a = mesh.node(t, (middle + 1) % 3);
        int b = mesh.node(t, (middle + 2) % 3);
        int m = mesh.node(t, middle);
        box.expandToInclude(
                2 * mesh.x(m) - 0.5 * (mesh.x(a) + mesh.x(b)), 2 * mesh.y(m) - 0.5 * (mesh.y(a) + mesh.y(b)));
    }

    /** Fills the barycentric coordinates and returns which is least. */
    private int barycentric(int t, double x, double y, double[] l) {
        int a = mesh.node(t, 0);
        int b = mesh.node(t, 1);
        int c = mesh.node(t, 2);
        double ax = mesh.x(a) - x;
        double ay = mesh.y(a) - y;
        double bx = mesh.x(b) - x;
        double by = mesh.y(b) - y;
        double cx = mesh.x(c) - x;
        double cy = mesh.y(c) - y;
        l[0] = bx * cy - cx * by;
        l[1] = cx * ay - ax * cy;
        l[2] = ax * by - bx * ay;
        double sum = l[0] + l[1] + l[2];
        l[0] /= sum;
        l[1] /= sum;
        l[2] /= sum;
        int worst = l[0] <= l[1] ? 0 : 1;
        return l[2] < l[worst] ? 2 : worst;
    }
}
