package tepor.mesher.mesh;

import java.util.List;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.hprtree.HPRtree;

/**
 * Finds the triangle in which a point lies: by walking from the last one found, and through a spatial index where the walk
 * leaves the mesh. Keeps the last find, so it is for one thread.
 */
public final class TriangleFinder {
    private static final int WALK_AT_MOST = 64;

    private final Mesh mesh;
    private HPRtree tree;
    private int last;

    public TriangleFinder(Mesh mesh) {
        this.mesh = mesh;
    }

    /**
     * The triangle in which the point lies, or, for a point just off the mesh, the one to which it is nearest in
     * barycentric terms among those whose box it touches.
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
            int worst = barycentric(t, x, y, l);
            if (l[worst] >= 0) {
                return t;
            }
            t = mesh.neighbour(t, worst);
        }
        return Mesh.NONE;
    }

    private int search(double x, double y, double[] l) {
        if (tree == null) {
            tree = new HPRtree();
            for (int t = 0; t < mesh.triangleCount(); t++) {
                Envelope box = new Envelope();
                for (int i = 0; i < 3; i++) {
                    box.expandToInclude(mesh.x(mesh.node(t, i)), mesh.y(mesh.node(t, i)));
                }
                // A point on a side may lie off both its triangles by rounding.
                box.expandBy(1e-7 * (box.getWidth() + box.getHeight()));
                tree.insert(box, t);
            }
            tree.build();
        }
        List<?> near = tree.query(new Envelope(x, x, y, y));
        int best = Mesh.NONE;
        double bestLeast = Double.NEGATIVE_INFINITY;
        for (Object item : near) {
            int t = (Integer) item;
            double least = l[barycentric(t, x, y, l)];
            if (least > bestLeast || (least == bestLeast && t < best)) {
                bestLeast = least;
                best = t;
            }
        }
        if (best != Mesh.NONE) {
            barycentric(best, x, y, l);
        }
        return best;
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
