package tepor.solver.field;

import java.util.function.IntPredicate;
import tepor.mesher.mesh.Mesh;

/** Mean temperatures over areas and along facets, exact for the field. */
public final class FieldMean {
    private FieldMean() {}

    /** Mean by area over triangles, K. */
    public static double overTriangles(TemperatureField field, IntPredicate triangles) {
        Mesh mesh = field.mesh();
        // ∫Nᵢ is a third of the area at corners of three-node and at mid-side nodes of six-node triangles, else
        // nothing.
        int first = mesh.nodesPerTriangle() == 3 ? 0 : 3;
        double area = 0;
        double sum = 0;
        double level = field.at(0);
        for (int t = 0; t < mesh.triangleCount(); t++) {
            if (triangles.test(t)) {
                double a = mesh.area(t);
                area += a;
                for (int i = first; i < first + 3; i++) {
                    sum += a / 3 * (field.at(mesh.node(t, i)) - level);
                }
            }
        }
        return level + sum / area;
    }

    /** Mean by length along facets, K (Simpson's rule, exact for quadratics). */
    public static double overFacets(TemperatureField field, int[] facets) {
        Mesh mesh = field.mesh();
        double length = 0;
        double sum = 0;
        double level = field.at(0);
        for (int f : facets) {
            double l = mesh.facetLength(f);
            length += l;
            double ends = field.at(mesh.facetNode(f, 0)) - level + (field.at(mesh.facetNode(f, 1)) - level);
            sum += mesh.nodesPerTriangle() == 3
                    ? l * ends / 2
                    : l * (ends + 4 * (field.at(mesh.facetNode(f, 2)) - level)) / 6;
        }
        return level + sum / length;
    }
}
