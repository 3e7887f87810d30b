package tepor.mesher.triangulation;

import java.util.Arrays;

/**
 * Orders points along Hilbert's curve, so that points near each other in the plane come near each other in the order.
 *
 * <p>For incremental insertion the order is taken in rounds of doubling size, each along the curve (Amenta, Choi & Rote 2003,
 * <em>Incremental constructions con BRIO</em>, SoCG). No chance is involved: the same points give the same order.
 */
public final class HilbertOrder {
    private static final int LEVELS = 16;
    private static final int SMALLEST_ROUND = 64;

    private HilbertOrder() {}

    /**
     * Point numbers along the curve; points in the same cell of the finest level keep their order.
     *
     * @param xy 2·n coordinates, finite
     */
    public static int[] alongCurve(double[] xy) {
        return sorted(keys(xy));
    }

    /**
     * Point numbers in rounds of doubling size, each round along the curve.
     *
     * @param xy 2·n coordinates, finite
     */
    public static int[] inRounds(double[] xy) {
        long[] key = keys(xy);
        int rounds = 0;
        for (int n = key.length; n > SMALLEST_ROUND; n /= 2) {
            rounds++;
        }
        for (int i = 0; i < key.length; i++) {
            // The lowest set bit of a scrambled number is a geometric distribution: half of all points in the last
            // round.
            int scrambled = scramble(i);
            int round = Math.max(0, rounds - Integer.numberOfTrailingZeros(scrambled));
            key[i] |= (long) round << (2 * LEVELS);
        }
        return sorted(key);
    }

    private static int scramble(int i) {
        int h = (i + 1) * 0x9E3779B9;
        h = (h ^ (h >>> 16)) * 0x85EBCA6B;
        h = (h ^ (h >>> 13)) * 0xC2B2AE35;
        return h ^ (h >>> 16);
    }

    private static long[] keys(double[] xy) {
        int n = xy.length / 2;
        double minX = Double.POSITIVE_INFINITY;
        double minY = Double.POSITIVE_INFINITY;
        double maxX = Double.NEGATIVE_INFINITY;
        double maxY = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < n; i++) {
            minX = Math.min(minX, xy[2 * i]);
            maxX = Math.max(maxX, xy[2 * i]);
            minY = Math.min(minY, xy[2 * i + 1]);
            maxY = Math.max(maxY, xy[2 * i + 1]);
        }
        int cells = 1 << LEVELS;
        double width = Math.max(maxX - minX, maxY - minY);
        double scale = width > 0 ? cells / width : 0;
        long[] key = new long[n];
        for (int i = 0; i < n; i++) {
            int x = Math.min(cells - 1, (int) ((xy[2 * i] - minX) * scale));
            int y = Math.min(cells - 1, (int) ((xy[2 * i + 1] - minY) * scale));
            key[i] = distance(x, y);
        }
        return key;
    }

    // Distance along the curve of a cell, by reflecting and turning quadrant by quadrant.
    private static long distance(int cellX, int cellY) {
        int x = cellX;
        int y = cellY;
        long d = 0;
        for (int s = 1 << (LEVELS - 1); s > 0; s >>= 1) {
            int rx = (x & s) != 0 ? 1 : 0;
            int ry = (y & s) != 0 ? 1 : 0;
            d = 4 * d + ((3 * rx) ^ ry);
            x &= s - 1;
            y &= s - 1;
            if (ry == 0) {
                if (rx == 1) {
                    x = s - 1 - x;
                    y = s - 1 - y;
                }
                int swapped = x;
                x = y;
                y = swapped;
            }
        }
        return d;
    }

    // Keys use at most 37 bits, so the sort of (key, number) fits a long while there are fewer than 2^26 points.
    private static int[] sorted(long[] key) {
        int n = key.length;
        if (n >= 1 << 26) {
            throw new IllegalArgumentException("at most " + ((1 << 26) - 1) + " points can be ordered, got " + n);
        }
        long[] packed = new long[n];
        for (int i = 0; i < n; i++) {
            packed[i] = key[i] << 26 | i;
        }
        Arrays.sort(packed);
        int[] order = new int[n];
        for (int i = 0; i < n; i++) {
            order[i] = (int) (packed[i] & ((1 << 26) - 1));
        }
        return order;
    }
}
