package tepor.viewer.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleBiFunction;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.Section;
import tepor.solver.field.TemperatureField;

/**
 * Sections and meshes for tests: columns × rows of four-sided cells, each cut into two triangles. Points come from a
 * mapping of the grid's lines, regions from a mapping of its cells; the last column may be joined to the first.
 */
public final class PatternedGrid {
    /** Where the grid's line i (column) and j (row) cross, metres. */
    @FunctionalInterface
    public interface Points {
        double[] at(int i, int j);
    }

    /** Region of cell (i, j). */
    @FunctionalInterface
    public interface Regions {
        int of(int i, int j);
    }

    private final int columns;
    private final int rows;
    private final boolean ring;
    private final Points points;
    private final Regions regions;
    private final String[] names;
    private final boolean[] hole;
    private boolean rounded;

    /** @param names of the regions; those beginning with "nothing" are holes */
    public PatternedGrid(int columns, int rows, boolean ring, Points points, Regions regions, String... names) {
        this.columns = columns;
        this.rows = rows;
        this.ring = ring;
        this.points = points;
        this.regions = regions;
        this.names = names;
        hole = new boolean[names.length];
        for (int r = 0; r < hole.length; r++) {
            hole[r] = names[r].startsWith("nothing");
        }
    }

    /** A ring about the origin, rows from the inner radius outwards in geometric steps. */
    public static PatternedGrid ring(double inner, double outer, int columns, int rows) {
        return new PatternedGrid(
                columns,
                rows,
                true,
                (i, j) -> {
                    double r = inner * Math.pow(outer / inner, j / (double) rows);
                    double angle = 2 * Math.PI * i / columns;
                    // Columns run clockwise, so that columns and rows make right-handed cells.
                    return new double[] {r * Math.cos(-angle), r * Math.sin(-angle)};
                },
                (i, j) -> 0,
                "ring");
    }

    /** Makes the segments along a ring's rows arcs, and the six-node triangles at them curved. */
    public PatternedGrid rounded() {
        rounded = true;
        return this;
    }

    private Circle circle(double ax, double ay, double bx, double by) {
        double radius = Math.hypot(ax, ay);
        return rounded && Math.abs(Math.hypot(bx, by) - radius) < 1e-9 * radius ? new Circle(0, 0, radius) : null;
    }

    /** A rectangle from the origin. */
    public static PatternedGrid rectangle(double width, double height, int columns, int rows, Regions r, String... n) {
        return new PatternedGrid(
                columns, rows, false, (i, j) -> new double[] {width * i / columns, height * j / rows}, r, n);
    }

    private int lines() {
        return ring ? columns : columns + 1;
    }

    private int vertex(int i, int j) {
        return j * lines() + i % lines();
    }

    private int region(int i, int j) {
        if (j < 0 || j >= rows || (!ring && (i < 0 || i >= columns))) {
            return Section.NONE;
        }
        return regions.of(Math.floorMod(i, columns), j);
    }

    private double[] vertices() {
        double[] xy = new double[2 * lines() * (rows + 1)];
        for (int j = 0; j <= rows; j++) {
            for (int i = 0; i < lines(); i++) {
                System.arraycopy(points.at(i, j), 0, xy, 2 * vertex(i, j), 2);
            }
        }
        return xy;
    }

    /** Segments: from, to, region on the left, region on the right. */
    private List<int[]> segments() {
        List<int[]> list = new ArrayList<>();
        for (int j = 0; j <= rows; j++) {
            for (int i = 0; i < columns; i++) {
                addSegment(list, vertex(i, j), vertex(i + 1, j), region(i, j), region(i, j - 1));
            }
        }
        for (int j = 0; j < rows; j++) {
            for (int i = 0; i < lines(); i++) {
                addSegment(list, vertex(i, j), vertex(i, j + 1), region(i - 1, j), region(i, j));
            }
        }
        return list;
    }

    private static void addSegment(List<int[]> list, int from, int to, int left, int right) {
        if (left != right) {
            list.add(new int[] {from, to, left, right});
        }
    }

    public Section section() {
        List<int[]> segments = segments();
        int n = segments.size();
        int[] ends = new int[2 * n];
        int[] sides = new int[2 * n];
        boolean[] outer = new boolean[n];
        for (int s = 0; s < n; s++) {
            System.arraycopy(segments.get(s), 0, ends, 2 * s, 2);
            System.arraycopy(segments.get(s), 2, sides, 2 * s, 2);
            outer[s] = sides[2 * s] == Section.NONE || sides[2 * s + 1] == Section.NONE;
        }
        double[] xy = vertices();
        Circle[] circle = new Circle[n];
        for (int s = 0; s < n; s++) {
            int a = ends[2 * s];
            int b = ends[2 * s + 1];
            circle[s] = circle(xy[2 * a], xy[2 * a + 1], xy[2 * b], xy[2 * b + 1]);
        }
        return new Section(xy, ends, circle, sides, outer, List.of(names), hole, 1e-9);
    }

