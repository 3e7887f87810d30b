package tepor.solver.bracket;

import tepor.mesher.section.Section;

/**
 * A section seen along one of the axes: u runs along, v across, so that v and u are right-handed as x and y are.
 *
 * @param section the section
 * @param upright whether u is y (then v is x); else u is x and v is −y
 */
record Frame(Section section, boolean upright) {
    double u(int vertex) {
        return upright ? section.y(vertex) : section.x(vertex);
    }

    double v(int vertex) {
        return upright ? section.x(vertex) : -section.y(vertex);
    }

    /** Direction of u, radians from +x. */
    double direction() {
        return upright ? Math.PI / 2 : 0;
    }

    /** Coordinate of the drawing along. */
    String along() {
        return upright ? "y" : "x";
    }

    /** Coordinate of the drawing across. */
    String across() {
        return upright ? "x" : "y";
    }

    /** u where a segment meets a line of constant v, within the segment's span. */
    double uAt(int segment, double v) {
        int a = section.start(segment);
        int b = section.end(segment);
        double t = within((v - v(a)) / (v(b) - v(a)));
        return (1 - t) * u(a) + t * u(b);
    }

    /** v where a segment meets a line of constant u, within the segment's span. */
    double vAt(int segment, double u) {
        int a = section.start(segment);
        int b = section.end(segment);
        double t = within((u - u(a)) / (u(b) - u(a)));
        return (1 - t) * v(a) + t * v(b);
    }

    private static double within(double t) {
        return Math.max(0, Math.min(1, t));
    }

    /** Distance below which two coordinates are one, m: far below what a drawing means. */
    double tolerance() {
        return 1e-9 * section.extent();
    }

    /** |n·e|, n being the normal of a segment and e the direction along. */
    double facing(int segment) {
        return Math.abs(v(section.end(segment)) - v(section.start(segment))) / section.length(segment);
    }

    /** Region beyond a segment for who moves along. */
    int beyondAlong(int segment) {
        return v(section.end(segment)) > v(section.start(segment)) ? section.left(segment) : section.right(segment);
    }

    /** Region beyond a segment for who moves across. */
    int beyondAcross(int segment) {
        return u(section.end(segment)) > u(section.start(segment)) ? section.right(segment) : section.left(segment);
    }

    /** Whether a region (or none) is of material. */
    boolean isSolid(int region) {
        return region != Section.NONE && !section.isHole(region);
    }
}
