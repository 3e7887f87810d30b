package tepor.mesher.outline;

import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;

/** Exact areas and lengths of shapes with arcs: those of the chords, and the circular segments over them. */
public final class CurveArea {
    private CurveArea() {}

    /** Area of polygons, m². */
    public static double of(Geometry polygons) {
        double sum = 0;
        for (int i = 0; i < polygons.getNumGeometries(); i++) {
            Polygon polygon = (Polygon) polygons.getGeometryN(i);
            sum += Math.abs(signed(polygon.getExteriorRing()));
            for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
                sum -= Math.abs(signed(polygon.getInteriorRingN(h)));
            }
        }
        return sum;
    }

    private static double signed(LineString ring) {
        Coordinate origin = ring.getCoordinateN(0);
        double sum = 0;
        for (int i = 0; i + 1 < ring.getNumPoints(); i++) {
            Coordinate a = ring.getCoordinateN(i);
            Coordinate b = ring.getCoordinateN(i + 1);
            sum += 0.5 * ((a.x - origin.x) * (b.y - origin.y) - (a.y - origin.y) * (b.x - origin.x));
            Circle circle = Arcs.circle(ring, i);
            if (circle != null) {
                double turn = circle.turn(a.x, a.y, b.x, b.y);
                sum += 0.5 * circle.radius() * circle.radius() * (turn - Math.sin(turn));
            }
        }
        return sum;
    }

    /** Length of line strings, metres. */
    public static double length(Geometry lines) {
        double sum = 0;
        for (int i = 0; i < lines.getNumGeometries(); i++) {
            LineString line = (LineString) lines.getGeometryN(i);
            for (int k = 0; k + 1 < line.getNumPoints(); k++) {
                Circle circle = Arcs.circle(line, k);
                double chord = line.getCoordinateN(k).distance(line.getCoordinateN(k + 1));
                sum += circle == null ? chord : circle.arcLength(chord);
            }
        }
        return sum;
    }
}
