package tepor.solver.bracket;

import java.util.List;

/**
 * What the conductance between two surroundings lies between.
 *
 * @param low lower bound, W/(m·K), above zero
 * @param high upper bound, W/(m·K), finite
 * @param working how both were reckoned, line by line
 */
public record Bracket(double low, double high, List<String> working) {
    public Bracket {
        working = List.copyOf(working);
    }
}
