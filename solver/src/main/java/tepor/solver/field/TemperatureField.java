package tepor.solver.field;

import tepor.mesher.mesh.Mesh;

/**
 * A temperature for each node of a mesh. Immutable.
 *
 * <p>Inside a triangle the temperature is the linear (3 nodes) or quadratic (6 nodes) polynomial through its nodes.
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
}
