package tepor.solver.answer;

import java.util.ArrayDeque;
import java.util.BitSet;
import java.util.Deque;
import java.util.TreeSet;
import java.util.stream.Collectors;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleMap;
import tepor.mesher.outline.Findings;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;

/** Finds parts of a section that nothing ties to a temperature: their temperature is not determined. */
final class FloatingPartCheck {
    private FloatingPartCheck() {}

    /** @throws tepor.mesher.outline.FaultyInputException if there is such a part; names each */
    static void check(Case subject, Mesh mesh) {
        BitSet tied = new BitSet();
        for (Edge edge : subject.edges()) {
            boolean ties = edge.conditions().stream().anyMatch(c -> !(c instanceof EdgeCondition.Inflow));
            if (ties) {
                for (int s : edge.pieces().segments()) {
                    tied.set(s);
                }
            }
        }
        BitSet tiedTriangle = new BitSet();
        for (int f = 0; f < mesh.facetCount(); f++) {
            if (mesh.isBoundaryFacet(f) && tied.get(mesh.facetSegment(f))) {
                tiedTriangle.set(Math.max(mesh.facetLeftTriangle(f), mesh.facetRightTriangle(f)));
            }
        }
        Findings findings = new Findings();
        BitSet seen = new BitSet();
        for (int t = 0; t < mesh.triangleCount(); t++) {
            if (!seen.get(t)) {
                part(subject, mesh, t, seen, tiedTriangle, findings);
            }
        }
        findings.throwIfFaulty();
    }

    private static void part(Case subject, Mesh mesh, int first, BitSet seen, BitSet tied, Findings findings) {
        Deque<Integer> queue = new ArrayDeque<>();
        TreeSet<Integer> regions = new TreeSet<>();
        boolean isTied = false;
        queue.add(first);
        seen.set(first);
        while (!queue.isEmpty()) {
            int t = queue.poll();
            regions.add(mesh.region(t));
            isTied |= tied.get(t);
            for (int i = 0; i < 3; i++) {
                int next = mesh.neighbour(t, i);
                if (next != Mesh.NONE && !seen.get(next)) {
                    seen.set(next);
                    queue.add(next);
                }
            }
        }
        if (!isTied) {
            TriangleMap map = new TriangleMap(mesh);
            map.moveTo(first);
            double third = 1.0 / 3;
            double x = map.x(third, third, third);
            double y = map.y(third, third, third);
            String names = regions.stream()
                    .map(r -> "'" + subject.regions().get(r).name() + "'")
                    .collect(Collectors.joining(", "));
            findings.error(
                    "floating-part",
                    subject.regions().get(regions.first()).place(),
                    "nothing ties the part of " + names + " around "
                            + subject.unit().point(x, y) + " to a temperature, so it has none",
                    "give a piece of its boundary a temperature, or a film or resistance with an air; or join it to its"
                            + " neighbours; or take it out");
        }
    }
}
