package tepor.solver.bracket;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.section.Section;
import tepor.solver.model.Air;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Region;
import tepor.solver.model.Values;

/**
 * The two surroundings between which heat flows, and the segments of the section that each holds.
 *
 * <p>There are exactly two, no heat is produced, and every other piece of the boundary is insulated; where a case is not
 * so, there is no bracket.
 */
public final class Surroundings {
    /** A segment that neither surrounding holds. */
    static final int NEITHER = -1;

    private final int[] side;
    private final double[] film;
    private final List<Set<String>> names = List.of(new LinkedHashSet<>(), new LinkedHashSet<>());
    private final double[] temperature = {Double.NaN, Double.NaN};

    private Surroundings(Section section) {
        side = new int[section.segmentCount()];
        Arrays.fill(side, NEITHER);
        film = new double[section.segmentCount()];
    }

    /** One exchange with a surrounding that an edge states. */
    private record Exchange(Edge edge, double film, double temperature, Air air) {}

    /** The surroundings of the case as stated: one for each of two temperatures. Empty where there are not two, or heat. */
    public static Optional<Surroundings> byTemperature(Case subject, Values values) {
        for (Region region : subject.regions()) {
            if (region.heat() != null && values.of(region.heat().amount()) != 0) {
                return Optional.empty();
            }
        }
        for (Edge edge : subject.edges()) {
            for (EdgeCondition condition : edge.conditions()) {
                if (condition instanceof EdgeCondition.Inflow inflow && values.of(inflow.amount()) != 0) {
                    return Optional.empty();
                }
            }
        }
        if (mixesAirs(subject)) {
            return Optional.empty();
        }
        Surroundings found = new Surroundings(subject.section());
        for (Exchange exchange : exchanges(subject, values)) {
            int which = found.whichTemperature(exchange.temperature());
            if (which == NEITHER || !found.take(which, exchange, subject.section())) {
                return Optional.empty();
            }
        }
        return found.both();
    }

    /** Two named airs as the only surroundings, heat off. Empty where there is a third, or one holds nothing. */
    public static Optional<Surroundings> ofAirs(Case subject, Values values, Air first, Air second) {
        Surroundings found = new Surroundings(subject.section());
        for (Exchange exchange : exchanges(subject, values)) {
            int which = first.equals(exchange.air()) ? 0 : second.equals(exchange.air()) ? 1 : NEITHER;
            if (which == NEITHER || !found.take(which, exchange, subject.section())) {
                return Optional.empty();
            }
        }
        return found.both();
    }

    /** Whether an edge exchanges heat with two airs at once: a flow into one of them is then a part of the edge's. */
    private static boolean mixesAirs(Case subject) {
        return subject.edges().stream()
                .anyMatch(edge -> subject.airs().stream()
                                .filter(air -> edge.conditions().stream().anyMatch(c -> isIn(c, air)))
                                .count()
                        > 1);
    }

    private static List<Exchange> exchanges(Case subject, Values values) {
        List<Exchange> all = new ArrayList<>();
        for (Edge edge : subject.edges()) {
            for (EdgeCondition condition : edge.conditions()) {
                if (condition instanceof EdgeCondition.FixedTemperature fixed) {
                    all.add(new Exchange(edge, Double.POSITIVE_INFINITY, values.of(fixed.temperature()), null));
                } else if (condition instanceof EdgeCondition.Film f) {
                    all.add(new Exchange(edge, values.of(f.coefficient()), values.of(f.airTemperature()), f.air()));
                } else if (condition instanceof EdgeCondition.SurfaceResistance r) {
                    all.add(new Exchange(edge, 1 / values.of(r.resistance()), values.of(r.airTemperature()), r.air()));
                }
            }
        }
        all.removeIf(exchange -> exchange.film() == 0);
        return all;
    }

    /** Whether a condition exchanges heat with a named air. */
    public static boolean isIn(EdgeCondition condition, Air air) {
        return condition instanceof EdgeCondition.Film f && air.equals(f.air())
                || condition instanceof EdgeCondition.SurfaceResistance r && air.equals(r.air());
    }

    private int whichTemperature(double wanted) {
        for (int which = 0; which < 2; which++) {
            if (Double.isNaN(temperature[which])) {
                temperature[which] = wanted;
            }
            if (temperature[which] == wanted) {
                return which;
            }
        }
        return NEITHER;
    }

    private boolean take(int which, Exchange exchange, Section section) {
        names.get(which)
                .add(
                        exchange.air() == null
                                ? exchange.edge().name()
                                : exchange.air().name());
        for (int segment : exchange.edge().pieces().segments()) {
            if (!section.isBoundary(segment) || side[segment] == 1 - which) {
                return false;
            }
            side[segment] = which;
            film[segment] += exchange.film();
        }
        return true;
    }

    private Optional<Surroundings> both() {
        boolean first = false;
        boolean second = false;
        for (int s : side) {
            first |= s == 0;
            second |= s == 1;
        }
        return first && second ? Optional.of(this) : Optional.empty();
    }

    /** Which surrounding holds a segment: 0, 1 or {@link #NEITHER}. */
    int side(int segment) {
        return side[segment];
    }

    /** Film coefficient on a segment, W/(m²·K); infinite where its temperature is fixed. */
    double film(int segment) {
        return film[segment];
    }

    /** Σ film · length of all that a surrounding holds, W/(m·K); infinite where a temperature is fixed. */
    double filmLength(Section section, int which) {
        double sum = 0;
        for (int s = 0; s < side.length; s++) {
            if (side[s] == which) {
                sum += film[s] * section.length(s);
            }
        }
        return sum;
    }

    /** Kelvin; NaN where a surrounding has none of its own here. */
    public double temperature(int which) {
        return temperature[which];
    }

    /** What people call it: its air, or the edges with its temperature. */
    public String name(int which) {
        return String.join(" and ", names.get(which));
    }

    /**
     * Which surrounding holds exactly these segments, insulated ones aside: 0 or 1, or −1 where neither does.
     *
     * @param segments segment numbers
     */
    public int heldBy(int[] segments) {
        int[] count = new int[2];
        for (int segment : segments) {
            if (side[segment] != NEITHER) {
                count[side[segment]]++;
            }
        }
        int[] all = new int[2];
        for (int s : side) {
            if (s != NEITHER) {
                all[s]++;
            }
        }
        if (count[0] == all[0] && count[1] == 0) {
            return 0;
        }
        return count[1] == all[1] && count[0] == 0 ? 1 : NEITHER;
    }
}
