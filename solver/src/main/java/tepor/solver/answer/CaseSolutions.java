package tepor.solver.answer;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BooleanSupplier;
import tepor.mesher.mesh.Mesh;
import tepor.solver.assembly.FacetIndex;
import tepor.solver.assembly.HeatBalance;
import tepor.solver.field.FacetFlows;
import tepor.solver.field.Solution;
import tepor.solver.field.SteadySolver;
import tepor.solver.model.Case;
import tepor.solver.model.Values;

/** The solutions that the asks of a case need on one mesh: one for each set of values, made when first wanted. */
final class CaseSolutions {
    private final Case subject;
    private final Mesh mesh;
    private final FacetIndex index;
    private final BooleanSupplier stopped;
    private final Map<Values, Solution> solutions = new LinkedHashMap<>();
    private final Map<Values, FacetFlows> flows = new HashMap<>();
    private SteadySolver solver;
    private int iterations;
    private double secondsAssembly;
    private double secondsLinear;

    CaseSolutions(Case subject, Mesh mesh, BooleanSupplier stopped) {
        this.subject = subject;
        this.mesh = mesh;
        this.stopped = stopped;
        index = new FacetIndex(mesh, subject.section().segmentCount());
    }

    Case subject() {
        return subject;
    }

    Mesh mesh() {
        return mesh;
    }

    FacetIndex index() {
        return index;
    }

    /** The solution for the values as stated. */
    Solution nominal() {
        return solution(subject.inputs().nominal());
    }

    Solution solution(Values values) {
        Solution known = solutions.get(values);
        if (known != null) {
            return known;
        }
        HeatBalance balance = new HeatBalance(subject, mesh, index, values);
        if (solver == null) {
            solver = new SteadySolver(mesh, balance.fixed());
        }
        Solution solution = solver.solve(balance, stopped);
        iterations += solution.iterations();
        secondsAssembly += solution.secondsAssembly();
        secondsLinear += solution.secondsLinear();
        solutions.put(values, solution);
        return solution;
    }

    /** All solutions made so far, in the order in which they were wanted. */
    List<Solution> all() {
        return List.copyOf(solutions.values());
    }

    FacetFlows flows(Values values) {
        FacetFlows known = flows.get(values);
        if (known == null) {
            Solution solution = solution(values);
            known = new FacetFlows(solution.balance(), solution.field());
            flows.put(values, known);
        }
        return known;
    }

    int iterations() {
        return iterations;
    }

    double secondsAssembly() {
        return secondsAssembly;
    }

    double secondsLinear() {
        return secondsLinear;
    }
}
