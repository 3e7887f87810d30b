package tepor.solver.check;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Conductivity by direction: a heated board turned together with its grain answers the same at every angle. */
class GrainTest {
    /**
     * Board 0.3 m by 0.1 m, 1.4 W/(m·K) along and 0.2 across, 2000 W/m³, one end at 50 °C, one long side insulated, a film
     * of 12 W/(m²·K) to 10 °C on the others. Reference: an independent solution of the board lying straight, tensor-product
     * elements of degree 9 and 11 on grids graded geometrically towards three corners; the two agree in the digits given,
     * to 5e-6 K at the point.
     */
    @ParameterizedTest
    @ValueSource(ints = {0, 30, 45, 90})
    void turnedWithItsGrain(int degrees) {
        double[][] p = new double[5][];
        double[][] straight = {{0, 0}, {0.3, 0}, {0.3, 0.1}, {0, 0.1}, {0.2, 0.05}};
        for (int i = 0; i < p.length; i++) {
            double cos = Math.cos(Math.toRadians(degrees));
            double sin = Math.sin(Math.toRadians(degrees));
            p[i] = new double[] {
                cos * straight[i][0] - sin * straight[i][1], sin * straight[i][0] + cos * straight[i][1]
            };
        }
        Compared.answer("""
                format = 1
                [outline]
                unit = "m"
                [[region]]
                name = "board"
                outline = "POLYGON ((A, B, C, D, A))"
                material = "wood"
                heat = "2000 W/m3"
                [material.wood]
                k = { along = "1.4 W/(m.K)", across = "0.2 W/(m.K)", angle = "DEG deg" }
                [air.room]
                temperature = "10 degC"
                film = "12 W/(m2.K)"
                [[edge]]
                name = "hot end"
                where = { line = "LINESTRING (D, A)" }
                temperature = "50 degC"
                [[edge]]
                name = "cooled"
                where = { line = "LINESTRING (B, C, D)" }
                air = "room"
                [[ask]]
                name = "to the room"
                flow = "room"
                [[ask]]
                name = "at the hot end"
                flow = "hot end"
                [[ask]]
                name = "mean"
                mean = "board"
                [[ask]]
                name = "inside"
                at = "POINT (E)"
                """.replace("POLYGON ((A, B, C, D, A))", "POLYGON ((" + text(p, 0, 1, 2, 3, 0) + "))")
                        .replace("LINESTRING (D, A)", "LINESTRING (" + text(p, 3, 0) + ")")
                        .replace("LINESTRING (B, C, D)", "LINESTRING (" + text(p, 1, 2, 3) + ")")
                        .replace("POINT (E)", "POINT (" + text(p, 4) + ")")
                        .replace("DEG", Integer.toString(degrees)))
                .holds("to the room", 70.1731477, 1e-4, 70)
                .holds("at the hot end", 60 - 70.1731477, 1e-4, 70)
                .holdsCelsius("mean", 41.4036189, 1e-5, 40)
                .holdsCelsius("inside", 41.77820, 1e-4, 40);
    }

    private static String text(double[][] p, int... corners) {
        StringBuilder text = new StringBuilder();
        for (int i : corners) {
            text.append(text.isEmpty() ? "" : ", ").append(p[i][0]).append(' ').append(p[i][1]);
        }
        return text.toString();
    }
}
