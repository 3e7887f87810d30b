package tepor.mesher.section;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.locationtech.jts.algorithm.Area;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.algorithm.RobustLineIntersector;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.index.hprtree.HPRtree;

/** Finds all that is wrong with one ring on its own, where JTS's validity check stops at the first fault. */
final class RingCheck {
    /** An area below this share of the square of the ring's diameter is round-off. */
    private static final double NO_AREA = 1e-13;

    /** Directions that differ by less, radians, differ by round-off. */
    private static final double SAME_DIRECTION = 1e-12;

    private final Coordinate[] points; // closed, without repeated points
    private final List<Coordinate> repeated = new ArrayList<>();
    private final Set<Coordinate> crossings = new LinkedHashSet<>();
    private final Set<Coordinate> touches = new LinkedHashSet<>();
    private final Set<Coordinate> spikes = new LinkedHashSet<>();
    private final Set<Coordinate> overlaps = new LinkedHashSet<>();
    private final boolean flat;
    private double overlapLength;
    private double spikeLength;

    RingCheck(LinearRing ring) {
        List<Coordinate> kept = new ArrayList<>();
        for (Coordinate c : ring.getCoordinates()) {
            if (!kept.isEmpty() && kept.get(kept.size() - 1).equals2D(c)) {
                repeated.add(c);
            } else {
                kept.add(c);
            }
        }
        points = kept.toArray(new Coordinate[0]);
        double diameter = ring.getEnvelopeInternal().getDiameter();
        boolean enclosesNothing = points.length < 4 || Area.ofRing(points) <= NO_AREA * diameter * diameter;
        if (points.length >= 4) {
            findSpikes();
            findMeetings();
            touches.removeAll(overlaps);
        }
        // A figure of eight may have lobes that cancel; its fault is the crossing.
        flat = enclosesNothing && crossings.isEmpty();
    }

    /** Points that follow on themselves: harmless. */
    List<Coordinate> repeated() {
        return repeated;
    }

    /** Whether the ring encloses nothing. */
    boolean isFlat() {
        return flat;
    }

    /** Where the ring crosses itself. */
    Set<Coordinate> crossings() {
        return crossings;
    }

    /** Where the ring touches itself in a point. */
    Set<Coordinate> touches() {
        return touches;
    }

    /** Where the ring turns back upon itself. */
    Set<Coordinate> spikes() {
        return spikes;
    }

    /** Length of the longest spike, metres. */
    double spikeLength() {
        return spikeLength;
    }

    /** Over what length the ring runs over itself, metres. */
    double overlapLength() {
        return overlapLength;
    }

    /** Between which points the ring runs over a part of itself that is not its neighbour. */
    Set<Coordinate> overlaps() {
        return overlaps;
    }

    private void findSpikes() {
        int count = points.length - 1;
        for (int i = 0; i < count; i++) {
            Coordinate before = points[(i + count - 1) % count];
            Coordinate here = points[i];
            Coordinate after = points[i + 1];
            double dot = (before.x - here.x) * (after.x - here.x) + (before.y - here.y) * (after.y - here.y);
            if (dot > 0 && Orientation.index(before, here, after) == Orientation.COLLINEAR) {
                spikes.add(here);
                spikeLength = Math.max(spikeLength, Math.min(here.distance(before), here.distance(after)));
            }
        }
    }

    private void findMeetings() {
        int count = points.length - 1;
        HPRtree index = new HPRtree();
        for (int i = 0; i < count; i++) {
            index.insert(new Envelope(points[i], points[i + 1]), i);
        }
        RobustLineIntersector intersector = new RobustLineIntersector();
        Set<Coordinate> undecided = new LinkedHashSet<>();
        for (int i = 0; i < count; i++) {
            int one = i;
            index.query(new Envelope(points[i], points[i + 1]), item -> {
                int other = (Integer) item;
                boolean neighbours = other == one + 1 || (one == 0 && other == count - 1);
                if (other > one && !neighbours) {
                    meet(one, other, intersector, undecided);
                }
            });
        }
        for (Coordinate at : undecided) {
            (crossesAt(at, index) ? crossings : touches).add(at);
        }
    }

    private void meet(int i, int j, RobustLineIntersector intersector, Set<Coordinate> undecided) {
        intersector.computeIntersection(points[i], points[i + 1], points[j], points[j + 1]);
        if (!intersector.hasIntersection()) {
            return;
        }
        Coordinate at = intersector.getIntersection(0).copy();
        if (intersector.getIntersectionNum() == 2) {
            Coordinate to = intersector.getIntersection(1).copy();
            overlaps.add(at);
            overlaps.add(to);
            overlapLength += at.distance(to);
        } else if (intersector.isProper()) {
            crossings.add(at);
        } else {
            undecided.add(at);
        }
    }

    /** Whether the ring crosses itself, rather than touches, in a point that is a vertex: the passes alternate around it. */
    private boolean crossesAt(Coordinate at, HPRtree index) {
        List<Integer> near = new ArrayList<>();
        index.query(new Envelope(at), item -> near.add((Integer) item));
        int count = points.length - 1;
        List<double[]> passes = new ArrayList<>(); // angle of the way in (seen backwards) and of the way out
        for (int i : near) {
            Coordinate p = points[i];
            Coordinate q = points[i + 1];
            if (p.equals2D(at)) {
                passes.add(new double[] {angle(at, points[(i + count - 1) % count]), angle(at, q)});
            } else if (!q.equals2D(at)
                    && new Envelope(p, q).contains(at)
                    && Orientation.index(p, q, at) == Orientation.COLLINEAR) {
                passes.add(new double[] {angle(at, p), angle(at, q)});
            }
        }
        for (int a = 0; a < passes.size(); a++) {
            for (int b = a + 1; b < passes.size(); b++) {
                if (!runTogether(passes.get(a), passes.get(b))
                        && isBetween(passes.get(b)[0], passes.get(a)) != isBetween(passes.get(b)[1], passes.get(a))) {
                    return true;
                }
            }
        }
        return false;
    }

    private static double angle(Coordinate from, Coordinate to) {
        return Math.atan2(to.y - from.y, to.x - from.x);
    }

    /** Whether two passes have a direction in common: then the ring runs over itself, which is another fault. */
    private static boolean runTogether(double[] pass, double[] other) {
        for (double angle : pass) {
            for (double otherAngle : other) {
                if (Math.abs(Math.IEEEremainder(angle - otherAngle, 2 * Math.PI)) < SAME_DIRECTION) {
                    return true;
                }
            }
        }
        return false;
    }

    private static boolean isBetween(double angle, double[] pass) {
        return angle > Math.min(pass[0], pass[1]) && angle < Math.max(pass[0], pass[1]);
    }
}
