package tepor.solver.answer;

import java.util.List;

/**
 * One-dimensional resistances in series and parallel, which bracket a heat flow or a coupling.
 *
 * @param low lower bracket, SI, in the unit of the answer it stands beside
 * @param high upper bracket
 * @param inside whether the computed value lies within the bracket, or leaves it by no more than its mesh error
 * @param working how it was reckoned, line by line, in words and figures that a checker can follow
 */
public record HandCheck(double low, double high, boolean inside, List<String> working) {
    public HandCheck {
        working = List.copyOf(working);
    }
}
