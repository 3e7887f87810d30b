package tepor.mesher.section;

import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.Place;

/**
 * A region as it was drawn, before later regions are laid over it.
 *
 * @param name the region's name
 * @param polygons a valid Polygon or MultiPolygon, coordinates in metres
 * @param hole whether the region is of nothing: cut out of what lies under it
 * @param place where the user wrote it
 */
public record RegionShape(String name, Geometry polygons, boolean hole, Place place) {}
