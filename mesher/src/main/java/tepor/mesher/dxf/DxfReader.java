package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import tepor.mesher.chain.Chained;
import tepor.mesher.chain.Chainer;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Outline;
import tepor.mesher.outline.OutlineElement;

/**
 * Reads outlines drawn in DXF, text form, of releases R12 to 2018.
 *
 * <p>Closed loops on a layer, drawn in one or chained from pieces whose ends meet within snap, are regions of the layer's
 * name; a loop within a loop is a hole. Open chains are lines of that name, points are points. Arcs stay arcs; ellipses and
 * splines become arcs that leave them by 1e-5 of their extent at most.
 */
public final class DxfReader {
    private static final double DEFAULT_SNAP = 1e-7;
    private static final double LEAST_SNAP_IN_ULPS = 32;
    private static final int SHOWN = 20;
    private static final DrawingUnit UNKNOWN = new DrawingUnit("drawing units", 1);

    private final DxfFaults faults;
    private final DrawingUnit unit;
    private final double statedSnap;
    private final GeometryFactory factory = new GeometryFactory();

    private DxfReader(DxfFaults faults, DrawingUnit unit, double statedSnap) {
        this.faults = faults;
        this.unit = unit;
        this.statedSnap = statedSnap;
    }

    /**
     * Reads a file.
     *
     * @param fileName the file as the user named it, for messages
     * @param bytes what is in it
     * @param stated the unit that the case states; goes before the one in the file
     * @param snap distance within which two points are one, metres; NaN for 1e-7 of the extent of the drawing
     * @param findings takes what is wrong, and what is passed over
     * @return what could be read; elements in metres
     */
    public static Outline read(
            String fileName, byte[] bytes, Optional<DrawingUnit> stated, double snap, Findings findings) {
        DxfFaults faults = new DxfFaults(fileName, findings);
        Optional<DxfDocument> document =
                DxfDecoder.decode(bytes, faults).flatMap(text -> DxfDocumentReader.read(text, faults));
        if (document.isEmpty()) {
            return new Outline(List.of(), stated.orElse(UNKNOWN));
        }
        DrawingUnit unit = unit(document.get(), stated, faults);
        DxfReader reader = new DxfReader(faults, unit, snap);
        List<OutlineElement> elements = reader.elements(DrawingExpander.expand(document.get(), unit, faults));
        if (elements.isEmpty() && !findings.hasErrors()) {
            faults.error(
                    "empty-outline",
                    1,
                    "the file holds nothing that makes an outline",
                    "draw the outlines in model space, on layers that are on");
        }
        return new Outline(elements, unit);
    }

    private static DrawingUnit unit(DxfDocument document, Optional<DrawingUnit> stated, DxfFaults faults) {
        Optional<DxfRecord.Group> variable = document.variable("$INSUNITS");
        int line = variable.map(DxfRecord.Group::line).orElse(1);
        String number = variable.map(DxfRecord.Group::value).orElse("0");
        Optional<DrawingUnit> own = number.matches("\\d{1,4}")
                ? Optional.ofNullable(DxfUnits.BY_NUMBER.get(Integer.parseInt(number)))
                : Optional.empty();
        if (stated.isPresent()) {
            boolean differ = own.isPresent()
                    && Math.abs(own.get().metres() - stated.get().metres())
                            > 1e-9 * stated.get().metres();
            if (differ) {
                faults.warning(
                        "unit-differs",
                        line,
                        "the drawing says its unit is " + own.get().symbol() + " ($INSUNITS " + number
                                + "), the case says " + stated.get().symbol() + "; that of the case is taken",
                        "leave unit out of the case if the drawing is right");
            }
            return stated.get();
        }
        if (own.isEmpty()) {
            boolean none = number.equals("0");
            faults.error(
                    "unit-missing",
                    line,
                    none
                            ? "neither the drawing ($INSUNITS) nor the case says in which unit it is drawn"
                            : "the drawing's $INSUNITS is " + DxfFaults.quote(number)
                                    + ", which is no unit of a cross-section",
                    "write unit = \"mm\" (or m, cm, in …) under [outline]; it is never guessed");
        }
        return own.orElse(UNKNOWN);
    }

    private List<OutlineElement> elements(DrawingLayers layers) {
        double snap = snap(layers.box());
        List<OutlineElement> elements = new ArrayList<>();
        for (Map.Entry<String, DrawingLayers.Content> entry : layers.all().entrySet()) {
            String name = entry.getKey();
            Chained chained = Chainer.chain(entry.getValue().strands(), snap);
            report(name, chained, snap);
            for (Chained.Area area : chained.areas()) {
                elements.add(new OutlineElement(
                        name, OutlineElement.Kind.REGION, area.polygon(), faults.place(area.source())));
            }
            for (Chained.Line line : chained.lines()) {
                elements.add(
                        new OutlineElement(name, OutlineElement.Kind.LINE, line.line(), faults.place(line.source())));
            }
            for (DrawingLayers.Spot spot : entry.getValue().spots()) {
                elements.add(new OutlineElement(
                        name, OutlineElement.Kind.POINT, factory.createPoint(spot.at()), faults.place(spot.source())));
            }
        }
        return elements;
    }

    private double snap(Envelope box) {
        double wanted = Double.isNaN(statedSnap) ? DEFAULT_SNAP * box.getDiameter() : statedSnap;
        double largest = box.isNull()
                ? 0
                : Math.max(
                        Math.max(Math.abs(box.getMinX()), Math.abs(box.getMaxX())),
                        Math.max(Math.abs(box.getMinY()), Math.abs(box.getMaxY())));
        return Math.max(wanted, LEAST_SNAP_IN_ULPS * Math.ulp(largest));
    }

    private void report(String layer, Chained chained, double snap) {
        String on = "on layer " + DxfFaults.quote(layer) + " ";
        if (chained.doubled() > 0) {
            faults.warning(
                    "drawn-twice",
                    chained.firstDoubled(),
                    on + chained.doubled() + (chained.doubled() == 1 ? " entity lies" : " entities lie")
                            + " wholly or in part over earlier ones; what lies twice is taken once",
                    "");
        }
        if (chained.tooShort() > 0) {
            faults.warning(
                    "shorter-than-snap",
                    chained.firstTooShort(),
                    on + chained.tooShort() + (chained.tooShort() == 1 ? " entity is" : " entities are")
                            + " shorter than snap, " + unit.length(snap) + ", and left out",
                    "check the drawing's unit, or state a smaller snap");
        }
        for (Chained.Gap gap : chained.gaps().stream().limit(SHOWN).toList()) {
            faults.warning(
                    "loop-not-closed",
                    gap.source(),
                    on + "a loop does not close: between " + point(gap.from()) + " and " + point(gap.to()) + " (line "
                            + gap.otherSource() + ") there is a gap of " + unit.length(gap.width()),
                    "if a region is meant, let the ends meet, or state a snap greater than the gap; as drawn it is a line");
        }
        if (!chained.branches().isEmpty()) {
            List<String> places =
                    chained.branches().stream().limit(SHOWN).map(this::point).toList();
            int more = chained.branches().size() - places.size();
            faults.warning(
                    "loops-branch",
                    chained.areas().isEmpty() ? 1 : chained.areas().get(0).source(),
                    on + "loops branch at " + String.join(", ", places)
                            + (more > 0 ? " and " + more + " more places" : "")
                            + "; each smallest loop is taken as an area of its own",
                    "draw what divides an area on another layer, if one area is meant");
        }
    }

    private String point(Coordinate c) {
        return unit.point(c.x, c.y);
    }
}
