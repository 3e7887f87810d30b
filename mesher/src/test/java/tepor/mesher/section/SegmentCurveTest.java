package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import tepor.mesher.outline.Circle;

class SegmentCurveTest {
    private static final Circle CIRCLE = new Circle(1, 2, 5);

    /** On the circle at an angle in degrees. */
    private static double x(double degrees) {
        return 1 + 5 * Math.cos(Math.toRadians(degrees));
    }

    private static double y(double degrees) {
        return 2 + 5 * Math.sin(Math.toRadians(degrees));
    }

    @Test
    void pointsRunAlongTheShorterArcWithinTheTolerance() {
        for (double to : new double[] {190, 60}) {
            double[] xy = SegmentCurve.points(CIRCLE, x(130), y(130), x(to), y(to), 1e-3);
            assertThat(xy[0]).isEqualTo(x(130));
            assertThat(xy[xy.length - 1]).isEqualTo(y(to));
            double length = 0;
            for (int i = 0; i + 3 < xy.length; i += 2) {
                assertThat(CIRCLE.offset(xy[i], xy[i + 1])).isCloseTo(0, within(1e-14));
                double off = CIRCLE.offset(0.5 * (xy[i] + xy[i + 2]), 0.5 * (xy[i + 1] + xy[i + 3]));
                assertThat(off).isBetween(-1e-3, -2e-4);
                length += Math.hypot(xy[i + 2] - xy[i], xy[i + 3] - xy[i + 1]);
            }
            assertThat(length).isCloseTo(Math.toRadians(Math.abs(to - 130)) * 5, within(1e-3));
        }
    }

    @Test
    void aStraightSegmentIsItsEnds() {
        assertThat(SegmentCurve.points(null, 1, 2, 3, 4, 1e-9)).containsExactly(1, 2, 3, 4);
        assertThat(SegmentCurve.direction(null, 1, 2, 1, 3)).isEqualTo(Math.PI / 2);
    }

    @Test
    void anArcLeavesAlongItsTangent() {
        // counter-clockwise from 130° the tangent points to 220°, clockwise to 40°
        double ccw = SegmentCurve.direction(CIRCLE, x(130), y(130), x(190), y(190));
        double cw = SegmentCurve.direction(CIRCLE, x(130), y(130), x(60), y(60));
        assertThat(Math.IEEEremainder(ccw - Math.toRadians(220), 2 * Math.PI)).isCloseTo(0, within(1e-12));
        assertThat(Math.IEEEremainder(cw - Math.toRadians(40), 2 * Math.PI)).isCloseTo(0, within(1e-12));
    }
}
