package tepor.mesher.mending;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.locationtech.jts.algorithm.locate.SimplePointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.util.PolygonExtracter;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.locationtech.jts.operation.polygonize.Polygonizer;
import org.locationtech.jts.operation.valid.IsSimpleOp;
import tepor.mesher.section.ArcCutter;

/**
 * Makes the area that a faulty outline means: whatever a ring goes around, in whichever direction and however often (the
 * non-zero rule), less whatever its holes go around, all pieces joined.
 */
final class AreaMender {
    private final double snap;

    /** @param snap what is thinner is dropped, metres */
    AreaMender(double snap) {
        this.snap = snap;
    }

    /** The area as a Polygon or MultiPolygon that is sound; empty where the outline encloses nothing. */
    Geometry mend(Geometry outline) {
        Geometry finer = ArcCutter.cut(List.of(outline), snap).get(0);
        List<Geometry> pieces = new ArrayList<>();
        for (int i = 0; i < finer.getNumGeometries(); i++) {
            pieces.add(piece((Polygon) finer.getGeometryN(i)));
        }
        Geometry all = OverlayNGRobust.union(pieces);
        List<Polygon> thick = new ArrayList<>();
        for (Object item : PolygonExtracter.getPolygons(all)) {
            Polygon polygon = (Polygon) item;
            if (polygon.getArea() > 0.5 * snap * polygon.getLength()) {
                thick.add(polygon);
            }
        }
        GeometryFactory factory = outline.getFactory();
        Geometry area = thick.size() == 1 ? thick.get(0) : factory.createMultiPolygon(thick.toArray(new Polygon[0]));
        return new ArcRecovery(List.of(outline), List.of(finer), snap).recover(area);
    }

    private static Geometry piece(Polygon polygon) {
        Geometry shell = fill(polygon.getExteriorRing());
        List<Geometry> holes = new ArrayList<>();
        for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
            holes.add(fill(polygon.getInteriorRingN(h)));
        }
        // Where a "hole" goes around the "outer ring", the two have changed places.
        for (int h = 0; h < holes.size(); h++) {
            boolean around = !shell.isEmpty()
                    && holes.get(h).getEnvelopeInternal().contains(shell.getEnvelopeInternal())
                    && overlay(shell, holes.get(h), OverlayNG.DIFFERENCE).isEmpty()
                    && holes.get(h).getArea() > shell.getArea();
            if (around) {
                Geometry inner = shell;
                shell = holes.set(h, inner);
            }
        }
        for (Geometry hole : holes) {
            shell = overlay(shell, hole, OverlayNG.DIFFERENCE);
        }
        return shell;
    }

    /** What a ring goes around. */
    static Geometry fill(LinearRing ring) {
        GeometryFactory factory = ring.getFactory();
        if (new IsSimpleOp(ring).isSimple()) {
            return factory.createPolygon(ring.getCoordinates());
        }
        Geometry lines =
                OverlayNGRobust.overlay(factory.createLineString(ring.getCoordinates()), null, OverlayNG.UNION);
        Polygonizer polygonizer = new Polygonizer();
        polygonizer.add(lines);
        List<Geometry> filled = new ArrayList<>(List.of(factory.createPolygon()));
        Collection<?> faces = polygonizer.getPolygons();
        for (Object item : faces) {
            Polygon face = (Polygon) item;
            Coordinate inside = face.getInteriorPoint().getCoordinate();
            boolean within = SimplePointInAreaLocator.locate(inside, face) == Location.INTERIOR;
            if (within && winding(ring.getCoordinates(), inside) != 0) {
                filled.add(face);
            }
        }
        return OverlayNGRobust.union(filled);
    }

    /** How often a ring goes around a point, counter-clockwise. */
    private static int winding(Coordinate[] ring, Coordinate point) {
        int winding = 0;
        for (int i = 0; i + 1 < ring.length; i++) {
            Coordinate a = ring[i];
            Coordinate b = ring[i + 1];
            double side = (b.x - a.x) * (point.y - a.y) - (b.y - a.y) * (point.x - a.x);
            if (a.y <= point.y && b.y > point.y && side > 0) {
                winding++;
            } else if (a.y > point.y && b.y <= point.y && side < 0) {
                winding--;
            }
        }
        return winding;
    }

    private static Geometry overlay(Geometry a, Geometry b, int operation) {
        return OverlayNGRobust.overlay(a, b, operation);
    }
}
