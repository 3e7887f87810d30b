package tepor.solver.assembly;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import tepor.mesher.mesh.Mesh;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Values;

/**
 * The nodes whose temperature is fixed, and the facets that fix them.
 *
 * <p>A node on facets of two edges takes the mean of their temperatures; where these differ, the heat flow there has no
 * limit as the mesh is refined.
 */
public final class FixedTemperatures {
    private final double[] kelvin;
    private final int[] owner;
    private final List<Edge> edges = new ArrayList<>();
    private final Map<Integer, int[]> meetings = new TreeMap<>();

    FixedTemperatures(Mesh mesh, FacetIndex index, List<Edge> all, Values values) {
        kelvin = new double[mesh.nodeCount()];
        owner = new int[mesh.facetCount()];
        Arrays.fill(owner, -1);
        int[] count = new int[mesh.nodeCount()];
        int nodesPerFacet = mesh.nodesPerTriangle() == 3 ? 2 : 3;
        for (Edge edge : all) {
            for (EdgeCondition condition : edge.conditions()) {
                if (condition instanceof EdgeCondition.FixedTemperature fixed) {
                    double t = values.of(fixed.temperature());
                    for (int f : index.on(edge.pieces().segments())) {
                        owner[f] = edges.size();
                        for (int i = 0; i < nodesPerFacet; i++) {
                            int node = mesh.facetNode(f, i);
                            // a running mean: nodes where all agree keep the temperature to the bit
                            kelvin[node] += (t - kelvin[node]) / ++count[node];
                        }
                    }
                    edges.add(edge);
                }
            }
        }
        for (int i = 0; i < kelvin.length; i++) {
            if (count[i] == 0) {
                kelvin[i] = Double.NaN;
            }
        }
        findMeetings(mesh, values);
    }

    /**
     * Temperatures fixed node by node.
     *
     * @param kelvin nodeCount entries; NaN where a node is free
     */
    FixedTemperatures(Mesh mesh, double[] kelvin) {
        this.kelvin = kelvin.clone();
        owner = new int[mesh.facetCount()];
        Arrays.fill(owner, -1);
    }

    private void findMeetings(Mesh mesh, Values values) {
        for (int f = 0; f < owner.length; f++) {
            if (owner[f] >= 0) {
                EdgeCondition condition = edges.get(owner[f]).conditions().get(0);
                double t = values.of(((EdgeCondition.FixedTemperature) condition).temperature());
                for (int i = 0; i < 2; i++) {
                    if (kelvin[mesh.facetNode(f, i)] != t) {
                        meetings.put(mesh.facetNode(f, i), new int[0]);
                    }
                }
            }
        }
        if (meetings.isEmpty()) {
            return;
        }
        for (int f = 0; f < owner.length; f++) {
            for (int i = 0; i < 2 && owner[f] >= 0; i++) {
                int facet = f;
                meetings.computeIfPresent(mesh.facetNode(f, i), (node, known) -> {
                    int[] more = Arrays.copyOf(known, known.length + 1);
                    more[known.length] = facet;
                    return more;
                });
            }
        }
    }

    /**
     * Where two different fixed temperatures meet: for each such node the facets around it that fix a temperature. The heat
     * flow through some but not all of them has no limit as the mesh is refined.
     */
    public Map<Integer, int[]> meetings() {
        return Collections.unmodifiableMap(meetings);
    }

    /** Whether the node's temperature is fixed. */
    public boolean isFixed(int iNode) {
        return !Double.isNaN(kelvin[iNode]);
    }

    /** Temperature of a fixed node, K. */
    public double at(int iNode) {
        return kelvin[iNode];
    }

    /** The edges with a fixed temperature. */
    public List<Edge> edges() {
        return List.copyOf(edges);
    }

    /** Number in {@link #edges()} of the edge that fixes this facet, or −1. */
    public int edgeOf(int facet) {
        return owner[facet];
    }
}
