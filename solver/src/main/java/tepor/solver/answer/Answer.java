package tepor.solver.answer;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.outline.Finding;
import tepor.solver.field.TemperatureField;
import tepor.solver.model.Case;

/**
 * A case answered.
 *
 * @param subject the case
 * @param mesh the last mesh
 * @param field the temperatures of the case as stated, on that mesh
 * @param asks one answer for each ask, in the order of the case
 * @param ledger where the heat comes from and goes to
 * @param insulated how much of the boundary is insulated, and where
 * @param history one entry for each round of refinement
 * @param figures counts and times
 * @param warnings those of the case and those of the computation
 */
public record Answer(
        Case subject,
        MeshResult mesh,
        TemperatureField field,
        List<AskAnswer> asks,
        Ledger ledger,
        Insulated insulated,
        List<Round> history,
        Figures figures,
        List<Finding> warnings) {
    public Answer {
        asks = List.copyOf(asks);
        history = List.copyOf(history);
        warnings = List.copyOf(warnings);
    }

    /**
     * One round of refinement.
     *
     * @param round from 1
     * @param triangles of its mesh
     * @param values one value (SI) for each ask
     * @param errors one mesh error for each ask; null where none can be said yet
     */
    public record Round(int round, int triangles, List<Double> values, List<MeshError> errors) {
        public Round {
            values = List.copyOf(values);
            errors = Collections.unmodifiableList(new ArrayList<>(errors));
        }
    }

    /**
     * Counts and times of the whole.
     *
     * @param unknowns of the last solution
     * @param iterations of the last solution, all its right-hand sides
     * @param residual |b − Kx| / |b| of the last solution, recomputed
     * @param secondsMesh all meshes
     * @param secondsAssembly all assemblies
     * @param secondsLinear all linear solves
     * @param secondsAll from the case to the answer
     */
    public record Figures(
            int unknowns,
            int iterations,
            double residual,
            double secondsMesh,
            double secondsAssembly,
            double secondsLinear,
            double secondsAll) {}
}
