package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.algorithm.CGAlgorithmsDD;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.index.hprtree.HPRtree;
import tepor.mesher.outline.Arcs;

/**
 * Nodes the borders of all regions together: vertices closer than snap become one, a vertex closer than snap to a piece
 * lies on it, crossing pieces meet in a vertex, and pieces that lie over each other become one.
 *
 * <p>Vertices keep their coordinates; it is the pieces that bend, by at most snap in each pass. Each piece remembers how
 * the regions' winding numbers change across it. As pieces only ever bend and fall together, each region's border stays
 * closed, and these numbers stay consistent; what is thinner than snap falls flat, its changes cancel, and it is gone.
 * JTS's snapping noder is not used: it works in one pass, so that a piece bent at a vertex may cross a third.
 *
 * <p>Pieces that are arcs meet others as arcs ({@link ArcMeeting}), and their parts stay arcs of the same circle. Where an
 * arc does not meet another piece, but its lens is in the way, it is halved until the lens is clear. In the end the chords
 * of all pieces make the same graph as the pieces, so that what comes after may work with chords.
 */
final class BorderNoder {
    private static final int PASSES_AT_MOST = 200;

    private final double snap;
    private final VertexGrid vertices;
    private final ArcMeeting arcs;
    private Map<Long, Border> borders = new LinkedHashMap<>();
    private final int drawnCount;

