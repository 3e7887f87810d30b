package tepor.mesher.refinement;

import tepor.mesher.triangulation.HilbertOrder;
import tepor.mesher.triangulation.Triangulation;

/**
 * Divides a triangulation that is about to grow many times over into patches, each small enough when grown for the
 * processor's cache to hold it. Refined one after the other, they leave their new triangles side by side in memory.
 */
final class Patches {
    /** Triangles in a grown patch. */
    private static final double GROWN = 32_000;
    /** Area of a triangle as a part of its longest side squared, on average, that refinement makes. */
    private static final double FILLING = 0.22;

    private static final int PATCHES_AT_MOST = Short.MAX_VALUE;

    private Patches() {}

    /** About how many triangles there will be. */
    static double expected(Triangulation mesh, Vertices vertices) {
        double sum = 0;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            sum += expected(mesh, vertices, t);
        }
        return sum;
    }

    /**
     * Gives each vertex its patch.
     *
     * @return number of patches
     */
    static int divide(Triangulation mesh, Vertices vertices) {
        double[] xy = new double[2 * mesh.vertexCount()];
        double[] weight = new double[mesh.vertexCount()];
        for (int v = 0; v < mesh.vertexCount(); v++) {
            xy[2 * v] = mesh.x(v);
            xy[2 * v + 1] = mesh.y(v);
        }
        double all = 0;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            double expected = expected(mesh, vertices, t);
            weight[mesh.apex(3 * t)] += expected;
            all += expected;
        }
        double each = Math.max(GROWN, all / (PATCHES_AT_MOST - 1));
        double before = 0;
        int last = 0;
        for (int v : HilbertOrder.alongCurve(xy)) {
            last = (int) (before / each);
            vertices.setPatch(v, last);
            before += weight[v];
        }
        return last + 1;
    }

    private static double expected(Triangulation mesh, Vertices vertices, int t) {
        int a = mesh.apex(3 * t);
        int b = mesh.apex(3 * t + 1);
        int c = mesh.apex(3 * t + 2);
        double area = 0.5
                * ((mesh.x(b) - mesh.x(a)) * (mesh.y(c) - mesh.y(a))
                        - (mesh.x(c) - mesh.x(a)) * (mesh.y(b) - mesh.y(a)));
        double size = Math.min(vertices.size(a), Math.min(vertices.size(b), vertices.size(c)));
        return Math.max(1, area / (FILLING * size * size));
    }
}
