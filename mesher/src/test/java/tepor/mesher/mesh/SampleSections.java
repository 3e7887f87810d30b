package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.ToIntBiFunction;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.DelaunayBuilder;
import tepor.mesher.triangulation.Predicates;
import tepor.mesher.triangulation.Triangulation;

/** Sections for tests, made from rings of points. */
public final class SampleSections {
    private final List<Double> xy = new ArrayList<>();
    private final Map<List<Double>, Integer> vertexAt = new HashMap<>();
    private final Map<List<Integer>, int[]> sidesOf = new HashMap<>();
    private final List<List<Integer>> segments = new ArrayList<>();
    private final List<String> names = new ArrayList<>();
    private final List<Boolean> holes = new ArrayList<>();

    /** A new region of material; returns its number. */
    public int region(String name) {
        names.add(name);
        holes.add(false);
        return names.size() - 1;
    }

    /** A new region of nothing; returns its number. */
    public int nothing(String name) {
        names.add(name);
        holes.add(true);
        return names.size() - 1;
    }

    /** A closed ring with the region on its left. Segments that are there already get it on that side. */
    public SampleSections ring(int region, double... points) {
        int n = points.length / 2;
        for (int i = 0; i < n; i++) {
            int j = (i + 1) % n;
            segment(points[2 * i], points[2 * i + 1], points[2 * j], points[2 * j + 1], region, Section.NONE);
        }
        return this;
    }

    /** A segment with regions on its left and right; NONE leaves what is there. */
    public SampleSections segment(double ax, double ay, double bx, double by, int left, int right) {
        int a = vertex(ax, ay);
        int b = vertex(bx, by);
        int[] sides = sidesOf.get(List.of(b, a));
        boolean reversed = sides != null;
        if (!reversed) {
            sides = sidesOf.computeIfAbsent(List.of(a, b), key -> {
                segments.add(key);
                return new int[] {Section.NONE, Section.NONE};
            });
        }
        if (left != Section.NONE) {
            sides[reversed ? 1 : 0] = left;
        }
        if (right != Section.NONE) {
            sides[reversed ? 0 : 1] = right;
        }
        return this;
    }

    private int vertex(double x, double y) {
        return vertexAt.computeIfAbsent(List.of(x + 0.0, y + 0.0), key -> {
            xy.add(x);
            xy.add(y);
            return xy.size() / 2 - 1;
        });
    }

    /** The section; segments with the same region on both sides are left out. */
    public Section build() {
        List<List<Integer>> kept = segments.stream()
                .filter(s -> sidesOf.get(s)[0] != sidesOf.get(s)[1])
                .filter(s -> isSolid(sidesOf.get(s)[0]) || isSolid(sidesOf.get(s)[1]))
                .toList();
        int[] ends = kept.stream().flatMap(List::stream).mapToInt(i -> i).toArray();
        int[] sides =
                kept.stream().flatMapToInt(s -> Arrays.stream(sidesOf.get(s))).toArray();
        boolean[] outer = new boolean[kept.size()];
        for (int s = 0; s < outer.length; s++) {
            outer[s] = sides[2 * s] == Section.NONE || sides[2 * s + 1] == Section.NONE;
        }
        boolean[] hole = new boolean[holes.size()];
        for (int r = 0; r < hole.length; r++) {
            hole[r] = holes.get(r);
        }
        double[] coordinates = xy.stream().mapToDouble(d -> d).toArray();
        return new Section(coordinates, ends, sides, outer, names, hole, 1e-9);
    }

    private boolean isSolid(int region) {
        return region != Section.NONE && !holes.get(region);
    }

    /** The same section with each vertex moved to scale·R(turn)·(x, y) + (dx, dy), rounded. */
    public static Section moved(Section section, double scale, double turn, double dx, double dy) {
        double[] xy = new double[2 * section.vertexCount()];
        double cos = scale * Math.cos(turn);
        double sin = scale * Math.sin(turn);
        for (int v = 0; v < section.vertexCount(); v++) {
            xy[2 * v] = cos * section.x(v) - sin * section.y(v) + dx;
            xy[2 * v + 1] = sin * section.x(v) + cos * section.y(v) + dy;
        }
        int n = section.segmentCount();
        int[] ends = new int[2 * n];
        int[] sides = new int[2 * n];
        boolean[] outer = new boolean[n];
        for (int s = 0; s < n; s++) {
            ends[2 * s] = section.start(s);
            ends[2 * s + 1] = section.end(s);
            sides[2 * s] = section.left(s);
            sides[2 * s + 1] = section.right(s);
            outer[s] = section.isOuter(s);
        }
        boolean[] hole = new boolean[section.regionCount()];
        List<String> names = new ArrayList<>();
        for (int r = 0; r < hole.length; r++) {
            hole[r] = section.isHole(r);
            names.add(section.regionName(r));
        }
        return new Section(xy, ends, sides, outer, names, hole, section.snap() * scale);
    }

    private static double[] rectangle(double x0, double y0, double x1, double y1) {
        return new double[] {x0, y0, x1, y0, x1, y1, x0, y1};
    }

    /** The unit square. */
    public static Section square() {
        SampleSections s = new SampleSections();
        return s.ring(s.region("plate"), rectangle(0, 0, 1, 1)).build();
    }

