package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.section.Section;
import tepor.mesher.section.Where;

/** Says in words where an edge was looked for, so that a user can see why nothing was found there. */
final class WhereText {
    private final Section section;
    private final DrawingUnit unit;

    WhereText(Section section, DrawingUnit unit) {
        this.section = section;
        this.unit = unit;
    }

    /** Where it was looked, as the rest of a sentence that begins "finds nothing:". */
    String lookedFor(Where where) {
        if (where instanceof Where.OnSide side) {
            double[] box = section.bounds();
            return switch (side.side()) {
                case LEFT -> "no boundary lies along x = " + unit.length(box[0]);
                case RIGHT -> "no boundary lies along x = " + unit.length(box[2]);
                case BOTTOM -> "no boundary lies along y = " + unit.length(box[1]);
                case TOP -> "no boundary lies along y = " + unit.length(box[3]);
            };
        }
        if (where instanceof Where.Outside) {
            return "the section has no outer boundary";
        }
        if (where instanceof Where.Holes) {
            return "the section has no hole";
        }
        if (where instanceof Where.Rest) {
            return "other edges state a condition on every piece of the boundary";
        }
        if (where instanceof Where.OnLine line) {
            return "no boundary and no border between regions lies along the line from "
                    + corner(line.line().getEnvelopeInternal(), true) + " to "
                    + corner(line.line().getEnvelopeInternal(), false) + " within " + unit.length(section.snap())
                    + distance(line.line())
                            .map(d -> "; the nearest is " + d + " away")
                            .orElse("");
        }
        if (where instanceof Where.OnCut cut) {
            return "the cut from " + corner(cut.line().getEnvelopeInternal(), true) + " to "
                    + corner(cut.line().getEnvelopeInternal(), false)
                    + " runs through no region";
        }
        if (where instanceof Where.Inside inside) {
            Envelope box = inside.polygon().getEnvelopeInternal();
            return "no piece of the boundary lies inside the polygon from " + corner(box, true) + " to "
                    + corner(box, false)
                    + distance(inside.polygon())
                            .map(d -> "; the nearest is " + d + " away")
                            .orElse("");
        }
        if (where instanceof Where.Nearest nearest) {
            return "there is no boundary near " + unit.point(nearest.x(), nearest.y());
        }
        if (where instanceof Where.OfRegion of) {
            return "nothing is left of region '" + section.regionName(of.region()) + "' under the later regions";
        }
        if (where instanceof Where.Between between) {
            return "regions '" + section.regionName(between.first()) + "' and '" + section.regionName(between.second())
                    + "' do not meet";
        }
        List<String> parts = new ArrayList<>();
        for (Where part : ((Where.Union) where).parts()) {
            parts.add(lookedFor(part));
        }
        return String.join("; ", parts);
    }

    /** What to do about it. */
    String remedy(Where where) {
        double[] box = section.bounds();
        String extent = "the section reaches from " + unit.point(box[0], box[1]) + " to " + unit.point(box[2], box[3]);
        if (where instanceof Where.Rest) {
            return "leave the edge out, or narrow the where of another";
        }
        if (where instanceof Where.Between) {
            return "name regions that share a border; a gap between them, or a later region over it, keeps them apart";
        }
        return "correct the where; " + extent;
    }

    private String corner(Envelope box, boolean low) {
        return low ? unit.point(box.getMinX(), box.getMinY()) : unit.point(box.getMaxX(), box.getMaxY());
    }

    /** Distance from a geometry to the nearest segment; empty where they touch. */
    private Optional<String> distance(Geometry geometry) {
        GeometryFactory factory = geometry.getFactory();
        LineString[] lines = new LineString[section.segmentCount()];
        for (int s = 0; s < lines.length; s++) {
            lines[s] = factory.createLineString(new Coordinate[] {
                new Coordinate(section.x(section.start(s)), section.y(section.start(s))),
                new Coordinate(section.x(section.end(s)), section.y(section.end(s)))
            });
        }
        double distance = geometry.distance(factory.createMultiLineString(lines));
        return distance > section.snap() ? Optional.of(unit.length(distance)) : Optional.empty();
    }
}
