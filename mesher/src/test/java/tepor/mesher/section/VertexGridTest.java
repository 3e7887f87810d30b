package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;

class VertexGridTest {
    /** Against a search of all, around the origin, where cell numbers change sign, and far from it. */
    @Test
    void findsTheNearestWithinReach() {
        for (double middle : new double[] {0, 1e6}) {
            Random random = new Random(5);
            VertexGrid grid = new VertexGrid(0.1);
            int found = 0;
            for (int i = 0; i < 3000; i++) {
                double x = middle + 4 * random.nextDouble() - 2;
                double y = 4 * random.nextDouble() - 2 - middle;
                int best = -1;
                double least = 0.1;
                for (int v = 0; v < grid.count(); v++) {
                    double distance = Math.hypot(grid.x(v) - x, grid.y(v) - y);
                    if (distance < least) {
                        least = distance;
                        best = v;
                    }
                }
                assertThat(grid.nearest(x, y)).isEqualTo(best);
                found += best >= 0 ? 1 : 0;
                grid.add(x, y);
            }
            assertThat(found).isGreaterThan(1000);
        }
    }

    @Test
    void mergesWithWhatIsThere() {
        VertexGrid grid = new VertexGrid(1e-3);
        assertThat(grid.merge(0.9995, 0)).isZero();
        assertThat(grid.merge(1.0004, 0)).isZero();
        assertThat(grid.merge(1.0006, 0)).isEqualTo(1);
        assertThat(grid.x(0)).isEqualTo(0.9995);
        assertThat(grid.count()).isEqualTo(2);
    }
}
