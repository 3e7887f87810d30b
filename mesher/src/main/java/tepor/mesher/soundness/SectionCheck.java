package tepor.mesher.soundness;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.algorithm.locate.PointOnGeometryLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.Location;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Finding.Severity;
import tepor.mesher.outline.Findings;
import tepor.mesher.section.ArcFlattener;
import tepor.mesher.section.RegionShape;

/**
 * Finds what is wrong between regions that are sound one by one, and what would make a mesh huge: gaps and slivers between
 * neighbours, points that nearly meet, needles, regions drawn twice; and notes thin layers and partial overlaps.
 */
public final class SectionCheck {
    /** Triangles that grow along a strip, per length over width; measured with the default angle and gradation. */
    private static final double TRIANGLES_PER_SQUARE = 8;
    /** A gap that would take more triangles than these is an error: nobody draws that on purpose. */
    private static final double TRIANGLES_AT_MOST = 500_000;

    private final List<RegionShape> shapes;
    private final Closeness closeness;
    private final DrawingUnit unit;
    private final Map<Integer, PointOnGeometryLocator> locators = new HashMap<>();
    private final ArcFlattener flattener;
    private final FindingList list = new FindingList();

    private SectionCheck(List<RegionShape> shapes, Closeness closeness, DrawingUnit unit) {
        this.shapes = shapes;
        this.closeness = closeness;
        this.unit = unit;
        flattener = new ArcFlattener(closeness.snap());
    }

    /**
     * Checks.
     *
     * @param shapes regions in the order they are laid, each sound by itself
     * @param closeness what counts as close
     * @param unit the drawing's unit, for coordinates in messages
     * @param findings takes what is found
     */
    public static void check(List<RegionShape> shapes, Closeness closeness, DrawingUnit unit, Findings findings) {
        SectionCheck check = new SectionCheck(shapes, closeness, unit);
        check.run();
        check.list.tell(findings);
    }

    private void run() {
        PointCheck points = new PointCheck(unit, closeness, list);
        shapes.forEach(points::check);
        findTwice();
        DrawnPieces pieces = new DrawnPieces(shapes, closeness.snap());
        NearRunFinder finder = new NearRunFinder(pieces, closeness);
        finder.runs().forEach(this::tell);
        for (PartialOverlaps.Overlap overlap : PartialOverlaps.find(shapes, pieces, finder.pairs(), closeness)) {
            tell(overlap);
        }
    }

    private void findTwice() {
        Map<Envelope, Integer> seen = new HashMap<>();
        for (int r = 0; r < shapes.size(); r++) {
            Geometry shape = shapes.get(r).polygons();
            Integer first = seen.putIfAbsent(shape.getEnvelopeInternal(), r);
            if (first != null
                    && shape.getNumPoints() == shapes.get(first).polygons().getNumPoints()
                    && shape.norm().equalsExact(shapes.get(first).polygons().norm(), closeness.snap())) {
                list.add(
                        new Finding(
                                Severity.WARNING,
                                "drawn-twice",
                                shapes.get(r).place(),
                                names(first, r) + " have the same outline, of "
                                        + unit.area(Arcs.area(shapes.get(r).polygons()))
                                        + ": the later hides the earlier",
                                "leave one of them out"),
                        0);
            }
        }
    }

