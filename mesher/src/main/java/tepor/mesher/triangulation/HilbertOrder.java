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
    /** Low bits of a packed key that hold the number of its point. */
    private static final int NUMBER_BITS = 26;

    private static final int DIGIT_BITS = 11;

    private static final int DIGIT_MASK = (1 << DIGIT_BITS) - 1;
    /** So few points are sorted by comparison. */
    private static final int FEW = 4096;

    private static final short[] FOUR_LEVELS = fourLevels();

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

    // Distance along the curve of a cell, four levels at a time.
    private static long distance(int x, int y) {
        int state = 0;
        long d = 0;
        for (int shift = LEVELS - 4; shift >= 0; shift -= 4) {
            int step = FOUR_LEVELS[state << 8 | (x >> shift & 15) << 4 | (y >> shift & 15)];
            d = d << 8 | step & 255;
            state = step >> 8;
        }
        return d;
    }

    // For each state of the curve and four bits of x and y: the eight bits of the distance, and the state after them. A
    // state tells whether x and y are exchanged (bit 0) and whether both are reflected (bit 1).
    private static short[] fourLevels() {
        short[] table = new short[4 << 8];
        for (int i = 0; i < table.length; i++) {
            int exchanged = i >> 8 & 1;
            int reflected = i >> 9;
            int d = 0;
            for (int bit = 3; bit >= 0; bit--) {
                int bitX = i >> (4 + bit) & 1;
                int bitY = i >> bit & 1;
                int rx = (exchanged == 0 ? bitX : bitY) ^ reflected;
                int ry = (exchanged == 0 ? bitY : bitX) ^ reflected;
                d = 4 * d + ((3 * rx) ^ ry);
                if (ry == 0) {
                    reflected ^= rx;
                    exchanged ^= 1;
                }
            }
            table[i] = (short) ((reflected << 1 | exchanged) << 8 | d);
        }
        return table;
    }

    // Keys use at most 37 bits, so the sort of (key, number) fits a long while there are fewer than 2^26 points.
    private static int[] sorted(long[] key) {
        int n = key.length;
        if (n >= 1 << NUMBER_BITS) {
            throw new IllegalArgumentException(
                    "at most " + ((1 << NUMBER_BITS) - 1) + " points can be ordered, got " + n);
        }
        for (int i = 0; i < n; i++) {
            key[i] = key[i] << NUMBER_BITS | i;
        }
        long[] packed = n < FEW ? key : sortedByDigits(key);
        if (n < FEW) {
            Arrays.sort(packed);
        }
        int[] order = new int[n];
        for (int i = 0; i < n; i++) {
            order[i] = (int) packed[i] & ((1 << NUMBER_BITS) - 1);
        }
        return order;
    }

    // By the digits of the key from the last to the first; equal ones keep their order, which is that of the numbers.
    private static long[] sortedByDigits(long[] unsorted) {
        long[] from = unsorted;
        long[] to = new long[from.length];
        for (int shift = NUMBER_BITS; shift < Long.SIZE; shift += DIGIT_BITS) {
            int[] start = new int[(1 << DIGIT_BITS) + 1];
            for (long p : from) {
                start[((int) (p >>> shift) & DIGIT_MASK) + 1]++;
            }
            if (start[1] == from.length) {
                continue;
            }
            for (int d = 0; d < DIGIT_MASK; d++) {
                start[d + 1] += start[d];
            }
            for (long p : from) {
                to[start[(int) (p >>> shift) & DIGIT_MASK]++] = p;
            }
            long[] sorted = to;
            to = from;
            from = sorted;
        }
        return from;
    }
}
