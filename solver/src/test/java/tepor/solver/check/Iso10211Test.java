package tepor.solver.check;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import tepor.solver.CaseText;
import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;

/**
 * The two plane test cases of ISO 10211:2017, Annex C. Their geometry and rounded values are quoted from memory of the
 * standard; the exact values stand beside them: the series for case 1, an independent solution of high order for case 2.
 */
class Iso10211Test {
    private static final double ZERO_CELSIUS = 273.15;

    /** Half of a square column, 20 degC on top, 0 degC on the other sides: printed to one decimal. */
    private static final double[][] CASE_1_PRINTED = {
        {9.7, 13.4, 14.7, 15.1},
        {5.3, 8.6, 10.3, 10.8},
        {3.2, 5.6, 7.0, 7.5},
        {2.0, 3.6, 4.7, 5.0},
        {1.3, 2.3, 3.0, 3.2},
        {0.7, 1.4, 1.8, 1.9},
        {0.3, 0.6, 0.8, 0.9}
    };

    @Test
    void case1() {
        StringBuilder toml = new StringBuilder("""
                format = 1
                title = "half column"
                [outline]
                unit = "m"
                [[region]]
                name = "column"
                outline = "POLYGON ((0 0, 0.5 0, 0.5 1, 0 1, 0 0))"
                material = "any"
                [material.any]
                k = "1 W/(m.K)"
                [[edge]]
                name = "top side"
                where = "top"
                temperature = "20 degC"
                [[edge]]
                name = "cold sides"
                where = ["left", "bottom"]
                temperature = "0 degC"
                [[edge]]
                name = "symmetry"
                where = "right"
                insulated = "symmetry plane"
                """);
        for (int row = 0; row < 7; row++) {
            for (int column = 0; column < 4; column++) {
                toml.append(String.format(
                        Locale.ROOT,
                        "[[ask]]\nname = \"T %d %d\"\nat = \"POINT (%s %s)\"\nwithin = \"0.005 K\"\n",
                        row,
                        column,
                        0.125 * (column + 1),
                        1 - 0.125 * (row + 1)));
            }
        }
        Map<String, AskAnswer> answers = CaseText.byName(CaseText.answer(toml.toString()));
        for (int row = 0; row < 7; row++) {
            for (int column = 0; column < 4; column++) {
                AskAnswer answer = answers.get("T " + row + " " + column);
                double exact = series(0.125 * (column + 1), 1 - 0.125 * (row + 1));
                double found = answer.value() - ZERO_CELSIUS;
                assertThat(found).as("row %d, column %d", row, column).isCloseTo(exact, within(0.005));
                assertThat(found).isCloseTo(CASE_1_PRINTED[row][column], within(0.1));
                assertThat(exact).isCloseTo(CASE_1_PRINTED[row][column], within(0.0501));
                assertThat(answer.meshError().reached()).isTrue();
            }
        }
    }

    /** H. S. Carslaw and J. C. Jaeger, Conduction of Heat in Solids, 2nd ed. 1959, section 5.2: square, one side hot. */
    private static double series(double x, double y) {
        double sum = 0;
        for (int n = 1; n < 200; n += 2) {
            double decay = Math.exp(n * Math.PI * (y - 1)) * (1 - Math.exp(-2 * n * Math.PI * y));
            sum += 80 / (n * Math.PI) * Math.sin(n * Math.PI * x) * decay / (1 - Math.exp(-2 * n * Math.PI));
        }
        return sum;
    }

    @Test
    void case2() {
        Answer answer = CaseText.answer("""
                format = 1
                title = "composite"
                [outline]
                unit = "mm"
                [[region]]
                name = "insulation"
                outline = "POLYGON ((0 0, 500 0, 500 41.5, 0 41.5, 0 0))"
                material = "insulation"
                [[region]]
                name = "concrete"
                outline = "POLYGON ((0 41.5, 500 41.5, 500 47.5, 0 47.5, 0 41.5))"
                material = "concrete"
                [[region]]
                name = "wood"
                outline = "POLYGON ((0 36.5, 15 36.5, 15 41.5, 0 41.5, 0 36.5))"
                material = "wood"
                [[region]]
                name = "aluminium"
                outline = "POLYGON ((0 0, 500 0, 500 1.5, 1.5 1.5, 1.5 35, 15 35, 15 36.5, 0 36.5, 0 0))"
                material = "aluminium"
                [material.concrete]
                k = "1.15 W/(m.K)"
                [material.wood]
                k = "0.12 W/(m.K)"
                [material.aluminium]
                k = "230 W/(m.K)"
                [material.insulation]
                k = "0.029 W/(m.K)"
                [air.outdoors]
                temperature = "0 degC"
                [air.room]
                temperature = "20 degC"
                [[edge]]
                name = "outer"
                where = "top"
                air = "outdoors"
                resistance = "0.06 m2.K/W"
                [[edge]]
                name = "inner"
                where = "bottom"
                air = "room"
                resistance = "0.11 m2.K/W"
                [[edge]]
                name = "cuts"
                where = ["left", "right"]
                insulated = "symmetry planes"
                [[ask]]
                name = "A"
                at = "POINT (0 47.5)"
                [[ask]]
                name = "B"
                at = "POINT (500 47.5)"
                [[ask]]
                name = "C"
                at = "POINT (0 41.5)"
                [[ask]]
                name = "D"
                at = "POINT (15 41.5)"
                within = "0.01 K"
                [[ask]]
                name = "E"
                at = "POINT (500 41.5)"
                [[ask]]
                name = "F"
                at = "POINT (0 36.5)"
                [[ask]]
                name = "G"
                at = "POINT (15 36.5)"
                [[ask]]
                name = "H"
                at = "POINT (0 0)"
                [[ask]]
                name = "I"
                at = "POINT (500 0)"
                [[ask]]
                name = "flow"
                flow = "outer"
                within = "0.05 %"
                [[ask]]
                name = "flow in"
                flow = "inner"
                """);
        Map<String, AskAnswer> answers = CaseText.byName(answer);
        String[] points = {"A", "B", "C", "D", "E", "F", "G", "H", "I"};
        double[] printed = {7.1, 0.8, 7.9, 6.3, 0.8, 16.4, 16.3, 16.8, 18.3};
        double[] exact = {
            7.06416811,
            0.76129352,
            7.89718725,
            6.27229146,
            0.82749854,
            16.40786257,
            16.33355708,
            16.76717112,
            18.33366461
        };
        for (int i = 0; i < points.length; i++) {
            double found = answers.get(points[i]).value() - ZERO_CELSIUS;
            assertThat(found).as(points[i]).isCloseTo(printed[i], within(0.1));
            assertThat(found).as(points[i]).isCloseTo(exact[i], within(0.005));
        }
        assertThat(answers.get("flow").value()).isCloseTo(9.5, within(0.1));
        assertThat(answers.get("flow").value()).isCloseTo(9.49144778, within(0.001 * 9.49));
        assertThat(answers.get("flow in").value())
                .isCloseTo(-answers.get("flow").value(), within(1e-9));
        assertThat(answer.ledger().imbalance()).isLessThan(1e-9);
    }
}
