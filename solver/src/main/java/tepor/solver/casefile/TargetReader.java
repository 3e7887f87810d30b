package tepor.solver.casefile;

import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.section.Section;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.Names.Kind;
import tepor.solver.model.Air;
import tepor.solver.model.Edge;
import tepor.solver.model.Region;
import tepor.solver.model.Target;

/** Finds what an ask looks at by its name. */
final class TargetReader {
    private static final String EVERYTHING = "everything";

    private final Parts parts;

    /**
     * What asks and mesh can refer to, as far as it is sound.
     *
     * @param names all names, of sound and faulty things alike
     * @param regions by name; faulty ones are missing
     * @param holes names of the regions of nothing
     * @param airs by name; faulty ones are missing
     * @param usedAirs names of the airs in which an edge is
     * @param edges by name; faulty ones are missing
     * @param section empty where regions are faulty
     * @param passable segments through which heat may pass
     */
    record Parts(
            Names names,
            Map<String, Region> regions,
            Set<String> holes,
            Map<String, Air> airs,
            Set<String> usedAirs,
            Map<String, Edge> edges,
            Optional<Section> section,
            BitSet passable) {}

    TargetReader(Parts parts) {
        this.parts = parts;
    }

    /** A region, an edge, or everything, to take temperatures of. */
    Optional<Target> ofTemperature(Value value) {
        Optional<String> text = value.text();
        if (text.isEmpty()) {
            return Optional.empty();
        }
        String name = text.get();
        Optional<Kind> kind = parts.names().kindOf(name);
        if (kind.isEmpty() && name.equals(EVERYTHING)) {
            return Optional.of(new Target.Everything());
        }
        String remedy = kind.filter(k -> k == Kind.AIR).isPresent()
                ? "the temperature of an air is stated, not answered; name an edge in that air"
                : "";
        if (!parts.names().check(name, value.place(), value.name(), remedy, Kind.REGION, Kind.EDGE)) {
            return Optional.empty();
        }
        if (kind.get() == Kind.EDGE) {
            return Optional.ofNullable(parts.edges().get(name)).map(Target.OfEdge::new);
        }
        if (parts.holes().contains(name)) {
            value.findings()
                    .error(
                            "ask-of-hole",
                            value.place(),
                            value.name() + " names region '" + name + "', which is of nothing and has no temperature",
                            "name an edge on its border: where = { of = \"" + name + "\" }");
            return Optional.empty();
        }
        return Optional.ofNullable(parts.regions().get(name)).map(Target.OfRegion::new);
    }

    /** An edge or an air, to take the heat flow through. */
    Optional<Target> ofFlow(Value value) {
        Optional<String> text = value.text();
        if (text.isEmpty()) {
            return Optional.empty();
        }
        String name = text.get();
        String remedy =
                "name an edge: [[edge]] with where = { of = \"" + name + "\" } is the whole border of the region";
        if (!parts.names().check(name, value.place(), value.name(), remedy, Kind.EDGE, Kind.AIR)) {
            return Optional.empty();
        }
        if (parts.names().kindOf(name).orElseThrow() == Kind.AIR) {
            return usedAir(name, value).map(Target.OfAir::new);
        }
        Edge edge = parts.edges().get(name);
        if (edge != null && !heatMayPass(edge)) {
            value.findings()
                    .warning(
                            "flow-through-insulation",
                            value.place(),
                            value.name() + " names edge '" + name
                                    + "', on which nothing but insulation holds: its heat flow is 0",
                            "state a condition on the edge if heat passes there");
        }
        return Optional.ofNullable(edge).map(Target.OfEdge::new);
    }

    private boolean heatMayPass(Edge edge) {
        for (int s : edge.pieces().segments()) {
            if (parts.passable().get(s)) {
                return true;
            }
        }
        return false;
    }

    /** An edge. */
    Optional<Edge> edge(Value value) {
        return value.text()
                .filter(name -> parts.names().check(name, value.place(), value.name(), "", Kind.EDGE))
                .map(name -> parts.edges().get(name));
    }

    /** An air in which an edge is. */
    Optional<Air> air(Value value) {
        return value.text()
                .filter(name -> parts.names().check(name, value.place(), value.name(), "", Kind.AIR))
                .flatMap(name -> usedAir(name, value));
    }

    /** Two different airs, in each of which an edge is. */
    Optional<List<Air>> twoAirs(Value value) {
        String example = "[\"air A\", \"air B\"]";
        if (!value.isArray()) {
            value.wrongType("an array of two airs", "write " + example);
            return Optional.empty();
        }
        List<Value> elements = value.elements(example);
        if (elements.size() != 2) {
            value.findings()
                    .error(
                            "two-airs",
                            value.place(),
                            value.name() + " has " + elements.size() + " elements, where two airs are wanted",
                            "write " + example);
            return Optional.empty();
        }
        if (elements.get(0).raw().equals(elements.get(1).raw())) {
            value.findings()
                    .error(
                            "two-airs",
                            value.place(),
                            value.name() + " names air '" + elements.get(0).raw() + "' twice",
                            "name two different airs");
            return Optional.empty();
        }
        Optional<Air> first = air(elements.get(0));
        Optional<Air> second = air(elements.get(1));
        return first.isPresent() && second.isPresent()
                ? Optional.of(List.of(first.get(), second.get()))
                : Optional.empty();
    }

    private Optional<Air> usedAir(String name, Value value) {
        if (!parts.usedAirs().contains(name)) {
            value.findings()
                    .error(
                            "air-without-edge",
                            value.place(),
                            value.name() + " names air '" + name + "', in which no edge is",
                            "write air = \"" + name + "\" on the edges that are in it");
            return Optional.empty();
        }
        return Optional.ofNullable(parts.airs().get(name));
    }
}
