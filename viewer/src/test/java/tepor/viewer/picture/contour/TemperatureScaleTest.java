package tepor.viewer.picture.contour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.viewer.picture.PatternedGrid;

class TemperatureScaleTest {
    @Test
    void isothermsAreWholeMultiplesOfA125StepWithinTheRange() {
        Random random = new Random(7);
        for (int k = 0; k < 500; k++) {
            double low = 173.15 + 300 * random.nextDouble();
            double spread = Math.pow(10, 6 * random.nextDouble() - 3);
            TemperatureRange range = new TemperatureRange(low, low + spread);
            TemperatureScale scale = TemperatureScale.of(range, 16);
            BigDecimal step = new BigDecimal(String.format(java.util.Locale.ROOT, "%.0e", scale.step()));
            assertThat(step.stripTrailingZeros().unscaledValue().intValue()).isIn(1, 2, 5);
            assertThat(scale.step()).isCloseTo(step.doubleValue(), within(1e-12 * scale.step()));
            assertThat(scale.bandCount()).as("bands of %s", range).isBetween(6, 16);
            for (int i = 0; i < scale.count(); i++) {
                BigDecimal written = BigDecimal.valueOf(scale.celsius(i))
                        .setScale(scale.decimals(), java.math.RoundingMode.HALF_EVEN);
                assertThat(written.remainder(step).signum())
                        .as(written + " by " + step)
                        .isZero();
                assertThat(scale.kelvin(i)).isStrictlyBetween(range.lowest(), range.highest());
            }
        }
    }

    @Test
    void aRangeThatEndsOnMultiplesCountsThemNotAsIsotherms() {
        TemperatureScale scale = TemperatureScale.of(new TemperatureRange(273.15 + 20, 273.15 + 90), 16);
        assertThat(scale.step()).isEqualTo(5);
        assertThat(scale.celsius(0)).isEqualTo(25);
        assertThat(scale.celsius(scale.count() - 1)).isEqualTo(85);
    }

    @Test
    void extremesInsideTrianglesCount() {
        // A paraboloid whose summit lies in the middle of a triangle; nodes stay 0.3 K below it.
        Mesh mesh = PatternedGrid.rectangle(1, 1, 1, 1, (i, j) -> 0, "square").mesh(6);
        TemperatureRange range = TemperatureRange.of(
                PatternedGrid.field(mesh, (x, y) -> 50 - 9 * (x - 0.7) * (x - 0.7) - 7 * (y - 0.35) * (y - 0.35)));
        assertThat(range.highest() - 273.15).isCloseTo(50, within(1e-9));
    }

    @Test
    void extremesOnSidesCount() {
        Mesh mesh = PatternedGrid.rectangle(1, 1, 1, 1, (i, j) -> 0, "square").mesh(6);
        TemperatureRange range =
                TemperatureRange.of(PatternedGrid.field(mesh, (x, y) -> 20 + 8 * (x - 0.2) * (x - 0.2) + 3 * y));
        assertThat(range.lowest() - 273.15).isCloseTo(20, within(1e-9));
    }
}
