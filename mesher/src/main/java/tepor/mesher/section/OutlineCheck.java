package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.valid.IsValidOp;
import org.locationtech.jts.operation.valid.TopologyValidationError;
import tepor.mesher.outline.Arcs;
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

    /** Arcs are cut until what is between an arc and its chord is clear, or thinner than this share of the extent. */
    private static final double ARC_TOLERANCE = 1e-7;

    /** Areas that differ by a smaller part are the same, arcs having been cut in chords. */
    private static final double NEARLY_ALL = 1e-4;

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
        if (!pieces.stream().allMatch(this::isFinite)) {
            return false;
        }
        // The chords of arcs may cross where the arcs do not, and the other way round.
        List<Polygon> finer = new ArrayList<>();
        double tolerance = ARC_TOLERANCE * polygons.getEnvelopeInternal().getDiameter();
        ArcCutter.cut(List.<Geometry>copyOf(pieces), tolerance).forEach(p -> finer.add((Polygon) p));
        finer.forEach(this::checkRings);
        if (sound) {
            finer.forEach(this::checkHoles);
        }
        if (sound) {
            checkPieces(finer);
        }
        return sound;
    }

    private boolean isFinite(Polygon piece) {
        for (Coordinate c : piece.getCoordinates()) {
            if (!Double.isFinite(c.x) || !Double.isFinite(c.y)) {
                fault("not-finite", "has a coordinate that is no finite number", "write finite numbers");
                return false;
            }
        }
        return true;
    }

    private void checkRings(Polygon piece) {
        checkRing(piece.getExteriorRing(), piece.getExteriorRing().getCoordinate());
        for (int h = 0; h < piece.getNumInteriorRing(); h++) {
            checkRing(piece.getInteriorRingN(h), piece.getInteriorRingN(h).getCoordinate());
        }
    }

    private void checkRing(LinearRing ring, Coordinate first) {
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
                "turns back upon itself, over " + unit.length(check.spikeLength()) + " at most, at ",
                check.spikes(),
                "take the spike's point out: it encloses nothing");
        if (check.spikes().isEmpty()) {
            faults(
                    "self-overlap",
                    "runs over its own line, over " + unit.length(check.overlapLength()) + ", between ",
                    check.overlaps(),
                    "draw each side once");
            faults(
                    "self-touching",
                    "touches itself at ",
                    check.touches(),
                    "draw what is enclosed as a hole of its own, or the parts as pieces of a MULTIPOLYGON");
        }
    }

    private void checkHoles(Polygon piece) {
        if (piece.getNumInteriorRing() == 0) {
            return;
        }
        List<Polygon> rings = new ArrayList<>();
        rings.add(piece.getFactory().createPolygon(piece.getExteriorRing()));
        for (int h = 0; h < piece.getNumInteriorRing(); h++) {
            rings.add(piece.getFactory().createPolygon(piece.getInteriorRingN(h)));
        }
        RingNesting nesting = new RingNesting(rings);
        for (int h = 1; h < rings.size(); h++) {
            checkWithin(nesting, rings, h);
        }
        for (RingNesting.Pair pair : nesting.pairs()) {
            if (pair.first() > 0) {
                overlap(nesting, rings, pair, "hole-overlap", "has holes that overlap", "join them to one hole");
            }
        }
        if (sound) {
            TopologyValidationError error = new IsValidOp(piece).getValidationError();
            if (error != null) {
                faultOfLibrary(error);
            }
        }
    }

    /** Checks that a hole lies within the outer ring, which is the first. */
    private void checkWithin(RingNesting nesting, List<Polygon> rings, int h) {
        Polygon hole = rings.get(h);
        Geometry outside = hole;
        String how = "wholly";
        if (nesting.meet(0, h)) {
            outside = RingNesting.overlay(hole, rings.get(0), OverlayNG.DIFFERENCE);
            if (!isThick(outside, hole)) {
                return;
            }
            how = outside.getArea() < (1 - NEARLY_ALL) * Arcs.area(hole) ? "partly" : "wholly";
        } else if (nesting.beginsInside(h, 0)) {
            return;
        } else if (nesting.beginsInside(0, h)) {
            Coordinate at = hole.getCoordinate();
            fault(
                    "ring-order",
                    "has its outer ring within a ring drawn as its hole, which begins at " + unit.point(at.x, at.y),
                    "write the outer ring first, its holes after it");
            return;
        }
        Coordinate at = outside.getInteriorPoint().getCoordinate();
        fault(
                "hole-outside",
                "has a hole that lies " + how + " outside it, with " + unit.area(outside.getArea()) + ", at "
                        + unit.point(at.x, at.y),
                "keep holes within the outer ring, or draw the notch into the outer ring itself");
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
        RingNesting nesting = new RingNesting(pieces);
        for (RingNesting.Pair pair : nesting.pairs()) {
            if (pair.meet()) {
                overlap(
                        nesting,
                        pieces,
                        pair,
                        "piece-overlap",
                        "has pieces that overlap",
                        "join them to one piece, or make them two regions");
            } else {
                overlap(
                        nesting,
                        pieces,
                        pair,
                        "piece-nested",
                        "has a piece that lies within another, where they overlap",
                        "draw it as a hole of the other, or leave it out, or make it a region of its own");
            }
        }
    }

    private void overlap(
            RingNesting nesting,
            List<Polygon> polygons,
            RingNesting.Pair pair,
            String code,
            String what,
            String remedy) {
        Geometry common = nesting.common(pair);
        if (common != null && isThick(common, polygons.get(pair.second()))) {
            Coordinate at = common.getInteriorPoint().getCoordinate();
            fault(code, what + " with " + unit.area(common.getArea()) + ", at " + unit.point(at.x, at.y), remedy);
        }
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
