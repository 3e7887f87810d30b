package tepor.solver.element;

import java.util.Arrays;
import tepor.mesher.mesh.Mesh;

/** Integrals of the shape functions over triangles and facets, straight or curved. For one thread. */
public final class ShapeIntegrals {
    /** The area element of a curved triangle is of degree 2, as the shape functions are. */
    private static final TriangleQuadrature CURVED = TriangleQuadrature.ofDegree(4);

    private final Mesh mesh;
    private final TriangleGeometry geometry;
    private final FacetGeometry facetGeometry;
    private final int first;
    private final double[] value;
    private final double[] slopes;
    private final double[] gx;
    private final double[] gy;

    public ShapeIntegrals(Mesh mesh) {
        this.mesh = mesh;
        geometry = new TriangleGeometry(mesh);
        facetGeometry = new FacetGeometry(mesh);
        // ∫Nᵢ is a third of the area at corners of three-node and at mid-side nodes of straight six-node triangles,
        // else
        // nothing.
        int n = mesh.nodesPerTriangle();
        first = n - 3;
        value = new double[n];
        slopes = new double[3 * n];
        gx = new double[n];
        gy = new double[n];
    }

    /**
     * ∫ Nᵢ dA over a triangle. They add up to its area.
     *
     * @param out one entry for each node, m²
     */
    public void overTriangle(int triangle, double[] out) {
        Arrays.fill(out, 0);
        if (!mesh.isCurved(triangle)) {
            Arrays.fill(out, first, first + 3, mesh.area(triangle) / 3);
            return;
        }
        geometry.moveTo(triangle);
        TriangleShape shape = TriangleShapes.of(mesh.nodesPerTriangle());
        for (int p = 0; p < CURVED.pointCount(); p++) {
            shape.values(CURVED.l0()[p], CURVED.l1()[p], CURVED.l2()[p], value);
            shape.slopes(CURVED.l0()[p], CURVED.l1()[p], CURVED.l2()[p], slopes);
            geometry.gradients(slopes, value.length, gx, gy);
            double area = CURVED.weight()[p] * geometry.areaElement();
            for (int i = 0; i < value.length; i++) {
                out[i] += area * value[i];
            }
        }
    }

    /**
     * ∫ Nᵢ ds along a facet. They add up to its length.
     *
     * @param out one entry for each node of the facet, in its node order, m
     */
    public void overFacet(int facet, double[] out) {
        facetGeometry.moveTo(facet);
        SideShape shape = facetGeometry.shape();
        Arrays.fill(out, 0);
        for (int p = 0; p < shape.pointCount(); p++) {
            double length = shape.weight(p) * facetGeometry.lengthElement(p);
            for (int i = 0; i < out.length; i++) {
                out[i] += length * shape.value(p, i);
            }
        }
    }
}
