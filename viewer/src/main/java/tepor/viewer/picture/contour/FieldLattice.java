package tepor.viewer.picture.contour;

import java.util.Arrays;
import tepor.mesher.mesh.Mesh;
import tepor.solver.field.TemperatureField;

/**
 * A field on a finer triangulation: each triangle of the mesh divided into n² smaller ones, whose corners and edges are
 * shared with their neighbours by number. Along an edge the field is the parabola through both ends and the middle, as it
 * is in the mesh; so crossings are exact, and the same seen from either side.
 */
final class FieldLattice {
    /** Coordinates of each point, m, 2 per point. */
    final double[] xy;
    /** Temperature of each point, K. */
    final double[] value;
    /** Points of each small triangle, counter-clockwise, 3 per triangle; those of a mesh triangle follow each other. */
    final int[] corner;
    /** Edges of each small triangle; edge i runs from its corner i to its corner (i+1)%3. */
    final int[] edge;
    /** Points at both ends of each edge. */
    final int[] edgeEnd;
    /** Temperature in the middle of each edge, K. */
    final double[] edgeMiddle;
    /** Small triangles on both sides of each edge, −1 where there is none (in the second place). */
    final int[] edgeTriangle;

    /** @param n into how many pieces each side is divided; 1 for three-node triangles loses nothing */
    FieldLattice(TemperatureField field, int n) {
        Mesh mesh = field.mesh();
        LatticePattern pattern = new LatticePattern(n);
        int triangles = mesh.triangleCount();
        int[] side = new int[3 * triangles]; // number of each side, shared by neighbours
        boolean[] first = new boolean[3 * triangles]; // whether this triangle gives the side its direction
        int sides = numberSides(mesh, side, first);

        int sidePoints = mesh.cornerCount();
        int innerPoints = sidePoints + sides * (n - 1);
        int points = innerPoints + triangles * pattern.innerPointCount;
        int innerEdges = sides * n;
        int edges = innerEdges + triangles * pattern.innerEdgeCount;
        xy = new double[2 * points];
        value = new double[points];
        corner = new int[3 * n * n * triangles];
        edge = new int[3 * n * n * triangles];
        edgeEnd = new int[2 * edges];
        edgeMiddle = new double[edges];
        edgeTriangle = new int[2 * edges];
        Arrays.fill(edgeTriangle, -1);

        double[] t = new double[6];
        double[] x = new double[6];
        double[] y = new double[6];
        int[] pointNumber = new int[pattern.pointCount];
        int[] edgeNumber = new int[pattern.edgeCount];
        for (int e = 0; e < triangles; e++) {
            loadNodes(field, e, t, x, y);
            for (int p = 0; p < pattern.pointCount; p++) {
                int at = pattern.pointSide[p];
                int position = pattern.pointPosition[p];
                int number;
                boolean known = false;
                if (at == -2) {
                    number = mesh.node(e, position);
                } else if (at == -1) {
                    number = innerPoints + e * pattern.innerPointCount + position;
                } else {
                    known = !first[3 * e + at];
                    number = sidePoints + side[3 * e + at] * (n - 1) + (known ? n - position : position) - 1;
                }
                pointNumber[p] = number;
                if (!known) {
                    double a = pattern.weight[3 * p];
                    double b = pattern.weight[3 * p + 1];
                    double c = pattern.weight[3 * p + 2];
                    value[number] = at == -2 ? t[position] : quadratic(t, a, b, c);
                    xy[2 * number] = at == -2 ? x[position] : quadratic(x, a, b, c);
                    xy[2 * number + 1] = at == -2 ? y[position] : quadratic(y, a, b, c);
                }
            }
            for (int g = 0; g < pattern.edgeCount; g++) {
                int at = pattern.edgeSide[g];
                int position = pattern.edgePosition[g];
                boolean known = at >= 0 && !first[3 * e + at];
                int number = at < 0
                        ? innerEdges + e * pattern.innerEdgeCount + position
                        : side[3 * e + at] * n + (known ? n - 1 - position : position);
                edgeNumber[g] = number;
                if (!known) {
                    int p = pattern.edgeEnd[2 * g];
                    int q = pattern.edgeEnd[2 * g + 1];
                    edgeEnd[2 * number] = pointNumber[p];
                    edgeEnd[2 * number + 1] = pointNumber[q];
                    double a = 0.5 * (pattern.weight[3 * p] + pattern.weight[3 * q]);
                    double b = 0.5 * (pattern.weight[3 * p + 1] + pattern.weight[3 * q + 1]);
                    edgeMiddle[number] = quadratic(t, a, b, 1 - a - b);
                }
            }
            for (int i = 0; i < 3 * n * n; i++) {
                int small = e * n * n + i / 3;
                int number = edgeNumber[pattern.edge[i]];
                corner[3 * n * n * e + i] = pointNumber[pattern.corner[i]];
                edge[3 * n * n * e + i] = number;
                edgeTriangle[2 * number + (edgeTriangle[2 * number] < 0 ? 0 : 1)] = small;
            }
        }
    }

    int triangleCount() {
        return corner.length / 3;
    }

    int edgeCount() {
        return edgeMiddle.length;
    }

    boolean isBoundary(int iEdge) {
        return edgeTriangle[2 * iEdge + 1] < 0;
    }

    private static int numberSides(Mesh mesh, int[] side, boolean[] first) {
        Arrays.fill(side, -1);
        int sides = 0;
        for (int e = 0; e < mesh.triangleCount(); e++) {
            for (int i = 0; i < 3; i++) {
                if (side[3 * e + i] >= 0) {
                    continue;
                }
                side[3 * e + i] = sides;
                first[3 * e + i] = true;
                int across = mesh.neighbour(e, i);
                for (int j = 0; across != Mesh.NONE && j < 3; j++) {
                    if (mesh.node(across, (j + 1) % 3) == mesh.node(e, (i + 2) % 3)
                            && mesh.node(across, (j + 2) % 3) == mesh.node(e, (i + 1) % 3)) {
                        side[3 * across + j] = sides;
                    }
                }
                sides++;
            }
        }
        return sides;
    }

    /** Three-node triangles get the middles that make the quadratic formulas linear. */
    private static void loadNodes(TemperatureField field, int e, double[] t, double[] x, double[] y) {
        Mesh mesh = field.mesh();
        for (int i = 0; i < mesh.nodesPerTriangle(); i++) {
            int node = mesh.node(e, i);
            t[i] = field.at(node);
            x[i] = mesh.x(node);
            y[i] = mesh.y(node);
        }
        for (int i = mesh.nodesPerTriangle(); i < 6; i++) {
            int a = (i - 2) % 3;
            int b = (i - 1) % 3;
            t[i] = 0.5 * (t[a] + t[b]);
            x[i] = 0.5 * (x[a] + x[b]);
            y[i] = 0.5 * (y[a] + y[b]);
        }
    }

    /** Quadratic shape functions: a (2a − 1) at corners, 4bc in the middle of sides. */
    private static double quadratic(double[] v, double a, double b, double c) {
        return v[0] * a * (2 * a - 1)
                + v[1] * b * (2 * b - 1)
                + v[2] * c * (2 * c - 1)
                + 4 * (v[3] * b * c + v[4] * c * a + v[5] * a * b);
    }
}
