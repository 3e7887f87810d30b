package tepor.mesher.refinement;

import java.util.Arrays;
import java.util.function.BooleanSupplier;
import tepor.mesher.triangulation.Cavity;
import tepor.mesher.triangulation.HilbertOrder;
import tepor.mesher.triangulation.TriangleWalk;
import tepor.mesher.triangulation.Triangulation;

/**
 * Plants vertices of a lattice of equilateral triangles wherever the size wanted is the same far and wide, before
 * refinement begins.
 *
 * <p>No mesh with sides of a given length at most has fewer triangles than such a lattice, and vertices known beforehand
 * can be inserted in an order that keeps to neighbouring triangles in memory and makes small cavities: coarse lattice
 * first, each lattice along Hilbert's curve. Near segments and where the size varies no vertex is planted: refinement fills
 * in what is missing. Planting can be left undone at any place, so it needs no case for places that are hard to reach.
 */
final class LatticeSeeder {
    /** Side of the lattice as a part of the size wanted. */
    private static final double SIDE = 0.985;
    /** Vertices are moved by up to this part of the side, lest rows of points on one line or circle tire the predicates. */
    private static final double JITTER = 1e-4;
    /** The size counts as even where it differs by no more than this part. */
    private static final double EVEN = 0.01;
    /** No vertex is planted nearer to another than this part of the side. */
    private static final double CLEARANCE = 0.7;
    /** No vertex is planted nearer to a segment than this part of the side. */
    private static final double SEGMENT_CLEARANCE = 0.45;
    /** For fewer vertices than this it is not worth it. */
    private static final int FEWEST = 100;
    /** Refinement beside segments adds this many triangles at most for each one of the lattice. */
    private static final double RESERVE = 1.5;

    /** Room is made beforehand for so many times the triangles of the lattice. */
    private static final double ROOM = 1.06;

    private static final int COARSEST = 12;
    private static final int STEPS_BETWEEN_CHECKS = 1024;

    private final Triangulation mesh;
    private final Vertices vertices;
    private final SubsegmentRule subsegmentRule;
    private final TriangleWalk walk;
    private final Cavity cavity;
    private final double side;
    private final double row;
    private final double size;
    private double originX;
    private double originY;

    /** Lattice columns and rows of the candidates, and a triangle in which each lay at first. */
    private int[] column = new int[1024];

    private int[] line = new int[1024];
    private int[] home = new int[1024];
    private int count;

    LatticeSeeder(
            Triangulation mesh, Vertices vertices, SubsegmentRule subsegmentRule, TriangleWalk walk, Cavity cavity) {
        this.mesh = mesh;
        this.vertices = vertices;
        this.subsegmentRule = subsegmentRule;
        this.walk = walk;
        this.cavity = cavity;
        size = greatestSize();
        side = SIDE * size;
        row = Math.sqrt(0.75) * side;
    }

    /**
     * Plants the vertices.
     *
     * @param trianglesAtMost nothing is planted if more triangles than this would be made
     * @param stopped asked now and then whether to stop; planting then ends half-way
     */
    void plant(int trianglesAtMost, BooleanSupplier stopped) {
        double expected = area() / (side * row);
        if (!(expected >= FEWEST && 2 * RESERVE * expected + mesh.triangleCount() < trianglesAtMost)) {
            return;
        }
        collect();
        vertices.reserve((int) (2 * ROOM * count) + mesh.triangleCount());
        insertAll(stopped);
    }

    private double greatestSize() {
        double greatest = 0;
        for (int v = 0; v < mesh.vertexCount(); v++) {
            greatest = Math.max(greatest, vertices.size(v));
        }
        return greatest;
    }

