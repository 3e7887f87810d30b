package tepor.solver.casefile;

import tepor.mesher.section.Section;

/** Where a point lies with respect to the material of a section. */
final class PointOnSection {
    private PointOnSection() {}

    /**
     * The point of the material that is nearest.
     *
     * @param x metres
     * @param y metres
     * @return x, y and the distance to it, metres; the point itself, and 0, where it lies in material
     */
    static double[] nearest(Section section, double x, double y) {
        double[] best = {x, y, Double.POSITIVE_INFINITY};
        boolean inside = false;
        for (int s = 0; s < section.segmentCount(); s++) {
            if (!section.isBoundary(s)) {
                continue;
            }
            double ax = section.x(section.start(s));
            double ay = section.y(section.start(s));
            double bx = section.x(section.end(s));
            double by = section.y(section.end(s));
            // A ray to the right crosses the boundary an odd number of times from inside (even-odd rule).
            if ((ay > y) != (by > y) && x < ax + (y - ay) / (by - ay) * (bx - ax)) {
                inside = !inside;
            }
            double along =
                    ((x - ax) * (bx - ax) + (y - ay) * (by - ay)) / ((bx - ax) * (bx - ax) + (by - ay) * (by - ay));
            double t = Math.max(0, Math.min(1, along));
            double px = ax + t * (bx - ax);
            double py = ay + t * (by - ay);
            double distance = Math.hypot(px - x, py - y);
            if (distance < best[2]) {
                best = new double[] {px, py, distance};
            }
        }
        return inside ? new double[] {x, y, 0} : best;
    }
}
