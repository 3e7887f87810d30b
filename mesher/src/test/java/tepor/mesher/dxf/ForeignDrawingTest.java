package tepor.mesher.dxf;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.outline.DrawingUnit;

/**
 * Drawings in three releases of the format which a library wrote that has nothing to do with this reader: ezdxf 1.4.4 (MIT
 * licence). Areas in closed form, that of the spline from 20,000 points of the same library.
 */
class ForeignDrawingTest {
    private static final double SPLINE = 7_166.559;

    private static DrawnDxf read(String release) throws IOException {
        try (InputStream in = ForeignDrawingTest.class.getResourceAsStream("written-" + release + ".dxf")) {
            Optional<DrawingUnit> unit =
                    release.equals("R12") ? Optional.of(new DrawingUnit("mm", 1e-3)) : Optional.empty();
            DrawnDxf drawn = DrawnDxf.read(in.readAllBytes(), unit, 1e-7);
            assertThat(drawn.findings.all())
                    .extracting(f -> f.what())
                    .containsExactly(
                            "2 entities are passed over: 1 TEXT on layer '0', 1 DIMENSION on layer '0' (kinds that"
                                    + " draw no outline)");
            return drawn;
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"R12", "R2007", "R2018"})
    void areasAreThoseThatWereWritten(String release) throws IOException {
        DrawnDxf drawn = read(release);
        // a ring of two circles
        assertThat(drawn.area("disc") * 1e6).isCloseTo(Math.PI * (100 * 100 - 60 * 60), within(1e-6));
        // a slot of two lines and two half circles
        assertThat(drawn.area("plate") * 1e6).isCloseTo(200 * 80 + Math.PI * 40 * 40, within(1e-6));
        // a square with a half circle added (bulge 1), and a segment cut off (bulge -0.5)
        double turn = 4 * Math.atan(0.5);
        double radius = 100 * (1 + 0.25) / (4 * 0.5);
        double segment = 0.5 * radius * radius * (turn - Math.sin(turn));
        assertThat(drawn.area("lw") * 1e6).isCloseTo(100 * 100 + Math.PI * 50 * 50 / 2 - segment, within(1e-6));
        // six insertions of a block, a square of 10 with a hole of radius 2, scaled by 2 and -3 and turned; the holes
        // become ellipses
        assertThat(drawn.area("hülle") * 1e6).isCloseTo(36 * (100 - 4 * Math.PI), within(1e-2));
        if (!release.equals("R12")) {
            assertThat(drawn.area("ell") * 1e6).isCloseTo(Math.PI * (80 * 80 + 20 * 20) * 0.4, within(0.1));
            assertThat(drawn.area("spl") * 1e6).isCloseTo(SPLINE, within(0.3));
        }
    }
}
