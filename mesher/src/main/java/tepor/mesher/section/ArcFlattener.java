package tepor.mesher.section;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;

/** Puts short chords in place of arcs, for questions that JTS answers for straight pieces only. */
final class ArcFlattener {
    /** However fine the tolerance, an arc of 30° takes no more chords. */
    private static final int MOST = 1024;

    private final double tolerance;
    private final GeometryFactory factory = new GeometryFactory();

    /** @param tolerance greatest distance of a chord from its arc, metres */
    ArcFlattener(double tolerance) {
        this.tolerance = tolerance;
    }

    /** Polygons with their rings of straight pieces. */
    Geometry flatten(Geometry polygons) {
        Polygon[] flat = new Polygon[polygons.getNumGeometries()];
        for (int i = 0; i < flat.length; i++) {
            Polygon polygon = (Polygon) polygons.getGeometryN(i);
            LinearRing[] holes = new LinearRing[polygon.getNumInteriorRing()];
            for (int h = 0; h < holes.length; h++) {
                holes[h] = factory.createLinearRing(points(polygon.getInteriorRingN(h)));
            }
            flat[i] = factory.createPolygon(factory.createLinearRing(points(polygon.getExteriorRing())), holes);
        }
        return flat.length == 1 ? flat[0] : factory.createMultiPolygon(flat);
    }

    private Coordinate[] points(LineString line) {
        List<Coordinate> points = new ArrayList<>();
        points.add(line.getCoordinateN(0));
        for (int i = 0; i + 1 < line.getNumPoints(); i++) {
            append(points, line.getCoordinateN(i + 1), Arcs.circle(line, i));
        }
        return points.toArray(new Coordinate[0]);
    }

    /** One piece as a line; straight where the circle is null. */
    LineString piece(Coordinate from, Coordinate to, Circle circle) {
        List<Coordinate> points = new ArrayList<>();
        points.add(from);
        append(points, to, circle);
        return factory.createLineString(points.toArray(new Coordinate[0]));
    }

    private void append(List<Coordinate> points, Coordinate to, Circle circle) {
        Coordinate from = points.get(points.size() - 1);
        if (circle != null) {
            double turn = circle.turn(from.x, from.y, to.x, to.y);
            // A chord that turns by a is off its arc by r (1 - cos(a/2)), about r a²/8.
            double step = Math.sqrt(8 * tolerance / circle.radius());
            int count = (int) Math.min(MOST, Math.ceil(Math.abs(turn) / step));
            double start = Math.atan2(from.y - circle.y(), from.x - circle.x());
            for (int i = 1; i < count; i++) {
                double angle = start + turn * i / count;
                points.add(new Coordinate(
                        circle.x() + circle.radius() * Math.cos(angle),
                        circle.y() + circle.radius() * Math.sin(angle)));
            }
        }
        points.add(to);
    }
}
