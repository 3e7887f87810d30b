package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.locationtech.jts.algorithm.CGAlgorithmsDD;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.hprtree.HPRtree;

/**
 * The faces into which noded borders cut the plane.
 *
 * <p>Border e has two half-edges: 2e runs from its first vertex to its second and sees the face on its left, 2e + 1 runs
 * back and sees the face on its right. Face 0 is the far outside.
 */
final class Faces {
    /** Number of the face that reaches to infinity. */
    static final int OUTSIDE = 0;

    private final VertexGrid vertices;
    private final List<Border> borders;
    private final int[] leaving; // half-edges by the vertex they leave, counterclockwise
    private final int[] leavingStart; // vertexCount + 1
    private final int[] rank; // place of each half-edge in leaving
    private final int[] cycle; // of each half-edge
    private int cycleCount;
    private final int[] face; // of each cycle
    private int faceCount;

    Faces(VertexGrid vertices, List<Border> borders) {
        this.vertices = vertices;
        this.borders = borders;
        int halfCount = 2 * borders.size();
        leavingStart = new int[vertices.count() + 1];
        leaving = new int[halfCount];
        rank = new int[halfCount];
        cycle = new int[halfCount];
        sortAroundVertices();
        walk();
        face = new int[cycleCount];
        nest();
    }

    int faceCount() {
        return faceCount;
    }

    /** The face on the left of a half-edge. */
    int face(int halfEdge) {
        return face[cycle[halfEdge]];
    }

    private int origin(int halfEdge) {
        Border border = borders.get(halfEdge >> 1);
        return (halfEdge & 1) == 0 ? border.a : border.b;
    }

    private int target(int halfEdge) {
        return origin(halfEdge ^ 1);
    }

    private void sortAroundVertices() {
        for (int h = 0; h < leaving.length; h++) {
            leavingStart[origin(h) + 1]++;
        }
        for (int v = 0; v < vertices.count(); v++) {
            leavingStart[v + 1] += leavingStart[v];
        }
        int[] fill = leavingStart.clone();
        for (int h = 0; h < leaving.length; h++) {
            leaving[fill[origin(h)]++] = h;
        }
        for (int v = 0; v < vertices.count(); v++) {
            sort(leavingStart[v], leavingStart[v + 1]);
        }
        for (int i = 0; i < leaving.length; i++) {
            rank[leaving[i]] = i;
        }
    }

    private void sort(int from, int to) {
        if (to - from > 1) {
            Integer[] around = new Integer[to - from];
            for (int i = from; i < to; i++) {
                around[i - from] = leaving[i];
            }
            Arrays.sort(around, this::compareDirection);
            for (int i = from; i < to; i++) {
                leaving[i] = around[i - from];
            }
        }
    }

    /** Compares two half-edges that leave one vertex by their direction, from −90° (excluded) counterclockwise to 270°. */
    private int compareDirection(int g, int h) {
        boolean rightG = pointsRight(g);
        boolean rightH = pointsRight(h);
        if (rightG != rightH) {
            return rightG ? -1 : 1;
        }
        return -turn(origin(g), target(g), target(h));
    }

    private boolean pointsRight(int halfEdge) {
        return before(origin(halfEdge), target(halfEdge));
    }

    /** Whether a vertex comes before another in the order by x, then by y. */
    private boolean before(int u, int v) {
        return vertices.x(u) != vertices.x(v) ? vertices.x(u) < vertices.x(v) : vertices.y(u) < vertices.y(v);
    }

    /** +1 where u, v, w turn left, −1 where they turn right, exactly. */
    private int turn(int u, int v, int w) {
        return CGAlgorithmsDD.orientationIndex(
                vertices.x(u), vertices.y(u), vertices.x(v), vertices.y(v), vertices.x(w), vertices.y(w));
    }

    /** Half-edge that follows around the face on the left: at the far end, the first clockwise from where it came. */
    private int next(int halfEdge) {
        int back = halfEdge ^ 1;
        int vertex = origin(back);
        int i = rank[back];
        return leaving[i == leavingStart[vertex] ? leavingStart[vertex + 1] - 1 : i - 1];
    }

    private void walk() {
        Arrays.fill(cycle, -1);
        for (int first = 0; first < cycle.length; first++) {
            if (cycle[first] < 0) {
                for (int h = first; cycle[h] < 0; h = next(h)) {
                    cycle[h] = cycleCount;
                }
                cycleCount++;
            }
        }
    }

