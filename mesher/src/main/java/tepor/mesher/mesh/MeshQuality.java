package tepor.mesher.mesh;

/**
 * How good a mesh is.
 *
 * <p>An angle is "made" unless it lies between two segments of the outline, or in a triangle whose shortest side joins two
 * segments that meet under 60°.
 *
 * @param smallestAngle smallest angle of all triangles, radians
 * @param smallestAngleMade smallest angle that the outline does not impose, radians
 * @param largestAngle largest angle of all triangles, radians
 */
public record MeshQuality(double smallestAngle, double smallestAngleMade, double largestAngle) {}
