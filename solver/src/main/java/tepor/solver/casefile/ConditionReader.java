package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import tepor.mesher.outline.Findings;
import tepor.solver.casefile.AirReader.WrittenAir;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.Names.Kind;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.model.Air;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.EdgeCondition.Film;
import tepor.solver.model.EdgeCondition.FixedTemperature;
import tepor.solver.model.EdgeCondition.Inflow;
import tepor.solver.model.EdgeCondition.InflowBasis;
import tepor.solver.model.EdgeCondition.SurfaceResistance;
import tepor.solver.model.Input;
import tepor.solver.quantity.Dimension;

/** Reads what holds on an edge, and refuses what cannot hold together. */
final class ConditionReader {
    private static final List<String> CONDITIONS =
            List.of("temperature", "film", "resistance", "air", "inflow", "insulated");
    private static final List<String> NOT_WITH_TEMPERATURE = List.of("film", "resistance", "air", "inflow");
    private static final Pattern NUMBER_FIRST = Pattern.compile("\\s*[-+\u2212]?[.\\d].*", Pattern.DOTALL);

    private final Names names;
    private final Map<String, WrittenAir> airs;
    private final QuantityKeys quantities;
    private final Findings findings;
    private final Set<String> usedAirs = new HashSet<>();

    /**
     * @param names the names of the case
     * @param airs all airs by name
     * @param quantities reads the quantities
     * @param findings takes what is wrong
     */
    ConditionReader(Names names, Map<String, WrittenAir> airs, QuantityKeys quantities, Findings findings) {
        this.names = names;
        this.airs = airs;
        this.quantities = quantities;
        this.findings = findings;
    }

    /** The keys in an edge's table that state a condition. */
    static List<String> stated(KeyTable edge) {
        return CONDITIONS.stream().filter(edge::has).toList();
    }

    /** The names of the airs that an edge read so far is in. */
    Set<String> usedAirs() {
        return Set.copyOf(usedAirs);
    }

    /** What holds on an edge; empty, with errors, where something of it is wrong. */
    Optional<List<EdgeCondition>> read(KeyTable edge, String name) {
        boolean together = mayStandTogether(edge);
        boolean insulation = insulation(edge);
        Optional<Input> temperature = input(edge, name, "temperature", Range.ANY, Dimension.TEMPERATURE);
        Optional<Input> film = input(edge, name, "film", Range.POSITIVE, Dimension.FILM);
        Optional<Input> resistance = input(edge, name, "resistance", Range.POSITIVE, Dimension.RESISTANCE);
        Optional<Input> inflow =
                input(edge, name, "inflow", Range.ANY, Dimension.HEAT_PER_AREA, Dimension.HEAT_PER_LENGTH);
        Optional<Around> around = edge.value("air").flatMap(v -> around(v, name));
        boolean complete = around.isPresent() == edge.has("air")
                && (edge.has("temperature") || edge.has("insulated") || filmAndAirTogether(edge, around));
        if (!together
                || !insulation
                || !complete
                || temperature.isPresent() != edge.has("temperature")
                || film.isPresent() != edge.has("film")
                || resistance.isPresent() != edge.has("resistance")
                || inflow.isPresent() != edge.has("inflow")) {
            return Optional.empty();
        }
        List<EdgeCondition> conditions = new ArrayList<>();
        temperature.ifPresent(t -> conditions.add(new FixedTemperature(t)));
        around.ifPresent(a -> {
            film.ifPresent(f -> conditions.add(new Film(f, a.temperature(), a.air())));
            resistance.ifPresent(r -> conditions.add(new SurfaceResistance(r, a.temperature(), a.air())));
            if (film.isEmpty() && resistance.isEmpty()) {
                conditions.add(new Film(a.air().film(), a.temperature(), a.air()));
            }
        });
        inflow.ifPresent(q -> conditions.add(new Inflow(q, basis(q.quantity().dimension()))));
        if (film.isPresent() && resistance.isPresent()) {
            findings.warning(
                    "film-and-resistance",
                    edge.place("resistance"),
                    edge.label()
                            + " states a film and a resistance; they act side by side, so that their heat flows add",
                    "for a film behind a resistance state one resistance, R + 1/film");
        }
        return Optional.of(conditions);
    }

