package tepor.solver.model;

import java.util.List;
import java.util.Map;
import tepor.mesher.outline.Place;

/** A figure wanted, with its limit and tolerance. */
public sealed interface Ask {
    /** What every ask has. */
    Head head();

    /** The key by which the case file and the output call this kind of ask. */
    String kind();

    default String name() {
        return head().name();
    }

    /**
     * What every ask has.
     *
     * @param name its name in the case
     * @param limit null where it has none
     * @param within how close the mesh must bring the answer
     * @param with other values (SI) of some inputs, for this ask alone; empty where it takes the case as it is
     * @param place where the user wrote it
     */
    record Head(String name, Limit limit, Within within, Map<Input, Double> with, Place place) {
        public Head {
            with = Map.copyOf(with);
        }
    }

    /** Highest temperature and where it is. */
    record Peak(Head head, Target target) implements Ask {
        @Override
        public String kind() {
            return "peak";
        }
    }

    /** Lowest temperature and where it is. */
    record Lowest(Head head, Target target) implements Ask {
        @Override
        public String kind() {
            return "lowest";
        }
    }

    /** Mean temperature by area or length. */
    record Mean(Head head, Target target) implements Ask {
        @Override
        public String kind() {
            return "mean";
        }
    }

    /** Temperature at a point (metres; already moved onto the section where it lay just off). */
    record At(Head head, double x, double y) implements Ask {
        @Override
        public String kind() {
            return "at";
        }
    }

    /** Heat flow, positive out of the section. */
    record Flow(Head head, Target target) implements Ask {
        @Override
        public String kind() {
            return "flow";
        }
    }

    /** Thermal coupling coefficient: the flow into {@code to} with {@code from} at 1 K and everything else at 0. */
    record Coupling(Head head, Air from, Air to) implements Ask {
        @Override
        public String kind() {
            return "coupling";
        }
    }

    /** Linear thermal transmittance (ISO 10211:2017): coupling less the sum of u·length. */
    record Transmittance(Head head, Air from, Air to, List<Less> less) implements Ask {
        public Transmittance {
            less = List.copyOf(less);
        }

        @Override
        public String kind() {
            return "transmittance";
        }
    }

    /** One one-dimensional part that a transmittance leaves out. {@code u} in W/(m²·K), {@code length} in m. */
    record Less(Input u, Input length) {}

    /** Surface temperature factor (T_min − T_outer)/(T_inner − T_outer) of an edge. */
    record Factor(Head head, Edge edge, Air inner, Air outer) implements Ask {
        @Override
        public String kind() {
            return "factor";
        }
    }

    /** One answer less another. */
    record Difference(Head head, Ask first, Ask second) implements Ask {
        @Override
        public String kind() {
            return "difference";
        }
    }
}
