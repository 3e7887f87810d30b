package tepor.solver.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class FaultyQuantityTest {
    /** Text, dimension wanted, words of the message, words of the remedy. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                // products after a quotient
                "0.65 W/mK           | CONDUCTIVITY | two ways               | is W/(m.K) meant?",
                "0.65 W/(mK)         | CONDUCTIVITY | two ways               | is W/(m.K) meant?",
                "0.65 W/m.K          | CONDUCTIVITY | two ways               | is W/(m.K) meant?",
                "0.65 W/m·K          | CONDUCTIVITY | two ways               | is W/(m.K) meant?",
                "0.65 W/m K          | CONDUCTIVITY | two ways               | is W/(m.K) meant?",
                "8 W/m2K             | FILM         | two ways               | is W/(m2.K) meant?",
                "8 W/m²K             | FILM         | 'W/m²K'                | is W/(m2.K) meant?",
                "8 W/m^2K            | FILM         | two ways               | is W/(m2.K) meant?",
                "8 W/m2.K            | FILM         | two ways               | is W/(m2.K) meant?",
                "1000 J/kg.K         | HEAT_CAPACITY| two ways               | is J/(kg.K) meant?",
                "1000 J/kgK          | HEAT_CAPACITY| 'kgK' is not known     | is kg.K meant?",
                // units missing, unknown, or of the wrong dimension
                "0.65                | CONDUCTIVITY | '0.65' has no unit     | a conductivity, such as 0.65 W/(m.K): 0.65 W/(m.K)?",
                "0.65 ± 10 %         | CONDUCTIVITY | has no unit            | W/(m.K)",
                "5 mm                | CONDUCTIVITY | is a length            | a conductivity, such as 0.65 W/(m.K)",
                "0.65 W/(m.K)        | FILM         | is a conductivity      | a film coefficient, such as 8 W/(m2.K)",
                "8 W/(m2.K)          | RESISTANCE   | is a film coefficient  | such as 0.13 m2.K/W",
                "5 kg                | LENGTH       | measures something else| a length",
                "20 degC             | CONDUCTIVITY | is a temperature       | a conductivity",
                "0.9 m               | NUMBER       | is a length            | a pure number, such as 0.9",
                "30 deg              | NUMBER       | is an angle            | a pure number",
                "30                  | ANGLE        | has no unit            | such as 30 deg",
                "30 %                | ANGLE        | is a pure number       | an angle",
                "10 %                | CONDUCTIVITY | is a pure number       | a conductivity",
                "0.2 degC            | TEMPERATURE_DIFFERENCE | on a scale   | give it in K: 0.2 K",
                "0.9 degF            | TEMPERATURE_DIFFERENCE | on a scale   | give it in K: 0.5 K",
                "20 C                | TEMPERATURE  | 'C' is not known       | is degC meant?",
                "20 F                | TEMPERATURE  | 'F' is not known       | is degF meant?",
                "20 deg              | TEMPERATURE  | is an angle            | such as 20 degC",
                "20 celsius          | TEMPERATURE  | 'celsius' is not known | is degC meant?",
                "1 BTU/h             | HEAT         | 'BTU' is not known     | is Btu meant?",
                "1 Btu/hr            | HEAT         | 'hr' is not known      | is h meant?",
                "5 inch              | LENGTH       | 'inch' is not known    | is in meant?",
                "90 w                | HEAT         | 'w' is not known       | is W meant?",
                "90 Wh               | HEAT         | 'Wh' is not known      | is W.h meant?",
                "90 parsec           | LENGTH       | 'parsec' is not known  | use SI units",
                "0.65 xW/(m.K)       | CONDUCTIVITY | 'xW' is not known      | is W meant?",
                // numbers
                "1,5 mm              | LENGTH       | has a comma            | 1.5 mm",
                ",5 mm               | LENGTH       | has a comma            | 0.5 mm",
                "1,000 W             | HEAT         | has a comma            | nothing between thousands",
                "1,000,000 W         | HEAT         | groups its digits      | 1000000 W",
                "1 000 W             | HEAT         | groups its digits      | 1000 W",
                "1_000 W             | HEAT         | groups its digits      | 1000 W",
                "NaN W               | HEAT         | not a finite number    | finite decimal",
                "inf W               | HEAT         | not a finite number    | finite decimal",
                "-Infinity K         | TEMPERATURE  | not a finite number    | finite decimal",
                "∞ W                 | HEAT         | not a finite number    | finite decimal",
                "1e400 W             | HEAT         | too large              | finite",
                "1e308 km            | LENGTH       | too large              | finite",
                "1e-400 W            | HEAT         | too small              | 0",
                "0x1p3 W             | HEAT         | hexadecimal            | decimal number",
                "0xA W               | HEAT         | hexadecimal            | decimal number",
                "2·10^-4 m2.K/W      | RESISTANCE   | power of ten           | 2e-4",
                "2 x 10-4 m2.K/W     | RESISTANCE   | 'x' is not known       | SI units",
                "20-30 W             | HEAT         | is a range             | ± 5",
                "20 – 30 W           | HEAT         | is a range             | ± 5",
                "1.2.3 W             | HEAT         | no decimal number      | 0.65",
                "1e W                | HEAT         | no decimal number      | 6.5e-1",
                "--5 W               | HEAT         | does not begin with a number | number first",
                "W                   | HEAT         | does not begin with a number | number first",
                "< 5 W               | HEAT         | does not begin with a number | number first",
                // temperatures
                "-300 degC           | TEMPERATURE  | below absolute zero    | -273.15 degC",
                "-1 K                | TEMPERATURE  | below absolute zero    | 0 K",
                "-500 degF           | TEMPERATURE  | below absolute zero    | -459.67 degF",
                "1 ± 2 K             | TEMPERATURE  | below absolute zero    | smaller spread",
                // spreads
                "35 degC ± 10 %      | TEMPERATURE  | percent of degC        | 35 ± 2 degC",
                "95 ± 10 % degF      | TEMPERATURE  | percent of degF        | 95 ± 2 degF",
                "0.65 W/(m.K) ± 100 %| CONDUCTIVITY | lets a conductivity reach zero | smaller than the value",
                "0.65 ± 0.65 W/(m.K) | CONDUCTIVITY | reach zero             | smaller",
                "8 ± 9 W/(m2.K)      | FILM         | lets a film coefficient reach zero | smaller",
                "0.1 ± 0.2 m2.K/W    | RESISTANCE   | reach zero             | smaller",
                "8 W/(m2.K) ± 50 % (normal, k=1) | FILM | reach zero         | smaller",
                "0.65 W/(m.K) ± 0.06 | CONDUCTIVITY | the spread 0.06        | 0.65 ± 0.06 W/(m.K), or ± 0.06 %",
                "0.65 W/(m.K) ± -10 %| CONDUCTIVITY | is negative            | without a sign",
                "0.65 W/(m.K) ±      | CONDUCTIVITY | no spread              | ± 10 %",
                "± 10 % W/(m.K)      | CONDUCTIVITY | no value before        | ± 10 %",
                "0.6 ± 0.1 ± 0.2 W/(m.K) | CONDUCTIVITY | more than one spread | one",
                "0.65 W/(m.K) ± 5 mm | CONDUCTIVITY | in 'mm'                | in W/(m.K)",
                "0.65 W/(m.K) ± 10 % W | CONDUCTIVITY | 'W' stands after     | distribution",
                "0.65 W/(m.K) ± 10 % (normal) | CONDUCTIVITY | coverage factor | (normal, k=2)",
                "0.65 W/(m.K) ± 10 % (normal, k=0) | CONDUCTIVITY | coverage factor | (normal, k=2)",
                "0.65 W/(m.K) ± 10 % (normal, k=-2) | CONDUCTIVITY | coverage factor | (normal, k=2)",
                "0.65 W/(m.K) ± 10 % (normal, k=1e400) | CONDUCTIVITY | too large | finite",
                "0.65 W/(m.K) ± 10 % (gaussian) | CONDUCTIVITY | no distribution | (triangular)",
                "0.65 W/(m.K) ± 10 % (rectangular, k=2) | CONDUCTIVITY | no distribution | (rectangular)",
                "0.65 W/(m.K) (normal, k=2) | CONDUCTIVITY | no spread       | before it",
                "90 % ± 2 %          | NUMBER       | two ways               | 0.9 ± 0.02",
                // rubbish
                "''                  | LENGTH       | empty                  | a length, such as 0.05 m",
                "5 mm; x             | LENGTH       | '; x'                  | end the unit",
                "5 mm)               | LENGTH       | ')'                    | end the unit",
                "5 mm 3              | LENGTH       | the number 3           | numbers out of the unit",
                "5 W/(m.K            | CONDUCTIVITY | not closed             | W/(m.K)",
                "5 W/                | HEAT         | stops                  | complete it",
                "5 W//m              | HEAT_PER_LENGTH | cannot be read      | slash",
                "5 m99               | LENGTH       | no power               | m2",
                "5 m0                | LENGTH       | no power               | m2",
                "5 m^                | LENGTH       | no power               | m2",
                "5 m²³               | LENGTH       | no power               | m2",
                "5 ()                | LENGTH       | cannot be read         | slash",
            })
    void saysWhatIsWrongAndWhatWouldBeRight(String text, Dimension dimension, String what, String remedy) {
        QuantityException fault =
                catchThrowableOfType(QuantityException.class, () -> QuantityReader.read(text, dimension));
        assertThat(fault).as(text).isNotNull();
        assertThat(fault.getMessage()).contains(what);
        assertThat(fault.remedy()).contains(remedy).doesNotEndWith(".");
    }

    @Test
    void namesEveryDimensionThatWouldBeRight() {
        assertThatExceptionOfType(QuantityException.class)
                .isThrownBy(() -> QuantityReader.read(
                        "5 K", Dimension.HEAT_PER_LENGTH, Dimension.HEAT_PER_VOLUME, Dimension.HEAT))
                .satisfies(e -> assertThat(e.remedy()).contains("W/m", "W/m3", "90 W"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"1", "1 K", "%", "1 % %", "1,5 %", "NaN %", ""})
    void refusesWhatIsNoPercentage(String text) {
        assertThatExceptionOfType(QuantityException.class)
                .isThrownBy(() -> QuantityReader.readFraction(text))
                .satisfies(e -> assertThat(e.remedy()).isNotEmpty());
    }
}
