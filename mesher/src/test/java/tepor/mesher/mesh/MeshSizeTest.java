package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tepor.mesher.refinement.RefinementReport.Reason;
import tepor.mesher.refinement.SizeField;
import tepor.mesher.section.Section;

class MeshSizeTest {
    private static final double ANGLE = Math.toRadians(28);

    private static MeshResult mesh(Section section, SizeField size, int atMost) {
        return Mesher.mesh(section, new MeshOptions(ANGLE, size, atMost, 3), () -> false);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("tepor.mesher.mesh.MesherTest#allSections")
    void noSideIsLongerThanTheSizeAndFewAreMuchShorter(String name, Section section) {
        double h = section.extent() / 40;
        Mesh mesh = mesh(section, (x, y) -> h, 1_000_000).mesh();
        double area = 0;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            assertThat(longestSide(mesh, t)).isLessThanOrEqualTo(h * (1 + 1e-8));
            area += mesh.area(t);
        }
        if (name.equals("square") || name.equals("L") || name.equals("square hole")) {
            // Equilateral triangles of side 0.65 h.
            assertThat((double) mesh.triangleCount()).isLessThan(area / (Math.sqrt(3) / 4 * 0.65 * 0.65 * h * h));
        }
    }

    @Test
    void evenSizeTakesHardlyMoreTrianglesThanAreNeeded() {
        for (Section section : new Section[] {
            SampleSections.lShape(),
            SampleSections.plateWithRoundHole(),
            SampleSections.moved(SampleSections.cells(3, 3, 2, (i, j) -> (i + j) % 2), 1, 0.4, 0, 0)
        }) {
            double h = section.extent() / 200;
            MeshResult result = mesh(section, SizeField.even(h), 1_000_000);
            assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
            double area = 0;
            double longest = 0;
            for (int t = 0; t < result.mesh().triangleCount(); t++) {
                longest = Math.max(longest, longestSide(result.mesh(), t));
                area += result.mesh().area(t);
            }
            assertThat(longest).isLessThanOrEqualTo(h * (1 + 1e-8));
            // Equilateral triangles of side h; more are needed only beside segments.
            double least = area / (Math.sqrt(3) / 4 * h * h);
            assertThat((double) result.mesh().triangleCount()).isBetween(least, 1.25 * least);
        }
    }

