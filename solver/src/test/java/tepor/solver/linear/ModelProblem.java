package tepor.solver.linear;

import java.util.Arrays;
import java.util.Random;

/**
 * Conduction in the unit square on a perturbed mesh of n × n cells, each of two triangles with a diagonal drawn by lot (graded: cells shrink towards x = 0 and y = 0 to e⁻⁴ of the largest, and are
 * stretched up to e⁴ : 1);
 * films of coefficient 1 at the left end (surroundings at 1) and the right end (at 0) unless stated otherwise.
 */
final class ModelProblem {
    /** Conductivities kxx, kyy and kxy at a point. */
    interface Conductivity {
        void at(double x, double y, double[] k);
    }

    final SparsityPattern pattern;
    final SymmetricMatrix matrix;
    final double[] load;
    /** As {@link MultilevelPreconditioner#quadratic} wants it; null for three-node triangles. */
    final int[] corners;

    private final int n;
    private final int nodesPerElement;
    private final double[] xy;
    private final boolean[] risingDiagonal;
    private final int[] unknown;

    private ModelProblem(
            int n, boolean quadratic, boolean fixedEnds, Conductivity conductivity, double scale, double grading) {
        this.n = n;
        nodesPerElement = quadratic ? 6 : 3;
        Random random = new Random(1);
        int cornerCount = (n + 1) * (n + 1);
        xy = new double[2 * cornerCount];
        for (int j = 0; j <= n; j++) {
            for (int i = 0; i <= n; i++) {
                int node = j * (n + 1) + i;
                double dx = i == 0 || i == n ? 0 : 0.5 * (random.nextDouble() - 0.5);
                double dy = j == 0 || j == n ? 0 : 0.5 * (random.nextDouble() - 0.5);
                xy[2 * node] = place((i + dx) / n, grading);
                xy[2 * node + 1] = place((j + dy) / n, grading);
            }
        }
        risingDiagonal = new boolean[n * n];
        for (int c = 0; c < n * n; c++) {
            risingDiagonal[c] = random.nextBoolean();
        }
        int nodeCount = quadratic ? cornerCount + 2 * n * (n + 1) + n * n : cornerCount;
        unknown = new int[nodeCount];
        int count = 0;
        for (int node = 0; node < nodeCount; node++) {
            unknown[node] = fixedEnds && atEnd(node) ? -1 : count++;
        }
        int[] nodes = elements();
        int[] elementUnknowns = Arrays.stream(nodes).map(node -> unknown[node]).toArray();
        pattern = new SparsityPattern(count, nodesPerElement, elementUnknowns);
        double[] value = new double[pattern.slotCount()];
        load = new double[count];
        double[] element = new double[nodesPerElement * nodesPerElement];
        for (int e = 0; e < nodes.length / nodesPerElement; e++) {
            stiffness(nodes, e, conductivity, element);
            pattern.add(e, element, value);
            for (int i = 0; i < nodesPerElement; i++) {
                for (int j = 0; j < nodesPerElement; j++) {
                    int row = unknown[nodes[e * nodesPerElement + i]];
                    int node = nodes[e * nodesPerElement + j];
                    if (row >= 0 && unknown[node] < 0 && node % (n + 1) == 0) {
                        load[row] -= element[i * nodesPerElement + j]; // fixed at 1 on the left
                    }
                }
            }
        }
        if (!fixedEnds) {
            films(value);
        }
        for (int k = 0; k < value.length; k++) {
            value[k] *= scale;
        }
        for (int k = 0; k < count; k++) {
            load[k] *= scale;
        }
        matrix = new SymmetricMatrix(pattern, value);
        corners = quadratic ? corners(nodes) : null;
    }

    static ModelProblem linear(int n, Conductivity conductivity) {
        return new ModelProblem(n, false, false, conductivity, 1, 0);
    }

    static ModelProblem quadratic(int n, Conductivity conductivity) {
        return new ModelProblem(n, true, false, conductivity, 1, 0);
    }

    /** Temperatures fixed at 1 on the left and 0 on the right end, eliminated; three- or six-node triangles. */
    static ModelProblem fixedEnds(int n, boolean quadratic, Conductivity conductivity) {
        return new ModelProblem(n, quadratic, true, conductivity, 1, 0);
    }

