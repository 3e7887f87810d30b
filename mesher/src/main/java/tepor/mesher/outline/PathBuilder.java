package tepor.mesher.outline;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;

/** Puts straight pieces and arcs end to end, and cuts the arcs into equal pieces that turn by 30° at most. */
public final class PathBuilder {
    /** Three points that are off one line by less than this part of their distance are on it. */
    private static final double STRAIGHT = 1e-12;

    private final List<Coordinate> points = new ArrayList<>();
    private final List<Circle> circles = new ArrayList<>();

    /** @param start where the path begins, metres */
    public PathBuilder(Coordinate start) {
        points.add(start.copy());
    }

    /** Where the path stands now. */
    public Coordinate end() {
        return points.get(points.size() - 1);
    }

    /** Number of pieces so far, straight ones and parts of arcs. */
    public int pieceCount() {
        return circles.size();
    }

    /** Goes straight; a point that stands where the path stands already is passed over. */
    public PathBuilder lineTo(Coordinate to) {
        return piece(to, null);
    }

    /**
     * Goes along a circle.
     *
     * @param circle through where the path stands, and through {@code to}
     * @param to where the arc ends; where the path stands for the whole circle
     * @param counterClockwise which way about the centre
     */
    public PathBuilder arcTo(Circle circle, Coordinate to, boolean counterClockwise) {
        Coordinate from = end();
        double start = Math.atan2(from.y - circle.y(), from.x - circle.x());
        double turn = circle.turn(from.x, from.y, to.x, to.y);
        if (counterClockwise && turn <= 0) {
            turn += 2 * Math.PI;
        } else if (!counterClockwise && turn >= 0) {
            turn -= 2 * Math.PI;
        }
        int pieces = Math.max(1, (int) Math.ceil(Math.abs(turn) / Arcs.GREATEST_TURN));
        for (int i = 1; i < pieces; i++) {
            double angle = start + turn * i / pieces;
            Coordinate at = new Coordinate(
                    circle.x() + circle.radius() * Math.cos(angle), circle.y() + circle.radius() * Math.sin(angle));
            piece(at, circle);
        }
        return piece(to, circle);
    }

    /**
     * Goes along the circle through where the path stands and two more points, as in CIRCULARSTRING (ISO/IEC 13249-3:2016):
     * if the path is to end where it stands, {@code through} lies opposite, and the whole circle is meant. Three points on
     * one line make a straight piece.
     */
    public PathBuilder arcThrough(Coordinate through, Coordinate to) {
        Coordinate from = end();
        if (from.equals2D(to)) {
            Circle whole =
                    new Circle(0.5 * (from.x + through.x), 0.5 * (from.y + through.y), 0.5 * from.distance(through));
            return whole.radius() > 0 ? arcTo(whole, to, true) : this;
        }
        Optional<Circle> circle = circle(from, through, to);
        if (circle.isEmpty()) {
            return lineTo(through).lineTo(to);
        }
        return arcTo(asBefore(circle.get()), to, cross(from, through, to) > 0);
    }

    /** The circle of the piece before where that is the same but for round-off: halves of one circle then share it. */
    private Circle asBefore(Circle circle) {
        Circle before = circles.isEmpty() ? null : circles.get(circles.size() - 1);
        boolean same = before != null
                && Math.hypot(before.x() - circle.x(), before.y() - circle.y()) <= STRAIGHT * circle.radius()
                && Math.abs(before.radius() - circle.radius()) <= STRAIGHT * circle.radius();
        return same ? before : circle;
    }

    /** Goes along an arc given by its bulge: the tangent of a quarter of its turn, positive counter-clockwise; 0 is straight. */
    public PathBuilder bulgeTo(double bulge, Coordinate to) {
        Coordinate from = end();
        if (bulge == 0 || from.equals2D(to)) {
            return lineTo(to);
        }
        double dx = to.x - from.x;
        double dy = to.y - from.y;
        // From the chord's middle to the centre, to the left of the chord, in chords.
        double toCentre = (1 - bulge * bulge) / (4 * bulge);
        double radius = Math.hypot(dx, dy) * (1 + bulge * bulge) / (4 * Math.abs(bulge));
        Circle circle =
                new Circle(0.5 * (from.x + to.x) - toCentre * dy, 0.5 * (from.y + to.y) + toCentre * dx, radius);
        return arcTo(circle, to, bulge > 0);
    }

    /** A whole circle as a ring, counter-clockwise from its right. */
    public static LinearRing ring(Circle circle, GeometryFactory factory) {
        Coordinate right = new Coordinate(circle.x() + circle.radius(), circle.y());
        return new PathBuilder(right).arcTo(circle, right, true).ring(factory);
    }

    /** The path as a line string, an {@link ArcLine} where it has arcs. */
    public LineString line(GeometryFactory factory) {
        Coordinate[] xy = points.toArray(new Coordinate[0]);
        return isStraight() ? factory.createLineString(xy) : new ArcLine(xy, circles(), factory);
    }

    /** The path as a ring, an {@link ArcRing} where it has arcs; it must end where it began. */
    public LinearRing ring(GeometryFactory factory) {
        halveArcsOfTwoPieces();
        Coordinate[] xy = points.toArray(new Coordinate[0]);
        return isStraight() ? factory.createLinearRing(xy) : new ArcRing(xy, circles(), factory);
    }

    // To JTS a ring of two chords would enclose nothing.
    private void halveArcsOfTwoPieces() {
        for (int i = circles.size() - 1; i >= 0 && points.size() < 5; i--) {
            if (circles.get(i) != null) {
                Coordinate a = points.get(i);
                Coordinate b = points.get(i + 1);
                points.add(i + 1, circles.get(i).middle(a.x, a.y, b.x, b.y));
                circles.add(i, circles.get(i));
            }
        }
    }

    private boolean isStraight() {
        return circles.stream().allMatch(Objects::isNull);
    }

    private Circle[] circles() {
        return circles.toArray(new Circle[0]);
    }

    private PathBuilder piece(Coordinate to, Circle circle) {
        if (!to.equals2D(end())) {
            points.add(to.copy());
            circles.add(circle);
        }
        return this;
    }

    private static double cross(Coordinate a, Coordinate b, Coordinate c) {
        return (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x);
    }

    /** The circle through three points; empty where they lie on one line. */
    public static Optional<Circle> circle(Coordinate a, Coordinate b, Coordinate c) {
        double bx = b.x - a.x;
        double by = b.y - a.y;
        double cx = c.x - a.x;
        double cy = c.y - a.y;
        double bb = bx * bx + by * by;
        double cc = cx * cx + cy * cy;
        double twice = 2 * (bx * cy - by * cx);
        if (Math.abs(twice) <= STRAIGHT * Math.max(bb, cc)) {
            return Optional.empty();
        }
        double ux = (cy * bb - by * cc) / twice;
        double uy = (bx * cc - cx * bb) / twice;
        return Optional.of(new Circle(a.x + ux, a.y + uy, Math.hypot(ux, uy)));
    }
}
