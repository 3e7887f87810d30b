package tepor.mesher.refinement;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.mesh.SampleSections;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.DelaunayCheck;
import tepor.mesher.triangulation.Predicates;
import tepor.mesher.triangulation.SectionTriangulator;
import tepor.mesher.triangulation.Triangulation;

class SectionRefinerTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void triangulationStaysConstrainedDelaunay(long seed) {
        Section section = SampleSections.patchwork(50, seed);
        Predicates predicates = new Predicates();
        Triangulation mesh = SectionTriangulator.triangulate(section, predicates);
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();
        RefinementOptions options =
                new RefinementOptions(Math.toRadians(28), (x, y) -> 0.05, 100_000, Math.toRadians(15));
        SectionRefiner.refine(mesh, section, options, predicates, () -> false);
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();
    }
}
