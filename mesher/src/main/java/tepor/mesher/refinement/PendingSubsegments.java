package tepor.mesher.refinement;

import java.util.Arrays;

/** Subsegments that wait to be split, first come first served. */
final class PendingSubsegments {
    private int[] side = new int[256];
    private int[] version = new int[256];
    private int first;
    private int count;
    private int takenVersion;

    void add(int side, int version) {
        if (count == this.side.length) {
            grow();
        }
        int at = (first + count) & (this.side.length - 1);
        this.side[at] = side;
        this.version[at] = version;
        count++;
    }

    /** Takes the next side; −1 if there is none. */
    int take() {
        if (count == 0) {
            return -1;
        }
        int at = first;
        first = (first + 1) & (side.length - 1);
        count--;
        takenVersion = version[at];
        return side[at];
    }

    /** Version that the triangle of the side taken last had when it was added. */
    int takenVersion() {
        return takenVersion;
    }

    private void grow() {
        int[] oldSide = side;
        int[] oldVersion = version;
        side = Arrays.copyOf(oldSide, 2 * count);
        version = Arrays.copyOf(oldVersion, 2 * count);
        for (int i = 0; i < count; i++) {
            side[i] = oldSide[(first + i) & (count - 1)];
            version[i] = oldVersion[(first + i) & (count - 1)];
        }
        first = 0;
    }
}
