package tepor.solver.field;

import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import tepor.mesher.mesh.Mesh;
import tepor.solver.assembly.FacetEffect;
import tepor.solver.assembly.HeatBalance;
import tepor.solver.assembly.Tensor;
import tepor.solver.element.FacetGeometry;
import tepor.solver.element.SideShape;

/**
 * The heat flow through every facet, from the balance equations that were solved.
 *
 * <p>Films and inflows give theirs directly. Elsewhere the element residuals of a fan of triangles about a node say how much
 * heat enters the fan there through the <em>open</em> facets that bound it, those with a fixed temperature, those between
 * regions and those of cuts (Carey 1982, Comput. Methods Appl. Mech. Engng 35, 1–14; Hughes et al. 2000, J. Comput. Phys. 163,
 * 467–488). Where several open facets meet in a node, each first gets what the temperature gradient says, and what is left
 * is shared out by {@link NodeShares}; so the sum over all open facets of a region is exactly what the region takes up, and
 * what leaves one region through an interface enters the other.
 */
public final class FacetFlows {
    private final Mesh mesh;
    private final double[] intoLeft;
    private final double[] intoRight;

    /** @param field a solution of the balance */
    public FacetFlows(HeatBalance balance, TemperatureField field) {
        mesh = balance.mesh();
        int count = mesh.facetCount();
        intoLeft = new double[count];
        intoRight = new double[count];
        double[] kelvin = field.nodal();
        double[] residual = balance.elementResidual(kelvin);
        for (FacetEffect effect : balance.facetEffects()) {
            for (int f : effect.facets()) {
                double in = effect.heatIn(kelvin, f);
                if (mesh.facetLeftTriangle(f) != Mesh.NONE) {
                    intoLeft[f] += in;
                } else {
                    intoRight[f] += in;
                }
            }
        }
        new OpenFacets(balance, field, residual).share();
    }

    /** Heat that enters the region on the left of the facet through it, W/m; 0 where there is no region. */
    public double intoLeft(int facet) {
        return intoLeft[facet];
    }

    /** Heat that enters the region on the right of the facet through it, W/m; 0 where there is no region. */
    public double intoRight(int facet) {
        return intoRight[facet];
    }

    /** Heat that enters the section through a boundary facet, W/m. */
    public double intoSection(int facet) {
        return intoLeft[facet] + intoRight[facet];
    }

    /** The sharing out of nodal reactions over open facets. */
    private final class OpenFacets {
        private final HeatBalance balance;
        private final FieldGradient gradientOf;
        private final int nodesPerFacet;
        private final FacetGeometry geometry;

        /** For each node the open facets that meet in it, as nodesPerFacet·facet + i, from start[node] on. */
        private final int[] start;

        private final int[] meeting;

        private final NodeFans fans;

        /** Sum of element residuals by fan. */
        private final HashMap<Integer, double[]> reaction = new HashMap<>();

        OpenFacets(HeatBalance balance, TemperatureField field, double[] residual) {
            this.balance = balance;
            gradientOf = new FieldGradient(field);
            nodesPerFacet = mesh.nodesPerTriangle() == 3 ? 2 : 3;
            geometry = new FacetGeometry(mesh);
            start = new int[mesh.nodeCount() + 1];
            for (int f = 0; f < mesh.facetCount(); f++) {
                for (int i = 0; i < nodesPerFacet && isOpen(f); i++) {
                    start[mesh.facetNode(f, i) + 1]++;
                }
            }
            for (int v = 0; v < mesh.nodeCount(); v++) {
                start[v + 1] += start[v];
            }
            int[] next = start.clone();
            meeting = new int[start[mesh.nodeCount()]];
            for (int f = 0; f < mesh.facetCount(); f++) {
                for (int i = 0; i < nodesPerFacet && isOpen(f); i++) {
                    meeting[next[mesh.facetNode(f, i)]++] = nodesPerFacet * f + i;
                }
            }
            fans = new NodeFans(mesh, openSides(), node -> start[node + 1] > start[node]);
            int n = mesh.nodesPerTriangle();
            for (int t = 0; t < mesh.triangleCount(); t++) {
                for (int i = 0; i < n; i++) {
                    int node = mesh.node(t, i);
                    if (start[node + 1] > start[node]) {
                        reaction.computeIfAbsent(fans.of(t, i), k -> new double[1])[0] += residual[n * t + i];
                    }
                }
            }
        }

        /** Sides of triangles, as 3·triangle + side, that lie on open facets. */
        private BitSet openSides() {
            BitSet sides = new BitSet(3 * mesh.triangleCount());
            for (int f = 0; f < mesh.facetCount(); f++) {
                if (isOpen(f) && mesh.facetLeftTriangle(f) != Mesh.NONE) {
                    sides.set(3 * mesh.facetLeftTriangle(f) + mesh.facetLeftSide(f));
                }
                if (isOpen(f) && mesh.facetRightTriangle(f) != Mesh.NONE) {
                    sides.set(3 * mesh.facetRightTriangle(f) + mesh.facetRightSide(f));
                }
            }
            return sides;
        }

