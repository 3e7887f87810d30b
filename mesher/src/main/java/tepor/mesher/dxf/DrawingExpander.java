package tepor.mesher.dxf;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import java.util.Set;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;
import tepor.mesher.chain.Strand;
import tepor.mesher.curve.Placement;
import tepor.mesher.dxf.DxfFaults.Fault;
import tepor.mesher.dxf.PassedOver.Reason;
import tepor.mesher.outline.DrawingUnit;

/** Draws the entities of a drawing layer by layer, and puts blocks in where they are inserted. */
final class DrawingExpander {
    private static final int DEEPEST = 64;
    private static final int MOST_RECORDS = 500_000;
    private static final int EXTERNAL = 4 | 8 | 16;
    private static final String OF_BLOCKS = "0";
    /** What only keeps house. */
    private static final Set<String> SILENT = Set.of("VIEWPORT", "ATTDEF", "ATTRIB", "SEQEND");

    private final DxfDocument document;
    private final DrawingUnit unit;
    private final DxfFaults faults;
    private final EntityDrawer drawer;
    private final PassedOver passedOver = new PassedOver();
    private final DrawingLayers layers = new DrawingLayers();
    private final Deque<String> within = new ArrayDeque<>();
    private int records;

    private DrawingExpander(DxfDocument document, DrawingUnit unit, DxfFaults faults) {
        this.document = document;
        this.unit = unit;
        this.faults = faults;
        drawer = new EntityDrawer(unit);
    }

    /** Everything that can be seen in model space. */
    static DrawingLayers expand(DxfDocument document, DrawingUnit unit, DxfFaults faults) {
        DrawingExpander expander = new DrawingExpander(document, unit, faults);
        for (DxfRecord record : document.entities()) {
            expander.draw(record, Placement.IDENTITY, null);
        }
        if (expander.records > MOST_RECORDS) {
            faults.error(
                    "too-many-entities",
                    1,
                    "with all blocks put in, the drawing has more than " + MOST_RECORDS + " entities",
                    "draw only what the cross-section needs");
            return new DrawingLayers();
        }
        expander.passedOver.report(faults);
        return expander.layers;
    }

    /**
     * Draws one entity.
     *
     * @param outer the layer of the insert, on which things on layer 0 of a block come to lie; null outside of blocks
     */
    private void draw(DxfRecord record, Placement placement, DxfDocument.Layer outer) {
        if (++records > MOST_RECORDS || faults.isHopeless()) {
            return;
        }
        String written = DxfDecoder.name(record.text(8, OF_BLOCKS));
        DxfDocument.Layer layer = outer != null && written.equals(OF_BLOCKS) ? outer : document.layer(written);
        try {
            if (record.integer(67, 0) == 1) {
                passedOver.add(Reason.PAPER, record, layer.name());
            } else if (record.integer(60, 0) == 1) {
                passedOver.add(Reason.INVISIBLE, record, layer.name());
            } else if (layer.frozen() || (layer.off() && !record.type().equals("INSERT"))) {
                passedOver.add(Reason.HIDDEN, record, layer.name());
            } else if (record.type().equals("INSERT")) {
                insert(record, placement, layer);
            } else if (record.type().equals("POINT")) {
                Coordinate at =
                        placement.apply(record.requiredLength(10, "x", unit), record.requiredLength(20, "y", unit));
                noteHeight(record);
                layers.layer(layer.name()).spots().add(new DrawingLayers.Spot(at, record.line()));
            } else if (EntityDrawer.KINDS.contains(record.type())) {
                drawLine(record, placement, layer);
            } else if (!SILENT.contains(record.type())) {
                passedOver.add(Reason.KIND, record, layer.name());
            }
        } catch (Fault fault) {
            faults.error(fault);
        }
    }

    private void drawLine(DxfRecord record, Placement placement, DxfDocument.Layer layer) throws Fault {
        boolean inPlane = record.type().equals("LINE") || EntityDrawer.facing(record) != 0;
        if (!inPlane) {
            passedOver.add(Reason.ASLANT, record, layer.name());
        } else if (PolylineDrawer.isNet(record)) {
            passedOver.add(Reason.NET, record, layer.name());
        } else if (record.type().equals("SPLINE") && SplineDrawer.hasNoControlPoints(record)) {
            passedOver.add(Reason.FIT_POINTS, record, layer.name());
        } else {
            Optional<LineString> line = drawer.draw(record, placement);
            if (line.isEmpty()) {
                passedOver.add(Reason.NO_LENGTH, record, layer.name());
                return;
            }
            layers.layer(layer.name()).strands().add(Strand.of(line.get(), record.line()));
            noteHeight(record);
            noteWidth(record);
        }
    }

