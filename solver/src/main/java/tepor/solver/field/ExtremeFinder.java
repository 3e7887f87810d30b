package tepor.solver.field;

import java.util.function.IntPredicate;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleMap;

/**
 * Finds the highest or lowest temperature of a field, inside triangles and along sides too, not only at nodes: a quadratic
 * field has its extremes where its gradient vanishes. In curved triangles and on curved sides too the field is quadratic in
 * the barycentric coordinates, and only the place is mapped.
 */
public final class ExtremeFinder {
    /** Curvatures of a smaller ratio than this are round-off along a ridge. */
    private static final double FLAT = 1e-9;

    private final TemperatureField field;
    private final Mesh mesh;
    private final double sign;
    private final TriangleMap map;
    private final double[] u = new double[6];
    private double best = Double.NEGATIVE_INFINITY;
    private double bestX = Double.NaN;
    private double bestY = Double.NaN;

    private ExtremeFinder(TemperatureField field, boolean highest) {
        this.field = field;
        this.mesh = field.mesh();
        this.map = new TriangleMap(mesh);
        this.sign = highest ? 1 : -1;
    }

    /**
     * Extreme over triangles.
     *
     * @param triangles which to look at; at least one
     * @param highest the highest, else the lowest
     */
    public static Extreme overTriangles(TemperatureField field, IntPredicate triangles, boolean highest) {
        ExtremeFinder finder = new ExtremeFinder(field, highest);
        for (int t = 0; t < finder.mesh.triangleCount(); t++) {
            if (triangles.test(t)) {
                finder.lookAtTriangle(t);
            }
        }
        return finder.result();
    }

    /**
     * Extreme along facets.
     *
     * @param facets at least one
     */
    public static Extreme overFacets(TemperatureField field, int[] facets, boolean highest) {
        ExtremeFinder finder = new ExtremeFinder(field, highest);
        for (int f : facets) {
            finder.lookAtFacet(f);
        }
        return finder.result();
    }

    private Extreme result() {
        return new Extreme(sign * best, bestX, bestY);
    }

    private void lookAtFacet(int f) {
        int a = mesh.facetNode(f, 0);
        int b = mesh.facetNode(f, 1);
        offer(sign * field.at(a), mesh.x(a), mesh.y(a));
        offer(sign * field.at(b), mesh.x(b), mesh.y(b));
        if (mesh.nodesPerTriangle() == 6) {
            int m = mesh.facetNode(f, 2);
            side(sign * field.at(a), sign * field.at(m), sign * field.at(b), a, m, b);
        }
    }

    private void lookAtTriangle(int t) {
        int n = mesh.nodesPerTriangle();
        double level = sign * field.at(mesh.node(t, 0));
        double ceiling = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < n; i++) {
            u[i] = sign * field.at(mesh.node(t, i));
        }
        for (int i = 0; i < 3; i++) {
            int node = mesh.node(t, i);
            offer(u[i], mesh.x(node), mesh.y(node));
        }
        if (n == 3) {
            return;
        }
        // Bézier coefficients bound the quadratic from above; most triangles are done with that.
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            ceiling = Math.max(ceiling, Math.max(u[i], 2 * u[3 + i] - 0.5 * (u[j] + u[k])));
        }
        if (ceiling <= best) {
            return;
        }
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            side(u[j], u[3 + i], u[k], mesh.node(t, j), mesh.node(t, 3 + i), mesh.node(t, k));
        }
        interior(t, level);
    }

    /** The quadratic through start, middle and end of a side has its extreme at t* = ½ + (a − b)/4c, c = a + b − 2m. */
    private void side(double a, double m, double b, int nodeA, int nodeM, int nodeB) {
        double curvature = (a - m) + (b - m);
        if (curvature >= 0) {
            return;
        }
        double t = 0.5 + (a - b) / (4 * curvature);
        if (t > 0 && t < 1) {
            double value = m - (b - a) * (b - a) / (8 * curvature);
            double middle = 4 * t * (1 - t); // of what the middle node lies off the chord; nothing on straight sides
            offer(
                    value,
                    (1 - t) * mesh.x(nodeA)
                            + t * mesh.x(nodeB)
                            + middle * (mesh.x(nodeM) - 0.5 * (mesh.x(nodeA) + mesh.x(nodeB))),
                    (1 - t) * mesh.y(nodeA)
                            + t * mesh.y(nodeB)
                            + middle * (mesh.y(nodeM) - 0.5 * (mesh.y(nodeA) + mesh.y(nodeB))));
        }
    }

    /** Stationary point of u(ξ, η), ξ = λ₁, η = λ₂, where it is a maximum inside the triangle. */
    private void interior(int t, double level) {
        double u1 = u[1] - level;
        double u2 = u[2] - level;
        double m12 = u[3] - level;
        double m20 = u[4] - level;
        double m01 = u[5] - level;
        double bx = 4 * m01 - u1;
        double by = 4 * m20 - u2;
        double cxx = 2 * u1 - 4 * m01;
        double cyy = 2 * u2 - 4 * m20;
        double cxy = 4 * m12 - 2 * bx - 2 * by - cxx - cyy;
        double det = 4 * cxx * cyy - cxy * cxy;
        double trace = 2 * (cxx + cyy);
        if (det <= FLAT * trace * trace || cxx >= 0) {
            return; // no peak, or a ridge: that is as high where it leaves the triangle
        }
        double xi = (-2 * cyy * bx + cxy * by) / det;
        double eta = (-2 * cxx * by + cxy * bx) / det;
        if (xi > 0 && eta > 0 && xi + eta < 1) {
            double value = level + 0.5 * (bx * xi + by * eta);
            map.moveTo(t);
            double l0 = 1 - xi - eta;
            offer(value, map.x(l0, xi, eta), map.y(l0, xi, eta));
        }
    }

    private void offer(double value, double x, double y) {
        if (value > best) {
            best = value;
            bestX = x;
            bestY = y;
        }
    }
}