    private void tell(NearRun run) {
        boolean empty = run.lengthOverWidth() > 0 && isEmpty(run.place());
        double triangles = empty ? 0 : TRIANGLES_PER_SQUARE * run.lengthOverWidth();
        String size = (run.widest() > 1.05 * run.width() ? unit.length(run.width()) + " to " : "")
                + unit.length(run.widest())
                + (run.length() > 0 ? " wide over a length of " + unit.length(run.length()) : "") + ", narrowest at "
                + unit.point(run.place().x, run.place().y);
        String cost = triangles > 1000
                ? String.format(Locale.ROOT, "; meshing it takes about %,.0f triangles", rounded(triangles))
                : "";
        String snapRemedy =
                "state snap = \"" + unit.length(rounded(1.5 * run.widest())) + "\" under [outline], or draw them";
        String name = "'" + shapes.get(run.second()).name() + "'";
        boolean huge = triangles > TRIANGLES_AT_MOST;
        switch (run.kind()) {
            case NEAR_POINT ->
                add(
                        false,
                        "near-miss",
                        run,
                        (run.first() == run.second()
                                        ? "region " + name + " comes within " + unit.length(run.width())
                                                + " of itself at "
                                        : names(run) + " come within " + unit.length(run.width())
                                                + " of each other at ")
                                + unit.point(run.place().x, run.place().y),
                        snapRemedy + " touching, or farther apart");
            case GAP ->
                add(
                        huge,
                        "gap",
                        run,
                        "between " + names(run) + " there is a gap, " + size
                                + (empty ? "; nothing is in it, so that no heat passes" : cost),
                        snapRemedy + " touching; a layer that is meant is a region of its own");
            case OVERLAP ->
                add(
                        huge,
                        "sliver",
                        run,
                        names(run) + " overlap in a sliver, " + size + cost,
                        snapRemedy + " touching; a layer that is meant is a region of its own");
            case STRIP ->
                add(
                        huge,
                        "strip",
                        run,
                        "between the sides of " + names(run) + " a strip is left, " + size + cost,
                        snapRemedy + " touching; a layer that is meant is a region of its own");
            case SLIT ->
                add(
                        huge,
                        "slit",
                        run,
                        "between parts of region " + name + " there is a slit, " + size + cost,
                        snapRemedy + " touching; a slit that is meant is a region of nothing of its own");
            case LAYER ->
                list.add(
                        new Finding(
                                Severity.NOTE,
                                "thin-layer",
                                shapes.get(run.second()).place(),
                                (run.first() == run.second()
                                                ? "region " + name + " is a thin layer, "
                                                : "between " + names(run)
                                                        + ", one within the other, a thin layer is left, ")
                                        + size
                                        + cost,
                                ""),
                        run.width());
        }
    }

    /** Whether no material lies at a place. */
    private boolean isEmpty(Coordinate place) {
        for (int r = shapes.size() - 1; r >= 0; r--) {
            Geometry polygons = shapes.get(r).polygons();
            if (polygons.getEnvelopeInternal().contains(place)) {
                PointOnGeometryLocator locator =
                        locators.computeIfAbsent(r, k -> new IndexedPointInAreaLocator(flattener.flatten(polygons)));
                if (locator.locate(place) != Location.EXTERIOR) {
                    return shapes.get(r).hole();
                }
            }
        }
        return true;
    }

    private void add(boolean huge, String code, NearRun run, String what, String remedy) {
        Severity severity = huge ? Severity.ERROR : Severity.WARNING;
        list.add(new Finding(severity, code, shapes.get(run.second()).place(), what, remedy), run.width());
    }

    private void tell(PartialOverlaps.Overlap overlap) {
        String area = Double.isNaN(overlap.area()) ? "" : ", with " + unit.area(overlap.area()) + " in common";
        list.add(
                new Finding(
                        Severity.NOTE,
                        "partial-overlap",
                        shapes.get(overlap.second()).place(),
                        names(overlap.first(), overlap.second()) + " overlap in part" + area + ", at "
                                + unit.point(overlap.place().x, overlap.place().y) + ": there '"
                                + shapes.get(overlap.second()).name() + "' counts",
                        ""),
                Double.isNaN(overlap.area()) ? 0 : -overlap.area());
    }

    private String names(NearRun run) {
        return names(run.first(), run.second());
    }

    private String names(int first, int second) {
        return "regions '" + shapes.get(first).name() + "' and '"
                + shapes.get(second).name() + "'";
    }

    /** Two significant digits, upwards for lengths that are to suffice. */
    private static double rounded(double value) {
        double unitOfTwo = Math.pow(10, Math.floor(Math.log10(value)) - 1);
        return Math.ceil(value / unitOfTwo - 1e-6) * unitOfTwo;
    }
}
