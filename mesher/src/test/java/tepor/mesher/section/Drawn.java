package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.io.ParseException;
import org.locationtech.jts.io.WKTReader;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/** Sections for tests, drawn in metres. */
final class Drawn {
    static final DrawingUnit METRE = new DrawingUnit("m", 1);

    private final List<RegionShape> shapes = new ArrayList<>();
    private final List<Coordinate> splits = new ArrayList<>();
    private final List<LineString> cuts = new ArrayList<>();
    private double snap = Double.NaN;
    final Findings findings = new Findings();

    static Geometry wkt(String text) {
        try {
            return new WKTReader().read(text);
        } catch (ParseException e) {
            throw new IllegalArgumentException(text, e);
        }
    }

    static String box(double x0, double y0, double x1, double y1) {
        return "POLYGON ((%s %s, %s %s, %s %s, %s %s, %s %s))".formatted(x0, y0, x1, y0, x1, y1, x0, y1, x0, y0);
    }

    Drawn region(String name, String wkt) {
        return add(name, wkt(wkt), false);
    }

    Drawn nothing(String name, String wkt) {
        return add(name, wkt(wkt), true);
    }

    Drawn add(String name, Geometry polygons, boolean hole) {
        shapes.add(new RegionShape(name, polygons, hole, new Place("case.toml", shapes.size() + 1, 1)));
        return this;
    }

    Drawn snap(double metres) {
        snap = metres;
        return this;
    }

    Drawn cut(Coordinate from, Coordinate to) {
        cuts.add(new GeometryFactory().createLineString(new Coordinate[] {from, to}));
        return this;
    }

    Drawn split(double x, double y) {
        splits.add(new Coordinate(x, y));
        return this;
    }

    Optional<Section> tryBuild() {
        return SectionBuilder.build(shapes, splits, cuts, snap, METRE, findings);
    }

    /** The section, audited. */
    Section build() {
        Optional<Section> section = tryBuild();
        assertThat(findings.all())
                .filteredOn(f -> f.severity() == Finding.Severity.ERROR)
                .isEmpty();
        SectionAudit.check(section.orElseThrow());
        return section.orElseThrow();
    }
}
