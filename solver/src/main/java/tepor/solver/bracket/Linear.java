package tepor.solver.bracket;

/** Integrals of functions that are linear between two ends. */
final class Linear {
    private Linear() {}

    /** ∫ dx / f(x) over a length, f being linear from a to b, both at least zero; infinite where one is zero. */
    static double integralOfInverse(double length, double a, double b) {
        double mean = 0.5 * (a + b);
        double relative = (b - a) / mean;
        if (Math.abs(relative) < 1e-4) {
            // ln(b/a)/(b − a) by its series about the mean: differences of close numbers lose their digits.
            return length / mean * (1 + relative * relative / 12);
        }
        return length * Math.log(b / a) / (b - a);
    }
}
