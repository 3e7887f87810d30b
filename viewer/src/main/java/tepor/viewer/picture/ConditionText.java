package tepor.viewer.picture;

import java.util.ArrayList;
import java.util.List;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Region;
import tepor.viewer.wording.ConditionWords;
import tepor.viewer.wording.UnitWords;

/** What a region is made of and what holds on an edge, a line for each thing, quantities as the user wrote them. */
final class ConditionText {
    private ConditionText() {}

    static List<String> of(Region region) {
        if (region.isHole()) {
            return List.of("nothing: cut out");
        }
        List<String> lines = new ArrayList<>();
        lines.add(region.material().name() + ", "
                + UnitWords.pretty(ConditionWords.of(region.material().conductivity())));
        if (region.heat() != null) {
            lines.add(
                    "heat " + UnitWords.pretty(region.heat().amount().quantity().text()));
        }
        return lines;
    }

    static List<String> of(Edge edge) {
        if (!edge.insulated().isEmpty() || edge.conditions().isEmpty()) {
            return List.of(ConditionWords.of(edge));
        }
        List<String> lines = new ArrayList<>();
        for (EdgeCondition condition : edge.conditions()) {
            lines.add(ConditionWords.of(condition, UnitWords::pretty));
        }
        return lines;
    }
}
