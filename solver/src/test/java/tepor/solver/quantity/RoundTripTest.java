package tepor.solver.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

class RoundTripTest {
    record Pair(Dimension dimension, String unit) {}

    @Provide
    Arbitrary<Pair> pairs() {
        return Arbitraries.of(List.of(
                new Pair(Dimension.TEMPERATURE, "degC"),
                new Pair(Dimension.TEMPERATURE, "degF"),
                new Pair(Dimension.TEMPERATURE, "K"),
                new Pair(Dimension.TEMPERATURE_DIFFERENCE, "mK"),
                new Pair(Dimension.LENGTH, "mm"),
                new Pair(Dimension.LENGTH, "ft"),
                new Pair(Dimension.ANGLE, "deg"),
                new Pair(Dimension.CONDUCTIVITY, "W/(m.K)"),
                new Pair(Dimension.CONDUCTIVITY, "Btu.in/(h.ft2.degF)"),
                new Pair(Dimension.FILM, "kW/m2/K"),
                new Pair(Dimension.RESISTANCE, "m2.K.W-1"),
                new Pair(Dimension.HEAT_PER_VOLUME, "MW/m3"),
                new Pair(Dimension.NUMBER, "")));
    }

    @Provide
    Arbitrary<Double> values() {
        Arbitrary<Double> mantissas = Arbitraries.doubles().between(1, 10);
        return Combinators.combine(mantissas, Arbitraries.integers().between(-7, 8))
                .as((mantissa, exponent) -> mantissa * Math.pow(10, exponent));
    }

    /** Six digits are written, so that what is read again differs by at most half of the last. */
    @Property(tries = 500)
    void whatIsWrittenIsReadAgain(@ForAll("pairs") Pair pair, @ForAll("values") double si) throws Exception {
        String text = Units.format(si, pair.unit(), pair.dimension());
        Quantity read = QuantityReader.read(text, pair.dimension());
        double shown = Units.fromSi(si, pair.unit(), pair.dimension());
        double again = Units.fromSi(read.value(), pair.unit(), pair.dimension());
        // A temperature is held in kelvin: near 0 degC its last bits are those of 273.15.
        assertThat(again).isCloseTo(shown, within(5.0001e-6 * Math.abs(shown) + 1e-12));
        assertThat(read.unit()).isEqualTo(pair.unit());
        assertThat(Units.format(read.value(), pair.unit(), pair.dimension())).isEqualTo(text);
    }

    /** Any text is read or refused with a remedy; nothing else comes out. */
    @Property(tries = 2000)
    void anyTextIsReadOrRefused(@ForAll("texts") String text) {
        try {
            Quantity read = QuantityReader.read(text, Dimension.CONDUCTIVITY, Dimension.TEMPERATURE, Dimension.NUMBER);
            assertThat(read.value()).isFinite();
        } catch (QuantityException e) {
            assertThat(e.getMessage()).isNotBlank();
            assertThat(e.remedy()).isNotBlank();
        }
    }

    @Provide
    Arbitrary<String> texts() {
        Arbitrary<String> pieces = Arbitraries.of(
                "0.65",
                "1",
                "-",
                "+",
                "e5",
                ".",
                "·",
                " ",
                "W",
                "m",
                "K",
                "mK",
                "2",
                "²",
                "^",
                "-1",
                "/",
                "(",
                ")",
                "±",
                "10",
                "%",
                "degC",
                "(normal, k=2)",
                "(",
                "k=",
                ",",
                "\u00a0",
                "\0",
                "Btu",
                "q");
        return pieces.list().ofMaxSize(12).map(list -> String.join("", list));
    }
}
