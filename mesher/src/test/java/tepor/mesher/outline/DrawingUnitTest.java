package tepor.mesher.outline;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class DrawingUnitTest {
    private static final DrawingUnit METRE = new DrawingUnit("m", 1);
    private static final DrawingUnit MILLIMETRE = new DrawingUnit("mm", 0.001);

    @Test
    void aPointFarFromTheOriginKeepsItsLastFigures() {
        assertThat(METRE.point(1e6, 1e6 + 0.2)).isEqualTo("(1000000 1000000.2) m");
        assertThat(MILLIMETRE.point(1e3, -1e3 - 0.0002)).isEqualTo("(1000000 -1000000.2) mm");
    }

    @Test
    void zerosThatSayNothingAreLeftOut() {
        assertThat(METRE.point(1e-6, 0)).isEqualTo("(1e-06 0) m");
        assertThat(METRE.length(1e-6)).isEqualTo("1e-06 m");
        assertThat(METRE.length(2.5e-7)).isEqualTo("2.5e-07 m");
        assertThat(METRE.length(1200)).isEqualTo("1200 m");
        assertThat(MILLIMETRE.length(0.0201)).isEqualTo("20.1 mm");
    }
}
