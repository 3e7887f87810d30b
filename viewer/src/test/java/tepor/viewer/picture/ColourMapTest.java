package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import org.junit.jupiter.api.Test;

class ColourMapTest {
    @Test
    void lightnessRisesStrictlyFromColdToWarm() {
        for (int bands = 2; bands <= 16; bands++) {
            for (int i = 1; i < bands; i++) {
                assertThat(ColourMap.lightness(ColourMap.ofBand(i, bands)))
                        .as("band %d of %d", i, bands)
                        .isGreaterThan(ColourMap.lightness(ColourMap.ofBand(i - 1, bands)) + 3);
            }
        }
    }

    @Test
    void lightnessStepsAreEven() {
        double whole = ColourMap.lightness(ColourMap.at(1)) - ColourMap.lightness(ColourMap.at(0));
        for (int i = 1; i <= 20; i++) {
            double step =
                    ColourMap.lightness(ColourMap.at(i / 20.0)) - ColourMap.lightness(ColourMap.at((i - 1) / 20.0));
            assertThat(step).isBetween(0.75 * whole / 20, 1.3 * whole / 20);
        }
    }

    @Test
    void endsAreThoseOfThePublishedMap() {
        // Ends of cividis as d3-scale-chromatic 3.1.1 gives them: interpolateCividis(0) and (1).
        assertThat(ColourMap.at(0)).isEqualTo(new Color(0, 32, 81));
        assertThat(ColourMap.at(1)).isEqualTo(new Color(253, 234, 69));
    }

    @Test
    void lightnessOfKnownColours() {
        // CIE 15:2004: L* is 100 for the white point and 0 for black; sRGB mid grey 119 has L* 50.03 (worked by hand).
        assertThat(ColourMap.lightness(Color.WHITE)).isCloseTo(100, within(1e-3));
        assertThat(ColourMap.lightness(Color.BLACK)).isZero();
        assertThat(ColourMap.lightness(new Color(119, 119, 119))).isCloseTo(50.03, within(0.02));
    }
}
