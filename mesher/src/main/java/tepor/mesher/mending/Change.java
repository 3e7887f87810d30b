package tepor.mesher.mending;

import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Place;

/**
 * One thing that was mended in an outline.
 *
 * @param code short stable identifier in lower case with hyphens, such as {@code points-merged}
 * @param region the region that changed
 * @param place where it was written
 * @param what what was found and what was done, as a sentence without a full stop
 * @param at where, metres
 * @param size length, width or area of it, m or m²
 */
public record Change(String code, String region, Place place, String what, Coordinate at, double size) {
    /** The change as one line of text. */
    @Override
    public String toString() {
        return place + ": mended: " + what;
    }
}
