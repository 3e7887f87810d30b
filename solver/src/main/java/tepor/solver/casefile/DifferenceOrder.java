package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.outline.Findings;
import tepor.solver.casefile.AskKindReader.WrittenAsk;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.quantity.Dimension;

/** Orders asks so that a difference comes after the two it is taken of, and finds the dimension of each. */
final class DifferenceOrder {
    private final Map<String, WrittenAsk> asks = new LinkedHashMap<>();
    private final Set<String> names;
    private final Findings findings;
    private final Map<String, Optional<Dimension>> dimensions = new LinkedHashMap<>();
    private final Map<String, List<String>> operands = new HashMap<>();
    private final List<String> open = new ArrayList<>();
    private final Set<String> inCircle = new HashSet<>();

    /**
     * @param written all asks
     * @param names the names among them
     * @param findings takes what is wrong
     */
    DifferenceOrder(List<WrittenAsk> written, Set<String> names, Findings findings) {
        written.forEach(a -> asks.put(a.name(), a));
        this.names = names;
        this.findings = findings;
        written.forEach(a -> visit(a.name()));
    }

    /** The asks, each difference after the two it is taken of. */
    List<WrittenAsk> inOrder() {
        return dimensions.keySet().stream().map(asks::get).toList();
    }

    /** The dimension of an ask's answer; empty where it depends on something wrong. */
    Optional<Dimension> dimension(String name) {
        return dimensions.get(name);
    }

    /** The two asks a difference is taken of; empty where they are wrong. */
    List<String> operands(String name) {
        return operands.getOrDefault(name, List.of());
    }

    private Optional<Dimension> visit(String name) {
        if (dimensions.containsKey(name)) {
            return dimensions.get(name);
        }
        WrittenAsk ask = asks.get(name);
        if (ask == null) {
            return Optional.empty();
        }
        if (open.contains(name)) {
            circle(name);
            return Optional.empty();
        }
        open.add(name);
        Optional<Dimension> dimension = switch (ask.kind().orElse("")) {
            case "" -> Optional.empty();
            case "peak", "lowest", "mean", "at" -> Optional.of(Dimension.TEMPERATURE);
            case "flow" -> Optional.of(Dimension.HEAT_PER_LENGTH);
            case "coupling", "transmittance" -> Optional.of(Dimension.COUPLING);
            case "factor" -> Optional.of(Dimension.NUMBER);
            default -> ofDifference(ask);
        };
        open.remove(name);
        dimensions.put(name, dimension);
        return dimension;
    }

    private void circle(String name) {
        List<String> circle = open.subList(open.indexOf(name), open.size());
        if (inCircle.addAll(circle)) {
            Value subject = asks.get(name).subject();
            findings.error(
                    "circle",
                    subject.place(),
                    subject.name() + " depends on itself: " + String.join(" → ", circle) + " → " + name,
                    "take differences of asks that are answered on their own");
        }
    }

    private Optional<Dimension> ofDifference(WrittenAsk ask) {
        Value subject = ask.subject();
        String example = "difference = [\"ask A\", \"ask B\"]";
        if (ask.table().has("with")) {
            findings.error(
                    "with-difference",
                    ask.table().place("with"),
                    "'with' stands in " + ask.table().label() + ", which is a difference of other asks",
                    "state it on the asks that are subtracted");
        }
        if (!subject.isArray()) {
            subject.wrongType("an array of two asks", "write " + example);
            return Optional.empty();
        }
        List<Value> elements = subject.elements(example);
        if (elements.size() != 2) {
            findings.error(
                    "difference-form",
                    subject.place(),
                    subject.name() + " has " + elements.size() + " elements, where two asks are wanted",
                    "write " + example);
            return Optional.empty();
        }
        List<String> pair = new ArrayList<>();
        for (Value element : elements) {
            element.text().filter(n -> known(n, element)).ifPresent(pair::add);
        }
        if (pair.size() < 2) {
            return Optional.empty();
        }
        Optional<Dimension> first = visit(pair.get(0));
        Optional<Dimension> second = visit(pair.get(1));
        if (first.isEmpty() || second.isEmpty()) {
            return Optional.empty();
        }
        if (first.get() != second.get()) {
            findings.error(
                    "difference-dimension",
                    subject.place(),
                    subject.name() + " subtracts " + second.get().words() + " ('" + pair.get(1) + "') from "
                            + first.get().words() + " ('" + pair.get(0) + "')",
                    "take the difference of two asks in the same unit");
            return Optional.empty();
        }
        operands.put(ask.name(), pair);
        return first.map(d -> d == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : d);
    }

    private boolean known(String name, Value value) {
        if (names.contains(name)) {
            return true;
        }
        findings.error(
                "unknown-name",
                value.place(),
                value.name() + " names '" + name + "', but no ask has that name",
                NearestWord.remedy(name, names, "other ask"));
        return false;
    }
}