    public static Section lShape() {
        SampleSections s = new SampleSections();
        return s.ring(s.region("angle"), 0, 0, 2, 0, 2, 1, 1, 1, 1, 2, 0, 2).build();
    }

    public static Section squareWithSquareHole() {
        SampleSections s = new SampleSections();
        int plate = s.region("plate");
        int window = s.nothing("window");
        s.ring(plate, rectangle(0, 0, 3, 3));
        return s.ring(window, rectangle(1, 1, 2, 2))
                .ring(plate, 1, 1, 1, 2, 2, 2, 2, 1)
                .build();
    }

    /** A plate with a hole of 64 sides; the hole stands as emptiness, not as a region of nothing. */
    public static Section plateWithRoundHole() {
        SampleSections s = new SampleSections();
        int plate = s.region("plate");
        s.ring(plate, rectangle(0, 0, 2, 1));
        double[] circle = new double[128];
        for (int i = 0; i < 64; i++) {
            circle[2 * i] = 1 + 0.25 * Math.cos(-Math.PI * i / 32);
            circle[2 * i + 1] = 0.5 + 0.25 * Math.sin(-Math.PI * i / 32);
        }
        return s.ring(plate, circle).build();
    }

    /** A layer of a thousandth of the height between two thick ones. */
    public static Section thinLayer() {
        SampleSections s = new SampleSections();
        int below = s.region("below");
        int foil = s.region("foil");
        int above = s.region("above");
        return s.ring(below, rectangle(0, 0, 1, 0.5))
                .ring(foil, rectangle(0, 0.5, 1, 0.501))
                .ring(above, rectangle(0, 0.501, 1, 1))
                .build();
    }

    /** Cells side by side, the region of each given by its column and row; equal neighbours are one. */
    public static Section cells(int columns, int rows, int regions, ToIntBiFunction<Integer, Integer> regionOf) {
        SampleSections s = new SampleSections();
        for (int r = 0; r < regions; r++) {
            s.region("region " + r);
        }
        for (int i = 0; i < columns; i++) {
            for (int j = 0; j < rows; j++) {
                s.ring(regionOf.applyAsInt(i, j), rectangle(i, j, i + 1, j + 1));
            }
        }
        return s.build();
    }

    /** A wedge, or a spike, of the angle given, 1 m long. */
    public static Section wedge(double angle) {
        SampleSections s = new SampleSections();
        return s.ring(s.region("wedge"), 0, 0, 1, 0, Math.cos(angle), Math.sin(angle))
                .build();
    }

    public static Section comb(int teeth) {
        double[] points = new double[2 * (4 * teeth + 2)];
        int n = 0;
        points[n++] = 0;
        points[n++] = -1;
        points[n++] = 2 * teeth - 1;
        points[n++] = -1;
        for (int i = teeth - 1; i >= 0; i--) {
            for (double[] p : new double[][] {{2 * i + 1, 8}, {2 * i, 8}}) {
                points[n++] = p[0];
                points[n++] = p[1];
            }
            if (i > 0) {
                for (double[] p : new double[][] {{2 * i, 0}, {2 * i - 1, 0}}) {
                    points[n++] = p[0];
                    points[n++] = p[1];
                }
            }
        }
        SampleSections s = new SampleSections();
        return s.ring(s.region("comb"), Arrays.copyOf(points, n)).build();
    }

    /** A plate with a spike of 5° driven into its edge. */
    public static Section spike() {
        SampleSections s = new SampleSections();
        double half = 0.5 * Math.tan(Math.toRadians(2.5));
        return s.ring(s.region("plate"), 0, 0, 1, 0, 1, 1, 0.5 + half, 1, 0.5, 0.5, 0.5 - half, 1, 0, 1)
                .build();
    }

    /** Two squares that touch in one corner. */
    public static Section touchingCorners() {
        SampleSections s = new SampleSections();
        int one = s.region("one");
        int other = s.region("other");
        return s.ring(one, rectangle(0, 0, 1, 1))
                .ring(other, rectangle(1, 1, 2, 2))
                .build();
    }

    /** One wide region above two narrow ones: their border ends in the middle of its lower side. */
    public static Section tJunction() {
        SampleSections s = new SampleSections();
        int left = s.region("left");
        int right = s.region("right");
        int top = s.region("top");
        return s.ring(left, rectangle(0, 0, 0.3, 1))
                .ring(right, rectangle(0.3, 0, 1, 1))
                .ring(top, 0, 1, 0.3, 1, 1, 1, 1, 1.5, 0, 1.5)
                .build();
    }

    /** The Delaunay triangles of random points, each given one of three regions by chance: angles of every size. */
    public static Section patchwork(int points, long seed) {
        Random random = new Random(seed);
        double[] xy = random.doubles(2L * points).toArray();
        Triangulation triangles = DelaunayBuilder.build(xy, new Predicates());
        SampleSections s = new SampleSections();
        int[] regions = {s.region("red"), s.region("green"), s.nothing("hole"), s.region("blue")};
        for (int t = 0; t < triangles.triangleCount(); t++) {
            if (!triangles.isGhost(t)) {
                double[] ring = new double[6];
                for (int i = 0; i < 3; i++) {
                    ring[2 * i] = xy[2 * triangles.apex(3 * t + i)];
                    ring[2 * i + 1] = xy[2 * triangles.apex(3 * t + i) + 1];
                }
                s.ring(regions[random.nextInt(4)], ring);
            }
        }
        return s.build();
    }
}
