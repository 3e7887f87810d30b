package tepor.viewer.wording;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.section.Section;
import tepor.solver.answer.Insulated;

/**
 * One run of boundary that is insulated because nothing was stated on it.
 *
 * @param length metres
 * @param closed whether it comes back to where it begins
 * @param x1 metres, where it begins
 * @param y1 metres
 * @param x2 metres, where it ends
 * @param y2 metres
 */
public record InsulatedRun(double length, boolean closed, double x1, double y1, double x2, double y2) {
    /** All runs of a section. */
    public static List<InsulatedRun> of(Insulated insulated, Section section) {
        List<InsulatedRun> runs = new ArrayList<>();
        for (int[] segments : insulated.pieces()) {
            if (segments.length > 0) {
                runs.add(run(segments, section));
            }
        }
        return runs;
    }

    private static InsulatedRun run(int[] segments, Section section) {
        double length = 0;
        Map<Integer, Integer> uses = new HashMap<>();
        for (int s : segments) {
            length += section.length(s);
            uses.merge(section.start(s), 1, Integer::sum);
            uses.merge(section.end(s), 1, Integer::sum);
        }
        int[] ends = uses.entrySet().stream()
                .filter(e -> e.getValue() % 2 != 0)
                .mapToInt(Map.Entry::getKey)
                .sorted()
                .toArray();
        boolean closed = ends.length < 2;
        int first = closed ? section.start(segments[0]) : ends[0];
        int last = closed ? first : ends[ends.length - 1];
        return new InsulatedRun(length, closed, section.x(first), section.y(first), section.x(last), section.y(last));
    }

    /** Such as "120 mm from (0 0) mm to (120 0) mm". */
    public String words(DrawingUnit unit) {
        String size = unit.length(length);
        return closed
                ? size + " all round, through " + unit.point(x1, y1)
                : size + " from " + unit.point(x1, y1) + " to " + unit.point(x2, y2);
    }
}
