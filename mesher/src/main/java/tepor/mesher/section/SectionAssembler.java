package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.Circle;

/** Makes the section from faces and their owners: keeps what separates something, and splits it where asked. */
final class SectionAssembler {
    private final List<RegionShape> shapes;
    private final double snap;
    private final VertexGrid vertices;
    private final int drawnCount;
    private final List<Border> borders;
    private final Faces faces;
    private final FaceOwners owners;
    private final List<Piece> pieces = new ArrayList<>();

    /** A segment to be. */
    private record Piece(int start, int end, Circle circle, int left, int right, boolean outer) {
        Piece reversed() {
            return new Piece(/* start= */ end, /* end= */ start, circle, /* left= */ right, /* right= */ left, outer);
        }

        Piece part(int newStart, int newEnd) {
            return new Piece(newStart, newEnd, circle, left, right, outer);
        }
    }

    SectionAssembler(List<RegionShape> shapes, double snap, BorderNoder noder, Faces faces, FaceOwners owners) {
        this.shapes = shapes;
        this.snap = snap;
        this.vertices = noder.vertices();
        this.drawnCount = noder.drawnCount();
        this.borders = noder.borders();
        this.faces = faces;
        this.owners = owners;
    }

    /** @param splitPoints where segments are split that they lie on within snap, metres */
    Section assemble(List<Coordinate> splitPoints) {
        collect();
        joinAtHiddenCrossings();
        split(splitPoints);
        return section();
    }

    private boolean isEmpty(int region) {
        return region == Section.NONE || shapes.get(region).hole();
    }

    private void collect() {
        DisjointSets joined = new DisjointSets(faces.faceCount());
        for (int e = 0; e < borders.size(); e++) {
            if (isEmpty(owners.owner(2 * e)) && isEmpty(owners.owner(2 * e + 1))) {
                joined.join(faces.face(2 * e), faces.face(2 * e + 1));
            }
        }
        int outside = joined.find(Faces.OUTSIDE);
        for (int e = 0; e < borders.size(); e++) {
            int left = owners.owner(2 * e);
            int right = owners.owner(2 * e + 1);
            boolean emptyLeft = isEmpty(left);
            boolean emptyRight = isEmpty(right);
            boolean parts = left != right || borders.get(e).cut;
            if (parts && !(emptyLeft && emptyRight)) {
                boolean outer = (emptyLeft && joined.find(faces.face(2 * e)) == outside)
                        || (emptyRight && joined.find(faces.face(2 * e + 1)) == outside);
                Border border = borders.get(e);
                pieces.add(new Piece(border.a, border.b, border.circle, left, right, outer));
            }
        }
    }

    /**
     * Joins pieces in line that meet where a hidden border crosses theirs: that vertex was never drawn, and would only make
     * the mesh finer for no reason. Parts of an arc stay apart: the lens of both together may hold a vertex.
     */
    private void joinAtHiddenCrossings() {
        int[][] at = new int[vertices.count()][]; // pieces at each vertex that is a crossing
        for (int p = 0; p < pieces.size(); p++) {
            for (int v : new int[] {pieces.get(p).start(), pieces.get(p).end()}) {
                if (v >= drawnCount) {
                    at[v] = at[v] == null ? new int[0] : at[v];
                    at[v] = Arrays.copyOf(at[v], at[v].length + 1);
                    at[v][at[v].length - 1] = p;
                }
            }
        }
        DisjointSets moved = new DisjointSets(pieces.size()); // a joined piece keeps the smaller number
        for (int v = drawnCount; v < vertices.count(); v++) {
            if (at[v] != null && at[v].length == 2) {
                int p = moved.find(at[v][0]);
                int q = moved.find(at[v][1]);
                Piece joined = p == q ? null : join(pieces.get(p), pieces.get(q), v);
                if (joined != null) {
                    moved.join(p, q);
                    pieces.set(Math.min(p, q), joined);
                    pieces.set(Math.max(p, q), null);
                }
            }
        }
        pieces.removeIf(p -> p == null);
    }

    /** The piece p followed (or preceded) by q through vertex v, in p's direction; null if they do not make one. */
    private Piece join(Piece p, Piece q, int v) {
        Piece along = (p.end() == v) == (q.start() == v) ? q : q.reversed();
        if (p.circle() != null
                || q.circle() != null
                || along.left() != p.left()
                || along.right() != p.right()
                || along.outer() != p.outer()) {
            return null;
        }
        int start = p.end() == v ? p.start() : along.start();
        int end = p.end() == v ? along.end() : p.end();
        double dx = vertices.x(end) - vertices.x(start);
        double dy = vertices.y(end) - vertices.y(start);
        double length = Math.hypot(dx, dy);
        double offset = Math.abs(dx * (vertices.y(v) - vertices.y(start)) - dy * (vertices.x(v) - vertices.x(start)));
        boolean inLine = offset <= 1e-3 * snap * length && length > distance(start, v) && length > distance(v, end);
        return inLine ? p.part(start, end) : null;
    }

    private double distance(int u, int v) {
        return Math.hypot(vertices.x(v) - vertices.x(u), vertices.y(v) - vertices.y(u));
    }

