package tepor.viewer.wording;

import java.util.Set;
import java.util.TreeSet;
import tepor.mesher.section.EdgePieces;
import tepor.mesher.section.Section;
import tepor.solver.model.Ask;
import tepor.solver.model.Target;

/** In which direction a heat flow is counted as positive, in words. */
public final class FlowDirection {
    private FlowDirection() {}

    /** {@code out} on the boundary, else such as {@code from bars to resin}. */
    public static String words(Ask.Flow ask, Section section) {
        if (!(ask.target() instanceof Target.OfEdge target)) {
            return "out";
        }
        EdgePieces pieces = target.edge().pieces();
        Set<String> from = new TreeSet<>();
        Set<String> to = new TreeSet<>();
        boolean boundary = true;
        boolean cut = true;
        for (int i = 0; i < pieces.segments().length; i++) {
            int s = pieces.segments()[i];
            boolean leftToRight = pieces.signs()[i] > 0;
            boundary &= section.isBoundary(s);
            cut &= section.isCut(s);
            from.add(name(section, leftToRight ? section.left(s) : section.right(s)));
            to.add(name(section, leftToRight ? section.right(s) : section.left(s)));
        }
        if (boundary) {
            return "out";
        }
        if (from.size() == 1 && !cut) {
            String source = from.iterator().next();
            return to.size() == 1 ? "from " + source + " to " + to.iterator().next() : "out of " + source;
        }
        return "from left to right";
    }

    private static String name(Section section, int region) {
        return region == Section.NONE ? "the surroundings" : section.regionName(region);
    }
}