    private void noteHeight(DxfRecord record) throws Fault {
        boolean high = isHigh(record);
        for (DxfRecord vertex : record.children()) {
            high |= isHigh(vertex);
        }
        if (high) {
            passedOver.addHeight(record);
        }
    }

    private static boolean isHigh(DxfRecord record) throws Fault {
        for (DxfRecord.Group group : record.groups()) {
            boolean height = group.code() == 30
                    || (group.code() == 31 && !record.type().equals("SPLINE"))
                    || (group.code() == 38 && record.type().equals("LWPOLYLINE"));
            if (height && DxfRecord.number(group, record.type()) != 0) {
                return true;
            }
        }
        return false;
    }

    private void noteWidth(DxfRecord record) throws Fault {
        boolean wide = false;
        if (record.type().equals("LWPOLYLINE") || record.type().equals("POLYLINE")) {
            for (DxfRecord.Group group : record.groups()) {
                boolean width = group.code() == 40 || group.code() == 41 || group.code() == 43;
                wide |= width && DxfRecord.number(group, record.type()) != 0;
            }
            for (DxfRecord vertex : record.children()) {
                wide |= vertex.number(40, 0) != 0 || vertex.number(41, 0) != 0;
            }
        }
        if (wide) {
            passedOver.addWidth(record);
        }
    }

    private void insert(DxfRecord record, Placement placement, DxfDocument.Layer layer) throws Fault {
        String name = DxfDecoder.name(record.text(2, ""));
        Optional<DxfDocument.Block> block = document.block(name);
        if (block.isEmpty()) {
            throw fault(
                    record,
                    "unknown-block",
                    "inserts the block " + DxfFaults.quote(name) + ", which the file does not have",
                    "save the whole drawing, with its blocks, as DXF");
        }
        if ((block.get().head().integer(70, 0) & EXTERNAL) != 0
                && block.get().entities().isEmpty()) {
            passedOver.add(Reason.EXTERNAL, record, layer.name());
            return;
        }
        String key = block.get().name();
        if (within.contains(key) || within.size() >= DEEPEST) {
            throw fault(
                    record,
                    "block-in-itself",
                    within.contains(key)
                            ? "inserts the block " + DxfFaults.quote(name) + " into itself"
                            : "lies within more than " + DEEPEST + " blocks",
                    "take it out of the block");
        }
        if (EntityDrawer.facing(record) == 0) {
            passedOver.add(Reason.ASLANT, record, layer.name());
            return;
        }
        within.push(key);
        try {
            place(record, block.get(), EntityDrawer.plane(record, placement), layer);
        } finally {
            within.pop();
        }
    }

    private void place(DxfRecord record, DxfDocument.Block block, Placement placement, DxfDocument.Layer layer)
            throws Fault {
        double x = record.requiredLength(10, "x", unit);
        double y = record.requiredLength(20, "y", unit);
        Placement turn = Placement.turn(Math.toRadians(record.number(50, 0)));
        Placement own = Placement.shift(
                        -block.head().length(10, 0, unit), -block.head().length(20, 0, unit))
                .then(Placement.scale(record.number(41, 1), record.number(42, 1)))
                .then(turn);
        int columns = Math.max(1, record.integer(70, 1));
        int rows = Math.max(1, record.integer(71, 1));
        double columnStep = record.length(44, 0, unit);
        double rowStep = record.length(45, 0, unit);
        if (own.then(placement).isFlat()) {
            throw fault(
                    record,
                    "scale",
                    "is scaled by " + record.text(41, "1") + " and " + record.text(42, "1"),
                    "scale it by finite numbers other than zero");
        }
        noteHeight(record);
        for (int row = 0; row < rows && records <= MOST_RECORDS; row++) {
            for (int column = 0; column < columns && records <= MOST_RECORDS; column++) {
                records++;
                Coordinate step = turn.apply(column * columnStep, row * rowStep);
                Placement placed =
                        own.then(Placement.shift(x + step.x, y + step.y)).then(placement);
                for (DxfRecord inner : block.entities()) {
                    draw(inner, placed, layer);
                }
            }
        }
    }

    private static Fault fault(DxfRecord record, String code, String what, String remedy) {
        return new Fault(code, record.line(), "this INSERT " + what, remedy);
    }
}
