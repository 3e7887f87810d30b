package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import tepor.mesher.section.Section;

/** Measures the angles of a mesh, and tells those the outline imposes from those that were made. */
final class QualityMeasure {
    private static final double SMALL = Math.PI / 3;

    private final Mesh mesh;
    private final Section section;
    private final List<Set<Integer>> segmentsAt = new ArrayList<>();
    private final Set<Long> facetSides = new HashSet<>();

    private QualityMeasure(Mesh mesh, Section section) {
        this.mesh = mesh;
        this.section = section;
        for (int n = 0; n < mesh.cornerCount(); n++) {
            segmentsAt.add(Set.of());
        }
        for (int f = 0; f < mesh.facetCount(); f++) {
            for (int i = 0; i < 2; i++) {
                int n = mesh.facetNode(f, i);
                if (segmentsAt.get(n).isEmpty()) {
                    segmentsAt.set(n, new HashSet<>(4));
                }
                segmentsAt.get(n).add(mesh.facetSegment(f));
            }
            facetSides.add(key(mesh.facetNode(f, 0), mesh.facetNode(f, 1)));
        }
    }

    static MeshQuality measure(Mesh mesh, Section section) {
        return new QualityMeasure(mesh, section).measure();
    }

    private MeshQuality measure() {
        double smallest = Math.PI;
        double smallestMade = Math.PI;
        double largest = 0;
        double[] angle = new double[3];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            double least = Math.PI;
            int leastCorner = 0;
            for (int i = 0; i < 3; i++) {
                angle[i] = angle(t, i);
                largest = Math.max(largest, angle[i]);
                if (angle[i] < least) {
                    least = angle[i];
                    leastCorner = i;
                }
            }
            smallest = Math.min(smallest, least);
            // The shortest side lies opposite the smallest angle.
            if (least < smallestMade && !joinsSmallAngle(t, leastCorner)) {
                for (int i = 0; i < 3; i++) {
                    if (angle[i] < smallestMade && !isBetweenSegments(t, i)) {
                        smallestMade = angle[i];
                    }
                }
            }
        }
        return new MeshQuality(smallest, smallestMade, largest);
    }

    private double angle(int t, int i) {
        int a = mesh.node(t, i);
        int b = mesh.node(t, (i + 1) % 3);
        int c = mesh.node(t, (i + 2) % 3);
        double bx = mesh.x(b) - mesh.x(a);
        double by = mesh.y(b) - mesh.y(a);
        double cx = mesh.x(c) - mesh.x(a);
        double cy = mesh.y(c) - mesh.y(a);
        return Math.atan2(bx * cy - by * cx, bx * cx + by * cy);
    }

    private boolean isBetweenSegments(int t, int i) {
        int a = mesh.node(t, i);
        return facetSides.contains(key(a, mesh.node(t, (i + 1) % 3)))
                && facetSides.contains(key(a, mesh.node(t, (i + 2) % 3)));
    }

    private boolean joinsSmallAngle(int t, int corner) {
        for (int p : segmentsAt.get(mesh.node(t, (corner + 1) % 3))) {
            for (int q : segmentsAt.get(mesh.node(t, (corner + 2) % 3))) {
                if (p != q && meetSmall(p, q)) {
                    return true;
                }
            }
        }
        return false;
    }

    private boolean meetSmall(int p, int q) {
        int apex = section.start(p) == section.start(q) || section.start(p) == section.end(q)
                ? section.start(p)
                : section.end(p) == section.start(q) || section.end(p) == section.end(q) ? section.end(p) : Mesh.NONE;
        if (apex == Mesh.NONE) {
            return false;
        }
        int a = section.start(p) == apex ? section.end(p) : section.start(p);
        int b = section.start(q) == apex ? section.end(q) : section.start(q);
        double ax = section.x(a) - section.x(apex);
        double ay = section.y(a) - section.y(apex);
        double bx = section.x(b) - section.x(apex);
        double by = section.y(b) - section.y(apex);
        return Math.abs(Math.atan2(ax * by - ay * bx, ax * bx + ay * by)) < SMALL;
    }

    private static long key(int a, int b) {
        return (long) Math.max(a, b) << 32 | Math.min(a, b);
    }
}
