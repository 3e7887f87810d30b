package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

class TriangleMapTest {
    /** Triangle (0 0), (4 0), (1 3), the middle node of side i moved to the right of its chord by bulge·length. */
    private static Mesh triangle(double... bulge) {
        double[] xy = {0, 0, 4, 0, 1, 3, 0, 0, 0, 0, 0, 0};
        for (int i = 0; i < 3; i++) {
            int a = (i + 1) % 3;
            int b = (i + 2) % 3;
            xy[6 + 2 * i] = 0.5 * (xy[2 * a] + xy[2 * b]) + bulge[i] * (xy[2 * b + 1] - xy[2 * a + 1]);
            xy[7 + 2 * i] = 0.5 * (xy[2 * a + 1] + xy[2 * b + 1]) - bulge[i] * (xy[2 * b] - xy[2 * a]);
        }
        return new Mesh(
                6,
                3,
                xy,
                new int[] {0, 1, 2, 3, 4, 5},
                new int[] {-1, -1, -1},
                new int[] {0},
                new int[] {0, 1, 2},
                new int[] {2, 0, 1},
                new int[] {-1, -1, -1});
    }

    private static TriangleMap map(double... bulge) {
        TriangleMap map = new TriangleMap(triangle(bulge));
        map.moveTo(0);
        return map;
    }

    private static final double[][] BULGES = {
        {0, 0, 0}, {0.2, 0, 0}, {-0.1, 0, 0}, {0, 0.15, 0}, {0, -0.12, 0}, {0.1, -0.08, 0.05}, {-0.1, -0.1, -0.1},
    };

    @Test
    void theWayBackLeadsToWhereOneCameFrom() {
        Random random = new Random(3);
        double[] l = new double[3];
        for (double[] bulge : BULGES) {
            TriangleMap map = map(bulge);
            for (int k = 0; k < 2000; k++) {
                double u = k % 50 == 0 ? 0 : random.nextDouble();
                double l1 = u * (k % 70 == 0 ? 1 : random.nextDouble());
                double l2 = u - l1;
                double l0 = 1 - u;
                assertThat(map.locate(map.x(l0, l1, l2), map.y(l0, l1, l2), l)).isTrue();
                assertThat(l).containsExactly(new double[] {l0, l1, l2}, within(1e-12));
            }
        }
    }

    @Test
    void nodesAreWhereTheMeshHasThem() {
        Mesh mesh = triangle(0.2, -0.1, 0.05);
        TriangleMap map = map(0.2, -0.1, 0.05);
        double[][] nodes = {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}, {0, 0.5, 0.5}, {0.5, 0, 0.5}, {0.5, 0.5, 0}};
        for (int i = 0; i < 6; i++) {
            assertThat(map.x(nodes[i][0], nodes[i][1], nodes[i][2])).isCloseTo(mesh.x(i), within(1e-15));
            assertThat(map.y(nodes[i][0], nodes[i][1], nodes[i][2])).isCloseTo(mesh.y(i), within(1e-15));
        }
    }

    /** A point is inside where its coordinates are all positive: two tests that share no formula. */
    @Test
    void containsWhatLiesWithinTheParabolas() {
        Random random = new Random(5);
        double[] l = new double[3];
        for (double[] bulge : BULGES) {
            TriangleMap map = map(bulge);
            int inside = 0;
            for (int k = 0; k < 20_000; k++) {
                double x = -1 + 6 * random.nextDouble();
                double y = -1 + 5 * random.nextDouble();
                boolean positive = map.locate(x, y, l) && Math.min(l[0], Math.min(l[1], l[2])) >= 0;
                assertThat(map.contains(x, y)).as("(%s %s)", x, y).isEqualTo(positive);
                inside += positive ? 1 : 0;
            }
            double area = triangle(bulge).area(0);
            assertThat(inside / 20_000.0 * 30).isCloseTo(area, within(0.05 * area));
        }
    }

    @Test
    void aPointBetweenChordAndArcIsInOrOutAsTheSideBulges() {
        double[] l = new double[3];
        TriangleFinder outwards = new TriangleFinder(triangle(0, 0, 0.1));
        assertThat(outwards.find(2, -0.3, l)).isZero();
        assertThat(l[2]).isPositive();
        TriangleFinder inwards = new TriangleFinder(triangle(0, 0, -0.1));
        assertThat(inwards.find(2, 0.3, l)).isZero(); // it is the nearest
        assertThat(l[2]).isNegative();
        assertThat(inwards.find(2, 0.5, l)).isZero();
        assertThat(l[2]).isPositive();
    }

    @Test
    void aPointALittleOffTheMeshHasTheNearestTriangle() {
        TriangleFinder finder = new TriangleFinder(triangle(0, 0, 0.1));
        double[] l = new double[3];
        assertThat(finder.find(2, -0.41, l)).isZero();
        assertThat(l[2]).isBetween(-0.02, 0.0);
        assertThat(finder.find(-0.05, -0.05, l)).isZero();
        assertThat(finder.find(20, 0, l)).isEqualTo(Mesh.NONE);
    }
}
