package tepor.solver.answer;

import java.util.BitSet;
import java.util.List;
import java.util.function.BooleanSupplier;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.mesh.Mesher;
import tepor.mesher.mesh.TriangleFinder;
import tepor.mesher.refinement.SizeField;
import tepor.solver.field.Solution;
import tepor.solver.model.Case;
import tepor.solver.trust.AskedSizes;
import tepor.solver.trust.ErrorIndicator;
import tepor.solver.trust.FirstSizes;
import tepor.solver.trust.MeshSizes;
import tepor.solver.trust.SizePlanner;

/** Makes the meshes of a case: the first from the section alone, each further one from the solutions on the last. */
final class MeshFinder {
    /** Growth of the number of triangles from round to round: where nothing is known, far from and near the tolerance. */
    private static final double GROWTH_FIRST = 2;

    /** A first mesh of more triangles than this has them because the outline is rich in detail, not by choice. */
    private static final int RICH = 3000;

    private static final double GROWTH_FAR = 4;
    private static final double GROWTH_MIDDLE = 2.2;
    private static final double GROWTH_NEAR = 1.5;

    /** Triangles about a place asked for shrink to this share of their size at least. */
    private static final double SHARPEN = 0.4;

    /** Growth of the size per distance. */
    private static final double GRADATION = 0.5;

    /**
     * The mesher takes a size for the longest side wanted; its triangles' sides come out shorter, and where sizes vary from
     * corner to corner shorter still: by this much in all, measured on the samples.
     */
    private static final double LONGEST_TO_MEAN = 2.1;

    private final Case subject;
    private final BooleanSupplier stopped;
    private final AskedSizes asked;
    private double seconds;

    MeshFinder(Case subject, BooleanSupplier stopped) {
        this.subject = subject;
        this.stopped = stopped;
        asked = new AskedSizes(subject);
    }

    MeshResult first() {
        return mesh(new FirstSizes(subject));
    }

    /**
     * The next mesh.
     *
     * @param solutions those on the last mesh; each counts the same
     * @param widest mesh error of the ask that is worst off, relative to its tolerance; NaN where none is known
     * @param places of the asks that look at a point (x and y, metres): there the mesh is made finer in any case
     * @return null where the element limit leaves no room for a mesh worth having
     */
    MeshResult next(Mesh last, List<Solution> solutions, double widest, List<double[]> places) {
        double room = 0.9 * subject.mesh().trianglesAtMost() / last.triangleCount();
        double growth = Math.min(growth(widest, last.triangleCount()), room);
        if (growth < 1.3) {
            return null;
        }
        double[] squared = new double[last.triangleCount()];
        for (Solution solution : solutions) {
            double[] own = ErrorIndicator.squared(solution.balance(), solution.field());
            double sum = 0;
            for (double e : own) {
                sum += e;
            }
            for (int t = 0; sum > 0 && t < own.length; t++) {
                squared[t] += own[t] / sum;
            }
        }
        double[] sizes = SizePlanner.plan(last, squared, growth);
        sharpen(last, sizes, places);
        for (int t = 0; t < sizes.length; t++) {
            sizes[t] *= LONGEST_TO_MEAN;
        }
        return mesh(new MeshSizes(last, sizes, GRADATION));
    }

    /**
     * Shrinks the triangles about each place. A temperature in a corner moves only as the triangles there shrink: left as
     * they are, it would stand still and look exact.
     */
    private static void sharpen(Mesh mesh, double[] sizes, List<double[]> places) {
        TriangleFinder finder = new TriangleFinder(mesh);
        BitSet nodes = new BitSet();
        double[] barycentric = new double[3];
        for (double[] place : places) {
            int triangle = finder.find(place[0], place[1], barycentric);
            for (int i = 0; i < 3 && triangle != Mesh.NONE; i++) {
                nodes.set(mesh.node(triangle, i));
            }
        }
        for (int t = 0; t < sizes.length; t++) {
            if (nodes.get(mesh.node(t, 0)) || nodes.get(mesh.node(t, 1)) || nodes.get(mesh.node(t, 2))) {
                sizes[t] = Math.min(sizes[t], SHARPEN * Math.sqrt(4 / Math.sqrt(3) * mesh.area(t)));
            }
        }
    }

    private static double growth(double widest, int triangles) {
        if (Double.isNaN(widest)) {
            return triangles > RICH ? GROWTH_NEAR : GROWTH_FIRST;
        }
        return widest > 10 ? GROWTH_FAR : widest > 0.5 ? GROWTH_MIDDLE : GROWTH_NEAR;
    }

    private MeshResult mesh(SizeField sizes) {
        long t0 = System.nanoTime();
        MeshResult result = Mesher.mesh(
                subject.section(),
                new MeshOptions(
                        subject.mesh().smallestAngle(),
                        SizeField.least(asked, sizes),
                        subject.mesh().trianglesAtMost(),
                        subject.mesh().nodesPerTriangle()),
                stopped);
        seconds += 1e-9 * (System.nanoTime() - t0);
        return result;
    }

    /** What all meshes so far took. */
    double seconds() {
        return seconds;
    }
}
