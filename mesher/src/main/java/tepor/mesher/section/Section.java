package tepor.mesher.section;

import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import tepor.mesher.outline.Circle;

/**
 * The planar graph which the outlines make once overlaps are resolved: every border stands once, and knows what lies on
 * its left and right.
 *
 * <p>Vertices are numbered from 0 to {@link #vertexCount()} − 1, segments from 0 to {@link #segmentCount()} − 1. A segment
 * runs from {@link #start} to {@link #end}, straight or along the shorter arc of its {@link #circle}; no segment crosses or
 * touches another except at a common vertex, and none has emptiness on both sides. Only a {@linkplain #isCut cut} has the
 * same region on both sides. Left and right are seen in the segment's direction. Immutable.
 *
 * <p>The <em>lens</em> of an arc lies between it and its chord. An arc turns by at most 30°, and no vertex lies in its lens,
 * unless the lens is thinner than snap; so the chords of all segments make the same graph as the segments themselves.
 */
public final class Section {
    /** What lies beside a segment where no region does. */
    public static final int NONE = -1;

    private final double[] xy;
    private final int[] ends;
    private final Circle[] circle;
    private final int[] sides;
    private final boolean[] outer;
    private final List<String> regionNames;
    private final boolean[] hole;
    private final double snap;

    /**
     * A section of straight segments.
     *
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
        this(xy, ends, new Circle[ends.length / 2], sides, outer, regionNames, hole, snap);
    }

    /**
     * @param xy 2·vertexCount coordinates, metres
     * @param ends 2·segmentCount vertices: start and end of each segment
     * @param circle for each segment the circle of which it is an arc; null where it is straight
     * @param sides 2·segmentCount regions: left and right of each segment; {@link #NONE} where there is none
     * @param outer for each segment, whether it lies on the outer boundary (emptiness joined to the far outside)
     * @param regionNames names of all regions in the order they are laid, those of nothing among them
     * @param hole for each region, whether it is of nothing
     * @param snap distance below which two points are one, metres
     */
    public Section(
            double[] xy,
            int[] ends,
            Circle[] circle,
            int[] sides,
            boolean[] outer,
            List<String> regionNames,
            boolean[] hole,
            double snap) {
        this.xy = xy.clone();
        this.ends = ends.clone();
        this.circle = circle.clone();
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

    /** Circle of which the segment is an arc; null where it is straight. */
    public Circle circle(int segment) {
        return circle[segment];
    }

    /** Whether any segment is an arc. */
    public boolean hasArcs() {
        return Arrays.stream(circle).anyMatch(Objects::nonNull);
    }

    /** Whether the segment lies within a region: a line made part of the mesh for asks only. */
    public boolean isCut(int segment) {
        return left(segment) == right(segment);
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

    /** Length of the segment, along its arc if it is one, metres. */
    public double length(int segment) {
        double chord = chord(segment);
        return circle[segment] == null ? chord : circle[segment].arcLength(chord);
    }

    /** Distance between the ends of the segment, metres. */
    public double chord(int segment) {
        return Math.hypot(x(end(segment)) - x(start(segment)), y(end(segment)) - y(start(segment)));
    }

    /** Middle of the segment, on its arc if it is one, metres. */
    public Coordinate middle(int segment) {
        int a = start(segment);
        int b = end(segment);
        return circle[segment] == null
                ? new Coordinate(0.5 * (x(a) + x(b)), 0.5 * (y(a) + y(b)))
                : circle[segment].middle(x(a), y(a), x(b), y(b));
    }

    /**
     * Area between the chord of the segment and its arc, m²: positive where the arc lies on the right of the chord (the
     * region on the left gains it), 0 for a straight segment.
     */
    public double lens(int segment) {
        if (circle[segment] == null) {
            return 0;
        }
        int a = start(segment);
        int b = end(segment);
        return circle[segment].lens(x(a), y(a), x(b), y(b));
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
     * What is left of the region once later ones lie over it, m². By the boundary integral over its segments; so a region of
     * nothing has an area only where material lies all around, as nothing separates it from emptiness elsewhere.
     *
     * @return NaN for a region of nothing that is open to the outside or to another such region
     */
    public double area(int region) {
        if (isHole(region) && !isClosed(region)) {
            return Double.NaN;
        }
        // Coordinates are taken relative to one vertex of the region, so that a small one far from the origin loses no
        // digits.
        int base = NONE;
        double twice = 0;
        for (int s = 0; s < segmentCount(); s++) {
            if (isCut(s) || (left(s) != region && right(s) != region)) {
                continue;
            }
            base = base == NONE ? start(s) : base;
            double x0 = x(base);
            double y0 = y(base);
            double cross = (x(start(s)) - x0) * (y(end(s)) - y0) - (x(end(s)) - x0) * (y(start(s)) - y0) + 2 * lens(s);
            twice += left(s) == region ? cross : -cross;
        }
        return 0.5 * twice;
    }

    /** Whether the region's segments make closed loops: as many lead to each vertex as lead away. */
    private boolean isClosed(int region) {
        int[] leaving = new int[vertexCount()];
        for (int s = 0; s < segmentCount(); s++) {
            int sign = isCut(s) ? 0 : left(s) == region ? 1 : right(s) == region ? -1 : 0;
            leaving[start(s)] += sign;
            leaving[end(s)] -= sign;
        }
        return Arrays.stream(leaving).allMatch(n -> n == 0);
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
                Envelope reach = envelope(s);
                box[0] = Math.min(box[0], reach.getMinX());
                box[1] = Math.min(box[1], reach.getMinY());
                box[2] = Math.max(box[2], reach.getMaxX());
                box[3] = Math.max(box[3], reach.getMaxY());
            }
        }
        return box;
    }

    /** Bounding box of a segment, its arc included, metres. */
    public Envelope envelope(int segment) {
        int a = start(segment);
        int b = end(segment);
        return circle[segment] == null
                ? new Envelope(x(a), x(b), y(a), y(b))
                : circle[segment].envelope(x(a), y(a), x(b), y(b));
    }

    /** Diagonal of the bounding box of the material, metres: the length to which tolerances refer. */
    public double extent() {
        double[] box = bounds();
        return Math.hypot(box[2] - box[0], box[3] - box[1]);
    }
}
