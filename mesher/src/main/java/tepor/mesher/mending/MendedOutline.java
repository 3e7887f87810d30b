package tepor.mesher.mending;

import java.util.List;
import tepor.mesher.outline.Finding;
import tepor.mesher.section.RegionShape;

/**
 * What mending made of the outlines of a case.
 *
 * @param shapes all regions in their order; those that needed no mending hold the same geometry as before
 * @param changes everything that was changed; empty where the outlines were sound
 * @param remaining what the check still finds
 */
public record MendedOutline(List<RegionShape> shapes, List<Change> changes, List<Finding> remaining) {
    public MendedOutline {
        shapes = List.copyOf(shapes);
        changes = List.copyOf(changes);
        remaining = List.copyOf(remaining);
    }
}
