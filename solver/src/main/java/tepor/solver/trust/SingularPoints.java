package tepor.solver.trust;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.LineSegment;
import org.locationtech.jts.index.strtree.STRtree;
import tepor.mesher.section.Section;
import tepor.mesher.section.SegmentCurve;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;

/**
 * The points of a section near which the heat flux varies without limit or nearly so: re-entrant corners, ends of
 * conditions, and corners and junctions of the borders between regions (P. Grisvard, Elliptic Problems in Nonsmooth
 * Domains, 1985).
 */
final class SingularPoints {
    /** A bend below this is part of a curve drawn with short pieces. */
    private static final double BEND = Math.toRadians(30);

    /**
     * One such point.
     *
     * @param x metres
     * @param y metres
     * @param clearance distance to the nearest part of the outline that does not meet in it, metres
     */
    record Point(double x, double y, double clearance) {}

    private final Section section;
    private final int[] condition;
    private final List<List<Integer>> incident = new ArrayList<>();

    private SingularPoints(Case subject) {
        section = subject.section();
        condition = new int[section.segmentCount()];
        int number = 0;
        for (Edge edge : subject.edges()) {
            number++;
            if (!edge.conditions().isEmpty()) {
                for (int s : edge.pieces().segments()) {
                    condition[s] = number;
                }
            }
        }
        for (int v = 0; v < section.vertexCount(); v++) {
            incident.add(new ArrayList<>());
        }
        for (int s = 0; s < section.segmentCount(); s++) {
            if ((section.solidLeft(s) || section.solidRight(s)) && !section.isCut(s)) {
                incident.get(section.start(s)).add(s);
                incident.get(section.end(s)).add(s);
            }
        }
    }

    static List<Point> of(Case subject) {
        return new SingularPoints(subject).find();
    }

    private List<Point> find() {
        STRtree tree = new STRtree();
        for (int s = 0; s < section.segmentCount(); s++) {
            Envelope box = new Envelope(point(section.start(s)), point(section.end(s)));
            tree.insert(box, s);
        }
        List<Point> found = new ArrayList<>();
        for (int v = 0; v < section.vertexCount(); v++) {
            if (isSingular(v)) {
                found.add(new Point(section.x(v), section.y(v), clearance(v, tree)));
            }
        }
        return found;
    }

    private Coordinate point(int v) {
        return new Coordinate(section.x(v), section.y(v));
    }

    private boolean isSingular(int v) {
        List<Integer> segments = incident.get(v);
        if (segments.size() != 2) {
            return segments.size() > 2;
        }
        int s = segments.get(0);
        int r = segments.get(1);
        if (section.isBoundary(s) != section.isBoundary(r)) {
            return true;
        }
        double turn = turn(v, s, r);
        if (!section.isBoundary(s)) {
            return Math.abs(turn) > BEND;
        }
        // turn is positive where the material bends away: an interior angle over 180°
        return turn > BEND || (condition[s] != condition[r] && turn > -Math.toRadians(89));
    }

    /** Interior angle of the material at v less 180°, of the boundary or of the region on the left of s. */
    private double turn(int v, int s, int r) {
        boolean ahead = section.start(s) == v;
        double a = direction(v, s);
        double b = direction(v, r);
        // counter-clockwise from s to r sweeps the left of s when s leaves v, else its right
        double sweep = b - a;
        sweep -= 2 * Math.PI * Math.floor(sweep / (2 * Math.PI));
        boolean sweptIsLeft = ahead;
        boolean solid = sweptIsLeft ? section.solidLeft(s) : section.solidRight(s);
        return (solid ? sweep : 2 * Math.PI - sweep) - Math.PI;
    }

    private double direction(int v, int s) {
        return SegmentCurve.direction(section, s, section.start(s) == v);
    }

    private double clearance(int v, STRtree tree) {
        Coordinate at = point(v);
        double shortest = incident.get(v).stream()
                .map(section::length)
                .min(Comparator.naturalOrder())
                .orElseThrow();
        double least = shortest;
        Envelope box = new Envelope(at);
        box.expandBy(shortest);
        int[] own =
                incident.get(v).stream().mapToInt(Integer::intValue).sorted().toArray();
        for (Object item : tree.query(box)) {
            int s = (Integer) item;
            if (Arrays.binarySearch(own, s) < 0) {
                double distance = new LineSegment(point(section.start(s)), point(section.end(s))).distance(at);
                if (distance > 0) {
                    least = Math.min(least, distance);
                }
            }
        }
        return least;
    }
}
