package tepor.solver.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.model.Air;
import tepor.solver.model.Input;
import tepor.solver.quantity.Dimension;

/** Reads {@code [air.NAME]}. */
final class AirReader {
    private static final Keys AIR = Keys.of("temperature", "film");

    private final QuantityKeys quantities;

    AirReader(QuantityKeys quantities) {
        this.quantities = quantities;
    }

    /**
     * An air as it is written.
     *
     * @param air empty where something in it is wrong
     * @param statesFilm whether it has a film, be it right or wrong
     * @param table where it is written
     */
    record WrittenAir(Optional<Air> air, boolean statesFilm, KeyTable table) {}

    /** All airs by name, in the order written. */
    Map<String, WrittenAir> read(KeyTable root) {
        Map<String, WrittenAir> airs = new LinkedHashMap<>();
        root.namedTables("air").forEach((name, table) -> airs.put(name, air(name, table)));
        return airs;
    }

    private WrittenAir air(String name, KeyTable table) {
        table.allow(AIR);
        if (!table.has("temperature")) {
            table.missing("temperature", "temperature = \"20 degC\"");
        }
        Optional<Input> temperature = quantities.input(
                table, "temperature", QuantityKeys.path("air", name, "temperature"), Range.ANY, Dimension.TEMPERATURE);
        Optional<Input> film =
                quantities.input(table, "film", QuantityKeys.path("air", name, "film"), Range.POSITIVE, Dimension.FILM);
        boolean statesFilm = table.has("film");
        Optional<Air> air = temperature
                .filter(t -> !statesFilm || film.isPresent())
                .map(t -> new Air(name, t, film.orElse(null), table.place()));
        return new WrittenAir(air, statesFilm, table);
    }
}
