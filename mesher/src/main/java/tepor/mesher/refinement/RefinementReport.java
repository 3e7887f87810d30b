package tepor.mesher.refinement;

import java.util.ArrayList;
import java.util.List;

/**
 * Where refinement stopped short of what was asked, counted by reason.
 *
 * @param stops one entry for each place
 */
public record RefinementReport(List<Stop> stops) {
    public RefinementReport {
        stops = List.copyOf(stops);
    }

    /**
     * One triangle that stayed worse than asked.
     *
     * @param reason why
     * @param x a point in the triangle, metres
     * @param y a point in the triangle, metres
     */
    public record Stop(Reason reason, double x, double y) {}

    /** Why refinement stopped short. */
    public enum Reason {
        /** The outline itself has the small angle. */
        IMPOSED_BY_OUTLINE,
        /** A smaller triangle would fall below the smallest length that numbers of this extent can hold. */
        SIZE_FLOOR,
        /** The greatest number of triangles was reached. */
        ELEMENT_LIMIT,
        /** A side that stands for a piece of an arc was left straight, as no valid triangle has it curved. */
        ARC_LEFT_STRAIGHT
    }

    /** The same with more stops. */
    public RefinementReport with(List<Stop> more) {
        List<Stop> all = new ArrayList<>(stops);
        all.addAll(more);
        return new RefinementReport(all);
    }

    /** The first places at which it stopped short for a reason. */
    public List<Stop> first(Reason reason, int atMost) {
        return stops.stream().filter(s -> s.reason() == reason).limit(atMost).toList();
    }

    public long count(Reason reason) {
        return stops.stream().filter(s -> s.reason() == reason).count();
    }
}