    /** The mesh; nodes in the middle of sides lie halfway between its ends, or on their arcs. */
    public Mesh mesh(int nodesPerTriangle) {
        double[] grid = vertices();
        int[] number = new int[grid.length / 2];
        Arrays.fill(number, -1);
        List<int[]> triangles = new ArrayList<>();
        List<Integer> region = new ArrayList<>();
        for (int j = 0; j < rows; j++) {
            for (int i = 0; i < columns; i++) {
                int r = region(i, j);
                if (hole[r]) {
                    continue;
                }
                int a = vertex(i, j);
                int b = vertex(i + 1, j);
                int c = vertex(i + 1, j + 1);
                int d = vertex(i, j + 1);
                boolean rising = (i + j) % 2 == 0;
                triangles.add(rising ? new int[] {a, b, c} : new int[] {a, b, d});
                triangles.add(rising ? new int[] {a, c, d} : new int[] {b, c, d});
                region.add(r);
                region.add(r);
            }
        }
        int corners = 0;
        for (int[] t : triangles) {
            for (int v : t) {
                number[v] = number[v] < 0 ? corners++ : number[v];
            }
        }
        double[] xy = new double[2 * corners];
        for (int v = 0; v < number.length; v++) {
            if (number[v] >= 0) {
                System.arraycopy(grid, 2 * v, xy, 2 * number[v], 2);
            }
        }
        return join(nodesPerTriangle, corners, xy, triangles, region, number);
    }

    private Mesh join(
            int nodesPerTriangle,
            int corners,
            double[] cornerXy,
            List<int[]> triangles,
            List<Integer> region,
            int[] number) {
        int n = triangles.size();
        Map<Long, Integer> sideOf = new HashMap<>(); // directed side → 3·triangle + side
        Map<Long, Integer> middle = new HashMap<>();
        int[] node = new int[nodesPerTriangle * n];
        List<Double> extra = new ArrayList<>();
        for (int t = 0; t < n; t++) {
            for (int i = 0; i < 3; i++) {
                node[nodesPerTriangle * t + i] = number[triangles.get(t)[i]];
            }
            for (int i = 0; i < 3; i++) {
                int a = node[nodesPerTriangle * t + (i + 1) % 3];
                int b = node[nodesPerTriangle * t + (i + 2) % 3];
                sideOf.put(key(a, b), 3 * t + i);
                if (nodesPerTriangle == 6) {
                    node[6 * t + 3 + i] = middle.computeIfAbsent(key(Math.min(a, b), Math.max(a, b)), k -> {
                        extra.add(0.5 * (cornerXy[2 * a] + cornerXy[2 * b]));
                        extra.add(0.5 * (cornerXy[2 * a + 1] + cornerXy[2 * b + 1]));
                        return corners + extra.size() / 2 - 1;
                    });
                }
            }
        }
        int[] neighbour = new int[3 * n];
        Arrays.fill(neighbour, Mesh.NONE);
        sideOf.forEach((k, side) -> {
            Integer across = sideOf.get((k << 32) | (k >>> 32));
            neighbour[side] = across == null ? Mesh.NONE : across / 3;
        });
        List<int[]> facets = new ArrayList<>();
        List<int[]> segments = segments();
        for (int s = 0; s < segments.size(); s++) {
            long along = key(number[segments.get(s)[0]], number[segments.get(s)[1]]);
            int left = sideOf.getOrDefault(along, -1);
            int right = sideOf.getOrDefault((along << 32) | (along >>> 32), -1);
            if (left >= 0 || right >= 0) {
                facets.add(new int[] {s, left, right});
            }
        }
        double[] xy = Arrays.copyOf(cornerXy, cornerXy.length + extra.size());
        for (int i = 0; i < extra.size(); i++) {
            xy[cornerXy.length + i] = extra.get(i);
        }
        for (int[] facet : facets) {
            int side = Math.max(facet[1], facet[2]);
            int a = node[nodesPerTriangle * (side / 3) + (side % 3 + 1) % 3];
            int b = node[nodesPerTriangle * (side / 3) + (side % 3 + 2) % 3];
            Circle circle = circle(xy[2 * a], xy[2 * a + 1], xy[2 * b], xy[2 * b + 1]);
            if (nodesPerTriangle == 6 && circle != null) {
                Coordinate on = circle.middle(xy[2 * a], xy[2 * a + 1], xy[2 * b], xy[2 * b + 1]);
                int m = node[6 * (side / 3) + 3 + side % 3];
                xy[2 * m] = on.x;
                xy[2 * m + 1] = on.y;
            }
        }
        return new Mesh(
                nodesPerTriangle,
                corners,
                xy,
                node,
                neighbour,
                region.stream().mapToInt(r -> r).toArray(),
                facets.stream().mapToInt(f -> f[0]).toArray(),
                facets.stream().mapToInt(f -> f[1]).toArray(),
                facets.stream().mapToInt(f -> f[2]).toArray());
    }

    private static long key(int a, int b) {
        return ((long) a << 32) | (b & 0xffffffffL);
    }

    /** The field that has these temperatures (°C, of x and y in metres) at its nodes. */
    public static TemperatureField field(Mesh mesh, ToDoubleBiFunction<Double, Double> celsius) {
        double[] kelvin = new double[mesh.nodeCount()];
        for (int i = 0; i < kelvin.length; i++) {
            kelvin[i] = 273.15 + celsius.applyAsDouble(mesh.x(i), mesh.y(i));
        }
        return new TemperatureField(mesh, kelvin);
    }
}
