package tepor.mesher.curve;

import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.PathBuilder;

/**
 * Follows a curve by arcs of circles that share its tangents: pairs of arcs (biarcs: K. M. Bolton, Biarc curves,
 * Computer-Aided Design 7 (1975) 89–92), each as long as the tolerance allows. Far fewer pieces are needed than with straight ones.
 */
public final class ArcFitter {
    private static final int SAMPLES = 8;
    private static final int DEEPEST = 12;
    /** What is off the chord by less than this share of the tolerance is straight. */
    private static final double STRAIGHT = 1e-3;
    /** Distances are looked at in a few points only: room for what lies between them. */
    private static final double ROOM = 0.9;

    private final Curve curve;
    private final PathBuilder path;
    private final double tolerance;
    private final double[] sample = new double[4];
    private final double[][] points = new double[SAMPLES - 1][2];

    private ArcFitter(Curve curve, PathBuilder path, double tolerance) {
        this.curve = curve;
        this.path = path;
        this.tolerance = tolerance;
    }

    /**
     * Goes along a curve that begins where the path stands.
     *
     * @param tolerance greatest distance from the curve, metres
     * @param end where it ends, to the bit
     */
    public static void follow(Curve curve, PathBuilder path, double tolerance, Coordinate end) {
        ArcFitter fitter = new ArcFitter(curve, path, tolerance);
        for (int s = 0; s < curve.spanCount(); s++) {
            double from = curve.spanStart(s);
            double to = curve.spanEnd(s);
            double middle = 0.5 * (from + to);
            Coordinate last = s + 1 == curve.spanCount() ? end : null;
            // A span may have a turn each way, which a few samples would not see.
            fitter.follow(s, from, middle, null, DEEPEST);
            fitter.follow(s, middle, to, last, DEEPEST);
        }
    }

    private void follow(int span, double from, double to, Coordinate fixedEnd, int depth) {
        double[] a = end(span, from, to);
        double[] b = end(span, to, from);
        Coordinate end = fixedEnd != null ? fixedEnd : new Coordinate(b[0], b[1]);
        for (int i = 0; i < points.length; i++) {
            curve.at(span, from + (to - from) * (i + 1) / SAMPLES, sample);
            points[i][0] = sample[0];
            points[i][1] = sample[1];
        }
        // What is not finite is no curve; whoever reads the path finds that out.
        boolean finite = Double.isFinite(a[0] + a[1] + a[2] + a[3] + b[0] + b[1] + b[2] + b[3]);
        if (depth == 0 || !finite || isStraight(a, b)) {
            path.lineTo(end);
            return;
        }
        if (fitPair(a, b, end)) {
            return;
        }
        double middle = 0.5 * (from + to);
        follow(span, from, middle, null, depth - 1);
        follow(span, middle, to, fixedEnd, depth - 1);
    }

    /** Place and unit tangent at one end of a stretch. */
    private double[] end(int span, double t, double other) {
        curve.at(span, t, sample);
        double[] end = sample.clone();
        double speed = Math.hypot(end[2], end[3]);
        curve.at(span, t + 1e-3 * (other - t), sample);
        double dx = sample[0] - end[0];
        double dy = sample[1] - end[1];
        double near = Math.hypot(dx, dy);
        double sign = other > t ? 1 : -1;
        if (speed * Math.abs(1e-3 * (other - t)) < 1e-2 * near) {
            // The curve stands still here: its direction is that of its next piece.
            end[2] = sign * dx / near;
            end[3] = sign * dy / near;
        } else if (speed > 0) {
            end[2] /= speed;
            end[3] /= speed;
        }
        return end;
    }

    private boolean isStraight(double[] a, double[] b) {
        double ux = b[0] - a[0];
        double uy = b[1] - a[1];
        double length = Math.hypot(ux, uy);
        double along = 0;
        for (double[] p : points) {
            double px = p[0] - a[0];
            double py = p[1] - a[1];
            double t = length > 0 ? (px * ux + py * uy) / length : 0;
            double off = length > 0 ? Math.abs(ux * py - uy * px) / length : Math.hypot(px, py);
            if (off > STRAIGHT * tolerance || t < along || t > length) {
                return length <= STRAIGHT * tolerance && Math.hypot(px, py) <= STRAIGHT * tolerance;
            }
            along = t;
        }
        return true;
    }

    /** Goes along the pair of arcs between two ends, if it is near enough to the curve. */
    private boolean fitPair(double[] a, double[] b, Coordinate end) {
        double vx = b[0] - a[0];
        double vy = b[1] - a[1];
        double vv = vx * vx + vy * vy;
        double alongStart = vx * a[2] + vy * a[3];
        double alongEnd = vx * b[2] + vy * b[3];
        double length = Math.sqrt(vv);
        // Each arc is to turn by less than a quarter.
        if (!(alongStart > 0.7 * length) || !(alongEnd > 0.7 * length)) {
            return false;
        }
        double vt = alongStart + alongEnd;
        double cos = a[2] * b[2] + a[3] * b[3];
        double d = vv / (vt + Math.sqrt(vt * vt + 2 * Math.max(0, 1 - cos) * vv));
        Coordinate middle =
                new Coordinate(0.5 * (a[0] + b[0] + d * (a[2] - b[2])), 0.5 * (a[1] + b[1] + d * (a[3] - b[3])));
        Circle first = tangentCircle(a[0], a[1], a[2], a[3], middle);
        Circle second = tangentCircle(b[0], b[1], -b[2], -b[3], middle);
        for (double[] p : points) {
            boolean inFirst = (p[0] - middle.x) * vx + (p[1] - middle.y) * vy < 0;
            double off = inFirst
                    ? distance(first, a[0], a[1], middle.x, middle.y, p)
                    : distance(second, middle.x, middle.y, b[0], b[1], p);
            if (!(off <= ROOM * tolerance)) {
                return false;
            }
        }
        go(first, middle);
        go(second, end);
        return true;
    }

    private void go(Circle circle, Coordinate to) {
        Coordinate from = path.end();
        if (circle == null || from.equals2D(to)) {
            path.lineTo(to);
        } else {
            path.arcTo(circle, to, circle.turn(from.x, from.y, to.x, to.y) > 0);
        }
    }

    /** The circle through two points that has this tangent in the first; null where the arc is as good as straight. */
    private Circle tangentCircle(double x, double y, double tx, double ty, Coordinate to) {
        double cx = to.x - x;
        double cy = to.y - y;
        double across = tx * cy - ty * cx; // to the left of the tangent
        double cc = cx * cx + cy * cy;
        if (Math.abs(across) <= 2 * STRAIGHT * tolerance) {
            return null;
        }
        double radius = cc / (2 * across);
        return new Circle(x - ty * radius, y + tx * radius, Math.abs(radius));
    }

    private static double distance(Circle circle, double ax, double ay, double bx, double by, double[] p) {
        if (circle != null) {
            return Math.abs(circle.offset(p[0], p[1]));
        }
        double length = Math.hypot(bx - ax, by - ay);
        return length > 0
                ? Math.abs((bx - ax) * (p[1] - ay) - (by - ay) * (p[0] - ax)) / length
                : Math.hypot(p[0] - ax, p[1] - ay);
    }
}
