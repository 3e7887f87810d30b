package tepor.viewer.picture.contour;

import java.util.List;

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
    public Isotherms {
        lines = List.copyOf(lines);
        areas = areas.stream().map(List::copyOf).toList();
        section = List.copyOf(section);
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
