package tepor.solver.answer;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tepor.mesher.outline.Finding;
import tepor.mesher.section.Section;
import tepor.mesher.section.SegmentCurve;
import tepor.solver.assembly.Tensor;
import tepor.solver.model.Case;
import tepor.solver.model.Region;

/**
 * Finds points where four regions meet like a checkerboard, good conductors facing each other across poor ones. The heat
 * that crosses in such a point is resolved more slowly than any rounds of refinement show (R. B. Kellogg, On the Poisson
 * equation with intersecting interfaces, Applicable Analysis 4 (1975) 101–129), so a mesh error taken from the movement of
 * an answer may be too small.
 */
final class CrossingCheck {
    /** Contrast from which on it matters. */
    private static final double CONTRAST = 30;

    private CrossingCheck() {}

    static List<Finding> check(Case subject) {
        Section section = subject.section();
        List<List<Integer>> around = new ArrayList<>();
        for (int v = 0; v < section.vertexCount(); v++) {
            around.add(new ArrayList<>());
        }
        for (int s = 0; s < section.segmentCount(); s++) {
            if (section.isCut(s)) {
                continue;
            }
            around.get(section.start(s)).add(s);
            around.get(section.end(s)).add(s);
        }
        List<Finding> found = new ArrayList<>();
        for (int v = 0; v < section.vertexCount(); v++) {
            if (around.get(v).size() == 4 && isCheckerboard(subject, v, around.get(v))) {
                Region region = subject.regions()
                        .get(Math.max(section.left(around.get(v).get(0)), 0));
                found.add(new Finding(
                        Finding.Severity.WARNING,
                        "checkerboard",
                        region.place(),
                        "good and poor conductors meet like a checkerboard at "
                                + subject.unit().point(section.x(v), section.y(v))
                                + "; heat crosses there in a point, and the mesh errors of this case may be larger than"
                                + " estimated",
                        "draw the contact as it is, with the width or the gap it really has"));
            }
        }
        return found;
    }

    private static boolean isCheckerboard(Case subject, int v, List<Integer> segments) {
        Section section = subject.section();
        List<Integer> turned = new ArrayList<>(segments);
        turned.sort(Comparator.comparingDouble(s -> SegmentCurve.direction(section, s, section.start(s) == v)));
        double[] k = new double[4];
        for (int i = 0; i < 4; i++) {
            int s = turned.get(i);
            int region = section.start(s) == v ? section.left(s) : section.right(s);
            if (region == Section.NONE || section.isHole(region)) {
                return false;
            }
            Tensor tensor = Tensor.of(
                    subject.regions().get(region).material().conductivity(),
                    subject.inputs().nominal());
            k[i] = 0.5 * (tensor.xx() + tensor.yy());
        }
        return Math.min(k[0], k[2]) > CONTRAST * Math.max(k[1], k[3])
                || Math.min(k[1], k[3]) > CONTRAST * Math.max(k[0], k[2]);
    }
}
