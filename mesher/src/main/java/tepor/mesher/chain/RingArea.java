package tepor.mesher.chain;

import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.algorithm.RayCrossingCounter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.Circle;

/** What a closed strand encloses, arcs taken as what they are. */
final class RingArea {
    private final Strand ring;
    private final HPRtree index = new HPRtree();
    private final Envelope box;
    private final double area;

    RingArea(Strand ring) {
        this.ring = ring;
        box = ring.box();
        for (int i = 0; i < ring.pieceCount(); i++) {
            index.insert(Strand.box(a(i), b(i), circle(i)), i);
        }
        area = Math.abs(signedArea(ring));
    }

    Strand ring() {
        return ring;
    }

    Envelope box() {
        return box;
    }

    /** Square metres. */
    double area() {
        return area;
    }

    /** Area of a closed strand, positive counter-clockwise, square metres. */
    static double signedArea(Strand ring) {
        Coordinate o = ring.first();
        double sum = 0;
        for (int i = 0; i < ring.pieceCount(); i++) {
            Coordinate a = ring.points().get(i);
            Coordinate b = ring.points().get(i + 1);
            sum += 0.5 * ((a.x - o.x) * (b.y - o.y) - (a.y - o.y) * (b.x - o.x));
            Circle c = ring.circles().get(i);
            if (c != null) {
                double turn = c.turn(a.x, a.y, b.x, b.y);
                sum += 0.5 * c.radius() * c.radius() * (turn - Math.sin(turn));
            }
        }
        return sum;
    }

    /** Whether a point is inside, outside, or within the tolerance (metres) of the border; {@link Location}. */
    int locate(Coordinate p, double tolerance) {
        if (isOnBorder(p, tolerance)) {
            return Location.BOUNDARY;
        }
        RayCrossingCounter counter = new RayCrossingCounter(p);
        boolean[] bulge = {false};
        index.query(new Envelope(p.x, box.getMaxX(), p.y, p.y), item -> {
            int i = (Integer) item;
            counter.countSegment(a(i), b(i));
            bulge[0] ^= isInSegment(i, p);
        });
        boolean inChords = counter.getLocation() != Location.EXTERIOR;
        return inChords ^ bulge[0] ? Location.INTERIOR : Location.EXTERIOR;
    }

    boolean isOnBorder(Coordinate p, double tolerance) {
        boolean[] near = {false};
        Envelope reach = new Envelope(p);
        reach.expandBy(tolerance);
        index.query(reach, item -> near[0] |= isNear((Integer) item, p, tolerance));
        return near[0];
    }

    private boolean isNear(int i, Coordinate p, double tolerance) {
        Circle c = circle(i);
        if (c == null) {
            return Distance.pointToSegment(p, a(i), b(i)) <= tolerance;
        }
        return p.distance(a(i)) <= tolerance
                || p.distance(b(i)) <= tolerance
                || (Math.abs(c.offset(p.x, p.y)) <= tolerance && isBeyondChord(i, c, p));
    }

    /** Whether a point lies between an arc and its chord. */
    private boolean isInSegment(int i, Coordinate p) {
        Circle c = circle(i);
        return c != null && c.offset(p.x, p.y) < 0 && isBeyondChord(i, c, p);
    }

    private boolean isBeyondChord(int i, Circle c, Coordinate p) {
        return side(a(i), b(i), p.x, p.y) * side(a(i), b(i), c.x(), c.y()) < 0;
    }

    private static double side(Coordinate a, Coordinate b, double x, double y) {
        return (b.x - a.x) * (y - a.y) - (b.y - a.y) * (x - a.x);
    }

    private Coordinate a(int i) {
        return ring.points().get(i);
    }

    private Coordinate b(int i) {
        return ring.points().get(i + 1);
    }

    private Circle circle(int i) {
        return ring.circles().get(i);
    }
}
