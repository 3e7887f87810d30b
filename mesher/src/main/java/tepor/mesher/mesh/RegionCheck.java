package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.Section;

/** The part of the audit that compares regions: their areas, and by sight from a sample of triangles. */
final class RegionCheck {
    private static final int SAMPLES = 200;
    private static final double[] WEIGHT = {0.2718, 0.3142, 0.4140};

    private RegionCheck() {}

    /** How far a vertex may lie off its segment once it is rounded, metres. */
    static double lengthTolerance(Section section) {
        double greatest = 0;
        for (double coordinate : section.bounds()) {
            greatest = Math.max(greatest, Math.abs(coordinate));
        }
        return 4 * Math.ulp(greatest);
    }

    static List<String> problems(Mesh mesh, Section section) {
        List<String> problems = new ArrayList<>();
        checkAreas(mesh, section, problems);
        boolean[] standsForArc = straightOnArc(mesh, section);
        int step = Math.max(1, mesh.triangleCount() / SAMPLES);
        for (int t = 0; t < mesh.triangleCount(); t += step) {
            // A triangle with a straight side on an arc may reach beyond the arc.
            int seen = standsForArc[t] ? mesh.region(t) : regionSeen(mesh, section, t);
            if (seen != mesh.region(t)) {
                problems.add("triangle " + t + " has region " + mesh.region(t) + " but lies in region " + seen);
            }
        }
        return problems;
    }

    private static boolean[] straightOnArc(Mesh mesh, Section section) {
        boolean[] straight = new boolean[mesh.triangleCount()];
        for (int f = 0; f < mesh.facetCount(); f++) {
            if (section.circle(mesh.facetSegment(f)) != null && !mesh.isCurvedFacet(f)) {
                for (int t : new int[] {mesh.facetLeftTriangle(f), mesh.facetRightTriangle(f)}) {
                    if (t >= 0) {
                        straight[t] = true;
                    }
                }
            }
        }
        return straight;
    }

