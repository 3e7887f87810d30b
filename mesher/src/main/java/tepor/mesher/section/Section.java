package tepor.mesher.section;

import java.util.List;

/**
 * The planar graph which the outlines make once overlaps are resolved: every border stands once, and knows what lies on
 * its left and right.
 *
 * <p>Vertices are numbered from 0 to {@link #vertexCount()} − 1, segments from 0 to {@link #segmentCount()} − 1. A segment
 * is straight and runs from {@link #start} to {@link #end}; no segment crosses or touches another except at a common
 * vertex, and none has the same region on both sides, or emptiness on both sides. Left and right are seen in the
 * segment's direction. Immutable.
 */
public final class Section {
    /** What lies beside a segment where no region does. */
    public static final int NONE = -1;

    private final double[] xy;
    private final int[] ends;
    private final int[] sides;
    private final boolean[] outer;
    private final List<String> regionNames;
    private final boolean[] hole;
    private final double snap;

    /**
     * @param xy 2·vertexCount coordinates, metres
     * @param ends 2·segmentCount vertices: start and end of each segment
     * @param sides 2·segmentCount regions: left and right of each segment; {@link #NONE} where there is none
     * @param outer for each segment, whether it lies on the outer boundary (emptiness joined to the far outside)
     * @param regionNames names of all regions in the order they are laid, those of nothing among them
     * @param hole for each region, whether it is of nothing
     * @param snap distance below which two points are one, metres
     */
    public Section(
            double[] xy,
            int[] ends,
            int[] sides,
            boolean[] outer,
            List<String> regionNames,
            boolean[] hole,
            double snap) {
        this.xy = xy.clone();
        this.ends = ends.clone();
        this.sides = sides.clone();
        this.outer = outer.clone();
        this.regionNames = List.copyOf(regionNames);
        this.hole = hole.clone();
        this.snap = snap;
    }

    public int vertexCount() {
        return xy.length / 2;
    }

    /** Metres. */
    public double x(int vertex) {
        return xy[2 * vertex];
    }

    /** Metres. */
    public double y(int vertex) {
        return xy[2 * vertex + 1];
    }

    public int segmentCount() {
        return ends.length / 2;
    }

    public int start(int segment) {
        return ends[2 * segment];
    }

    public int end(int segment) {
        return ends[2 * segment + 1];
    }

    /** Region on the left of the segment (a region of nothing, too), or {@link #NONE}. */
    public int left(int segment) {
        return sides[2 * segment];
    }

    /** Region on the right of the segment (a region of nothing, too), or {@link #NONE}. */
    public int right(int segment) {
        return sides[2 * segment + 1];
    }

    /** Whether there is material on the left of the segment. */
    public boolean solidLeft(int segment) {
        return solid(left(segment));
    }

    /** Whether there is material on the right of the segment. */
    public boolean solidRight(int segment) {
        return solid(right(segment));
    }

    private boolean solid(int region) {
        return region != NONE && !hole[region];
    }

    /** Whether the segment has material on one side only. */
    public boolean isBoundary(int segment) {
        return solidLeft(segment) != solidRight(segment);
    }

    /** Whether the segment lies on the outer boundary, rather than on the boundary of a hole or between regions. */
    public boolean isOuter(int segment) {
        return outer[segment];
    }

    /** Metres. */
    public double length(int segment) {
        return Math.hypot(x(end(segment)) - x(start(segment)), y(end(segment)) - y(start(segment)));
    }

    public int regionCount() {
        return hole.length;
    }

    public String regionName(int region) {
        return regionNames.get(region);
    }

    /** Whether the region is of nothing. */
    public boolean isHole(int region) {
        return hole[region];
    }

    /**
     * What is left of the region once later ones lie over it, m². By the boundary integral over its segments; NaN for a
     * region of nothing that material does not lie all around, as nothing separates it from emptiness elsewhere.
     */
    public double area(int region) {
        // Coordinates are taken relative to one vertex, so that a section far from the origin loses no digits.
        double x0 = x(0);
        double y0 = y(0);
        double twice = 0;
        int[] loose = new int[vertexCount()];
        for (int s = 0; s < segmentCount(); s++) {
            double cross = (x(start(s)) - x0) * (y(end(s)) - y0) - (x(end(s)) - x0) * (y(start(s)) - y0);
            if (left(s) == region) {
                twice += cross;
                loose[start(s)]++;
                loose[end(s)]--;
            } else if (right(s) == region) {
                twice -= cross;
                loose[start(s)]--;
                loose[end(s)]++;
            }
        }
        for (int ends : loose) {
            if (ends != 0) {
                return Double.NaN;
            }
        }
        return 0.5 * twice;
    }

    /** Distance below which two points are one, metres. */
    public double snap() {
        return snap;
    }

    /** Bounding box of the material: least x, least y, greatest x, greatest y, metres. */
    public double[] bounds() {
        double[] box = {
            Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY
        };
        for (int s = 0; s < segmentCount(); s++) {
            if (solidLeft(s) || solidRight(s)) {
                for (int v : new int[] {start(s), end(s)}) {
                    box[0] = Math.min(box[0], x(v));
                    box[1] = Math.min(box[1], y(v));
                    box[2] = Math.max(box[2], x(v));
                    box[3] = Math.max(box[3], y(v));
                }
            }
        }
        return box;
    }

    /** Diagonal of the bounding box of the material, metres: the length to which tolerances refer. */
    public double extent() {
        double[] box = bounds();
        return Math.hypot(box[2] - box[0], box[3] - box[1]);
    }
}
