package tepor.mesher.mending;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import tepor.mesher.outline.ArcRing;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;

/** A ring that can be changed: points, each with the circle of the piece to the following one (null where straight). */
final class RingPath {
    private final List<Coordinate> points = new ArrayList<>();
    private final List<Circle> circles = new ArrayList<>();

    RingPath() {}

    RingPath(LinearRing ring) {
        Coordinate[] closed = ring.getCoordinates();
        for (int i = 0; i + 1 < closed.length; i++) {
            add(closed[i], Arcs.circle(ring, i));
        }
    }

    int size() {
        return points.size();
    }

    int next(int i) {
        return i + 1 < points.size() ? i + 1 : 0;
    }

    int previous(int i) {
        return i > 0 ? i - 1 : points.size() - 1;
    }

    Coordinate point(int i) {
        return points.get(i);
    }

    /** Circle of the piece from point i to the next; null where it is straight. */
    Circle circle(int i) {
        return circles.get(i);
    }

    /** Adds a point at the end, and the circle of the piece that leaves it. */
    void add(Coordinate point, Circle leaving) {
        points.add(point);
        circles.add(leaving);
    }

    void move(int i, Coordinate to) {
        points.set(i, to);
    }

    void bend(int i, Circle circle) {
        circles.set(i, circle);
    }

    /** Puts a point into piece i, behind point i; both parts keep the circle. */
    void insert(int i, Coordinate point) {
        points.add(i + 1, point);
        circles.add(i + 1, circles.get(i));
    }

    /** Takes point i out, and with it the piece that arrives there; the piece that leaves it begins at the point before. */
    void removeArriving(int i) {
        int before = previous(i);
        circles.set(before, circles.get(i));
        points.remove(i);
        circles.remove(i);
    }

    /** Takes point i out, and with it the piece that leaves it; the piece that arrives there ends at the point after. */
    void removeLeaving(int i) {
        points.remove(i);
        circles.remove(i);
    }

    /** The ring; an {@link ArcRing} where it has arcs. It has at least three points. */
    LinearRing ring(GeometryFactory factory) {
        Coordinate[] closed = new Coordinate[points.size() + 1];
        for (int i = 0; i < points.size(); i++) {
            closed[i] = points.get(i).copy();
        }
        closed[points.size()] = closed[0].copy();
        return circles.stream().allMatch(Objects::isNull)
                ? factory.createLinearRing(closed)
                : new ArcRing(closed, circles.toArray(new Circle[0]), factory);
    }
}
