package tepor.solver.field;

import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleFinder;
import tepor.solver.element.TriangleShape;
import tepor.solver.element.TriangleShapes;

/**
 * A temperature for each node of a mesh. Immutable.
 *
 * <p>Inside a triangle the temperature is the linear (3 nodes) or quadratic (6 nodes) polynomial through its nodes; in a
 * curved one it is that polynomial in the barycentric coordinates, which the curved map then places.
 */
public final class TemperatureField {
    private final Mesh mesh;
    private final double[] kelvin;

    /** @param kelvin nodeCount temperatures, K */
    public TemperatureField(Mesh mesh, double[] kelvin) {
        if (kelvin.length != mesh.nodeCount()) {
            throw new IllegalArgumentException(kelvin.length + " temperatures for " + mesh.nodeCount() + " nodes");
        }
        this.mesh = mesh;
        this.kelvin = kelvin.clone();
    }

    public Mesh mesh() {
        return mesh;
    }

    /** Temperature of a node, K. */
    public double at(int iNode) {
        return kelvin[iNode];
    }

    /** All nodal temperatures, K; a copy. */
    public double[] nodal() {
        return kelvin.clone();
    }

    /**
     * Temperature at a point of the section, K. A little off the mesh, as on an arc beside the facets that stand for it, the
     * nearest triangle's polynomial goes on; NaN where no triangle is near.
     *
     * @param x metres
     * @param y metres
     * @param finder of this field's mesh
     */
    public double at(double x, double y, TriangleFinder finder) {
        double[] l = new double[3];
        int triangle = finder.find(x, y, l);
        return triangle == Mesh.NONE ? Double.NaN : inside(triangle, l[0], l[1], l[2]);
    }

    /** Temperature at barycentric coordinates of a triangle, K. */
    public double inside(int triangle, double l0, double l1, double l2) {
        TriangleShape shape = TriangleShapes.of(mesh.nodesPerTriangle());
        double[] value = new double[shape.nodeCount()];
        shape.values(l0, l1, l2, value);
        double level = kelvin[mesh.node(triangle, 0)];
        double sum = 0;
        for (int i = 0; i < value.length; i++) {
            sum += value[i] * (kelvin[mesh.node(triangle, i)] - level);
        }
        return level + sum;
    }
}
