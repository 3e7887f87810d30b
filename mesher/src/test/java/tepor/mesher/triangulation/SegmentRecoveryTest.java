package tepor.mesher.triangulation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class SegmentRecoveryTest {
    @Test
    void thousandRandomSegmentsAreRecovered() {
        double[] xy = segments(1000, new Random(11));
        Predicates predicates = new Predicates();
        Triangulation mesh = DelaunayBuilder.build(xy, predicates);
        SegmentRecovery recovery = new SegmentRecovery(mesh, predicates);
        for (int s = 0; s < 1000; s++) {
            recovery.recover(2 * s, 2 * s + 1, 2 * s);
        }
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();
        boolean[] found = new boolean[1000];
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            int code = mesh.constraint(side);
            if (code >= 0) {
                assertThat(mesh.origin(side)).isEqualTo(code);
                assertThat(mesh.destination(side)).isEqualTo(code ^ 1);
                found[code / 2] = true;
            }
        }
        assertThat(found).doesNotContain(false);
    }

    @Test
    void vertexOnASegmentDividesIt() {
        double[] xy = {0, 0, 4, 0, 1, 0, 3, 0, 2, 1, 2, -1, 1.5, 0.1, 2.5, -0.1};
        Predicates predicates = new Predicates();
        Triangulation mesh = DelaunayBuilder.build(xy, predicates);
        new SegmentRecovery(mesh, predicates).recover(0, 1, 0);
        List<String> pieces = new ArrayList<>();
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            if (mesh.constraint(side) == 0) {
                pieces.add(mesh.origin(side) + "-" + mesh.destination(side));
            }
        }
        assertThat(pieces).containsExactlyInAnyOrder("0-2", "2-3", "3-1");
        assertThat(DelaunayCheck.problems(mesh)).isEmpty();
    }

    @Test
    void segmentsThatCrossAreRefusedWithTheirNumbers() {
        double[] xy = {0, 0, 1, 1, 0, 1, 1, 0};
        Predicates predicates = new Predicates();
        Triangulation mesh = DelaunayBuilder.build(xy, predicates);
        SegmentRecovery recovery = new SegmentRecovery(mesh, predicates);
        recovery.recover(0, 1, 2 * 7);
        assertThatThrownBy(() -> recovery.recover(2, 3, 2 * 9))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("segments cross: number 9 and number 7");
    }

    // Segments of random place and direction, kept if they cross none before.
    private static double[] segments(int count, Random random) {
        double[] xy = new double[4 * count];
        Predicates p = new Predicates();
        int n = 0;
        while (n < count) {
            double length = Math.pow(10, n < 20 ? -0.3 : -1 - 2 * random.nextDouble());
            double angle = 2 * Math.PI * random.nextDouble();
            double ax = random.nextDouble();
            double ay = random.nextDouble();
            double[] s = {ax, ay, ax + length * Math.cos(angle), ay + length * Math.sin(angle)};
            boolean free = true;
            for (int i = 0; i < n && free; i++) {
                free = !cross(p, xy, 4 * i, s);
            }
            if (free) {
                System.arraycopy(s, 0, xy, 4 * n++, 4);
            }
        }
        return xy;
    }

    private static boolean cross(Predicates p, double[] xy, int at, double[] s) {
        double ax = xy[at];
        double ay = xy[at + 1];
        double bx = xy[at + 2];
        double by = xy[at + 3];
        return p.orientation(ax, ay, bx, by, s[0], s[1]) > 0 != p.orientation(ax, ay, bx, by, s[2], s[3]) > 0
                && p.orientation(s[0], s[1], s[2], s[3], ax, ay) > 0
                        != p.orientation(s[0], s[1], s[2], s[3], bx, by) > 0;
    }
}
