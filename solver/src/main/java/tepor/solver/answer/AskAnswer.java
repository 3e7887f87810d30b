package tepor.solver.answer;

import tepor.solver.model.Ask;
import tepor.solver.quantity.Dimension;

/**
 * The answer to one ask.
 *
 * @param ask what was asked
 * @param value SI (kelvin for temperatures, W/m for flows)
 * @param dimension of the value
 * @param unit in which the value is to be shown
 * @param where place of a peak, a lowest value or a point, metres: x and y; null where there is none
 * @param meshError how far off the mesh may be
 * @param verdict null where the ask has no limit
 * @param handCheck null where the section allows none
 */
public record AskAnswer(
        Ask ask,
        double value,
        Dimension dimension,
        String unit,
        double[] where,
        MeshError meshError,
        Verdict verdict,
        HandCheck handCheck) {}
