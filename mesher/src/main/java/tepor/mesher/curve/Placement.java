package tepor.mesher.curve;

import org.locationtech.jts.geom.Coordinate;

/**
 * An affine map of the plane: x' = xx·x + xy·y + dx, y' = yx·x + yy·y + dy. Lengths in metres.
 */
public record Placement(double xx, double xy, double yx, double yy, double dx, double dy) {
    /** Leaves everything where it is, to the bit. */
    public static final Placement IDENTITY = new Placement(1, 0, 0, 1, 0, 0);
    /** Mirrors x, to the bit. */
    public static final Placement MIRROR_X = new Placement(-1, 0, 0, 1, 0, 0);

    private static final double SAME_SHAPE = 1e-12;
    private static final double ROUND_OFF = 4e-16;

    public static Placement shift(double dx, double dy) {
        return new Placement(1, 0, 0, 1, dx, dy);
    }

    public static Placement scale(double x, double y) {
        return new Placement(x, 0, 0, y, 0, 0);
    }

    /** Counter-clockwise about the origin, radians; exact at quarter turns. */
    public static Placement turn(double angle) {
        double cos = cos(angle);
        double sin = sin(angle);
        return new Placement(cos, -sin, sin, cos, 0, 0);
    }

    /** Cosine that is exactly 0 where it misses 0 by the round-off of the angle. */
    static double cos(double angle) {
        double cos = Math.cos(angle);
        return Math.abs(cos) <= ROUND_OFF ? 0 : cos;
    }

    /** Sine that is exactly 0 where it misses 0 by the round-off of the angle. */
    static double sin(double angle) {
        double sin = Math.sin(angle);
        return Math.abs(sin) <= ROUND_OFF ? 0 : sin;
    }

    /** This map, and then another one. */
    public Placement then(Placement o) {
        return new Placement(
                o.xx * xx + o.xy * yx,
                o.xx * xy + o.xy * yy,
                o.yx * xx + o.yy * yx,
                o.yx * xy + o.yy * yy,
                o.xx * dx + o.xy * dy + o.dx,
                o.yx * dx + o.yy * dy + o.dy);
    }

    public Coordinate apply(double x, double y) {
        return new Coordinate(xx * x + xy * y + dx, yx * x + yy * y + dy);
    }

    /** x of a vector, which is not shifted. */
    double vectorX(double x, double y) {
        return xx * x + xy * y;
    }

    /** y of a vector, which is not shifted. */
    double vectorY(double x, double y) {
        return yx * x + yy * y;
    }

    /** Whether circles stay circles. */
    public boolean keepsShape() {
        double first = Math.hypot(xx, yx);
        double second = Math.hypot(xy, yy);
        return Math.abs(first - second) <= SAME_SHAPE * first
                && Math.abs(xx * xy + yx * yy) <= SAME_SHAPE * first * second;
    }

    /** Whether left becomes right. */
    public boolean mirrors() {
        return xx * yy - xy * yx < 0;
    }

    /** Whether areas vanish, or something is not finite. */
    public boolean isFlat() {
        double area = xx * yy - xy * yx;
        return area == 0 || !Double.isFinite(area) || !Double.isFinite(dx) || !Double.isFinite(dy);
    }
}
