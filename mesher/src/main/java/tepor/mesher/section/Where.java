package tepor.mesher.section;

import java.util.List;
import org.locationtech.jts.geom.Geometry;

/** Where an edge is: the ways to choose pieces of a section's boundary and of the borders between its regions. */
public sealed interface Where {
    /** Boundary pieces that lie on one side of the section's bounding box. */
    record OnSide(Side side) implements Where {}

    /** The sides of the bounding box. */
    enum Side {
        LEFT,
        RIGHT,
        BOTTOM,
        TOP
    }

    /** The outer boundary. */
    record Outside() implements Where {}

    /** The boundary of every hole. */
    record Holes() implements Where {}

    /** Every boundary piece on which no other edge states a condition. */
    record Rest() implements Where {}

    /** Boundary and interface pieces that lie on the line within snap. Line strings, coordinates in metres. */
    record OnLine(Geometry line) implements Where {}

    /**
     * Pieces that lie on the line within snap, but for those of the boundary: cuts through regions, and interfaces. Line
     * strings, coordinates in metres.
     */
    record OnCut(Geometry line) implements Where {}

    /** Boundary pieces inside the polygon, coordinates in metres. */
    record Inside(Geometry polygon) implements Where {}

    /** The one piece nearest to the point (metres); pieces run between corners over 30° or junctions. */
    record Nearest(double x, double y) implements Where {}

    /** The whole border of a region, by its number, against boundary and neighbours. */
    record OfRegion(int region) implements Where {}

    /** Where two regions, by their numbers, meet. */
    record Between(int first, int second) implements Where {}

    /** All of these. */
    record Union(List<Where> parts) implements Where {
        public Union {
            parts = List.copyOf(parts);
        }
    }
}
