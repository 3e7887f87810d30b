package tepor.mesher.outline;

import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;

/**
 * Pieces end to end between points, some of them arcs. An arc piece turns by at most {@link #GREATEST_TURN}; longer arcs
 * are cut into equal pieces when they are read.
 */
public interface Arcs {
    /** By how much one piece turns at most, radians. */
    double GREATEST_TURN = Math.toRadians(30) * (1 + 1e-9);

    /** Circle of the piece from point i to point i + 1; null where it is straight. */
    Circle circle(int piece);

    /** Circle of a piece of any line string or ring; null where it is straight. */
    static Circle circle(LineString line, int piece) {
        return line instanceof Arcs arcs ? arcs.circle(piece) : null;
    }

    /** Area within a closed line, its arcs included, m²: positive where it runs counter-clockwise. */
    static double signedArea(LineString ring) {
        Coordinate[] points = ring.getCoordinates();
        double area = 0;
        for (int i = 1; i < points.length; i++) {
            Coordinate a = points[i - 1];
            Coordinate b = points[i];
            area += 0.5 * ((a.x - points[0].x) * (b.y - points[0].y) - (b.x - points[0].x) * (a.y - points[0].y));
            Circle circle = circle(ring, i - 1);
            if (circle != null) {
                area += circle.lens(a.x, a.y, b.x, b.y);
            }
        }
        return area;
    }

    /** Area of polygons, their arcs included, m². */
    static double area(Geometry polygons) {
        double area = 0;
        for (int i = 0; i < polygons.getNumGeometries(); i++) {
            Polygon polygon = (Polygon) polygons.getGeometryN(i);
            area += Math.abs(signedArea(polygon.getExteriorRing()));
            for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
                area -= Math.abs(signedArea(polygon.getInteriorRingN(h)));
            }
        }
        return area;
    }

    /** The circles, after a look whether each piece has one or null. */
    static Circle[] checked(Coordinate[] points, Circle[] circle) {
        if (circle.length != Math.max(0, points.length - 1)) {
            throw new IllegalArgumentException(
                    points.length + " points make " + (points.length - 1) + " pieces, got " + circle.length);
        }
        return circle.clone();
    }

    /** The circles in opposite order. */
    static Circle[] reversed(Circle[] circle) {
        Circle[] reversed = new Circle[circle.length];
        for (int i = 0; i < circle.length; i++) {
            reversed[i] = circle[circle.length - 1 - i];
        }
        return reversed;
    }
}
