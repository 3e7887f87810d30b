package tepor.mesher.section;

import java.util.BitSet;

/** Finds the pieces of a section's boundary and interfaces that a {@link Where} chooses. */
public final class EdgeFinder {
    /** @param section the section to search */
    public EdgeFinder(Section section) {
        throw new IllegalStateException("not joined yet");
    }

    /**
     * Finds an edge.
     *
     * @param where where it is
     * @param conditioned segments on which other edges state a condition; {@link Where.Rest} leaves them out
     * @return its pieces; empty where nothing is found
     */
    public EdgePieces find(Where where, BitSet conditioned) {
        throw new IllegalStateException("not joined yet");
    }
}
