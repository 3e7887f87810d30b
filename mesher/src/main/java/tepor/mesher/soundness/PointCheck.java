package tepor.mesher.soundness;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LinearRing;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.section.ArcCutter;
import tepor.mesher.section.RegionShape;

/** Finds points that follow each other too closely, and needles: corners much longer than wide. */
public final class PointCheck {
    /** A corner this many times longer than wide, and narrower than a gap, is a needle. */
    public static final double NEEDLE = 20;

    private static final int PLACES_AT_MOST = 5;

    private final DrawingUnit unit;
    private final Closeness closeness;
    private final FindingList findings;

    PointCheck(DrawingUnit unit, Closeness closeness, FindingList findings) {
        this.unit = unit;
        this.closeness = closeness;
        this.findings = findings;
    }

    void check(RegionShape shape) {
        List<Coordinate> close = new ArrayList<>();
        double[] least = {Double.POSITIVE_INFINITY};
        ArcCutter.forEachRing(shape.polygons(), ring -> {
            Coordinate[] points = ring.getCoordinates();
            for (int i = 0; i + 1 < points.length; i++) {
                double distance = points[i].distance(points[i + 1]);
                if (distance > closeness.snap() && distance <= closeness.nearPoint()) {
                    close.add(points[i]);
                    least[0] = Math.min(least[0], distance);
                }
            }
            needles(shape, ring, points);
            return ring;
        });
        if (!close.isEmpty()) {
            List<String> places = close.stream()
                    .limit(PLACES_AT_MOST)
                    .map(c -> unit.point(c.x, c.y))
                    .toList();
            int more = close.size() - places.size();
            String what = "region '" + shape.name() + "' has points only " + unit.length(least[0])
                    + (close.size() > 1 ? " and little more apart, at " : " apart, at ") + String.join(", ", places)
                    + (more > 0 ? " and " + more + " more places" : "")
                    + ": not within snap (" + unit.length(closeness.snap()) + "), but less than "
                    + (int) Closeness.NEAR_POINT_SNAPS + " times that";
            findings.add(
                    new Finding(
                            Finding.Severity.WARNING,
                            "near-points",
                            shape.place(),
                            what,
                            "draw one point, or state snap = \"" + unit.length(2 * least[0]) + "\" under [outline]"),
                    least[0]);
        }
    }

    private void needles(RegionShape shape, LinearRing ring, Coordinate[] points) {
        int count = points.length - 1;
        for (int i = 0; i < count; i++) {
            int before = (i + count - 1) % count;
            if (Arcs.circle(ring, i) == null && Arcs.circle(ring, before) == null) {
                double width = needleWidth(points[before], points[i], points[i + 1]);
                double length = Math.min(points[i].distance(points[before]), points[i].distance(points[i + 1]));
                if (width > 0 && width <= closeness.gap() && length >= NEEDLE * width) {
                    boolean left = Orientation.index(points[before], points[i], points[i + 1]) > 0;
                    String kind = left == Orientation.isCCW(points) ? "a spike" : "a notch";
                    findings.add(
                            new Finding(
                                    Finding.Severity.WARNING,
                                    "needle",
                                    shape.place(),
                                    "region '" + shape.name() + "' has " + kind + " with its point at "
                                            + unit.point(points[i].x, points[i].y) + ", " + unit.length(length)
                                            + " long and " + unit.length(width) + " wide",
                                    "take its point out, or make it wider"),
                            width);
                }
            }
        }
    }

    /** Distance of the end of the shorter side from the other side, metres; 0 where the corner is not acute. */
    public static double needleWidth(Coordinate before, Coordinate here, Coordinate after) {
        double dot = (before.x - here.x) * (after.x - here.x) + (before.y - here.y) * (after.y - here.y);
        if (dot <= 0) {
            return 0;
        }
        return here.distance(before) <= here.distance(after)
                ? Distance.pointToSegment(before, here, after)
                : Distance.pointToSegment(after, here, before);
    }
}
