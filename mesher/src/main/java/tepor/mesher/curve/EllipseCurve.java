package tepor.mesher.curve;

import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.PathBuilder;

/**
 * An elliptic or circular arc: centre + cos t · u + sin t · v, for t from {@code from} to {@code to}. u and v are any two
 * half diameters that are conjugate; where they are as long and at right angles, the arc is circular.
 *
 * @param x centre, metres
 * @param y centre, metres
 * @param to radians; greater than from
 */
public record EllipseCurve(double x, double y, double ux, double uy, double vx, double vy, double from, double to)
        implements Curve {
    private static final double ROUND = 1e-12;
    private static final double WHOLE = 1e-9;

    /** An arc of a circle, counter-clockwise. */
    public static EllipseCurve circular(double x, double y, double radius, double from, double to) {
        return new EllipseCurve(x, y, radius, 0, 0, radius, from, to);
    }

    /** The arc where a placement lays it. */
    public EllipseCurve placed(Placement p) {
        Coordinate centre = p.apply(x, y);
        return new EllipseCurve(
                centre.x,
                centre.y,
                p.vectorX(ux, uy),
                p.vectorY(ux, uy),
                p.vectorX(vx, vy),
                p.vectorY(vx, vy),
                from,
                to);
    }

    /** Whether the arc ends where it begins. */
    public boolean isWhole() {
        return to - from >= 2 * Math.PI * (1 - WHOLE);
    }

    public boolean isCircular() {
        double u = Math.hypot(ux, uy);
        double v = Math.hypot(vx, vy);
        return Math.abs(u - v) <= ROUND * u && Math.abs(ux * vx + uy * vy) <= ROUND * u * v;
    }

    /** Where the arc begins, metres. */
    public Coordinate start() {
        return point(from);
    }

    /** Where the arc ends, metres. */
    public Coordinate end() {
        return isWhole() ? start() : point(to);
    }

    /**
     * Goes along the arc: where it is circular exactly, else along circular arcs that leave it nowhere by more than the
     * tolerance (metres).
     */
    public void follow(PathBuilder path, double tolerance) {
        follow(path, tolerance, end());
    }

    /** As {@link #follow(PathBuilder, double)}, with the end of the arc given to the bit. */
    public void follow(PathBuilder path, double tolerance, Coordinate end) {
        if (isCircular()) {
            path.arcTo(new Circle(x, y, Math.hypot(ux, uy)), end, ux * vy - uy * vx > 0);
        } else {
            ArcFitter.follow(this, path, tolerance, end);
        }
    }

    /** Greatest diameter, metres, or somewhat more. */
    public double extent() {
        return 2 * Math.hypot(Math.hypot(ux, uy), Math.hypot(vx, vy));
    }

    private Coordinate point(double t) {
        double cos = Placement.cos(t);
        double sin = Placement.sin(t);
        return new Coordinate(x + cos * ux + sin * vx, y + cos * uy + sin * vy);
    }

    /** Spans turn by an eighth of a turn at most. */
    @Override
    public int spanCount() {
        return Math.max(1, (int) Math.ceil((to - from) / (Math.PI / 4) - WHOLE));
    }

    @Override
    public double spanStart(int span) {
        return from + (to - from) * span / spanCount();
    }

    @Override
    public double spanEnd(int span) {
        return spanStart(span + 1);
    }

    @Override
    public void at(int span, double t, double[] result) {
        double cos = Placement.cos(t);
        double sin = Placement.sin(t);
        result[0] = x + cos * ux + sin * vx;
        result[1] = y + cos * uy + sin * vy;
        result[2] = -sin * ux + cos * vx;
        result[3] = -sin * uy + cos * vy;
    }
}
