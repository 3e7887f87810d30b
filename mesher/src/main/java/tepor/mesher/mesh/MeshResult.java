package tepor.mesher.mesh;

import tepor.mesher.refinement.RefinementReport;

/**
 * A mesh, how good it is, and where it had to stay worse than asked.
 *
 * @param mesh the mesh
 * @param quality angles and counts
 * @param report where refinement stopped short
 */
public record MeshResult(Mesh mesh, MeshQuality quality, RefinementReport report) {}
