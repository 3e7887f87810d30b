package tepor.mesher.soundness;

import java.util.Optional;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineSegment;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.ArcCutter;

/** Two pieces of borders that come closer than a gap's greatest width. */
public final class NearPair {
    /** Pieces that part by more than this share of their length do not run side by side. */
    private static final double PARALLEL = 0.02;

    /** What a wedge counts for in length over width, for each e-fold of its width. */
    private static final double WEDGE = 5;

    /** What lies between the two. */
    public enum Between {
        /** Nothing long: a point nears a piece. */
        POINT,
        /** What is in neither region. */
        GAP,
        /** What is in both. */
        OVERLAP,
        /** What is in the region of p only. */
        STRIP_OF_P,
        /** What is in the region of q only. */
        STRIP_OF_Q
    }

    /** The one piece, as {@link DrawnPieces} counts them. */
    public final int p;
    /** The other piece. */
    public final int q;
    /** Whether they touch, cross, or are joined within reach. */
    boolean meets;
    /** Whether they properly cross. */
    final boolean crosses;
    /** Least distance, metres. */
    public final double distance;
    /** Where they are nearest, metres. */
    final Coordinate nearest;
    /** Least distance of an end from the other piece that is beyond snap but not beyond a near point's; NaN without. */
    final double endDistance;
    /** Where that end is; null without. */
    final Coordinate endPlace;
    /** Over what length they run side by side beyond snap, metres. */
    public double length;
    /** Integral of length over width there. */
    double lengthOverWidth;
    /** Least width there, metres. */
    double width = Double.POSITIVE_INFINITY;
    /** Greatest width there, metres. */
    double widest;
    /** Middle of the strip between them there, metres; null without. */
    LineSegment middle;

    Between between = Between.POINT;

    private NearPair(
            int p,
            int q,
            boolean crosses,
            double distance,
            Coordinate nearest,
            double endDistance,
            Coordinate endPlace) {
        this.p = p;
        this.q = q;
        this.crosses = crosses;
        this.distance = distance;
        this.nearest = nearest;
        this.endDistance = endDistance;
        this.endPlace = endPlace;
    }

    /** Looks at two pieces; empty where they are farther apart than a gap. */
    static Optional<NearPair> of(DrawnPieces pieces, int p, int q, Closeness closeness) {
        double[] fromEnds = {
            pieces.distance(pieces.start(p), q),
            pieces.distance(pieces.end(p), q),
            pieces.distance(pieces.start(q), p),
            pieces.distance(pieces.end(q), p)
        };
        Coordinate[] ends = {pieces.start(p), pieces.end(p), pieces.start(q), pieces.end(q)};
        boolean crosses = crosses(pieces, p, q) && !isSameCircle(pieces, p, q, closeness);
        double least = crosses ? 0 : Double.POSITIVE_INFINITY;
        Coordinate nearest = crosses ? crossing(pieces, p, q) : ends[0];
        double endDistance = Double.NaN;
        Coordinate endPlace = null;
        for (int i = 0; i < 4; i++) {
            if (fromEnds[i] < least) {
                least = fromEnds[i];
                nearest = ends[i];
            }
            // The short side itself is reported where its two points are.
            boolean ofShort = pieces.length(i < 2 ? p : q) <= closeness.nearPoint();
            if (fromEnds[i] > closeness.snap() && fromEnds[i] <= closeness.nearPoint() && !ofShort) {
                if (Double.isNaN(endDistance) || fromEnds[i] < endDistance) {
                    endDistance = fromEnds[i];
                    endPlace = ends[i];
                }
            }
        }
        if (least > closeness.gap()) {
            return Optional.empty();
        }
        NearPair pair = new NearPair(p, q, crosses, least, nearest, endDistance, endPlace);
        pair.meets = least <= closeness.snap();
        if (!isSameCircle(pieces, p, q, closeness)) {
            pair.sideBySide(pieces, closeness);
        }
        return Optional.of(pair);
    }

    private static boolean isSameCircle(DrawnPieces pieces, int p, int q, Closeness closeness) {
        return ArcCutter.isSameCircle(pieces.circle(p), pieces.circle(q), closeness.snap());
    }

    private static boolean crosses(DrawnPieces pieces, int p, int q) {
        return Orientation.index(pieces.start(p), pieces.end(p), pieces.start(q))
                                * Orientation.index(pieces.start(p), pieces.end(p), pieces.end(q))
                        < 0
                && Orientation.index(pieces.start(q), pieces.end(q), pieces.start(p))
                                * Orientation.index(pieces.start(q), pieces.end(q), pieces.end(p))
                        < 0;
    }

