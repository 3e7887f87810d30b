package tepor.solver.casefile;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.model.Input;
import tepor.solver.model.Inputs;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;
import tepor.solver.quantity.QuantityException;
import tepor.solver.quantity.QuantityReader;

/** Reads the quantities of a case file: their dimension, their sign, and whether they may carry a spread. */
final class QuantityKeys {
    /** Which values make sense. */
    enum Range {
        /** Any value of the dimension. */
        ANY,
        /** Greater than zero, also at the lower end of its spread. */
        POSITIVE
    }

    private final Inputs inputs;
    private final Findings findings;
    private final Map<String, Range> ranges = new HashMap<>();
    private final Set<String> faulty = new HashSet<>();

    /**
     * @param inputs takes every quantity that decides an answer
     * @param findings takes what is wrong
     */
    QuantityKeys(Inputs inputs, Findings findings) {
        this.inputs = inputs;
        this.findings = findings;
    }

    /** The input at a key, if it is there and right; a spread is kept. */
    Optional<Input> input(KeyTable table, String key, String path, Range range, Dimension... dimensions) {
        return table.value(key).flatMap(v -> input(v, path, range, dimensions));
    }

    /** The input that a value states, if it is right; a spread is kept. */
    Optional<Input> input(Value value, String path, Range range, Dimension... dimensions) {
        Optional<Quantity> quantity = read(value, range, dimensions);
        if (quantity.isEmpty()) {
            faulty.add(path);
        }
        return quantity.flatMap(q -> add(path, q, range, value.place()));
    }

    /** Makes a quantity an input; empty where the path is taken, as by a second thing of the same name. */
    Optional<Input> add(String path, Quantity quantity, Range range, Place place) {
        // A duplicate name was reported where it stands; its inputs would only repeat the path.
        if (inputs.find(path).isPresent()) {
            return Optional.empty();
        }
        ranges.put(path, range);
        return Optional.of(inputs.add(path, quantity, place));
    }

    /** The path that these steps make: {@code edge.outer skin.film}; a name with a dot is quoted. */
    static String path(String... steps) {
        return List.of(steps).stream()
                .map(name -> name.contains(".") ? "\"" + name + "\"" : name)
                .collect(Collectors.joining("."));
    }

    /** Notes that an input of this path is stated, but wrongly. */
    void addFaulty(String path) {
        faulty.add(path);
    }

    /** Whether an input of this path is stated, but wrongly. */
    boolean isFaulty(String path) {
        return faulty.contains(path);
    }

    /** The input of a path; quotes around a name with a dot may be left out where that is unambiguous. */
    Optional<Input> find(String path) {
        Optional<Input> exact = inputs.find(path);
        if (exact.isPresent()) {
            return exact;
        }
        String bare = path.replace("\"", "");
        List<Input> same = inputs.all().stream()
                .filter(i -> i.path().replace("\"", "").equals(bare))
                .toList();
        return same.size() == 1 ? Optional.of(same.get(0)) : Optional.empty();
    }

    /** Which values of an input make sense. */
    Range rangeOf(Input input) {
        return ranges.get(input.path());
    }

    Inputs inputs() {
        return inputs;
    }

    /** The quantity that a value states, which may carry no spread; {@code why} says why not. */
    Optional<Quantity> exact(Value value, String why, Range range, Dimension... dimensions) {
        return read(value, range, dimensions).flatMap(q -> withoutSpread(q, value, why));
    }

    /** The quantity that a text states, which may carry no spread; {@code why} says why not. */
    Optional<Quantity> exact(String text, Value value, String why, Range range, Dimension... dimensions) {
        return read(text, value, range, dimensions).flatMap(q -> withoutSpread(q, value, why));
    }

    /** The quantity that a value states, if it is one of these dimensions and of this range. */
    Optional<Quantity> read(Value value, Range range, Dimension... dimensions) {
        if (value.isText()) {
            return read((String) value.raw(), value, range, dimensions);
        }
        if (value.isNumber() && List.of(dimensions).contains(Dimension.NUMBER)) {
            return read(String.valueOf(value.raw()), value, range, dimensions);
        }
        Dimension first = dimensions[0];
        boolean number = value.raw() instanceof Number n && Double.isFinite(n.doubleValue());
        findings.error(
                value.isNumber() ? "unit-missing" : "wrong-type",
                value.place(),
                value.name() + " is " + value.found() + ", where " + first.words()
                        + (first == Dimension.NUMBER ? "" : " with its unit") + " is wanted",
                first == Dimension.NUMBER
                        ? "write a number"
                        : "write a text such as \"" + (number ? value.raw() : "1") + " " + first.unit() + "\"");
        return Optional.empty();
    }

    private Optional<Quantity> read(String text, Value value, Range range, Dimension... dimensions) {
        Quantity quantity;
        try {
            quantity = QuantityReader.read(text, dimensions);
        } catch (QuantityException e) {
            findings.error("quantity", value.place(), value.name() + ": " + e.getMessage(), e.remedy());
            return Optional.empty();
        }
        if (range == Range.POSITIVE && quantity.value() <= 0) {
            findings.error(
                    "not-positive",
                    value.place(),
                    value.name() + " is \"" + text + "\", but must be greater than zero",
                    "write " + quantity.dimension().words() + " above 0 " + quantity.unit());
            return Optional.empty();
        }
        if (range == Range.POSITIVE
                && quantity.hasSpread()
                && quantity.value() - quantity.spread().halfWidth() <= 0) {
            findings.error(
                    "spread-reaches-zero",
                    value.place(),
                    value.name() + " is \"" + text + "\": its spread reaches zero",
                    "state a spread smaller than the value");
            return Optional.empty();
        }
        return Optional.of(quantity);
    }

    private Optional<Quantity> withoutSpread(Quantity quantity, Value value, String why) {
        if (quantity.hasSpread()) {
            findings.error(
                    "spread-refused",
                    value.place(),
                    value.name() + " is \"" + quantity.text() + "\" with a spread, but " + why,
                    "leave the spread out");
            return Optional.empty();
        }
        return Optional.of(quantity);
    }
}
