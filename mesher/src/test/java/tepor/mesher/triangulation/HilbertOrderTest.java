package tepor.mesher.triangulation;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HilbertOrderTest {
    @ParameterizedTest
    @ValueSource(ints = {32, 64, 256})
    void neighboursOnTheCurveAreNeighboursOnTheGrid(int n) {
        double[] xy = new double[2 * n * n];
        for (int i = 0; i < n * n; i++) {
            // Cell centres; the corners of the bounding box are cell centres too, so cells do not straddle.
            xy[2 * i] = i % n;
            xy[2 * i + 1] = i / n;
        }
        int[] order = HilbertOrder.alongCurve(xy);
        int jumps = 0;
        for (int i = 1; i < order.length; i++) {
            int dx = Math.abs(order[i] % n - order[i - 1] % n);
            int dy = Math.abs(order[i] / n - order[i - 1] / n);
            jumps += dx + dy == 1 ? 0 : 1;
        }
        assertThat(jumps).isLessThan(order.length / 20);
    }

    @Test
    void bothOrdersHaveEveryPointOnce() {
        double[] xy = new Random(1).doubles(2 * 5000).toArray();
        int[] all = IntStream.range(0, 5000).toArray();
        assertThat(Arrays.stream(HilbertOrder.alongCurve(xy)).sorted().toArray())
                .isEqualTo(all);
        assertThat(Arrays.stream(HilbertOrder.inRounds(xy)).sorted().toArray()).isEqualTo(all);
    }

    @Test
    void pointsAtOnePlaceKeepTheirOrder() {
        assertThat(HilbertOrder.alongCurve(new double[] {3, 3, 3, 3, 3, 3})).containsExactly(0, 1, 2);
    }

    @Test
    void roundsGrowTwofoldAndEachFollowsTheCurve() {
        double[] xy = new Random(2).doubles(2 * 20_000).toArray();
        int[] order = HilbertOrder.inRounds(xy);
        // The last round holds about half of all points; along a curve through them steps are short.
        double last = 0;
        for (int i = 11_000; i < 20_000; i++) {
            last += Math.hypot(
                    xy[2 * order[i]] - xy[2 * order[i - 1]], xy[2 * order[i] + 1] - xy[2 * order[i - 1] + 1]);
        }
        assertThat(last / 9000).isLessThan(1.5 / Math.sqrt(10_000));
    }
}
