package tepor.mesher.section;

import java.util.Arrays;
import tepor.mesher.outline.Circle;

/**
 * A piece of border between two vertices, from the lower-numbered to the higher, straight or the shorter arc of a circle,
 * and for each region whose border it is by how much that region's winding number is greater on its left than on its right.
 */
final class Border {
    final int a;
    final int b;
    /** Circle of which the piece is an arc; null where it is straight. */
    final Circle circle;
    /** Whether the piece is part of a cut, which stays even where it parts nothing. */
    final boolean cut;
    /** Regions whose winding number changes across the piece, ascending. */
    final int[] region;
    /** Winding number on the left less that on the right, for each of {@link #region}; never 0. */
    final int[] change;
    /** Whether the piece has not been tried against all others yet. */
    boolean fresh = true;

    Border(int a, int b, Circle circle, boolean cut, int[] region, int[] change) {
        this.a = a;
        this.b = b;
        this.circle = circle;
        this.cut = cut;
        this.region = region;
        this.change = change;
    }

    static long key(int a, int b) {
        return (long) Math.min(a, b) << 32 | Math.max(a, b);
    }

    /** This piece and one that lies over it as one: an arc where either is, with the changes of both. */
    Border plus(Border other) {
        int[] otherRegion = other.region;
        int[] otherChange = other.change;
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
        Circle kept = circle != null ? circle : other.circle;
        Border joined =
                new Border(a, b, kept, cut || other.cut, Arrays.copyOf(regions, count), Arrays.copyOf(changes, count));
        joined.fresh = fresh || other.fresh;
        return joined;
    }

    /** Whether the piece parts nothing and is no cut, so that it can be left out. */
    boolean isIdle() {
        return region.length == 0 && !cut;
    }
}
