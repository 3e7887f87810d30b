package tepor.mesher.mesh;

import java.util.function.BooleanSupplier;
import tepor.mesher.refinement.RefinementOptions;
import tepor.mesher.refinement.RefinementReport;
import tepor.mesher.refinement.SectionRefiner;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Predicates;
import tepor.mesher.triangulation.SectionTriangulator;
import tepor.mesher.triangulation.Triangulation;

/** Makes the mesh of a section. */
public final class Mesher {
    /** The parabola through three points of an arc that turns by this much leaves it by 9e-6 of its radius at most. */
    private static final double TURN_OF_CURVED_SIDE = Math.toRadians(15);
    /** A chord over this turn leaves its arc by 1e-3 of its radius at most. */
    private static final double TURN_OF_STRAIGHT_SIDE = Math.toRadians(5);

    private Mesher() {}

    /**
     * Meshes a section. The same section and options give the same mesh to the last bit.
     *
     * @param section the section
     * @param options what is asked of the mesh
     * @param stopped asked now and then whether to stop
     * @throws IllegalArgumentException if the section breaks its contract, or the options make no sense
     * @throws java.util.concurrent.CancellationException if told to stop
     */
    public static MeshResult mesh(Section section, MeshOptions options, BooleanSupplier stopped) {
        RefinementOptions refinement = new RefinementOptions(
                options.smallestAngle(),
                options.size(),
                options.trianglesAtMost(),
                options.nodesPerTriangle() == 6 ? TURN_OF_CURVED_SIDE : TURN_OF_STRAIGHT_SIDE);
        Predicates predicates = new Predicates();
        Triangulation triangulation = SectionTriangulator.triangulate(section, predicates);
        RefinementReport report = SectionRefiner.refine(triangulation, section, refinement, predicates, stopped);
        MeshAssembler assembler = MeshAssembler.assemble(triangulation, section, options.nodesPerTriangle());
        Mesh mesh = assembler.mesh();
        return new MeshResult(mesh, QualityMeasure.measure(mesh, section), report.with(assembler.leftStraight()));
    }
}
