package tepor.viewer.picture.contour;

import java.util.List;
import tepor.solver.field.TemperatureField;

/**
 * Isotherms of a field as lines, and the areas they bound.
 *
 * @param scale their temperatures
 * @param lines every piece of every isotherm
 * @param areas loops around the area at or above each isotherm's temperature; the area lies on a loop's left
 * @param section loops around the whole section
 */
public record Isotherms(
        TemperatureScale scale, List<Isotherm> lines, List<List<double[]>> areas, List<double[]> section) {
    /** Triangles into which six-node triangles may be divided altogether; more is finer than a picture shows. */
    private static final int SMALL_TRIANGLES = 400_000;

    public Isotherms {
        lines = List.copyOf(lines);
        areas = areas.stream().map(List::copyOf).toList();
        section = List.copyOf(section);
    }

    /**
     * Traces the isotherms of a field.
     *
     * @param tolerance points nearer to the line through their neighbours are left out, m; 0 keeps all
     */
    public static Isotherms of(TemperatureField field, TemperatureScale scale, double tolerance) {
        FieldLattice lattice = new FieldLattice(field, division(field));
        return new IsothermTracer(lattice, scale, tolerance).trace();
    }

    private static int division(TemperatureField field) {
        if (field.mesh().nodesPerTriangle() == 3) {
            return 1;
        }
        double n = Math.sqrt(SMALL_TRIANGLES / (double) Math.max(1, field.mesh().triangleCount()));
        return (int) Math.max(2, Math.min(12, n));
    }

    /** Area on the left of loops, m²: by the boundary integral about their first point. */
    public static double area(List<double[]> loops) {
        double sum = 0;
        for (double[] xy : loops) {
            for (int i = 2; i + 3 < xy.length; i += 2) {
                sum += 0.5 * ((xy[i] - xy[0]) * (xy[i + 3] - xy[1]) - (xy[i + 2] - xy[0]) * (xy[i + 1] - xy[1]));
            }
        }
        return sum;
    }
}
