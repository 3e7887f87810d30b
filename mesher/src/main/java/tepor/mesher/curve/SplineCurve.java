package tepor.mesher.curve;

import java.util.Arrays;
import org.locationtech.jts.geom.Coordinate;

/**
 * A rational B-spline, evaluated by de Boor's algorithm in homogeneous coordinates (L. Piegl, W. Tiller, The NURBS Book,
 * 2nd ed., 1997, sections 3.2 and 4.3).
 */
public final class SplineCurve implements Curve {
    private final int degree;
    private final double[] knot;
    private final double[][] control; // x·w, y·w, w
    private final int[] span; // knot interval of each span
    private final double[][] work;

    /**
     * @param degree at least 1
     * @param knot ascending, as many as points and degree and one together
     * @param points control points, metres; more than the degree
     * @param weight as many as points, greater than zero
     * @throws IllegalArgumentException if the numbers do not fit together
     */
    public SplineCurve(int degree, double[] knot, Coordinate[] points, double[] weight) {
        if (degree < 1
                || points.length <= degree
                || knot.length != points.length + degree + 1
                || weight.length != points.length) {
            throw new IllegalArgumentException("degree " + degree + ", " + knot.length + " knots, " + points.length
                    + " points, " + weight.length + " weights");
        }
        this.degree = degree;
        this.knot = knot.clone();
        control = new double[points.length][];
        for (int i = 0; i < control.length; i++) {
            control[i] = new double[] {points[i].x * weight[i], points[i].y * weight[i], weight[i]};
        }
        int[] intervals = new int[points.length];
        int count = 0;
        for (int k = degree; k < points.length; k++) {
            if (knot[k + 1] > knot[k]) {
                intervals[count++] = k;
            }
        }
        span = Arrays.copyOf(intervals, count);
        work = new double[degree + 1][3];
    }

    @Override
    public int spanCount() {
        return span.length;
    }

    @Override
    public double spanStart(int i) {
        return knot[span[i]];
    }

    @Override
    public double spanEnd(int i) {
        return knot[span[i] + 1];
    }

    @Override
    public void at(int i, double t, double[] result) {
        int k = span[i];
        for (int j = 0; j <= degree; j++) {
            System.arraycopy(control[k - degree + j], 0, work[j], 0, 3);
        }
        for (int level = 1; level < degree; level++) {
            blend(k, level, t);
        }
        // The last two points of the level before the last give the derivative.
        double width = knot[k + 1] - knot[k];
        double[] a = work[degree - 1];
        double[] b = work[degree];
        double dx = degree * (b[0] - a[0]) / width;
        double dy = degree * (b[1] - a[1]) / width;
        double dw = degree * (b[2] - a[2]) / width;
        blend(k, degree, t);
        double w = work[degree][2];
        result[0] = work[degree][0] / w;
        result[1] = work[degree][1] / w;
        result[2] = (dx - dw * result[0]) / w;
        result[3] = (dy - dw * result[1]) / w;
    }

    private void blend(int k, int level, double t) {
        for (int j = degree; j >= level; j--) {
            int left = k - degree + j;
            double low = knot[left];
            double share = (t - low) / (knot[left + degree - level + 1] - low);
            for (int c = 0; c < 3; c++) {
                work[j][c] = (1 - share) * work[j - 1][c] + share * work[j][c];
            }
        }
    }
}
