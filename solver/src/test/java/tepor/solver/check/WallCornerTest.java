package tepor.solver.check;

import org.junit.jupiter.api.Test;

/** Corner of a wall of two layers with a film on either side, and flows through parts of its edges and layers. */
class WallCornerTest {
    /**
     * 0.20 m stone inside 0.12 m insulation, 1.2 m of inner surface on each leg. Reference: an independent solution,
     * tensor-product elements of degree 8 and 10 on grids graded geometrically towards the corners; the two agree to 1e-8
     * W/m, 2e-7 K, and 1e-6 W/m for the part of the border between the layers.
     */
    @Test
    void flowsTemperaturesAndPsi() {
        double flow = 17.905437;
        double u = 1 / (1 / 25.0 + 0.12 / 0.035 + 0.20 / 0.7 + 0.13);
        Compared.answer("""
                format = 1
                [outline]
                unit = "m"
                [[region]]
                name = "insulation"
                outline = "POLYGON ((0 0, 1.52 0, 1.52 0.12, 0.12 0.12, 0.12 1.52, 0 1.52, 0 0))"
                material = "wool"
                [[region]]
                name = "stone"
                outline = "POLYGON ((0.12 0.12, 1.52 0.12, 1.52 0.32, 0.32 0.32, 0.32 1.52, 0.12 1.52, 0.12 0.12))"
                material = "stone"
                [material.wool]
                k = "0.035 W/(m.K)"
                [material.stone]
                k = "0.7 W/(m.K)"
                [air.room]
                temperature = "20 degC"
                [air.outdoors]
                temperature = "-5 degC"
                film = "25 W/(m2.K)"
                [[edge]]
                name = "outer"
                where = ["left", "bottom"]
                air = "outdoors"
                [[edge]]
                name = "inner"
                where = { line = "LINESTRING (0.32 1.52, 0.32 0.32, 1.52 0.32)" }
                air = "room"
                resistance = "0.13 m2.K/W"
                [[edge]]
                name = "between the layers"
                where = { between = ["stone", "insulation"] }
                [[edge]]
                name = "part of the outside"
                where = { line = "LINESTRING (0 0.2, 0 0.7)" }
                [[edge]]
                name = "part of the border"
                where = { line = "LINESTRING (0.12 0.6, 0.12 0.12)" }
                [[ask]]
                name = "flow"
                flow = "outdoors"
                [[ask]]
                name = "psi"
                transmittance = ["room", "outdoors"]
                less = [{ u = "U W/(m2.K)", length = "3.04 m" }]
                [[ask]]
                name = "factor"
                factor = "inner"
                inner = "room"
                outer = "outdoors"
                [[ask]]
                name = "poorer film"
                lowest = "inner"
                with = { "edge.inner.resistance" = "0.25 m2.K/W" }
                [[ask]]
                name = "insulation"
                mean = "insulation"
                [[ask]]
                name = "inner surface"
                mean = "inner"
                [[ask]]
                name = "between"
                flow = "between the layers"
                [[ask]]
                name = "part outside"
                flow = "part of the outside"
                [[ask]]
                name = "part of the border"
                flow = "part of the border"
                """.replace("U W/(m2.K)", u + " W/(m2.K)"))
                .holds("flow", flow, 1e-4, flow)
                .holds("psi", flow / 25 - u * 3.04, 1e-4, flow / 25)
                .holds("factor", 0.9201971, 1e-4, 1)
                .holdsCelsius("poorer film", 16.8927306, 1e-4, 25)
                .holdsCelsius("insulation", 5.6508699, 1e-4, 25)
                .holdsCelsius("inner surface", 20 - flow * 0.13 / 2.4, 1e-4, 25)
                .holds("between", flow, 1e-4, flow)
                .holds("part outside", 3.0471812, 1e-4, flow)
                .holds("part of the border", 3.046688, 1e-4, flow);
    }
}
