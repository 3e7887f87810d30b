package tepor.solver;

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
