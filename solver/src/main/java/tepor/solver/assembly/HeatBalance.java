package tepor.solver.assembly;

import java.util.ArrayList;
import java.util.List;
import tepor.mesher.mesh.Mesh;
import tepor.solver.element.FacetGeometry;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.HeatSource;
import tepor.solver.model.Input;
import tepor.solver.model.Region;
import tepor.solver.model.Values;

/** The heat balance of a case on a mesh, for given values: the sum of its contributions, and the fixed temperatures. */
public final class HeatBalance {
    private final Mesh mesh;
    private final Conduction conduction;
    private final List<RegionHeat> heats = new ArrayList<>();
    private final List<FacetEffect> facetEffects = new ArrayList<>();
    private final List<Contribution> others = new ArrayList<>();
    private final FixedTemperatures fixed;

    /** @param index of the mesh's facets */
    public HeatBalance(Case subject, Mesh mesh, FacetIndex index, Values values) {
        this.mesh = mesh;
        conduction = new Conduction(mesh, subject.regions(), values);
        for (Region region : subject.regions()) {
            if (region.heat() != null) {
                heats.add(heat(subject, region, values));
            }
        }
        for (Edge edge : subject.edges()) {
            int[] facets = edge.conditions().isEmpty()
                    ? new int[0]
                    : index.on(edge.pieces().segments());
            for (EdgeCondition condition : edge.conditions()) {
                if (condition instanceof EdgeCondition.Film film) {
                    facetEffects.add(FilmExchange.of(
                            mesh,
                            facets,
                            edge.name(),
                            film,
                            values.of(film.coefficient()),
                            values.of(film.airTemperature())));
                } else if (condition instanceof EdgeCondition.SurfaceResistance resistance) {
                    facetEffects.add(FilmExchange.of(
                            mesh,
                            facets,
                            edge.name(),
                            resistance,
                            values.of(resistance.resistance()),
                            values.of(resistance.airTemperature())));
                } else if (condition instanceof EdgeCondition.Inflow inflow) {
                    double perAmount =
                            inflow.basis() == EdgeCondition.InflowBasis.PER_AREA ? 1 : 1 / length(mesh, facets);
                    facetEffects.add(new EdgeInflow(
                            mesh, facets, edge.name(), inflow, perAmount * values.of(inflow.amount()), perAmount));
                }
            }
        }
        fixed = new FixedTemperatures(mesh, index, subject.edges(), values);
    }

    /**
     * A balance of conduction alone and any further contributions.
     *
     * @param values for the regions' conductivities
     * @param others contributions beside conduction
     */
    HeatBalance(Mesh mesh, List<Region> regions, Values values, List<Contribution> others, FixedTemperatures fixed) {
        this.mesh = mesh;
        conduction = new Conduction(mesh, regions, values);
        this.others.addAll(others);
        this.fixed = fixed;
    }

    // A total is spread over what the mesh has: an arc is a little longer than the facets on it, and the total is to be
    // kept.
    private static double length(Mesh mesh, int[] facets) {
        FacetGeometry geometry = new FacetGeometry(mesh);
        double sum = 0;
        for (int facet : facets) {
            geometry.moveTo(facet);
            sum += geometry.length();
        }
        return sum;
    }

    private static double area(Mesh mesh, int region) {
        double sum = 0;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            sum += mesh.region(t) == region ? mesh.area(t) : 0;
        }
        return sum;
    }

    private RegionHeat heat(Case subject, Region region, Values values) {
        HeatSource source = region.heat();
        double area = area(mesh, region.index());
        Input depth = source.basis() == HeatSource.Basis.TOTAL ? subject.depth() : null;
        double depthValue = depth == null ? 1 : values.of(depth);
        double perAmount = source.basis() == HeatSource.Basis.PER_VOLUME ? 1 : 1 / (area * depthValue);
        return new RegionHeat(mesh, region, perAmount * values.of(source.amount()), perAmount, depth, depthValue);
    }

    public Mesh mesh() {
        return mesh;
    }

    public Conduction conduction() {
        return conduction;
    }

    public List<RegionHeat> heats() {
        return List.copyOf(heats);
    }

    public List<FacetEffect> facetEffects() {
        return List.copyOf(facetEffects);
    }

    public FixedTemperatures fixed() {
        return fixed;
    }

    /** Every effect: the one list to which a new one is added. */
    public List<Contribution> contributions() {
        List<Contribution> all = new ArrayList<>();
        all.add(conduction);
        all.addAll(heats);
        all.addAll(facetEffects);
        all.addAll(others);
        return all;
    }

    /**
     * Element residuals of all effects together.
     *
     * @param kelvin nodeCount temperatures
     * @return n·triangleCount entries, W/m
     */
    public double[] elementResidual(double[] kelvin) {
        double[] residual = new double[mesh.nodesPerTriangle() * mesh.triangleCount()];
        for (Contribution c : contributions()) {
            c.addResidual(kelvin, residual);
        }
        return residual;
    }

    /**
     * Sums element residuals to nodes.
     *
     * @return nodeCount entries, W/m: zero at free nodes of a solution; at fixed nodes the heat that keeps them fixed
     */
    public double[] nodalResidual(double[] elementResidual) {
        double[] nodal = new double[mesh.nodeCount()];
        int n = mesh.nodesPerTriangle();
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < n; i++) {
                nodal[mesh.node(t, i)] += elementResidual[n * t + i];
            }
        }
        return nodal;
    }
}