    /**
     * Merges the vertices of all shapes, and collects their borders.
     *
     * @param shapes in the order they are laid
     * @param cuts lines that stay though they part nothing
     * @param snap metres
     */
    BorderNoder(List<RegionShape> shapes, List<LineString> cuts, double snap) {
        this.snap = snap;
        this.vertices = new VertexGrid(snap);
        this.arcs = new ArcMeeting(vertices, snap);
        for (int r = 0; r < shapes.size(); r++) {
            Geometry polygons = shapes.get(r).polygons();
            for (int i = 0; i < polygons.getNumGeometries(); i++) {
                Polygon polygon = (Polygon) polygons.getGeometryN(i);
                addRing(polygon.getExteriorRing(), r, 1);
                for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
                    addRing(polygon.getInteriorRingN(h), r, -1);
                }
            }
        }
        cuts.forEach(this::addCut);
        drawnCount = vertices.count();
    }

    private void addCut(LineString line) {
        Coordinate[] points = line.getCoordinates();
        int before = vertices.merge(points[0].x, points[0].y);
        for (int i = 1; i < points.length; i++) {
            int here = vertices.merge(points[i].x, points[i].y);
            lay(before, here, new Border(before, here, Arcs.circle(line, i - 1), true, new int[0], new int[0]), true);
            before = here;
        }
    }

    /** @param inside how the winding number changes on entering the ring */
    private void addRing(LinearRing ring, int region, int inside) {
        Coordinate[] points = ring.getCoordinates();
        boolean straight = !(ring instanceof Arcs);
        boolean counterClockwise = straight ? Orientation.isCCW(points) : Arcs.signedArea(ring) > 0;
        int leftChange = counterClockwise ? inside : -inside;
        int before = vertices.merge(points[0].x, points[0].y);
        for (int i = 1; i < points.length; i++) {
            int here = vertices.merge(points[i].x, points[i].y);
            Border piece = new Border(
                    before, here, Arcs.circle(ring, i - 1), false, new int[] {region}, new int[] {leftChange});
            lay(before, here, piece, true);
            before = here;
        }
    }

    /** Adds a piece from u to v, with the circle and the changes (seen from u to v) of a model, to those there are. */
    private void lay(int u, int v, Border model, boolean fresh) {
        if (u == v) {
            return;
        }
        int[] change = model.change;
        if (u > v) {
            change = change.clone();
            for (int i = 0; i < change.length; i++) {
                change[i] = -change[i];
            }
        }
        Border border = new Border(Math.min(u, v), Math.max(u, v), model.circle, model.cut, model.region, change);
        border.fresh = fresh;
        long key = Border.key(u, v);
        Border there = borders.get(key);
        if (there == null) {
            borders.put(key, border);
        } else if (arcs.isSame(there, border) || !layApart(there, border)) {
            Border joined = there.plus(border);
            if (joined.isIdle()) {
                borders.remove(key);
            } else {
                borders.put(key, joined);
            }
        }
    }

    /** Lays two pieces that have the same ends, but bow apart: the arcs among them in halves. */
    private boolean layApart(Border there, Border border) {
        Border bent = arcs.isBent(border) ? border : there;
        Border other = bent == border ? there : border;
        Coordinate at = arcs.middle(bent);
        int middle = vertices.merge(at.x, at.y);
        if (middle == bent.a || middle == bent.b) {
            return false;
        }
        borders.remove(Border.key(there.a, there.b));
        lay(bent.a, middle, bent, true);
        lay(middle, bent.b, bent, true);
        lay(other.a, other.b, other, true);
        return true;
    }

    VertexGrid vertices() {
        return vertices;
    }

    /** Vertices below this number were drawn; the others are crossings. */
    int drawnCount() {
        return drawnCount;
    }

    /** The pieces, after {@link #node}. */
    List<Border> borders() {
        return List.copyOf(borders.values());
    }

    /**
     * Nodes.
     *
     * @return whether it came to an end; it may not where very many vertices crowd within few snaps
     */
    boolean node() {
        for (int pass = 0; pass < PASSES_AT_MOST; pass++) {
            if (!passChanged()) {
                return true;
            }
        }
        return false;
    }

    private boolean passChanged() {
        List<Border> list = new ArrayList<>(borders.values());
        HPRtree index = new HPRtree();
        for (int i = 0; i < list.size(); i++) {
            index.insert(envelope(list.get(i), 0), i);
        }
        int[][] splits = new int[list.size()][];
        List<Crossing> crossings = new ArrayList<>();
        for (int i = 0; i < list.size(); i++) {
            if (list.get(i).fresh) {
                int one = i;
                index.query(envelope(list.get(i), snap), item -> tryPair(one, (Integer) item, list, splits, crossings));
            }
        }
        for (Crossing crossing : crossings) {
            cross(crossing, list, splits);
        }
        return rebuild(list, splits);
    }

    private Envelope envelope(Border border, double margin) {
        double ax = vertices.x(border.a);
        double ay = vertices.y(border.a);
        double bx = vertices.x(border.b);
        double by = vertices.y(border.b);
        Envelope envelope =
                border.circle == null ? new Envelope(ax, bx, ay, by) : border.circle.envelope(ax, ay, bx, by);
        envelope.expandBy(margin);
        return envelope;
    }

    private void tryPair(int i, int j, List<Border> list, int[][] splits, List<Crossing> crossings) {
        Border p = list.get(i);
        Border q = list.get(j);
        if (i == j || (q.fresh && j < i)) {
            return;
        }
        boolean touches = trySplit(i, q.a, list, splits);
        touches |= trySplit(i, q.b, list, splits);
        touches |= trySplit(j, p.a, list, splits);
        touches |= trySplit(j, p.b, list, splits);
        boolean bent = arcs.isBent(p) || arcs.isBent(q);
        boolean joined = p.a == q.a || p.a == q.b || p.b == q.a || p.b == q.b;
        if (touches) {
            return;
        }
        if (bent) {
            List<Coordinate> meetings = arcs.meetings(p, q);
            meetings.forEach(at -> crossings.add(new Crossing(i, j, at)));
            if (meetings.isEmpty() && arcs.areTangled(p, q)) {
                halve(arcs.sagitta(p) >= arcs.sagitta(q) ? i : j, list, splits);
            }
        } else if (!joined && cross(p, q)) {
            crossings.add(
                    new Crossing(i, j, CGAlgorithmsDD.intersection(point(p.a), point(p.b), point(q.a), point(q.b))));
        }
    }

    /** Where two pieces, by their numbers in the list, cross or touch. */
    private record Crossing(int one, int other, Coordinate at) {}

    private void halve(int i, List<Border> list, int[][] splits) {
        Coordinate at = arcs.middle(list.get(i));
        int middle = vertices.merge(at.x, at.y);
        if (middle != list.get(i).a && middle != list.get(i).b) {
            addSplit(splits, i, middle);
        }
    }

    /** Splits piece i at a vertex if it lies on it. */
    private boolean trySplit(int i, int vertex, List<Border> list, int[][] splits) {
        Border border = list.get(i);
        if (vertex == border.a || vertex == border.b || !liesOn(vertex, border)) {
            return false;
        }
        addSplit(splits, i, vertex);
        return true;
    }

    private static void addSplit(int[][] splits, int i, int vertex) {
        int[] old = splits[i];
        if (old == null) {
            splits[i] = new int[] {vertex};
        } else if (Arrays.stream(old).noneMatch(v -> v == vertex)) {
            splits[i] = Arrays.copyOf(old, old.length + 1);
            splits[i][old.length] = vertex;
        }
    }

    /**
     * Whether a vertex is within snap of the piece and sees it under an obtuse angle. Without the second condition the
     * parts could be longer than the whole, and three vertices little more than snap apart would be split for ever.
     */
    private boolean liesOn(int vertex, Border border) {
        if (arcs.isBent(border)) {
            return arcs.liesOn(vertices.x(vertex), vertices.y(vertex), border);
        }
        double ax = vertices.x(border.a) - vertices.x(vertex);
        double ay = vertices.y(border.a) - vertices.y(vertex);
        double bx = vertices.x(border.b) - vertices.x(vertex);
        double by = vertices.y(border.b) - vertices.y(vertex);
        if (ax * bx + ay * by >= 0) {
            return false;
        }
        double distance = Math.abs(ax * by - ay * bx) / Math.hypot(bx - ax, by - ay);
        return distance <= snap;
    }

    private boolean cross(Border p, Border q) {
        return side(p, q.a) * side(p, q.b) < 0 && side(q, p.a) * side(q, p.b) < 0;
    }

    private int side(Border p, int vertex) {
        return CGAlgorithmsDD.orientationIndex(
                vertices.x(p.a),
                vertices.y(p.a),
                vertices.x(p.b),
                vertices.y(p.b),
                vertices.x(vertex),
                vertices.y(vertex));
    }

    /** Splits two crossing pieces where they cross, at a vertex that is there already if one is near. */
    private void cross(Crossing crossing, List<Border> list, int[][] splits) {
        Border p = list.get(crossing.one());
        Border q = list.get(crossing.other());
        Coordinate at = crossing.at();
        int near = vertices.nearest(at.x, at.y);
        boolean endOfP = near == p.a || near == p.b;
        boolean endOfQ = near == q.a || near == q.b;
        boolean fits = near >= 0 && (endOfP || liesOn(near, p)) && (endOfQ || liesOn(near, q));
        int vertex = fits ? near : vertices.add(at.x, at.y);
        if (!fits || !endOfP) {
            addSplit(splits, crossing.one(), vertex);
        }
        if (!fits || !endOfQ) {
            addSplit(splits, crossing.other(), vertex);
        }
    }

    private Coordinate point(int vertex) {
        return new Coordinate(vertices.x(vertex), vertices.y(vertex));
    }

    /** Puts the parts in the place of the pieces that are split. */
    private boolean rebuild(List<Border> list, int[][] splits) {
        boolean changed = false;
        borders = new LinkedHashMap<>(2 * list.size());
        for (int i = 0; i < list.size(); i++) {
            Border border = list.get(i);
            if (splits[i] == null) {
                lay(border.a, border.b, border, false);
                continue;
            }
            changed = true;
            int before = border.a;
            for (int vertex : inOrder(border, splits[i])) {
                lay(before, vertex, border, true);
                before = vertex;
            }
            lay(before, border.b, border, true);
        }
        return changed;
    }

    // Along an arc the order is that along its chord, as it turns by far less than 180°.
    private int[] inOrder(Border border, int[] split) {
        double dx = vertices.x(border.b) - vertices.x(border.a);
        double dy = vertices.y(border.b) - vertices.y(border.a);
        return Arrays.stream(split)
                .boxed()
                .sorted((u, v) -> {
                    double du = (vertices.x(u) - vertices.x(v)) * dx + (vertices.y(u) - vertices.y(v)) * dy;
                    return du != 0 ? Double.compare(du, 0) : Integer.compare(u, v);
                })
                .mapToInt(Integer::intValue)
                .toArray();
    }
}
