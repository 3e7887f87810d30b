package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tepor.mesher.refinement.RefinementReport.Reason;
import tepor.mesher.section.Section;

class MesherTest {
    private static final double ANGLE = Math.toRadians(28);

    static Map<String, Section> sections() {
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put("square", SampleSections.square());
        sections.put("L", SampleSections.lShape());
        sections.put("square hole", SampleSections.squareWithSquareHole());
        sections.put("round hole", SampleSections.plateWithRoundHole());
        sections.put("thin layer", SampleSections.thinLayer());
        sections.put("many regions", SampleSections.cells(8, 5, 40, (i, j) -> 8 * j + i));
        sections.put("checkerboard", SampleSections.cells(30, 30, 2, (i, j) -> (i + j) % 2));
        sections.put("wedge of 1°", SampleSections.wedge(Math.toRadians(1)));
        sections.put("wedge of 10°", SampleSections.wedge(Math.toRadians(10)));
        sections.put("wedge of 40°", SampleSections.wedge(Math.toRadians(40)));
        sections.put("comb", SampleSections.comb(7));
        sections.put("spike", SampleSections.spike());
        sections.put("touching corners", SampleSections.touchingCorners());
        sections.put("T-junction", SampleSections.tJunction());
        return sections;
    }

    static Stream<Arguments> allSections() {
        return sections().entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
    }

    private static MeshResult mesh(Section section, double size, int nodes) {
        return Mesher.mesh(section, new MeshOptions(ANGLE, (x, y) -> size, 200_000, nodes), () -> false);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("allSections")
    void coarseMeshIsSoundAndHasNoSmallAngleButThoseOfTheOutline(String name, Section section) {
        MeshResult result = mesh(section, Double.POSITIVE_INFINITY, 6);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
    }
}