    @Test
    void evenSizeWithOneSmallPlaceIsFollowed() {
        Section section = SampleSections.square();
        SizeField size = SizeField.least(SizeField.even(0.01), (x, y) -> 0.0005 + 0.3 * Math.hypot(x - 0.3, y - 0.4));
        MeshResult result = mesh(section, size, 1_000_000);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().stops()).isEmpty();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
        assertThat(longestToWanted(result.mesh(), size)).isLessThanOrEqualTo(1 + 1e-8);
    }

    @Test
    void manyTrianglesOfUnevenSizeAreMadeInStagesAndAreSound() {
        Section section = SampleSections.plateWithRoundHole();
        SizeField size = (x, y) -> 0.006 * (1 + 0.5 * x);
        MeshResult result = mesh(section, size, 1_000_000);
        assertThat(result.mesh().triangleCount()).isGreaterThan(100_000);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().stops()).isEmpty();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
        assertThat(longestToWanted(result.mesh(), size)).isLessThanOrEqualTo(1 + 1e-8);
    }

    @Test
    void sizeGradedOverSevenOrdersOfMagnitudeIsFollowedWithoutWaste() {
        Section section = SampleSections.lShape();
        SizeField size = (x, y) -> Math.min(0.3, 3e-7 + 0.25 * Math.hypot(x - 1, y - 1));
        MeshResult result = mesh(section, size, 1_000_000);
        Mesh mesh = result.mesh();
        assertThat(MeshCheck.problems(mesh, section)).isEmpty();
        assertThat(result.quality().smallestAngleMade()).isGreaterThan(ANGLE - 1e-9);
        assertThat(result.report().stops()).isEmpty();
        double wanted = 0;
        double shortest = 1;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            double h = size.at(centroidX(mesh, t), centroidY(mesh, t));
            assertThat(longestSide(mesh, t)).isLessThanOrEqualTo(h * (1 + 1e-8));
            wanted += mesh.area(t) / (Math.sqrt(3) / 4 * h * h);
            shortest = Math.min(shortest, longestSide(mesh, t));
        }
        assertThat(shortest).isLessThan(3.1e-7);
        assertThat((double) mesh.triangleCount()).isLessThan(3 * wanted);
    }

    @Test
    void elementLimitStopsRefinementAndIsReported() {
        Section section = SampleSections.plateWithRoundHole();
        MeshResult result = mesh(section, (x, y) -> 0.002, 5000);
        assertThat(result.mesh().triangleCount()).isBetween(4990, 5000);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isPositive();
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
    }

    @Test
    void sizeOfNothingEndsAtTheFloorOrTheLimit() {
        Section section = SampleSections.square();
        MeshResult result = mesh(section, (x, y) -> x == 0 && y == 0 ? 0 : 1, 20_000);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        assertThat(result.mesh().triangleCount()).isLessThan(2000);
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isPositive();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
    }

    @Test
    void smallAngleOfTheOutlineIsReportedAsImposed() {
        MeshResult result = mesh(SampleSections.wedge(Math.toRadians(10)), (x, y) -> 1, 20_000);
        assertThat(result.report().count(Reason.IMPOSED_BY_OUTLINE)).isPositive();
        assertThat(Math.toDegrees(result.quality().smallestAngle())).isBetween(5.0, 10 + 1e-9);
        assertThat(mesh(SampleSections.square(), (x, y) -> 0.1, 20_000).report().stops())
                .isEmpty();
    }

    @Test
    void sameOptionsGiveTheSameMeshToTheLastBit() {
        Section section = SampleSections.patchwork(40, 9);
        Mesh one = mesh(section, (x, y) -> 0.05, 100_000).mesh();
        Mesh other = mesh(section, (x, y) -> 0.05, 100_000).mesh();
        assertThat(one.triangleCount()).isEqualTo(other.triangleCount());
        for (int n = 0; n < one.nodeCount(); n++) {
            assertThat(one.x(n)).isEqualTo(other.x(n));
            assertThat(one.y(n)).isEqualTo(other.y(n));
        }
        for (int t = 0; t < one.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                assertThat(one.node(t, i)).isEqualTo(other.node(t, i));
            }
        }
    }

    @Test
    void meshingStopsWhenTold() {
        AtomicInteger asked = new AtomicInteger();
        MeshOptions options = new MeshOptions(ANGLE, (x, y) -> 0.001, Integer.MAX_VALUE, 3);
        assertThatThrownBy(() -> Mesher.mesh(SampleSections.square(), options, () -> asked.incrementAndGet() > 3))
                .isInstanceOf(CancellationException.class);
        assertThat(asked).hasValue(4);
    }

    @Test
    void optionsThatMakeNoSenseAreRefused() {
        Section square = SampleSections.square();
        MeshOptions steep = new MeshOptions(Math.toRadians(35), (x, y) -> 1, 1000, 3);
        assertThatThrownBy(() -> Mesher.mesh(square, steep, () -> false)).hasMessageContaining("33°");
        MeshOptions four = new MeshOptions(ANGLE, (x, y) -> 1, 1000, 4);
        assertThatThrownBy(() -> Mesher.mesh(square, four, () -> false)).hasMessageContaining("3 or 6 nodes, not 4");
    }

    private static double longestToWanted(Mesh mesh, SizeField size) {
        double greatest = 0;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            double h = size.at(centroidX(mesh, t), centroidY(mesh, t));
            greatest = Math.max(greatest, longestSide(mesh, t) / h);
        }
        return greatest;
    }

    private static double longestSide(Mesh mesh, int t) {
        double longest = 0;
        for (int i = 0; i < 3; i++) {
            int a = mesh.node(t, i);
            int b = mesh.node(t, (i + 1) % 3);
            longest = Math.max(longest, Math.hypot(mesh.x(a) - mesh.x(b), mesh.y(a) - mesh.y(b)));
        }
        return longest;
    }

    private static double centroidX(Mesh mesh, int t) {
        return (mesh.x(mesh.node(t, 0)) + mesh.x(mesh.node(t, 1)) + mesh.x(mesh.node(t, 2))) / 3;
    }

    private static double centroidY(Mesh mesh, int t) {
        return (mesh.y(mesh.node(t, 0)) + mesh.y(mesh.node(t, 1)) + mesh.y(mesh.node(t, 2))) / 3;
    }
}
