package tepor.viewer.picture.contour;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tepor.solver.field.TemperatureField;

/**
 * Walks along isotherms from edge to edge of a lattice, and joins them with the boundary to the loops around the areas that
 * are at least so warm.
 *
 * <p>A point exactly at an isotherm's temperature counts as above it (simulation of simplicity, Edelsbrunner and Mücke
 * 1990), so that every small triangle is crossed not at all or through exactly two edges.
 */
public final class IsothermTracer {
    /** Triangles into which six-node triangles may be divided altogether; more is finer than a picture shows. */
    private static final int SMALL_TRIANGLES = 160_000;

    private static final int NONE = -1;

    private final FieldLattice lattice;
    private final TemperatureScale scale;
    private final double tolerance;
    /** Boundary edge that starts at a point, seen with the section on its left. */
    private final int[] boundaryFrom;
    /** Point at the other end of that edge. */
    private final int[] boundaryNext;
    /** Loops of points around the whole section. */
    private final List<int[]> boundaryLoops = new ArrayList<>();
    /** Whether a loop must keep this boundary point; the points along a straight side need not be repeated. */
    private final boolean[] isCorner;
    /** Temperature of each isotherm, K. */
    private final double[] kelvin;
    /** For each small triangle the isotherm (by number + 1) that was traced through it last. */
    private final int[] visited;

    private double level;

    IsothermTracer(FieldLattice lattice, TemperatureScale scale, double tolerance) {
        this.lattice = lattice;
        this.scale = scale;
        this.tolerance = tolerance;
        boundaryFrom = new int[lattice.value.length];
        boundaryNext = new int[lattice.value.length];
        isCorner = new boolean[lattice.value.length];
        visited = new int[lattice.triangleCount()];
        kelvin = new double[scale.count()];
        for (int i = 0; i < kelvin.length; i++) {
            kelvin[i] = scale.kelvin(i);
        }
        findBoundary();
    }

    /**
     * Traces the isotherms of a field.
     *
     * @param tolerance points nearer to the line through their neighbours are left out, m; 0 keeps all
     */
    public static Isotherms trace(TemperatureField field, TemperatureScale scale, double tolerance) {
        FieldLattice lattice = new FieldLattice(field, division(field));
        return new IsothermTracer(lattice, scale, tolerance).trace();
    }

    private static int division(TemperatureField field) {
        if (field.mesh().nodesPerTriangle() == 3) {
            return 1;
        }
        double n = Math.sqrt(SMALL_TRIANGLES / (double) Math.max(1, field.mesh().triangleCount()));
        return (int) Math.max(2, Math.min(12, n));
    }

    private Isotherms trace() {
        List<Isotherm> lines = new ArrayList<>();
        List<List<double[]>> areas = new ArrayList<>();
        int[][] crossed = crossedTriangles();
        for (int i = 0; i < scale.count(); i++) {
            areas.add(trace(i, crossed[i], lines));
        }
        List<double[]> section = new ArrayList<>();
        for (int[] loop : boundaryLoops) {
            section.add(corners(loop));
        }
        return new Isotherms(scale, lines, areas, section);
    }

    /** Small triangles that each isotherm crosses. */
    private int[][] crossedTriangles() {
        int[] count = new int[scale.count()];
        int[][] crossed = new int[scale.count()][];
        for (int pass = 0; pass < 2; pass++) {
            for (int t = 0; t < lattice.triangleCount(); t++) {
                double a = lattice.value[lattice.corner[3 * t]];
                double b = lattice.value[lattice.corner[3 * t + 1]];
                double c = lattice.value[lattice.corner[3 * t + 2]];
                double low = Math.min(a, Math.min(b, c));
                double high = Math.max(a, Math.max(b, c));
                int i = firstAbove(low);
                for (; i < scale.count() && kelvin[i] <= high; i++) {
                    if (pass == 1) {
                        crossed[i][count[i]] = t;
                    }
                    count[i]++;
                }
            }
            if (pass == 0) {
                for (int i = 0; i < count.length; i++) {
                    crossed[i] = new int[count[i]];
                    count[i] = 0;
                }
            }
        }
        return crossed;
    }

