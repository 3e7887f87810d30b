package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tepor.mesher.section.Section;

class MeshTest {
    private static MeshResult mesh(Section section, double size) {
        return Mesher.mesh(section, new MeshOptions(Math.toRadians(28), (x, y) -> size, 100_000, 6), () -> false);
    }

    @Test
    void squaresThatTouchInOneCornerHaveANodeEachThere() {
        Mesh mesh = mesh(SampleSections.touchingCorners(), 0.2).mesh();
        Set<Integer> there = new HashSet<>();
        for (int n = 0; n < mesh.cornerCount(); n++) {
            if (mesh.x(n) == 1 && mesh.y(n) == 1) {
                there.add(n);
            }
        }
        assertThat(there).hasSize(2);
    }

    @Test
    void bothTrianglesOfAnInterfaceShareItsNodes() {
        Section section = SampleSections.tJunction();
        Mesh mesh = mesh(section, 0.2).mesh();
        int interfaces = 0;
        for (int f = 0; f < mesh.facetCount(); f++) {
            assertThat(mesh.isBoundaryFacet(f)).isEqualTo(section.isBoundary(mesh.facetSegment(f)));
            if (!mesh.isBoundaryFacet(f)) {
                interfaces++;
                int t = mesh.facetRightTriangle(f);
                int side = mesh.facetRightSide(f);
                assertThat(mesh.node(t, (side + 2) % 3)).isEqualTo(mesh.facetNode(f, 0));
                assertThat(mesh.node(t, (side + 1) % 3)).isEqualTo(mesh.facetNode(f, 1));
                assertThat(mesh.node(t, 3 + side)).isEqualTo(mesh.facetNode(f, 2));
            }
        }
        assertThat(interfaces).isGreaterThan(8);
    }

    @Test
    void qualityOfAnEquilateralTriangleAndOfARightOne() {
        MeshQuality equilateral = mesh(SampleSections.wedge(Math.PI / 3), 10).quality();
        assertThat(equilateral.smallestAngle()).isCloseTo(Math.PI / 3, within(1e-9));
        assertThat(equilateral.largestAngle()).isCloseTo(Math.PI / 3, within(1e-9));
        // Every angle lies between two segments: none was made.
        assertThat(equilateral.smallestAngleMade()).isEqualTo(Math.PI);
        MeshQuality square = mesh(SampleSections.square(), 10).quality();
        assertThat(square.smallestAngleMade()).isCloseTo(Math.PI / 4, within(1e-9));
        assertThat(square.largestAngle()).isCloseTo(Math.PI / 2, within(1e-9));
    }

    @Test
    void numbersNearEachOtherLieNearEachOther() {
        Mesh mesh = mesh(SampleSections.square(), 0.02).mesh();
        double sum = 0;
        for (int t = 1; t < mesh.triangleCount(); t++) {
            int a = mesh.node(t, 0);
            int b = mesh.node(t - 1, 0);
            sum += Math.hypot(mesh.x(a) - mesh.x(b), mesh.y(a) - mesh.y(b));
        }
        assertThat(sum / mesh.triangleCount()).isLessThan(0.03);
    }
}
