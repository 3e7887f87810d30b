package tepor.solver.bracket;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tepor.mesher.mesh.SegmentCurve;
import tepor.mesher.section.Section;
import tepor.solver.model.Case;
import tepor.solver.model.Values;

/**
 * Finds the narrowest bracket that strips, planes, rays and circles give.
 *
 * <p>Every lower bound is below the true conductance of the section as drawn and every upper one above it, so that the
 * greatest and the least may be taken whatever they come from. Strips and planes are integrated in closed form, rays and
 * circles by quadrature to about nine digits.
 *
 * <p>All take segments for straight, so a section with arcs has no bracket.
 */
public final class BracketFinder {
    /** Where rounding puts a lower bound above an upper one that it equals, relative. */
    private static final double ROUNDING = 1e-7;

    private final Case subject;
    private final Section section;
    private final Surroundings surroundings;
    private final RegionConduction conduction;
    private final Working working;

    private double low;
    private double high = Double.POSITIVE_INFINITY;
    private List<String> lowWorking = List.of();
    private List<String> highWorking = List.of();

    private BracketFinder(Case subject, Values values, Surroundings surroundings) {
        this.subject = subject;
        this.section = subject.section();
        this.surroundings = surroundings;
        this.conduction = new RegionConduction(subject, values);
        this.working = new Working(subject, surroundings);
    }

    /** The bracket; empty where the section allows none with both ends. */
    public static Optional<Bracket> between(Case subject, Values values, Surroundings surroundings) {
        return new BracketFinder(subject, values, surroundings).find();
    }

    private Optional<Bracket> find() {
        if (SegmentCurve.hasArcs(section)) {
            return Optional.empty();
        }
        for (boolean upright : new boolean[] {true, false}) {
            Frame frame = new Frame(section, upright);
            take(new StripBound(frame, surroundings, conduction));
            PlaneBound.of(frame, surroundings, conduction).ifPresent(this::take);
        }
        if (conduction.isUniform()) {
            double[] lengths = {surroundings.filmLength(section, 0), surroundings.filmLength(section, 1)};
            for (int side = 0; side < 2; side++) {
                centre(side).flatMap(c -> Polar.of(section, c[0], c[1])).ifPresent(polar -> {
                    take(polar, new RayBound(polar, surroundings, conduction));
                    CircleBound.of(polar, surroundings, conduction, lengths).ifPresent(bound -> take(polar, bound));
                });
            }
        }
        if (!(low > 0) || !(high < Double.POSITIVE_INFINITY) || low > high * (1 + ROUNDING)) {
            return Optional.empty();
        }
        List<String> lines = new ArrayList<>(lowWorking);
        lines.addAll(highWorking);
        return Optional.of(new Bracket(Math.min(low, high), Math.max(low, high), lines));
    }

    private void take(StripBound bound) {
        double conductance = bound.conductance();
        // What rounding alone makes greater does not take the place of a simpler working.
        if (conductance > low * (1 + ROUNDING)) {
            low = conductance;
            lowWorking = working.of(subject.unit(), bound);
        }
    }

    private void take(Polar polar, RayBound bound) {
        if (bound.conductance() > low * (1 + ROUNDING)) {
            low = bound.conductance();
            lowWorking = working.of(subject.unit(), polar, bound);
        }
    }

    private void take(PlaneBound bound) {
        double conductance = 1 / bound.resistance();
        if (conductance < high * (1 - ROUNDING)) {
            high = conductance;
            highWorking = working.of(subject.unit(), bound);
        }
    }

    private void take(Polar polar, CircleBound bound) {
        double conductance = 1 / bound.resistance();
        if (conductance < high * (1 - ROUNDING)) {
            high = conductance;
            highWorking = working.of(subject.unit(), polar, bound);
        }
    }

    /**
     * Centre of the circle that fits the corners of a surrounding's segments best: the least squares of x² + y² + Dx + Ey +
     * F (Kåsa 1976). A centre that fits badly costs sharpness, never validity. Empty where the corners lie on a line.
     */
    private Optional<double[]> centre(int side) {
        double weight = 0;
        double meanX = 0;
        double meanY = 0;
        for (int s = 0; s < section.segmentCount(); s++) {
            if (surroundings.side(s) == side) {
                for (int v : new int[] {section.start(s), section.end(s)}) {
                    weight++;
                    meanX += section.x(v);
                    meanY += section.y(v);
                }
            }
        }
        meanX /= weight;
        meanY /= weight;
        double xx = 0;
        double xy = 0;
        double yy = 0;
        double xz = 0;
        double yz = 0;
        for (int s = 0; s < section.segmentCount(); s++) {
            if (surroundings.side(s) == side) {
                for (int v : new int[] {section.start(s), section.end(s)}) {
                    double x = section.x(v) - meanX;
                    double y = section.y(v) - meanY;
                    double z = x * x + y * y;
                    xx += x * x;
                    xy += x * y;
                    yy += y * y;
                    xz += x * z;
                    yz += y * z;
                }
            }
        }
        double determinant = xx * yy - xy * xy;
        if (!(determinant > 1e-12 * (xx + yy) * (xx + yy))) {
            return Optional.empty();
        }
        double x = meanX + 0.5 * (xz * yy - yz * xy) / determinant;
        double y = meanY + 0.5 * (yz * xx - xz * xy) / determinant;
        // A centre at the origin would show its rounding.
        double nothing = 1e-12 * section.extent();
        return Optional.of(new double[] {Math.abs(x) < nothing ? 0 : x, Math.abs(y) < nothing ? 0 : y});
    }
}
