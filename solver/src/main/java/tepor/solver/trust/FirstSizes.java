package tepor.solver.trust;

import java.util.BitSet;
import java.util.List;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.strtree.STRtree;
import tepor.mesher.refinement.SizeField;
import tepor.solver.model.Case;

/**
 * Sizes of the first mesh, from the section alone: a base size everywhere, shrinking towards the points where the flux is
 * expected to vary without limit.
 */
public final class FirstSizes implements SizeField {
    /** About so many triangles would fill the section at the base size. */
    private static final double TRIANGLES_LINEAR = 1500;

    private static final double TRIANGLES_QUADRATIC = 600;

    /** A size is the longest side wanted; the sides of a mesh come out shorter by this on average. */
    private static final double LONGEST_TO_MEAN = 1.7;

    /** Growth of the size with the distance from a singular point. */
    private static final double GRADATION = 0.6;

    /** Size at a singular point, relative to its clearance. */
    private static final double TIP = 0.04;

    /**
     * For so many singular points the size at each is that above; for more, as of a grid of bars or a ragged outline, it is
     * greater by as much, so that the first mesh stays small. The adaptive rounds find out which of them matter.
     */
    private static final double MANY = 150;
    /** Sizes at singular points above this part of the clearance change nothing that the outline does not ask for. */
    private static final double LARGEST_TIP = 0.5;

    private static final int CELLS = 128;

    private final double base;
    private final double tip;
    private final STRtree tree = new STRtree();

    /** Cells of a grid over the section in which a point can matter, row by row: most questions end here. */
    private final BitSet near = new BitSet();

    private final double[] bounds;

    public FirstSizes(Case subject) {
        bounds = subject.section().bounds();
        double area = 0;
        for (int r = 0; r < subject.section().regionCount(); r++) {
            if (!subject.section().isHole(r)) {
                area += subject.section().area(r);
            }
        }
        double count = subject.mesh().nodesPerTriangle() == 3 ? TRIANGLES_LINEAR : TRIANGLES_QUADRATIC;
        base = Math.min(subject.mesh().size(), LONGEST_TO_MEAN * Math.sqrt(4 / Math.sqrt(3) * area / count));
        List<SingularPoints.Point> points = SingularPoints.of(subject);
        tip = TIP * Math.max(1, points.size() / MANY);
        for (SingularPoints.Point point : tip < LARGEST_TIP ? points : List.<SingularPoints.Point>of()) {
            double reach = base / GRADATION;
            tree.insert(
                    new Envelope(point.x() - reach, point.x() + reach, point.y() - reach, point.y() + reach), point);
            int right = column(point.x() + reach);
            for (int row = row(point.y() - reach); row <= row(point.y() + reach); row++) {
                near.set(CELLS * row + column(point.x() - reach), CELLS * row + right + 1);
            }
        }
        tree.build();
    }

    @Override
    public double gradation() {
        return GRADATION;
    }

    @Override
    public double at(double x, double y) {
        double size = base;
        if (!near.get(CELLS * row(y) + column(x))) {
            return size;
        }
        for (Object item : tree.query(new Envelope(x, x, y, y))) {
            SingularPoints.Point point = (SingularPoints.Point) item;
            double distance = Math.hypot(x - point.x(), y - point.y());
            size = Math.min(size, tip * point.clearance() + GRADATION * distance);
        }
        return size;
    }

    private int column(double x) {
        return cell((x - bounds[0]) / (bounds[2] - bounds[0]));
    }

    private int row(double y) {
        return cell((y - bounds[1]) / (bounds[3] - bounds[1]));
    }

    private static int cell(double part) {
        return Math.max(0, Math.min(CELLS - 1, (int) (CELLS * part)));
    }
}
