package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import tepor.mesher.section.Section;

/** Sections that are hard to mesh, for tests. */
final class StressSections {
    private StressSections() {}

    /** A square plate with round holes of 24 sides laid by chance, some nearly touching. */
    static Section circles(int count, long seed) {
        SampleSections s = new SampleSections();
        int plate = s.region("plate");
        s.ring(plate, 0, 0, 1, 0, 1, 1, 0, 1);
        Random random = new Random(seed);
        List<double[]> placed = new ArrayList<>();
        double greatest = 0.5 / Math.sqrt(count);
        while (placed.size() < count) {
            double r = greatest * (0.2 + 0.8 * random.nextDouble());
            double x = r + 1e-4 + (1 - 2 * r - 2e-4) * random.nextDouble();
            double y = r + 1e-4 + (1 - 2 * r - 2e-4) * random.nextDouble();
            if (placed.stream().allMatch(c -> Math.hypot(c[0] - x, c[1] - y) > c[2] + r + 1e-4)) {
                placed.add(new double[] {x, y, r});
                double[] ring = new double[48];
                for (int i = 0; i < 24; i++) {
                    ring[2 * i] = x + r * Math.cos(-Math.PI * i / 12);
                    ring[2 * i + 1] = y + r * Math.sin(-Math.PI * i / 12);
                }
                s.ring(plate, ring);
            }
        }
        return s.build();
    }

    /** Three layers one upon the other, the middle one as thin as told; 1 m wide and high in all. */
    static Section layer(double thickness) {
        SampleSections s = new SampleSections();
        double top = 0.5 + thickness;
        return s.ring(s.region("below"), 0, 0, 1, 0, 1, 0.5, 0, 0.5)
                .ring(s.region("layer"), 0, 0.5, 1, 0.5, 1, top, 0, top)
                .ring(s.region("above"), 0, top, 1, top, 1, 1, 0, 1)
                .build();
    }

    /** An island whose coast is rough at every scale: radii by displacing middles, and so without crossings. */
    static Section coast(int vertices, long seed) {
        Random random = new Random(seed);
        int n = Integer.highestOneBit(vertices - 1) * 2;
        double[] radius = new double[n];
        for (int step = n; step > 1; step /= 2) {
            double reach = 0.3 * Math.pow((double) step / n, 0.9);
            for (int i = 0; i < n; i += step) {
                double middle = 0.5 * (radius[i] + radius[(i + step) % n]);
                radius[i + step / 2] = middle + reach * (random.nextDouble() - 0.5);
            }
        }
        double[] ring = new double[2 * vertices];
        for (int i = 0; i < vertices; i++) {
            double angle = 2 * Math.PI * i / vertices;
            ring[2 * i] = (1 + radius[(int) ((long) i * n / vertices)]) * Math.cos(angle);
            ring[2 * i + 1] = (1 + radius[(int) ((long) i * n / vertices)]) * Math.sin(angle);
        }
        SampleSections s = new SampleSections();
        return s.ring(s.region("island"), ring).build();
    }

    /** A unit square one corner of which is cut off within so many units in the last place. */
    static Section cutWithinUlps(int ulps) {
        double near = 1 - ulps * Math.ulp(1.0);
        SampleSections s = new SampleSections();
        return s.ring(s.region("plate"), 0, 0, 1, 0, 1, near, near, 1, 0, 1).build();
    }

    /**
     * Star-shaped rings in star-shaped rings, several levels deep, each of a material, of another, or of nothing.
     */
    static Section nested(long seed) {
        Random random = new Random(seed);
        SampleSections s = new SampleSections();
        int[] regions = {s.region("body"), s.region("core"), s.nothing("hole"), s.region("pin")};
        nest(s, random, regions, 0, Section.NONE, new double[] {0, 0, 1}, 1 + random.nextInt(4));
        return s.build();
    }

    private static void nest(
            SampleSections s, Random random, int[] regions, int inside, int outside, double[] circle, int levels) {
        int corners = 3 + random.nextInt(12);
        double[] ring = new double[2 * corners];
        double[] reversed = new double[2 * corners];
        double least = 0.15 + 0.8 * random.nextDouble();
        double clear = circle[2];
        double turn = random.nextDouble();
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * (turn + (i + 0.5 * random.nextDouble()) / corners);
            double radius = circle[2] * (least + (1 - least) * random.nextDouble());
            ring[2 * i] = circle[0] + radius * Math.cos(angle);
            ring[2 * i + 1] = circle[1] + radius * Math.sin(angle);
        }
        for (int i = 0; i < corners; i++) {
            int j = (i + 1) % corners;
            double ax = ring[2 * i] - circle[0];
            double ay = ring[2 * i + 1] - circle[1];
            double bx = ring[2 * j] - circle[0];
            double by = ring[2 * j + 1] - circle[1];
            double distance = (ax * by - ay * bx) / Math.hypot(bx - ax, by - ay);
            clear = Math.min(clear, distance);
            reversed[2 * (corners - 1 - i)] = ring[2 * i];
            reversed[2 * (corners - 1 - i) + 1] = ring[2 * i + 1];
        }
        s.ring(regions[inside], ring);
        if (outside != Section.NONE) {
            s.ring(regions[outside], reversed);
        }
        if (levels == 0 || clear < 0.02) {
            return;
        }
        int children = 1 + random.nextInt(3);
        for (int c = 0; c < children; c++) {
            double share = clear / (children == 1 ? 1 : 2.2);
            double offset = children == 1 ? 0 : 0.52 * clear;
            double angle = 2 * Math.PI * c / children + 0.1;
            double radius = 0.8 * (children == 3 ? 0.9 : 1) * share;
            double x = circle[0] + offset * Math.cos(angle);
            double y = circle[1] + offset * Math.sin(angle);
            int own = (inside + 1 + random.nextInt(3)) % 4;
            nest(s, random, regions, own, inside, new double[] {x, y, radius}, levels - 1);
        }
    }
}
