package tepor.solver.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tepor.solver.quantity.Spread.Distribution;

class GoodQuantityTest {
    /** SI prefixes, derived units and degrees by the definitions of the SI brochure (BIPM, 9th edition). */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "0.65 W/(m.K)      | CONDUCTIVITY    | 0.65   | W/(m.K)",
                "0.65 W/(m·K)      | CONDUCTIVITY    | 0.65   | W/(m.K)",
                "0.65 W/(m⋅K)      | CONDUCTIVITY    | 0.65   | W/(m.K)",
                "0.65 W/(m*K)      | CONDUCTIVITY    | 0.65   | W/(m.K)",
                "0.65 W/(m K)      | CONDUCTIVITY    | 0.65   | W/(m.K)",
                "0.65 W / ( m . K )| CONDUCTIVITY    | 0.65   | W/(m.K)",
                "0.65 W/m/K        | CONDUCTIVITY    | 0.65   | W/m/K",
                "0.65 W.m-1.K-1    | CONDUCTIVITY    | 0.65   | W.m-1.K-1",
                "0.65 W·m⁻¹·K⁻¹    | CONDUCTIVITY    | 0.65   | W.m-1.K-1",
                "0.65 W m^-1 K^-1  | CONDUCTIVITY    | 0.65   | W.m-1.K-1",
                "0.65 W m^−1 K−1   | CONDUCTIVITY    | 0.65   | W.m-1.K-1",
                "650 mW/(m.K)      | CONDUCTIVITY    | 0.65   | mW/(m.K)",
                "0.65 W/(m.degC)   | CONDUCTIVITY    | 0.65   | W/(m.degC)",
                "0.65 W/(m·°C)     | CONDUCTIVITY    | 0.65   | W/(m.degC)",
                "0.38 kW/(m.K)     | CONDUCTIVITY    | 380    | kW/(m.K)",
                "3.8 W/(cm.K)      | CONDUCTIVITY    | 380    | W/(cm.K)",
                "0.35 W/(m.K)      | COUPLING        | 0.35   | W/(m.K)",
                "8 W/(m2.K)        | FILM            | 8      | W/(m2.K)",
                "8 W/(m²K)         | FILM            | 8      | W/(m2.K)",
                "8 W/(m^2.K)       | FILM            | 8      | W/(m2.K)",
                "8 W/m2/K          | FILM            | 8      | W/m2/K",
                "8e-4 W/(cm2.K)    | FILM            | 8      | W/(cm2.K)",
                "0.13 m2.K/W       | RESISTANCE      | 0.13   | m2.K/W",
                "0.13 m²K/W        | RESISTANCE      | 0.13   | m2.K/W",
                "0.13 m² K/W       | RESISTANCE      | 0.13   | m2.K/W",
                "0.13 m2.K.W-1     | RESISTANCE      | 0.13   | m2.K.W-1",
                "2e-4m2.K/W        | RESISTANCE      | 0.0002 | m2.K/W",
                "200 mm2.K/W       | RESISTANCE      | 0.0002 | mm2.K/W",
                "90 W              | HEAT            | 90     | W",
                "1.5 kW            | HEAT            | 1500   | kW",
                "250 mW            | HEAT            | 0.25   | mW",
                "3.6 MJ/h          | HEAT            | 1000   | MJ/h",
                "2 V.A             | HEAT            | 2      | V.A",
                "42 W/m            | HEAT_PER_LENGTH | 42     | W/m",
                "0.42 W/cm         | HEAT_PER_LENGTH | 42     | W/cm",
                "1.2e6 W/m3        | HEAT_PER_VOLUME | 1.2e6  | W/m3",
                "1.2E+6 W/m³       | HEAT_PER_VOLUME | 1.2e6  | W/m3",
                "1.2 MW/m^3        | HEAT_PER_VOLUME | 1.2e6  | MW/m3",
                "1.2 mW/mm3        | HEAT_PER_VOLUME | 1.2e6  | mW/mm3",
                "150 W/m2          | HEAT_PER_AREA   | 150    | W/m2",
                "-150 W/m2         | HEAT_PER_AREA   | -150   | W/m2",
                "−150 W/m2         | HEAT_PER_AREA   | -150   | W/m2",
                "1700 kg/m3        | DENSITY         | 1700   | kg/m3",
                "1.7 g/cm3         | DENSITY         | 1700   | g/cm3",
                "1.7 kg/L          | DENSITY         | 1700   | kg/L",
                "1000 J/(kg.K)     | HEAT_CAPACITY   | 1000   | J/(kg.K)",
                "1 kJ/(kg·K)       | HEAT_CAPACITY   | 1000   | kJ/(kg.K)",
                "0.00393 1/K       | PER_KELVIN      | 0.00393| 1/K",
                "0.00393 K-1       | PER_KELVIN      | 0.00393| K-1",
                "0.00393 /K        | PER_KELVIN      | 0.00393| 1/K",
                "0.393 %/K         | PER_KELVIN      | 0.00393| %/K",
                "20 degC           | TEMPERATURE     | 293.15 | degC",
                "20°C              | TEMPERATURE     | 293.15 | degC",
                "20 ºC             | TEMPERATURE     | 293.15 | degC",
                "20 ℃              | TEMPERATURE     | 293.15 | degC",
                "-40 degC          | TEMPERATURE     | 233.15 | degC",
                "-273.15 degC      | TEMPERATURE     | 0      | degC",
                "293.15 K          | TEMPERATURE     | 293.15 | K",
                "0 K               | TEMPERATURE     | 0      | K",
                "0.2 K             | TEMPERATURE_DIFFERENCE | 0.2   | K",
                "5 mK              | TEMPERATURE_DIFFERENCE | 0.005 | mK",
                "0.05 m            | LENGTH          | 0.05   | m",
                "5mm               | LENGTH          | 0.005  | mm",
                "5 mm              | LENGTH          | 0.005  | mm",
                ".5 cm             | LENGTH          | 0.005  | cm",
                "5. mm             | LENGTH          | 0.005  | mm",
                "+5 mm             | LENGTH          | 0.005  | mm",
                "5000 um           | LENGTH          | 0.005  | um",
                "5000 µm           | LENGTH          | 0.005  | um",
                "5000 μm           | LENGTH          | 0.005  | um",
                "5e6 nm            | LENGTH          | 0.005  | nm",
                "1.2 km            | LENGTH          | 1200   | km",
                "120 mm2           | AREA            | 0.00012| mm2",
                "180 deg           | ANGLE           | 3.141592653589793 | deg",
                "30°               | ANGLE           | 0.5235987755982988 | deg",
                "0.5 rad           | ANGLE           | 0.5    | rad",
                "0.9               | NUMBER          | 0.9    | ''",
                "90 %              | NUMBER          | 0.9    | %",
            })
    void readsSiUnitsInEverySpelling(String text, Dimension dimension, double si, String unit) throws Exception {
        Quantity read = QuantityReader.read(text, dimension);
        assertThat(read.value()).isCloseTo(si, within(1e-15 * Math.abs(si)));
        assertThat(read.dimension()).isEqualTo(dimension);
        assertThat(read.unit()).isEqualTo(unit);
        assertThat(read.spread()).isNull();
        assertThat(read.text()).isEqualTo(text);
    }

    /**
     * Factors of NIST Special Publication 811 (2008), appendix B.8, seven digits as printed there unless exact; those of
     * conductivity and heat capacity were compared with a second copy of the table, the others are from memory and agree
     * with the definitions 1 in = 0.0254 m, 1 ft = 0.3048 m, 1 lb = 0.453 592 37 kg, 1 Btu (IT) = 1055.055 852 62 J.
     */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1 in                        | LENGTH          | 0.0254",
                "1 ft                        | LENGTH          | 0.3048",
                "1 ft2                       | AREA            | 9.290304e-2",
                "1 Btu.in/(h.ft2.degF)       | CONDUCTIVITY    | 1.442279e-1",
                "1 Btu/(h.ft.degF)           | CONDUCTIVITY    | 1.730735",
                "1 Btu/(h·ft·°F)             | CONDUCTIVITY    | 1.730735",
                "1 Btu/(h.ft2.degF)          | FILM            | 5.678263",
                "1 h.ft2.degF/Btu            | RESISTANCE      | 1.761102e-1",
                "1 Btu/h                     | HEAT            | 2.930711e-1",
                "1 Btu/(h.ft2)               | HEAT_PER_AREA   | 3.154591",
                "1 Btu/(lb.degF)             | HEAT_CAPACITY   | 4186.8",
                "1 lb/ft3                    | DENSITY         | 1.601846e1",
                "1 degF                      | TEMPERATURE     | 255.927778",
                "32 degF                     | TEMPERATURE     | 273.15",
                "212°F                       | TEMPERATURE     | 373.15",
                "-459.67 degF                | TEMPERATURE     | 0",
                "1 J/min                     | HEAT            | 1.666667e-2",
            })
    void readsInchPoundUnitsAsThePublishedTable(String text, Dimension dimension, double si) throws Exception {
        assertThat(QuantityReader.read(text, dimension).value()).isCloseTo(si, within(4e-7 * si));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "0.65 W/(m.K) ± 10 %                    | CONDUCTIVITY | 0.65   | 0.065  | RECTANGULAR | 1",
                "0.65 W/(m.K) +- 10 %                   | CONDUCTIVITY | 0.65   | 0.065  | RECTANGULAR | 1",
                "0.65 W/(m.K) +/- 10%                   | CONDUCTIVITY | 0.65   | 0.065  | RECTANGULAR | 1",
                "0.65W/(m.K)±10%                        | CONDUCTIVITY | 0.65   | 0.065  | RECTANGULAR | 1",
                "0.65 ± 0.06 W/(m.K)                    | CONDUCTIVITY | 0.65   | 0.06   | RECTANGULAR | 1",
                "0.65 ± 10 % W/(m.K)                    | CONDUCTIVITY | 0.65   | 0.065  | RECTANGULAR | 1",
                "0.65 W/(m.K) ± 60 mW/(m.K)             | CONDUCTIVITY | 0.65   | 0.06   | RECTANGULAR | 1",
                "0.65 ± 0.06 W/(m.K) (normal, k=2)      | CONDUCTIVITY | 0.65   | 0.06   | NORMAL      | 2",
                "0.65 W/(m.K) ± 10 % (normal, k=2)      | CONDUCTIVITY | 0.65   | 0.065  | NORMAL      | 2",
                "0.65 W/(m.K) ± 10 % (normal,k=1)       | CONDUCTIVITY | 0.65   | 0.065  | NORMAL      | 1",
                "0.65 W/(m.K) ± 10 % ( Normal , k = 1 ) | CONDUCTIVITY | 0.65   | 0.065  | NORMAL      | 1",
                "0.65 W/(m.K) ± 10 % (normal, k=1.96)   | CONDUCTIVITY | 0.65   | 0.065  | NORMAL      | 1.96",
                "0.65 W/(m.K) ± 10 % (triangular)       | CONDUCTIVITY | 0.65   | 0.065  | TRIANGULAR  | 1",
                "0.65 W/(m.K) ± 10 % (rectangular)      | CONDUCTIVITY | 0.65   | 0.065  | RECTANGULAR | 1",
                "0.65 ± 0.06 W/(m.K) (triangular)       | CONDUCTIVITY | 0.65   | 0.06   | TRIANGULAR  | 1",
                "35 ± 3 degC                            | TEMPERATURE  | 308.15 | 3      | RECTANGULAR | 1",
                "35 degC ± 3 degC                       | TEMPERATURE  | 308.15 | 3      | RECTANGULAR | 1",
                "35 degC ± 3 K                          | TEMPERATURE  | 308.15 | 3      | RECTANGULAR | 1",
                "95 ± 9 degF                            | TEMPERATURE  | 308.15 | 5      | RECTANGULAR | 1",
                "-5 ± 2 degC (normal, k=2)              | TEMPERATURE  | 268.15 | 2      | NORMAL      | 2",
                "300 K ± 1 %                            | TEMPERATURE  | 300    | 3      | RECTANGULAR | 1",
                "300 ± 3 K                              | TEMPERATURE  | 300    | 3      | RECTANGULAR | 1",
                "42 ± 3 W/m                             | HEAT_PER_LENGTH | 42  | 3      | RECTANGULAR | 1",
                "-42 W/m ± 10 %                         | HEAT_PER_LENGTH | -42 | 4.2    | RECTANGULAR | 1",
                "0 ± 3 W/m                              | HEAT_PER_LENGTH | 0   | 3      | RECTANGULAR | 1",
                "20 ± 0.5 mm                            | LENGTH       | 0.02   | 0.0005 | RECTANGULAR | 1",
                "0.9 ± 0.05                             | NUMBER       | 0.9    | 0.05   | RECTANGULAR | 1",
                "0.9 ± 5 %                              | NUMBER       | 0.9    | 0.045  | RECTANGULAR | 1",
                "0.393 %/K ± 5 %                        | PER_KELVIN   | 0.00393| 0.0001965 | RECTANGULAR | 1",
            })
    void readsSpreads(
            String text, Dimension dimension, double si, double halfWidth, Distribution distribution, double factor)
            throws Exception {
        Quantity read = QuantityReader.read(text, dimension);
        assertThat(read.value()).isCloseTo(si, within(1e-12));
        assertThat(read.spread().halfWidth()).isCloseTo(halfWidth, within(1e-12));
        assertThat(read.spread().distribution()).isEqualTo(distribution);
        assertThat(read.spread().coverageFactor()).isEqualTo(factor);
    }

    @Test
    void takesNoBreakAndThinSpacesForBlanks() throws Exception {
        Quantity read =
                QuantityReader.read("0.65\u00a0W/(m\u00b7K)\u202f\u00b1\u200910\u00a0%", Dimension.CONDUCTIVITY);
        assertThat(read.value()).isEqualTo(0.65);
        assertThat(read.spread().halfWidth()).isCloseTo(0.065, within(1e-15));
    }

    @Test
    void takesTheDimensionThatTheUnitMeasures() throws Exception {
        Dimension[] heat = {Dimension.HEAT_PER_LENGTH, Dimension.HEAT_PER_VOLUME, Dimension.HEAT};
        assertThat(QuantityReader.read("42 W/m", heat).dimension()).isEqualTo(Dimension.HEAT_PER_LENGTH);
        assertThat(QuantityReader.read("42 W/m3", heat).dimension()).isEqualTo(Dimension.HEAT_PER_VOLUME);
        assertThat(QuantityReader.read("42 W", heat).dimension()).isEqualTo(Dimension.HEAT);
        assertThat(QuantityReader.read("1 W/(m.K)", Dimension.COUPLING, Dimension.CONDUCTIVITY)
                        .dimension())
                .isEqualTo(Dimension.COUPLING);
    }

    @Test
    void aSpreadOfZeroIsNone() throws Exception {
        assertThat(QuantityReader.read("0.65 W/(m.K) ± 0 %", Dimension.CONDUCTIVITY)
                        .hasSpread())
                .isFalse();
    }

    @ParameterizedTest
    @CsvSource({"1 %, 0.01", "95%, 0.95", "99.73 %, 0.9973", "0.5\u00a0%, 0.005"})
    void readsPercentages(String text, double fraction) throws Exception {
        assertThat(QuantityReader.readFraction(text)).isCloseTo(fraction, within(1e-15));
    }
}
