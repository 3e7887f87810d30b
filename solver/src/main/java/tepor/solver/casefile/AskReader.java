package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Findings;
import tepor.mesher.section.Section;
import tepor.solver.casefile.AskKindReader.WrittenAsk;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.casefile.TargetReader.Parts;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Edge;
import tepor.solver.model.Input;
import tepor.solver.quantity.Dimension;

/** Reads {@code [[ask]]}. */
final class AskReader {
    private static final Keys LESS = Keys.of("u", "length");
    private static final String LESS_EXAMPLE = "less = [{ u = \"0.25 W/(m2.K)\", length = \"1.2 m\" }]";
    /** How far off the section a point may lie, as a fraction of the extent. */
    private static final double OFF = 1e-5;

    private final Parts parts;
    private final Drawing drawing;
    private final QuantityKeys quantities;
    private final Findings findings;
    private final TargetReader targets;

    AskReader(Parts parts, Drawing drawing, QuantityKeys quantities, Findings findings) {
        this.parts = parts;
        this.drawing = drawing;
        this.quantities = quantities;
        this.findings = findings;
        this.targets = new TargetReader(parts);
    }

    /** All asks in the order written; those with a fault are left out. */
    List<Ask> read(KeyTable root) {
        AskKindReader kinds = new AskKindReader(findings);
        List<WrittenAsk> written = kinds.read(root);
        // Every input must be there before a `with` may name it.
        Map<String, Optional<List<Ask.Less>>> less = new HashMap<>();
        for (WrittenAsk ask : written) {
            if (ask.is("transmittance")) {
                less.put(ask.name(), less(ask));
            }
        }
        DifferenceOrder order = new DifferenceOrder(written, kinds.names(), findings);
        AskHeadReader headReader = new AskHeadReader(quantities, findings);
        Map<String, Ask> asks = new HashMap<>();
        for (WrittenAsk ask : order.inOrder()) {
            Optional<Dimension> dimension = order.dimension(ask.name());
            Ask.Head head = headReader.read(ask.table(), ask.name(), dimension);
            if (dimension.isEmpty()) {
                continue;
            }
            Optional<Ask> made = ask.is("difference")
                    ? difference(head, order.operands(ask.name()), asks)
                    : ask(ask, head, less.getOrDefault(ask.name(), Optional.empty()));
            made.ifPresent(a -> asks.put(ask.name(), a));
        }
        return written.stream()
                .map(WrittenAsk::name)
                .filter(asks::containsKey)
                .map(asks::get)
                .toList();
    }

    private static Optional<Ask> difference(Ask.Head head, List<String> operands, Map<String, Ask> asks) {
        Ask first = asks.get(operands.get(0));
        Ask second = asks.get(operands.get(1));
        return first == null || second == null
                ? Optional.empty()
                : Optional.of(new Ask.Difference(head, first, second));
    }

    private Optional<Ask> ask(WrittenAsk ask, Ask.Head head, Optional<List<Ask.Less>> less) {
        Value subject = ask.subject();
        return switch (ask.kind().orElseThrow()) {
            case "peak" -> targets.ofTemperature(subject).map(t -> new Ask.Peak(head, t));
            case "lowest" -> targets.ofTemperature(subject).map(t -> new Ask.Lowest(head, t));
            case "mean" -> targets.ofTemperature(subject).map(t -> new Ask.Mean(head, t));
            case "flow" -> targets.ofFlow(subject).map(t -> new Ask.Flow(head, t));
            case "at" -> point(subject).map(p -> new Ask.At(head, p.x, p.y));
            case "coupling" -> targets.twoAirs(subject).map(a -> new Ask.Coupling(head, a.get(0), a.get(1)));
            case "transmittance" -> {
                Optional<List<Air>> airs = targets.twoAirs(subject);
                yield airs.isEmpty() || less.isEmpty()
                        ? Optional.empty()
                        : Optional.of(new Ask.Transmittance(
                                head, airs.get().get(0), airs.get().get(1), less.get()));
            }
            default -> factor(ask, head);
        };
    }

    private Optional<Ask> factor(WrittenAsk ask, Ask.Head head) {
        Optional<Edge> edge = targets.edge(ask.subject());
        Optional<Air> inner = air(ask.table(), "inner");
        Optional<Air> outer = air(ask.table(), "outer");
        if (inner.isEmpty() || outer.isEmpty()) {
            return Optional.empty();
        }
        if (inner.get().name().equals(outer.get().name())) {
            findings.error(
                    "two-airs",
                    ask.table().place("outer"),
                    "'inner' and 'outer' of " + ask.table().label() + " both name air '"
                            + inner.get().name() + "'",
                    "name two different airs");
            return Optional.empty();
        }
        if (temperature(inner.get(), head) == temperature(outer.get(), head)) {
            findings.error(
                    "no-temperature-difference",
                    ask.table().place("inner"),
                    "airs '" + inner.get().name() + "' and '" + outer.get().name() + "' of "
                            + ask.table().label() + " have the same temperature, "
                            + inner.get().temperature().quantity().text(),
                    "a temperature factor needs two different temperatures");
            return Optional.empty();
        }
        return edge.map(e -> new Ask.Factor(head, e, inner.get(), outer.get()));
    }

