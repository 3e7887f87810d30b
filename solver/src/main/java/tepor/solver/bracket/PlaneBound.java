package tepor.solver.bracket;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import tepor.mesher.section.Section;

/**
 * Upper bound of the conductance between two surroundings: perfectly conducting sheets across an axis make layers one
 * after the other, in each of which heat passes the regions side by side.
 *
 * <p>The temperature it amounts to depends on the coordinate along alone, so that by Dirichlet's principle its dissipation,
 * with that in the films, is never below the true one at the same difference. It can be had where the two surroundings
 * lie apart along the axis: all that holds the first before all that holds the second. What lies beyond them is at one
 * temperature.
 */
final class PlaneBound {
    /** Layers from the first surrounding to the second along the axis. */
    final List<Layer> layers = new ArrayList<>();

    /** Which surrounding comes first along the axis. */
    final int first;

    /** Σ film · length of the two surroundings, in the order of the axis, W/(m·K); infinite where a temperature is fixed. */
    final double[] films;

    private final Frame frame;
    private final RegionConduction conduction;

    /**
     * A layer between two planes.
     *
     * @param from along, m
     * @param to along, m
     * @param regions side by side in it, each once
     * @param atFrom ∫ k dv at its first plane, W/K
     * @param atTo the same at its second plane; in between it changes linearly
     */
    record Layer(double from, double to, List<Part> regions, double atFrom, double atTo) {
        /** ∫ du / ∫ k dv, m·K/W. */
        double resistance() {
            return Integral.ofInverse(to - from, atFrom, atTo);
        }
    }

    /** A region's share of a layer: its width at the two planes (m) and its conductivity W/(m·K) along. */
    record Part(int region, double atFrom, double atTo, double conductivity) {}

    private PlaneBound(Frame frame, RegionConduction conduction, int first, double[] films) {
        this.frame = frame;
        this.conduction = conduction;
        this.first = first;
        this.films = films;
    }

    /** Empty where the surroundings do not lie apart along the axis. */
    static Optional<PlaneBound> of(Frame frame, Surroundings surroundings, RegionConduction conduction) {
        Section section = frame.section();
        int count = section.segmentCount();
        double[] low = new double[count];
        double[] high = new double[count];
        for (int s = 0; s < count; s++) {
            double a = frame.u(section.start(s));
            double b = frame.u(section.end(s));
            low[s] = Math.min(a, b);
            high[s] = Math.max(a, b);
        }
        Sweep.join(low, high, count, frame.tolerance());
        double[] least = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
        double[] greatest = {Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (int s = 0; s < count; s++) {
            int side = surroundings.side(s);
            if (side != Surroundings.NEITHER) {
                least[side] = Math.min(least[side], low[s]);
                greatest[side] = Math.max(greatest[side], high[s]);
            }
        }
        for (int first = 0; first < 2; first++) {
            int second = 1 - first;
            if (greatest[first] <= least[second]) {
                double[] films = {surroundings.filmLength(section, first), surroundings.filmLength(section, second)};
                PlaneBound bound = new PlaneBound(frame, conduction, first, films);
                if (greatest[first] < least[second]) {
                    Sweep.run(low, high, greatest[first], least[second], bound::slice);
                }
                return Optional.of(bound);
            }
        }
        return Optional.empty();
    }

    Frame frame() {
        return frame;
    }

    /** m·K/W. */
    double resistance() {
        double sum = 1 / films[0] + 1 / films[1];
        for (Layer layer : layers) {
            sum += layer.resistance();
        }
        return sum;
    }

    private void slice(double from, double to, int[] active, int count) {
        double middle = 0.5 * (from + to);
        int[] crossed = Arrays.stream(active, 0, count)
                .boxed()
                .sorted(Comparator.comparingDouble(s -> frame.vAt(s, middle)))
                .mapToInt(Integer::intValue)
                .toArray();
        List<Part> parts = new ArrayList<>();
        double atFrom = 0;
        double atTo = 0;
        for (int i = 0; i + 1 < crossed.length; i++) {
            int region = frame.beyondAcross(crossed[i]);
            if (!frame.isSolid(region)) {
                continue;
            }
            double widthFrom = frame.vAt(crossed[i + 1], from) - frame.vAt(crossed[i], from);
            double widthTo = frame.vAt(crossed[i + 1], to) - frame.vAt(crossed[i], to);
            double k = conduction.conductivity(region, frame.direction());
            atFrom += k * widthFrom;
            atTo += k * widthTo;
            add(parts, new Part(region, widthFrom, widthTo, k));
        }
        layers.add(new Layer(from, to, parts, atFrom, atTo));
    }

    private static void add(List<Part> parts, Part part) {
        for (int i = 0; i < parts.size(); i++) {
            Part same = parts.get(i);
            if (same.region() == part.region()) {
                parts.set(
                        i,
                        new Part(
                                part.region(),
                                same.atFrom() + part.atFrom(),
                                same.atTo() + part.atTo(),
                                part.conductivity()));
                return;
            }
        }
        parts.add(part);
    }
}
