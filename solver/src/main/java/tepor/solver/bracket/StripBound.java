package tepor.solver.bracket;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import tepor.mesher.section.Section;

/**
 * Lower bound of the conductance between two surroundings: adiabatic cuts along an axis make strips side by side, in each
 * of which heat passes its layers one after the other.
 *
 * <p>The flux it amounts to is free of sources and enters no insulated border, so that by Thomson's principle its
 * dissipation, with that in the films, is never below the true one at the same flow. Strips that end on an insulated
 * border carry nothing.
 */
final class StripBound {
    /** Strips, in the order met. */
    final List<Strip> strips = new ArrayList<>();

    private final Frame frame;
    private final Section section;
    private final Surroundings surroundings;
    private final RegionConduction conduction;

    /**
     * A strip, all of whose layers keep their order.
     *
     * @param from across, m
     * @param to across, m
     * @param layers from one surrounding to the other
     * @param films of the two ends, W/(m²·K) as they act per area across the strip; infinite where there is none
     * @param atFrom resistance at one flank, m²·K/W
     * @param atTo resistance at the other flank, m²·K/W; in between it changes linearly
     */
    record Strip(double from, double to, List<Layer> layers, double[] films, double atFrom, double atTo) {
        /** ∫ dv / R(v) with R linear, W/(m·K). */
        double conductance() {
            return Integral.ofInverse(to - from, atFrom, atTo);
        }
    }

    /** A layer of a strip: its region, thickness at the strip's two flanks (m), and conductivity W/(m·K) along. */
    record Layer(int region, double atFrom, double atTo, double conductivity) {}

    StripBound(Frame frame, Surroundings surroundings, RegionConduction conduction) {
        this.frame = frame;
        this.section = frame.section();
        this.surroundings = surroundings;
        this.conduction = conduction;
        int count = section.segmentCount();
        double[] low = new double[count];
        double[] high = new double[count];
        for (int s = 0; s < count; s++) {
            double a = frame.v(section.start(s));
            double b = frame.v(section.end(s));
            low[s] = Math.min(a, b);
            high[s] = Math.max(a, b);
        }
        Sweep.join(low, high, count, frame.tolerance());
        double from = Arrays.stream(low).min().orElse(0);
        double to = Arrays.stream(high).max().orElse(0);
        Sweep.run(low, high, from, to, this::cut);
    }

    Frame frame() {
        return frame;
    }

    /** W/(m·K). */
    double conductance() {
        double sum = 0;
        for (Strip strip : strips) {
            sum += strip.conductance();
        }
        return sum;
    }

    private void cut(double from, double to, int[] active, int count) {
        double middle = 0.5 * (from + to);
        int[] crossed = Arrays.stream(active, 0, count)
                .boxed()
                .sorted(Comparator.comparingDouble(s -> frame.uAt(s, middle)))
                .mapToInt(Integer::intValue)
                .toArray();
        int begin = -1;
        List<Layer> layers = new ArrayList<>();
        for (int i = 0; i < crossed.length; i++) {
            if (begin >= 0) {
                layers.add(layer(crossed[i - 1], crossed[i], from, to));
            }
            boolean solid = frame.isSolid(frame.beyondAlong(crossed[i]));
            if (!solid && begin >= 0) {
                finish(from, to, layers, crossed[begin], crossed[i]);
                layers = new ArrayList<>();
                begin = -1;
            } else if (solid && begin < 0) {
                begin = i;
            }
        }
    }

    private Layer layer(int below, int above, double from, double to) {
        int region = frame.beyondAlong(below);
        return new Layer(
                region,
                frame.uAt(above, from) - frame.uAt(below, from),
                frame.uAt(above, to) - frame.uAt(below, to),
                1 / conduction.resistivity(region, frame.direction()));
    }

    private void finish(double from, double to, List<Layer> layers, int first, int last) {
        int begin = surroundings.side(first);
        int end = surroundings.side(last);
        if (begin == Surroundings.NEITHER || end == Surroundings.NEITHER || begin == end) {
            return;
        }
        // Heat leaves an oblique border over a greater area than the strip is wide.
        double[] films = {surroundings.film(first) / frame.facing(first), surroundings.film(last) / frame.facing(last)};
        double atFrom = 1 / films[0] + 1 / films[1];
        double atTo = atFrom;
        for (Layer layer : layers) {
            atFrom += layer.atFrom() / layer.conductivity();
            atTo += layer.atTo() / layer.conductivity();
        }
        strips.add(new Strip(from, to, layers, films, atFrom, atTo));
    }
}
