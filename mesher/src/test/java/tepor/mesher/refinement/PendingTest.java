package tepor.mesher.refinement;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class PendingTest {
    @Test
    void trianglesWithShortSidesComeFirstThenInTurn() {
        PendingTriangles pending = new PendingTriangles(1);
        pending.add(1, 11, 0, 1e-2);
        pending.add(2, 12, 0, 1e-6);
        pending.add(3, 13, 0, 1e-6);
        pending.add(4, 14, 0, 0.5);
        pending.add(5, 15, 0, 1e-30);
        int[] taken = new int[5];
        for (int i = 0; i < 5; i++) {
            taken[i] = pending.take();
            assertThat(pending.takenVersion()).isEqualTo(10 + taken[i]);
        }
        assertThat(taken).containsExactly(5, 2, 3, 1, 4);
        assertThat(pending.take()).isNegative();
    }

    @Test
    void manyTrianglesAreAllGivenBack() {
        PendingTriangles pending = new PendingTriangles(1);
        long sum = 0;
        for (int i = 0; i < 5000; i++) {
            pending.add(i, 0, 0, 1.0 / (1 + i));
            if (i % 3 == 0) {
                sum += pending.take();
            }
        }
        for (int t = pending.take(); t >= 0; t = pending.take()) {
            sum += t;
        }
        assertThat(sum).isEqualTo(5000L * 4999 / 2);
    }

    @Test
    void patchesComeOneAfterTheOtherAndRoundAgain() {
        PendingTriangles pending = new PendingTriangles(1);
        pending.divide(3);
        pending.add(1, 0, 2, 1e-9);
        pending.add(2, 0, 0, 1);
        pending.add(3, 0, 0, 0.1);
        assertThat(pending.take()).isEqualTo(3);
        assertThat(pending.take()).isEqualTo(2);
        assertThat(pending.take()).isEqualTo(1);
        pending.add(4, 0, 1, 1e-9);
        pending.add(5, 0, 2, 1);
        assertThat(pending.take()).isEqualTo(5);
        assertThat(pending.take()).isEqualTo(4);
        assertThat(pending.take()).isNegative();
    }

    @Test
    void subsegmentsComeInTurn() {
        PendingSubsegments pending = new PendingSubsegments();
        int next = 0;
        for (int i = 0; i < 3000; i++) {
            pending.add(i, -i);
            if (i % 2 == 0) {
                assertThat(pending.take()).isEqualTo(next++);
            }
        }
        while (next < 3000) {
            assertThat(pending.take()).isEqualTo(next);
            assertThat(pending.takenVersion()).isEqualTo(-next++);
        }
        assertThat(pending.take()).isNegative();
    }
}
