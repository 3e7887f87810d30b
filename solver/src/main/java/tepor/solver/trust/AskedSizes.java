package tepor.solver.trust;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygonal;
import org.locationtech.jts.operation.distance.IndexedFacetDistance;
import org.locationtech.jts.operation.polygonize.Polygonizer;
import tepor.mesher.refinement.SizeField;
import tepor.mesher.section.ArcFlattener;
import tepor.mesher.section.Section;
import tepor.mesher.section.SegmentCurve;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.MeshRequest;
import tepor.solver.model.Target;

/** Sizes that the case itself asks for: the greatest everywhere, and smaller ones near regions, edges or geometries. */
public final class AskedSizes implements SizeField {
    /** Growth of the size with the distance from where it was asked. */
    private static final double GRADATION = 0.4;

    /** How closely arcs are followed, as a share of their length. */
    private static final double ARC_TOLERANCE = 0.01;

    private final double greatest;
    private final List<Near> places = new ArrayList<>();

    public AskedSizes(Case subject) {
        greatest = subject.mesh().size();
        for (MeshRequest.Refinement refinement : subject.mesh().refinements()) {
            places.add(new Near(geometry(subject.section(), refinement), refinement.size()));
        }
    }

    @Override
    public double at(double x, double y) {
        double size = greatest;
        for (Near place : places) {
            size = Math.min(size, place.at(x, y));
        }
        return size;
    }

    @Override
    public double gradation() {
        return places.isEmpty() ? 0 : GRADATION;
    }

    private static Geometry geometry(Section section, MeshRequest.Refinement refinement) {
        if (refinement.near() instanceof Target.OfRegion target) {
            return region(section, target.region().index());
        }
        if (refinement.near() instanceof Target.OfEdge target) {
            return edge(section, target.edge());
        }
        return new ArcFlattener(1e-4 * section.extent()).flatten(refinement.geometry());
    }

    private static Geometry edge(Section section, Edge edge) {
        GeometryFactory factory = new GeometryFactory();
        List<LineString> lines = new ArrayList<>();
        for (int s : edge.pieces().segments()) {
            lines.add(line(factory, section, s));
        }
        return factory.buildGeometry(lines);
    }

    private static Geometry region(Section section, int region) {
        GeometryFactory factory = new GeometryFactory();
        Polygonizer polygonizer = new Polygonizer(true);
        for (int s = 0; s < section.segmentCount(); s++) {
            if (!section.isCut(s) && (section.left(s) == region || section.right(s) == region)) {
                polygonizer.add(line(factory, section, s));
            }
        }
        return polygonizer.getGeometry();
    }

    private static LineString line(GeometryFactory factory, Section section, int s) {
        double[] xy = SegmentCurve.points(section, s, true, ARC_TOLERANCE * section.length(s));
        Coordinate[] points = new Coordinate[xy.length / 2];
        for (int i = 0; i < points.length; i++) {
            points[i] = new Coordinate(xy[2 * i], xy[2 * i + 1]);
        }
        return factory.createLineString(points);
    }

    /** One place with a smaller size. */
    private static final class Near {
        private final GeometryFactory factory = new GeometryFactory();
        private final IndexedFacetDistance distance;
        private final IndexedPointInAreaLocator locator;
        private final double size;

        Near(Geometry geometry, double size) {
            this.size = size;
            distance = new IndexedFacetDistance(geometry);
            locator = geometry instanceof Polygonal ? new IndexedPointInAreaLocator(geometry) : null;
        }

        double at(double x, double y) {
            Coordinate point = new Coordinate(x, y);
            if (locator != null && locator.locate(point) != Location.EXTERIOR) {
                return size;
            }
            return size + GRADATION * distance.distance(factory.createPoint(point));
        }
    }
}