        private boolean isOpen(int f) {
            return !mesh.isBoundaryFacet(f) || balance.fixed().edgeOf(f) >= 0;
        }

        void share() {
            double[] flow = new double[nodesPerFacet * mesh.facetCount()]; // from left to right
            double[] moment = new double[nodesPerFacet];
            for (int f = 0; f < mesh.facetCount(); f++) {
                if (isOpen(f)) {
                    predict(f, moment);
                    System.arraycopy(moment, 0, flow, nodesPerFacet * f, nodesPerFacet);
                }
            }
            NodeShares shares = new NodeShares();
            for (int node = 0; node < mesh.nodeCount(); node++) {
                if (start[node + 1] > start[node]) {
                    shareAt(node, flow, shares);
                }
            }
            for (int f = 0; f < mesh.facetCount(); f++) {
                for (int i = 0; i < nodesPerFacet && isOpen(f); i++) {
                    intoLeft[f] -= mesh.facetLeftTriangle(f) == Mesh.NONE ? 0 : flow[nodesPerFacet * f + i];
                    intoRight[f] += mesh.facetRightTriangle(f) == Mesh.NONE ? 0 : flow[nodesPerFacet * f + i];
                }
            }
        }

        private void shareAt(int node, double[] flow, NodeShares shares) {
            shares.clear();
            for (int k = start[node]; k < start[node + 1]; k++) {
                int f = meeting[k] / nodesPerFacet;
                shares.add(
                        fan(mesh.facetLeftTriangle(f), node), fan(mesh.facetRightTriangle(f), node), flow[meeting[k]]);
            }
            shares.balance(fan -> reaction.get(fan)[0]);
            for (int k = start[node]; k < start[node + 1]; k++) {
                flow[meeting[k]] = shares.flow(k - start[node]);
            }
        }

        private int fan(int triangle, int node) {
            if (triangle == Mesh.NONE) {
                return NodeShares.OUTSIDE;
            }
            int i = 0;
            while (mesh.node(triangle, i) != node) {
                i++;
            }
            return fans.of(triangle, i);
        }

        /**
         * Flow from left to right through a facet as the temperature gradient says it, weighted by each node's shape
         * function. On an interface the better conductor's gradient is the worse known: each side counts with the
         * conductivity of the other.
         */
        private void predict(int f, double[] moment) {
            geometry.moveTo(f);
            SideShape shape = geometry.shape();
            int tl = mesh.facetLeftTriangle(f);
            int tr = mesh.facetRightTriangle(f);
            Tensor kl = tl == Mesh.NONE ? null : balance.conduction().tensor(mesh.region(tl));
            Tensor kr = tr == Mesh.NONE ? null : balance.conduction().tensor(mesh.region(tr));
            double[] gradient = new double[2];
            Arrays.fill(moment, 0);
            for (int p = 0; p < shape.pointCount(); p++) {
                double length = geometry.lengthElement(p);
                double nx = geometry.dy(shape.point(p)) / length;
                double ny = -geometry.dx(shape.point(p)) / length;
                double wl = kl == null ? 0 : kr == null ? 1 : kr.inDirection(nx, ny);
                double wr = kr == null ? 0 : kl == null ? 1 : kl.inDirection(nx, ny);
                double flux = 0;
                if (kl != null) {
                    gradientOnSide(tl, mesh.facetLeftSide(f), shape.point(p), gradient);
                    flux += wl / (wl + wr) * normalFlux(kl, gradient, nx, ny);
                }
                if (kr != null) {
                    gradientOnSide(tr, mesh.facetRightSide(f), 1 - shape.point(p), gradient);
                    flux += wr / (wl + wr) * normalFlux(kr, gradient, nx, ny);
                }
                for (int i = 0; i < nodesPerFacet; i++) {
                    moment[i] += shape.weight(p) * length * flux * shape.value(p, i);
                }
            }
        }

        private double normalFlux(Tensor k, double[] g, double nx, double ny) {
            return -(nx * (k.xx() * g[0] + k.xy() * g[1]) + ny * (k.xy() * g[0] + k.yy() * g[1]));
        }

        /** Gradient at a point of a triangle's side, s from 0 at corner side+1 to 1 at corner side+2. */
        private void gradientOnSide(int triangle, int side, double s, double[] out) {
            double[] l = new double[3];
            l[(side + 1) % 3] = 1 - s;
            l[(side + 2) % 3] = s;
            gradientOf.at(triangle, l[0], l[1], l[2], out);
        }
    }
}
