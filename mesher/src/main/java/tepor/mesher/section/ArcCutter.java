package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.MultiPolygon;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.ArcRing;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;

/**
 * Cuts arcs into shorter pieces of the same circles until their chords tell the truth: the lens between each arc and its
 * chord is clear of all other pieces, or thinner than a tolerance.
 *
 * <p>So what is found between the chords (a crossing, a touch, a hole outside) is there between the arcs, too, and the other
 * way round. Points that are there stay where they are. Pieces of one circle that lie over each other are left as they are.
 */
public final class ArcCutter {
    /** A chord is clear if what is near it is farther away than this many times the depths of both lenses. */
    private static final double CLEARANCE = 8;

    private static final int ROUNDS_AT_MOST = 40;

    private final double tolerance;
    private double[] x = new double[64]; // start of each piece; it ends where the following one starts
    private double[] y = new double[64];
    private Circle[] circle = new Circle[64];
    private int[] following = new int[64];
    private int[] preceding = new int[64];
    private int count;

    private ArcCutter(double tolerance) {
        this.tolerance = tolerance;
    }

    /**
     * Cuts the arcs of several polygons against each other.
     *
     * @param polygons Polygons and MultiPolygons, metres
     * @param tolerance lenses thinner than this need not be clear, metres, greater than zero
     * @return the same outlines with finer arcs; the very same objects where there are no arcs
     */
    public static List<Geometry> cut(List<Geometry> polygons, double tolerance) {
        if (polygons.stream().noneMatch(ArcCutter::hasArcs)) {
            return polygons;
        }
        ArcCutter cutter = new ArcCutter(tolerance);
        List<Integer> starts = new ArrayList<>();
        for (Geometry geometry : polygons) {
            forEachRing(geometry, ring -> {
                starts.add(cutter.add(ring));
                return ring;
            });
        }
        cutter.cut();
        int[] ring = {0};
        return polygons.stream()
                .map(g -> forEachRing(g, old -> cutter.ring(starts.get(ring[0]++), old)))
                .toList();
    }

    /** Whether any ring of a geometry has arcs. */
    public static boolean hasArcs(Geometry polygons) {
        boolean[] found = {false};
        forEachRing(polygons, ring -> {
            found[0] |= ring instanceof Arcs;
            return ring;
        });
        return found[0];
    }

    /** Puts another ring in the place of each, in order: shell, holes, next polygon. */
    public interface RingChange {
        LinearRing apply(LinearRing ring);
    }

    /** The geometry with its rings changed; what is no polygon is left out of sight. */
    public static Geometry forEachRing(Geometry geometry, RingChange change) {
        GeometryFactory factory = geometry.getFactory();
        if (geometry instanceof Polygon polygon) {
            if (polygon.isEmpty()) {
                return polygon;
            }
            LinearRing shell = change.apply(polygon.getExteriorRing());
            LinearRing[] holes = new LinearRing[polygon.getNumInteriorRing()];
            for (int h = 0; h < holes.length; h++) {
                holes[h] = change.apply(polygon.getInteriorRingN(h));
            }
            return factory.createPolygon(shell, holes);
        }
        if (geometry instanceof MultiPolygon) {
            Polygon[] parts = new Polygon[geometry.getNumGeometries()];
            for (int i = 0; i < parts.length; i++) {
                parts[i] = (Polygon) forEachRing(geometry.getGeometryN(i), change);
            }
            return factory.createMultiPolygon(parts);
        }
        return geometry;
    }

    private int add(LinearRing ring) {
        Coordinate[] points = ring.getCoordinates();
        int first = count;
        for (int i = 0; i < points.length - 1; i++) {
            int piece = newPiece(points[i].x, points[i].y, Arcs.circle(ring, i));
            link(piece, i == points.length - 2 ? first : piece + 1);
        }
        return first;
    }

    private int newPiece(double startX, double startY, Circle of) {
        if (count == x.length) {
            x = Arrays.copyOf(x, 2 * count);
            y = Arrays.copyOf(y, 2 * count);
            circle = Arrays.copyOf(circle, 2 * count);
            following = Arrays.copyOf(following, 2 * count);
            preceding = Arrays.copyOf(preceding, 2 * count);
        }
        x[count] = startX;
        y[count] = startY;
        circle[count] = of;
        return count++;
    }

