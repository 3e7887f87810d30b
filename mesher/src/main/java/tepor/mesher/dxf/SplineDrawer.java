package tepor.mesher.dxf;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import tepor.mesher.curve.ArcFitter;
import tepor.mesher.curve.Placement;
import tepor.mesher.curve.SplineCurve;
import tepor.mesher.dxf.DxfFaults.Fault;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.PathBuilder;

/** Draws SPLINE by its control points, knots and weights. */
final class SplineDrawer {
    private static final int HIGHEST_DEGREE = 10;
    private static final double CLOSED = 1e-9;

    private final DrawingUnit unit;

    SplineDrawer(DrawingUnit unit) {
        this.unit = unit;
    }

    /** Whether a SPLINE is given only by the points through which it was drawn, which leaves open how it runs between. */
    static boolean hasNoControlPoints(DxfRecord record) {
        return !record.has(10) && record.has(11);
    }

    Optional<PathBuilder> draw(DxfRecord record, Placement placement) throws Fault {
        int degree = record.integer(71, 3);
        if (degree < 1 || degree > HIGHEST_DEGREE) {
            throw fault(record, "has degree " + degree, "draw it with a degree from 1 to " + HIGHEST_DEGREE);
        }
        Coordinate[] points = points(record, placement);
        double[] knots = array(record.numbers(40));
        if (points.length <= degree) {
            throw fault(
                    record,
                    "has " + points.length + " control points, too few for its degree " + degree,
                    "give it more than " + degree + ", or draw it again");
        }
        if (knots.length != points.length + degree + 1) {
            throw fault(
                    record,
                    "has " + knots.length + " knots, where " + points.length + " control points and degree " + degree
                            + " make " + (points.length + degree + 1),
                    "draw it again");
        }
        checkKnots(record, knots, degree);
        SplineCurve curve = new SplineCurve(degree, knots, points, weights(record, points.length));
        double[] start = new double[4];
        double[] last = new double[4];
        int span = curve.spanCount() - 1;
        curve.at(0, curve.spanStart(0), start);
        curve.at(span, curve.spanEnd(span), last);
        Envelope box = new Envelope();
        Arrays.stream(points).forEach(box::expandToInclude);
        Coordinate from = new Coordinate(start[0], start[1]);
        Coordinate to = new Coordinate(last[0], last[1]);
        if (from.distance(to) <= CLOSED * box.getDiameter()) {
            to = from;
        }
        PathBuilder path = new PathBuilder(from);
        ArcFitter.follow(curve, path, EntityDrawer.TOLERANCE * box.getDiameter(), to);
        return Optional.of(path);
    }

    private Coordinate[] points(DxfRecord record, Placement placement) throws Fault {
        List<Double> x = record.lengths(10, unit);
        List<Double> y = record.lengths(20, unit);
        if (x.size() != y.size()) {
            throw fault(record, "has " + x.size() + " x and " + y.size() + " y of control points", "draw it again");
        }
        Coordinate[] points = new Coordinate[x.size()];
        for (int i = 0; i < points.length; i++) {
            points[i] = placement.apply(x.get(i), y.get(i));
        }
        return points;
    }

    private static void checkKnots(DxfRecord record, double[] knots, int degree) throws Fault {
        for (int i = 1; i < knots.length; i++) {
            if (knots[i] < knots[i - 1]) {
                throw fault(
                        record, "has knots that go down, from " + knots[i - 1] + " to " + knots[i], "draw it again");
            }
        }
        double first = knots[degree];
        double last = knots[knots.length - degree - 1];
        if (!(last > first) || !Double.isFinite(last - first)) {
            throw fault(record, "has no length: its knots are all " + first, "draw it again, or delete it");
        }
        for (int i = 0; i + degree < knots.length; i++) {
            if (knots[i] == knots[i + degree]
                    && knots[i] > first
                    && knots[i] < last
                    && degree > 1
                    && i + degree + 1 < knots.length
                    && knots[i + degree + 1] == knots[i]) {
                throw fault(
                        record, "falls apart at the knot " + knots[i] + ", which stands too often", "draw it again");
            }
        }
    }

    private static double[] weights(DxfRecord record, int count) throws Fault {
        double[] weights = array(record.numbers(41));
        if (weights.length == 0) {
            weights = new double[count];
            Arrays.fill(weights, 1);
        }
        if (weights.length != count) {
            throw fault(record, "has " + weights.length + " weights for " + count + " control points", "draw it again");
        }
        for (double weight : weights) {
            if (!(weight > 0)) {
                throw fault(record, "has a weight of " + weight, "give it weights greater than zero");
            }
        }
        return weights;
    }

    private static double[] array(List<Double> numbers) {
        return numbers.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private static Fault fault(DxfRecord record, String what, String remedy) {
        return new Fault("spline", record.line(), "this SPLINE " + what, remedy);
    }
}
