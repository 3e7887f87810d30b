package tepor.solver.answer;

import java.util.List;

/**
 * Where the heat comes from and goes to: one row per source and per effect on an edge. W/m, positive into the section.
 *
 * @param rows in the order of regions, then edges
 * @param imbalance |Σ rows| / (½ Σ |rows|); 0 where no heat flows
 */
public record Ledger(List<Row> rows, double imbalance) {
    public Ledger {
        rows = List.copyOf(rows);
    }

    /**
     * One source or effect.
     *
     * @param name of the region or edge
     * @param kind {@code heat}, {@code temperature}, {@code film}, {@code resistance} or {@code inflow}
     * @param in W/m, positive into the section
     * @param dependsOnMesh whether the figure has no limit as the mesh is refined: two different fixed temperatures meet
     */
    public record Row(String name, String kind, double in, boolean dependsOnMesh) {}
}
