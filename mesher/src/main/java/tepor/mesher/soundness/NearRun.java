package tepor.mesher.soundness;

import java.util.List;
import org.locationtech.jts.geom.Coordinate;

/**
 * Two borders that come close to each other over one stretch.
 *
 * @param kind what lies between them
 * @param first region, by its order
 * @param second region, not before the first
 * @param width least width, metres
 * @param widest greatest width, metres; the same where a point nears a side
 * @param length over what length they run side by side, metres; 0 where a point nears a side
 * @param lengthOverWidth integral of length over width; the mesh between them grows with it
 * @param place where they are closest, metres
 * @param pairs the pieces, as {@link DrawnPieces} counts them
 */
public record NearRun(
        Kind kind,
        int first,
        int second,
        double width,
        double widest,
        double length,
        double lengthOverWidth,
        Coordinate place,
        List<NearPair> pairs) {
    /** What lies between the two. */
    public enum Kind {
        /** A point nears a side or a point of another ring. */
        NEAR_POINT,
        /** Between two regions, in neither. */
        GAP,
        /** In both of two regions. */
        OVERLAP,
        /** What a region laid over another leaves of it along a part of its own border. */
        STRIP,
        /** A thin region, or what a region laid over another leaves of it all around: drawn on purpose. */
        LAYER,
        /** Between two parts of one region, outside it. */
        SLIT
    }
}
