package tepor.solver.bracket;

import java.util.function.DoubleUnaryOperator;

/**
 * Integrals over an interval: of 1/f for f linear in closed form, of others by Gauss–Legendre quadrature with sixteen points
 * (Abramowitz & Stegun 25.4.29; nodes found by Newton's method).
 */
final class Integral {
    private static final int POINTS = 16;
    private static final double[] NODE = new double[POINTS];
    private static final double[] WEIGHT = new double[POINTS];

    static {
        for (int i = 0; i < POINTS; i++) {
            double x = Math.cos(Math.PI * (i + 0.75) / (POINTS + 0.5));
            double slope = 1;
            for (int step = 0; step < 20; step++) {
                double previous = 1;
                double value = x;
                for (int n = 2; n <= POINTS; n++) {
                    double next = ((2 * n - 1) * x * value - (n - 1) * previous) / n;
                    previous = value;
                    value = next;
                }
                slope = POINTS * (x * value - previous) / (x * x - 1);
                x -= value / slope;
            }
            NODE[i] = x;
            WEIGHT[i] = 2 / ((1 - x * x) * slope * slope);
        }
    }

    private Integral() {}

    /** ∫ f from a to b, f being smooth up to the ends. */
    static double of(double a, double b, DoubleUnaryOperator f) {
        double sum = 0;
        for (int i = 0; i < POINTS; i++) {
            sum += WEIGHT[i] * f.applyAsDouble(0.5 * (a + b) + 0.5 * (b - a) * NODE[i]);
        }
        return 0.5 * (b - a) * sum;
    }

    /** ∫ f from a to b, f behaving as a square root does at the ends: with x = a + (b − a) sin²φ it becomes smooth. */
    static double withRoots(double a, double b, DoubleUnaryOperator f) {
        return of(0, Math.PI / 2, phi -> {
            double sine = Math.sin(phi);
            return f.applyAsDouble(a + (b - a) * sine * sine) * (b - a) * Math.sin(2 * phi);
        });
    }

    /** ∫ dx / f(x) over a length, f being linear from a to b, both at least zero; infinite where one is zero. */
    static double ofInverse(double length, double a, double b) {
        double mean = 0.5 * (a + b);
        double relative = (b - a) / mean;
        if (Math.abs(relative) < 1e-4) {
            // ln(b/a)/(b − a) by its series about the mean: differences of close numbers lose their digits.
            return length / mean * (1 + relative * relative / 12);
        }
        return length * Math.log(b / a) / (b - a);
    }
}
