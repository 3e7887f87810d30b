package tepor.mesher.triangulation;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PredicatesTest {
    private final Predicates predicates = new Predicates();

    @Test
    void orientationNearALineHasTheSignOfExactArithmetic() {
        // The grid of neighbouring doubles of Kettner et al. 2008, Classroom examples of robustness problems, fig. 2.
        double ulp = Math.ulp(0.5);
        for (int i = 0; i < 64; i++) {
            for (int j = 0; j < 64; j++) {
                double x = 0.5 + i * ulp;
                double y = 0.5 + j * ulp;
                assertThat(Math.signum(predicates.orientation(x, y, 12, 12, 24, 24)))
                        .isEqualTo(orientationSign(x, y, 12, 12, 24, 24));
            }
        }
        assertThat(predicates.exactOrientations()).isPositive();
    }

    @ParameterizedTest
    @CsvSource({"1, 0", "1e-9, 0", "1e9, 0", "1, 1e6", "1e-9, 1e-3", "1e9, 1e15"})
    void inCircleNearACircleHasTheSignOfExactArithmetic(double scale, double offset) {
        Random random = new Random(7);
        for (int n = 0; n < 400; n++) {
            double[] p = new double[8];
            double start = random.nextDouble();
            for (int i = 0; i < 4; i++) {
                double angle = 2 * Math.PI * (start + 0.25 * (i + 0.9 * random.nextDouble()));
                p[2 * i] = offset + scale * Math.cos(angle);
                p[2 * i + 1] = offset + scale * Math.sin(angle);
            }
            if (orientationSign(p[0], p[1], p[2], p[3], p[4], p[5]) > 0) {
                assertThat(Math.signum(predicates.inCircle(p[0], p[1], p[2], p[3], p[4], p[5], p[6], p[7])))
                        .isEqualTo(inCircleSign(p));
            }
        }
    }

    @Test
    void pointsOfAGridOnOneCircleGiveZero() {
        // Twelve grid points lie on the circle of radius 5; tenths of them are rounded, but not these multiples of
        // 2^-10.
        double s = Math.scalb(1.0, -10);
        assertThat(predicates.inCircle(5 * s, 0, 3 * s, 4 * s, -4 * s, 3 * s, 0, -5 * s))
                .isZero();
        assertThat(predicates.inCircle(5 * s, 0, 3 * s, 4 * s, -4 * s, 3 * s, 0, Math.nextUp(-5 * s)))
                .isPositive();
        assertThat(predicates.inCircle(5 * s, 0, 3 * s, 4 * s, -4 * s, 3 * s, 0, Math.nextDown(-5 * s)))
                .isNegative();
        assertThat(predicates.exactInCircles()).isEqualTo(3);
    }

    @Test
    void clearCasesNeedNoExactArithmetic() {
        assertThat(predicates.orientation(0, 0, 1, 0, 0, 1)).isEqualTo(1);
        assertThat(predicates.inCircle(0, 0, 1, 0, 0, 1, 0.5, 0.5)).isPositive();
        assertThat(predicates.inCircle(0, 0, 1, 0, 0, 1, 2, 2)).isNegative();
        assertThat(predicates.exactOrientations() + predicates.exactInCircles()).isZero();
    }

    private static double orientationSign(double ax, double ay, double bx, double by, double cx, double cy) {
        return cross(minus(ax, cx), minus(ay, cy), minus(bx, cx), minus(by, cy)).signum();
    }

    private static double inCircleSign(double[] p) {
        BigDecimal[] dx = new BigDecimal[3];
        BigDecimal[] dy = new BigDecimal[3];
        for (int i = 0; i < 3; i++) {
            dx[i] = minus(p[2 * i], p[6]);
            dy[i] = minus(p[2 * i + 1], p[7]);
        }
        BigDecimal sum = BigDecimal.ZERO;
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            BigDecimal lift = dx[i].multiply(dx[i]).add(dy[i].multiply(dy[i]));
            sum = sum.add(lift.multiply(cross(dx[j], dy[j], dx[k], dy[k])));
        }
        return sum.signum();
    }

    private static BigDecimal minus(double a, double b) {
        return new BigDecimal(a).subtract(new BigDecimal(b));
    }

    private static BigDecimal cross(BigDecimal ax, BigDecimal ay, BigDecimal bx, BigDecimal by) {
        return ax.multiply(by).subtract(ay.multiply(bx));
    }
}