    private void link(int piece, int next) {
        if (next >= preceding.length) {
            preceding = Arrays.copyOf(preceding, 2 * next);
        }
        following[piece] = next;
        preceding[next] = piece;
    }

    private void cut() {
        BitSet fresh = new BitSet();
        for (int i = 0; i < count; i++) {
            fresh.set(i, circle[i] != null);
        }
        for (int round = 0; round < ROUNDS_AT_MOST && !fresh.isEmpty(); round++) {
            HPRtree index = new HPRtree();
            for (int i = 0; i < count; i++) {
                index.insert(envelope(i), i);
            }
            BitSet split = new BitSet();
            for (int i = fresh.nextSetBit(0); i >= 0; i = fresh.nextSetBit(i + 1)) {
                int one = i;
                if (sagitta(i) > tolerance) {
                    Envelope reach = envelope(i);
                    reach.expandBy(CLEARANCE * sagitta(i));
                    index.query(reach, item -> {
                        if (!split.get(one) && !isClear(one, (Integer) item)) {
                            split.set(one);
                        }
                    });
                }
            }
            fresh = new BitSet();
            for (int i = split.nextSetBit(0); i >= 0; i = split.nextSetBit(i + 1)) {
                Coordinate middle = circle[i].middle(x[i], y[i], x[following[i]], y[following[i]]);
                int added = newPiece(middle.x, middle.y, circle[i]);
                link(added, following[i]);
                link(i, added);
                fresh.set(i);
                fresh.set(added);
            }
        }
    }

    private double sagitta(int i) {
        int j = following[i];
        return circle[i] == null ? 0 : circle[i].sagitta(Math.hypot(x[j] - x[i], y[j] - y[i]));
    }

    private Envelope envelope(int i) {
        Envelope envelope = new Envelope(x[i], x[following[i]], y[i], y[following[i]]);
        envelope.expandBy(CLEARANCE * sagitta(i));
        return envelope;
    }

    private boolean isClear(int i, int j) {
        if (i == j || isSameCircle(circle[i], circle[j], tolerance)) {
            return true;
        }
        int iEnd = following[i];
        int jEnd = following[j];
        if (same(i, j)) {
            return diverge(i, iEnd, j, jEnd, i, j);
        } else if (same(i, jEnd)) {
            return diverge(i, iEnd, jEnd, j, i, j);
        } else if (same(iEnd, j)) {
            return diverge(iEnd, i, j, jEnd, i, j);
        } else if (same(iEnd, jEnd)) {
            return diverge(iEnd, i, jEnd, j, i, j);
        }
        double distance = Distance.segmentToSegment(point(i), point(iEnd), point(j), point(jEnd));
        return distance > CLEARANCE * (sagitta(i) + sagitta(j));
    }

    private boolean same(int v, int w) {
        return x[v] == x[w] && y[v] == y[w];
    }

    private Coordinate point(int v) {
        return new Coordinate(x[v], y[v]);
    }

    /** Whether two pieces that leave one point part by more than their arcs bend. */
    private boolean diverge(int at, int to, int otherAt, int otherTo, int i, int j) {
        double ux = x[to] - x[at];
        double uy = y[to] - y[at];
        double vx = x[otherTo] - x[otherAt];
        double vy = y[otherTo] - y[otherAt];
        double angle = Math.abs(Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy));
        return angle > turn(i) + turn(j);
    }

    private double turn(int i) {
        int j = following[i];
        return circle[i] == null ? 0 : Math.abs(circle[i].turn(x[i], y[i], x[j], y[j]));
    }

    /** Whether two circles are one within a tolerance (metres); false where either is null. */
    public static boolean isSameCircle(Circle one, Circle other, double tolerance) {
        return one != null
                && other != null
                && (one.equals(other)
                        || Math.hypot(one.x() - other.x(), one.y() - other.y())
                                        + Math.abs(one.radius() - other.radius())
                                <= tolerance);
    }

    private LinearRing ring(int start, LinearRing old) {
        if (!(old instanceof Arcs)) {
            return old;
        }
        List<Coordinate> points = new ArrayList<>();
        List<Circle> circles = new ArrayList<>();
        int i = start;
        do {
            points.add(point(i));
            circles.add(circle[i]);
            i = following[i];
        } while (i != start);
        points.add(point(start));
        return new ArcRing(points.toArray(new Coordinate[0]), circles.toArray(new Circle[0]), old.getFactory());
    }
}
