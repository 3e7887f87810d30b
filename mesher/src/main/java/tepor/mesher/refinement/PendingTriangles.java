package tepor.mesher.refinement;

import java.util.Arrays;

/**
 * Triangles that wait to be refined: those with the shortest sides first (Üngör 2009, Comput. Geom. 42:109–118, needs this
 * for off-centres to pay), first come first served among nearly equals.
 */
final class PendingTriangles {
    private static final int BUCKETS = 256;
    private static final int NONE = -1;
    /** Keeps the exponent and the first bit of the mantissa of a squared length. */
    private static final int SHIFT = 51;

    private final long firstBucket;
    private final int[] head = new int[BUCKETS];
    private final int[] tail = new int[BUCKETS];
    private int[] next = new int[1024];
    private int[] triangle = new int[1024];
    private int[] version = new int[1024];
    private int free = NONE;
    private int used;
    private int lowest = BUCKETS;

    private int takenVersion;

    /** @param extent about the greatest length that occurs, metres */
    PendingTriangles(double extent) {
        firstBucket = (Double.doubleToRawLongBits(extent * extent) >>> SHIFT) - (BUCKETS - 8);
        Arrays.fill(head, NONE);
    }

    void add(int triangle, int version, double shortestSquared) {
        int bucket = (int) ((Double.doubleToRawLongBits(shortestSquared) >>> SHIFT) - firstBucket);
        bucket = Math.min(BUCKETS - 1, Math.max(0, bucket));
        int entry = newEntry();
        this.triangle[entry] = triangle;
        this.version[entry] = version;
        next[entry] = NONE;
        if (head[bucket] < 0) {
            head[bucket] = entry;
        } else {
            next[tail[bucket]] = entry;
        }
        tail[bucket] = entry;
        lowest = Math.min(lowest, bucket);
    }

    /** Takes the next triangle; −1 if there is none. */
    int take() {
        while (lowest < BUCKETS && head[lowest] < 0) {
            lowest++;
        }
        if (lowest == BUCKETS) {
            return NONE;
        }
        int entry = head[lowest];
        head[lowest] = next[entry];
        next[entry] = free;
        free = entry;
        takenVersion = version[entry];
        return triangle[entry];
    }

    /** Version that the triangle taken last had when it was added. */
    int takenVersion() {
        return takenVersion;
    }

    private int newEntry() {
        if (free >= 0) {
            int entry = free;
            free = next[entry];
            return entry;
        }
        if (used == next.length) {
            next = Arrays.copyOf(next, 2 * used);
            triangle = Arrays.copyOf(triangle, 2 * used);
            version = Arrays.copyOf(version, 2 * used);
        }
        return used++;
    }
}
