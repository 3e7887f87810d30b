package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.outline.Circle;
import tepor.mesher.refinement.CurvedTriangle;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Predicates;

/**
 * Audits a mesh against its contract and its section: node numbers, orientation, neighbours, facets, regions, areas.
 *
 * <p>Tolerances follow from the section's extent and from the size of its coordinates; orientation is tested exactly.
 */
public final class MeshCheck {
    private static final int PROBLEMS_AT_MOST = 50;

    private final Mesh mesh;
    private final Section section;
    private final List<String> problems = new ArrayList<>();

    private MeshCheck(Mesh mesh, Section section) {
        this.mesh = mesh;
        this.section = section;
    }

    /**
     * Looks for faults.
     *
     * @return what is wrong, one sentence each, the first fifty at most; empty if the mesh is sound
     */
    public static List<String> problems(Mesh mesh, Section section) {
        MeshCheck check = new MeshCheck(mesh, section);
        check.checkNodes();
        if (check.problems.isEmpty()) {
            check.checkOrientation();
            check.checkNeighbours();
            check.checkFans();
            check.checkMiddles();
        }
        if (check.problems.isEmpty()) {
            check.problems.addAll(FacetCheck.problems(mesh, section));
            check.problems.addAll(RegionCheck.problems(mesh, section));
        }
        return List.copyOf(check.problems.subList(0, Math.min(PROBLEMS_AT_MOST, check.problems.size())));
    }

