package tepor.mesher.mending;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.index.strtree.STRtree;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.ArcCutter;

/** Gives the arcs back to outlines that an operation on their finely cut chords has made. */
final class ArcRecovery {
    private static final int APPROACHES = 30;

    /** A chord and its circle. */
    private record Chord(Coordinate from, Coordinate to, Circle circle) {}

    private final STRtree chords = new STRtree();
    private final Set<Coordinate> drawn = new HashSet<>();
    private final Set<Coordinate> cut = new HashSet<>();
    private final double tolerance;

    /**
     * @param original the outlines as drawn
     * @param finer the same with finer arcs, as the operation saw them
     * @param tolerance how far the operation moves points at most, metres
     */
    ArcRecovery(Collection<Geometry> original, Collection<Geometry> finer, double tolerance) {
        this.tolerance = tolerance;
        original.forEach(g -> drawn.addAll(List.of(g.getCoordinates())));
        for (Geometry geometry : finer) {
            cut.addAll(List.of(geometry.getCoordinates()));
            ArcCutter.forEachRing(geometry, ring -> {
                Coordinate[] points = ring.getCoordinates();
                for (int i = 0; i + 1 < points.length; i++) {
                    Circle circle = Arcs.circle(ring, i);
                    if (circle != null) {
                        chords.insert(
                                new Envelope(points[i], points[i + 1]), new Chord(points[i], points[i + 1], circle));
                    }
                }
                return ring;
            });
        }
        chords.build();
    }

    /** The outline with its arcs; the same object where there are none. */
    Geometry recover(Geometry polygons) {
        return chords.isEmpty() ? polygons : ArcCutter.forEachRing(polygons, this::recover);
    }

    private LinearRing recover(LinearRing ring) {
        RingPath path = new RingPath(ring);
        boolean bent = false;
        for (int i = 0; i < path.size(); i++) {
            Circle circle = circle(path.point(i), path.point(path.next(i)));
            path.bend(i, circle);
            bent |= circle != null;
        }
        if (!bent) {
            return ring;
        }
        for (int i = 0; i < path.size(); i++) {
            if (!cut.contains(path.point(i))) {
                path.move(i, onto(path.circle(path.previous(i)), path.circle(i), path.point(i)));
            }
        }
        List<Integer> superfluous = new ArrayList<>();
        for (int i = 0; i < path.size(); i++) {
            Circle circle = path.circle(i);
            if (circle != null
                    && circle.equals(path.circle(path.previous(i)))
                    && cut.contains(path.point(i))
                    && !drawn.contains(path.point(i))) {
                superfluous.add(i);
            }
        }
        for (int k = superfluous.size() - 1; k >= 0 && path.size() > 3; k--) {
            path.removeArriving(superfluous.get(k));
        }
        return path.ring(ring.getFactory());
    }

    private Circle circle(Coordinate from, Coordinate to) {
        Envelope box = new Envelope(from, to);
        box.expandBy(tolerance);
        for (Object item : chords.query(box)) {
            Chord chord = (Chord) item;
            if (Distance.pointToSegment(from, chord.from(), chord.to()) <= tolerance
                    && Distance.pointToSegment(to, chord.from(), chord.to()) <= tolerance) {
                return chord.circle();
            }
        }
        return null;
    }

    /** The place next to a point that lies on the circles of both pieces, as far as they have any. */
    private static Coordinate onto(Circle one, Circle other, Coordinate point) {
        Coordinate at = point;
        for (int k = 0; k < APPROACHES; k++) {
            at = one == null ? at : one.nearest(at.x, at.y);
            if (other == null || other.equals(one)) {
                return at;
            }
            at = other.nearest(at.x, at.y);
        }
        return at;
    }
}
