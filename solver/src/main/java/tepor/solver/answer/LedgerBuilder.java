package tepor.solver.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import tepor.solver.assembly.Contribution;
import tepor.solver.assembly.FacetEffect;
import tepor.solver.assembly.FixedTemperatures;
import tepor.solver.assembly.RegionHeat;
import tepor.solver.field.FacetFlows;
import tepor.solver.field.Solution;
import tepor.solver.model.Edge;
import tepor.solver.model.Values;

/** Makes the ledger from the balance that was solved: each effect's own residual, and the reactions of what is fixed. */
final class LedgerBuilder {
    private LedgerBuilder() {}

    static Ledger build(CaseSolutions solutions, Values values) {
        Solution solution = solutions.solution(values);
        double[] kelvin = solution.field().nodal();
        List<Ledger.Row> rows = new ArrayList<>();
        for (RegionHeat heat : solution.balance().heats()) {
            rows.add(new Ledger.Row(heat.owner(), heat.kind(), heatIn(solution, heat, kelvin), false));
        }
        FixedTemperatures fixed = solution.balance().fixed();
        for (Edge edge : solutions.subject().edges()) {
            for (FacetEffect effect : solution.balance().facetEffects()) {
                if (effect.owner().equals(edge.name())) {
                    double in = 0;
                    for (int f : effect.facets()) {
                        in += effect.heatIn(kelvin, f);
                    }
                    rows.add(new Ledger.Row(effect.owner(), effect.kind(), in, false));
                }
            }
            int number = fixed.edges().indexOf(edge);
            if (number >= 0) {
                FacetFlows flows = solutions.flows(values);
                double in = 0;
                for (int f : solutions.index().on(edge.pieces().segments())) {
                    in += flows.intoSection(f);
                }
                rows.add(new Ledger.Row(edge.name(), "temperature", in, meets(fixed, number)));
            }
        }
        double sum = 0;
        double size = 0;
        for (Ledger.Row row : rows) {
            sum += row.in();
            size += Math.abs(row.in());
        }
        return new Ledger(rows, size == 0 ? 0 : Math.abs(sum) / (size / 2));
    }

    private static double heatIn(Solution solution, Contribution effect, double[] kelvin) {
        double[] residual = new double
                [solution.balance().mesh().nodesPerTriangle()
                        * solution.balance().mesh().triangleCount()];
        effect.addResidual(kelvin, residual);
        double in = 0;
        for (double r : residual) {
            in -= r;
        }
        return in;
    }

    private static boolean meets(FixedTemperatures fixed, int edge) {
        for (Map.Entry<Integer, int[]> meeting : fixed.meetings().entrySet()) {
            for (int f : meeting.getValue()) {
                if (fixed.edgeOf(f) == edge) {
                    return true;
                }
            }
        }
        return false;
    }
}
