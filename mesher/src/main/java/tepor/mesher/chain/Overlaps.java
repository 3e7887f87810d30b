package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.Circle;

/**
 * Finds what was drawn twice among open strands, and takes it once. Pieces that lie over each other in part are cut where
 * either ends.
 */
final class Overlaps {
    private final List<Strand> strands;
    private final double snap;
    private final List<Piece> pieces = new ArrayList<>();
    private final List<Strand> once = new ArrayList<>();
    private boolean found;
    private int doubled;
    private Strand firstDoubled;

    /** One piece of a strand, and the points of others at which it is cut. */
    private static final class Piece {
        private final int strand;
        private final Coordinate a;
        private final Coordinate b;
        private final Circle circle;
        private final double chord;
        private final double length; // along the arc if it is one
        private final List<Coordinate> cuts = new ArrayList<>(0);

        private Piece(int strand, Coordinate a, Coordinate b, Circle circle) {
            this.strand = strand;
            this.a = a;
            this.b = b;
            this.circle = circle;
            chord = a.distance(b);
            length = circle == null ? chord : circle.arcLength(chord);
        }

        /** How far along the piece a point lies, metres along the chord, or metres of arc; NaN where it is off by more than snap. */
        private double along(Coordinate p, double snap) {
            if (circle == null) {
                double ux = (b.x - a.x) / chord;
                double uy = (b.y - a.y) / chord;
                double off = ux * (p.y - a.y) - uy * (p.x - a.x);
                return Math.abs(off) <= snap ? ux * (p.x - a.x) + uy * (p.y - a.y) : Double.NaN;
            }
            if (Math.abs(circle.offset(p.x, p.y)) > snap) {
                return Double.NaN;
            }
            double turn = circle.turn(a.x, a.y, b.x, b.y);
            return circle.radius() * Math.signum(turn) * circle.turn(a.x, a.y, p.x, p.y);
        }

        private boolean isLike(Piece other, double snap) {
            if (circle == null || other.circle == null) {
                return circle == null && other.circle == null;
            }
            return Math.hypot(circle.x() - other.circle.x(), circle.y() - other.circle.y()) <= snap
                    && Math.abs(circle.radius() - other.circle.radius()) <= snap;
        }
    }

    /** Ends, in either order, and the middle: what tells pieces apart. */
    private record Key(int low, int high, int middle) {}

    private Overlaps(List<Strand> strands, double snap) {
        this.strands = strands;
        this.snap = snap;
        for (int s = 0; s < strands.size(); s++) {
            Strand strand = strands.get(s);
            for (int i = 0; i < strand.pieceCount(); i++) {
                pieces.add(new Piece(
                        s,
                        strand.points().get(i),
                        strand.points().get(i + 1),
                        strand.circles().get(i)));
            }
        }
    }

    /** The strands, in the order drawn, without what lies twice. */
    static Overlaps resolve(List<Strand> strands, double snap) {
        Overlaps overlaps = new Overlaps(strands, snap);
        overlaps.cut();
        if (overlaps.found) {
            overlaps.takeOnce();
        } else {
            overlaps.once.addAll(strands);
        }
        return overlaps;
    }

    List<Strand> strands() {
        return once;
    }

    /** How many strands lay wholly or in part over others. */
    int doubled() {
        return doubled;
    }

    /** The first of them; null where there is none. */
    Strand firstDoubled() {
        return firstDoubled;
    }

    private void cut() {
        HPRtree index = new HPRtree();
        for (int i = 0; i < pieces.size(); i++) {
            index.insert(box(pieces.get(i)), i);
        }
        for (int i = 0; i < pieces.size(); i++) {
            Piece one = pieces.get(i);
            int number = i;
            index.query(box(one), item -> {
                if ((Integer) item > number) {
                    cut(one, pieces.get((Integer) item));
                }
            });
        }
    }

    private Envelope box(Piece p) {
        Envelope box = Strand.box(p.a, p.b, p.circle);
        box.expandBy(snap);
        return box;
    }

    private void cut(Piece one, Piece other) {
        Piece longer = one.length >= other.length ? one : other;
        Piece shorter = longer == one ? other : one;
        if (!one.isLike(other, snap)) {
            return;
        }
        double from = longer.along(shorter.a, snap);
        double to = longer.along(shorter.b, snap);
        double common = Math.min(longer.length, Math.max(from, to)) - Math.max(0, Math.min(from, to));
        if (!(common > 2 * snap)) {
            return; // also where either is off
        }
        found = true;
        cutAt(longer, shorter.a, from);
        cutAt(longer, shorter.b, to);
        cutAt(shorter, longer.a, shorter.along(longer.a, snap));
        cutAt(shorter, longer.b, shorter.along(longer.b, snap));
    }

    private void cutAt(Piece piece, Coordinate p, double along) {
        if (along > snap && along < piece.length - snap) {
            piece.cuts.add(p);
        }
    }

    private void takeOnce() {
        PointGrid ends = new PointGrid(snap);
        PointGrid middles = new PointGrid(2 * snap);
        Set<Key> taken = new HashSet<>();
        int at = 0;
        for (int s = 0; s < strands.size(); s++) {
            Run run = new Run(strands.get(s).source());
            boolean whole = true;
            for (; at < pieces.size() && pieces.get(at).strand == s; at++) {
                whole &= addParts(pieces.get(at), run, ends, middles, taken);
            }
            run.close();
            if (whole) {
                once.add(strands.get(s));
                continue;
            }
            doubled++;
            firstDoubled = firstDoubled == null ? strands.get(s) : firstDoubled;
            once.addAll(run.strands);
        }
    }

    /** Adds those parts of a piece that are new; gives whether all are. */
    private boolean addParts(Piece piece, Run run, PointGrid ends, PointGrid middles, Set<Key> taken) {
        piece.cuts.sort(Comparator.comparingDouble(c -> piece.along(c, snap)));
        List<Coordinate> stops = new ArrayList<>(piece.cuts);
        stops.add(piece.b);
        boolean whole = true;
        Coordinate from = piece.a;
        for (int i = 0; i < stops.size(); i++) {
            Coordinate to = stops.get(i);
            int first = ends.number(from);
            int last = ends.number(to);
            if (first == last && i + 1 < stops.size()) {
                continue; // cut twice at one point
            }
            Key key = new Key(
                    Math.min(first, last),
                    Math.max(first, last),
                    middles.number(Strand.middle(from, to, piece.circle)));
            if (first == last || taken.add(key)) {
                run.add(from, to, piece);
            } else {
                run.close();
                whole = false;
            }
            from = to;
        }
        return whole;
    }

    /** Collects parts that follow on each other; those of one piece become one again. */
    private static final class Run {
        private final int source;
        private final List<Strand> strands = new ArrayList<>();
        private List<Coordinate> points = new ArrayList<>();
        private List<Circle> circles = new ArrayList<>();
        private Piece last;

        private Run(int source) {
            this.source = source;
        }

        private void add(Coordinate from, Coordinate to, Piece piece) {
            if (points.isEmpty()) {
                points.add(from);
            }
            if (piece == last) {
                points.set(points.size() - 1, to);
            } else {
                points.add(to);
                circles.add(piece.circle);
            }
            last = piece;
        }

        private void close() {
            if (!circles.isEmpty()) {
                strands.add(new Strand(points, circles, source));
            }
            points = new ArrayList<>();
            circles = new ArrayList<>();
            last = null;
        }
    }
}
