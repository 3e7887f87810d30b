package tepor.mesher.mending;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;
import tepor.mesher.section.OutlineCheck;
import tepor.mesher.section.RegionShape;
import tepor.mesher.soundness.Closeness;
import tepor.mesher.soundness.DrawnPieces;
import tepor.mesher.soundness.NearRun;
import tepor.mesher.soundness.NearRunFinder;
import tepor.mesher.soundness.SectionCheck;

/**
 * Mends what the checks find in outlines, and lists each change.
 *
 * <p>First the points of each ring are merged and its spikes cut ({@link PointMender}), then a region that is still faulty
 * becomes the area that it means ({@link AreaMender}), then gaps and slivers between regions are closed by moving the later
 * onto the earlier ({@link NeighbourMender}). No point moves farther than {@link Closeness#gap} at a time. A region that is sound is
 * not touched. What cannot be mended remains as it was, and is named.
 */
public final class OutlineMender {
    private static final int PASSES_AT_MOST = 5;

    /** What is done about each kind of fault in a region's area. */
    private static final Map<String, String> REMEDIES = Map.ofEntries(
            Map.entry("self-crossing", "it now holds whatever its line goes around (the non-zero rule)"),
            Map.entry("self-overlap", "the doubled line is dropped"),
            Map.entry("self-touching", "it is split there into pieces or holes"),
            Map.entry("spike", "the spike is cut off"),
            Map.entry("zero-area", "the ring without area is dropped"),
            Map.entry("hole-outside", "the hole is kept where it lies within, and dropped outside"),
            Map.entry("ring-order", "the outer ring and the hole change places"),
            Map.entry("hole-overlap", "the holes are joined"),
            Map.entry("hole-at-side", "the hole becomes a notch, or is joined with the other"),
            Map.entry("falls-apart", "it becomes pieces of its own"),
            Map.entry("piece-overlap", "the pieces are joined"),
            Map.entry("piece-nested", "the inner piece is dropped, since it adds nothing"));

    private final List<RegionShape> shapes;
    private final DrawingUnit unit;
    private final Closeness closeness;
    private final List<Change> changes = new ArrayList<>();

    private OutlineMender(List<RegionShape> shapes, Closeness closeness, DrawingUnit unit) {
        this.shapes = new ArrayList<>(shapes);
        this.closeness = closeness;
        this.unit = unit;
    }

    /**
     * Mends.
     *
     * @param shapes regions in the order they are laid, faulty or not; Polygons and MultiPolygons
     * @param closeness what counts as close
     * @param unit the drawing's unit, for coordinates in messages
     */
    public static MendedOutline mend(List<RegionShape> shapes, Closeness closeness, DrawingUnit unit) {
        OutlineMender mender = new OutlineMender(shapes, closeness, unit);
        return mender.mend();
    }

    private MendedOutline mend() {
        for (int r = 0; r < shapes.size(); r++) {
            mendByItself(r);
        }
        List<RegionShape> sound = sound();
        if (sound.size() == shapes.size()) {
            boolean more = true;
            for (int pass = 0; pass < PASSES_AT_MOST && more; pass++) {
                more = mendNeighbours();
            }
        }
        Findings remaining = new Findings();
        for (RegionShape shape : shapes) {
            check(shape, remaining);
        }
        if (!remaining.hasErrors()) {
            SectionCheck.check(shapes, closeness, unit, remaining);
        }
        return new MendedOutline(shapes, changes, remaining.all());
    }

    private List<RegionShape> sound() {
        return shapes.stream().filter(s -> check(s, new Findings())).toList();
    }

    private boolean check(RegionShape shape, Findings findings) {
        return OutlineCheck.check(shape.name(), shape.polygons(), shape.place(), unit, findings);
    }