    private static void checkAreas(Mesh mesh, Section section, List<String> problems) {
        double[] area = new double[section.regionCount()];
        // Compensated sums: of a million terms, plain ones would be off by more than is allowed.
        double[] rest = new double[area.length];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            int r = mesh.region(t);
            double term = mesh.area(t) + rest[r];
            double sum = area[r] + term;
            rest[r] = term - (sum - area[r]);
            area[r] = sum;
        }
        double[] perimeter = new double[section.regionCount()];
        for (int s = 0; s < section.segmentCount(); s++) {
            if (section.left(s) >= 0) {
                perimeter[section.left(s)] += section.length(s);
            }
            if (section.right(s) >= 0) {
                perimeter[section.right(s)] += section.length(s);
            }
        }
        double[] looseArcs = areaAboutLooseEnds(section);
        double[] besideArcs = areaBesideArcs(mesh, section);
        for (int r = 0; r < area.length; r++) {
            double expected = section.isHole(r) ? 0 : section.area(r) - besideArcs[r];
            double allowed = 1e-12 * expected
                    + looseArcs[r]
                    + perimeter[r] * (lengthTolerance(section) + 4 * Math.ulp(section.extent()));
            if (!(Math.abs(area[r] - expected) <= allowed)) {
                problems.add("the triangles of region " + r + " (" + section.regionName(r) + ") cover " + area[r]
                        + " m² instead of " + expected + " m²");
            }
        }
    }

    // Where the ends of an arc lie off its circle, within snap, the area beside it is not certain to the last digit,
    // m².
    private static double[] areaAboutLooseEnds(Section section) {
        double[] area = new double[section.regionCount()];
        for (int s = 0; s < section.segmentCount(); s++) {
            Circle circle = section.circle(s);
            if (circle != null) {
                double start = Math.abs(circle.offset(section.x(section.start(s)), section.y(section.start(s))));
                double end = Math.abs(circle.offset(section.x(section.end(s)), section.y(section.end(s))));
                for (int r : new int[] {section.left(s), section.right(s)}) {
                    if (r >= 0) {
                        area[r] += section.length(s) * (start + end) + 1e-12 * Math.abs(section.lens(s));
                    }
                }
            }
        }
        return area;
    }

    // What the mesh lacks of each region between the sides of its triangles and the true arcs, m².
    private static double[] areaBesideArcs(Mesh mesh, Section section) {
        double[] lacking = new double[section.regionCount()];
        for (int f = 0; f < mesh.facetCount(); f++) {
            int s = mesh.facetSegment(f);
            Circle circle = section.circle(s);
            if (circle == null) {
                continue;
            }
            double ax = mesh.x(mesh.facetNode(f, 0));
            double ay = mesh.y(mesh.facetNode(f, 0));
            double dx = mesh.x(mesh.facetNode(f, 1)) - ax;
            double dy = mesh.y(mesh.facetNode(f, 1)) - ay;
            double beyondChord = circle.lens(ax, ay, ax + dx, ay + dy);
            if (mesh.nodesPerTriangle() == 6) {
                int m = mesh.facetNode(f, 2);
                double mx = mesh.x(m) - ax - 0.5 * dx;
                double my = mesh.y(m) - ay - 0.5 * dy;
                beyondChord -= 2.0 / 3.0 * (mx * dy - my * dx);
            }
            if (section.left(s) >= 0) {
                lacking[section.left(s)] += beyondChord;
            }
            if (section.right(s) >= 0) {
                lacking[section.right(s)] -= beyondChord;
            }
        }
        return lacking;
    }

    // The first segment met by a ray to the right tells the region. The ray starts at a point of no symmetry, so that
    // it does not run into a vertex.
    private static int regionSeen(Mesh mesh, Section section, int t) {
        double x = 0;
        double y = 0;
        for (int i = 0; i < mesh.nodesPerTriangle(); i++) {
            double weight = weight(i, mesh.nodesPerTriangle());
            x += weight * mesh.x(mesh.node(t, i));
            y += weight * mesh.y(mesh.node(t, i));
        }
        double nearest = Double.POSITIVE_INFINITY;
        int seen = Mesh.NONE;
        for (int s = 0; s < section.segmentCount(); s++) {
            double[] met = section.circle(s) == null ? meetLine(section, s, x, y) : meetArc(section, s, x, y);
            for (int i = 0; i < met.length; i += 2) {
                if (met[i] > 0 && met[i] < nearest) {
                    nearest = met[i];
                    seen = met[i + 1] > 0 ? section.left(s) : section.right(s);
                }
            }
        }
        return seen;
    }

    // Shape function of a node at the point: a curved triangle need not hold the point of the straight one.
    private static double weight(int i, int nodesPerTriangle) {
        if (nodesPerTriangle == 3) {
            return WEIGHT[i];
        }
        return i < 3 ? WEIGHT[i] * (2 * WEIGHT[i] - 1) : 4 * WEIGHT[(i + 1) % 3] * WEIGHT[(i + 2) % 3];
    }

    // Distance at which the ray meets the segment, and whether the segment runs up (1) or down (-1) there; or nothing.
    private static double[] meetLine(Section section, int s, double x, double y) {
        double ay = section.y(section.start(s)) - y;
        double by = section.y(section.end(s)) - y;
        if (ay > 0 == by > 0) {
            return new double[0];
        }
        double ax = section.x(section.start(s)) - x;
        double bx = section.x(section.end(s)) - x;
        return new double[] {ax + (bx - ax) * (ay / (ay - by)), by > ay ? 1 : -1};
    }

    private static double[] meetArc(Section section, int s, double x, double y) {
        Circle circle = section.circle(s);
        double ax = section.x(section.start(s));
        double ay = section.y(section.start(s));
        double bx = section.x(section.end(s));
        double by = section.y(section.end(s));
        double turn = circle.turn(ax, ay, bx, by);
        double height = y - circle.y();
        double[] met = {};
        if (Math.abs(height) < circle.radius()) {
            double half = Math.sqrt((circle.radius() - height) * (circle.radius() + height));
            for (int sign = -1; sign <= 1; sign += 2) {
                if (circle.spans(ax, ay, bx, by, circle.x() + sign * half, y)) {
                    met = Arrays.copyOf(met, met.length + 2);
                    met[met.length - 2] = circle.x() + sign * half - x;
                    met[met.length - 1] = sign * turn > 0 ? 1 : -1;
                }
            }
        }
        return met;
    }
}
