package tepor.mesher.outline;

import org.locationtech.jts.geom.Geometry;

/**
 * One named thing in a drawing.
 *
 * @param name its name; empty where the record has none
 * @param kind what it can serve as
 * @param shape the geometry, coordinates in metres
 * @param place where its record begins in the drawing's file
 */
public record OutlineElement(String name, Kind kind, Geometry shape, Place place) {
    /** Polygons are regions, line strings named lines, points named points. */
    public enum Kind {
        REGION,
        LINE,
        POINT
    }
}
