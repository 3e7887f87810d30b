package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.index.strtree.STRtree;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.locationtech.jts.operation.valid.IsValidOp;
import org.locationtech.jts.operation.valid.TopologyValidationError;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/**
 * Finds what is wrong with a region's outline on its own.
 *
 * <p>First each ring by itself, then, if all are sound, rings and pieces against each other. Pieces that share a side are
 * let pass (they are one where they meet), though the simple-features standard does not allow them in a MULTIPOLYGON.
 */
public final class OutlineCheck {
    /** Pieces that overlap by less than this share of their size only miss each other by round-off. */
    private static final double NO_OVERLAP = 1e-7;

    private static final int PLACES_AT_MOST = 10;

    private final String name;
    private final Place place;
    private final DrawingUnit unit;
    private final Findings findings;
    private boolean sound = true;

    private OutlineCheck(String name, Place place, DrawingUnit unit, Findings findings) {
        this.name = name;
        this.place = place;
        this.unit = unit;
        this.findings = findings;
    }

    /**
     * Checks one region's polygons: self-crossing, zero area, repeated points, a hole outside its shell, and whatever else
     * makes them invalid.
     *
     * @param name the region's name
     * @param polygons its geometry, metres
     * @param place where it is written
     * @param unit the drawing's unit, for coordinates in messages
     * @param findings takes every fault found
     * @return whether it is sound enough to build a section from
     */
    public static boolean check(String name, Geometry polygons, Place place, DrawingUnit unit, Findings findings) {
        return new OutlineCheck(name, place, unit, findings).check(polygons);
    }

    private boolean check(Geometry polygons) {
        List<Polygon> pieces = new ArrayList<>();
        for (int i = 0; i < polygons.getNumGeometries(); i++) {
            Geometry piece = polygons.getGeometryN(i);
            if (!(piece instanceof Polygon polygon) || piece.isEmpty()) {
                fault(
                        "no-polygon",
                        "is drawn by something that encloses no area",
                        "draw it as POLYGON or MULTIPOLYGON");
                return false;
            }
            pieces.add(polygon);
        }
        if (pieces.isEmpty()) {
            fault("no-polygon", "has no outline", "draw it as POLYGON or MULTIPOLYGON");
            return false;
        }
        for (Polygon piece : pieces) {
            checkRings(piece);
        }
        if (sound) {
            pieces.forEach(this::checkHoles);
        }
        if (sound) {
            checkPieces(pieces);
        }
        return sound;
    }

    private void checkRings(Polygon piece) {
        checkRing(piece.getExteriorRing(), piece.getExteriorRing().getCoordinate());
        for (int h = 0; h < piece.getNumInteriorRing(); h++) {
            checkRing(piece.getInteriorRingN(h), piece.getInteriorRingN(h).getCoordinate());
        }
    }

    private void checkRing(LinearRing ring, Coordinate first) {
        for (Coordinate c : ring.getCoordinates()) {
            if (!Double.isFinite(c.x) || !Double.isFinite(c.y)) {
                fault("not-finite", "has a coordinate that is no finite number", "write finite numbers");
                return;
            }
        }
        RingCheck check = new RingCheck(ring);
        if (!check.repeated().isEmpty()) {
            findings.warning(
                    "repeated-point",
                    place,
                    "region '" + name + "' has repeated points: " + places(check.repeated()),
                    "write each point once; the repetition is passed over");
        }
        if (check.isFlat()) {
            String where = unit.point(first.x, first.y);
            fault("zero-area", "has a ring without area, beginning at " + where, "give it a width, or leave it out");
            return;
        }
        faults("self-crossing", "crosses itself at ", check.crossings(), "draw it so that its sides do not cross");
        faults(
                "spike",
                "turns back upon itself at ",
                check.spikes(),
                "take the spike's point out: it encloses nothing");
        if (check.spikes().isEmpty()) {
            faults("self-overlap", "runs over its own line between ", check.overlaps(), "draw each side once");
            faults(
                    "self-touching",
                    "touches itself at ",
                    check.touches(),
                    "draw what is enclosed as a hole of its own, or the parts as pieces of a MULTIPOLYGON");
        }
    }

