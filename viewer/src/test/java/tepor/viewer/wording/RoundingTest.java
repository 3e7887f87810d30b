package tepor.viewer.wording;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RoundingTest {
    @ParameterizedTest
    @CsvSource({
        "96.3712345, 0.05, 96.371",
        "96.3712345, 0.0012, 96.3712",
        "96.3712345, 3, 96.4",
        "96.3712345, 40, 96",
        "-0.001, 3, 0.0",
        "1234567.8, 250, 1234568",
        "150, 1.8e-13, 150.0000",
        "42, 0, 42.0000",
        "0, 0, 0.00000",
        "0.000012345678, 1e-9, 1.23457e-5",
        "42, NaN, 42.0000",
        "NaN, 1, unknown",
    })
    void showsAValueToTheSecondDigitOfItsError(double value, double error, String text) {
        assertThat(Rounding.value(value, error)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "0.0501, 0.051",
        "0.05, 0.050",
        "0.0999, 0.10",
        "123, 130",
        "0, 0",
        "1e-12, 1.0e-12",
        "Infinity, unknown"
    })
    void neverSaysAnErrorIsSmallerThanItIs(double error, String text) {
        assertThat(Rounding.error(error)).isEqualTo(text);
    }

    @Test
    void dropsIdleZeros() {
        assertThat(Rounding.significant(0.65, 6)).isEqualTo("0.65");
        assertThat(Rounding.significant(-42, 6)).isEqualTo("-42");
        assertThat(Rounding.significant(1.2e12, 3)).isEqualTo("1.2e12");
        assertThat(Rounding.significant(3.14159e-13, 2)).isEqualTo("3.1e-13");
    }
}
