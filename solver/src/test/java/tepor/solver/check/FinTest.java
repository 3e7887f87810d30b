package tepor.solver.check;

import org.junit.jupiter.api.Test;

/** A straight fin as a two-dimensional body: the base at one temperature, a film on both sides and on the tip. */
class FinTest {
    private static final double K = 15; // W/(m·K)
    private static final double FILM = 60; // W/(m²·K)
    private static final double HALF = 0.004; // m
    private static final double LENGTH = 0.03; // m
    private static final double BASE = 60; // K above the air

    /**
     * Separation of variables (H. S. Carslaw and J. C. Jaeger, Conduction of Heat in Solids, 2nd ed. 1959, section 5.3):
     * θ = Σ cₙ cos(λₙy) fₙ(x), λₙ·HALF tan(λₙ·HALF) = Bi, with fₙ falling from 1 at the base to the film on the tip. The
     * terms of the base flow fall as n⁻³.
     */
    @Test
    void flowsAndTipTemperatures() {
        double biot = FILM * HALF / K;
        double base = 0;
        double tip = 0;
        double middle = 0;
        double rim = 0;
        for (int n = 0; n < 4000; n++) {
            double mu = root(n, biot);
            double lambda = mu / HALF;
            double c = BASE * 4 * Math.sin(mu) / (2 * mu + Math.sin(2 * mu));
            double h = FILM / (K * lambda);
            double decay = Math.exp(-lambda * LENGTH);
            double divisor = 1 + decay * decay + h * (1 - decay * decay);
            base += 2 * K * c * Math.sin(mu) * (1 - decay * decay + h * (1 + decay * decay)) / divisor;
            double atTip = 2 * c * decay / divisor;
            tip += 2 * FILM * atTip * Math.sin(mu) / lambda;
            middle += atTip;
            rim += atTip * Math.cos(mu);
        }
        Compared.answer("""
                format = 1
                [outline]
                unit = "mm"
                [[region]]
                name = "fin"
                outline = "POLYGON ((0 -4, 30 -4, 30 4, 0 4, 0 -4))"
                material = "steel"
                [material.steel]
                k = "15 W/(m.K)"
                [air.room]
                temperature = "20 degC"
                film = "60 W/(m2.K)"
                [[edge]]
                name = "base"
                where = "left"
                temperature = "80 degC"
                [[edge]]
                name = "sides"
                where = ["top", "bottom"]
                air = "room"
                [[edge]]
                name = "tip"
                where = "right"
                air = "room"
                [[ask]]
                name = "all"
                flow = "room"
                [[ask]]
                name = "by the tip"
                flow = "tip"
                [[ask]]
                name = "warmest at the tip"
                peak = "tip"
                [[ask]]
                name = "coldest"
                lowest = "everything"
                """)
                .holds("all", base, 1e-5, base)
                .holds("by the tip", tip, 1e-5, tip)
                .holdsCelsius("warmest at the tip", 20 + middle, 1e-5, BASE)
                .holdsCelsius("coldest", 20 + rim, 1e-5, BASE);
    }

    /** The n-th positive root of μ tan μ = biot, by bisection: it lies in (nπ, nπ + π/2). */
    private static double root(int n, double biot) {
        double low = n * Math.PI;
        double high = low + 0.5 * Math.PI;
        for (int step = 0; step < 60; step++) {
            double mu = 0.5 * (low + high);
            // both sides times cos μ, whose sign alternates from root to root
            double excess = (mu * Math.sin(mu) - biot * Math.cos(mu)) * (n % 2 == 0 ? 1 : -1);
            if (excess > 0) {
                high = mu;
            } else {
                low = mu;
            }
        }
        return 0.5 * (low + high);
    }
}