    private Optional<Input> input(KeyTable edge, String name, String key, Range range, Dimension... dimensions) {
        return quantities.input(edge, key, QuantityKeys.path("edge", name, key), range, dimensions);
    }

    private static InflowBasis basis(Dimension dimension) {
        return dimension == Dimension.HEAT_PER_AREA ? InflowBasis.PER_AREA : InflowBasis.PER_LENGTH;
    }

    private boolean mayStandTogether(KeyTable edge) {
        List<String> others = NOT_WITH_TEMPERATURE.stream().filter(edge::has).toList();
        boolean sound = true;
        if (edge.has("temperature") && !others.isEmpty()) {
            findings.error(
                    "conditions-clash",
                    edge.place("temperature"),
                    edge.label() + " states temperature together with " + String.join(", ", others),
                    "a fixed surface temperature stands alone; the temperature of the surroundings is the edge's air");
            sound = false;
        }
        if (edge.has("insulated") && stated(edge).size() > 1) {
            List<String> all =
                    stated(edge).stream().filter(k -> !k.equals("insulated")).toList();
            findings.error(
                    "conditions-clash",
                    edge.place("insulated"),
                    edge.label() + " is insulated, but states " + String.join(", ", all) + " too",
                    "leave out one or the other");
            sound = false;
        }
        return sound;
    }

    private boolean insulation(KeyTable edge) {
        if (!edge.has("insulated")) {
            return true;
        }
        Value value = edge.value("insulated").orElseThrow();
        if (!value.isText() || ((String) value.raw()).isBlank()) {
            findings.error(
                    "wrong-type",
                    value.place(),
                    value.name() + " is " + value.found() + ", where the reason is wanted",
                    "write why no heat passes, such as insulated = \"symmetry plane\"");
            return false;
        }
        return true;
    }

    private boolean filmAndAirTogether(KeyTable edge, Optional<Around> around) {
        boolean film = edge.has("film") || edge.has("resistance");
        if (film && !edge.has("air")) {
            String key = edge.has("film") ? "film" : "resistance";
            findings.error(
                    "air-missing",
                    edge.place(key),
                    edge.label() + " states a " + key + ", but no air behind it",
                    "write air = \"…\": a named air, or a temperature such as \"20 degC\"");
            return false;
        }
        if (!film && around.isPresent() && !around.get().statesFilm()) {
            findings.error(
                    "film-missing",
                    edge.place("air"),
                    edge.label() + " is in air, but neither the edge nor the air states a film",
                    "write film = \"8 W/(m2.K)\" or resistance = \"0.13 m2.K/W\" on the edge, or a film under [air.NAME]");
            return false;
        }
        return true;
    }

    /**
     * The surroundings of an edge.
     *
     * @param temperature of the air
     * @param air null where the edge states a temperature
     */
    private record Around(Input temperature, Air air) {
        boolean statesFilm() {
            return air != null && air.film() != null;
        }
    }

    private Optional<Around> around(Value value, String edgeName) {
        if (!value.isText()) {
            value.wrongType("a named air or a temperature", "write air = \"room\" or air = \"20 degC\"");
            return Optional.empty();
        }
        String text = (String) value.raw();
        Optional<Kind> kind = names.kindOf(text);
        if (kind.isPresent() && kind.get() == Kind.AIR) {
            usedAirs.add(text);
            WrittenAir written = airs.get(text);
            return written == null ? Optional.empty() : written.air().map(a -> new Around(a.temperature(), a));
        }
        if (kind.isEmpty() && NUMBER_FIRST.matcher(text).matches()) {
            return quantities
                    .input(value, QuantityKeys.path("edge", edgeName, "air"), Range.ANY, Dimension.TEMPERATURE)
                    .map(t -> new Around(t, null));
        }
        names.check(
                text,
                value.place(),
                value.name(),
                "name an air, or write a temperature such as air = \"20 degC\"",
                Kind.AIR);
        return Optional.empty();
    }

    /** Warns of airs in which no edge is. */
    void warnOfUnusedAirs() {
        airs.forEach((name, written) -> {
            if (!usedAirs.contains(name)) {
                findings.warning(
                        "unused-air",
                        written.table().place(),
                        "no edge is in air '" + name + "'",
                        "leave it out, or name it in an [[edge]]: air = \"" + name + "\"");
            }
        });
    }
}
