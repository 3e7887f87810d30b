package tepor.solver.trust;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class ConvergenceTest {
    private static Convergence of(double... values) {
        Convergence convergence = new Convergence();
        int triangles = 100;
        for (double v : values) {
            convergence.add(v, 1.0, triangles);
            triangles *= 2;
        }
        return convergence;
    }

    @Test
    void nothingIsKnownAfterOneRound() {
        assertThat(of(5).error()).isInfinite();
        assertThat(of(5).settled()).isFalse();
    }

    @Test
    void isSettledAfterTwoSmallMovementsRunning() {
        assertThat(of(5, 5.2).settled()).isFalse();
        assertThat(of(5, 5.2, 5.3).settled()).isTrue();
        assertThat(of(5, 5.3, 5.4).settled()).isFalse();
        assertThat(of(5, 5.2, 5.5).settled()).isFalse();
        assertThat(of(5, 5.3, 5.4, 5.3).settled()).isTrue();
        assertThat(of(5, 5, 5).settled()).isTrue();
    }

    @Test
    void errorIsThreeTimesTheLastMovementOrHalfTheOneBefore() {
        assertThat(of(5, 5.2).error()).isCloseTo(0.6, within(1e-12));
        assertThat(of(5, 5.2, 5.1).error()).isCloseTo(0.3, within(1e-12));
        assertThat(of(5, 5.2, 5.21).error()).isCloseTo(0.3, within(1e-12));
        assertThat(of(5, 5, 5).error()).isCloseTo(5e-9, within(1e-15));
    }

    @Test
    void aMovementOnAMeshThatHardlyGrewCountsForMore() {
        Convergence convergence = new Convergence();
        convergence.add(5, 1.0, 1000);
        convergence.add(5.1, 1.0, 1500);
        assertThat(convergence.error()).isCloseTo(0.6, within(1e-12));
        convergence.add(5.11, 1.0, 1600);
        assertThat(convergence.error()).isCloseTo(3 * 0.01 / 0.0667, within(1e-3));
        assertThat(convergence.settled()).isTrue();
        convergence.add(5.1, 1.0, 1600);
        assertThat(convergence.error()).isCloseTo(3 * 0.01 / 0.05, within(1e-9));
    }
}