    private static double temperature(Air air, Ask.Head head) {
        Double changed = head.with().get(air.temperature());
        return changed == null ? air.temperature().quantity().value() : changed;
    }

    private Optional<Air> air(KeyTable ask, String key) {
        if (!ask.has(key)) {
            ask.missing(key, key + " = \"…\", the air on the " + key + " side");
        }
        return ask.value(key).flatMap(targets::air);
    }

    private Optional<Coordinate> point(Value value) {
        Optional<Coordinate> point = drawing.geometry(value, "a point", "POINT").map(g -> g.getCoordinate());
        if (point.isEmpty() || parts.section().isEmpty()) {
            return Optional.empty();
        }
        Section section = parts.section().get();
        double[] nearest = nearest(section, point.get().x, point.get().y);
        double distance = nearest[2];
        String off = value.name() + ", " + drawing.unit().point(point.get().x, point.get().y)
                + ", lies off the section by " + drawing.unit().length(distance);
        String onto = drawing.unit().point(nearest[0], nearest[1]);
        if (distance > OFF * section.extent()) {
            findings.error("point-off-section", value.place(), off, "the nearest point of the section is " + onto);
            return Optional.empty();
        }
        if (distance > section.snap()) {
            findings.warning("point-moved", value.place(), off + "; it is moved to " + onto, "");
        }
        return Optional.of(new Coordinate(nearest[0], nearest[1]));
    }

    /** What a transmittance leaves out; empty where something of it is wrong. */
    private Optional<List<Ask.Less>> less(WrittenAsk ask) {
        Optional<Value> value = ask.table().value("less");
        if (value.isEmpty()) {
            findings.warning(
                    "nothing-less",
                    ask.table().place(),
                    ask.table().label() + " asks a transmittance, but leaves out no one-dimensional part: it is the"
                            + " coupling itself",
                    "write " + LESS_EXAMPLE + ", or less = [] if that is meant");
            return Optional.of(List.of());
        }
        List<Value> elements = value.get().elements(LESS_EXAMPLE);
        List<Ask.Less> less = new ArrayList<>();
        for (int i = 0; i < elements.size(); i++) {
            Value element = elements.get(i);
            String path = QuantityKeys.path("ask", ask.name(), "less", String.valueOf(i + 1));
            element.table(LESS_EXAMPLE, element.name()).ifPresent(table -> {
                table.allow(LESS);
                Optional<Input> u = required(table, "u", path, "0.25 W/(m2.K)", Dimension.FILM);
                Optional<Input> length = required(table, "length", path, "1.2 m", Dimension.LENGTH);
                if (u.isPresent() && length.isPresent()) {
                    less.add(new Ask.Less(u.get(), length.get()));
                }
            });
        }
        return value.get().isArray() && less.size() == elements.size() ? Optional.of(less) : Optional.empty();
    }

    private Optional<Input> required(KeyTable table, String key, String path, String example, Dimension dimension) {
        if (!table.has(key)) {
            table.missing(key, key + " = \"" + example + "\"");
        }
        return quantities.input(table, key, path + "." + key, Range.POSITIVE, dimension);
    }

    /**
     * The point of the material that is nearest.
     *
     * @param x metres
     * @param y metres
     * @return x, y and the distance to it, metres; the point itself, and 0, where it lies in material
     */
    private static double[] nearest(Section section, double x, double y) {
        double[] best = {x, y, Double.POSITIVE_INFINITY};
        boolean inside = false;
        for (int s = 0; s < section.segmentCount(); s++) {
            if (!section.isBoundary(s)) {
                continue;
            }
            double ax = section.x(section.start(s));
            double ay = section.y(section.start(s));
            double bx = section.x(section.end(s));
            double by = section.y(section.end(s));
            // A ray to the right crosses the boundary an odd number of times from inside (even-odd rule).
            if ((ay > y) != (by > y) && x < ax + (y - ay) / (by - ay) * (bx - ax)) {
                inside = !inside;
            }
            double along =
                    ((x - ax) * (bx - ax) + (y - ay) * (by - ay)) / ((bx - ax) * (bx - ax) + (by - ay) * (by - ay));
            double t = Math.max(0, Math.min(1, along));
            double px = ax + t * (bx - ax);
            double py = ay + t * (by - ay);
            double distance = Math.hypot(px - x, py - y);
            if (distance < best[2]) {
                best = new double[] {px, py, distance};
            }
        }
        return inside ? new double[] {x, y, 0} : best;
    }
}
