package tepor.solver.answer;

import java.util.Map;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Input;
import tepor.solver.model.Region;
import tepor.solver.model.Values;

/** The values with which an ask is to be answered: those of the case, those of its {@code with}, and unit loads. */
final class AskValues {
    private AskValues() {}

    static Values of(Case subject, Ask ask) {
        Values values = subject.inputs().nominal();
        for (Map.Entry<Input, Double> change : ask.head().with().entrySet()) {
            values = values.with(change.getKey(), change.getValue());
        }
        if (ask instanceof Ask.Coupling coupling) {
            return unitLoad(subject, values, coupling.from());
        }
        if (ask instanceof Ask.Transmittance transmittance) {
            return unitLoad(subject, values, transmittance.from());
        }
        return values;
    }

    /** One air at 1 K, every other air and fixed temperature at 0, no heat and no inflow. */
    private static Values unitLoad(Case subject, Values values, Air warm) {
        Values load = values;
        for (Air air : subject.airs()) {
            load = load.with(air.temperature(), 0);
        }
        for (Region region : subject.regions()) {
            if (region.heat() != null) {
                load = load.with(region.heat().amount(), 0);
            }
        }
        for (Edge edge : subject.edges()) {
            for (EdgeCondition condition : edge.conditions()) {
                if (condition instanceof EdgeCondition.FixedTemperature fixed) {
                    load = load.with(fixed.temperature(), 0);
                } else if (condition instanceof EdgeCondition.Film film) {
                    load = load.with(film.airTemperature(), 0);
                } else if (condition instanceof EdgeCondition.SurfaceResistance resistance) {
                    load = load.with(resistance.airTemperature(), 0);
                } else if (condition instanceof EdgeCondition.Inflow inflow) {
                    load = load.with(inflow.amount(), 0);
                }
            }
        }
        return load.with(warm.temperature(), 1);
    }
}
