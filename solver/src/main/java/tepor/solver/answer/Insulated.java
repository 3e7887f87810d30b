package tepor.solver.answer;

import java.util.List;

/**
 * How much of the boundary is insulated.
 *
 * @param stated metres on which the user said so
 * @param byDefault metres on which nothing was stated
 * @param pieces section segments insulated by default, joined to runs: each a list of segment numbers
 */
public record Insulated(double stated, double byDefault, List<int[]> pieces) {
    public Insulated {
        pieces = List.copyOf(pieces);
    }
}
