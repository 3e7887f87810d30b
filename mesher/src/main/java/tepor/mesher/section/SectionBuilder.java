package tepor.mesher.section;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.LineString;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/**
 * Lays regions over each other and makes the section.
 *
 * <p>All borders are noded together ({@link BorderNoder}), the faces between them found ({@link Faces}), each given to the
 * last region over it ({@link FaceOwners}), and what separates nothing left out. Vertices keep the coordinates of the
 * drawing bit for bit, unless another vertex lies within snap: then the first one drawn stands for both.
 */
public final class SectionBuilder {
    private static final double DEFAULT_SNAP = 1e-7;
    /** Snap is never less than this many units in the last place of the largest coordinate. */
    private static final double LEAST_SNAP_IN_ULPS = 32;

    private final List<RegionShape> shapes;
    private final double snap;
    private final DrawingUnit unit;
    private final Findings findings;

    private SectionBuilder(List<RegionShape> shapes, double snap, DrawingUnit unit, Findings findings) {
        this.shapes = shapes;
        this.snap = snap;
        this.unit = unit;
        this.findings = findings;
    }

    /**
     * Builds the section.
     *
     * @param shapes regions in the order they are laid: later ones lie over earlier ones, and cut them
     * @param splitPoints points (metres) at which a segment they lie on, within snap, is split
     * @param cuts lines (metres) made part of the section where they run through material
     * @param snap distance below which two points are one, metres; NaN for 1e-7 of the extent
     * @param unit the drawing's unit, for coordinates in messages
     * @param findings takes what is wrong, and warnings
     * @return the section; empty where something was wrong
     */
    public static Optional<Section> build(
            List<RegionShape> shapes,
            List<Coordinate> splitPoints,
            List<LineString> cuts,
            double snap,
            DrawingUnit unit,
            Findings findings) {
        if (shapes.stream().allMatch(RegionShape::hole)) {
            Place place = shapes.isEmpty() ? new Place("", 0, 0) : shapes.get(0).place();
            String what = shapes.isEmpty() ? "the section has no region" : "all regions are of nothing";
            findings.error("no-material", place, what, "draw at least one region with a material");
            return Optional.empty();
        }
        return new SectionBuilder(shapes, snap(shapes, snap), unit, findings).build(splitPoints, cuts);
    }

    /**
     * The snap that a section of these regions has, metres.
     *
     * @param stated the snap stated, metres; NaN for 1e-7 of the extent
     */
    public static double snap(Collection<RegionShape> shapes, double stated) {
        Envelope all = new Envelope();
        shapes.forEach(s -> all.expandToInclude(s.polygons().getEnvelopeInternal()));
        double wanted = Double.isNaN(stated) ? DEFAULT_SNAP * all.getDiameter() : stated;
        double largest = Math.max(
                Math.max(Math.abs(all.getMinX()), Math.abs(all.getMaxX())),
                Math.max(Math.abs(all.getMinY()), Math.abs(all.getMaxY())));
        return Math.max(wanted, LEAST_SNAP_IN_ULPS * Math.ulp(largest));
    }

    private Optional<Section> build(List<Coordinate> splitPoints, List<LineString> cuts) {
        BorderNoder noder = new BorderNoder(shapes, cuts, snap);
        if (!noder.node()) {
            findings.error(
                    "snap-too-coarse",
                    shapes.get(0).place(),
                    "points of the outlines crowd so closely that they cannot be sorted out with a snap of "
                            + unit.length(snap),
                    "state a smaller snap");
            return Optional.empty();
        }
        List<Border> borders = noder.borders();
        Faces faces = new Faces(noder.vertices(), borders);
        FaceOwners owners = new FaceOwners(shapes, borders, faces);
        if (reportLost(owners)) {
            return Optional.empty();
        }
        return Optional.of(new SectionAssembler(shapes, snap, noder, faces, owners).assemble(splitPoints));
    }

    /** Reports regions of which nothing is left, and regions of nothing that cut nothing. */
    private boolean reportLost(FaceOwners owners) {
        BitSet visible = owners.visible();
        boolean lost = false;
        for (int r = 0; r < shapes.size(); r++) {
            RegionShape shape = shapes.get(r);
            if (shape.hole() && !owners.cuts(r)) {
                findings.warning(
                        "cuts-nothing",
                        shape.place(),
                        "region '" + shape.name() + "' is of nothing, but cuts nothing: no material lies under it",
                        "lay it after the regions which it is to cut");
            } else if (!shape.hole() && !visible.get(r)) {
                lost = true;
                reportCovered(shape, owners.ownersOver(r));
            }
        }
        return lost;
    }

    private void reportCovered(RegionShape shape, BitSet over) {
        if (over.isEmpty()) {
            findings.error(
                    "thinner-than-snap",
                    shape.place(),
                    "region '" + shape.name() + "' is nowhere thicker than snap, " + unit.length(snap),
                    "check the drawing's unit, or state a smaller snap");
            return;
        }
        List<String> names = new ArrayList<>();
        over.stream().forEach(r -> names.add("'" + shapes.get(r).name() + "'"));
        findings.error(
                "region-covered",
                shape.place(),
                "nothing is left of region '" + shape.name() + "': it lies wholly under "
                        + names.stream().collect(Collectors.joining(", ")),
                "state it after whatever lies over it, or leave it out");
    }
}
