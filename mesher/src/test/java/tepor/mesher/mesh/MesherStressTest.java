package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.ShrinkingMode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.refinement.RefinementReport.Reason;
import tepor.mesher.refinement.SizeField;
import tepor.mesher.section.Section;

/** Outlines that are hard to mesh, as drawn and scaled, turned and moved; and thousands of random ones. */
class MesherStressTest {
    private static final double ANGLE = Math.toRadians(28);

    private static MeshResult mesh(Section section, double angle, SizeField size) {
        return Mesher.mesh(section, new MeshOptions(angle, size, 3_000_000, 3), () -> false);
    }

    static Stream<Arguments> hardSections() {
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put("wedge of half a degree", SampleSections.wedge(Math.toRadians(0.5)));
        sections.put("comb of 200 fins", SampleSections.comb(200));
        sections.put("2000 circles", StressSections.circles(2000, 1));
        sections.put("layer of 1e-5", StressSections.layer(1e-5));
        sections.put("coast of 50,000 vertices", StressSections.coast(50_000, 1));
        return sections.entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("hardSections")
    void hardSectionIsMeshedWell(String name, Section section) {
        MeshResult result = mesh(section, ANGLE, SizeField.even(Double.POSITIVE_INFINITY));
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("hardSections")
    void hardSectionScaledTurnedOrMovedFarIsSound(String name, Section section) {
        double far = 1e6 * section.extent();
        Section[] changed = {
            SampleSections.moved(section, 1e-9, 0.7, 0, 0),
            SampleSections.moved(section, 1e9, 0, 0, 0),
            SampleSections.moved(section, 1, 0.3, far, -far)
        };
        for (Section s : changed) {
            MeshResult result = mesh(s, ANGLE, SizeField.even(s.extent() / 60));
            assertThat(MeshCheck.problems(result.mesh(), s)).isEmpty();
            assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
        }
    }

    @Test
    void pointsAFewUlpsApartEndAtTheFloorAndAreSound() {
        for (int ulps : new int[] {1, 3, 16, 1000}) {
            for (double scale : new double[] {1, 0x1p-30, 0x1p30}) {
                Section section = SampleSections.moved(StressSections.cutWithinUlps(ulps), scale, 0, 0, 0);
                MeshResult result = mesh(section, ANGLE, SizeField.even(scale / 10));
                assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
                assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
                assertThat(result.mesh().triangleCount()).isLessThan(5000);
            }
        }
    }

    @Property(tries = 2000, shrinking = ShrinkingMode.OFF)
    void nestedStarsAreMeshedWell(@ForAll long seed) {
        Section section = StressSections.nested(seed);
        MeshResult result = mesh(section, ANGLE, SizeField.even(Double.POSITIVE_INFINITY));
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
    }

    @Property(tries = 600, shrinking = ShrinkingMode.OFF)
    void nestedStarsAreMeshedAt33Degrees(@ForAll long seed) {
        Section section = StressSections.nested(seed);
        MeshResult result = mesh(section, Math.toRadians(33), SizeField.even(Double.POSITIVE_INFINITY));
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(Math.toRadians(33) - 1e-9);
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8})
    void patchworkOfManySmallAnglesReaches33Degrees(int seed) {
        Section section = SampleSections.patchwork(200, seed);
        MeshResult result = mesh(section, Math.toRadians(33), SizeField.even(Double.POSITIVE_INFINITY));
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(Math.toRadians(33) - 1e-9);
    }

    @Property(tries = 300, shrinking = ShrinkingMode.OFF)
    void nestedStarsAreMeshedWellAtEvenSizes(@ForAll long seed) {
        Section section = StressSections.nested(seed);
        MeshResult result = mesh(section, ANGLE, SizeField.even(section.extent() / 50));
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
    }
}
