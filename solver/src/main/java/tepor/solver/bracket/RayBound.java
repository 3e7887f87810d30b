package tepor.solver.bracket;

import java.util.Arrays;
import java.util.Comparator;

/**
 * Lower bound of the conductance between two surroundings that lie about a centre: adiabatic cuts along rays.
 *
 * <p>As {@link StripBound}, in polar coordinates: a flux g(angle)/r along the rays is free of sources. Every region must
 * conduct alike in all directions.
 */
final class RayBound {
    private final Polar polar;
    private final Surroundings surroundings;
    private final RegionConduction conduction;
    private double conductance;
    private double widest;

    /** Least and greatest resistance of the rays that carry heat, m·K/W per radian⁻¹. */
    private double least = Double.POSITIVE_INFINITY;

    private double greatest;

    RayBound(Polar polar, Surroundings surroundings, RegionConduction conduction) {
        this.polar = polar;
        this.surroundings = surroundings;
        this.conduction = conduction;
        Sweep.run(
                Arrays.copyOf(polar.lowV, polar.count),
                Arrays.copyOf(polar.highV, polar.count),
                -Math.PI,
                Math.PI,
                this::cut);
    }

    /** W/(m·K). */
    double conductance() {
        return conductance;
    }

    /** Angle over which rays carry heat, radians. */
    double angle() {
        return widest;
    }

    /** Least of ∫ dr/(k r) + Σ |n·e|/(h r) over the rays that carry heat, m·K·rad/W. */
    double leastResistance() {
        return least;
    }

    /** Greatest of the same. */
    double greatestResistance() {
        return greatest;
    }

    private void cut(double from, double to, int[] active, int count) {
        double middle = 0.5 * (from + to);
        int[] crossed = Arrays.stream(active, 0, count)
                .boxed()
                .sorted(Comparator.comparingDouble(piece -> polar.rAt(piece, middle)))
                .mapToInt(Integer::intValue)
                .toArray();
        int begin = -1;
        for (int i = 0; i < crossed.length; i++) {
            boolean solid = polar.isSolid(polar.beyondAlong(crossed[i]));
            if (solid && begin < 0) {
                begin = i;
            } else if (!solid && begin >= 0) {
                carry(from, to, Arrays.copyOfRange(crossed, begin, i + 1));
                begin = -1;
            }
        }
    }

    private void carry(double from, double to, int[] crossed) {
        int begin = surroundings.side(polar.segment[crossed[0]]);
        int end = surroundings.side(polar.segment[crossed[crossed.length - 1]]);
        if (begin == Surroundings.NEITHER || end == Surroundings.NEITHER || begin == end) {
            return;
        }
        widest += to - from;
        conductance += Integral.of(from, to, v -> {
            double resistance = resistance(crossed, v);
            least = Math.min(least, resistance);
            greatest = Math.max(greatest, resistance);
            return 1 / resistance;
        });
    }

    private double resistance(int[] crossed, double v) {
        double sum = film(crossed[0], v) + film(crossed[crossed.length - 1], v);
        double inner = polar.rAt(crossed[0], v);
        for (int i = 0; i + 1 < crossed.length; i++) {
            double outer = polar.rAt(crossed[i + 1], v);
            sum += Math.log(outer / inner) * conduction.resistivity(polar.beyondAlong(crossed[i]), 0);
            inner = outer;
        }
        return sum;
    }

    private double film(int piece, double v) {
        double h = surroundings.film(polar.segment[piece]);
        return Double.isInfinite(h) ? 0 : polar.facing(piece, v) / (h * polar.rAt(piece, v));
    }
}
