package tepor.solver.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TriangleShapeTest {
    private static final double[][] NODES = {
        {1, 0, 0}, {0, 1, 0}, {0, 0, 1}, {0, 0.5, 0.5}, {0.5, 0, 0.5}, {0.5, 0.5, 0}
    };

    @ParameterizedTest
    @ValueSource(ints = {3, 6})
    void isOneAtItsNodeAndZeroAtTheOthers(int n) {
        TriangleShape shape = TriangleShapes.of(n);
        double[] value = new double[n];
        for (int j = 0; j < n; j++) {
            shape.values(NODES[j][0], NODES[j][1], NODES[j][2], value);
            for (int i = 0; i < n; i++) {
                assertThat(value[i]).as("N%d at node %d", i, j).isEqualTo(i == j ? 1 : 0);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {3, 6})
    void slopesAreTheDerivativesOfTheValues(int n) {
        TriangleShape shape = TriangleShapes.of(n);
        double[] l = {0.2, 0.3, 0.5};
        double[] slopes = new double[3 * n];
        shape.slopes(l[0], l[1], l[2], slopes);
        double step = 1e-6;
        double[] up = new double[n];
        double[] down = new double[n];
        for (int d = 0; d < 3; d++) {
            double[] a = l.clone();
            double[] b = l.clone();
            a[d] += step;
            b[d] -= step;
            shape.values(a[0], a[1], a[2], up);
            shape.values(b[0], b[1], b[2], down);
            for (int i = 0; i < n; i++) {
                assertThat(slopes[3 * i + d])
                        .as("∂N%d/∂λ%d", i, d)
                        .isCloseTo((up[i] - down[i]) / (2 * step), within(1e-9));
            }
        }
    }
}
