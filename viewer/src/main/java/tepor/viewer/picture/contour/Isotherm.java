package tepor.viewer.picture.contour;

/**
 * One line of equal temperature. Higher temperatures lie on its left (seen with y upwards).
 *
 * @param level number of the isotherm in its scale
 * @param xy points, x and y in turn, m; a closed line does not repeat its first point
 * @param closed whether it returns to its first point; if not, it ends on the boundary at both ends
 */
public record Isotherm(int level, double[] xy, boolean closed) {
    public int pointCount() {
        return xy.length / 2;
    }
}
