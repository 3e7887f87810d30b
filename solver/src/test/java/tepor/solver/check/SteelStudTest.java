package tepor.solver.check;

import org.junit.jupiter.api.Test;

/** A C-shaped metal stud between boards, in insulation: thin, of sharp corners, and conducting thousands of times better. */
class SteelStudTest {
    /**
     * Steel 1.5 mm, every 600 mm, k 1429 times that of the insulation. Reference: an independent solution, tensor-product
     * elements of degree 7 and 9 on grids graded geometrically (ratio 0.17) towards every corner and border of the stud,
     * solved with a residual free of cancellation; the two agree to 2e-6 W/m and 6e-6 K.
     */
    @Test
    void steel() {
        Compared.answer(wall(600, 1.5, 50))
                .holds("flow", 7.395571, 1e-4, 7.4)
                .holds("coupling", 7.395571 / 20, 1e-4, 0.37)
                .holdsCelsius("coldest", 13.931003, 1e-4, 20)
                .holdsCelsius("stud", 8.3345607, 1e-4, 20);
    }

    /** Aluminium 0.5 mm in 300 mm of wall, k 4571 times that of the insulation; the reference as above. */
    @Test
    void thinSheet() {
        Compared.answer(wall(300, 0.5, 160))
                .holds("flow", 5.530705, 1e-4, 5.5)
                .holds("coupling", 5.530705 / 20, 1e-4, 0.28)
                .holdsCelsius("coldest", 13.854454, 1e-4, 20)
                .holdsCelsius("stud", 8.3115432, 1e-4, 20);
    }

    private static String wall(double pitch, double sheet, double k) {
        double x1 = pitch / 2 - 25;
        double x2 = x1 + sheet;
        double x3 = x1 + 50;
        double low = 12.5 + sheet;
        double high = 112.5 - sheet;
        String stud = x1 + " 12.5, " + x3 + " 12.5, " + x3 + " " + low + ", " + x2 + " " + low + ", " + x2 + " " + high
                + ", " + x3 + " " + high + ", " + x3 + " 112.5, " + x1 + " 112.5, " + x1 + " 12.5";
        return """
                format = 1
                [outline]
                unit = "mm"
                [[region]]
                name = "boards"
                outline = "POLYGON ((0 0, WIDTH 0, WIDTH 125, 0 125, 0 0))"
                material = "gypsum"
                [[region]]
                name = "wool"
                outline = "POLYGON ((0 12.5, WIDTH 12.5, WIDTH 112.5, 0 112.5, 0 12.5))"
                material = "wool"
                [[region]]
                name = "stud"
                outline = "POLYGON ((STUD))"
                material = "metal"
                [material.gypsum]
                k = "0.25 W/(m.K)"
                [material.wool]
                k = "0.035 W/(m.K)"
                [material.metal]
                k = "CONDUCTIVITY W/(m.K)"
                [air.room]
                temperature = "20 degC"
                [air.outdoors]
                temperature = "0 degC"
                [[edge]]
                name = "inner"
                where = "bottom"
                air = "room"
                film = "7.7 W/(m2.K)"
                [[edge]]
                name = "outer"
                where = "top"
                air = "outdoors"
                film = "25 W/(m2.K)"
                [[ask]]
                name = "flow"
                flow = "outdoors"
                [[ask]]
                name = "coupling"
                coupling = ["room", "outdoors"]
                [[ask]]
                name = "coldest"
                lowest = "inner"
                [[ask]]
                name = "stud"
                mean = "stud"
                """.replace("WIDTH", Double.toString(pitch))
                .replace("STUD", stud)
                .replace("CONDUCTIVITY", Double.toString(k));
    }
}
