package tepor.solver.model;

import java.util.List;
import tepor.mesher.outline.Place;
import tepor.mesher.section.EdgePieces;

/**
 * A named edge.
 *
 * @param name its name in the case
 * @param pieces the segments of the section it consists of
 * @param conditions what holds on it: empty (a mere name), one {@link EdgeCondition.FixedTemperature}, or a sum of others
 * @param insulated why it is insulated, where that is stated; empty where not
 * @param place where the user wrote it
 */
public record Edge(String name, EdgePieces pieces, List<EdgeCondition> conditions, String insulated, Place place) {
    public Edge {
        conditions = List.copyOf(conditions);
    }
}
