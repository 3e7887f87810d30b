package tepor.solver.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class UnitsTest {
    @ParameterizedTest
    @CsvSource({
        "293.15, degC, TEMPERATURE, 20",
        "20, degC, TEMPERATURE_DIFFERENCE, 20",
        "308.15, degF, TEMPERATURE, 95",
        "5, degF, TEMPERATURE_DIFFERENCE, 9",
        "293.15, K, TEMPERATURE, 293.15",
        "0.005, mm, LENGTH, 5",
        "0.5235987755982988, deg, ANGLE, 30",
        "0.9, %, NUMBER, 90",
        "1.730734666, Btu/(h.ft.degF), CONDUCTIVITY, 1"
    })
    void convertsFromSiAndBack(double si, String unit, Dimension dimension, double value) {
        assertThat(Units.fromSi(si, unit, dimension)).isCloseTo(value, within(1e-9 * value));
        assertThat(Units.toSi(value, unit, dimension)).isCloseTo(si, within(1e-9 * si));
    }

    @ParameterizedTest
    @CsvSource({
        "293.15,     degC,     TEMPERATURE,  20 degC",
        "369.5211,   degC,     TEMPERATURE,  96.3711 degC",
        "0.65,       W/(m.K),  CONDUCTIVITY, 0.65 W/(m.K)",
        "1234567.89, W/m3,     HEAT_PER_VOLUME, 1234570 W/m3",
        "1.2e9,      W/m3,     HEAT_PER_VOLUME, 1.2e9 W/m3",
        "0.0002,     m2.K/W,   RESISTANCE,   0.0002 m2.K/W",
        "0.0000123456789, m2.K/W, RESISTANCE, 1.23457e-5 m2.K/W",
        "-0.0000001, W, HEAT, -1e-7 W",
        "0, W, HEAT, 0 W",
        "0.75, '', NUMBER, 0.75"
    })
    void writesSixDigitsWithoutIdleZeros(double si, String unit, Dimension dimension, String text) {
        assertThat(Units.format(si, unit, dimension)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({
        "369.52, degC, TEMPERATURE, 0.2,   96.4 degC",
        "369.5,  degC, TEMPERATURE, 0.01,  96.35 degC",
        "293.15, degC, TEMPERATURE, 0.001, 20.000 degC",
        "308.15, degF, TEMPERATURE, 0.05,  95.00 degF",
        "42.123, W/m,  HEAT_PER_LENGTH, 0.4, 42.1 W/m",
        "-0.04,  W/m,  HEAT_PER_LENGTH, 0.4, 0.0 W/m",
        "42123,  W/m,  HEAT_PER_LENGTH, 400, 42100 W/m",
        "0.0051, mm,   LENGTH,      0.001, 5 mm"
    })
    void writesAsManyDecimalsAsAreKnown(double si, String unit, Dimension dimension, double resolution, String text) {
        assertThat(Units.format(si, unit, dimension, resolution)).isEqualTo(text);
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void theDefaultUnitMeasuresItsDimension(Dimension dimension) throws Exception {
        String text = Units.format(300, Units.defaultUnit(dimension), dimension);
        assertThat(QuantityReader.read(text, dimension).value()).isCloseTo(300, within(1e-2));
    }

    @ParameterizedTest
    @CsvSource({"mm, CONDUCTIVITY", "parsec, LENGTH"})
    void refusesAUnitOfAnotherDimension(String unit, Dimension dimension) {
        assertThatIllegalArgumentException().isThrownBy(() -> Units.fromSi(1, unit, dimension));
    }
}
