package tepor.mesher.mending;

import java.util.List;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.section.ArcCutter;
import tepor.mesher.section.RegionShape;
import tepor.mesher.soundness.Closeness;
import tepor.mesher.soundness.PointCheck;

/** Merges points of a ring that follow each other too closely, and cuts spikes and notches off. */
final class PointMender {
    /** A ring smaller than this many near points is left alone: it would vanish. */
    private static final double LEAST_RING = 4;

    private final RegionShape shape;
    private final DrawingUnit unit;
    private final Closeness closeness;
    private final List<Change> changes;

    PointMender(RegionShape shape, DrawingUnit unit, Closeness closeness, List<Change> changes) {
        this.shape = shape;
        this.unit = unit;
        this.closeness = closeness;
        this.changes = changes;
    }

    /** The mended outline; the very same where nothing was to be done. */
    Geometry mend() {
        int before = changes.size();
        Geometry mended = ArcCutter.forEachRing(shape.polygons(), this::mend);
        return changes.size() == before ? shape.polygons() : mended;
    }

    private LinearRing mend(LinearRing ring) {
        int before = changes.size();
        RingPath path = new RingPath(ring);
        Envelope box = ring.getEnvelopeInternal();
        if (box.getDiameter() > LEAST_RING * closeness.nearPoint()) {
            merge(path);
            int beforeCut = changes.size();
            cutSpikes(path);
            if (changes.size() > beforeCut) {
                merge(path); // where a spike stood, its two feet may be one
            }
        }
        return changes.size() == before ? ring : path.ring(ring.getFactory());
    }

    private void merge(RingPath path) {
        for (int i = 0; i < path.size() && path.size() > 3; ) {
            Coordinate here = path.point(i);
            Coordinate next = path.point(path.next(i));
            double distance = here.distance(next);
            if (distance > closeness.nearPoint()) {
                i++;
                continue;
            }
            if (path.next(i) == 0) {
                path.removeLeaving(i); // the first point stays
            } else {
                path.removeArriving(i + 1);
            }
            boolean same = distance == 0;
            change(
                    same ? "repeated-point-dropped" : "points-merged",
                    same
                            ? "a repeated point at " + point(next) + " is dropped"
                            : "the point at " + point(next) + " is " + unit.length(distance) + " from the one at "
                                    + point(here) + ", and merged with it",
                    next,
                    distance);
        }
    }

    private void cutSpikes(RingPath path) {
        for (int i = 0; i < path.size() && path.size() > 3; ) {
            Coordinate tip = path.point(i);
            Coordinate before = path.point(path.previous(i));
            Coordinate after = path.point(path.next(i));
            boolean thereAndBack = before.equals2D(after);
            if (!isSpike(path, i) || (thereAndBack && path.size() == 4)) {
                i++;
                continue;
            }
            double length = Math.min(tip.distance(before), tip.distance(after));
            double width = PointCheck.needleWidth(before, tip, after);
            if (thereAndBack) {
                path.removeLeaving(i);
                int again = i < path.size() ? i : 0;
                path.removeArriving(again);
            } else {
                path.bend(path.previous(i), null);
                path.removeLeaving(i);
            }
            change(
                    "spike-cut",
                    "a spike with its point at " + point(tip) + ", " + unit.length(length) + " long"
                            + (width > 0 ? " and " + unit.length(width) + " wide" : "") + ", is cut off",
                    tip,
                    length);
            i = Math.max(0, i - 2);
        }
    }

    private boolean isSpike(RingPath path, int i) {
        Coordinate before = path.point(path.previous(i));
        Coordinate here = path.point(i);
        Coordinate after = path.point(path.next(i));
        if (path.circle(i) != null || path.circle(path.previous(i)) != null) {
            return path.circle(i) != null
                    && before.equals2D(after)
                    && path.circle(i).equals(path.circle(path.previous(i)));
        }
        double dot = (before.x - here.x) * (after.x - here.x) + (before.y - here.y) * (after.y - here.y);
        if (dot <= 0) {
            return false;
        }
        double width = PointCheck.needleWidth(before, here, after);
        double length = Math.min(here.distance(before), here.distance(after));
        return Orientation.index(before, here, after) == Orientation.COLLINEAR
                || width <= closeness.gap() && length >= PointCheck.NEEDLE * width;
    }

    private void change(String code, String what, Coordinate at, double size) {
        changes.add(new Change(code, shape.name(), shape.place(), "region '" + shape.name() + "': " + what, at, size));
    }

    private String point(Coordinate c) {
        return unit.point(c.x, c.y);
    }
}