    private double area() {
        double twice = 0;
        originX = Double.POSITIVE_INFINITY;
        originY = Double.POSITIVE_INFINITY;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            int a = mesh.apex(3 * t);
            int b = mesh.apex(3 * t + 1);
            int c = mesh.apex(3 * t + 2);
            twice += (mesh.x(b) - mesh.x(a)) * (mesh.y(c) - mesh.y(a))
                    - (mesh.x(c) - mesh.x(a)) * (mesh.y(b) - mesh.y(a));
            originX = Math.min(originX, Math.min(mesh.x(a), Math.min(mesh.x(b), mesh.x(c))));
            originY = Math.min(originY, Math.min(mesh.y(a), Math.min(mesh.y(b), mesh.y(c))));
        }
        return 0.5 * twice;
    }

    private void collect() {
        for (int t = 0; t < mesh.triangleCount(); t++) {
            double low = Double.POSITIVE_INFINITY;
            double high = Double.NEGATIVE_INFINITY;
            for (int s = 3 * t; s < 3 * t + 3; s++) {
                low = Math.min(low, mesh.y(mesh.apex(s)));
                high = Math.max(high, mesh.y(mesh.apex(s)));
            }
            int last = (int) Math.floor((high - originY) / row);
            for (int j = (int) Math.ceil((low - originY) / row); j <= last; j++) {
                collectRow(t, j);
            }
        }
    }

    // Takes the lattice points of a row that lie in the triangle: left end in, right end out, so that each point falls
    // into one triangle.
    private void collectRow(int t, int j) {
        double y = originY + j * row;
        double from = Double.POSITIVE_INFINITY;
        double to = Double.NEGATIVE_INFINITY;
        for (int s = 3 * t; s < 3 * t + 3; s++) {
            int a = Math.min(mesh.origin(s), mesh.destination(s));
            int b = Math.max(mesh.origin(s), mesh.destination(s));
            double ay = mesh.y(a);
            double by = mesh.y(b);
            if (ay <= y != by <= y) {
                double x = mesh.x(a) + (mesh.x(b) - mesh.x(a)) * ((y - ay) / (by - ay));
                from = Math.min(from, x);
                to = Math.max(to, x);
            }
        }
        double shift = originX + ((j & 1) == 0 ? 0 : 0.5 * side);
        int first = (int) Math.ceil((from - shift) / side);
        int end = (int) Math.ceil((to - shift) / side);
        for (int i = first; i < end; i++) {
            double size = vertices.sizeAt(shift + i * side, y);
            if (Math.abs(size - this.size) <= EVEN * this.size) {
                add(i, j, t);
            }
        }
    }

    private void add(int i, int j, int t) {
        if (count == column.length) {
            column = Arrays.copyOf(column, 2 * count);
            line = Arrays.copyOf(line, 2 * count);
            home = Arrays.copyOf(home, 2 * count);
        }
        column[count] = i;
        line[count] = j;
        home[count++] = t;
    }

    private void insertAll(BooleanSupplier stopped) {
        double[] xy = new double[2 * count];
        int[] round = new int[count];
        for (int k = 0; k < count; k++) {
            int i = column[k];
            int j = line[k];
            double x = originX + (i + 0.5 * (j & 1)) * side;
            double y = originY + j * row;
            xy[2 * k] = x + JITTER * side * (hash(i, j) * 0x1p-31);
            xy[2 * k + 1] = y + JITTER * side * (hash(j, ~i) * 0x1p-31);
            // In oblique coordinates every other row and column is a lattice of twice the side.
            int oblique = i - (j >> 1);
            round[k] = COARSEST - Math.min(COARSEST, Integer.numberOfTrailingZeros(oblique | j));
        }
        int last = 0;
        int[] order = HilbertOrder.alongCurve(xy);
        for (int r = 0; r <= COARSEST; r++) {
            for (int n = 0; n < count; n++) {
                int k = order[n];
                if (round[k] == r) {
                    if (n % STEPS_BETWEEN_CHECKS == 0 && stopped.getAsBoolean()) {
                        return;
                    }
                    last = insert(xy[2 * k], xy[2 * k + 1], last, home[k]);
                }
            }
        }
    }

    private static int hash(int a, int b) {
        int h = a * 0x9E3779B9 + b * 0x85EBCA6B;
        h = (h ^ (h >>> 15)) * 0xC2B2AE35;
        return h ^ (h >>> 16);
    }

    // Returns a triangle near the place.
    private int insert(double x, double y, int near, int home) {
        TriangleWalk.Found found = find(x, y, near);
        if (found != TriangleWalk.Found.INSIDE && found != TriangleWalk.Found.ON_SIDE) {
            found = find(x, y, home);
        }
        boolean onFreeSide = found == TriangleWalk.Found.ON_SIDE && mesh.constraint(walk.side()) < 0;
        if (found == TriangleWalk.Found.INSIDE || onFreeSide) {
            cavity.dig(x, y, walk.triangle());
            if (isClear(x, y)) {
                cavity.fill(vertices.add(x, y, Vertices.FREE));
            }
            return cavity.borderSide(0) / 3;
        }
        return near;
    }

    private TriangleWalk.Found find(double x, double y, int near) {
        TriangleWalk.Found found = walk.walk(near, x, y);
        for (int i = 0; i < 8 && found == TriangleWalk.Found.BLOCKED && mesh.twin(walk.side()) >= 0; i++) {
            found = walk.walk(mesh.twin(walk.side()) / 3, x, y);
        }
        return found;
    }

    private boolean isClear(double x, double y) {
        double clear = CLEARANCE * side;
        double segmentClear = SEGMENT_CLEARANCE * side;
        for (int i = 0; i < cavity.borderCount(); i++) {
            int s = cavity.borderSide(i);
            int a = mesh.origin(s);
            double dx = mesh.x(a) - x;
            double dy = mesh.y(a) - y;
            if (dx * dx + dy * dy < clear * clear) {
                return false;
            }
            if (mesh.constraint(s) >= 0) {
                int b = mesh.destination(s);
                double ex = mesh.x(b) - mesh.x(a);
                double ey = mesh.y(b) - mesh.y(a);
                double cross = dx * ey - dy * ex;
                if (cross * cross < segmentClear * segmentClear * (ex * ex + ey * ey)
                        || subsegmentRule.isEncroachedBy(s, x, y)) {
                    return false;
                }
            }
        }
        return true;
    }
}