    /** Number of the lowest isotherm above a temperature. */
    private int firstAbove(double temperature) {
        if (scale.count() == 0) {
            return 0;
        }
        double guess = (temperature - TemperatureScale.ZERO_CELSIUS) / scale.step() - scale.first();
        int i = (int) Math.max(0, Math.min(scale.count(), Math.floor(guess)));
        while (i < scale.count() && kelvin[i] <= temperature) {
            i++;
        }
        return i;
    }

    /** Adds the lines of one isotherm; returns the loops around what is at least as warm. */
    private List<double[]> trace(int i, int[] crossed, List<Isotherm> lines) {
        level = kelvin[i];
        List<double[]> loops = new ArrayList<>();
        List<double[]> open = new ArrayList<>();
        List<int[]> openEnds = new ArrayList<>(); // first and last edge of each open line
        for (int t : crossed) {
            int down = crossing(t, false);
            if (visited[t] != i + 1 && lattice.isBoundary(down)) {
                int[] ends = {down, NONE};
                double[] line = walk(i, t, ends);
                open.add(line);
                openEnds.add(ends);
                lines.add(new Isotherm(i, line, false));
            }
        }
        for (int t : crossed) {
            if (visited[t] != i + 1) {
                double[] line = walk(i, t, new int[] {crossing(t, false), NONE});
                double[] loop = Arrays.copyOf(line, line.length - 2);
                if (loop.length >= 6) {
                    lines.add(new Isotherm(i, loop, true));
                    loops.add(loop);
                }
            }
        }
        joinWithBoundary(open, openEnds, loops);
        for (int[] loop : boundaryLoops) {
            if (Arrays.stream(loop).allMatch(this::above)) {
                loops.add(corners(loop));
            }
        }
        return loops;
    }

    /** From a triangle's falling edge on, until the boundary or the first triangle again; ends[1] becomes the last edge. */
    private double[] walk(int i, int start, int[] ends) {
        Points points = new Points();
        addCrossing(points, ends[0]);
        int t = start;
        while (t >= 0 && visited[t] != i + 1) {
            visited[t] = i + 1;
            int up = crossing(t, true);
            addCrossing(points, up);
            ends[1] = up;
            t = lattice.edgeTriangle[2 * up] == t ? lattice.edgeTriangle[2 * up + 1] : lattice.edgeTriangle[2 * up];
        }
        return new LineSimplifier(tolerance).simplify(points.toArray());
    }

    private void joinWithBoundary(List<double[]> open, List<int[]> openEnds, List<double[]> loops) {
        int[] lineFrom = new int[open.size()]; // edges at which lines start, sorted, with the line's number beside
        long[] sorted = new long[open.size()];
        for (int k = 0; k < sorted.length; k++) {
            sorted[k] = ((long) openEnds.get(k)[0] << 32) | k;
        }
        Arrays.sort(sorted);
        for (int k = 0; k < sorted.length; k++) {
            lineFrom[k] = (int) (sorted[k] >>> 32);
        }
        boolean[] used = new boolean[open.size()];
        for (int start = 0; start < used.length; start++) {
            if (used[start]) {
                continue;
            }
            Points loop = new Points();
            int k = start;
            while (!used[k]) {
                used[k] = true;
                loop.addAll(open.get(k));
                // The line ends on a boundary edge along which the temperature rises: on to that edge's upper end.
                int v = boundaryEnd(openEnds.get(k)[1]);
                while (above(v)) {
                    if (isCorner[v]) {
                        loop.add(lattice.xy[2 * v], lattice.xy[2 * v + 1]);
                    }
                    int edge = boundaryFrom[v];
                    v = boundaryNext[v];
                    if (!above(v)) {
                        k = (int) sorted[Arrays.binarySearch(lineFrom, edge)];
                    }
                }
            }
            loops.add(loop.toArray());
        }
    }

    private boolean above(int point) {
        return lattice.value[point] >= level;
    }

