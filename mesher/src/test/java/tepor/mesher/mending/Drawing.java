package tepor.mesher.mending;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.PathBuilder;
import tepor.mesher.outline.Place;
import tepor.mesher.outline.WktReader;
import tepor.mesher.section.OutlineCheck;
import tepor.mesher.section.RegionShape;
import tepor.mesher.section.SectionBuilder;
import tepor.mesher.soundness.Closeness;
import tepor.mesher.soundness.SectionCheck;

/** Outlines for tests, drawn in millimetres; regions are called a, b, c in their order, each in a line of its own. */
final class Drawing {
    static final DrawingUnit MILLIMETRE = new DrawingUnit("mm", 0.001);
    static final GeometryFactory FACTORY = new GeometryFactory();

    private Drawing() {}

    /** Regions from well-known text between semicolons. */
    static List<RegionShape> of(String drawing) {
        List<RegionShape> shapes = new ArrayList<>();
        for (String text : drawing.split(";")) {
            Findings findings = new Findings();
            Place place = place(shapes.size());
            Optional<Geometry> read = WktReader.readGeometry(text.strip(), place, MILLIMETRE, findings);
            shapes.add(region(shapes.size(), read.orElseThrow(() -> new IllegalArgumentException(text))));
        }
        return shapes;
    }

    static List<RegionShape> of(Geometry... metres) {
        List<RegionShape> shapes = new ArrayList<>();
        for (Geometry geometry : metres) {
            shapes.add(region(shapes.size(), geometry));
        }
        return shapes;
    }

    private static RegionShape region(int index, Geometry metres) {
        return new RegionShape(String.valueOf((char) ('a' + index)), metres, false, place(index));
    }

    private static Place place(int index) {
        return new Place("drawing.wkt", index + 1, 1);
    }

    /** A box in millimetres, as text. */
    static String box(double x0, double y0, double x1, double y1) {
        return "POLYGON ((%s %s, %s %s, %s %s, %s %s, %s %s))".formatted(x0, y0, x1, y0, x1, y1, x0, y1, x0, y0);
    }

    /** A circle, metres, as a ring of true arcs. */
    static LinearRing circle(double x, double y, double radius) {
        return PathBuilder.ring(new Circle(x, y, radius), FACTORY);
    }

    /** All that both checks find, as the case reader runs them. */
    static List<Finding> check(List<RegionShape> shapes) {
        Findings findings = new Findings();
        boolean sound = true;
        for (RegionShape shape : shapes) {
            sound &= OutlineCheck.check(shape.name(), shape.polygons(), shape.place(), MILLIMETRE, findings);
        }
        if (sound) {
            SectionCheck.check(shapes, Closeness.of(shapes, Double.NaN), MILLIMETRE, findings);
            SectionBuilder.build(shapes, List.of(), List.of(), Double.NaN, MILLIMETRE, findings);
        }
        return findings.all();
    }

    static MendedOutline mend(List<RegionShape> shapes) {
        return OutlineMender.mend(shapes, Closeness.of(shapes, Double.NaN), MILLIMETRE);
    }
}