    private void mendByItself(int r) {
        Findings asDrawn = new Findings();
        check(shapes.get(r), asDrawn);
        if (asDrawn.all().stream()
                .anyMatch(f -> f.code().equals("not-finite") || f.code().equals("no-polygon"))) {
            return;
        }
        shapes.set(r, with(shapes.get(r), new PointMender(shapes.get(r), unit, closeness, changes).mend()));
        Findings found = new Findings();
        if (check(shapes.get(r), found)) {
            return;
        }
        RegionShape faulty = shapes.get(r);
        Geometry area = new AreaMender(closeness.snap()).mend(faulty.polygons());
        if (area.isEmpty() || !check(with(faulty, area), new Findings())) {
            return;
        }
        int pieces = area.getNumGeometries();
        for (Finding fault : found.all()) {
            if (fault.severity() == Finding.Severity.ERROR) {
                Coordinate at = area.getInteriorPoint().getCoordinate();
                String done = REMEDIES.getOrDefault(fault.code(), "it is made sound");
                changes.add(new Change(
                        "mended-" + fault.code(),
                        faulty.name(),
                        faulty.place(),
                        fault.what() + ": " + done + (pieces > 1 ? ", in " + pieces + " pieces" : "") + "; its area is "
                                + unit.area(Arcs.area(area)),
                        at,
                        Arcs.area(area)));
            }
        }
        shapes.set(r, with(faulty, area));
        // The new corners may lie close to old ones.
        RegionShape again = with(faulty, new PointMender(shapes.get(r), unit, closeness, changes).mend());
        if (check(again, new Findings())) {
            shapes.set(r, again);
        }
    }

    private static RegionShape with(RegionShape shape, Geometry polygons) {
        return new RegionShape(shape.name(), polygons, shape.hole(), shape.place());
    }

    /** Closes gaps and slivers once; whether anything was changed. */
    private boolean mendNeighbours() {
        DrawnPieces pieces = new DrawnPieces(shapes, closeness.snap());
        Map<Integer, List<NearRun>> byMover = new TreeMap<>();
        for (NearRun run : new NearRunFinder(pieces, closeness).runs()) {
            boolean closes = switch (run.kind()) {
                case GAP, OVERLAP, STRIP, SLIT -> true;
                case NEAR_POINT -> run.width() <= closeness.nearPoint();
                case LAYER -> false;
            };
            if (closes) {
                byMover.computeIfAbsent(run.second(), k -> new ArrayList<>()).add(run);
            }
        }
        boolean changed = false;
        for (Map.Entry<Integer, List<NearRun>> entry : byMover.entrySet()) {
            changed |= move(entry.getKey(), entry.getValue(), pieces);
        }
        return changed;
    }

    private boolean move(int region, List<NearRun> runs, DrawnPieces pieces) {
        RegionShape shape = shapes.get(region);
        NeighbourMender mender = new NeighbourMender(pieces, shape.polygons(), closeness);
        List<Change> closed = new ArrayList<>();
        Map<Integer, Set<Coordinate>> drawnOf = new HashMap<>();
        for (NearRun run : runs) {
            Set<Coordinate> drawn = drawnOf.computeIfAbsent(
                    run.first(),
                    r -> new HashSet<>(List.of(shapes.get(r).polygons().getCoordinates())));
            NeighbourMender.Asked asked = mender.take(run, region, drawn);
            if (asked.moved() + asked.inserted() > 0) {
                closed.add(change(run, asked));
            }
        }
        Geometry moved = mender.moved(shape.polygons());
        if (mender.movedCount() + mender.insertedCount() == 0) {
            return false;
        }
        List<Change> merged = new ArrayList<>();
        RegionShape candidate = with(shape, moved);
        candidate = with(candidate, new PointMender(candidate, unit, closeness, merged).mend());
        if (!check(candidate, new Findings())) {
            Geometry area = new AreaMender(closeness.snap()).mend(candidate.polygons());
            candidate = with(candidate, area);
            if (area.isEmpty() || !check(candidate, new Findings())) {
                return false;
            }
        }
        changes.addAll(closed);
        changes.addAll(merged);
        shapes.set(region, candidate);
        return true;
    }

    private Change change(NearRun run, NeighbourMender.Asked asked) {
        String mover = shapes.get(run.second()).name();
        String other = shapes.get(run.first()).name();
        String kind = switch (run.kind()) {
            case GAP -> "the gap between regions '" + other + "' and '" + mover + "'";
            case OVERLAP -> "the sliver in which regions '" + other + "' and '" + mover + "' overlap";
            case STRIP -> "the strip between the sides of regions '" + other + "' and '" + mover + "'";
            case SLIT -> "the slit between parts of region '" + mover + "'";
            default -> "the narrow place between regions '" + other + "' and '" + mover + "'";
        };
        String what = kind + ", up to " + unit.length(run.widest()) + " wide"
                + (run.length() > 0 ? " over a length of " + unit.length(run.length()) : "") + ", narrowest at "
                + unit.point(run.place().x, run.place().y) + ", is closed: " + count(asked.moved()) + " of '" + mover
                + "' moved, " + count(asked.inserted()) + " put in";
        return new Change("gap-closed", mover, shapes.get(run.second()).place(), what, run.place(), run.widest());
    }

    private static String count(int points) {
        return points == 1 ? "1 point" : points + " points";
    }
}
