package tepor.solver.answer;

import java.util.BitSet;
import java.util.List;
import tepor.mesher.section.BoundaryRuns;
import tepor.mesher.section.Section;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;

/** Finds what of the boundary is insulated: stated to be, or because nothing was stated. */
final class InsulatedFinder {
    private InsulatedFinder() {}

    static Insulated find(Case subject) {
        Section section = subject.section();
        BitSet open = new BitSet();
        for (int s = 0; s < section.segmentCount(); s++) {
            open.set(s, section.isBoundary(s));
        }
        double stated = 0;
        for (Edge edge : subject.edges()) {
            if (edge.conditions().isEmpty() && edge.insulated().isEmpty()) {
                continue;
            }
            for (int s : edge.pieces().segments()) {
                if (open.get(s)) {
                    open.clear(s);
                    stated += edge.insulated().isEmpty() ? 0 : section.length(s);
                }
            }
        }
        double byDefault = open.stream().mapToDouble(section::length).sum();
        List<int[]> runs = BoundaryRuns.of(section, open);
        return new Insulated(stated, byDefault, runs);
    }
}
