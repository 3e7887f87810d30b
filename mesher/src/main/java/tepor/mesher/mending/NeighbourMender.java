package tepor.mesher.mending;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineSegment;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.index.strtree.STRtree;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.PathBuilder;
import tepor.mesher.section.ArcCutter;
import tepor.mesher.soundness.Closeness;
import tepor.mesher.soundness.DrawnPieces;
import tepor.mesher.soundness.NearPair;
import tepor.mesher.soundness.NearRun;

/**
 * Moves one region's border onto its neighbour's along stretches where the two nearly touch: its points move onto the
 * neighbour's points or sides, and the neighbour's points are put into its sides.
 */
final class NeighbourMender {
    /** A point of the neighbour is taken, rather than its side, if it is not farther than this many times the side. */
    private static final double POINT_RATHER_THAN_SIDE = 1.5;

    private final DrawnPieces pieces;
    private final Closeness closeness;
    private final Set<Coordinate> movable = new HashSet<>(); // points as drawn of the region that moves
    private final Map<Coordinate, Coordinate> moves = new HashMap<>();
    private final Set<Coordinate> inserts = new HashSet<>();
    private final Map<Integer, Envelope> targets = new TreeMap<>();
    private final STRtree insertIndex = new STRtree();
    private final STRtree targetIndex = new STRtree();
    private int movedCount;
    private int insertedCount;

    /**
     * @param pieces all borders
     * @param moving the outline that moves
     */
    NeighbourMender(DrawnPieces pieces, Geometry moving, Closeness closeness) {
        this.pieces = pieces;
        this.closeness = closeness;
        movable.addAll(List.of(moving.getCoordinates()));
    }

    /** What one stretch asks for: how many points are to move, and to be put in. */
    record Asked(int moved, int inserted) {}

    /**
     * Takes one stretch in.
     *
     * @param run the stretch
     * @param region the region that moves, by its order
     * @param drawnThere points as drawn of the other region
     */
    Asked take(NearRun run, int region, Set<Coordinate> drawnThere) {
        Map<Integer, Set<Integer>> facing = new TreeMap<>(); // pieces on the other side, by piece
        Set<Integer> own = new TreeSet<>();
        boolean anySides = run.pairs().stream().anyMatch(pair -> pair.length > 0);
        for (NearPair pair : run.pairs()) {
            if (anySides ? pair.length > 0 : pair.distance > closeness.snap()) {
                boolean first = pieces.region(pair.p) == region && run.first() != run.second();
                own.add(first ? pair.p : pair.q);
                facing.computeIfAbsent(pair.p, k -> new TreeSet<>()).add(pair.q);
                facing.computeIfAbsent(pair.q, k -> new TreeSet<>()).add(pair.p);
            }
        }
        Set<Coordinate> drawn = drawnThere;
        if (run.first() == run.second()) {
            drawn = new HashSet<>(drawnThere);
            for (int piece : own) {
                drawn.remove(pieces.start(piece));
                drawn.remove(pieces.end(piece));
            }
        }
        int movedBefore = moves.size();
        int insertedBefore = inserts.size();
        Set<Coordinate> taken = new HashSet<>();
        for (int piece : own) {
            take(pieces.start(piece), around(piece, pieces.previous(piece), facing), drawn, taken);
            take(pieces.end(piece), around(piece, pieces.next(piece), facing), drawn, taken);
        }
        for (int piece : facing.keySet()) {
            if (!own.contains(piece)) {
                targets.put(piece, new Envelope(pieces.start(piece), pieces.end(piece)));
                for (Coordinate end : List.of(pieces.start(piece), pieces.end(piece))) {
                    double distance = nearest(end, facing.get(piece));
                    if (drawn.contains(end) && !taken.contains(end) && distance > 0 && distance <= closeness.gap()) {
                        inserts.add(end);
                    }
                }
            }
        }
        return new Asked(moves.size() - movedBefore, inserts.size() - insertedBefore);
    }

    private void take(Coordinate end, Set<Integer> among, Set<Coordinate> drawn, Set<Coordinate> taken) {
        if (movable.contains(end) && !drawn.contains(end) && !moves.containsKey(end)) {
            destination(end, among, drawn).ifPresent(to -> {
                moves.put(end, to);
                taken.add(to);
            });
        }
    }

    /** What faces a piece, or the one beside it. */
    private static Set<Integer> around(int piece, int beside, Map<Integer, Set<Integer>> facing) {
        Set<Integer> around = new TreeSet<>(facing.get(piece));
        around.addAll(facing.getOrDefault(beside, Set.of()));
        return around;
    }

    private double nearest(Coordinate point, Set<Integer> among) {
        return among.stream()
                .mapToDouble(piece -> pieces.distance(point, piece))
                .min()
                .orElse(Double.POSITIVE_INFINITY);
    }

