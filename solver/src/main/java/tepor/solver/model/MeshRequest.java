package tepor.solver.model;

import java.util.List;
import org.locationtech.jts.geom.Geometry;

/**
 * What the case asks of the mesh.
 *
 * @param nodesPerTriangle 3 (linear) or 6 (quadratic)
 * @param smallestAngle radians
 * @param size no longer side than this, metres; infinite where not stated
 * @param refinements places with a smaller size
 * @param trianglesAtMost element limit
 */
public record MeshRequest(
        int nodesPerTriangle, double smallestAngle, double size, List<Refinement> refinements, int trianglesAtMost) {
    public MeshRequest {
        refinements = List.copyOf(refinements);
    }

    /**
     * A place with a smaller size.
     *
     * @param near a region, an edge, or null where a geometry is given
     * @param geometry points, lines or polygons in metres, or null where a target is given
     * @param size longest side there, metres
     */
    public record Refinement(Target near, Geometry geometry, double size) {}
}
