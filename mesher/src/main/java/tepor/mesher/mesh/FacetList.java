package tepor.mesher.mesh;

import java.util.Arrays;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Triangulation;

/** The constrained sides of a triangulation, segment by segment, each segment's from its start to its end. */
final class FacetList {
    private final int[] segment;
    private final int[] left;
    private final int[] right;

    private FacetList(int[] segment, int[] left, int[] right) {
        this.segment = segment;
        this.left = left;
        this.right = right;
    }

    static FacetList of(Triangulation mesh, Section section) {
        int[] sides = facetSides(mesh);
        double[] along = new double[sides.length];
        Integer[] order = new Integer[sides.length];
        for (int f = 0; f < order.length; f++) {
            along[f] = distanceAlong(mesh, section, sides[f]);
            order[f] = f;
        }
        Arrays.sort(order, (a, b) -> {
            int bySegment = Integer.compare(mesh.constraint(sides[a]) / 2, mesh.constraint(sides[b]) / 2);
            return bySegment != 0 ? bySegment : Double.compare(along[a], along[b]);
        });
        int[] segment = new int[order.length];
        int[] left = new int[order.length];
        int[] right = new int[order.length];
        for (int f = 0; f < order.length; f++) {
            int side = sides[order[f]];
            boolean runsAlong = mesh.constraint(side) % 2 == 0;
            segment[f] = mesh.constraint(side) / 2;
            left[f] = runsAlong ? side : mesh.twin(side);
            right[f] = runsAlong ? mesh.twin(side) : side;
        }
        return new FacetList(segment, left, right);
    }

    // One side for each facet: that on the left of the segment if there is a triangle, else that on the right.
    private static int[] facetSides(Triangulation mesh) {
        int[] sides = new int[256];
        int count = 0;
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            int code = mesh.constraint(side);
            if (code >= 0 && (code % 2 == 0 || mesh.twin(side) < 0)) {
                if (count == sides.length) {
                    sides = Arrays.copyOf(sides, 2 * count);
                }
                sides[count++] = side;
            }
        }
        return Arrays.copyOf(sides, count);
    }

    private static double distanceAlong(Triangulation mesh, Section section, int side) {
        int segment = mesh.constraint(side) / 2;
        int a = section.start(segment);
        int b = section.end(segment);
        int p = mesh.origin(side);
        int q = mesh.destination(side);
        double x = 0.5 * (mesh.x(p) - section.x(a)) + 0.5 * (mesh.x(q) - section.x(a));
        double y = 0.5 * (mesh.y(p) - section.y(a)) + 0.5 * (mesh.y(q) - section.y(a));
        return x * (section.x(b) - section.x(a)) + y * (section.y(b) - section.y(a));
    }

    int count() {
        return segment.length;
    }

    /** Segment of each facet. */
    int[] segments() {
        return segment;
    }

    /** Side of the triangle on the left of the facet, or {@link Triangulation#NONE}. */
    int leftSide(int facet) {
        return left[facet];
    }

    /** Side of the triangle on the right of the facet, or {@link Triangulation#NONE}. */
    int rightSide(int facet) {
        return right[facet];
    }
}