    /** Joins the cycle around the outside of each connected part to the face in which the part lies. */
    private void nest() {
        int[] part = parts();
        List<Integer> leftmost = leftmostOfParts(part);
        int[] around = new int[leftmost.size()]; // outer cycle of each part
        int[] host = new int[cycleCount]; // cycle to which an outer one is joined, −1 the outside, −2 a face's own
        Arrays.fill(host, -2);
        HPRtree index = new HPRtree();
        for (int e = 0; e < borders.size(); e++) {
            index.insert(envelope(e), e);
        }
        double lowest = lowest();
        for (int i = 0; i < around.length; i++) {
            int vertex = leftmost.get(i);
            // All half-edges leave to the right here, and the outside lies between the last and the first of them.
            around[i] = cycle[leaving[leavingStart[vertex + 1] - 1]];
            int below = halfEdgeBelow(vertex, part, index, lowest);
            host[around[i]] = below < 0 ? -1 : cycle[below];
        }
        faceCount = 1;
        for (int c = 0; c < cycleCount; c++) {
            face[c] = host[c] == -2 ? faceCount++ : -1;
        }
        for (int c : around) {
            // Parts lie within parts, so the way to a face of its own may lead over several outer cycles.
            int at = c;
            while (at >= 0 && face[at] < 0) {
                at = host[at];
            }
            face[c] = at < 0 ? OUTSIDE : face[at];
        }
    }

    /** Connected part of each vertex, named by one of its vertices. */
    private int[] parts() {
        DisjointSets sets = new DisjointSets(vertices.count());
        for (Border border : borders) {
            sets.join(border.a, border.b);
        }
        int[] part = new int[vertices.count()];
        for (int v = 0; v < part.length; v++) {
            part[v] = sets.find(v);
        }
        return part;
    }

    private List<Integer> leftmostOfParts(int[] part) {
        int[] first = new int[part.length];
        Arrays.fill(first, -1);
        for (int v = 0; v < part.length; v++) {
            boolean used = leavingStart[v + 1] > leavingStart[v];
            if (used && (first[part[v]] < 0 || before(v, first[part[v]]))) {
                first[part[v]] = v;
            }
        }
        List<Integer> found = new ArrayList<>();
        for (int v : first) {
            if (v >= 0) {
                found.add(v);
            }
        }
        return found;
    }

    private Envelope envelope(int e) {
        Border border = borders.get(e);
        return new Envelope(vertices.x(border.a), vertices.x(border.b), vertices.y(border.a), vertices.y(border.b));
    }

    private double lowest() {
        double least = Double.POSITIVE_INFINITY;
        for (int v = 0; v < vertices.count(); v++) {
            least = Math.min(least, vertices.y(v));
        }
        return least;
    }

    /**
     * The half-edge running to the right, of another part, that is met first on the way down from a vertex, or rather from
     * a place a hair to its right, so that no vertex is met; −1 where there is none. The vertex lies in the face on its
     * left.
     */
    private int halfEdgeBelow(int vertex, int[] part, HPRtree index, double lowest) {
        double x = vertices.x(vertex);
        double y = vertices.y(vertex);
        int[] best = {-1};
        index.query(new Envelope(x, x, lowest, y), item -> {
            int e = (Integer) item;
            Border border = borders.get(e);
            int half = before(border.a, border.b) ? 2 * e : 2 * e + 1; // running to the right
            boolean spans = vertices.x(origin(half)) <= x && x < vertices.x(target(half));
            if (spans && part[border.a] != part[vertex] && turn(origin(half), target(half), vertex) > 0) {
                if (best[0] < 0 || isAbove(half, best[0], x)) {
                    best[0] = half;
                }
            }
        });
        return best[0];
    }

    /** Whether a half-edge running to the right lies above another a hair to the right of x. */
    private boolean isAbove(int g, int h, double x) {
        if (origin(g) == origin(h)) {
            return turn(origin(h), target(h), target(g)) > 0;
        }
        return heightAt(g, x) > heightAt(h, x);
    }

    private double heightAt(int h, double x) {
        double x0 = vertices.x(origin(h));
        double y0 = vertices.y(origin(h));
        return y0 + (x - x0) * ((vertices.y(target(h)) - y0) / (vertices.x(target(h)) - x0));
    }
}
