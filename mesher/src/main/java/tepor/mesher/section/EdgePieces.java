package tepor.mesher.section;

/**
 * Segments of a section that make up an edge, each with the direction in which a heat flow through it is counted.
 *
 * @param segments segment numbers, ascending, each once
 * @param signs as long as segments: +1 where flow from the segment's left to its right counts as positive, −1 where flow
 *     from right to left does; on the boundary, positive is out of the material
 */
public record EdgePieces(int[] segments, int[] signs) {
    public boolean isEmpty() {
        return segments.length == 0;
    }

    /** Total length, metres. */
    public double length(Section section) {
        double sum = 0;
        for (int s : segments) {
            sum += section.length(s);
        }
        return sum;
    }
}
