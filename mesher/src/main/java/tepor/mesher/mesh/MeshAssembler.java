package tepor.mesher.mesh;

import java.util.Arrays;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.refinement.RefinementReport;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.HilbertOrder;
import tepor.mesher.triangulation.Triangulation;

/**
 * Turns a finished triangulation into a mesh: orders triangles along Hilbert's curve and nodes by first use, gives each fan
 * of triangles at a vertex a node of its own, adds nodes in the middle of sides, and lists the facets.
 */
final class MeshAssembler {
    private final Triangulation from;
    private final Section section;
    private final int nodesPerTriangle;
    private final int count;
    /** Old triangle number of each new one, and new number of each old one. */
    private final int[] oldNumber;

    private final int[] newNumber;
    private final int[] node;
    private final int[] neighbour;
    private final int[] region;
    private int cornerCount;
    private int nodeCount;
    private double[] xy;
    private Mesh mesh;
    private List<RefinementReport.Stop> leftStraight = List.of();

    private MeshAssembler(Triangulation from, Section section, int nodesPerTriangle) {
        this.from = from;
        this.section = section;
        this.nodesPerTriangle = nodesPerTriangle;
        count = from.triangleCount();
        oldNumber = HilbertOrder.alongCurve(centroids());
        newNumber = new int[count];
        node = new int[nodesPerTriangle * count];
        neighbour = new int[3 * count];
        region = new int[count];
        xy = new double[2 * from.vertexCount() + 16];
    }

    /**
     * Makes the mesh, {@link #mesh()}.
     *
     * @param nodesPerTriangle 3 or 6
     */
    static MeshAssembler assemble(Triangulation from, Section section, int nodesPerTriangle) {
        if (nodesPerTriangle != 3 && nodesPerTriangle != 6) {
            throw new IllegalArgumentException("a triangle has 3 or 6 nodes, not " + nodesPerTriangle);
        }
        MeshAssembler assembler = new MeshAssembler(from, section, nodesPerTriangle);
        assembler.orderTriangles();
        assembler.numberCorners();
        if (nodesPerTriangle == 6) {
            assembler.numberMiddles();
        }
        assembler.finish();
        return assembler;
    }

    Mesh mesh() {
        return mesh;
    }

    /** Where sides on arcs were left straight. */
    List<RefinementReport.Stop> leftStraight() {
        return leftStraight;
    }

    private double[] centroids() {
        double[] centroid = new double[2 * count];
        for (int side = 0; side < 3 * count; side++) {
            centroid[2 * (side / 3)] += from.x(from.apex(side)) / 3;
            centroid[2 * (side / 3) + 1] += from.y(from.apex(side)) / 3;
        }
        return centroid;
    }

    private void orderTriangles() {
        for (int t = 0; t < count; t++) {
            newNumber[oldNumber[t]] = t;
        }
        for (int t = 0; t < count; t++) {
            int old = oldNumber[t];
            region[t] = from.region(old);
            for (int i = 0; i < 3; i++) {
                int twin = from.twin(3 * old + i);
                neighbour[3 * t + i] = twin < 0 ? Mesh.NONE : newNumber[twin / 3];
            }
        }
    }

    private void numberCorners() {
        Arrays.fill(node, Mesh.NONE);
        for (int t = 0; t < count; t++) {
            for (int i = 0; i < 3; i++) {
                if (node[nodesPerTriangle * t + i] == Mesh.NONE) {
                    int vertex = from.apex(3 * oldNumber[t] + i);
                    numberFan(3 * oldNumber[t] + i, newNode(from.x(vertex), from.y(vertex)));
                }
            }
        }
        cornerCount = nodeCount;
    }

    // All triangles that can be reached about the vertex, first one way round, then the other if there is a boundary.
    private void numberFan(int start, int number) {
        int side = start;
        do {
            setCorner(side, number);
            int twin = from.twin(Triangulation.next(side));
            side = twin < 0 ? Triangulation.NONE : Triangulation.next(twin);
        } while (side >= 0 && side != start);
        if (side < 0) {
            int twin = from.twin(Triangulation.previous(start));
            while (twin >= 0) {
                side = Triangulation.previous(twin);
                setCorner(side, number);
                twin = from.twin(Triangulation.previous(side));
            }
        }
    }

    private void setCorner(int side, int number) {
        node[nodesPerTriangle * newNumber[side / 3] + side % 3] = number;
    }

    private void numberMiddles() {
        ArcSides arcSides = new ArcSides(from, section);
        leftStraight = arcSides.leftStraight();
        for (int t = 0; t < count; t++) {
            for (int i = 0; i < 3; i++) {
                if (node[6 * t + 3 + i] != Mesh.NONE) {
                    continue;
                }
                Coordinate at = arcSides.middle(3 * oldNumber[t] + i);
                int middle = newNode(at.x, at.y);
                node[6 * t + 3 + i] = middle;
                int twin = from.twin(3 * oldNumber[t] + i);
                if (twin >= 0) {
                    node[6 * newNumber[twin / 3] + 3 + twin % 3] = middle;
                }
            }
        }
    }

    private int newNode(double x, double y) {
        if (2 * nodeCount == xy.length) {
            xy = Arrays.copyOf(xy, 2 * xy.length);
        }
        xy[2 * nodeCount] = x;
        xy[2 * nodeCount + 1] = y;
        return nodeCount++;
    }

    private void finish() {
        FacetList facets = FacetList.of(from, section);
        int[] left = new int[facets.count()];
        int[] right = new int[facets.count()];
        for (int f = 0; f < left.length; f++) {
            left[f] = renumbered(facets.leftSide(f));
            right[f] = renumbered(facets.rightSide(f));
        }
        mesh = new Mesh(
                nodesPerTriangle,
                cornerCount,
                Arrays.copyOf(xy, 2 * nodeCount),
                node,
                neighbour,
                region,
                facets.segments(),
                left,
                right);
    }

    private int renumbered(int side) {
        return side < 0 ? Mesh.NONE : 3 * newNumber[side / 3] + side % 3;
    }
}
