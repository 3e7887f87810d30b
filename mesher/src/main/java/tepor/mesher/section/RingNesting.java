package tepor.mesher.section;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.locationtech.jts.algorithm.RobustLineIntersector;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.index.hprtree.HPRtree;
import org.locationtech.jts.index.strtree.STRtree;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;

/** Which of several polygons, each sound by itself, meet in their borders, and which lie within each other. */
final class RingNesting {
    private static final double ARC_TOLERANCE = 1e-6;

    /** Two polygons that may have something in common. */
    record Pair(int first, int second, boolean meet) {}

    private final List<Polygon> polygons;
    private final IndexedPointInAreaLocator[] locators;
    private final Set<Long> meeting = new HashSet<>();

    RingNesting(List<Polygon> polygons) {
        this.polygons = polygons;
        this.locators = new IndexedPointInAreaLocator[polygons.size()];
        findMeetings();
    }

    private void findMeetings() {
        List<Coordinate[]> rings = new ArrayList<>();
        List<Integer> owner = new ArrayList<>();
        HPRtree index = new HPRtree();
        for (int p = 0; p < polygons.size(); p++) {
            addRing(polygons.get(p).getExteriorRing(), p, rings, owner, index);
            for (int h = 0; h < polygons.get(p).getNumInteriorRing(); h++) {
                addRing(polygons.get(p).getInteriorRingN(h), p, rings, owner, index);
            }
        }
        if (polygons.size() < 2) {
            return;
        }
        RobustLineIntersector intersector = new RobustLineIntersector();
        for (int r = 0; r < rings.size(); r++) {
            Coordinate[] ring = rings.get(r);
            int own = owner.get(r);
            for (int i = 0; i + 1 < ring.length; i++) {
                Coordinate a = ring[i];
                Coordinate b = ring[i + 1];
                index.query(new Envelope(a, b), item -> {
                    int[] other = (int[]) item;
                    int otherOwner = owner.get(other[0]);
                    if (otherOwner > own && !meeting.contains(key(own, otherOwner))) {
                        Coordinate[] that = rings.get(other[0]);
                        intersector.computeIntersection(a, b, that[other[1]], that[other[1] + 1]);
                        if (intersector.hasIntersection()) {
                            meeting.add(key(own, otherOwner));
                        }
                    }
                });
            }
        }
    }

    private static void addRing(
            LinearRing ring, int polygon, List<Coordinate[]> rings, List<Integer> owner, HPRtree index) {
        Coordinate[] points = ring.getCoordinates();
        for (int i = 0; i + 1 < points.length; i++) {
            index.insert(new Envelope(points[i], points[i + 1]), new int[] {rings.size(), i});
        }
        rings.add(points);
        owner.add(polygon);
    }

    private static long key(int i, int j) {
        return ((long) Math.min(i, j) << 32) | Math.max(i, j);
    }

    /** Whether the borders of two polygons touch or cross. */
    boolean meet(int i, int j) {
        return meeting.contains(key(i, j));
    }

    /** Whether the first point of polygon i lies inside polygon j. */
    boolean beginsInside(int i, int j) {
        if (locators[j] == null) {
            locators[j] = new IndexedPointInAreaLocator(polygons.get(j));
        }
        return locators[j].locate(polygons.get(i).getCoordinate()) == Location.INTERIOR;
    }

    /** All pairs whose bounding boxes overlap, the first number the smaller. */
    List<Pair> pairs() {
        List<Pair> pairs = new ArrayList<>();
        if (polygons.size() < 2) {
            return pairs;
        }
        STRtree index = new STRtree();
        for (int i = 0; i < polygons.size(); i++) {
            index.insert(polygons.get(i).getEnvelopeInternal(), i);
        }
        for (int i = 0; i < polygons.size(); i++) {
            for (Object item : index.query(polygons.get(i).getEnvelopeInternal())) {
                int j = (Integer) item;
                if (j > i) {
                    pairs.add(new Pair(i, j, meet(i, j)));
                }
            }
        }
        return pairs;
    }

    /** What two polygons of a pair have in common; null where that is nothing, or a touch without a doubt. */
    Geometry common(Pair pair) {
        if (pair.meet()) {
            return overlay(polygons.get(pair.first()), polygons.get(pair.second()), OverlayNG.INTERSECTION);
        } else if (beginsInside(pair.second(), pair.first())) {
            return overlay(polygons.get(pair.second()), null, OverlayNG.UNION);
        }
        return beginsInside(pair.first(), pair.second())
                ? overlay(polygons.get(pair.first()), null, OverlayNG.UNION)
                : null;
    }

    /** An overlay whose area is that of the arcs, but for a millionth of the polygon's size. */
    static Geometry overlay(Geometry polygon, Geometry other, int operation) {
        ArcFlattener flattener =
                new ArcFlattener(ARC_TOLERANCE * polygon.getEnvelopeInternal().getDiameter());
        return OverlayNGRobust.overlay(
                flattener.flatten(polygon), other == null ? null : flattener.flatten(other), operation);
    }
}
