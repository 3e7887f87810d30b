package tepor.solver.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TriangleQuadratureTest {
    /** ∫ λ₀^a λ₁^b λ₂^c = 2·area·a!b!c!/(a+b+c+2)! (M. A. Eisenberg and L. E. Malvern, IJNME 7 (1973) 574). */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 4, 6})
    void integratesEveryMonomialOfItsDegreeExactly(int degree) {
        TriangleQuadrature rule = TriangleQuadrature.ofDegree(degree);
        for (int a = 0; a <= degree; a++) {
            for (int b = 0; a + b <= degree; b++) {
                for (int c = 0; a + b + c <= degree; c++) {
                    double sum = 0;
                    for (int p = 0; p < rule.pointCount(); p++) {
                        sum += rule.weight()[p]
                                * Math.pow(rule.l0()[p], a)
                                * Math.pow(rule.l1()[p], b)
                                * Math.pow(rule.l2()[p], c);
                    }
                    double exact = 2 * factorial(a) * factorial(b) * factorial(c) / factorial(a + b + c + 2);
                    assertThat(sum).as("λ₀^%d λ₁^%d λ₂^%d", a, b, c).isCloseTo(exact, within(1e-15));
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 4, 6})
    void doesNotIntegrateTheNextDegree(int degree) {
        TriangleQuadrature rule = TriangleQuadrature.ofDegree(degree);
        double sum = 0;
        for (int p = 0; p < rule.pointCount(); p++) {
            sum += rule.weight()[p] * Math.pow(rule.l0()[p], degree + 1);
        }
        double exact = 2.0 * factorial(degree + 1) / factorial(degree + 3);
        assertThat(Math.abs(sum - exact)).isGreaterThan(1e-7);
    }

    private static double factorial(int n) {
        return n < 2 ? 1 : n * factorial(n - 1);
    }
}
