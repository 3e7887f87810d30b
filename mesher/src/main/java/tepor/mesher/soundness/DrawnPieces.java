package tepor.mesher.soundness;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.ArcCutter;
import tepor.mesher.section.RegionShape;

/**
 * The sides of all regions as one list of pieces, each seeing its region on its left; arcs are cut until their chords tell
 * the truth.
 */
public final class DrawnPieces {
    private final List<Coordinate> start = new ArrayList<>();
    private final List<Coordinate> end = new ArrayList<>();
    private final List<Circle> circle = new ArrayList<>();
    private final List<int[]> owner = new ArrayList<>(); // region, polygon within all, ring within all
    private final List<Integer> ringStart = new ArrayList<>();
    private final List<Double> ringLength = new ArrayList<>();
    private int polygons;

    /**
     * @param shapes all regions, each sound by itself
     * @param snap metres
     */
    public DrawnPieces(List<RegionShape> shapes, double snap) {
        List<Geometry> cut =
                ArcCutter.cut(shapes.stream().map(RegionShape::polygons).toList(), snap);
        for (int r = 0; r < cut.size(); r++) {
            for (int i = 0; i < cut.get(r).getNumGeometries(); i++) {
                Polygon polygon = (Polygon) cut.get(r).getGeometryN(i);
                addRing(polygon.getExteriorRing(), r, true);
                for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
                    addRing(polygon.getInteriorRingN(h), r, false);
                }
                polygons++;
            }
        }
        ringStart.add(start.size());
    }

    private void addRing(LinearRing drawn, int region, boolean shell) {
        boolean turn = Orientation.isCCW(drawn.getCoordinates()) != shell;
        LinearRing ring = turn ? drawn.reverse() : drawn;
        Coordinate[] points = ring.getCoordinates();
        int number = ringStart.size();
        ringStart.add(start.size());
        double length = 0;
        for (int i = 0; i + 1 < points.length; i++) {
            if (!points[i].equals2D(points[i + 1])) {
                start.add(points[i]);
                end.add(points[i + 1]);
                circle.add(Arcs.circle(ring, i));
                owner.add(new int[] {region, polygons, number});
                length += points[i].distance(points[i + 1]);
            }
        }
        ringLength.add(length);
    }

    int count() {
        return start.size();
    }

    /** Where a piece starts, metres. */
    public Coordinate start(int piece) {
        return start.get(piece);
    }

    /** Where a piece ends, metres. */
    public Coordinate end(int piece) {
        return end.get(piece);
    }

    double length(int piece) {
        return start.get(piece).distance(end.get(piece));
    }

    /** Circle of a piece; null where it is straight. */
    public Circle circle(int piece) {
        return circle.get(piece);
    }

    /** Region of a piece, by its order. */
    public int region(int piece) {
        return owner.get(piece)[0];
    }

    int polygon(int piece) {
        return owner.get(piece)[1];
    }

    int ring(int piece) {
        return owner.get(piece)[2];
    }

    int ringCount() {
        return ringLength.size();
    }

    /** First piece of a ring; for the number of rings, the number of pieces. */
    int ringStart(int ring) {
        return ringStart.get(ring);
    }

    double ringLength(int ring) {
        return ringLength.get(ring);
    }

    /** The piece behind, along the ring. */
    public int next(int piece) {
        int ring = ring(piece);
        return piece + 1 < ringStart(ring + 1) ? piece + 1 : ringStart(ring);
    }

    /** The piece before, along the ring. */
    public int previous(int piece) {
        int ring = ring(piece);
        return piece > ringStart(ring) ? piece - 1 : ringStart(ring + 1) - 1;
    }

    /** Depth of the lens between an arc and its chord, metres; 0 for a straight piece. */
    double sagitta(int piece) {
        return circle(piece) == null ? 0 : circle(piece).sagitta(length(piece));
    }

    /** Box around a piece, its arc included, and a margin, metres. */
    Envelope envelope(int piece, double margin) {
        Envelope envelope = new Envelope(start.get(piece), end.get(piece));
        envelope.expandBy(margin + sagitta(piece));
        return envelope;
    }

    HPRtree index() {
        HPRtree index = new HPRtree();
        for (int i = 0; i < count(); i++) {
            index.insert(envelope(i, 0), i);
        }
        return index;
    }

    /** Distance of a point from a piece (of its circle, where the point faces the arc), metres. */
    public double distance(Coordinate point, int piece) {
        double along = along(point, piece);
        if (along <= 0 || along >= 1) {
            return Math.min(point.distance(start(piece)), point.distance(end(piece)));
        }
        if (circle(piece) != null) {
            return Math.abs(circle(piece).offset(point.x, point.y));
        }
        return Math.abs(offset(point, piece));
    }

    /** Where a point faces a piece: 0 at its start, 1 at its end. */
    double along(Coordinate point, int piece) {
        Coordinate a = start(piece);
        Coordinate b = end(piece);
        double dx = b.x - a.x;
        double dy = b.y - a.y;
        return ((point.x - a.x) * dx + (point.y - a.y) * dy) / (dx * dx + dy * dy);
    }

    /** Signed distance of a point from the line of a piece's chord, metres: positive on its left. */
    double offset(Coordinate point, int piece) {
        Coordinate a = start(piece);
        Coordinate b = end(piece);
        double dx = b.x - a.x;
        double dy = b.y - a.y;
        return (dx * (point.y - a.y) - dy * (point.x - a.x)) / Math.hypot(dx, dy);
    }
}
