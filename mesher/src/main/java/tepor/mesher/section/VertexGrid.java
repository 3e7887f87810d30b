package tepor.mesher.section;

import java.util.Arrays;

/** Points in the plane, numbered from 0, that can be asked for the one nearest to a place within a fixed reach. */
final class VertexGrid {
    private final double reach;
    private double[] xy = new double[128];
    private int[] following = new int[64];
    private int[] head = new int[128];
    private int count;

    /** @param reach how far {@link #nearest} looks, metres */
    VertexGrid(double reach) {
        this.reach = reach;
        Arrays.fill(head, -1);
    }

    int count() {
        return count;
    }

    double x(int vertex) {
        return xy[2 * vertex];
    }

    double y(int vertex) {
        return xy[2 * vertex + 1];
    }

    /** The vertex nearest to a place, within reach; −1 where there is none. */
    int nearest(double x, double y) {
        long column = cell(x);
        long row = cell(y);
        int best = -1;
        double bestSquare = reach * reach;
        for (long i = column - 1; i <= column + 1; i++) {
            for (long j = row - 1; j <= row + 1; j++) {
                for (int v = head[slot(i, j)]; v >= 0; v = following[v]) {
                    double dx = xy[2 * v] - x;
                    double dy = xy[2 * v + 1] - y;
                    double square = dx * dx + dy * dy;
                    if (square < bestSquare || (square == bestSquare && (best < 0 || v < best))) {
                        best = v;
                        bestSquare = square;
                    }
                }
            }
        }
        return best;
    }

    /** The vertex nearest to a place, or a new one there. */
    int merge(double x, double y) {
        int near = nearest(x, y);
        return near >= 0 ? near : add(x, y);
    }

    /** Adds a vertex, whatever is near. */
    int add(double x, double y) {
        if (count == following.length) {
            grow();
        }
        xy[2 * count] = x;
        xy[2 * count + 1] = y;
        link(count);
        return count++;
    }

    private void link(int vertex) {
        int slot = slot(cell(xy[2 * vertex]), cell(xy[2 * vertex + 1]));
        following[vertex] = head[slot];
        head[slot] = vertex;
    }

    private void grow() {
        xy = Arrays.copyOf(xy, 4 * count);
        following = new int[2 * count];
        head = new int[4 * count];
        Arrays.fill(head, -1);
        for (int v = 0; v < count; v++) {
            link(v);
        }
    }

    private long cell(double coordinate) {
        return (long) Math.floor(coordinate / reach);
    }

    private int slot(long column, long row) {
        // The multipliers are the odd constants of Steele, Lea and Flood's SplitMix (2014).
        long mixed = column * 0x9E3779B97F4A7C15L ^ row * 0xBF58476D1CE4E5B9L;
        mixed ^= mixed >>> 32;
        return (int) (mixed & (head.length - 1)); // the length is a power of two
    }
}