    private void checkHoles(Polygon piece) {
        Polygon shell = piece.getFactory().createPolygon(piece.getExteriorRing());
        List<Polygon> holes = new ArrayList<>();
        for (int h = 0; h < piece.getNumInteriorRing(); h++) {
            Polygon hole = piece.getFactory().createPolygon(piece.getInteriorRingN(h));
            Geometry outside = overlay(hole, shell, OverlayNG.DIFFERENCE);
            if (isThick(outside, hole)) {
                Coordinate at = outside.getInteriorPoint().getCoordinate();
                String how = overlay(hole, shell, OverlayNG.INTERSECTION).getArea() > 0 ? "partly" : "wholly";
                fault(
                        "hole-outside",
                        "has a hole that lies " + how + " outside it, at " + unit.point(at.x, at.y),
                        "keep holes within the outer ring, or draw the notch into the outer ring itself");
            }
            holes.add(hole);
        }
        overlaps(holes, "hole-overlap", "has holes that overlap", "join them to one hole");
        if (sound) {
            TopologyValidationError error = new IsValidOp(piece).getValidationError();
            if (error != null) {
                faultOfLibrary(error);
            }
        }
    }

    private void faultOfLibrary(TopologyValidationError error) {
        Coordinate at = error.getCoordinate();
        String where = unit.point(at.x, at.y);
        if (error.getErrorType() == TopologyValidationError.DISCONNECTED_INTERIOR) {
            fault(
                    "falls-apart",
                    "is cut in parts by holes that touch its outer ring or each other, at " + where,
                    "draw the parts as pieces of a MULTIPOLYGON");
        } else {
            fault(
                    "hole-at-side",
                    "has a hole that shares a side with the outer ring or another hole, at " + where,
                    "draw the notch into the outer ring, or join the holes");
        }
    }

    private void checkPieces(List<Polygon> pieces) {
        overlaps(
                pieces, "piece-overlap", "has pieces that overlap", "join them to one piece, or make them two regions");
    }

    private void overlaps(List<Polygon> polygons, String code, String what, String remedy) {
        STRtree index = new STRtree();
        for (int i = 0; i < polygons.size(); i++) {
            index.insert(polygons.get(i).getEnvelopeInternal(), i);
        }
        for (int i = 0; i < polygons.size() && polygons.size() > 1; i++) {
            List<?> near = index.query(polygons.get(i).getEnvelopeInternal());
            for (Object item : near) {
                int j = (Integer) item;
                if (j > i) {
                    Geometry common = overlay(polygons.get(i), polygons.get(j), OverlayNG.INTERSECTION);
                    if (isThick(common, polygons.get(j))) {
                        Coordinate at = common.getInteriorPoint().getCoordinate();
                        fault(code, what + " at " + unit.point(at.x, at.y), remedy);
                    }
                }
            }
        }
    }

    private static Geometry overlay(Geometry a, Geometry b, int operation) {
        return OverlayNGRobust.overlay(a, b, operation);
    }

    /** Whether a geometry has an area that is more than a round-off's breadth along the border of a reference. */
    private static boolean isThick(Geometry geometry, Geometry reference) {
        return geometry.getDimension() == 2
                && geometry.getArea()
                        > NO_OVERLAP
                                * geometry.getLength()
                                * reference.getEnvelopeInternal().getDiameter();
    }

    private void faults(String code, String what, Collection<Coordinate> where, String remedy) {
        if (!where.isEmpty()) {
            fault(code, what + places(where), remedy);
        }
    }

    private String places(Collection<Coordinate> where) {
        List<String> shown = where.stream()
                .limit(PLACES_AT_MOST)
                .map(c -> unit.point(c.x, c.y))
                .toList();
        int more = where.size() - shown.size();
        return String.join(", ", shown) + (more > 0 ? " and " + more + " more places" : "");
    }

    private void fault(String code, String what, String remedy) {
        sound = false;
        findings.error(code, place, "region '" + name + "' " + what, remedy);
    }
}
