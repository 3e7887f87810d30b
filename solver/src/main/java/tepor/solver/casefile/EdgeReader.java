package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tepor.mesher.section.Where;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.model.EdgeCondition;

/** Reads {@code [[edge]]}: the name of an edge, where it is, and what holds on it. */
final class EdgeReader {
    private static final String LATER_LAYER = "draw the layer as a thin region with its conductivity";
    private static final String LATER_RADIATION = "state a film that takes radiation in";
    private static final Keys EDGE = new Keys(
            Keys.of("name", "where", "temperature", "film", "resistance", "air", "inflow", "insulated")
                    .now(),
            Map.of(
                    "contact", LATER_LAYER,
                    "sheet", LATER_LAYER,
                    "emissivity", LATER_RADIATION,
                    "surroundings", LATER_RADIATION));

    private final WhereReader whereReader;
    private final ConditionReader conditionReader;

    EdgeReader(WhereReader whereReader, ConditionReader conditionReader) {
        this.whereReader = whereReader;
        this.conditionReader = conditionReader;
    }

    /**
     * An edge as it is written.
     *
     * @param name its name
     * @param where empty where that is wrong
     * @param conditions what holds on it; empty where something of it is wrong; an empty list for a mere name
     * @param stated the keys that state a condition, insulation among them, be they right or wrong
     * @param insulated why it is insulated; empty where it is not
     * @param table where it is written
     */
    record WrittenEdge(
            String name,
            Optional<Where> where,
            Optional<List<EdgeCondition>> conditions,
            List<String> stated,
            String insulated,
            KeyTable table) {
        /** Whether nothing else may be stated on its pieces. */
        boolean statesCondition() {
            return !stated.isEmpty();
        }
    }

    /** All edges with a name, in the order written. */
    List<WrittenEdge> read(KeyTable root) {
        List<WrittenEdge> edges = new ArrayList<>();
        for (KeyTable table : root.arrayTables("edge")) {
            table.allow(EDGE);
            Optional<String> name = table.requiredText("name", "name = \"…\"");
            Optional<Where> where = whereReader.read(table);
            Optional<List<EdgeCondition>> conditions = conditionReader.read(table, name.orElse(""));
            List<String> stated = ConditionReader.stated(table);
            String insulated = table.value("insulated")
                    .filter(KeyTable.Value::isText)
                    .map(v -> (String) v.raw())
                    .orElse("");
            name.ifPresent(n -> edges.add(new WrittenEdge(n, where, conditions, stated, insulated, table)));
        }
        return edges;
    }
}
