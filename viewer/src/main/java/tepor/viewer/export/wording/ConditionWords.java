package tepor.viewer.export.wording;

import java.util.stream.Collectors;
import tepor.solver.model.Air;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Input;

/** What holds on an edge, and how a material conducts, in words. */
public final class ConditionWords {
    private ConditionWords() {}

    /** Such as "film 8 W/(m2.K) to room (35 degC)". */
    public static String of(EdgeCondition condition) {
        if (condition instanceof EdgeCondition.FixedTemperature fixed) {
            return "temperature " + text(fixed.temperature());
        }
        if (condition instanceof EdgeCondition.Film film) {
            return "film " + text(film.coefficient()) + to(film.air(), film.airTemperature());
        }
        if (condition instanceof EdgeCondition.SurfaceResistance surface) {
            return "resistance " + text(surface.resistance()) + to(surface.air(), surface.airTemperature());
        }
        if (condition instanceof EdgeCondition.Inflow inflow) {
            return "inflow " + text(inflow.amount());
        }
        return condition.word();
    }

    /** All that holds on an edge; "a name only" where nothing does. */
    public static String of(Edge edge) {
        if (!edge.insulated().isEmpty()) {
            return "insulated: " + edge.insulated();
        }
        return edge.conditions().isEmpty()
                ? "a name only"
                : edge.conditions().stream().map(ConditionWords::of).collect(Collectors.joining(", and "));
    }

    /** Such as "0.65 W/(m.K)". */
    public static String of(Conductivity conductivity) {
        if (conductivity instanceof Conductivity.Uniform uniform) {
            return text(uniform.k());
        }
        if (conductivity instanceof Conductivity.Directional directional) {
            return text(directional.along()) + " along, " + text(directional.across()) + " across, along at "
                    + text(directional.angle());
        }
        return "";
    }

    private static String to(Air air, Input temperature) {
        return air == null ? " to " + text(temperature) : " to " + air.name() + " (" + text(temperature) + ")";
    }

    private static String text(Input input) {
        return input.quantity().text();
    }
}
