package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import tepor.mesher.section.Section;

/** A sound mesh of two triangles, then one fault at a time. */
class MeshCheckTest {
    private static final Section SQUARE = SampleSections.square();

    private double[] xy = {0, 0, 1, 0, 1, 1, 0, 1, 0.5, 0, 1, 0.5, 0.5, 0.5, 0.5, 1, 0, 0.5};
    private int cornerCount = 4;
    private int[] node = {0, 1, 2, 5, 6, 4, 0, 2, 3, 7, 8, 6};
    private int[] neighbour = {Mesh.NONE, 1, Mesh.NONE, Mesh.NONE, Mesh.NONE, 0};
    private int[] region = {0, 0};
    private int[] facetSegment = {0, 1, 2, 3};
    private int[] facetLeft = {2, 0, 3, 4};
    private int[] facetRight = {Mesh.NONE, Mesh.NONE, Mesh.NONE, Mesh.NONE};

    private List<String> problems() {
        return MeshCheck.problems(
                new Mesh(6, cornerCount, xy, node, neighbour, region, facetSegment, facetLeft, facetRight), SQUARE);
    }

    @Test
    void soundMeshHasNoProblems() {
        assertThat(problems()).isEmpty();
    }

    @Test
    void turnedTriangle() {
        node = new int[] {1, 0, 2, 6, 5, 4, 0, 2, 3, 7, 8, 6};
        assertThat(problems()).anyMatch(p -> p.equals("triangle 0 is flat or turned over: -1.0"));
    }

    @Test
    void nodeOutOfPlace() {
        cornerCount = 5;
        assertThat(problems()).anyMatch(p -> p.startsWith("triangle 0 has node 4 at place 5"));
    }

    @Test
    void unusedNode() {
        xy = java.util.Arrays.copyOf(xy, 20);
        assertThat(problems()).containsExactly("node 9 is in no triangle");
    }

    @Test
    void oneSidedNeighbour() {
        neighbour[5] = Mesh.NONE;
        assertThat(problems()).anyMatch(p -> p.startsWith("triangle 0 has neighbour 1 at side 1"));
    }

    @Test
    void torn() {
        neighbour[1] = Mesh.NONE;
        neighbour[5] = Mesh.NONE;
        assertThat(problems())
                .anyMatch(p -> p.equals("node 0 is a corner of 2 triangles, but only 1 of them hang together"));
    }

    @Test
    void middleNodeOffTheMiddle() {
        xy[8] = 0.6;
        assertThat(problems())
                .anyMatch(p -> p.startsWith("node 4 lies 0.09999999999999998 m off the middle of side 2"));
    }

    @Test
    void wrongArea() {
        xy[4] = 1.5;
        xy[5] = 1.5;
        xy[10] = 1.25;
        xy[11] = 0.75;
        xy[12] = 0.75;
        xy[13] = 0.75;
        xy[14] = 0.75;
        xy[15] = 1.25;
        assertThat(problems()).anyMatch(p -> p.startsWith("the triangles of region 0 (plate) cover 1.5 m²"));
    }

    @Test
    void missingFacet() {
        facetSegment = new int[] {0, 1, 2};
        facetLeft = new int[] {2, 0, 3};
        facetRight = new int[] {Mesh.NONE, Mesh.NONE, Mesh.NONE};
        assertThat(problems())
                .anyMatch(p -> p.startsWith("facets of segment 3 end at"))
                .anyMatch(p -> p.equals("side 1 of triangle 1 is a facet 0 times"));
    }

    @Test
    void facetOnTheWrongSegment() {
        facetLeft = new int[] {0, 2, 3, 4};
        assertThat(problems()).anyMatch(p -> p.startsWith("facet 0 of segment 0 does not begin where"));
    }

    @Test
    void facetOnTheWrongSide() {
        facetRight[1] = facetLeft[1];
        facetLeft[1] = Mesh.NONE;
        assertThat(problems()).anyMatch(p -> p.startsWith("facet 1 on its left has triangle -1"));
    }

    @Test
    void wrongRegion() {
        region[1] = 7;
        assertThat(problems()).containsExactly("triangle 1 lies in region 7, which has no material");
    }
}
