package tepor.solver.bracket;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;

/**
 * Upper bound of the conductance between two surroundings that lie about a centre: perfectly conducting sheets on circles.
 *
 * <p>As {@link PlaneBound}, in polar coordinates: it can be had where all that holds one surrounding lies nearer to the
 * centre than all that holds the other.
 */
final class CircleBound {
    /** Rings from the inner surrounding to the outer. */
    final List<Ring> rings = new ArrayList<>();

    /** Which surrounding is the inner one. */
    final int inner;

    /** Σ film · length of the inner and the outer surrounding, W/(m·K); infinite where a temperature is fixed. */
    final double[] films;

    private final Polar polar;
    private final RegionConduction conduction;

    /**
     * A ring between two circles.
     *
     * @param from inner radius, m
     * @param to outer radius, m
     * @param region the one region that fills it all round; −1 where it passes several
     * @param resistance ∫ dr / (r ∫ k dv), m·K/W
     */
    record Ring(double from, double to, int region, double resistance) {}

    private CircleBound(Polar polar, RegionConduction conduction, int inner, double[] films, double from, double to) {
        this.polar = polar;
        this.conduction = conduction;
        this.inner = inner;
        this.films = films;
        if (to > from) {
            Sweep.run(
                    Arrays.copyOf(polar.lowR, polar.count),
                    Arrays.copyOf(polar.highR, polar.count),
                    from,
                    to,
                    this::slice);
        }
    }

    /**
     * Empty where neither surrounding lies within the other.
     *
     * @param lengths Σ film · length of each surrounding, W/(m·K)
     */
    static Optional<CircleBound> of(
            Polar polar, Surroundings surroundings, RegionConduction conduction, double[] lengths) {
        double[] least = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
        double[] greatest = new double[2];
        for (int piece = 0; piece < polar.count; piece++) {
            int side = surroundings.side(polar.segment[piece]);
            if (side != Surroundings.NEITHER) {
                least[side] = Math.min(least[side], polar.lowR[piece]);
                greatest[side] = Math.max(greatest[side], polar.highR[piece]);
            }
        }
        for (int inner = 0; inner < 2; inner++) {
            int outer = 1 - inner;
            if (greatest[inner] <= least[outer]) {
                double[] inOrder = {lengths[inner], lengths[outer]};
                return Optional.of(new CircleBound(polar, conduction, inner, inOrder, greatest[inner], least[outer]));
            }
        }
        return Optional.empty();
    }

    /** m·K/W. */
    double resistance() {
        double sum = 1 / films[0] + 1 / films[1];
        for (Ring ring : rings) {
            sum += ring.resistance();
        }
        return sum;
    }

    private void slice(double from, double to, int[] active, int count) {
        if (count == 0) {
            int region = allRound(0.5 * (from + to));
            double k = polar.isSolid(region) ? conduction.conductivity(region, 0) : 0;
            rings.add(new Ring(from, to, region, Math.log(to / from) / (2 * Math.PI * k)));
            return;
        }
        int[] pieces = Arrays.copyOf(active, count);
        double resistance = Integral.withRoots(from, to, r -> 1 / (r * around(pieces, r)));
        rings.add(new Ring(from, to, -1, resistance));
    }

    /** ∫ k dv round the circle of radius r. */
    private double around(int[] pieces, double r) {
        double[] v = new double[pieces.length];
        for (int i = 0; i < pieces.length; i++) {
            v[i] = polar.vAt(pieces[i], r);
        }
        Integer[] order = new Integer[pieces.length];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, Comparator.comparingDouble(i -> v[i]));
        double sum = 0;
        for (int i = 0; i < order.length; i++) {
            int region = polar.beyondAcross(pieces[order[i]]);
            if (polar.isSolid(region)) {
                double next = i + 1 < order.length ? v[order[i + 1]] : v[order[0]] + 2 * Math.PI;
                sum += (next - v[order[i]]) * conduction.conductivity(region, 0);
            }
        }
        return sum;
    }

    /** The region in which a circle lies that meets no piece. */
    private int allRound(double r) {
        // A ray on which no piece begins or ends: midway between two neighbouring ends.
        double[] ends = DoubleStream.concat(
                        Arrays.stream(polar.lowV, 0, polar.count), Arrays.stream(polar.highV, 0, polar.count))
                .filter(end -> Math.abs(end) < Math.PI)
                .sorted()
                .distinct()
                .toArray();
        double v = ends.length < 2 ? 0 : widestMiddle(ends);
        int below = -1;
        int above = -1;
        for (int piece = 0; piece < polar.count; piece++) {
            if (polar.lowV[piece] < v && polar.highV[piece] > v) {
                double at = polar.rAt(piece, v);
                if (at < r && (below < 0 || at > polar.rAt(below, v))) {
                    below = piece;
                } else if (at > r && (above < 0 || at < polar.rAt(above, v))) {
                    above = piece;
                }
            }
        }
        if (below >= 0) {
            return polar.beyondAlong(below);
        }
        return above >= 0 ? polar.beforeAlong(above) : -1;
    }

    private static double widestMiddle(double[] ends) {
        int widest = 0;
        for (int i = 1; i + 1 < ends.length; i++) {
            if (ends[i + 1] - ends[i] > ends[widest + 1] - ends[widest]) {
                widest = i;
            }
        }
        return 0.5 * (ends[widest] + ends[widest + 1]);
    }
}
