package tepor.solver.bracket;

import java.util.Optional;
import tepor.mesher.section.Section;

/**
 * A section seen from a centre: pieces of its segments in polar coordinates, v = −angle across and r along, so that v and r
 * are right-handed as x and y are. Each piece's r changes one way only: segments are split where they come nearest.
 */
final class Polar {
    final double centreX;
    final double centreY;

    /** Number of pieces; those across the cut at ±π stand twice, once on each end of the range of v. */
    final int count;

    /** Segment of each piece. */
    final int[] segment;

    /** 4·count: x and y of the piece's begin and end from the centre, in the direction of its segment. */
    final double[] xy;

    /** Least and greatest v of each piece; equal for one that points at the centre. */
    final double[] lowV;

    final double[] highV;

    /** Least and greatest r of each piece. */
    final double[] lowR;

    final double[] highR;

    private final Section section;

    private Polar(Section section, double centreX, double centreY) {
        this.section = section;
        this.centreX = centreX;
        this.centreY = centreY;
        int most = 4 * section.segmentCount();
        segment = new int[most];
        xy = new double[4 * most];
        lowV = new double[most];
        highV = new double[most];
        lowR = new double[most];
        highR = new double[most];
        int n = 0;
        for (int s = 0; s < section.segmentCount(); s++) {
            double ax = section.x(section.start(s)) - centreX;
            double ay = section.y(section.start(s)) - centreY;
            double bx = section.x(section.end(s)) - centreX;
            double by = section.y(section.end(s)) - centreY;
            double t = foot(ax, ay, bx, by);
            if (t > 0 && t < 1) {
                double fx = (1 - t) * ax + t * bx;
                double fy = (1 - t) * ay + t * by;
                n = add(n, s, ax, ay, fx, fy);
                n = add(n, s, fx, fy, bx, by);
            } else {
                n = add(n, s, ax, ay, bx, by);
            }
        }
        count = n;
        Sweep.join(lowV, highV, count, 1e-10);
        Sweep.join(lowR, highR, count, 1e-9 * section.extent());
    }

    /** The section seen from a point; empty where a segment comes so near to it that angles mean nothing. */
    static Optional<Polar> of(Section section, double x, double y) {
        double near = 1e-6 * section.extent();
        for (int s = 0; s < section.segmentCount(); s++) {
            double ax = section.x(section.start(s)) - x;
            double ay = section.y(section.start(s)) - y;
            double bx = section.x(section.end(s)) - x;
            double by = section.y(section.end(s)) - y;
            double t = Math.max(0, Math.min(1, foot(ax, ay, bx, by)));
            if (Math.hypot((1 - t) * ax + t * bx, (1 - t) * ay + t * by) < near) {
                return Optional.empty();
            }
        }
        return Optional.of(new Polar(section, x, y));
    }

    /** Where on the line from a to b (0 to 1) the origin is nearest. */
    private static double foot(double ax, double ay, double bx, double by) {
        double dx = bx - ax;
        double dy = by - ay;
        return -(ax * dx + ay * dy) / (dx * dx + dy * dy);
    }

    private int add(int n, int s, double ax, double ay, double bx, double by) {
        double a = -Math.atan2(ay, ax);
        double turn = -Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
        double low = turn < 0 ? a + turn : a;
        double high = turn < 0 ? a : a + turn;
        if (low < -Math.PI) {
            low += 2 * Math.PI;
            high += 2 * Math.PI;
        }
        put(n, s, ax, ay, bx, by, low, high);
        if (high > Math.PI) {
            put(n + 1, s, ax, ay, bx, by, low - 2 * Math.PI, high - 2 * Math.PI);
            // Circles meet each piece once: the second standing has no extent along r.
            lowR[n + 1] = highR[n + 1];
            return n + 2;
        }
        return n + 1;
    }

    private void put(int n, int s, double ax, double ay, double bx, double by, double low, double high) {
        segment[n] = s;
        xy[4 * n] = ax;
        xy[4 * n + 1] = ay;
        xy[4 * n + 2] = bx;
        xy[4 * n + 3] = by;
        lowV[n] = low;
        highV[n] = high;
        double ra = Math.hypot(ax, ay);
        double rb = Math.hypot(bx, by);
        lowR[n] = Math.min(ra, rb);
        highR[n] = Math.max(ra, rb);
    }

    /** r where a piece meets the ray at v. */
    double rAt(int piece, double v) {
        double ex = Math.cos(v);
        double ey = -Math.sin(v);
        double ax = xy[4 * piece];
        double ay = xy[4 * piece + 1];
        double dx = xy[4 * piece + 2] - ax;
        double dy = xy[4 * piece + 3] - ay;
        return (ax * dy - ay * dx) / (ex * dy - ey * dx);
    }

    /** v, from −π to π, where a piece meets the circle of radius r. */
    double vAt(int piece, double r) {
        double ax = xy[4 * piece];
        double ay = xy[4 * piece + 1];
        double dx = xy[4 * piece + 2] - ax;
        double dy = xy[4 * piece + 3] - ay;
        double length = Math.hypot(dx, dy);
        double along = (ax * dx + ay * dy) / length;
        double off = (ax * dy - ay * dx) / length;
        double reach = Math.sqrt(Math.max(0, (r - Math.abs(off)) * (r + Math.abs(off))));
        double t = (outward(piece) ? reach - along : -reach - along) / length;
        return -Math.atan2(ay + t * dy, ax + t * dx);
    }

    /** |n·e|, n being the normal of a piece and e the direction of the ray at v. */
    double facing(int piece, double v) {
        double dx = xy[4 * piece + 2] - xy[4 * piece];
        double dy = xy[4 * piece + 3] - xy[4 * piece + 1];
        return Math.abs(Math.cos(v) * dy + Math.sin(v) * dx) / Math.hypot(dx, dy);
    }

    /** Region beyond a piece for who moves outward. */
    int beyondAlong(int piece) {
        return clockwise(piece) ? section.left(segment[piece]) : section.right(segment[piece]);
    }

    /** Region before a piece for who moves outward. */
    int beforeAlong(int piece) {
        return clockwise(piece) ? section.right(segment[piece]) : section.left(segment[piece]);
    }

    /** Region beyond a piece for who moves with growing v. */
    int beyondAcross(int piece) {
        return outward(piece) ? section.right(segment[piece]) : section.left(segment[piece]);
    }

    private boolean clockwise(int piece) {
        return xy[4 * piece] * xy[4 * piece + 3] - xy[4 * piece + 1] * xy[4 * piece + 2] < 0;
    }

    private boolean outward(int piece) {
        return Math.hypot(xy[4 * piece + 2], xy[4 * piece + 3]) > Math.hypot(xy[4 * piece], xy[4 * piece + 1]);
    }

    /** Whether a region (or none) is of material. */
    boolean isSolid(int region) {
        return region != Section.NONE && !section.isHole(region);
    }
}