    /**
     * The problems by name: constant, weak films (conductivity 1e4), checkerboard, strong checkerboard (1 : 1e8),
     * inclusions, anisotropic, rotated, layers, graded, fixed ends (with layers).
     */
    static ModelProblem named(String name, boolean quadratic, int n) {
        Conductivity conductivity = switch (name) {
            case "constant", "graded" -> constant(1);
            case "weak films" -> constant(1e4);
            case "checkerboard" -> checkerboard(1e4);
            case "strong checkerboard" -> checkerboard(1e8);
            case "inclusions" -> inclusions();
            case "anisotropic" -> anisotropic(100);
            case "rotated" -> rotated(100);
            case "layers", "fixed ends" -> thinLayers();
            default -> throw new IllegalArgumentException(name);
        };
        boolean fixed = name.equals("fixed ends");
        return new ModelProblem(n, quadratic, fixed, conductivity, 1, name.equals("graded") ? 4 : 0);
    }

    LinearSolver solver() {
        return corners == null ? new LinearSolver(matrix) : LinearSolver.quadratic(matrix, corners);
    }

    /** Everything multiplied by a factor. */
    static ModelProblem scaled(int n, boolean quadratic, Conductivity conductivity, double scale) {
        return new ModelProblem(n, quadratic, false, conductivity, scale, 0);
    }

    static Conductivity constant(double conductivity) {
        return (x, y, k) -> ground(k, conductivity);
    }

    /** 8 × 8 squares, 1 and the contrast in turn. */
    static Conductivity checkerboard(double contrast) {
        return (x, y, k) -> ground(k, ((int) (8 * x) + (int) (8 * y)) % 2 == 0 ? 1 : contrast);
    }

    /** 60 discs by lot, of 1e4 and 1e−4 in turn, in a ground of 1. */
    static Conductivity inclusions() {
        Random random = new Random(7);
        double[] disc = new double[3 * 60];
        for (int d = 0; d < 60; d++) {
            disc[3 * d] = random.nextDouble();
            disc[3 * d + 1] = random.nextDouble();
            disc[3 * d + 2] = 0.02 + 0.04 * random.nextDouble();
        }
        return (x, y, k) -> {
            ground(k, 1);
            for (int d = 0; d < 60; d++) {
                if (Math.hypot(x - disc[3 * d], y - disc[3 * d + 1]) < disc[3 * d + 2]) {
                    ground(k, d % 2 == 0 ? 1e4 : 1e-4);
                }
            }
        };
    }

    /** The ratio along x, 1 along y. */
    static Conductivity anisotropic(double ratio) {
        return (x, y, k) -> {
            k[0] = ratio;
            k[1] = 1;
            k[2] = 0;
        };
    }

    /** The ratio along a line that rises by 30°, 1 across it. */
    static Conductivity rotated(double ratio) {
        double c = Math.cos(Math.PI / 6);
        double s = Math.sin(Math.PI / 6);
        return (x, y, k) -> {
            k[0] = ratio * c * c + s * s;
            k[1] = ratio * s * s + c * c;
            k[2] = (ratio - 1) * c * s;
        };
    }

    private static void ground(double[] k, double conductivity) {
        k[0] = conductivity;
        k[1] = conductivity;
        k[2] = 0;
    }

    /** Horizontal and vertical foils one to two cells of a mesh of 64 thick, 1e3 and 1e−3, in a ground of 1. */
    static Conductivity thinLayers() {
        return (x, y, k) -> {
            ground(k, 1);
            if (Math.abs(y - 0.3) < 0.01 || Math.abs(x - 0.7) < 0.01) {
                ground(k, 1e3);
            }
            if (Math.abs(y - 0.6) < 0.01) {
                ground(k, 1e-3);
            }
        };
    }

    private static double place(double t, double grading) {
        return grading == 0 ? t : Math.expm1(grading * t) / Math.expm1(grading);
    }

    private boolean atEnd(int node) {
        int corners = (n + 1) * (n + 1);
        if (node < corners) {
            return node % (n + 1) == 0 || node % (n + 1) == n;
        }
        int vertical = node - corners - n * (n + 1); // middle nodes of upright sides follow those of level ones
        return vertical >= 0 && vertical < n * (n + 1) && (vertical % (n + 1) == 0 || vertical % (n + 1) == n);
    }

    private int[] elements() {
        int[] nodes = new int[2 * n * n * nodesPerElement];
        int next = 0;
        for (int j = 0; j < n; j++) {
            for (int i = 0; i < n; i++) {
                int p = j * (n + 1) + i;
                int q = p + 1;
                int r = p + n + 2;
                int s = p + n + 1;
                int[][] triangles = risingDiagonal[j * n + i]
                        ? new int[][] {{p, q, r}, {p, r, s}}
                        : new int[][] {{p, q, s}, {q, r, s}};
                for (int[] t : triangles) {
                    for (int c = 0; c < 3; c++) {
                        nodes[next++] = t[c];
                    }
                    for (int c = 0; c < 3 && nodesPerElement == 6; c++) {
                        nodes[next++] = middle(t[(c + 1) % 3], t[(c + 2) % 3], i, j);
                    }
                }
            }
        }
        return nodes;
    }

