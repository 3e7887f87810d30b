package tepor.viewer.wording;

import java.util.function.UnaryOperator;
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
        return of(condition, UnaryOperator.identity());
    }

    /**
     * The same with quantities in another spelling.
     *
     * @param spelling of a quantity as the user wrote it
     */
    public static String of(EdgeCondition condition, UnaryOperator<String> spelling) {
        if (condition instanceof EdgeCondition.FixedTemperature fixed) {
            return "temperature " + spelling.apply(text(fixed.temperature()));
        }
        if (condition instanceof EdgeCondition.Film film) {
            return "film " + spelling.apply(text(film.coefficient()))
                    + to(film.air(), spelling.apply(text(film.airTemperature())));
        }
        if (condition instanceof EdgeCondition.SurfaceResistance surface) {
            return "resistance " + spelling.apply(text(surface.resistance()))
                    + to(surface.air(), spelling.apply(text(surface.airTemperature())));
        }
        if (condition instanceof EdgeCondition.Inflow inflow) {
            return "inflow " + spelling.apply(text(inflow.amount()));
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
                : edge.conditions().stream().map(c -> of(c)).collect(Collectors.joining(", and "));
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

    private static String to(Air air, String temperature) {
        return air == null ? " to " + temperature : " to " + air.name() + " (" + temperature + ")";
    }

    private static String text(Input input) {
        return input.quantity().text();
    }
}
