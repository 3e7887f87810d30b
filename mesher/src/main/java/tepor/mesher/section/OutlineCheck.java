package tepor.mesher.section;

import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/** Finds what is wrong with a region's outline on its own. */
public final class OutlineCheck {
    private OutlineCheck() {}

    /**
     * Checks one region's polygons: self-crossing, zero area, repeated points, a hole outside its shell, and whatever else
     * makes them invalid.
     *
     * @param name the region's name
     * @param polygons its geometry, metres
     * @param place where it is written
     * @param unit the drawing's unit, for coordinates in messages
     * @param findings takes every fault found
     * @return whether it is sound enough to build a section from
     */
    public static boolean check(String name, Geometry polygons, Place place, DrawingUnit unit, Findings findings) {
        throw new IllegalStateException("not joined yet");
    }
}