    private int middle(int a, int b, int i, int j) {
        int corners = (n + 1) * (n + 1);
        int low = Math.min(a, b);
        return switch (Math.abs(a - b)) {
            case 1 -> corners + low / (n + 1) * n + low % (n + 1);
            default -> Math.abs(a - b) == n + 1 ? corners + n * (n + 1) + low : corners + 2 * n * (n + 1) + j * n + i;
        };
    }

    private void stiffness(int[] nodes, int e, Conductivity conductivity, double[] element) {
        int first = e * nodesPerElement;
        double[] x = new double[3];
        double[] y = new double[3];
        for (int c = 0; c < 3; c++) {
            x[c] = xy[2 * nodes[first + c]];
            y[c] = xy[2 * nodes[first + c] + 1];
        }
        double twiceArea = (x[1] - x[0]) * (y[2] - y[0]) - (x[2] - x[0]) * (y[1] - y[0]);
        double[] k = new double[3];
        int cell = e / 2;
        conductivity.at((cell % n + 0.5) / n, (cell / n + 0.5) / n, k);
        double[] gx = new double[3];
        double[] gy = new double[3];
        for (int c = 0; c < 3; c++) {
            gx[c] = (y[(c + 1) % 3] - y[(c + 2) % 3]) / twiceArea;
            gy[c] = (x[(c + 2) % 3] - x[(c + 1) % 3]) / twiceArea;
        }
        Arrays.fill(element, 0);
        double[] dx = new double[nodesPerElement];
        double[] dy = new double[nodesPerElement];
        for (int point = 0; point < 3; point++) { // the middles of the sides: exact for degree 2
            double[] l = {0.5, 0.5, 0.5};
            l[point] = 0;
            for (int c = 0; c < 3; c++) {
                int a = (c + 1) % 3;
                int b = (c + 2) % 3;
                double own = nodesPerElement == 3 ? 1 : 4 * l[c] - 1;
                dx[c] = own * gx[c];
                dy[c] = own * gy[c];
                if (nodesPerElement == 6) {
                    dx[3 + c] = 4 * (l[a] * gx[b] + l[b] * gx[a]);
                    dy[3 + c] = 4 * (l[a] * gy[b] + l[b] * gy[a]);
                }
            }
            for (int i = 0; i < nodesPerElement; i++) {
                for (int j = 0; j < nodesPerElement; j++) {
                    element[i * nodesPerElement + j] += twiceArea
                            / 6
                            * (k[0] * (dx[i] * dx[j])
                                    + k[1] * (dy[i] * dy[j])
                                    + k[2] * (dx[i] * dy[j] + dy[i] * dx[j]));
                }
            }
        }
    }

    private void films(double[] value) {
        double[][] mass = nodesPerElement == 3
                ? new double[][] {{2 / 6.0, 1 / 6.0}, {1 / 6.0, 2 / 6.0}}
                : new double[][] {
                    {4 / 30.0, -1 / 30.0, 2 / 30.0}, {-1 / 30.0, 4 / 30.0, 2 / 30.0}, {2 / 30.0, 2 / 30.0, 16 / 30.0}
                };
        for (int j = 0; j < n; j++) {
            for (int end = 0; end <= n; end += n) {
                int low = j * (n + 1) + end;
                int[] edge = {low, low + n + 1, nodesPerElement == 6 ? middle(low, low + n + 1, 0, 0) : -1};
                double length = xy[2 * edge[1] + 1] - xy[2 * edge[0] + 1];
                for (int a = 0; a < mass.length; a++) {
                    for (int b = 0; b < mass.length; b++) {
                        value[pattern.slot(edge[a], edge[b])] += mass[a][b] * length;
                        load[edge[a]] += end == 0 ? mass[a][b] * length : 0;
                    }
                }
            }
        }
    }

    private int[] corners(int[] nodes) {
        int[] result = new int[2 * pattern.unknowns()];
        for (int e = 0; e < nodes.length / 6; e++) {
            for (int c = 0; c < 3; c++) {
                int corner = unknown[nodes[6 * e + c]];
                int side = unknown[nodes[6 * e + 3 + c]];
                if (corner >= 0) {
                    result[2 * corner] = corner;
                    result[2 * corner + 1] = corner;
                }
                if (side >= 0) {
                    result[2 * side] = unknown[nodes[6 * e + (c + 1) % 3]];
                    result[2 * side + 1] = unknown[nodes[6 * e + (c + 2) % 3]];
                }
            }
        }
        return result;
    }
}
