package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.util.PolygonExtracter;
import tepor.mesher.outline.Outline;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.outline.Place;
import tepor.mesher.section.OutlineCheck;
import tepor.mesher.section.RegionShape;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.KeyTable.Value;

/** Finds the outline of a region: written in the case, or the records of its name in the drawing's file. */
final class OutlineFinder {
    private final Drawing drawing;
    private final RecordUse recordUse;

    /**
     * @param drawing the drawing
     * @param recordUse takes which records are used
     */
    OutlineFinder(Drawing drawing, RecordUse recordUse) {
        this.drawing = drawing;
        this.recordUse = recordUse;
    }

    /** The outline of the region in a table; empty, with errors, where it is missing or faulty. */
    Optional<RegionShape> find(String name, boolean hole, KeyTable table) {
        Optional<Value> inline = table.value("outline");
        if (inline.isPresent()) {
            Place place = inline.get().place();
            return drawing.geometry(inline.get(), "an area", "POLYGON", "MULTIPOLYGON")
                    .filter(g -> OutlineCheck.check(name, g, place, drawing.unit(), table.findings()))
                    .map(g -> new RegionShape(name, g, hole, place));
        }
        recordUse.use(OutlineElement.Kind.REGION, name);
        if (!drawing.stated()) {
            table.findings()
                    .error(
                            "outline-missing",
                            table.place(),
                            table.label() + " has no outline, and the case names no outline file",
                            "write outline = \"POLYGON ((…))\" (or CURVEPOLYGON), or name a file under [outline]");
            return Optional.empty();
        }
        // A file that cannot be read was reported where it is named.
        return drawing.outline().flatMap(o -> inFile(name, hole, table, o));
    }

    private Optional<RegionShape> inFile(String name, boolean hole, KeyTable table, Outline outline) {
        List<OutlineElement> records = outline.find(name, OutlineElement.Kind.REGION);
        if (records.isEmpty()) {
            noRecord(name, table, outline);
            return Optional.empty();
        }
        boolean sound = true;
        for (OutlineElement record : records) {
            sound &= OutlineCheck.check(name, record.shape(), record.place(), drawing.unit(), table.findings());
        }
        Place first = records.get(0).place();
        Geometry shape = records.size() == 1 ? records.get(0).shape() : together(records);
        if (records.size() > 1 && sound) {
            sound = OutlineCheck.check(name, shape, first, drawing.unit(), table.findings());
        }
        return sound ? Optional.of(new RegionShape(name, shape, hole, first)) : Optional.empty();
    }

    private void noRecord(String name, KeyTable table, Outline outline) {
        List<OutlineElement> lines = outline.find(name, OutlineElement.Kind.LINE);
        boolean other = !lines.isEmpty()
                || !outline.find(name, OutlineElement.Kind.POINT).isEmpty();
        List<String> known = drawing.names(OutlineElement.Kind.REGION);
        String what = !other
                ? "it states none, and " + drawing.fileName() + " has no " + drawing.named() + " of that name"
                        + (drawing.dxf() ? " with a closed loop" : "")
                : drawing.dxf()
                        ? "in " + drawing.fileName() + " its layer has no closed loop" + open(lines)
                        : "in " + drawing.fileName() + " its record is a " + (lines.isEmpty() ? "point" : "line");
        String remedy = drawing.dxf()
                ? "close the loop in the drawing, or state a snap greater than the gap"
                : "make the record a POLYGON, MULTIPOLYGON or CURVEPOLYGON";
        table.findings()
                .error(
                        "outline-missing",
                        table.place("name"),
                        table.label() + " has no outline: " + what,
                        other
                                ? remedy
                                : NearestWord.to(name, known)
                                        .map(near -> "did you mean '" + near + "'")
                                        .orElse(
                                                drawing.dxf()
                                                        ? "layers with closed loops are " + NearestWord.list(known)
                                                        : "its regions are " + NearestWord.list(known)));
    }

    /** What there is in place of a loop. */
    private String open(List<OutlineElement> lines) {
        if (lines.isEmpty()) {
            return ", only points";
        }
        LineString first = (LineString) lines.get(0).shape();
        Coordinate from = first.getCoordinateN(0);
        Coordinate to = first.getCoordinateN(first.getNumPoints() - 1);
        return (lines.size() == 1 ? ": its line runs from " : ", but " + lines.size() + " open lines, the first from ")
                + drawing.unit().point(from.x, from.y) + " to "
                + drawing.unit().point(to.x, to.y) + " (" + lines.get(0).place() + "), a gap of "
                + drawing.unit().length(from.distance(to));
    }

    /** Several records of one name are one region of several pieces. */
    static Geometry together(List<OutlineElement> records) {
        List<Polygon> polygons = new ArrayList<>();
        for (OutlineElement record : records) {
            for (Object polygon : PolygonExtracter.getPolygons(record.shape())) {
                polygons.add((Polygon) polygon);
            }
        }
        return records.get(0).shape().getFactory().createMultiPolygon(polygons.toArray(new Polygon[0]));
    }
}
