package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Rectangle2D;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleMap;
import tepor.solver.assembly.Tensor;
import tepor.solver.field.FieldGradient;
import tepor.solver.field.TemperatureField;

class FluxArrowsTest {
    @Test
    void fluxIsMinusConductivityTimesGradient() {
        // T = 3x² − 2xy + y: ∇T = (6x − 2y, −2x + 1), at (0.3, 0.2) (1.4, 0.4); q = −k ∇T with kxx 2, kxy 0.5, kyy 1.
        Mesh mesh = PatternedGrid.rectangle(1, 1, 1, 1, (i, j) -> 0, "square").mesh(6);
        TemperatureField field = PatternedGrid.field(mesh, (x, y) -> 3 * x * x - 2 * x * y + y);
        double[] q = new double[2];
        int found = 0;
        TriangleMap map = new TriangleMap(mesh);
        double[] l = new double[3];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            map.moveTo(t);
            if (map.contains(0.3, 0.2) && map.locate(0.3, 0.2, l)) {
                FluxArrows.flux(new FieldGradient(field), t, new Tensor(2, 0.5, 1), l, q);
                found++;
            }
        }
        assertThat(found).isEqualTo(1);
        assertThat(q).containsExactly(new double[] {-(2 * 1.4 + 0.5 * 0.4), -(0.5 * 1.4 + 0.4)}, within(1e-11));
    }

    /** One arrow for each point of the pattern within the circles: rows √¾ apart, every other shifted by half; on the rim
     * a parabola is off its circle by up to Rφ⁴/32, 0.07 px of 500, so that a few points may change sides. */
    @Test
    void arrowsFillARoundRingToItsCircles() {
        PatternedGrid grid = PatternedGrid.ring(0.05, 0.1, 12, 2).rounded();
        TemperatureField field = PatternedGrid.field(grid.mesh(6), (x, y) -> 100 * x);
        SectionView view = new SectionView(grid.section(), new Rectangle2D.Double(0, 0, 1000, 1000), 1);
        int expected = 0;
        for (int row = 0; row * 7 * Math.sqrt(0.75) <= 1000; row++) {
            for (int column = 0; column * 7 <= 1000; column++) {
                double x = (column + 0.5 * (row % 2)) * 7 - 500;
                double y = row * 7 * Math.sqrt(0.75) - 500;
                expected += Math.hypot(x, y) < 500 && Math.hypot(x, y) > 250 ? 1 : 0;
            }
        }
        assertThat(new FluxArrows(
                                field,
                                new SampleAnswers("ring", grid).inspection().subject(),
                                view,
                                7)
                        .count())
                .isBetween(expected - 3, expected + 3);
    }
}
