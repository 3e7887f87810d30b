package tepor.solver.trust;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import tepor.solver.CaseText;

class AskedSizesTest {
    @Test
    void sizesNearAnArcFollowTheArcAndNotItsChords() {
        AskedSizes sizes = new AskedSizes(CaseText.read("""
                format = 1
                [outline]
                unit = "m"
                [[region]]
                name = "plate"
                outline = "POLYGON ((-2 -2, 2 -2, 2 2, -2 2, -2 -2))"
                material = "steel"
                [material.steel]
                k = "50 W/(m.K)"
                [[edge]]
                name = "all"
                where = "outside"
                temperature = "20 degC"
                [[ask]]
                name = "hottest"
                peak = "plate"
                [mesh]
                size = "1 m"
                refine = [{ near = "CIRCULARSTRING (1 0, -1 0, 1 0)", size = "0.01 m" }]
                """));
        // Midway between two points of the circle 30° apart the chord sags by 0.034.
        double middle = Math.toRadians(15);
        assertThat(sizes.at(Math.cos(middle), Math.sin(middle))).isCloseTo(0.01, within(3e-4));
        assertThat(sizes.at(0, 0)).isCloseTo(0.01 + 0.4, within(3e-4));
    }
}
