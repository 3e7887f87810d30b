package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.locationtech.jts.geom.Geometry;
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
    private final Set<String> usedRecords;

    /**
     * @param drawing the drawing
     * @param usedRecords takes the names of the records that are used
     */
    OutlineFinder(Drawing drawing, Set<String> usedRecords) {
        this.drawing = drawing;
        this.usedRecords = usedRecords;
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
        usedRecords.add(name);
        if (!drawing.stated()) {
            table.findings()
                    .error(
                            "outline-missing",
                            table.place(),
                            table.label() + " has no outline, and the case names no outline file",
                            "write outline = \"POLYGON ((…))\", or name a file under [outline]");
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
        boolean line = !outline.find(name, OutlineElement.Kind.LINE).isEmpty();
        boolean point = !outline.find(name, OutlineElement.Kind.POINT).isEmpty();
        List<String> known = outline.elements().stream()
                .filter(e -> e.kind() == OutlineElement.Kind.REGION && !e.name().isEmpty())
                .map(OutlineElement::name)
                .distinct()
                .toList();
        table.findings()
                .error(
                        "outline-missing",
                        table.place("name"),
                        table.label() + " has no outline: "
                                + (line || point
                                        ? "in " + drawing.fileName() + " its record is a " + (line ? "line" : "point")
                                        : "it states none, and " + drawing.fileName() + " has no record of that name"),
                        line || point
                                ? "make the record a POLYGON or MULTIPOLYGON"
                                : NearestWord.to(name, known)
                                        .map(near -> "did you mean '" + near + "'")
                                        .orElse("its regions are " + NearestWord.list(known)));
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
