package tepor.solver.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;

class ExtremeFinderTest {
    /** One six-node triangle (0 0), (4 0), (0 4). */
    private static final Mesh TRIANGLE = new Mesh(
            6,
            3,
            new double[] {0, 0, 4, 0, 0, 4, 2, 2, 0, 2, 2, 0},
            new int[] {0, 1, 2, 3, 4, 5},
            new int[] {-1, -1, -1},
            new int[] {0},
            new int[] {0, 1, 2},
            new int[] {2, 0, 1},
            new int[] {-1, -1, -1});

    private static TemperatureField field(DoubleBinaryOperator f) {
        double[] kelvin = new double[6];
        for (int i = 0; i < 6; i++) {
            kelvin[i] = f.applyAsDouble(TRIANGLE.x(i), TRIANGLE.y(i));
        }
        return new TemperatureField(TRIANGLE, kelvin);
    }

    @Test
    void findsThePeakInsideATriangle() {
        TemperatureField field =
                field((x, y) -> 300 - (x - 1) * (x - 1) - 2 * (y - 1.5) * (y - 1.5) + 0.3 * (x - 1) * (y - 1.5));
        Extreme peak = ExtremeFinder.overTriangles(field, t -> true, true);
        assertThat(peak.kelvin()).isCloseTo(300, within(1e-12));
        assertThat(peak.x()).isCloseTo(1, within(1e-12));
        assertThat(peak.y()).isCloseTo(1.5, within(1e-12));
    }

    @Test
    void findsThePeakOnASide() {
        TemperatureField field = field((x, y) -> 300 - (x - 1) * (x - 1) - y);
        Extreme peak = ExtremeFinder.overTriangles(field, t -> true, true);
        assertThat(peak.kelvin()).isCloseTo(300, within(1e-12));
        assertThat(peak.x()).isCloseTo(1, within(1e-12));
        assertThat(peak.y()).isCloseTo(0, within(1e-12));
        Extreme along = ExtremeFinder.overFacets(field, new int[] {0, 1, 2}, true);
        assertThat(along).isEqualTo(peak);
    }

    @Test
    void findsTheLowestAtACorner() {
        TemperatureField field = field((x, y) -> 300 + x + 2 * y);
        Extreme lowest = ExtremeFinder.overTriangles(field, t -> true, false);
        assertThat(lowest).isEqualTo(new Extreme(300, 0, 0));
    }

    @Test
    void aSaddleHasItsPeakOnTheBoundary() {
        TemperatureField field = field((x, y) -> 300 + (x - 1) * (x - 1) - (y - 1) * (y - 1));
        Extreme peak = ExtremeFinder.overTriangles(field, t -> true, true);
        assertThat(peak.kelvin()).isCloseTo(308, within(1e-12));
        assertThat(peak.x()).isCloseTo(4, within(1e-12));
    }
}
