package tepor.mesher.chain;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Coordinate;

/**
 * Finds the loops in a graph of strands: what leads to a dead end is put aside, and the loops are the smallest ones that go
 * round a face of what is left. Where no loops branch, each is one chain of strands.
 */
final class LoopFinder {
    /** Directions that differ by less, radians, are told apart by how they bend. */
    private static final double SAME_DIRECTION = 1e-9;

    private final StrandGraph graph;
    private final BitSet core = new BitSet(); // strands of the core
    private final BitSet inLoop = new BitSet(); // strands that some loop has
    private final List<Strand> loops = new ArrayList<>();
    private final List<Coordinate> branches = new ArrayList<>();
    private final List<List<Integer>> open = new ArrayList<>();

    LoopFinder(StrandGraph graph) {
        this.graph = graph;
        core.set(0, graph.strandCount());
        prune();
        findLoops();
        findOpen();
    }

    List<Strand> loops() {
        return loops;
    }

    /** Nodes of the core at which an odd number of strands meets: the loop there is a matter of choice. */
    List<Coordinate> branches() {
        return branches;
    }

    /** What is in no loop: half-sides end to end, as far as it is plain how they go on. */
    List<List<Integer>> open() {
        return open;
    }

    private int degree(int node) {
        return (int) graph.leaving(node).stream().filter(h -> core.get(h / 2)).count();
    }

    private void prune() {
        int[] degree = new int[graph.nodeCount()];
        Deque<Integer> dead = new ArrayDeque<>();
        for (int n = 0; n < degree.length; n++) {
            degree[n] = degree(n);
            if (degree[n] == 1) {
                dead.add(n);
            }
        }
        while (!dead.isEmpty()) {
            int node = dead.remove();
            for (int half : graph.leaving(node)) {
                if (core.get(half / 2)) {
                    core.clear(half / 2);
                    degree[node]--;
                    int other = graph.to(half);
                    if (--degree[other] == 1) {
                        dead.add(other);
                    }
                }
            }
        }
        for (int n = 0; n < degree.length; n++) {
            if (degree[n] > 2 && degree[n] % 2 == 1) {
                branches.add(graph.point(n));
            }
        }
    }

    private void findLoops() {
        int[] next = new int[2 * graph.strandCount()];
        Arrays.fill(next, -1);
        for (int n = 0; n < graph.nodeCount(); n++) {
            linkAround(n, next);
        }
        BitSet done = new BitSet();
        for (int h = 0; h < next.length; h++) {
            if (core.get(h / 2) && !done.get(h)) {
                List<Integer> walk = new ArrayList<>();
                for (int at = h; !done.get(at); at = next[at]) {
                    done.set(at);
                    walk.add(at);
                }
                split(walk);
            }
        }
    }

    /** Coming into a node, a face on the left goes on with the strand next clockwise from the one it came by. */
    private void linkAround(int node, int[] next) {
        List<Integer> around = new ArrayList<>(
                graph.leaving(node).stream().filter(h -> core.get(h / 2)).toList());
        if (around.size() > 2) {
            around.sort(this::compareTurn);
        }
        for (int i = 0; i < around.size(); i++) {
            int before = around.get((i + around.size() - 1) % around.size());
            next[around.get(i) ^ 1] = before;
        }
    }

    private int compareTurn(int a, int b) {
        int turn = Long.compare(direction(a), direction(b));
        return turn != 0 ? turn : Double.compare(graph.bend(a), graph.bend(b));
    }

    /** Rounded, so that directions that are the same are equal. */
    private long direction(int half) {
        double angle = graph.direction(half);
        double turn = angle - 2 * Math.PI * Math.floor(angle / (2 * Math.PI));
        return turn > 2 * Math.PI - SAME_DIRECTION ? 0 : Math.round(turn / SAME_DIRECTION);
    }

    /** Cuts the walk round a face where it comes through a node again, and keeps the loops that have the face inside. */
    private void split(List<Integer> walk) {
        List<Integer> stack = new ArrayList<>();
        Map<Integer, Integer> at = new HashMap<>(); // node to its place in the stack
        for (int half : walk) {
            at.put(graph.from(half), stack.size());
            stack.add(half);
            Integer begin = at.get(graph.to(half));
            if (begin != null) {
                List<Integer> loop = new ArrayList<>(stack.subList(begin, stack.size()));
                keep(loop);
                loop.forEach(h -> at.remove(graph.from(h)));
                stack.subList(begin, stack.size()).clear();
            }
        }
    }

    private void keep(List<Integer> loop) {
        Strand ring = graph.join(loop);
        if (ring.pieceCount() > 2 && RingArea.signedArea(ring) > 0) {
            loops.add(ring);
            loop.forEach(h -> inLoop.set(h / 2));
        }
    }

    private void findOpen() {
        BitSet done = (BitSet) inLoop.clone();
        // First from where a chain cannot go on; what is left then are rings that enclose nothing.
        for (int pass = 0; pass < 2; pass++) {
            for (int h = 0; h < 2 * graph.strandCount(); h++) {
                if (!done.get(h / 2) && (pass == 1 || !isPassage(graph.from(h)))) {
                    List<Integer> chain = new ArrayList<>();
                    int at = h;
                    while (at >= 0 && !done.get(at / 2)) {
                        done.set(at / 2);
                        chain.add(at);
                        at = isPassage(graph.to(at)) ? other(at) : -1;
                    }
                    open.add(chain);
                }
            }
        }
    }

    private boolean isPassage(int node) {
        return graph.leaving(node).size() == 2;
    }

    private int other(int half) {
        List<Integer> leaving = graph.leaving(graph.to(half));
        return leaving.get(0) == (half ^ 1) ? leaving.get(1) : leaving.get(0);
    }
}
