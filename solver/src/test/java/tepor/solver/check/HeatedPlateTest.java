package tepor.solver.check;

import org.junit.jupiter.api.Test;

/** Heat, inflows, a cooled duct and a cold end in one plate of two metals. */
class HeatedPlateTest {
    /**
     * Reference: an independent solution, tensor-product elements of degree 8 on grids graded geometrically (ratio 0.17, 7
     * and 9 steps) towards every corner and junction; the two agree to 2e-7 W/m and 5e-9 K, and to 1.3e-5 W/m for the
     * flows between the metals.
     */
    @Test
    void everyKindOfHeat() {
        Compared.answer("""
                format = 1
                [outline]
                unit = "mm"
                [[region]]
                name = "steel"
                outline = "POLYGON ((0 0, 200 0, 200 100, 0 100, 0 0))"
                material = "steel"
                [[region]]
                name = "heated"
                outline = "POLYGON ((0 0, 80 0, 80 100, 0 100, 0 0))"
                material = "steel"
                heat = "800 W/m"
                [[region]]
                name = "brass"
                outline = "POLYGON ((120 0, 200 0, 200 100, 120 100, 120 0))"
                material = "brass"
                [[region]]
                name = "duct"
                outline = "POLYGON ((80 30, 120 30, 120 60, 80 60, 80 30))"
                material = "nothing"
                [material.steel]
                k = "15 W/(m.K)"
                [material.brass]
                k = "45 W/(m.K)"
                [[edge]]
                name = "duct wall"
                where = "holes"
                air = "30 degC"
                film = "50 W/(m2.K)"
                [[edge]]
                name = "lamp"
                where = "top"
                inflow = "1500 W/m2"
                [[edge]]
                name = "loss"
                where = "left"
                inflow = "-40 W/m"
                [[edge]]
                name = "cold end"
                where = "right"
                temperature = "20 degC"
                [[edge]]
                name = "side of the duct"
                where = { line = "LINESTRING (80 30, 80 60)" }
                [[edge]]
                name = "metals"
                where = { between = ["steel", "brass"] }
                [[edge]]
                name = "metals below"
                where = { line = "LINESTRING (120 0, 120 30)" }
                [[edge]]
                name = "about the heated"
                where = { of = "heated" }
                [[ask]]
                name = "cold end"
                flow = "cold end"
                [[ask]]
                name = "duct"
                flow = "duct wall"
                [[ask]]
                name = "side"
                flow = "side of the duct"
                [[ask]]
                name = "metals"
                flow = "metals"
                [[ask]]
                name = "metals below"
                flow = "metals below"
                [[ask]]
                name = "heated"
                flow = "about the heated"
                [[ask]]
                name = "hottest"
                peak = "everything"
                [[ask]]
                name = "under the lamp"
                mean = "lamp"
                """)
                .holds("cold end", 911.43383, 1e-4, 911)
                .holds("duct", 148.56617, 1e-4, 149)
                .holds("side", 63.227214, 1e-4, 149)
                .holds("metals", 795.62903, 1e-4, 796)
                .holds("metals below", 322.90019, 1e-4, 323)
                .holds("heated", 800, 1e-8, 800)
                .holdsCelsius("hottest", 93.747015, 1e-4, 74)
                .holdsCelsius("under the lamp", 56.8197499, 1e-4, 74);
    }
}
