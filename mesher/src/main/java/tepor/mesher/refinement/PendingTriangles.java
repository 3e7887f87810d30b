package tepor.mesher.refinement;

import java.util.Arrays;

/**
 * Triangles that wait to be refined, patch by patch; in a patch those with the shortest sides first (Üngör 2009, Comput. Geom. 42:109–118, needs this
 * for off-centres to pay), first come first served among nearly equals.
 */
final class PendingTriangles {
    private static final int BUCKETS = 256;
    private static final int NONE = -1;
    /** Keeps the exponent and the first bit of the mantissa of a squared length. */
    private static final int SHIFT = 51;

    private final long firstBucket;
    private int[] head = new int[BUCKETS];
    private int[] tail = new int[BUCKETS];
    private int[] lowest = {BUCKETS};
    private int[] next = new int[1024];
    private int[] triangle = new int[1024];
    private int[] version = new int[1024];
    private int free = NONE;
    private int used;
    private int patch;
    private int takenVersion;

    /** @param extent about the greatest length that occurs, metres */
    PendingTriangles(double extent) {
        firstBucket = (Double.doubleToRawLongBits(extent * extent) >>> SHIFT) - (BUCKETS - 8);
        Arrays.fill(head, NONE);
    }

    /** Sets the number of patches; nothing may be waiting. */
    void divide(int patches) {
        head = new int[BUCKETS * patches];
        tail = new int[BUCKETS * patches];
        lowest = new int[patches];
        Arrays.fill(head, NONE);
        Arrays.fill(lowest, BUCKETS);
        patch = 0;
    }

    void add(int triangle, int version, int patch, double shortestSquared) {
        int bucket = (int) ((Double.doubleToRawLongBits(shortestSquared) >>> SHIFT) - firstBucket);
        bucket = Math.min(BUCKETS - 1, Math.max(0, bucket));
        int entry = newEntry();
        this.triangle[entry] = triangle;
        this.version[entry] = version;
        next[entry] = NONE;
        int list = BUCKETS * patch + bucket;
        if (head[list] < 0) {
            head[list] = entry;
        } else {
            next[tail[list]] = entry;
        }
        tail[list] = entry;
        lowest[patch] = Math.min(lowest[patch], bucket);
    }

    /** Takes the next triangle of the patch at hand, or of the next one that has any; −1 if there is none. */
    int take() {
        for (int i = 0; i <= lowest.length; i++) {
            int bucket = lowest[patch];
            while (bucket < BUCKETS && head[BUCKETS * patch + bucket] < 0) {
                bucket++;
            }
            lowest[patch] = bucket;
            if (bucket < BUCKETS) {
                int entry = head[BUCKETS * patch + bucket];
                head[BUCKETS * patch + bucket] = next[entry];
                next[entry] = free;
                free = entry;
                takenVersion = version[entry];
                return triangle[entry];
            }
            patch = patch + 1 == lowest.length ? 0 : patch + 1;
        }
        return NONE;
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
