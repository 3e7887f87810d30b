package tepor.solver.trust;

import java.util.Arrays;
import java.util.PriorityQueue;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleFinder;
import tepor.mesher.refinement.SizeField;

/**
 * Sizes wanted next, known at the corners of the last mesh and linear in between.
 *
 * <p>The size is made to grow no faster than a stated gradation with distance (P.-O. Persson, Mesh size functions for
 * implicit geometries and PDE-based gradient limiting, Engng with Computers 22 (2006) 95–109), by a sweep from the smallest
 * along the sides of the mesh.
 */
public final class MeshSizes implements SizeField {
    private final Mesh mesh;
    private final double[] size;
    private final TriangleFinder finder;
    private final double[] barycentric = new double[3];

    /**
     * @param wanted one size for each triangle, metres
     * @param gradation growth of the size per distance
     */
    public MeshSizes(Mesh mesh, double[] wanted, double gradation) {
        this.mesh = mesh;
        finder = new TriangleFinder(mesh);
        size = new double[mesh.cornerCount()];
        Arrays.fill(size, Double.POSITIVE_INFINITY);
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                int node = mesh.node(t, i);
                size[node] = Math.min(size[node], wanted[t]);
            }
        }
        limitGrowth(gradation);
    }

    private void limitGrowth(double gradation) {
        int[] start = new int[mesh.cornerCount() + 1];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                start[mesh.node(t, i) + 1]++;
            }
        }
        for (int v = 0; v < mesh.cornerCount(); v++) {
            start[v + 1] += start[v];
        }
        int[] next = start.clone();
        int[] around = new int[3 * mesh.triangleCount()];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                around[next[mesh.node(t, i)]++] = t;
            }
        }
        record Entry(double size, int node) {}
        PriorityQueue<Entry> queue =
                new PriorityQueue<>((a, b) -> a.size != b.size ? Double.compare(a.size, b.size) : a.node - b.node);
        for (int v = 0; v < size.length; v++) {
            queue.add(new Entry(size[v], v));
        }
        while (!queue.isEmpty()) {
            Entry entry = queue.poll();
            int v = entry.node;
            if (entry.size > size[v]) {
                continue;
            }
            for (int k = start[v]; k < start[v + 1]; k++) {
                for (int i = 0; i < 3; i++) {
                    int w = mesh.node(around[k], i);
                    double reach = size[v] + gradation * Math.hypot(mesh.x(w) - mesh.x(v), mesh.y(w) - mesh.y(v));
                    if (reach < size[w]) {
                        size[w] = reach;
                        queue.add(new Entry(reach, w));
                    }
                }
            }
        }
    }

    @Override
    public double at(double x, double y) {
        int t = finder.find(x, y, barycentric);
        if (t == Mesh.NONE) {
            return Double.POSITIVE_INFINITY;
        }
        double sum = 0;
        double share = 0; // of all three, more than 1 off the mesh
        for (int i = 0; i < 3; i++) {
            sum += Math.max(0, barycentric[i]) * size[mesh.node(t, i)];
            share += Math.max(0, barycentric[i]);
        }
        return sum / share;
    }
}