    /** The edge along which the temperature, counter-clockwise around the triangle, rises past the level, or falls. */
    private int crossing(int t, boolean rising) {
        for (int i = 0; i < 3; i++) {
            boolean from = above(lattice.corner[3 * t + i]);
            boolean to = above(lattice.corner[3 * t + (i + 1) % 3]);
            if (from != to && to == rising) {
                return lattice.edge[3 * t + i];
            }
        }
        throw new IllegalStateException("triangle " + t + " is not crossed at " + level + " K");
    }

    /** Where the parabola along an edge has the level: the one root between ends on either side of it. */
    private void addCrossing(Points points, int edge) {
        int p = lattice.edgeEnd[2 * edge];
        int q = lattice.edgeEnd[2 * edge + 1];
        double a = lattice.value[p] - level;
        double b = lattice.value[q] - level;
        double m = lattice.edgeMiddle[edge] - level;
        double bend = 2 * (a - 2 * m + b);
        double slope = -3 * a + 4 * m - b;
        // a + slope s + bend s² = 0, in the form that does not cancel (Press et al., Numerical Recipes, 5.6)
        double root = Math.sqrt(Math.max(0, slope * slope - 4 * bend * a));
        double w = -0.5 * (slope + Math.copySign(root, slope));
        double s = w == 0 ? 0 : a / w;
        if (!(s >= 0 && s <= 1) || (bend != 0 && Math.abs(w / bend - 0.5) < Math.abs(s - 0.5))) {
            s = w / bend;
        }
        if (!(s >= 0 && s <= 1)) {
            s = a / (a - b); // round-off next to a node at the level
        }
        points.add(
                lattice.xy[2 * p] + s * (lattice.xy[2 * q] - lattice.xy[2 * p]),
                lattice.xy[2 * p + 1] + s * (lattice.xy[2 * q + 1] - lattice.xy[2 * p + 1]));
    }

    private void findBoundary() {
        Arrays.fill(boundaryFrom, NONE);
        for (int t = 0; t < lattice.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                int edge = lattice.edge[3 * t + i];
                if (lattice.isBoundary(edge)) {
                    int from = lattice.corner[3 * t + i];
                    boundaryFrom[from] = edge;
                    boundaryNext[from] = lattice.corner[3 * t + (i + 1) % 3];
                }
            }
        }
        boolean[] seen = new boolean[boundaryFrom.length];
        for (int start = 0; start < seen.length; start++) {
            if (boundaryFrom[start] == NONE || seen[start]) {
                continue;
            }
            int[] loop = new int[16];
            int n = 0;
            for (int v = start; !seen[v]; v = boundaryNext[v]) {
                seen[v] = true;
                if (n == loop.length) {
                    loop = Arrays.copyOf(loop, 2 * n);
                }
                loop[n++] = v;
            }
            boundaryLoops.add(Arrays.copyOf(loop, n));
            for (int i = 0; i < n; i++) {
                isCorner[loop[i]] = turns(loop[(i + n - 1) % n], loop[i], loop[(i + 1) % n]);
            }
        }
    }

    /** The end, seen with the section on the left, of a boundary edge. */
    private int boundaryEnd(int edge) {
        int p = lattice.edgeEnd[2 * edge];
        return boundaryFrom[p] == edge ? boundaryNext[p] : p;
    }

    private double[] corners(int[] loop) {
        Points points = new Points();
        for (int v : loop) {
            if (isCorner[v]) {
                points.add(lattice.xy[2 * v], lattice.xy[2 * v + 1]);
            }
        }
        return points.toArray();
    }

    private boolean turns(int before, int v, int next) {
        double[] xy = lattice.xy;
        double ux = xy[2 * v] - xy[2 * before];
        double uy = xy[2 * v + 1] - xy[2 * before + 1];
        double wx = xy[2 * next] - xy[2 * v];
        double wy = xy[2 * next + 1] - xy[2 * v + 1];
        return Math.abs(ux * wy - uy * wx) > 1e-9 * Math.hypot(ux, uy) * Math.hypot(wx, wy);
    }
}
