package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.Section;

/** The part of the audit that compares facets with the section's segments. */
final class FacetCheck {
    private final Mesh mesh;
    private final Section section;
    private final double tolerance;
    private final List<String> problems = new ArrayList<>();

    private FacetCheck(Mesh mesh, Section section) {
        this.mesh = mesh;
        this.section = section;
        tolerance = RegionCheck.lengthTolerance(section);
    }

    static List<String> problems(Mesh mesh, Section section) {
        FacetCheck check = new FacetCheck(mesh, section);
        check.checkSides();
        check.checkCover();
        check.checkOtherSides();
        return check.problems;
    }

    private void checkSides() {
        for (int f = 0; f < mesh.facetCount(); f++) {
            int segment = mesh.facetSegment(f);
            checkSide(f, mesh.facetLeftTriangle(f), true, section.left(segment), section.solidLeft(segment));
            checkSide(f, mesh.facetRightTriangle(f), false, section.right(segment), section.solidRight(segment));
        }
    }

    private void checkSide(int f, int triangle, boolean left, int region, boolean solid) {
        String where = "facet " + f + (left ? " on its left" : " on its right");
        if ((triangle != Mesh.NONE) != solid) {
            problems.add(where + " has triangle " + triangle + " though the section has region " + region + " there");
            return;
        }
        if (triangle == Mesh.NONE) {
            return;
        }
        if (mesh.region(triangle) != region) {
            problems.add(where + " has region " + mesh.region(triangle) + " instead of " + region);
        }
        int side = left ? mesh.facetLeftSide(f) : mesh.facetRightSide(f);
        int from = mesh.node(triangle, (side + 1) % 3);
        int to = mesh.node(triangle, (side + 2) % 3);
        if (mesh.facetNode(f, left ? 0 : 1) != from || mesh.facetNode(f, left ? 1 : 0) != to) {
            problems.add(where + " has a triangle whose side runs the wrong way or elsewhere");
        }
        int opposite = left ? mesh.facetRightTriangle(f) : mesh.facetLeftTriangle(f);
        if (mesh.neighbour(triangle, side) != opposite) {
            problems.add(where + " has a triangle whose neighbour is not the one on the facet's other side");
        }
    }

    private void checkCover() {
        int f = 0;
        for (int s = 0; s < section.segmentCount(); s++) {
            if (!section.solidLeft(s) && !section.solidRight(s)) {
                continue;
            }
            double x = section.x(section.start(s));
            double y = section.y(section.start(s));
            while (f < mesh.facetCount() && mesh.facetSegment(f) == s) {
                int from = mesh.facetNode(f, 0);
                int to = mesh.facetNode(f, 1);
                if (mesh.x(from) != x || mesh.y(from) != y) {
                    problems.add("facet " + f + " of segment " + s + " does not begin where the one before it ends");
                }
                x = mesh.x(to);
                y = mesh.y(to);
                checkOnLine(s, f, x, y);
                f++;
            }
            if (x != section.x(section.end(s)) || y != section.y(section.end(s))) {
                problems.add("facets of segment " + s + " end at (" + x + " " + y + ") instead of at its end");
            }
        }
        if (f != mesh.facetCount()) {
            problems.add("facets are not in the order of segments, from facet " + f);
        }
    }

    private void checkOnLine(int s, int f, double x, double y) {
        double dx = section.x(section.end(s)) - section.x(section.start(s));
        double dy = section.y(section.end(s)) - section.y(section.start(s));
        Circle circle = section.circle(s);
        double off = circle != null
                ? Math.abs(circle.offset(x, y)) - section.snap()
                : Math.abs(dx * (y - section.y(section.start(s))) - dy * (x - section.x(section.start(s))))
                        / section.chord(s);
        if (!(off <= tolerance)) {
            problems.add("facet " + f + " ends " + off + " m off its segment " + s);
        }
        int from = mesh.facetNode(f, 0);
        if (!((x - mesh.x(from)) * dx + (y - mesh.y(from)) * dy > 0)) {
            problems.add("facet " + f + " runs against its segment " + s);
        }
    }

    // Sides without a neighbour and sides between regions are facets.
    private void checkOtherSides() {
        Map<Integer, Integer> facetOf = new HashMap<>();
        for (int f = 0; f < mesh.facetCount(); f++) {
            if (mesh.facetLeftTriangle(f) != Mesh.NONE) {
                facetOf.merge(3 * mesh.facetLeftTriangle(f) + mesh.facetLeftSide(f), 1, Integer::sum);
            }
            if (mesh.facetRightTriangle(f) != Mesh.NONE) {
                facetOf.merge(3 * mesh.facetRightTriangle(f) + mesh.facetRightSide(f), 1, Integer::sum);
            }
        }
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                int other = mesh.neighbour(t, i);
                boolean must = other == Mesh.NONE || mesh.region(other) != mesh.region(t);
                int facets = facetOf.getOrDefault(3 * t + i, 0);
                if (facets > 1 || (must && facets == 0)) {
                    problems.add("side " + i + " of triangle " + t + " is a facet " + facets + " times");
                }
            }
        }
    }
}
