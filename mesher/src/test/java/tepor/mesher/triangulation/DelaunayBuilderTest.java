package tepor.mesher.triangulation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.tinfour.common.IQuadEdge;
import org.tinfour.common.Vertex;
import org.tinfour.standard.IncrementalTin;

class DelaunayBuilderTest {
    @Test
    void sidesAreThoseOfAnIndependentProgram() {
        int n = 3000;
        double[] xy = new Random(3).doubles(2 * n).toArray();
        Triangulation mesh = DelaunayBuilder.build(xy, new Predicates());
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();

        IncrementalTin tin = new IncrementalTin(1.0 / n);
        for (int v = 0; v < n; v++) {
            tin.add(new Vertex(xy[2 * v], xy[2 * v + 1], 0, v));
        }
        Set<Long> expected = new HashSet<>();
        for (IQuadEdge edge : tin.edges()) {
            if (edge.getA() != null && edge.getB() != null) {
                expected.add(key(edge.getA().getIndex(), edge.getB().getIndex()));
            }
        }
        assertThat(sides(mesh)).isEqualTo(expected);
    }

    @ParameterizedTest
    @ValueSource(ints = {100, 500})
    void gridOfCocircularPointsIsSound(int n) {
        double[] xy = new double[2 * n * n];
        for (int i = 0; i < n * n; i++) {
            xy[2 * i] = 0.1 * (i % n);
            xy[2 * i + 1] = 0.1 * (i / n);
        }
        Predicates predicates = new Predicates();
        Triangulation mesh = DelaunayBuilder.build(xy, predicates);
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();
        // Euler: 2n² − 2 − hull triangles, and as many ghosts as there are sides on the hull.
        assertThat(mesh.triangleCount()).isEqualTo(2 * n * n - 2);
        assertThat(predicates.exactInCircles()).isPositive();
    }

    @Test
    void pointsOnALineWithOneBesideItAreSound() {
        double[] xy = new double[2 * 200];
        for (int i = 0; i < 199; i++) {
            xy[2 * i] = i;
        }
        xy[398] = 50;
        xy[399] = 1e-3;
        Triangulation mesh = DelaunayBuilder.build(xy, new Predicates());
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();
        assertThat(mesh.triangleCount()).isEqualTo(2 * 200 - 2);
    }

    @Test
    void sameInputGivesTheSameArrays() {
        double[] xy = new Random(5).doubles(2 * 1000).toArray();
        Triangulation one = DelaunayBuilder.build(xy, new Predicates());
        Triangulation other = DelaunayBuilder.build(xy, new Predicates());
        assertThat(Arrays.copyOf(one.corner, 3 * one.triangleCount()))
                .isEqualTo(Arrays.copyOf(other.corner, 3 * other.triangleCount()));
    }

    @Test
    void refusesWhatHasNoTriangulation() {
        assertThatThrownBy(() -> DelaunayBuilder.build(new double[] {0, 0, 1, 1}, new Predicates()))
                .hasMessageContaining("at least three points, got 2");
        assertThatThrownBy(() -> DelaunayBuilder.build(new double[] {0, 0, 1, 1, 2, 2, 3, 3}, new Predicates()))
                .hasMessageContaining("on one line");
        assertThatThrownBy(() -> DelaunayBuilder.build(new double[] {0, 0, 1, 0, 0, 1, 1, 0}, new Predicates()))
                .hasMessageContaining("two points are the same");
    }

    private static Set<Long> sides(Triangulation mesh) {
        Set<Long> sides = new HashSet<>();
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            if (mesh.origin(side) >= 0 && mesh.destination(side) >= 0) {
                sides.add(key(mesh.origin(side), mesh.destination(side)));
            }
        }
        return sides;
    }

    private static long key(int a, int b) {
        return (long) Math.max(a, b) << 32 | Math.min(a, b);
    }
}