    private void split(List<Coordinate> points) {
        HPRtree index = new HPRtree();
        for (int p = 0; p < pieces.size(); p++) {
            index.insert(envelope(pieces.get(p)), p);
        }
        double[][] cuts = new double[pieces.size()][]; // distances from each piece's start
        for (Coordinate point : points) {
            Envelope reach = new Envelope(point);
            reach.expandBy(snap);
            int[] nearest = {-1};
            double[] best = {snap};
            index.query(reach, item -> {
                int p = (Integer) item;
                double distance = Math.abs(offset(pieces.get(p), point));
                double along = along(pieces.get(p), point);
                if (distance <= best[0] && along > -snap && along < length(pieces.get(p)) + snap) {
                    best[0] = distance;
                    nearest[0] = p;
                }
            });
            if (nearest[0] >= 0) {
                addCut(cuts, nearest[0], along(pieces.get(nearest[0]), point));
            }
        }
        for (int p = 0, count = pieces.size(); p < count; p++) {
            if (cuts[p] != null) {
                cut(p, cuts[p]);
            }
        }
    }

    private void addCut(double[][] cuts, int p, double along) {
        double[] old = cuts[p] == null ? new double[0] : cuts[p];
        boolean apart = along > snap && along < length(pieces.get(p)) - snap;
        for (double other : old) {
            apart &= Math.abs(other - along) > snap;
        }
        if (apart) {
            cuts[p] = Arrays.copyOf(old, old.length + 1);
            cuts[p][old.length] = along;
        }
    }

    private void cut(int p, double[] along) {
        Piece whole = pieces.get(p);
        double length = length(whole);
        double[] sorted = along.clone();
        Arrays.sort(sorted);
        int before = whole.start();
        for (int i = 0; i <= sorted.length; i++) {
            int after = whole.end();
            if (i < sorted.length) {
                Coordinate at = at(whole, sorted[i] / length);
                after = vertices.add(at.x, at.y);
            }
            Piece part = whole.part(before, after);
            if (i == 0) {
                pieces.set(p, part);
            } else {
                pieces.add(part);
            }
            before = after;
        }
    }

    /** The point at a part of the length of a piece. */
    private Coordinate at(Piece piece, double part) {
        double x0 = vertices.x(piece.start());
        double y0 = vertices.y(piece.start());
        Circle circle = piece.circle();
        if (circle == null) {
            return new Coordinate(
                    x0 + part * (vertices.x(piece.end()) - x0), y0 + part * (vertices.y(piece.end()) - y0));
        }
        return circle.at(x0, y0, x(piece.end()), y(piece.end()), part);
    }

    private double turn(Piece arc) {
        return arc.circle().turn(x(arc.start()), y(arc.start()), x(arc.end()), y(arc.end()));
    }

    private double x(int vertex) {
        return vertices.x(vertex);
    }

    private double y(int vertex) {
        return vertices.y(vertex);
    }

    private Envelope envelope(Piece piece) {
        return piece.circle() == null
                ? new Envelope(x(piece.start()), x(piece.end()), y(piece.start()), y(piece.end()))
                : piece.circle().envelope(x(piece.start()), y(piece.start()), x(piece.end()), y(piece.end()));
    }

    private double length(Piece piece) {
        double chord = distance(piece.start(), piece.end());
        return piece.circle() == null ? chord : piece.circle().arcLength(chord);
    }

    /** How far along a piece a point lies, from its start. */
    private double along(Piece piece, Coordinate point) {
        if (piece.circle() != null) {
            double toPoint = piece.circle().turn(x(piece.start()), y(piece.start()), point.x, point.y);
            return Math.copySign(1, turn(piece)) * toPoint * piece.circle().radius();
        }
        double dx = x(piece.end()) - x(piece.start());
        double dy = y(piece.end()) - y(piece.start());
        double dot = dx * (point.x - x(piece.start())) + dy * (point.y - y(piece.start()));
        return dot / Math.hypot(dx, dy);
    }

    private double offset(Piece piece, Coordinate point) {
        if (piece.circle() != null) {
            return piece.circle().offset(point.x, point.y);
        }
        double dx = x(piece.end()) - x(piece.start());
        double dy = y(piece.end()) - y(piece.start());
        double cross = dx * (point.y - y(piece.start())) - dy * (point.x - x(piece.start()));
        return cross / Math.hypot(dx, dy);
    }

    private Section section() {
        int[] number = new int[vertices.count()]; // in the section
        for (Piece piece : pieces) {
            number[piece.start()] = 1;
            number[piece.end()] = 1;
        }
        double[] xy = new double[2 * vertices.count()];
        int count = 0;
        for (int v = 0; v < number.length; v++) {
            if (number[v] == 1) {
                xy[2 * count] = vertices.x(v);
                xy[2 * count + 1] = vertices.y(v);
                number[v] = count++;
            }
        }
        int[] ends = new int[2 * pieces.size()];
        Circle[] circles = new Circle[pieces.size()];
        int[] sides = new int[2 * pieces.size()];
        boolean[] outer = new boolean[pieces.size()];
        boolean[] hole = new boolean[shapes.size()];
        for (int p = 0; p < pieces.size(); p++) {
            Piece piece = pieces.get(p);
            ends[2 * p] = number[piece.start()];
            ends[2 * p + 1] = number[piece.end()];
            circles[p] = piece.circle();
            sides[2 * p] = piece.left();
            sides[2 * p + 1] = piece.right();
            outer[p] = piece.outer();
        }
        for (int r = 0; r < hole.length; r++) {
            hole[r] = shapes.get(r).hole();
        }
        List<String> names = shapes.stream().map(RegionShape::name).toList();
        return new Section(Arrays.copyOf(xy, 2 * count), ends, circles, sides, outer, names, hole, snap);
    }
}
