package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;

/** Reads of each {@code [[ask]]} its name and what kind of figure it wants. */
final class AskKindReader {
    private static final List<String> KINDS =
            List.of("peak", "lowest", "mean", "at", "flow", "coupling", "transmittance", "factor", "difference");
    private static final List<String> LATER_KINDS = List.of("largest", "smallest");
    private static final String LATER_SEARCH = "answer the case with several values of the input, and compare";
    private static final Keys ASK = new Keys(
            Keys.of(
                            "name",
                            "peak",
                            "lowest",
                            "mean",
                            "at",
                            "flow",
                            "coupling",
                            "transmittance",
                            "factor",
                            "difference",
                            "less",
                            "inner",
                            "outer",
                            "limit",
                            "within",
                            "with")
                    .now(),
            Map.of(
                    "largest",
                    LATER_SEARCH,
                    "smallest",
                    LATER_SEARCH,
                    "keeps",
                    LATER_SEARCH,
                    "in",
                    "leave it out; without contact resistances both sides have one temperature"));
    private static final Map<String, String> ONLY_WITH =
            Map.of("less", "transmittance", "inner", "factor", "outer", "factor");

    private final Findings findings;
    private final Map<String, Place> places = new LinkedHashMap<>();

    AskKindReader(Findings findings) {
        this.findings = findings;
    }

    /**
     * An ask as it is written.
     *
     * @param name its name; where it has none of its own, something that no name can be
     * @param kind the key that says what is asked; empty where that is wrong
     * @param table where it is written
     */
    record WrittenAsk(String name, Optional<String> kind, KeyTable table) {
        /** What the key that says what is asked says. */
        Value subject() {
            return kind.flatMap(table::value).orElseThrow();
        }

        /** Whether it is of this kind. */
        boolean is(String wanted) {
            return kind.filter(wanted::equals).isPresent();
        }
    }

    /** All asks, in the order written. */
    List<WrittenAsk> read(KeyTable root) {
        List<WrittenAsk> asks = new ArrayList<>();
        if (!root.has("ask")) {
            findings.warning(
                    "no-ask",
                    root.place(),
                    "the case asks nothing",
                    "write [[ask]] with a name and, say, peak = \"everything\"");
        }
        for (KeyTable table : root.arrayTables("ask")) {
            table.allow(ASK);
            Optional<String> kind = kind(table);
            Optional<String> name = table.requiredText("name", "name = \"…\"").filter(n -> isFirst(n, table));
            // One without a name of its own is read all the same, for what else is wrong in it.
            String key = name.orElse("\0" + asks.size());
            asks.add(new WrittenAsk(key, kind, table));
        }
        return asks;
    }

    /** The names of all asks read, sound or not. */
    Set<String> names() {
        return places.keySet();
    }

    private boolean isFirst(String name, KeyTable table) {
        Place first = places.putIfAbsent(name, table.place("name"));
        if (first != null) {
            findings.error(
                    "duplicate-name",
                    table.place("name"),
                    "the name '" + name + "' is taken: an ask has it at " + first,
                    "give this ask another");
        }
        return first == null;
    }

    private Optional<String> kind(KeyTable table) {
        List<String> kinds = KINDS.stream().filter(table::has).toList();
        if (LATER_KINDS.stream().anyMatch(table::has)) {
            return Optional.empty();
        }
        if (kinds.isEmpty()) {
            findings.error(
                    "ask-kind",
                    table.place(),
                    table.label() + " does not say what is asked",
                    "write one of " + String.join(", ", KINDS));
            return Optional.empty();
        }
        if (kinds.size() > 1) {
            findings.error(
                    "ask-kind",
                    table.place(kinds.get(1)),
                    table.label() + " asks " + String.join(" and ", kinds) + ", where exactly one is wanted",
                    "write an [[ask]] for each");
            return Optional.empty();
        }
        String kind = kinds.get(0);
        for (String key : List.of("less", "inner", "outer")) {
            if (table.has(key) && !ONLY_WITH.get(key).equals(kind)) {
                findings.error(
                        "ask-kind",
                        table.place(key),
                        "'" + key + "' stands in " + table.label() + ", which asks " + kind + ", but goes with "
                                + ONLY_WITH.get(key),
                        "leave it out");
            }
        }
        return Optional.of(kind);
    }
}
