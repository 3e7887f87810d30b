package tepor.solver.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Input;
import tepor.solver.model.Material;
import tepor.solver.quantity.Dimension;

/** Reads {@code [material.NAME]}. */
final class MaterialReader {
    /** The word for a region that is a hole. */
    static final String NOTHING = "nothing";

    private static final Keys MATERIAL = Keys.of("k", "density", "heat_capacity", "source");
    private static final Keys DIRECTIONAL = Keys.of("along", "across", "angle");
    private static final String EXAMPLE = "k = \"0.65 W/(m.K)\"";

    private final QuantityKeys quantities;

    MaterialReader(QuantityKeys quantities) {
        this.quantities = quantities;
    }

    /** All materials by name, in the order written; a material with a fault has the value empty. */
    Map<String, Optional<Material>> read(KeyTable root) {
        Map<String, Optional<Material>> materials = new LinkedHashMap<>();
        root.namedTables("material").forEach((name, table) -> materials.put(name, material(name, table)));
        return materials;
    }

    private Optional<Material> material(String name, KeyTable table) {
        if (name.equals(NOTHING)) {
            table.findings()
                    .error(
                            "reserved-name",
                            table.place(),
                            "a material is called 'nothing', which is the word for a hole",
                            "give the material another name");
            return Optional.empty();
        }
        table.allow(MATERIAL);
        Optional<Conductivity> conductivity = conductivity(name, table);
        Input density = quantities
                .input(
                        table,
                        "density",
                        QuantityKeys.path("material", name, "density"),
                        Range.POSITIVE,
                        Dimension.DENSITY)
                .orElse(null);
        Input heatCapacity = quantities
                .input(
                        table,
                        "heat_capacity",
                        QuantityKeys.path("material", name, "heat_capacity"),
                        Range.POSITIVE,
                        Dimension.HEAT_CAPACITY)
                .orElse(null);
        String source = table.text("source").orElse("");
        return conductivity.map(k -> new Material(name, k, density, heatCapacity, source, table.place()));
    }

    private Optional<Conductivity> conductivity(String name, KeyTable table) {
        Optional<Value> value = table.value("k");
        if (value.isEmpty()) {
            table.missing("k", EXAMPLE);
            return Optional.empty();
        }
        if (value.get().isArray()) {
            byTemperature(table, value.get());
            return Optional.empty();
        }
        if (value.get().isTable()) {
            return directional(name, table, value.get());
        }
        return quantities
                .input(value.get(), QuantityKeys.path("material", name, "k"), Range.POSITIVE, Dimension.CONDUCTIVITY)
                .map(Conductivity.Uniform::new);
    }

    private Optional<Conductivity> directional(String name, KeyTable material, Value value) {
        KeyTable table = value.table("k", "k of " + material.label()).orElseThrow();
        if (table.has("cavity")) {
            table.later(
                    table.place("cavity"), "'cavity' in k", "state the cavity's equivalent conductivity, " + EXAMPLE);
            return Optional.empty();
        }
        table.allow(DIRECTIONAL);
        Optional<Input> along = part(name, table, "along", Range.POSITIVE, Dimension.CONDUCTIVITY);
        Optional<Input> across = part(name, table, "across", Range.POSITIVE, Dimension.CONDUCTIVITY);
        Optional<Input> angle = part(name, table, "angle", Range.ANY, Dimension.ANGLE);
        if (along.isEmpty() || across.isEmpty() || angle.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Conductivity.Directional(along.get(), across.get(), angle.get()));
    }

    private Optional<Input> part(String name, KeyTable table, String key, Range range, Dimension dimension) {
        Optional<Value> value = table.value(key);
        if (value.isEmpty()) {
            table.missing(
                    key,
                    "k = { along = \"0.9 W/(m.K)\", across = \"0.25 W/(m.K)\", angle = \"30 deg\" }, along running at"
                            + " angle from +x");
            return Optional.empty();
        }
        if (value.get().isArray()) {
            byTemperature(table, value.get());
            return Optional.empty();
        }
        return quantities.input(value.get(), QuantityKeys.path("material", name, "k", key), range, dimension);
    }

    private static void byTemperature(KeyTable table, Value value) {
        table.later(
                value.place(),
                value.name() + " by temperature",
                "state one value, that at the temperature expected, " + EXAMPLE);
    }
}
