package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.index.strtree.STRtree;

/** Makes areas of loops: a loop within a loop is a hole, a loop within the hole an area again, and so on. */
final class LoopNesting {
    private final double snap;
    private final List<RingArea> loops = new ArrayList<>();
    private final List<Strand> doubled = new ArrayList<>();
    private final STRtree index = new STRtree();

    /**
     * @param rings closed strands
     * @param snap what is nearer to a border is on it, metres
     */
    LoopNesting(List<Strand> rings, double snap) {
        this.snap = snap;
        List<RingArea> all = rings.stream().map(RingArea::new).toList();
        STRtree byBox = new STRtree();
        for (int i = 0; i < all.size(); i++) {
            byBox.insert(all.get(i).box(), i);
        }
        for (int i = 0; i < all.size(); i++) {
            if (isDrawnBefore(i, all, byBox)) {
                doubled.add(all.get(i).ring());
            } else {
                index.insert(all.get(i).box(), loops.size());
                loops.add(all.get(i));
            }
        }
    }

    /** Loops left out, since they had been drawn before. */
    List<Strand> doubled() {
        return doubled;
    }

    /** The areas, in the order in which their outer loops were drawn. */
    List<Chained.Area> areas(GeometryFactory factory) {
        int count = loops.size();
        int[] depth = new int[count];
        int[] parent = new int[count];
        for (int i = 0; i < count; i++) {
            parent[i] = -1;
            for (Object item : index.query(loops.get(i).box())) {
                int j = (Integer) item;
                if (j != i && isWithin(loops.get(i), loops.get(j))) {
                    depth[i]++;
                    if (parent[i] < 0
                            || loops.get(j).area() < loops.get(parent[i]).area()) {
                        parent[i] = j;
                    }
                }
            }
        }
        List<List<LinearRing>> holes = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            holes.add(new ArrayList<>());
        }
        for (int i = 0; i < count; i++) {
            if (depth[i] % 2 == 1) {
                holes.get(parent[i]).add(loops.get(i).ring().ring(factory));
            }
        }
        List<Chained.Area> areas = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            if (depth[i] % 2 == 0) {
                LinearRing shell = loops.get(i).ring().ring(factory);
                areas.add(new Chained.Area(
                        factory.createPolygon(shell, holes.get(i).toArray(new LinearRing[0])),
                        loops.get(i).ring().source()));
            }
        }
        areas.sort(Comparator.comparingInt(Chained.Area::source));
        return areas;
    }

    private boolean isDrawnBefore(int i, List<RingArea> all, STRtree byBox) {
        RingArea loop = all.get(i);
        List<?> near = byBox.query(loop.box());
        return near.stream().anyMatch(item -> (Integer) item < i && isSame(all.get((Integer) item), loop));
    }

    private boolean isSame(RingArea one, RingArea other) {
        Envelope a = one.box();
        Envelope b = other.box();
        boolean sameBox = Math.abs(a.getMinX() - b.getMinX()) <= 2 * snap
                && Math.abs(a.getMinY() - b.getMinY()) <= 2 * snap
                && Math.abs(a.getMaxX() - b.getMaxX()) <= 2 * snap
                && Math.abs(a.getMaxY() - b.getMaxY()) <= 2 * snap;
        // The boxes of arcs depend on where they are cut: only areas and borders tell in the end.
        return (sameBox || a.intersects(b))
                && Math.abs(one.area() - other.area()) <= 4 * snap * one.ring().length()
                && liesOn(one, other)
                && liesOn(other, one);
    }

    private boolean liesOn(RingArea one, RingArea other) {
        Strand ring = one.ring();
        for (int i = 0; i < ring.pieceCount(); i++) {
            Coordinate a = ring.points().get(i);
            Coordinate middle =
                    Strand.middle(a, ring.points().get(i + 1), ring.circles().get(i));
            if (!other.isOnBorder(a, 2 * snap) || !other.isOnBorder(middle, 2 * snap)) {
                return false;
            }
        }
        return true;
    }

    private boolean isWithin(RingArea inner, RingArea outer) {
        if (inner.area() >= outer.area()) {
            return false;
        }
        Envelope reach = new Envelope(outer.box());
        reach.expandBy(2 * snap);
        Strand ring = inner.ring();
        if (!reach.intersects(inner.box())) {
            return false;
        }
        for (int i = 0; i < ring.pieceCount(); i++) {
            Coordinate a = ring.points().get(i);
            int location = outer.locate(a, 2 * snap);
            if (location == Location.BOUNDARY) {
                location = outer.locate(
                        Strand.middle(
                                a, ring.points().get(i + 1), ring.circles().get(i)),
                        2 * snap);
            }
            if (location != Location.BOUNDARY) {
                return location == Location.INTERIOR;
            }
        }
        return true;
    }
}
