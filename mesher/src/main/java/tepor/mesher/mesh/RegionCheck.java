package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.List;
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
        int step = Math.max(1, mesh.triangleCount() / SAMPLES);
        for (int t = 0; t < mesh.triangleCount(); t += step) {
            int seen = regionSeen(mesh, section, t);
            if (seen != mesh.region(t)) {
                problems.add("triangle " + t + " has region " + mesh.region(t) + " but lies in region " + seen);
            }
        }
        return problems;
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
        for (int r = 0; r < area.length; r++) {
            double expected = section.isHole(r) ? 0 : section.area(r);
            double allowed =
                    1e-12 * expected + perimeter[r] * (lengthTolerance(section) + 4 * Math.ulp(section.extent()));
            if (!(Math.abs(area[r] - expected) <= allowed)) {
                problems.add("the triangles of region " + r + " (" + section.regionName(r) + ") cover " + area[r]
                        + " m² instead of " + expected + " m²");
            }
        }
    }

    // The first segment met by a ray to the right tells the region. The ray starts at a point of no symmetry, so that
    // it does not run into a vertex.
    private static int regionSeen(Mesh mesh, Section section, int t) {
        double x = 0;
        double y = 0;
        for (int i = 0; i < 3; i++) {
            x += WEIGHT[i] * mesh.x(mesh.node(t, i));
            y += WEIGHT[i] * mesh.y(mesh.node(t, i));
        }
        double nearest = Double.POSITIVE_INFINITY;
        int seen = Mesh.NONE;
        for (int s = 0; s < section.segmentCount(); s++) {
            double ay = section.y(section.start(s)) - y;
            double by = section.y(section.end(s)) - y;
            if (ay > 0 == by > 0) {
                continue;
            }
            double ax = section.x(section.start(s)) - x;
            double bx = section.x(section.end(s)) - x;
            double at = ax + (bx - ax) * (ay / (ay - by));
            if (at > 0 && at < nearest) {
                nearest = at;
                seen = by > ay ? section.left(s) : section.right(s);
            }
        }
        return seen;
    }
}
