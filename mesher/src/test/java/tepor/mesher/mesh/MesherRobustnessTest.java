package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.refinement.RefinementReport.Reason;
import tepor.mesher.section.Section;

class MesherRobustnessTest {
    private static final double ANGLE = Math.toRadians(28);

    private static MeshResult mesh(Section section, double angle, double size) {
        return Mesher.mesh(section, new MeshOptions(angle, (x, y) -> size, 100_000, 6), () -> false);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("tepor.mesher.mesh.MesherTest#allSections")
    void scaledSectionsMeshAlike(String name, Section section) {
        long count = mesh(section, ANGLE, section.extent() / 20).mesh().triangleCount();
        for (double scale : new double[] {1e-9, 1e9}) {
            Section scaled = SampleSections.moved(section, scale, 0, 0, 0);
            MeshResult result = mesh(scaled, ANGLE, scaled.extent() / 20);
            assertThat(MeshCheck.problems(result.mesh(), scaled)).isEmpty();
            assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
            assertThat((double) result.mesh().triangleCount()).isBetween(0.8 * count, 1.25 * count);
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("tepor.mesher.mesh.MesherTest#allSections")
    void turnedSectionsMeshAsWell(String name, Section section) {
        Section turned = SampleSections.moved(section, 1, 0.7, 0, 0);
        MeshResult result = mesh(turned, ANGLE, section.extent() / 20);
        assertThat(MeshCheck.problems(result.mesh(), turned)).isEmpty();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("tepor.mesher.mesh.MesherTest#allSections")
    void sectionsFarFromTheOriginAreSound(String name, Section section) {
        double far = 1e6 * section.extent();
        Section moved = SampleSections.moved(section, 1, 0.3, far, -far);
        MeshResult result = mesh(moved, ANGLE, section.extent() / 20);
        assertThat(MeshCheck.problems(result.mesh(), moved)).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void patchworkOfManySmallAnglesEndsAndIsSound(long seed) {
        Section section = SampleSections.patchwork(60, seed);
        MeshResult result = mesh(section, ANGLE, Double.POSITIVE_INFINITY);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
    }

    @ParameterizedTest
    @ValueSource(doubles = {20.7, 26.5, 30, 33})
    void anglesUpTo33DegreesAreReached(double degrees) {
        for (Section section : MesherTest.sections().values()) {
            MeshResult result = mesh(section, Math.toRadians(degrees), Double.POSITIVE_INFINITY);
            assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
            assertThat(result.quality().smallestAngleMade()).isGreaterThan(Math.toRadians(degrees) - 1e-9);
        }
    }
}