    private static Coordinate crossing(DrawnPieces pieces, int p, int q) {
        Coordinate at = new LineSegment(pieces.start(p), pieces.end(p))
                .intersection(new LineSegment(pieces.start(q), pieces.end(q)));
        return at == null ? pieces.start(p) : at;
    }

    private void sideBySide(DrawnPieces pieces, Closeness closeness) {
        double f0 = pieces.along(pieces.start(p), q);
        double f1 = pieces.along(pieces.end(p), q);
        double[] facing = within(f0, f1, 0, 1, 0, 1);
        double pieceLength = pieces.length(p);
        if ((facing[1] - facing[0]) * pieceLength <= closeness.snap()) {
            return;
        }
        double from = offset(pieces, facing[0]);
        double to = offset(pieces, facing[1]);
        double faced = (facing[1] - facing[0]) * pieceLength;
        if (Math.abs(to - from) > PARALLEL * faced) {
            return;
        }
        double[] near = within(from, to, -closeness.gap(), closeness.gap(), 0, 1);
        double[] touching = within(from, to, -closeness.snap(), closeness.snap(), near[0], near[1]);
        boolean parted = touching[0] >= touching[1];
        double[][] parts =
                parted ? new double[][] {near} : new double[][] {{near[0], touching[0]}, {touching[1], near[1]}};
        double longest = 0;
        for (double[] part : parts) {
            double partLength = (part[1] - part[0]) * faced;
            if (partLength > closeness.snap()) {
                double w0 = Math.abs(from + part[0] * (to - from));
                double w1 = Math.abs(from + part[1] * (to - from));
                length += partLength;
                // Between sides that meet, refinement stops at the angle that they make.
                lengthOverWidth += meets ? WEDGE * Math.abs(Math.log(w1 / w0)) : partLength * meanInverse(w0, w1);
                width = Math.min(width, Math.max(closeness.snap(), Math.min(w0, w1)));
                widest = Math.max(widest, Math.max(w0, w1));
                if (partLength > longest) {
                    longest = partLength;
                    double t = 0.5 * (part[0] + part[1]);
                    place(pieces, facing, part, from + t * (to - from));
                }
            }
        }
    }

    /** Mean of 1/w for w from w0 to w1 in a straight line. */
    private static double meanInverse(double w0, double w1) {
        return Math.abs(w1 - w0) < 1e-6 * w0 ? 1 / w0 : Math.log(w1 / w0) / (w1 - w0);
    }

    /** The part of [lo, hi] in which a value that runs from a (at 0) to b (at 1) lies in [least, most]; empty where reversed. */
    private static double[] within(double a, double b, double least, double most, double lo, double hi) {
        if (a == b) {
            return a >= least && a <= most ? new double[] {lo, hi} : new double[] {hi, lo};
        }
        double t0 = (least - a) / (b - a);
        double t1 = (most - a) / (b - a);
        return new double[] {Math.max(lo, Math.min(t0, t1)), Math.min(hi, Math.max(t0, t1))};
    }

    /** Signed distance of the place at t of p from q, metres: positive on the left of q. */
    private double offset(DrawnPieces pieces, double t) {
        Coordinate at = at(pieces, t);
        Circle circle = pieces.circle(q);
        if (circle == null) {
            return pieces.offset(at, q);
        }
        boolean counterClockwise = pieces.offset(new Coordinate(circle.x(), circle.y()), q) > 0;
        return counterClockwise ? -circle.offset(at.x, at.y) : circle.offset(at.x, at.y);
    }

    private Coordinate at(DrawnPieces pieces, double t) {
        Coordinate chord = new LineSegment(pieces.start(p), pieces.end(p)).pointAlong(t);
        Circle circle = pieces.circle(p);
        return circle == null ? chord : circle.nearest(chord.x, chord.y);
    }

    private void place(DrawnPieces pieces, double[] facing, double[] part, double offset) {
        Coordinate a = at(pieces, facing[0] + part[0] * (facing[1] - facing[0]));
        Coordinate b = at(pieces, facing[0] + part[1] * (facing[1] - facing[0]));
        double qx = pieces.end(q).x - pieces.start(q).x;
        double qy = pieces.end(q).y - pieces.start(q).y;
        double shift = -0.5 * offset / Math.hypot(qx, qy);
        // To the left of q is (−qy, qx); p lies there where the offset is positive, the middle back from p.
        middle = new LineSegment(a.x - shift * qy, a.y + shift * qx, b.x - shift * qy, b.y + shift * qx);
        boolean sameWay = (pieces.end(p).x - pieces.start(p).x) * qx + (pieces.end(p).y - pieces.start(p).y) * qy > 0;
        boolean inQ = offset > 0;
        boolean inP = sameWay != inQ;
        between = inP ? (inQ ? Between.OVERLAP : Between.STRIP_OF_P) : (inQ ? Between.STRIP_OF_Q : Between.GAP);
    }
}
