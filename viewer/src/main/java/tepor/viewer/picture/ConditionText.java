package tepor.viewer.picture;

import java.util.ArrayList;
import java.util.List;
import tepor.solver.model.Air;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Input;
import tepor.solver.model.Region;

/** What a region is made of and what holds on an edge, in a few words, quantities as the user wrote them. */
final class ConditionText {
    private ConditionText() {}

    static List<String> of(Region region) {
        if (region.isHole()) {
            return List.of("nothing: cut out");
        }
        List<String> lines = new ArrayList<>();
        Conductivity conductivity = region.material().conductivity();
        String k = "";
        if (conductivity instanceof Conductivity.Uniform uniform) {
            k = written(uniform.k());
        } else if (conductivity instanceof Conductivity.Directional directional) {
            k = written(directional.along()) + " along, " + written(directional.across()) + " across";
        }
        lines.add(region.material().name() + ", " + k);
        if (region.heat() != null) {
            lines.add("heat " + written(region.heat().amount()));
        }
        return lines;
    }

    static List<String> of(Edge edge) {
        List<String> lines = new ArrayList<>();
        for (EdgeCondition condition : edge.conditions()) {
            lines.add(of(condition));
        }
        if (!edge.insulated().isEmpty()) {
            lines.add("insulated: " + edge.insulated());
        } else if (lines.isEmpty()) {
            lines.add("a name only");
        }
        return lines;
    }

    private static String of(EdgeCondition condition) {
        if (condition instanceof EdgeCondition.FixedTemperature fixed) {
            return "temperature " + written(fixed.temperature());
        }
        if (condition instanceof EdgeCondition.Film film) {
            return "film " + written(film.coefficient()) + ", " + air(film.air(), film.airTemperature());
        }
        if (condition instanceof EdgeCondition.SurfaceResistance surface) {
            return "resistance " + written(surface.resistance()) + ", " + air(surface.air(), surface.airTemperature());
        }
        return "inflow " + written(((EdgeCondition.Inflow) condition).amount());
    }

    private static String air(Air air, Input temperature) {
        return air == null ? "air " + written(temperature) : air.name() + " " + written(temperature);
    }

    private static String written(Input input) {
        return FigureText.unit(input.quantity().text());
    }
}
