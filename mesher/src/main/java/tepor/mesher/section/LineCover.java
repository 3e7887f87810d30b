package tepor.mesher.section;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;

/** Tells which pieces, straight ones and arcs, lie wholly on a drawn line, and in which direction the line runs there. */
final class LineCover {
    private final double tolerance;
    private final List<Part> parts = new ArrayList<>();
    private final HPRtree index = new HPRtree();

    /** A piece of the drawn line; the circle is null where it is straight. */
    private record Part(Coordinate from, Coordinate to, Circle circle) {}

    /** What of a piece is covered, metres along it from its start, and +1 or −1 for the direction of the line. */
    private record Span(double from, double to, double direction) {}

    /**
     * @param line line strings, with or without arcs
     * @param tolerance how far from the line a piece still lies on it
     */
    LineCover(Geometry line, double tolerance) {
        this.tolerance = tolerance;
        for (int i = 0; i < line.getNumGeometries(); i++) {
            LineString string = (LineString) line.getGeometryN(i);
            for (int k = 0; k + 1 < string.getNumPoints(); k++) {
                add(string.getCoordinateN(k), string.getCoordinateN(k + 1), Arcs.circle(string, k));
            }
        }
    }

    private void add(Coordinate from, Coordinate to, Circle circle) {
        if (!from.equals2D(to)) {
            Circle counted = bent(circle, from.distance(to));
            index.insert(envelope(from.x, from.y, to.x, to.y, counted), parts.size());
            parts.add(new Part(from, to, counted));
        }
    }

    /** The circle of an arc that is farther from its chord than the tolerance; null for others, which are as good as straight. */
    private Circle bent(Circle circle, double chord) {
        return circle != null && circle.sagitta(chord) > 0.1 * tolerance ? circle : null;
    }

    private static Envelope envelope(double x0, double y0, double x1, double y1, Circle circle) {
        return circle == null ? new Envelope(x0, x1, y0, y1) : circle.envelope(x0, y0, x1, y1);
    }

    /**
     * Whether a piece lies on the line.
     *
     * @param circle of the piece; null where it is straight
     * @return +1 where it lies on the line and runs its way, −1 where it runs against it, 0 where it does not lie on it
     */
    int direction(double x0, double y0, double x1, double y1, Circle circle) {
        double chord = Math.hypot(x1 - x0, y1 - y0);
        Circle bent = bent(circle, chord);
        double length = bent == null ? chord : bent.arcLength(chord);
        Envelope reach = envelope(x0, y0, x1, y1, bent);
        reach.expandBy(tolerance);
        List<Span> covered = new ArrayList<>();
        index.query(reach, item -> {
            Part part = parts.get((Integer) item);
            if (bent == null && part.circle() == null) {
                addStraight(covered, part, x0, y0, (x1 - x0) / chord, (y1 - y0) / chord);
            } else if (bent != null && part.circle() != null) {
                addArc(covered, part, x0, y0, bent, bent.turn(x0, y0, x1, y1));
            }
        });
        covered.sort((a, b) -> Double.compare(a.from(), b.from()));
        double end = 0;
        double along = 0;
        for (Span span : covered) {
            if (span.from() > end + tolerance) {
                return 0;
            }
            along += span.direction() * Math.max(0, Math.min(span.to(), length) - Math.max(span.from(), 0));
            end = Math.max(end, span.to());
        }
        if (covered.isEmpty() || end < length - tolerance) {
            return 0;
        }
        return along >= 0 ? 1 : -1;
    }

    private void addStraight(List<Span> covered, Part part, double x0, double y0, double ux, double uy) {
        double px = part.from().x - x0;
        double py = part.from().y - y0;
        double qx = part.to().x - x0;
        double qy = part.to().y - y0;
        double tp = px * ux + py * uy; // along the piece
        double tq = qx * ux + qy * uy;
        double dp = ux * py - uy * px; // across it
        double dq = ux * qy - uy * qx;
        double from = 0; // the share of the part within tolerance
        double to = 1;
        if (dp == dq) {
            if (Math.abs(dp) > tolerance) {
                return;
            }
        } else {
            double a = (-tolerance - dp) / (dq - dp);
            double b = (tolerance - dp) / (dq - dp);
            from = Math.max(from, Math.min(a, b));
            to = Math.min(to, Math.max(a, b));
        }
        if (from <= to) {
            double a = tp + from * (tq - tp);
            double b = tp + to * (tq - tp);
            covered.add(new Span(Math.min(a, b), Math.max(a, b), Math.signum(tq - tp)));
        }
    }

    /** Adds what a part of the line covers of an arc: where both run side by side, their circles must be within tolerance. */
    private void addArc(List<Span> covered, Part part, double x0, double y0, Circle circle, double turn) {
        double way = Math.signum(turn);
        double tp = way * circle.turn(x0, y0, part.from().x, part.from().y);
        double tq = way * circle.turn(x0, y0, part.to().x, part.to().y);
        if (Math.abs(tq - tp) > Math.PI) {
            return; // on the far side of the circle
        }
        double from = Math.max(0, Math.min(tp, tq));
        double to = Math.min(Math.abs(turn), Math.max(tp, tq));
        double slack = tolerance / circle.radius();
        if (to < from - slack) {
            return;
        }
        for (double t : new double[] {from, 0.5 * (from + to), to}) {
            double angle = Math.atan2(y0 - circle.y(), x0 - circle.x()) + way * t;
            double x = circle.x() + circle.radius() * Math.cos(angle);
            double y = circle.y() + circle.radius() * Math.sin(angle);
            if (Math.abs(part.circle().offset(x, y)) > tolerance) {
                return;
            }
        }
        double radius = circle.radius();
        covered.add(new Span(radius * Math.min(tp, tq), radius * Math.max(tp, tq), Math.signum(tq - tp)));
    }
}
