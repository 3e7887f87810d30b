package tepor.mesher.soundness;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import tepor.mesher.section.ArcFlattener;
import tepor.mesher.section.RegionShape;

/** Which regions overlap in part, neither lying wholly over the other. */
final class PartialOverlaps {
    /** How far chords may be off their arcs where an area is computed, in extents. */
    private static final double ARC_TOLERANCE = 1e-6;

    /** Of so many pairs the area in common is computed; the others are only counted. */
    private static final int COMPUTED_AT_MOST = 40;

    /**
     * Two regions that overlap in part.
     *
     * @param first region, by its order
     * @param second a later region
     * @param area that they have in common, m²; NaN where it was not computed
     * @param place in it, metres
     */
    record Overlap(int first, int second, double area, Coordinate place) {}

    private PartialOverlaps() {}

    /**
     * Finds them, from where their borders cross.
     *
     * @param shapes all regions
     * @param pieces their borders
     * @param pairs pieces that come near each other
     * @param closeness overlaps thinner than a gap are left out: they are slivers
     */
    static List<Overlap> find(List<RegionShape> shapes, DrawnPieces pieces, List<NearPair> pairs, Closeness closeness) {
        Map<Long, Coordinate> crossing = new TreeMap<>();
        Set<Long> seen = new HashSet<>();
        for (NearPair pair : pairs) {
            int a = Math.min(pieces.region(pair.p), pieces.region(pair.q));
            int b = Math.max(pieces.region(pair.p), pieces.region(pair.q));
            if (pair.crosses && a != b && seen.add(((long) a << 32) | b)) {
                crossing.put(((long) a << 32) | b, pair.nearest);
            }
        }
        List<Overlap> overlaps = new ArrayList<>();
        int computed = 0;
        for (Map.Entry<Long, Coordinate> entry : crossing.entrySet()) {
            int a = (int) (entry.getKey() >> 32);
            int b = (int) (entry.getKey() & 0xFFFFFFFFL);
            if (computed++ >= COMPUTED_AT_MOST) {
                overlaps.add(new Overlap(a, b, Double.NaN, entry.getValue()));
                continue;
            }
            ArcFlattener flattener = new ArcFlattener(ARC_TOLERANCE * closeness.extent());
            Geometry first = flattener.flatten(shapes.get(a).polygons());
            Geometry second = flattener.flatten(shapes.get(b).polygons());
            Geometry common = OverlayNGRobust.overlay(flat(first), flat(second), OverlayNG.INTERSECTION);
            // A strip of the width w and the length l has the area w·l, and a border of 2·(w + l).
            if (common.getArea() > 0.5 * closeness.gap() * common.getLength()) {
                Coordinate at = common.getInteriorPoint().getCoordinate();
                overlaps.add(new Overlap(a, b, common.getArea(), at));
            }
        }
        return overlaps;
    }

    /** Pieces that share a side are one. */
    private static Geometry flat(Geometry polygons) {
        return polygons.getNumGeometries() > 1 ? OverlayNGRobust.overlay(polygons, null, OverlayNG.UNION) : polygons;
    }
}
