package tepor.mesher.section;

import java.util.Arrays;

/**
 * A straight piece of border between two vertices, from the lower-numbered to the higher, and for each region whose border
 * it is by how much that region's winding number is greater on its left than on its right.
 */
final class Border {
    final int a;
    final int b;
    /** Regions whose winding number changes across the piece, ascending. */
    final int[] region;
    /** Winding number on the left less that on the right, for each of {@link #region}; never 0. */
    final int[] change;
    /** Whether the piece has not been tried against all others yet. */
    boolean fresh = true;

    Border(int a, int b, int[] region, int[] change) {
        this.a = a;
        this.b = b;
        this.region = region;
        this.change = change;
    }

    static long key(int a, int b) {
        return (long) Math.min(a, b) << 32 | Math.max(a, b);
    }

    /** The changes of a piece that lies over this one (seen in this one's direction) added to its own. */
    Border plus(int[] otherRegion, int[] otherChange) {
        int[] regions = new int[region.length + otherRegion.length];
        int[] changes = new int[regions.length];
        int count = 0;
        for (int i = 0, j = 0; i < region.length || j < otherRegion.length; ) {
            int next = Math.min(
                    i < region.length ? region[i] : Integer.MAX_VALUE,
                    j < otherRegion.length ? otherRegion[j] : Integer.MAX_VALUE);
            int sum = 0;
            if (i < region.length && region[i] == next) {
                sum += change[i++];
            }
            if (j < otherRegion.length && otherRegion[j] == next) {
                sum += otherChange[j++];
            }
            if (sum != 0) {
                regions[count] = next;
                changes[count++] = sum;
            }
        }
        Border joined = new Border(a, b, Arrays.copyOf(regions, count), Arrays.copyOf(changes, count));
        joined.fresh = fresh;
        return joined;
    }
}