    /** Where a point moves to; empty where it is too far off, or there already. */
    private Optional<Coordinate> destination(Coordinate point, Set<Integer> among, Set<Coordinate> drawn) {
        int nearest = -1;
        double least = Double.POSITIVE_INFINITY;
        for (int piece : among) {
            double distance = pieces.distance(point, piece);
            if (distance < least || (distance == least && piece < nearest)) {
                least = distance;
                nearest = piece;
            }
        }
        if (nearest < 0 || least == 0 || least > closeness.gap()) {
            return Optional.empty();
        }
        double reach = Math.max(POINT_RATHER_THAN_SIDE * least, closeness.nearPoint());
        Coordinate best = null;
        for (int piece : among) {
            for (Coordinate end : List.of(pieces.start(piece), pieces.end(piece))) {
                boolean closer = best == null || point.distance(end) < point.distance(best);
                if (drawn.contains(end) && point.distance(end) <= reach && closer) {
                    best = end;
                }
            }
        }
        return Optional.of(best == null ? foot(point, nearest) : best);
    }

    private Coordinate foot(Coordinate point, int piece) {
        Circle circle = pieces.circle(piece);
        return circle == null
                ? new LineSegment(pieces.start(piece), pieces.end(piece)).closestPoint(point)
                : circle.nearest(point.x, point.y);
    }

    /** The outline that moves, after all stretches were taken in; to be asked once. */
    Geometry moved(Geometry moving) {
        inserts.forEach(point -> insertIndex.insert(new Envelope(point), point));
        targets.forEach((piece, box) -> targetIndex.insert(box, piece));
        return ArcCutter.forEachRing(moving, this::moved);
    }

    private LinearRing moved(LinearRing ring) {
        RingPath path = new RingPath(ring);
        Set<Integer> changed = new HashSet<>();
        Coordinate[] middle = new Coordinate[path.size()];
        for (int i = 0; i < path.size(); i++) {
            Coordinate a = path.point(i);
            Coordinate b = path.point(path.next(i));
            middle[i] = path.circle(i) == null ? null : path.circle(i).middle(a.x, a.y, b.x, b.y);
        }
        for (int i = 0; i < path.size(); i++) {
            Coordinate to = moves.get(path.point(i));
            if (to != null) {
                path.move(i, to);
                movedCount++;
                changed.add(i);
                changed.add(path.previous(i));
            }
        }
        // From the last piece to the first, so that the numbers of those before do not change.
        boolean any = !changed.isEmpty();
        for (int i = path.size() - 1; i >= 0; i--) {
            List<Coordinate> within = within(path, i);
            any |= !within.isEmpty();
            boolean touched = changed.contains(i);
            for (Coordinate point : within) {
                path.insert(i, point);
                insertedCount++;
            }
            for (int k = i; k <= i + within.size(); k++) {
                if (touched || !within.isEmpty()) {
                    bend(path, k, within.isEmpty() ? middle[i] : null);
                }
            }
        }
        return any ? path.ring(ring.getFactory()) : ring;
    }

    /** The neighbour's points that belong into piece i, the last first. */
    private List<Coordinate> within(RingPath path, int i) {
        Coordinate a = path.point(i);
        Coordinate b = path.point(path.next(i));
        LineSegment chord = new LineSegment(a, b);
        double lens = path.circle(i) == null ? 0 : path.circle(i).sagitta(a.distance(b));
        List<Coordinate> within = new ArrayList<>();
        Envelope box = new Envelope(a, b);
        box.expandBy(closeness.gap() + lens);
        for (Object item : insertIndex.query(box)) {
            Coordinate point = (Coordinate) item;
            double along = chord.projectionFactor(point);
            if (along > 0
                    && along < 1
                    && chord.distancePerpendicular(point) <= closeness.gap() + lens
                    && off(path.circle(i), chord, point) <= closeness.gap()
                    && point.distance(a) > closeness.nearPoint()
                    && point.distance(b) > closeness.nearPoint()) {
                within.add(point);
            }
        }
        within.sort(Comparator.comparingDouble(chord::projectionFactor).reversed());
        return within;
    }

    private static double off(Circle circle, LineSegment chord, Coordinate point) {
        return circle == null ? chord.distancePerpendicular(point) : Math.abs(circle.offset(point.x, point.y));
    }

    /** Gives a piece the neighbour's shape where it lies along one side of it, or an arc through its new ends. */
    private void bend(RingPath path, int i, Coordinate middle) {
        Coordinate a = path.point(i);
        Coordinate b = path.point(path.next(i));
        Envelope box = new Envelope(a, b);
        box.expandBy(closeness.gap());
        for (Object item : targetIndex.query(box)) {
            int target = (Integer) item;
            Circle circle = pieces.circle(target);
            boolean along = circle == null
                    ? pieces.distance(a, target) <= closeness.snap() && pieces.distance(b, target) <= closeness.snap()
                    : Math.abs(circle.offset(a.x, a.y)) <= closeness.snap()
                            && Math.abs(circle.offset(b.x, b.y)) <= closeness.snap()
                            && pieces.distance(a, target) <= a.distance(b);
            if (along) {
                path.bend(i, circle);
                return;
            }
        }
        if (path.circle(i) != null) {
            Circle old = path.circle(i);
            Coordinate through = middle == null ? old.middle(a.x, a.y, b.x, b.y) : middle;
            path.bend(i, PathBuilder.circle(a, through, b).orElse(null));
        }
    }

    int movedCount() {
        return movedCount;
    }

    int insertedCount() {
        return insertedCount;
    }
}
