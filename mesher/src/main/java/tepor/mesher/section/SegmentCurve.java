package tepor.mesher.section;

import tepor.mesher.outline.Circle;

/** How a segment of a section runs between its vertices: straight, or along the shorter arc of its circle. */
public final class SegmentCurve {
    private SegmentCurve() {}

    /**
     * Points along a segment from one of its vertices to the other, both among them, so close that the lines between them
     * are nowhere farther off than a tolerance.
     *
     * @param fromStart whether they begin at the segment's start rather than its end
     * @param tolerance metres
     * @return x and y of each in turn, metres
     */
    public static double[] points(Section section, int segment, boolean fromStart, double tolerance) {
        int from = fromStart ? section.start(segment) : section.end(segment);
        int to = fromStart ? section.end(segment) : section.start(segment);
        return points(
                section.circle(segment), section.x(from), section.y(from), section.x(to), section.y(to), tolerance);
    }

    static double[] points(Circle circle, double ax, double ay, double bx, double by, double tolerance) {
        if (circle == null) {
            return new double[] {ax, ay, bx, by};
        }
        double turn = circle.turn(ax, ay, bx, by);
        // A chord over the angle α is off its arc by r·(1 − cos(α/2)).
        double step = 2 * Math.acos(Math.max(0, 1 - tolerance / circle.radius()));
        int count = (int) Math.max(1, Math.ceil(Math.abs(turn) / step));
        double[] xy = new double[2 * count + 2];
        double start = Math.atan2(ay - circle.y(), ax - circle.x());
        for (int i = 1; i < count; i++) {
            double angle = start + turn * i / count;
            xy[2 * i] = circle.x() + circle.radius() * Math.cos(angle);
            xy[2 * i + 1] = circle.y() + circle.radius() * Math.sin(angle);
        }
        xy[0] = ax;
        xy[1] = ay;
        xy[2 * count] = bx;
        xy[2 * count + 1] = by;
        return xy;
    }

    /**
     * The direction in which a segment leaves one of its vertices, radians: along the tangent of an arc.
     *
     * @param atStart whether its start is meant rather than its end
     */
    public static double direction(Section section, int segment, boolean atStart) {
        int from = atStart ? section.start(segment) : section.end(segment);
        int to = atStart ? section.end(segment) : section.start(segment);
        return direction(section.circle(segment), section.x(from), section.y(from), section.x(to), section.y(to));
    }

    static double direction(Circle circle, double ax, double ay, double bx, double by) {
        double chord = Math.atan2(by - ay, bx - ax);
        // The angle between tangent and chord is half that by which the arc turns (Euclid, Elements III.32).
        return circle == null ? chord : chord - 0.5 * circle.turn(ax, ay, bx, by);
    }
}
