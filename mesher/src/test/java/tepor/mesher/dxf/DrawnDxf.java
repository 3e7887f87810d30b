package tepor.mesher.dxf;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.CurveArea;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Outline;
import tepor.mesher.outline.OutlineElement;

/**
 * A drawing in DXF, written short: pairs are separated by semicolons or line breaks, code and value by a blank, and a word
 * that stands alone begins an entity.
 */
final class DrawnDxf {
    static final DrawingUnit METRE = new DrawingUnit("m", 1);

    final Findings findings = new Findings();
    final Outline outline;

    private DrawnDxf(byte[] bytes, Optional<DrawingUnit> unit, double snap) {
        outline = DxfReader.read("part.dxf", bytes, unit, snap, findings);
    }

    /** Short notation as the text of a file: a pair on two lines. */
    static String pairs(String brief) {
        StringBuilder text = new StringBuilder();
        for (String pair : brief.split("[;\n]")) {
            String p = pair.strip();
            if (p.isEmpty()) {
                continue;
            }
            if (!Character.isDigit(p.charAt(0))) {
                p = "0 " + p;
            }
            int blank = p.indexOf(' ');
            text.append(String.format("%3s%n", blank < 0 ? p : p.substring(0, blank)))
                    .append(blank < 0 ? "" : p.substring(blank + 1))
                    .append('\n');
        }
        return text.toString();
    }

    /** A whole file of entities in metres. */
    static String file(String entities) {
        return file("", "", entities);
    }

    static String file(String layers, String blocks, String entities) {
        return pairs("SECTION;2 HEADER;9 $ACADVER;1 AC1032;9 $INSUNITS;70 6;ENDSEC")
                + pairs("SECTION;2 TABLES;TABLE;2 LAYER;70 1;" + layers + ";ENDTAB;ENDSEC")
                + pairs("SECTION;2 BLOCKS;" + blocks + ";ENDSEC")
                + pairs("SECTION;2 ENTITIES;" + entities + ";ENDSEC;EOF");
    }

    static DrawnDxf read(String text) {
        return new DrawnDxf(text.getBytes(StandardCharsets.UTF_8), Optional.empty(), Double.NaN);
    }

    static DrawnDxf read(byte[] bytes, Optional<DrawingUnit> unit, double snap) {
        return new DrawnDxf(bytes, unit, snap);
    }

    static DrawnDxf read(String text, double snap) {
        return new DrawnDxf(text.getBytes(StandardCharsets.UTF_8), Optional.empty(), snap);
    }

    DrawnDxf sound() {
        assertThat(findings.all()).isEmpty();
        return this;
    }

    /** The one thing found. */
    Finding finding() {
        assertThat(findings.all()).hasSize(1);
        return findings.all().get(0);
    }

    List<Geometry> regions(String layer) {
        return shapes(layer, OutlineElement.Kind.REGION);
    }

    List<Geometry> lines(String layer) {
        return shapes(layer, OutlineElement.Kind.LINE);
    }

    List<Geometry> points(String layer) {
        return shapes(layer, OutlineElement.Kind.POINT);
    }

    private List<Geometry> shapes(String layer, OutlineElement.Kind kind) {
        return outline.find(layer, kind).stream().map(OutlineElement::shape).toList();
    }

    /** Area of all regions of a layer, arcs as what they are. */
    double area(String layer) {
        return regions(layer).stream().mapToDouble(CurveArea::of).sum();
    }

    double length(String layer) {
        return lines(layer).stream().mapToDouble(CurveArea::length).sum();
    }
}
