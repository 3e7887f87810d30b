package tepor.solver.field;

import java.util.function.IntPredicate;
import tepor.mesher.mesh.Mesh;
import tepor.solver.element.ShapeIntegrals;

/** Mean temperatures over areas and along facets: exact for the field but for the length of curved facets, by Gauss's rule. */
public final class FieldMean {
    private FieldMean() {}

    /** Mean by area over triangles, K. */
    public static double overTriangles(TemperatureField field, IntPredicate triangles) {
        Mesh mesh = field.mesh();
        ShapeIntegrals integrals = new ShapeIntegrals(mesh);
        double[] part = new double[mesh.nodesPerTriangle()];
        double area = 0;
        double sum = 0;
        double level = field.at(0);
        for (int t = 0; t < mesh.triangleCount(); t++) {
            if (triangles.test(t)) {
                integrals.overTriangle(t, part);
                for (int i = 0; i < part.length; i++) {
                    area += part[i];
                    sum += part[i] * (field.at(mesh.node(t, i)) - level);
                }
            }
        }
        return level + sum / area;
    }

    /** Mean by length along facets, K. */
    public static double overFacets(TemperatureField field, int[] facets) {
        Mesh mesh = field.mesh();
        ShapeIntegrals integrals = new ShapeIntegrals(mesh);
        double[] part = new double[mesh.nodesPerTriangle() == 3 ? 2 : 3];
        double length = 0;
        double sum = 0;
        double level = field.at(0);
        for (int f : facets) {
            integrals.overFacet(f, part);
            for (int i = 0; i < part.length; i++) {
                length += part[i];
                sum += part[i] * (field.at(mesh.facetNode(f, i)) - level);
            }
        }
        return level + sum / length;
    }
}
