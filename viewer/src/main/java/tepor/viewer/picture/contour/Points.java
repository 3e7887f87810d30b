package tepor.viewer.picture.contour;

import java.util.Arrays;

/** A growing list of points. */
final class Points {
    private double[] xy = new double[64];
    private int length;

    void add(double x, double y) {
        reserve(2);
        xy[length++] = x;
        xy[length++] = y;
    }

    void addAll(double[] points) {
        reserve(points.length);
        System.arraycopy(points, 0, xy, length, points.length);
        length += points.length;
    }

    private void reserve(int more) {
        if (length + more > xy.length) {
            xy = Arrays.copyOf(xy, 2 * (length + more));
        }
    }

    double[] toArray() {
        return Arrays.copyOf(xy, length);
    }
}
