package tepor.viewer.picture.contour;

import tepor.mesher.mesh.Mesh;
import tepor.solver.field.TemperatureField;

/**
 * Lowest and highest temperature of a field, K: extremes inside six-node triangles and on their sides count, which exceed
 * those of the nodes.
 *
 * @param lowest K
 * @param highest K
 */
public record TemperatureRange(double lowest, double highest) {
    /** Below this fraction of the highest absolute temperature a spread is round-off. */
    private static final double ROUND_OFF = 1e-8;

    public double spread() {
        return highest - lowest;
    }

    /** Whether the field does not vary beyond round-off. */
    public boolean isUniform() {
        return !(spread() > ROUND_OFF * Math.max(Math.abs(lowest), Math.abs(highest)));
    }

    /** The range of a field. */
    public static TemperatureRange of(TemperatureField field) {
        Mesh mesh = field.mesh();
        int nodes = mesh.nodesPerTriangle();
        double[] t = new double[nodes];
        double[] extremes = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (int e = 0; e < mesh.triangleCount(); e++) {
            for (int i = 0; i < nodes; i++) {
                t[i] = field.at(mesh.node(e, i));
                take(extremes, t[i]);
            }
            if (nodes == 6) {
                for (int i = 0; i < 3; i++) {
                    takeSide(extremes, t[(i + 1) % 3], t[3 + i], t[(i + 2) % 3]);
                }
                takeInside(extremes, t);
            }
        }
        return new TemperatureRange(extremes[0], extremes[1]);
    }

    private static void take(double[] extremes, double t) {
        extremes[0] = Math.min(extremes[0], t);
        extremes[1] = Math.max(extremes[1], t);
    }

    /** The parabola through a (s = 0), m (s = 1/2) and b (s = 1) has its vertex at s = (3a − 4m + b) / (4 (a − 2m + b)). */
    private static void takeSide(double[] extremes, double a, double m, double b) {
        double bend = a - 2 * m + b;
        double s = (3 * a - 4 * m + b) / (4 * bend);
        if (s > 0 && s < 1) { // false for 0/0 and x/0: a straight line has its extremes at its ends
            take(extremes, a + s * (-3 * a + 4 * m - b + 2 * s * bend));
        }
    }

    /** Where both derivatives vanish, in barycentric coordinates p and q of corners 1 and 2, if that is inside. */
    private static void takeInside(double[] extremes, double[] t) {
        // T = t0 + g1 p + g2 q + h11 p² + h12 p q + h22 q²
        double g1 = -3 * t[0] - t[1] + 4 * t[5];
        double g2 = -3 * t[0] - t[2] + 4 * t[4];
        double h11 = 2 * t[0] + 2 * t[1] - 4 * t[5];
        double h22 = 2 * t[0] + 2 * t[2] - 4 * t[4];
        double h12 = 4 * t[0] + 4 * t[3] - 4 * t[4] - 4 * t[5];
        double determinant = 4 * h11 * h22 - h12 * h12;
        double p = (h12 * g2 - 2 * h22 * g1) / determinant;
        double q = (h12 * g1 - 2 * h11 * g2) / determinant;
        if (p > 0 && q > 0 && p + q < 1) { // false where the determinant vanishes
            take(extremes, t[0] + 0.5 * (g1 * p + g2 * q));
        }
    }
}
