package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tepor.mesher.outline.Findings;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.model.Ask;
import tepor.solver.model.Input;
import tepor.solver.model.Limit;
import tepor.solver.model.Within;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;
import tepor.solver.quantity.QuantityException;
import tepor.solver.quantity.QuantityReader;

/** Reads what every ask may have: {@code limit}, {@code within} and {@code with}. */
final class AskHeadReader {
    private static final Within DEFAULT_WITHIN = new Within.Fraction(0.01);
    private static final Pattern LIMIT = Pattern.compile("\\s*(<=|>=|\u2264|\u2265)(.*)", Pattern.DOTALL);

    private final QuantityKeys quantities;
    private final Findings findings;

    AskHeadReader(QuantityKeys quantities, Findings findings) {
        this.quantities = quantities;
        this.findings = findings;
    }

    /**
     * Reads.
     *
     * @param ask the ask's table
     * @param name its name
     * @param dimension of its answer; empty where it is not known, and limit and tolerance cannot be read
     */
    Ask.Head read(KeyTable ask, String name, Optional<Dimension> dimension) {
        Limit limit = dimension
                .flatMap(d -> ask.value("limit").flatMap(v -> limit(v, d)))
                .orElse(null);
        Within within = dimension
                .flatMap(d -> ask.value("within").flatMap(v -> within(v, d)))
                .orElse(DEFAULT_WITHIN);
        return new Ask.Head(name, limit, within, with(ask), ask.place());
    }

    private Optional<Limit> limit(Value value, Dimension dimension) {
        String example = example(dimension);
        if (!value.isText()) {
            value.wrongType("a text with <= or >=", "write limit = \"<= " + example + "\"");
            return Optional.empty();
        }
        Matcher matcher = LIMIT.matcher((String) value.raw());
        if (!matcher.matches()) {
            findings.error(
                    "limit-form",
                    value.place(),
                    value.name() + " is " + value.found() + ", which begins with neither <= nor >=",
                    "write limit = \"<= " + example + "\" or limit = \">= " + example + "\"");
            return Optional.empty();
        }
        boolean atMost = matcher.group(1).equals("<=") || matcher.group(1).equals("\u2264");
        return quantities
                .exact(matcher.group(2).strip(), value, "a limit is exact", Range.ANY, dimension)
                .map(q -> new Limit(atMost ? Limit.Relation.AT_MOST : Limit.Relation.AT_LEAST, q));
    }

    private Optional<Within> within(Value value, Dimension dimension) {
        if (value.isText() && ((String) value.raw()).strip().endsWith("%")) {
            return fraction(value, (String) value.raw());
        }
        Dimension tolerance = dimension == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : dimension;
        return quantities
                .exact(value, "a tolerance is exact", Range.POSITIVE, tolerance)
                .map(q -> new Within.Absolute(q.value()));
    }

    private Optional<Within> fraction(Value value, String text) {
        String remedy = "write a tolerance such as \"1 %\"";
        try {
            double fraction = QuantityReader.readFraction(text);
            if (fraction > 0) {
                return Optional.of(new Within.Fraction(fraction));
            }
            findings.error(
                    "not-positive",
                    value.place(),
                    value.name() + " is " + value.found() + ", but must be greater than zero",
                    remedy);
        } catch (QuantityException e) {
            findings.error("quantity", value.place(), value.name() + ": " + e.getMessage(), remedy);
        }
        return Optional.empty();
    }

    private static String example(Dimension dimension) {
        return switch (dimension) {
            case TEMPERATURE -> "105 degC";
            case NUMBER -> "0.7";
            default -> "1 " + dimension.unit();
        };
    }

    private Map<Input, Double> with(KeyTable ask) {
        Map<Input, Double> changed = new LinkedHashMap<>();
        Optional<KeyTable> table = ask.value("with").flatMap(v -> v.table("with = { \"PATH\" = \"…\" }", v.name()));
        for (Change change : table.map(t -> flat(t, List.of())).orElse(List.of())) {
            make(change, "'with' of " + ask.label(), changed);
        }
        return changed;
    }

    /** One line of a {@code with}. */
    private record Change(String path, Value value) {}

    /** Paths may be one quoted key or TOML's own dotted keys: the latter come as tables in tables. */
    private static List<Change> flat(KeyTable table, List<String> above) {
        List<Change> changes = new ArrayList<>();
        for (String key : table.keys()) {
            List<String> steps = new ArrayList<>(above);
            steps.add(key);
            Value value = table.value(key).orElseThrow();
            if (value.isTable()) {
                changes.addAll(flat(value.table("with", table.label()).orElseThrow(), steps));
            } else {
                String path = steps.size() == 1 ? key : QuantityKeys.path(steps.toArray(new String[0]));
                changes.add(new Change(path, value));
            }
        }
        return changes;
    }

    private void make(Change change, String with, Map<Input, Double> changed) {
        Optional<Input> input = quantities.find(change.path());
        if (input.isEmpty()) {
            if (!quantities.isFaulty(change.path())) {
                findings.error(
                        "unknown-path",
                        change.value().place(),
                        with + " names the input '" + change.path() + "', but the case has no quantity of that path",
                        remedy(change.path()));
            }
            return;
        }
        Optional<Quantity> quantity = quantities.exact(
                change.value(),
                "the spread stays that of the input itself",
                quantities.rangeOf(input.get()),
                input.get().quantity().dimension());
        if (quantity.isPresent() && changed.put(input.get(), quantity.get().value()) != null) {
            findings.error(
                    "duplicate-path",
                    change.value().place(),
                    with + " names the input '" + input.get().path() + "' twice",
                    "state it once");
        }
    }

    private String remedy(String path) {
        List<String> known = quantities.inputs().all().stream().map(Input::path).toList();
        return NearestWord.remedy(path, known, "quantity");
    }
}
