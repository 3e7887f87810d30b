package tepor.mesher.mesh;

import tepor.mesher.refinement.SizeField;

/**
 * What is asked of a mesh.
 *
 * @param smallestAngle no smaller angle than this where the outline allows it, radians; at most 33°
 * @param size the longest side wanted at each point
 * @param trianglesAtMost refinement stops at this number of triangles
 * @param nodesPerTriangle 3 or 6
 */
public record MeshOptions(double smallestAngle, SizeField size, int trianglesAtMost, int nodesPerTriangle) {}
