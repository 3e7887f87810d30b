package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;

/**
 * Open strands as the sides of a graph whose nodes are their ends; ends within snap are one node. Half-side 2·s leaves the
 * first end of strand s, 2·s + 1 its last.
 */
final class StrandGraph {
    private final List<Strand> strands = new ArrayList<>();
    private final int[] from;
    private final List<List<Integer>> leaving = new ArrayList<>();
    private final List<Strand> closed = new ArrayList<>();

    StrandGraph(List<Strand> drawn, double snap) {
        PointGrid grid = new PointGrid(snap);
        boolean[] onArc = new boolean[2 * drawn.size()];
        int[][] ends = new int[drawn.size()][2];
        for (int s = 0; s < drawn.size(); s++) {
            Strand strand = drawn.get(s);
            ends[s][0] = node(grid, onArc, strand.first(), strand.circles().get(0));
            ends[s][1] = node(grid, onArc, strand.last(), strand.circles().get(strand.pieceCount() - 1));
        }
        List<int[]> kept = new ArrayList<>();
        for (int s = 0; s < drawn.size(); s++) {
            Strand joined = drawn.get(s).withEnds(grid.point(ends[s][0]), grid.point(ends[s][1]));
            if (ends[s][0] != ends[s][1]) {
                kept.add(ends[s]);
                strands.add(joined);
            } else if (joined.pieceCount() > 2) {
                closed.add(joined);
            }
        }
        for (int n = 0; n < grid.size(); n++) {
            leaving.add(new ArrayList<>(2));
        }
        from = new int[2 * kept.size()];
        for (int s = 0; s < kept.size(); s++) {
            for (int e = 0; e < 2; e++) {
                from[2 * s + e] = kept.get(s)[e];
                leaving.get(kept.get(s)[e]).add(2 * s + e);
            }
        }
    }

    /** The node at an end; an end of an arc stands for it before others, so that it stays on its circle. */
    private static int node(PointGrid grid, boolean[] onArc, Coordinate end, Circle circle) {
        int node = grid.number(end);
        if (circle != null && !onArc[node]) {
            onArc[node] = true;
            grid.setPoint(node, end);
        }
        return node;
    }

    /** Strands that close by themselves. */
    List<Strand> closed() {
        return closed;
    }

    int strandCount() {
        return strands.size();
    }

    int nodeCount() {
        return leaving.size();
    }

    int from(int half) {
        return from[half];
    }

    int to(int half) {
        return from[half ^ 1];
    }

    /** The half-sides that leave a node, in the order drawn. */
    List<Integer> leaving(int node) {
        return leaving.get(node);
    }

    /** The strand of a half-side, in its direction. */
    Strand along(int half) {
        Strand strand = strands.get(half / 2);
        return half % 2 == 0 ? strand : strand.reversed();
    }

    Coordinate point(int node) {
        return along(leaving.get(node).get(0)).first();
    }

    int source(int half) {
        return strands.get(half / 2).source();
    }

    /** Half-sides end to end as one strand. */
    Strand join(List<Integer> halves) {
        List<Coordinate> points = new ArrayList<>();
        List<Circle> circles = new ArrayList<>();
        int source = Integer.MAX_VALUE;
        points.add(along(halves.get(0)).first());
        for (int half : halves) {
            Strand strand = along(half);
            points.addAll(strand.points().subList(1, strand.points().size()));
            circles.addAll(strand.circles());
            source = Math.min(source, strand.source());
        }
        return new Strand(points, circles, source);
    }

    /** In which direction a half-side leaves its node, radians; arcs by their tangent. */
    double direction(int half) {
        Strand strand = along(half);
        Coordinate a = strand.first();
        Coordinate b = strand.points().get(1);
        double chord = Math.atan2(b.y - a.y, b.x - a.x);
        Circle circle = strand.circles().get(0);
        return circle == null ? chord : chord - 0.5 * circle.turn(a.x, a.y, b.x, b.y);
    }

    /** How a half-side bends away from its direction, 1/m, positive to the left: tells apart what leaves in one direction. */
    double bend(int half) {
        Strand strand = along(half);
        Circle circle = strand.circles().get(0);
        Coordinate a = strand.first();
        Coordinate b = strand.points().get(1);
        return circle == null ? 0 : Math.signum(circle.turn(a.x, a.y, b.x, b.y)) / circle.radius();
    }
}
