package tepor.solver;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.mesh.Mesh;

/** Meshes of polygons whose corners lie on circles, made curved: the middles of facets move onto the circle. */
public final class CurvedMesh {
    private CurvedMesh() {}

    /**
     * Moves the nodes of every facet that is a chord of a circle about a centre, or a piece of one, onto that circle.
     *
     * @param straight six-node triangles
     * @param x of the centre, metres
     * @param y of the centre, metres
     * @param radii of the circles, metres; no facet that is none of their chords may be near them
     */
    public static Mesh about(Mesh straight, double x, double y, double... radii) {
        double[] xy = new double[2 * straight.nodeCount()];
        for (int i = 0; i < straight.nodeCount(); i++) {
            xy[2 * i] = straight.x(i);
            xy[2 * i + 1] = straight.y(i);
        }
        for (int f = 0; f < straight.facetCount(); f++) {
            for (int i = 0; i < 2; i++) {
                move(xy, straight.facetNode(f, i), x, y, radii);
            }
        }
        for (int t = 0; t < straight.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                for (int d = 0; d < 2; d++) {
                    xy[2 * straight.node(t, 3 + i) + d] = 0.5
                            * (xy[2 * straight.node(t, (i + 1) % 3) + d] + xy[2 * straight.node(t, (i + 2) % 3) + d]);
                }
            }
        }
        for (int f = 0; f < straight.facetCount(); f++) {
            move(xy, straight.facetNode(f, 2), x, y, radii);
        }
        return moved(straight, xy);
    }

    private static void move(double[] xy, int node, double x, double y, double[] radii) {
        double dx = xy[2 * node] - x;
        double dy = xy[2 * node + 1] - y;
        for (double radius : radii) {
            double off = Math.hypot(dx, dy) / radius;
            if (off > 0.9 && off < 1 + 1e-9) {
                xy[2 * node] = x + dx / off;
                xy[2 * node + 1] = y + dy / off;
            }
        }
    }

    /**
     * Divides every triangle in four, at the middles of its sides. A curved side becomes two straight ones through its
     * middle node: hand the result to {@link #about}.
     */
    public static Mesh halved(Mesh mesh) {
        int count = mesh.triangleCount();
        Map<Long, Integer> middles = new HashMap<>();
        List<Double> xy = new ArrayList<>();
        for (int i = 0; i < mesh.nodeCount(); i++) {
            xy.add(mesh.x(i));
            xy.add(mesh.y(i));
        }
        int[] node = new int[24 * count];
        int[] region = new int[4 * count];
        int[][] children = {{0, 5, 4}, {5, 1, 3}, {4, 3, 2}, {3, 4, 5}};
        Map<Long, Integer> sides = new HashMap<>();
        for (int t = 0; t < 4 * count; t++) {
            region[t] = mesh.region(t / 4);
            for (int i = 0; i < 3; i++) {
                node[6 * t + i] = mesh.node(t / 4, children[t % 4][i]);
            }
            for (int i = 0; i < 3; i++) {
                int a = node[6 * t + (i + 1) % 3];
                int b = node[6 * t + (i + 2) % 3];
                sides.put(directed(a, b), 3 * t + i);
                node[6 * t + 3 + i] = middles.computeIfAbsent(directed(Math.min(a, b), Math.max(a, b)), key -> {
                    xy.add(0.5 * (xy.get(2 * a) + xy.get(2 * b)));
                    xy.add(0.5 * (xy.get(2 * a + 1) + xy.get(2 * b + 1)));
                    return xy.size() / 2 - 1;
                });
            }
        }
        int[] neighbour = new int[12 * count];
        for (int s = 0; s < neighbour.length; s++) {
            int a = node[6 * (s / 3) + (s % 3 + 1) % 3];
            int b = node[6 * (s / 3) + (s % 3 + 2) % 3];
            int across = sides.getOrDefault(directed(b, a), Mesh.NONE);
            neighbour[s] = across < 0 ? Mesh.NONE : across / 3;
        }
        int facets = 2 * mesh.facetCount();
        int[] segment = new int[facets];
        int[] left = new int[facets];
        int[] right = new int[facets];
        for (int f = 0; f < facets; f++) {
            int a = mesh.facetNode(f / 2, f % 2 == 0 ? 0 : 2);
            int b = mesh.facetNode(f / 2, f % 2 == 0 ? 2 : 1);
            segment[f] = mesh.facetSegment(f / 2);
            left[f] = sides.getOrDefault(directed(a, b), Mesh.NONE);
            right[f] = sides.getOrDefault(directed(b, a), Mesh.NONE);
        }
        double[] all = xy.stream().mapToDouble(Double::doubleValue).toArray();
        return new Mesh(6, mesh.nodeCount(), all, node, neighbour, region, segment, left, right);
    }

    private static long directed(int a, int b) {
        return (long) a << 32 | b;
    }

    /** Makes every facet a parabola whose middle lies off its chord by a share of the chord. */
    public static Mesh bulged(Mesh straight, double share) {
        double[] xy = new double[2 * straight.nodeCount()];
        for (int i = 0; i < straight.nodeCount(); i++) {
            xy[2 * i] = straight.x(i);
            xy[2 * i + 1] = straight.y(i);
        }
        for (int f = 0; f < straight.facetCount(); f++) {
            int a = straight.facetNode(f, 0);
            int b = straight.facetNode(f, 1);
            int m = straight.facetNode(f, 2);
            xy[2 * m] += share * (straight.y(b) - straight.y(a));
            xy[2 * m + 1] -= share * (straight.x(b) - straight.x(a));
        }
        return moved(straight, xy);
    }

    /** The same mesh with its nodes elsewhere. */
    public static Mesh moved(Mesh mesh, double[] xy) {
        int n = mesh.nodesPerTriangle();
        int count = mesh.triangleCount();
        int[] node = new int[n * count];
        int[] neighbour = new int[3 * count];
        int[] region = new int[count];
        for (int t = 0; t < count; t++) {
            for (int i = 0; i < n; i++) {
                node[n * t + i] = mesh.node(t, i);
            }
            for (int i = 0; i < 3; i++) {
                neighbour[3 * t + i] = mesh.neighbour(t, i);
            }
            region[t] = mesh.region(t);
        }
        int facets = mesh.facetCount();
        int[] segment = new int[facets];
        int[] left = new int[facets];
        int[] right = new int[facets];
        for (int f = 0; f < facets; f++) {
            segment[f] = mesh.facetSegment(f);
            left[f] = code(mesh.facetLeftTriangle(f), mesh.facetLeftSide(f));
            right[f] = code(mesh.facetRightTriangle(f), mesh.facetRightSide(f));
        }
        return new Mesh(n, mesh.cornerCount(), xy, node, neighbour, region, segment, left, right);
    }

    private static int code(int triangle, int side) {
        return triangle == Mesh.NONE ? Mesh.NONE : 3 * triangle + side;
    }
}
