package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

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
            if (FluxArrows.isIn(map, 0.3, 0.2, l)) {
                FluxArrows.flux(new FieldGradient(field), t, new Tensor(2, 0.5, 1), l, q);
                found++;
            }
        }
        assertThat(found).isEqualTo(1);
        assertThat(q).containsExactly(new double[] {-(2 * 1.4 + 0.5 * 0.4), -(0.5 * 1.4 + 0.4)}, within(1e-11));
    }
}
