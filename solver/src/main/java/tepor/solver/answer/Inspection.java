package tepor.solver.answer;

import java.util.List;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.outline.Finding;
import tepor.solver.model.Case;

/**
 * A case checked and meshed, but not solved.
 *
 * @param subject the case
 * @param mesh its first mesh
 * @param secondsMesh what meshing took
 * @param insulated how much of the boundary is insulated, and where
 * @param warnings those of the case and those of the mesh
 */
public record Inspection(
        Case subject, MeshResult mesh, double secondsMesh, Insulated insulated, List<Finding> warnings) {
    public Inspection {
        warnings = List.copyOf(warnings);
    }
}