    private void checkNodes() {
        boolean[] used = new boolean[mesh.nodeCount()];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < mesh.nodesPerTriangle(); i++) {
                int n = mesh.node(t, i);
                if (n < 0 || n >= mesh.nodeCount() || (n < mesh.cornerCount()) != (i < 3)) {
                    problems.add("triangle " + t + " has node " + n + " at place " + i + ", of " + mesh.cornerCount()
                            + " corners and " + mesh.nodeCount() + " nodes");
                } else {
                    used[n] = true;
                }
            }
            if (mesh.region(t) < 0 || mesh.region(t) >= section.regionCount() || section.isHole(mesh.region(t))) {
                problems.add("triangle " + t + " lies in region " + mesh.region(t) + ", which has no material");
            }
        }
        for (int n = 0; n < used.length; n++) {
            if (!used[n]) {
                problems.add("node " + n + " is in no triangle");
            }
            if (!Double.isFinite(mesh.x(n)) || !Double.isFinite(mesh.y(n))) {
                problems.add("node " + n + " is at (" + mesh.x(n) + " " + mesh.y(n) + ")");
            }
        }
    }

    private void checkOrientation() {
        Predicates predicates = new Predicates();
        for (int t = 0; t < mesh.triangleCount(); t++) {
            int a = mesh.node(t, 0);
            int b = mesh.node(t, 1);
            int c = mesh.node(t, 2);
            double turn = predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c));
            if (!(turn > 0)) {
                problems.add("triangle " + t + " is flat or turned over: " + turn);
            }
        }
    }

    private void checkNeighbours() {
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                int other = mesh.neighbour(t, i);
                if (other == Mesh.NONE) {
                    continue;
                }
                int back = other < 0 || other >= mesh.triangleCount() ? -1 : sideTowards(other, t, i);
                if (back < 0) {
                    problems.add("triangle " + t + " has neighbour " + other + " at side " + i
                            + ", which does not have it for a neighbour at the same side");
                } else if (mesh.nodesPerTriangle() == 6 && mesh.node(t, 3 + i) != mesh.node(other, 3 + back)) {
                    problems.add("triangles " + t + " and " + other + " differ in the node between them");
                }
            }
        }
    }

    private int sideTowards(int triangle, int neighbour, int neighbourSide) {
        for (int i = 0; i < 3; i++) {
            if (mesh.neighbour(triangle, i) == neighbour
                    && mesh.node(triangle, (i + 1) % 3) == mesh.node(neighbour, (neighbourSide + 2) % 3)
                    && mesh.node(triangle, (i + 2) % 3) == mesh.node(neighbour, (neighbourSide + 1) % 3)) {
                return i;
            }
        }
        return -1;
    }

    // Every node's triangles hang together: at each corner one can go round to all of them.
    private void checkFans() {
        int[] corners = new int[mesh.cornerCount()];
        int[] firstCorner = new int[mesh.cornerCount()];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                corners[mesh.node(t, i)]++;
                firstCorner[mesh.node(t, i)] = 3 * t + i;
            }
        }
        for (int n = 0; n < corners.length; n++) {
            int reached = fanSize(firstCorner[n] / 3, n);
            if (reached != corners[n]) {
                problems.add("node " + n + " is a corner of " + corners[n] + " triangles, but only " + reached
                        + " of them hang together");
            }
        }
    }

    private int fanSize(int start, int n) {
        int size = 1;
        int t = start;
        do {
            t = mesh.neighbour(t, (cornerOf(t, n) + 1) % 3);
            if (t == start) {
                return size;
            }
            size += t == Mesh.NONE ? 0 : 1;
        } while (t != Mesh.NONE && size <= mesh.triangleCount());
        t = mesh.neighbour(start, (cornerOf(start, n) + 2) % 3);
        while (t != Mesh.NONE && size <= mesh.triangleCount()) {
            size++;
            t = mesh.neighbour(t, (cornerOf(t, n) + 2) % 3);
        }
        return size;
    }

    private int cornerOf(int t, int n) {
        return mesh.node(t, 0) == n ? 0 : mesh.node(t, 1) == n ? 1 : 2;
    }

    private void checkMiddles() {
        if (mesh.nodesPerTriangle() != 6) {
            return;
        }
        Map<Integer, Circle> circleOf = circlesOfMiddles();
        double[] node = new double[12];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                checkMiddle(t, i, circleOf);
            }
            for (int i = 0; i < 6; i++) {
                node[2 * i] = mesh.x(mesh.node(t, i));
                node[2 * i + 1] = mesh.y(mesh.node(t, i));
            }
            if (mesh.isCurved(t) && !(CurvedTriangle.leastJacobian(node) > 0)) {
                problems.add("curved triangle " + t + " is not valid everywhere");
            }
        }
    }

    /** Circle of each node in the middle of a facet on an arc. */
    private Map<Integer, Circle> circlesOfMiddles() {
        Map<Integer, Circle> circleOf = new HashMap<>();
        for (int f = 0; f < mesh.facetCount(); f++) {
            Circle circle = section.circle(mesh.facetSegment(f));
            if (circle != null) {
                circleOf.put(mesh.facetNode(f, 2), circle);
            }
        }
        return circleOf;
    }

    private void checkMiddle(int t, int i, Map<Integer, Circle> circleOf) {
        int a = mesh.node(t, (i + 1) % 3);
        int b = mesh.node(t, (i + 2) % 3);
        int m = mesh.node(t, 3 + i);
        double ulp = Math.ulp(Math.max(Math.abs(mesh.x(m)), Math.abs(mesh.y(m))));
        double gap = Math.hypot(mesh.x(m) - 0.5 * (mesh.x(a) + mesh.x(b)), mesh.y(m) - 0.5 * (mesh.y(a) + mesh.y(b)));
        if (gap <= 2 * ulp) {
            return;
        }
        Circle circle = circleOf.get(m);
        if (circle == null) {
            problems.add("node " + m + " lies " + gap + " m off the middle of side " + i + " of triangle " + t);
            return;
        }
        double off = Math.abs(circle.offset(mesh.x(m), mesh.y(m)));
        double uneven = Math.abs(Math.hypot(mesh.x(m) - mesh.x(a), mesh.y(m) - mesh.y(a))
                - Math.hypot(mesh.x(m) - mesh.x(b), mesh.y(m) - mesh.y(b)));
        double allowed = 8 * ulp + 8 * Math.ulp(circle.radius());
        if (!(off <= allowed && uneven <= allowed + 2 * section.snap())) {
            problems.add("node " + m + " lies " + off + " m off the arc of side " + i + " of triangle " + t + ", and "
                    + uneven + " m off its middle");
        }
    }
}
