package tepor.viewer.picture.contour;

import java.util.ArrayDeque;
import java.util.BitSet;
import java.util.Deque;

/** Leaves out points that a line does not need (Douglas and Peucker 1973). */
final class LineSimplifier {
    private final double tolerance;

    /** @param tolerance no point left out lies farther than this from the line that remains, m */
    LineSimplifier(double tolerance) {
        this.tolerance = tolerance;
    }

    /** A line with its first and last point kept. */
    double[] simplify(double[] xy) {
        int n = xy.length / 2;
        if (n < 3) {
            return xy;
        }
        BitSet kept = new BitSet(n);
        kept.set(0);
        kept.set(n - 1);
        Deque<int[]> open = new ArrayDeque<>();
        open.push(new int[] {0, n - 1});
        while (!open.isEmpty()) {
            int[] span = open.pop();
            int farthest = -1;
            double most = tolerance;
            for (int i = span[0] + 1; i < span[1]; i++) {
                double d = distance(xy, i, span[0], span[1]);
                if (d > most) {
                    most = d;
                    farthest = i;
                }
            }
            if (farthest >= 0) {
                kept.set(farthest);
                open.push(new int[] {span[0], farthest});
                open.push(new int[] {farthest, span[1]});
            }
        }
        double[] result = new double[2 * kept.cardinality()];
        int out = 0;
        for (int i = kept.nextSetBit(0); i >= 0; i = kept.nextSetBit(i + 1)) {
            result[out++] = xy[2 * i];
            result[out++] = xy[2 * i + 1];
        }
        return result;
    }

    /** Distance of point i from the segment between points a and b (their distance where both are one point). */
    private static double distance(double[] xy, int i, int a, int b) {
        double dx = xy[2 * b] - xy[2 * a];
        double dy = xy[2 * b + 1] - xy[2 * a + 1];
        double px = xy[2 * i] - xy[2 * a];
        double py = xy[2 * i + 1] - xy[2 * a + 1];
        double square = dx * dx + dy * dy;
        double s = square == 0 ? 0 : Math.max(0, Math.min(1, (px * dx + py * dy) / square));
        return Math.hypot(px - s * dx, py - s * dy);
    }
}
